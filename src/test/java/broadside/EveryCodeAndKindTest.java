package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.assess.ItemResult;
import broadside.assess.ItemResult.Outcome;
import broadside.assess.Loads;
import broadside.trace.Step;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** What holds for every code and every kind of item, on random items from a seed. */
class EveryCodeAndKindTest {

    private static final int SEEDS = 12;
    private static final List<String> KINDS = List.of("post-sign", "stack", "hoarding", "banner-fence", "facade-panel", "projecting-sign", "spanned-banner");

    static Stream<Arguments> all() {
        List<Arguments> all = new ArrayList<>();
        for (String[] code : JobTexts.CODES) {
            for (String kind : KINDS) {
                all.add(Arguments.of(code[0], code[1], kind));
            }
        }
        return all.stream();
    }

    /** A random item; {@code m} makes the text of a length in metres or in feet. */
    private static String item(String kind, Random random, Lengths m) {
        String text = switch (kind) {
            case "post-sign" -> "'boards': [{'width': '%s', 'height': '%s', 'clearance': '%s', 'offset': '%s', 'depth': '%s'}], 'posts': {'count': 2, 'spacing': '%s', 'section': 'CHS 114.3x5'}"
                .formatted(m.of(random, 1, 5), m.of(random, 0.6, 2.5), m.of(random, 1.5, 4), m.of(random, -0.5, 0.5), m.of(random, 0.02, 0.3), m.of(random, 0.8, 2));
            case "stack" -> "'boards': [{'width': '%s', 'height': '1 m', 'clearance': '4.2 m'}, {'width': '%s', 'height': '1 m', 'clearance': '3 m'}], 'posts': {'count': 1}"
                .formatted(m.of(random, 1, 3), m.of(random, 1, 3));
            case "hoarding" -> "'length': '%s', 'height': '%s', 'posts': {'spacing': '%s'}".formatted(m.of(random, 6, 60), m.of(random, 1.5, 3), m.of(random, 1.5, 3));
            case "banner-fence" -> "'panel-length': '%s', 'panel-height': '2 m', 'panels': %d, 'cover-solidity': 1.0, 'fence-solidity': 0.25"
                .formatted(m.of(random, 2, 3.5), 2 + random.nextInt(30));
            case "facade-panel" -> ("'backing': '%s', 'width': '%s', 'height': '%s', 'bottom': '%s', 'distance-from-corner': '%s', "
                + "'building': {'width': '30 m', 'depth': '20 m', 'height': '12 m', 'roof-slope': '20 deg'}")
                .formatted(random.nextBoolean() ? "wall" : "skin", m.of(random, 0.8, 4), m.of(random, 0.8, 3), m.of(random, 1, 7), m.of(random, 0, 12));
            case "projecting-sign" -> "'projection': '%s', 'height': '%s', 'bottom': '%s', 'gap': '%s', 'depth': '0.12 m', 'mass': '30 kg', 'brackets': {'count': 2, 'spacing': '1 m'}"
                .formatted(m.of(random, 0.5, 1.2), m.of(random, 0.8, 2.5), m.of(random, 2.8, 6), m.of(random, 0.02, 0.3));
            default -> "'width': '%s', 'height': '%s', 'bottom': '%s', 'sag': '%s'".formatted(m.of(random, 3, 12), m.of(random, 0.6, 2), m.of(random, 2.5, 6), m.of(random, 0.1, 1));
        };
        return "{'mark': 'X1', 'kind': '" + (kind.equals("stack") ? "post-sign" : kind) + "', " + text + "}";
    }

    /** How a random length is written. */
    private interface Lengths {
        String of(Random random, double least, double most);

        static double value(Random random, double least, double most) {
            return Math.round((least + random.nextDouble() * (most - least)) * 1000) / 1000.0;
        }
    }

    private static final Lengths METRES = (r, a, b) -> Lengths.value(r, a, b) + " m";
    private static final Lengths FEET = (r, a, b) -> String.format(Locale.ROOT, "%.12f ft", Lengths.value(r, a, b) / 0.3048);

    private static String faster(String site, double factor) {
        java.util.regex.Matcher found = java.util.regex.Pattern.compile("speed': '([0-9.]+) m/s'").matcher(site);
        if (!found.find()) {
            throw new IllegalArgumentException(site);
        }
        return site.replace(found.group(), "speed': '" + Double.parseDouble(found.group(1)) * factor + " m/s'");
    }

    private static Optional<Loads> loads(String key, String site, String item) {
        ItemResult result = JobTexts.result(key, site, item);
        assertThat(result.outcome()).isNotEqualTo(Outcome.OUTSIDE_SCOPE);
        return result.loads();
    }

    private static double force(Loads loads) {
        return loads.governs("base-shear").force();
    }

    /** Every result is finite, every governing load is the greatest, and a code that does not cover the kind says so for every item of it. */
    @ParameterizedTest(name = "{2} by {0}")
    @MethodSource("all")
    void numbers_are_finite_and_governing_loads_are_the_greatest(String key, String site, String kind) {
        for (int seed = 0; seed < SEEDS; seed++) {
            ItemResult result = JobTexts.result(key, site, item(kind, new Random(seed), METRES));
            for (Step step : result.sheet().steps()) {
                assertThat(step.value()).as(step.name()).isFinite();
            }
            if (result.loads().isEmpty()) {
                assertThat(result.refusal().orElseThrow().reason()).isNotBlank();
                boolean narrowBlade = kind.equals("projecting-sign") && result.refusal().get().reason().contains("narrower than");
                assertThat(narrowBlade || kind.equals("facade-panel") && key.startsWith("open-flow")).as(kind + " by " + key).isTrue();
                continue;
            }
            Loads loads = result.loads().get();
            for (CaseAction each : loads.cases()) {
                if (!each.state().equals("bare-fence")) {
                    assertThat(loads.governs("base-shear").baseShear()).isGreaterThanOrEqualTo(each.baseShear() * (1 - 1e-9));
                    assertThat(loads.governs("base-moment").baseMoment()).isGreaterThanOrEqualTo(each.baseMoment() * (1 - 1e-9));
                }
            }
        }
    }

    /** Where no least pressure governs, 1.3 times the speed gives 1.69 times the force. */
    @ParameterizedTest(name = "{2} by {0}")
    @MethodSource("all")
    void force_grows_with_the_square_of_the_speed(String key, String site, String kind) {
        for (int seed = 0; seed < SEEDS; seed++) {
            String item = item(kind, new Random(seed), METRES);
            Optional<Loads> slow = loads(key, faster(site, 1.25), item);
            Optional<Loads> fast = loads(key, faster(site, 1.25 * 1.2), item);
            if (slow.isPresent()) {
                double ratio = force(fast.orElseThrow()) / force(slow.get());
                boolean least = JobTexts.result(key, faster(site, 1.25), item).sheet().steps().stream().anyMatch(s -> s.name().startsWith("minimum-"));
                assertThat(ratio).as(item).isCloseTo(1.44, within(least ? 0.2 : 1e-9));
            }
        }
    }

    /** The same item typed in feet gives the same loads. */
    @ParameterizedTest(name = "{2} by {0}")
    @MethodSource("all")
    void feet_and_metres_give_the_same_loads(String key, String site, String kind) {
        for (int seed = 0; seed < SEEDS; seed++) {
            Optional<Loads> metres = loads(key, site, item(kind, new Random(seed), METRES));
            Optional<Loads> feet = loads(key, site, item(kind, new Random(seed), FEET));
            assertThat(feet.isPresent()).isEqualTo(metres.isPresent());
            metres.ifPresent(m -> {
                assertThat(force(feet.orElseThrow())).isCloseTo(force(m), within(1e-9 * force(m)));
                assertThat(feet.get().governs("base-moment").baseMoment()).isCloseTo(m.governs("base-moment").baseMoment(),
                    within(1e-9 * Math.max(1, m.governs("base-moment").baseMoment())));
            });
        }
    }

    /** An answer that is not known never lowers the load. */
    @ParameterizedTest(name = "{2} by {0}")
    @MethodSource("all")
    void not_knowing_never_lowers_the_load(String key, String site, String kind) {
        for (int seed = 0; seed < SEEDS / 3; seed++) {
            String item = item(kind, new Random(seed), METRES);
            Optional<Loads> known = loads(key, site, item);
            Optional<Loads> shape = loads(key, site + ", 'ground-nearby': 'unknown'", item);
            Optional<Loads> terrain = loads(key, site.replaceAll("'terrain': '[^']*'", "'terrain': 'unknown'"), item);
            known.ifPresent(k -> {
                shape.ifPresent(s -> assertThat(force(s)).as("ground").isGreaterThanOrEqualTo(force(k) * (1 - 1e-9)));
                terrain.ifPresent(t -> assertThat(force(t)).as("terrain").isGreaterThanOrEqualTo(force(k) * (1 - 1e-9)));
            });
        }
    }

    /** The wind on the posts is its own line and only adds. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("codes")
    void wind_on_the_posts_only_adds(String key, String site) {
        for (int seed = 0; seed < SEEDS; seed++) {
            String with = item("post-sign", new Random(seed), METRES);
            Loads bare = loads(key, site, with.replace(", 'section': 'CHS 114.3x5'", "")).orElseThrow();
            Loads posts = loads(key, site, with).orElseThrow();
            assertThat(bare.supports().drag()).isEmpty();
            double drag = posts.supports().drag().orElseThrow().force();
            assertThat(drag).isPositive();
            assertThat(posts.governs("base-shear").baseShear()).isCloseTo(bare.governs("base-shear").baseShear() + drag, within(1e-9 * drag + 1e-6));
            assertThat(posts.governs("base-moment").baseMoment()).isGreaterThan(bare.governs("base-moment").baseMoment());
            assertThat(force(posts)).isEqualTo(force(bare));
            for (int i = 0; i < 2; i++) {
                assertThat(posts.posts().get(i).moment()).isGreaterThan(bare.posts().get(i).moment());
            }
        }
    }

    static Stream<Arguments> codes() {
        return JobTexts.CODES.stream().map(c -> Arguments.of(c[0], c[1]));
    }
}
