package broadside.assess;

import broadside.action.CaseAction;
import broadside.codes.CodeLibrary;
import broadside.codes.WindCode;
import broadside.panel.BannerFence;
import broadside.panel.Item;
import broadside.panel.Panel;
import broadside.quantity.Speed;
import broadside.site.Averaging;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.site.SpeedConversion;
import broadside.table.Rows;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * Works out one item by every code. The basic speed of the job is brought to the wind of 50 years by the law of its own
 * code and to the averaging time of the other code by the ratios after Durst; a speed typed for a code comes first.
 */
final class SideBySide {

    private final Assessor assessor;
    private final CodeLibrary codes;
    private final SpeedConversion conversion;
    private final Rows terrains;
    private final Comparison.Gust gust;

    SideBySide(Assessor assessor, SpeedConversion conversion, Rows terrains, Rows gusts) {
        this.assessor = assessor;
        this.codes = assessor.codes();
        this.conversion = conversion;
        this.terrains = terrains;
        double used = conversion.convert(Speed.metresPerSecond(1), Averaging.MEAN_10_MIN, Averaging.GUST_3_S, new Trace());
        this.gust = new Comparison.Gust(used, gusts.number("smallest", "ratio").value(), gusts.number("largest", "ratio").value());
    }

    Comparison of(Job job, Item item) {
        List<String> keys = new ArrayList<>(List.of(job.basis().key()));
        codes.editions().stream().filter(k -> !keys.contains(k)).forEach(keys::add);
        WindCode own = codes.code(job.basis().key()).orElseThrow();
        List<Comparison.Line> lines = new ArrayList<>();
        for (String key : keys) {
            lines.add(line(job, item, own, key));
        }
        return new Comparison(item, lines, gust);
    }

    private Comparison.Line line(Job job, Item item, WindCode own, String key) {
        WindCode code = codes.code(key).orElseThrow();
        boolean chosen = key.equals(job.basis().key());
        Optional<Job.Compared> typed = job.compared().stream().filter(c -> c.key().equals(key)).findFirst();
        Trace steps = new Trace();
        String terrain = chosen ? job.site().ground().terrain() : typed.flatMap(Job.Compared::terrain).orElseGet(() -> match(job.site(), own, code));
        Run run = chosen ? chosen(job.site(), code, steps) : typed.flatMap(Job.Compared::speed).map(s -> typed(job.site(), s, code, terrain, steps))
            .orElseGet(() -> converted(job.site(), own, code, terrain, steps));
        Job.Basis basis = chosen ? job.basis() : new Job.Basis(key.substring(0, key.indexOf('/')), key.substring(key.indexOf('/') + 1), Optional.empty(), Optional.empty(), Optional.empty());
        ItemResult result = assessor.loadsOnly(new Job(Map.of(), basis, run.site(), List.of(item), job.remarks(), List.of(), List.of())).items().get(0);
        String name = code.edition().property(code.edition().hasProperty("short") ? "short" : "title");
        return new Comparison.Line(key, code.edition().property("title"), name, chosen, code.edition().hasProperty("no-code"), run.site().basicSpeed().metresPerSecond(), terrain,
            how(chosen, typed, own, code), result.loads().map(l -> found(item, l, run.ratio(), result.sheet())), result.refusal(), differs(code, item), steps);
    }

    /** The site that one code is given, and the wind of 50 years over its basic speed. */
    private record Run(Site site, double ratio) { }

    /** The site of the job as it is, without what lowers or raises the wind for a while or by an authority. */
    private static Run chosen(Site site, WindCode code, Trace steps) {
        steps.given("V_1", "basic wind speed, " + site.averaging().words(), site.basicSpeed().metresPerSecond(), "m/s", site.basicSpeed().typed());
        double k = code.fiftyYearRatio(site, steps);
        boolean strength = code.level(site).name().equals("strength");
        return new Run(new Site(site.name(), site.basicSpeed(), site.averaging(), strength ? site.returnPeriod() : Optional.empty(), site.ground(), Optional.empty(),
            site.options().without("duration-rule", "season", "season-factor", "structure-class")), k);
    }

    private static Run typed(Site site, Speed speed, WindCode code, String terrain, Trace steps) {
        Site other = bare(site, speed, code, terrain);
        steps.given("V", "basic wind speed typed for this code, " + code.terms().averaging().words(), speed.metresPerSecond(), "m/s", speed.typed());
        return new Run(other, code.fiftyYearRatio(other, steps));
    }

    /** The basic speed of the other code: through the wind of 50 years and the averaging time of that code. */
    private Run converted(Site site, WindCode own, WindCode code, String terrain, Trace steps) {
        double v = averaged(fifty(site, own, steps), site.averaging(), code.terms().averaging(), steps);
        Trace part = steps.part("other");
        double k = code.fiftyYearRatio(bare(site, site.basicSpeed(), code, terrain), part);
        double basic = part.line("basic-speed", "V", "basic wind speed of this code, " + code.terms().averaging().words()).in("V_{50}", v, "m/s").in("k_{50}", k)
            .from("as above", Status.DERIVED).gives("V_{50} / k_{50}", v / k, "m/s");
        return new Run(bare(site, new Speed(basic, String.format(Locale.ROOT, "%.4g m/s", basic)), code, terrain), k);
    }

    /** The basic speed of a site brought to the wind of 50 years, m/s. */
    private static double fifty(Site site, WindCode code, Trace steps) {
        double v = steps.given("V_1", "basic wind speed, " + site.averaging().words(), site.basicSpeed().metresPerSecond(), "m/s", site.basicSpeed().typed());
        double k = code.fiftyYearRatio(site, steps);
        return steps.line("fifty-year-speed", "V_{50}", "wind passed once in 50 years, " + site.averaging().words()).in("k_{50}", k).in("V_1", v, "m/s")
            .from("as above", Status.DERIVED).gives("k_{50} V_1", k * v, "m/s");
    }

    private double averaged(double v50, Averaging from, Averaging to, Trace steps) {
        if (same(from, to)) {
            return v50;
        }
        return conversion.convert(new Speed(v50, ""), from == Averaging.GUST_0_2_S ? Averaging.GUST_3_S : from, to == Averaging.GUST_0_2_S ? Averaging.GUST_3_S : to, steps);
    }

    /** The gust that one code calls 0.2 s is the number that was called a 3 s gust before: it is not converted. */
    private static boolean same(Averaging a, Averaging b) {
        return a == b || a.seconds() <= 3 && b.seconds() <= 3 && a.seconds() != 1 && b.seconds() != 1;
    }

    private static Site bare(Site site, Speed speed, WindCode code, String terrain) {
        Site.Ground ground = new Site.Ground(terrain, site.ground().altitude(), site.ground().topography(), site.ground().unknown());
        return new Site(site.name(), speed, code.terms().averaging(), Optional.empty(), ground, Optional.empty(), SiteOptions.NONE);
    }

    /** The class of the other code that stands for about the same ground. */
    private String match(Site site, WindCode own, WindCode code) {
        String column = family(own);
        String terrain = site.ground().terrain();
        String best = terrains.keys().get(0);
        for (String ground : terrains.keys()) {
            String there = terrains.text(ground, column);
            if (there.equals(terrain) || number(there) >= 0 && number(there) <= number(terrain)) {
                best = ground;
                if (there.equals(terrain)) {
                    break;
                }
            }
        }
        return terrains.text(best, family(code));
    }

    private static String family(WindCode code) {
        return code.edition().key().substring(0, code.edition().key().indexOf('/'));
    }

    /** A class that is a number or a length, so that a class between two printed ones finds the smoother; -1 for a letter. */
    private static double number(String terrain) {
        String digits = terrain.replace(" m", "");
        return digits.chars().allMatch(c -> Character.isDigit(c) || c == '.') && !digits.isEmpty() ? Double.parseDouble(digits) : -1;
    }

    private static String how(boolean chosen, Optional<Job.Compared> typed, WindCode own, WindCode code) {
        if (chosen) {
            return "the speed of this job";
        }
        if (typed.flatMap(Job.Compared::speed).isPresent()) {
            return "a speed typed for this code";
        }
        return same(own.terms().averaging(), code.terms().averaging()) ? "the same 50-year wind" : "the same 50-year wind, from a " + own.terms().averaging().words()
            + " to a " + (code.terms().averaging() == Averaging.GUST_0_2_S ? "3 s gust after Durst, the number that this code calls a 0.2 s gust"
                : code.terms().averaging().words() + " after Durst");
    }

    /** What is particular to a code: in general, and for this kind of item. */
    private static String differs(WindCode code, Item item) {
        return Stream.of("differs", "differs-" + item.kind()).filter(code.edition()::hasProperty).map(code.edition()::property).collect(Collectors.joining(" "));
    }

    private static Comparison.Found found(Item item, Loads loads, double ratio, Trace sheet) {
        double level = ratio * ratio;
        CaseAction governing = loads.governs("base-shear");
        double area = item.panels().stream().mapToDouble(Panel::area).sum();
        double greatest = loads.cases().stream().filter(c -> !c.state().equals(BannerFence.BARE)).flatMap(c -> c.zones().stream()).flatMap(z -> z.zones().stream())
            .mapToDouble(z -> Math.abs(z.pressure())).max().orElse(0);
        long recalled = sheet.steps().stream().filter(s -> s.status() == Status.RECALLED).count();
        return new Comparison.Found(level * loads.velocity().pressure(), level * governing.force() / area, level * greatest, level * governing.force(),
            level * loads.governs("base-moment").baseMoment(), (double) recalled / sheet.steps().size());
    }
}
