package broadside.job;

import broadside.assess.Job;
import broadside.assess.Problem;
import broadside.codes.CodeLibrary;
import broadside.codes.SiteTerms;
import broadside.codes.WindCode;
import broadside.quantity.Density;
import broadside.quantity.Dimension;
import broadside.quantity.Length;
import broadside.quantity.Period;
import broadside.quantity.Pressure;
import broadside.quantity.Quantity;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Speed;
import broadside.quantity.Unit;
import broadside.site.Averaging;
import broadside.site.Site;
import broadside.site.SiteOptions;
import broadside.site.SpeedConversion;
import broadside.site.Topography;
import broadside.table.OutsideTable;
import broadside.trace.Trace;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

/** Reads the site and holds it against what the chosen code wants to know. */
final class SiteReader {

    private static final List<String> NUMBERS = List.of("direction-factor", "season-factor", "topographic-factor", "gust-factor", "k4", "directionality",
        "direction-multiplier", "shielding-multiplier", "climate-multiplier");
    private static final List<String> QUANTITIES = List.of("air-density", "ground-elevation", "regional-speed", "stands-for");
    private static final List<String> WORDS = List.of("risk-category", "gust-factor", "season", "wind-zone", "structure-class", "region");

    /** The word for an answer that is not known. */
    private static final String UNKNOWN = "unknown";

    private final CodeLibrary codes;
    private final SpeedConversion conversion;
    private final List<Problem> problems;

    SiteReader(CodeLibrary codes, SpeedConversion conversion, List<Problem> problems) {
        this.codes = codes;
        this.conversion = conversion;
        this.problems = problems;
    }

    /** The site, or nothing when something needed is missing; what does not fit is noted. */
    Optional<Site> read(Values values, Optional<Job.Basis> basis) {
        Optional<Speed> speed = values.quantity("basic-speed", Speed.class);
        for (String name : List.of("basic-speed", "regional-speed")) {
            values.quantity(name, Speed.class).ifPresent(s -> within(values, name, s.metresPerSecond(), 1, 150, "1 m/s and 150 m/s"));
        }
        values.quantity("altitude", Length.class).ifPresent(a -> within(values, "altitude", a.metres(), -500, 6000, "-500 m and 6000 m"));
        values.quantity("ground-elevation", Length.class)
            .ifPresent(a -> within(values, "ground-elevation", a.metres(), -500, 6000, "-500 m and 6000 m"));
        values.quantity("air-density", Density.class)
            .ifPresent(d -> within(values, "air-density", d.kilogramsPerCubicMetre(), 0.5, 1.6, "0.5 kg/m3 and 1.6 kg/m3"));
        values.quantity("authority-minimum-pressure", Pressure.class)
            .ifPresent(p -> within(values, "authority-minimum-pressure", p.pascals(), 0, 20_000, "0 and 20 kN/m2"));
        NUMBERS.forEach(n -> values.number(n).ifPresent(v -> within(values, n, v, 0.3, 5, "0.3 and 5")));
        Optional<Averaging> averaging = values.text("averaging").flatMap(Averaging::of);
        Optional<WindCode> code = basis.flatMap(b -> codes.code(b.key()));
        String leastYears = code.map(WindCode::edition).filter(e -> e.hasProperty("least-return-period")).map(e -> e.property("least-return-period")).orElse("1.05");
        values.quantity("return-period", Period.class)
            .ifPresent(p -> within(values, "return-period", p.years(), Double.parseDouble(leastYears), 10_000, leastYears + (leastYears.equals("1") ? " year" : " years") + " and 10 000 years"));
        Set<Site.Unknown> unknown = EnumSet.noneOf(Site.Unknown.class);
        Optional<String> terrain = values.text("terrain");
        if (terrain.filter(UNKNOWN::equals).isPresent()) {
            unknown.add(Site.Unknown.TERRAIN);
            terrain = code.map(c -> c.terms().smoothest());
        }
        Optional<Speed> other = code.flatMap(c -> otherSpeed(c, values));
        Optional<Speed> used = other.or(() -> speed);
        if (code.isPresent()) {
            holdAgainst(code.get(), values, speed, averaging, terrain);
            speedIsGiven(code.get(), values, speed, other, averaging);
        }
        Optional<Topography> topography = values.object("topography").flatMap(this::topography);
        nearby(values, unknown);
        if (used.isEmpty() || terrain.isEmpty() || code.isEmpty()) {
            return Optional.empty();
        }
        Site.Ground ground = new Site.Ground(terrain.get(), values.quantity("altitude", Length.class), topography, unknown);
        return Optional.of(new Site(values.text("name").orElse(""), used.get(), averaging.orElse(code.get().terms().averaging()),
            values.quantity("return-period", Period.class), ground, authority(values), options(values)));
    }

    /** The basic speed that other values stand for; what does not fit in them is noted. */
    private Optional<Speed> otherSpeed(WindCode code, Values values) {
        try {
            return code.basicSpeed(options(values), values.quantity("return-period", Period.class));
        } catch (IllegalArgumentException e) {
            String wrong = Stream.of("region", "wind-zone", "regional-speed").filter(n -> options(values).names().contains(n)).findFirst().orElse("basic-speed");
            problems.add(new Problem(values.at(wrong), e.getMessage()));
            return Optional.empty();
        }
    }

    private void speedIsGiven(WindCode code, Values values, Optional<Speed> speed, Optional<Speed> other, Optional<Averaging> averaging) {
        boolean typed = values.quantity("basic-speed", Speed.class).isPresent();
        boolean told = Stream.of("basic-speed", "region", "wind-zone", "regional-speed").anyMatch(n -> told(values.at(n)));
        if (speed.isEmpty() && other.isEmpty() && !told) {
            problems.add(new Problem(values.at("basic-speed"), "is missing: basic wind speed as the code defines it, like \"25 m/s\""));
        } else if (typed && averaging.isEmpty() && !told(values.at("averaging"))) {
            problems.add(new Problem(values.at("averaging"), "is missing: averaging time of the basic speed, one of " + String.join(", ", Averaging.allWords())));
        }
        if (speed.isPresent() && other.isPresent()) {
            problems.add(new Problem(values.at("basic-speed"), "stands beside values that give the speed in " + code.edition().property("title")
                + "; give one of the two"));
        }
    }

    /** Whether a problem at this place was noted already. */
    private boolean told(String path) {
        return problems.stream().anyMatch(p -> p.path().equals(path));
    }

    /** What is said of the ground near by must fit the slope that is given. */
    private void nearby(Values values, Set<Site.Unknown> unknown) {
        Optional<String> nearby = values.text("ground-nearby");
        boolean slope = values.object("topography").isPresent();
        if (nearby.filter(UNKNOWN::equals).isPresent()) {
            unknown.add(Site.Unknown.SHAPE);
        }
        if (slope && nearby.filter(n -> !n.equals("hill")).isPresent()) {
            problems.add(new Problem(values.at("ground-nearby"), "is \"" + nearby.get() + "\", but topography gives a slope; give one of the two"));
        }
        if (!slope && nearby.filter("hill"::equals).isPresent() && values.number("topographic-factor").isEmpty()) {
            problems.add(new Problem(values.at("topography"), "is missing: the ground near by was said to be higher or lower; give its sizes, or answer \"unknown\""));
        }
    }

    private static Optional<Site.AuthorityMinimum> authority(Values values) {
        boolean service = values.text("authority-minimum-level").filter("service"::equals).isPresent();
        return values.quantity("authority-minimum-pressure", Pressure.class).map(p -> new Site.AuthorityMinimum(p, service));
    }

    private void holdAgainst(WindCode code, Values values, Optional<Speed> speed, Optional<Averaging> averaging, Optional<String> terrain) {
        SiteTerms terms = code.terms();
        String name = code.edition().property("title");
        terrain.filter(t -> !terms.hasTerrain(t)).ifPresent(t -> problems.add(new Problem(values.at("terrain"), "\"" + StructureReader.clean(t)
            + "\" is not a terrain class of " + name + "; it has " + terms.terrainNames())));
        averaging.filter(a -> !terms.averagings().contains(a)).ifPresent(a -> wrongAveraging(name, values, speed, a, terms.averaging()));
        for (String option : options(values).names()) {
            if (!option.equals("stands-for") && !terms.options().contains(option)) {
                problems.add(new Problem(values.at(option), "is not a value of " + name + "; beside the wind and the ground it takes "
                    + String.join(", ", terms.options().stream().sorted().toList())));
            }
        }
        if (values.text("authority-minimum-level").isPresent() && values.quantity("authority-minimum-pressure", Pressure.class).isEmpty()) {
            problems.add(new Problem(values.at("authority-minimum-level"), "stands without authority-minimum-pressure"));
        }
        if (values.object("topography").isPresent() && values.number("topographic-factor").isPresent()) {
            problems.add(new Problem(values.at("topographic-factor"), "stands beside topography; give one of the two"));
        }
    }

    /** The conversion that can be taken over, with what it rests on. */
    private void wrongAveraging(String name, Values values, Optional<Speed> speed, Averaging from, Averaging to) {
        Optional<String> converted = speed.flatMap(s -> converted(s, from, to));
        String offer = speed.map(s -> converted.map(text -> " In open country at 10 m " + s.typed() + " as a " + from.words() + " is about " + text + " as a " + to.words()
            + " (ratios after Durst); type that with \"" + to.words() + "\" if it is what you mean.")
            .orElse(" There is no conversion from a " + from.words() + " here; type the speed as a " + to.words() + ".")).orElse("");
        problems.add(new Problem(values.at("averaging"), name + " defines its basic speed as a " + to.words() + ", and this one is a " + from.words() + "." + offer,
            converted.map(text -> text + " as a " + to.words()).stream().toList()));
    }

    private Optional<String> converted(Speed speed, Averaging from, Averaging to) {
        try {
            double found = conversion.convert(speed, from, to == Averaging.GUST_0_2_S ? Averaging.GUST_3_S : to, new Trace());
            boolean miles = speed.typed().toLowerCase(Locale.ROOT).contains("mph");
            double unit = Unit.of(Dimension.SPEED, miles ? "mph" : "m/s").orElseThrow().toSi();
            return Optional.of(Show.number(found / unit, 4, Rounding.UP) + (miles ? " mph" : " m/s"));
        } catch (OutsideTable e) {
            return Optional.empty();
        }
    }

    private Optional<Topography> topography(Values values) {
        Optional<Length> height = positive(values, "height");
        Optional<Length> upwind = positive(values, "upwind-length");
        Optional<Length> downwind = positive(values, "downwind-length");
        Optional<Length> half = positive(values, "half-length");
        Optional<Length> distance = values.quantity("distance-from-crest", Length.class);
        Optional<String> feature = values.text("feature");
        if (half.isPresent() && upwind.isPresent() && half.get().metres() >= upwind.get().metres()) {
            problems.add(new Problem(values.at("half-length"), "must be shorter than upwind-length, as it ends half-way up the slope"));
        }
        if (height.isEmpty() || upwind.isEmpty() || distance.isEmpty() || feature.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(new Topography(Topography.Feature.valueOf(feature.get().toUpperCase(Locale.ROOT)), height.get(), upwind.get(),
            downwind, half, distance.get()));
    }

    private Optional<Length> positive(Values values, String name) {
        Optional<Length> length = values.quantity(name, Length.class);
        length.ifPresent(l -> within(values, name, l.metres(), 0.1, 20_000, "0.1 m and 20 km"));
        return length;
    }

    private void within(Values values, String name, double value, double least, double most, String words) {
        if (!(value >= least && value <= most)) {
            problems.add(new Problem(values.at(name), "must lie between " + words));
        }
    }

    private static SiteOptions options(Values values) {
        Map<String, Double> numbers = new HashMap<>();
        NUMBERS.forEach(n -> values.number(n).ifPresent(v -> numbers.put(n, v)));
        Map<String, Quantity> quantities = new HashMap<>();
        QUANTITIES.forEach(n -> values.quantity(n, Quantity.class).ifPresent(v -> quantities.put(n, v)));
        Map<String, String> words = new HashMap<>();
        WORDS.forEach(n -> values.text(n).ifPresent(v -> words.put(n, v)));
        values.text("duration-rule").filter("code"::equals).ifPresent(v -> words.put("duration-rule", v));
        return new SiteOptions(numbers, quantities, words);
    }
}
