package broadside.support;

import static broadside.support.GroundCases.FOOTINGS;
import static broadside.support.GroundCases.footing;
import static broadside.support.GroundCases.request;
import static org.assertj.core.api.Assertions.assertThat;

import broadside.panel.Footing;
import broadside.panel.Footing.Kind;
import broadside.trace.Trace;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** What must hold for any footing, tried on random ones from fixed seeds. */
class FootingPropertyTest {

    private static final List<Map<String, String>> SOILS = List.of(Map.of("ground", "gravel"), Map.of("ground", "clay", "doubled", ""),
        Map.of("ground", "sand", "paved", "", "increased", ""), Map.of("ground", "average"), Map.of(), Map.of("cohesion", "35 kPa"),
        Map.of("friction-angle", "28 deg", "water", "high"), Map.of("lateral", "150 psf/ft", "doubled", "", "increased", ""));

    private static Footing random(Random random) {
        Map<String, String> answers = new HashMap<>(SOILS.get(random.nextInt(SOILS.size())));
        Kind kind = Kind.values()[random.nextInt(3)];
        if (random.nextBoolean()) {
            answers.put("width", Math.exp(-1.5 + 2.5 * random.nextDouble()) + " m");
        }
        if (random.nextInt(3) == 0) {
            answers.put("depth", Math.exp(-2 + 3 * random.nextDouble()) + " m");
        }
        return footing(kind, kind != Kind.PAD && random.nextBoolean(), answers);
    }

    /** From nothing to a million N and N m; many of them no footing can hold, and then it says so. */
    @Test
    void noLoadLeadsToANumberThatIsNone() {
        Random random = new Random(7);
        int held = 0;
        for (int i = 0; i < 20_000; i++) {
            double shear = random.nextInt(20) == 0 ? 0 : Math.exp(-20 + 34 * random.nextDouble());
            double moment = random.nextInt(20) == 0 ? 0 : Math.exp(-20 + 34 * random.nextDouble());
            try {
                FootingResult result = FOOTINGS.hold(request(random(random), new FootLoad("a", shear, moment), new FootLoad("b", moment, shear)),
                    new Trace());
                assertThat(List.of(result.depth(), result.width(), result.length(),
                    result.concrete())).allSatisfy(v -> assertThat(v).isFinite().isPositive());
                for (Check check : result.checks()) {
                    assertThat(check.utilisation()).isFinite().isBetween(0.0, Check.MOST);
                }
                if (result.sized()) {
                    assertThat(result.passes()).isTrue();
                }
                held++;
            } catch (UnfitAnswer e) {
                assertThat(e.field()).startsWith("footing.");
            } catch (NoAnswer e) {
                assertThat(e.getMessage()).contains("hold");
            }
        }
        assertThat(held).isGreaterThan(15_000);
    }

    /** More shear or more moment never leads to a smaller footing. */
    @Test
    void sizesGrowWithTheLoads() {
        Random random = new Random(8);
        int grown = 0;
        for (int i = 0; i < 3000; i++) {
            Map<String, String> soil = SOILS.get(random.nextInt(SOILS.size()));
            Kind kind = Kind.values()[random.nextInt(3)];
            Footing footing = footing(kind, kind != Kind.PAD, soil);
            double shear = 200 + 8000 * random.nextDouble();
            double moment = 200 + 20000 * random.nextDouble();
            FootingResult less = FOOTINGS.hold(request(footing, new FootLoad("wind", shear, moment)), new Trace());
            boolean push = random.nextBoolean();
            FootingResult more = FOOTINGS.hold(request(footing, new FootLoad("wind", push ? shear * 1.3 : shear, push ? moment : moment * 1.3)), new Trace());
            assertThat(more.depth()).isGreaterThanOrEqualTo(less.depth());
            assertThat(more.width()).isGreaterThanOrEqualTo(less.width());
            grown += more.depth() > less.depth() || more.width() > less.width() ? 1 : 0;
        }
        assertThat(grown).as("the loads matter").isGreaterThan(1000);
    }

    /** A typed footing of the size that was found gives the same checks. */
    @Test
    void aCheckedSizeIsTheSizedOne() {
        Random random = new Random(9);
        for (int i = 0; i < 2000; i++) {
            Map<String, String> answers = new HashMap<>(SOILS.get(random.nextInt(SOILS.size())));
            Kind kind = Kind.values()[random.nextInt(3)];
            FootLoad a = new FootLoad("a", 8000 * random.nextDouble(), 20000 * random.nextDouble());
            FootLoad b = new FootLoad("b", 8000 * random.nextDouble(), 20000 * random.nextDouble());
            FootingResult sized = FOOTINGS.hold(request(footing(kind, false, answers), a, b), new Trace());
            answers.put("depth", sized.depth() + " m");
            answers.put("width", sized.width() + " m");
            FootingResult typed = FOOTINGS.hold(request(footing(kind, false, answers), a, b), new Trace());
            assertThat(typed.passes()).isTrue();
            for (int j = 0; j < sized.checks().size(); j++) {
                assertThat(typed.checks().get(j).utilisation()).isCloseTo(sized.checks().get(j).utilisation(), org.assertj.core.api.Assertions.within(2e-9));
            }
        }
    }
}
