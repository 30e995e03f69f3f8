package broadside;

import static broadside.CarriedJobs.ASCE;
import static broadside.CarriedJobs.EN;
import static broadside.CarriedJobs.carried;
import static broadside.CarriedJobs.step;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.action.PostAction;
import broadside.assess.BadJob;
import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.support.Check;
import broadside.trace.Step;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Whole random jobs from fixed seeds: what goes down into the supports is what the wind brings, and more wind or more board never asks for less. */
class CarriedRandomTest {

    private static final double EXACT = 1e-9;

    private static void near(double actual, double expected, String what) {
        assertThat(actual).as(what).isCloseTo(expected, within(EXACT * Math.max(1e-6, Math.abs(expected))));
    }

    /** A random item of which one size can be made larger without a change of anything else. */
    private record Draw(boolean en, String kind, double speed, double width, double height, double clearance, String rest) {

        static Draw of(Random random, String kind) {
            boolean en = random.nextInt(3) > 0;
            double speed = round(en ? 15 + 15 * random.nextDouble() : 30 + 25 * random.nextDouble());
            double clearance = round(kind.equals("hoarding") || kind.equals("banner-fence") ? 0 : 1.5 + 2 * random.nextDouble());
            return new Draw(en, kind, speed, round(1 + 2.5 * random.nextDouble()), round(0.6 + 1.2 * random.nextDouble()), clearance, rest(random, kind));
        }

        private static String rest(Random random, String kind) {
            String ground = any(random, "'ground': 'average'", "'ground': 'poor'", "'ground': 'clay'", "'cohesion': '40 kPa'", "'friction-angle': '32 deg'");
            String footing = random.nextInt(3) > 0 ? "'footing': {'kind': 'planted', 'width': '0.6 m', " + ground + "}"
                : "'footing': {'kind': 'pad', 'depth': '0.6 m', " + any(random, "'ground': 'clay'", "'ground': 'sand'", "'bearing': '150 kPa', 'friction': 0.5") + "}";
            return switch (kind) {
                case "post-sign" -> "'posts': {'count': " + (1 + random.nextInt(2)) + ", 'spacing': '" + round(0.3 + 0.3 * random.nextDouble()) + " m', 'section': 'auto', 'series': '"
                    + any(random, "chs-hot", "us-pipe", "shs-hot") + "'}, " + footing;
                case "hoarding" -> "'length': '30 m', 'posts': {'spacing': '" + any(random, "2", "2.5") + " m'" + (random.nextBoolean()
                    ? "}, 'ballast': {'lever': '1.6 m', 'mass': '500 kg', 'face-mass': '90 kg', 'friction': 0.4}" : ", 'series': 'chs-hot'}, " + footing);
                case "banner-fence" -> "'panel-length': '3 m', 'panels': 8, 'cover-solidity': 1.0, 'fence-solidity': 0.25, 'panel-mass': '20 kg', 'foot-mass': '15 kg', 'friction': 0.4"
                    + any(random, "", ", 'brace': {'lever': '1.5 m', 'mass': '60 kg'}");
                case "projecting-sign" -> "'gap': '0.1 m', 'depth': '0.1 m', 'mass': '30 kg', 'brackets': {'count': 2, 'spacing': '0.5 m'}, 'fixings': {'columns': 2, 'rows': 2, "
                    + "'horizontal-pitch': '0.1 m', 'vertical-pitch': '0.15 m'}";
                default -> "'distance-from-corner': '1 m', 'backing': 'wall', 'building': {'width': '40 m', 'depth': '30 m', 'height': '15 m', 'roof-slope': '2 deg'}, 'mass': '20 kg', "
                    + "'fixings': {'columns': " + (1 + random.nextInt(3)) + ", 'rows': 2, 'horizontal-pitch': '0.4 m', 'vertical-pitch': '0.5 m'}";
            };
        }

        String job() {
            String sizes = switch (kind) {
                case "post-sign" -> "'boards': [{'width': '" + width + " m', 'height': '" + height + " m', 'clearance': '" + clearance + " m', 'mass': '25 kg'}], ";
                case "hoarding" -> "'height': '" + (height + 1) + " m', 'clearance': '" + clearance + " m', ";
                case "banner-fence" -> "'panel-height': '" + (height + 1) + " m', ";
                default -> (kind.equals("projecting-sign") ? "'projection': '" : "'width': '") + width + " m', 'height': '" + height + " m', 'bottom': '" + clearance + " m', ";
            };
            return CarriedJobs.job(en ? EN : ASCE, String.format(Locale.ROOT, "'basic-speed': '%s m/s', 'averaging': '%s', 'terrain': '%s'", speed, en ? "10 min mean" : "3 s gust",
                en ? "II" : "C"), kind, sizes + rest);
        }

        Draw faster(double by) {
            return new Draw(en, kind, round(speed * by), width, height, clearance, rest);
        }

        Draw wider(double by) {
            return new Draw(en, kind, speed, round(width * by), height, clearance, rest);
        }

        Draw higher(double by) {
            return new Draw(en, kind, speed, width, height, round(clearance + by), rest);
        }
    }

    private static double round(double value) {
        return Math.round(value * 1000) / 1000.0;
    }

    private static String any(Random random, String... of) {
        return of[random.nextInt(of.length)];
    }

    private static Optional<ItemResult> tried(String job) {
        try {
            ItemResult item = CarriedJobs.result(job);
            return item.loads().flatMap(Loads::carried).isPresent() ? Optional.of(item) : Optional.empty();
        } catch (BadJob e) {
            return Optional.empty(); // no pad is wide enough, as the line says
        }
    }

    /** Of every post the wind on the boards and on itself; the footing takes the same times the factor of its rule. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2})
    void theFootingTakesWhatThePostBrings(long seed) {
        Random random = new Random(seed);
        int seen = 0;
        for (int i = 0; i < 500; i++) {
            String job = Draw.of(random, i % 3 == 0 ? "hoarding" : "post-sign").job();
            Optional<ItemResult> found = tried(job);
            if (found.isEmpty() || carried(found.get(), job).part("footing").isEmpty()) {
                continue;
            }
            ItemResult item = found.get();
            Loads loads = item.loads().orElseThrow();
            for (Loads.Balance balance : loads.balance()) {
                near(balance.reactions(), balance.loads(), balance.what() + " of " + job);
            }
            boolean wall = i % 3 == 0;
            PostAction worst = loads.worstPost().orElseThrow();
            double shear = wall ? worst.shear() : loads.posts().stream().mapToDouble(PostAction::shear).max().orElseThrow();
            near(step(item, "footing-moment"), worst.moment(), "moment at the ground of " + job);
            assertThat(step(item, "footing-shear")).as(job).isLessThanOrEqualTo(shear * (1 + EXACT));
            if (loads.posts().size() == 1) {
                CaseAction base = loads.governs("base-moment");
                near(step(item, "footing-moment"), base.baseMoment(), "one post takes all: " + job);
                near(step(item, "footing-shear"), base.baseShear(), "one post takes all: " + job);
            }
            item.sheet().find("ground-shear").ifPresent(s -> near(s.value(), step(item, "footing-wind-level") * step(item, "footing-shear"), "ground shear of " + job));
            item.sheet().find("ground-moment").ifPresent(s -> near(s.value(), step(item, "footing-wind-level") * step(item, "footing-moment"), "ground moment of " + job));
            seen++;
        }
        assertThat(seen).isGreaterThan(300);
    }

    /** Every check of ballast holds force times lever of its own wind against the weights. */
    @ParameterizedTest
    @ValueSource(longs = {3, 4})
    void overturningMomentIsForceTimesLever(long seed) {
        Random random = new Random(seed);
        int checked = 0;
        for (int i = 0; i < 400; i++) {
            String job = Draw.of(random, i % 2 == 0 ? "hoarding" : "banner-fence").job();
            Optional<ItemResult> found = tried(job);
            if (found.isEmpty() || carried(found.get(), job).part("ballast").isEmpty()) {
                continue;
            }
            ItemResult item = found.get();
            double factor = step(item, "wind-level") * step(item, "factor-on-wind");
            for (Step moment : item.sheet().steps()) {
                if (!moment.name().startsWith("overturning-moment/")) {
                    continue;
                }
                String which = moment.name().substring("overturning-moment/".length());
                String wall = which.startsWith("zone-") ? post(item, which.substring(5)) : "";
                String state = which.endsWith("-bare") ? "/bare-fence" : "";
                String panel = which.equals("mean") ? "fence-panel-mean" : "fence-panel-shear/" + which.replace("-bare", "") + state;
                double force = step(item, wall.isEmpty() ? panel : "post-shear/" + wall);
                double lever = step(item, wall.isEmpty() ? "fence-panel-arm/" + which.replace("-bare", "") + state : "post-lever-arm/" + wall);
                near(moment.value(), factor * force * lever, which + " of " + job);
                near(step(item, "design-force/" + which), factor * force, which + " of " + job);
                checked++;
            }
        }
        assertThat(checked).isGreaterThan(500);
    }

    /** The zone of a post as its steps name it, from the name of its ballast. */
    private static String post(ItemResult item, String zone) {
        return item.sheet().steps().stream().map(Step::name).filter(n -> n.startsWith("post-shear/")).map(n -> n.substring("post-shear/".length()))
            .filter(n -> n.replace('/', '-').equals(zone)).findFirst().orElseThrow();
    }

    /** What was found for an item: sizes of which none may fall. */
    private static List<Double> asked(String job) {
        List<Double> asked = new ArrayList<>();
        Optional<ItemResult> found = tried(job);
        if (found.isEmpty()) {
            return asked;
        }
        Carried carried = carried(found.get(), job);
        for (Carried.Part each : carried.parts()) {
            if (each.refused().isPresent()) {
                return List.of();
            }
            for (Carried.Result result : each.results()) {
                boolean size = List.of("mass", "depth", "ballast-line", "ballast-per-metre", "pull").contains(result.key());
                boolean pad = result.key().equals("width") && found.get().sheet().find("pad-width").isPresent();
                if ((size || pad) && !result.unit().isEmpty()) {
                    asked.add(result.value());
                }
            }
        }
        return asked;
    }

    private static int neverLess(String less, String more, String what) {
        List<Double> before = asked(less);
        List<Double> after = asked(more);
        if (before.isEmpty() || after.isEmpty() || before.size() != after.size()) {
            return 0;
        }
        for (int k = 0; k < before.size(); k++) {
            assertThat(after.get(k)).as("%s: %s of %s, then %s of %s", what, before, less, after, more).isGreaterThanOrEqualTo(before.get(k) * (1 - EXACT));
        }
        return after.equals(before) ? 0 : 1;
    }

    /** The boards cover their posts: where a wider board begins to cover posts that stood free, the wind on the posts falls and so may the footing. */
    @ParameterizedTest
    @ValueSource(strings = {"post-sign", "hoarding", "banner-fence", "facade-panel", "projecting-sign"})
    void moreWindOrBoardNeverAsksForLess(String kind) {
        Random random = new Random(kind.length());
        int grown = 0;
        for (int i = 0; i < 250; i++) {
            Draw draw = Draw.of(random, kind);
            grown += neverLess(draw.job(), draw.faster(1.15).job(), "faster");
            if (List.of("post-sign", "facade-panel", "projecting-sign").contains(kind)) {
                grown += neverLess(draw.job(), draw.wider(1.2).job(), "wider");
                grown += neverLess(draw.job(), draw.higher(0.5).job(), "higher up");
            }
        }
        assertThat(grown).as("it matters").isGreaterThan(150);
    }

    /** A check that is met names a demand not above its capacity, and the share is their ratio. */
    @ParameterizedTest
    @ValueSource(longs = {5})
    void sharesAreDemandOverCapacity(long seed) {
        Random random = new Random(seed);
        for (int i = 0; i < 200; i++) {
            String job = Draw.of(random, any(random, "post-sign", "hoarding", "banner-fence", "facade-panel")).job();
            for (Check check : tried(job).map(r -> carried(r, job).checks()).orElse(List.of())) {
                if (check.utilisation() < Check.MOST && check.demand() > 0) {
                    near(check.utilisation(), check.demand() / check.capacity(), check.name() + " of " + job);
                }
                assertThat(check.passes()).isEqualTo(check.utilisation() <= 1 + EXACT);
            }
        }
    }
}
