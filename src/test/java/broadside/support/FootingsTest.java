package broadside.support;

import static broadside.support.GroundCases.FOOTINGS;
import static broadside.support.GroundCases.footing;
import static broadside.support.GroundCases.load;
import static broadside.support.GroundCases.request;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.Footing;
import broadside.panel.Footing.Kind;
import broadside.support.Footings.Request;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Which rule holds, what is sized, what is said. */
class FootingsTest {

    private static FootingResult hold(Kind kind, boolean round, Map<String, String> answers, FootLoad... loads) {
        return FOOTINGS.hold(request(footing(kind, round, answers), loads), new Trace());
    }

    private static FootingResult planted(Map<String, String> answers) {
        return hold(Kind.PLANTED, true, answers, load(3000, 7500));
    }

    private static String rule(Map<String, String> answers) {
        return planted(answers).rule();
    }

    @Test
    void theRuleThatFitsWhatIsKnown() {
        assertThat(rule(Map.of("cohesion", "40 kPa", "friction-angle", "30 deg"))).contains("clay");
        assertThat(rule(Map.of("friction-angle", "30 deg", "ground", "sand"))).contains("sand");
        assertThat(rule(Map.of("lateral", "20 kPa/m"))).startsWith("IBC");
        assertThat(rule(Map.of("ground", "Gravel"))).startsWith("IBC");
        assertThat(rule(Map.of("ground", "class 4"))).startsWith("IBC");
        assertThat(rule(Map.of("ground", "average"))).startsWith("PD 6547");
        assertThat(rule(Map.of())).startsWith("PD 6547");
        assertThat(rule(Map.of("rule", "ibc", "ground", "good"))).startsWith("IBC");
        assertThat(rule(Map.of("rule", "ground-factor", "ground", "sand"))).startsWith("PD 6547");
    }

    /** Nothing known: poor ground in Europe, class 5 in the United States, and both say so. */
    @Test
    void unknownGroundIsTheWorst() {
        Footing unknown = footing(Kind.PLANTED, true, Map.of("width", "0.5 m"));
        Trace en = new Trace();
        FootingResult europe = FOOTINGS.hold(request(unknown, load(3000, 7500)), en);
        assertThat(en.find("ground-factor").orElseThrow().value()).isEqualTo(230e3);
        assertThat(europe.assumed()).anySatisfy(a -> assertThat(a.text()).contains("assumed to be poor"));
        for (String route : List.of("us-asd", "us-strength")) {
            Trace us = new Trace();
            FootingResult states = FOOTINGS.hold(new Request(Optional.of(unknown), List.of(load(3000, 7500)), 0, 0, GroundCases.LEVELS,
                GroundCases.GLOBAL, route, 0.1, false), us);
            assertThat(us.find("lateral-bearing").orElseThrow().value()).isCloseTo(15708.7, within(0.1));
            assertThat(states.assumed()).anySatisfy(a -> assertThat(a.text()).contains("class 5"));
        }
    }

    /** No footing at all: planted in 0.45 m of concrete, sized; the volume of the hole is 0.1590 m2 by the depth. */
    @Test
    void noFootingGiven() {
        Trace trace = new Trace();
        FootingResult result = FOOTINGS.hold(new Request(Optional.empty(), List.of(load(3000, 7500)), 0, 120, GroundCases.LEVELS, GroundCases.GLOBAL,
            "en", 0.1, false), trace);
        assertThat(result.kind()).isEqualTo(Kind.PLANTED);
        assertThat(result.sized()).isTrue();
        assertThat(result.width()).isEqualTo(0.45);
        assertThat(result.concrete()).isCloseTo(0.159043 * result.depth(), within(1e-6));
        assertThat(result.assumed()).extracting(Assumed::text).anyMatch(t -> t.contains("No footing was given")).anyMatch(t -> t.contains("450 mm"));
        assertThat(trace.find("footing-torsion").orElseThrow().value()).isEqualTo(120);
        assertThat(result.remarks()).contains("Torsion of the footing is shown and not checked.");
        assertThat(result.passes()).isTrue();
    }

    /** 4.5 kN and 11.25 kN m at the level of strength, b = 0.5 m, average: 15600 P³ = 11 250 + 3181.98 P gives P = 0.9678 m: 1.00 m. */
    @Test
    void sizedByTheGroundFactor() {
        Trace trace = new Trace();
        FootingResult result = FOOTINGS.hold(request(footing(Kind.PIER, true, Map.of("width", "0.5 m", "ground", "average")), load(3000, 7500)), trace);
        double p = trace.find("embedment-depth").orElseThrow().value();
        assertThat(15600 * p * p * p).isCloseTo(11250 + 4500 * p / Math.sqrt(2), within(1e-3));
        assertThat(result.depth()).isEqualTo(1.0);
        assertThat(result.checks()).singleElement().satisfies(c -> assertThat(c.utilisation()).isCloseTo((11250 + 3181.98) / 15600, within(1e-5)));
    }

    /** Small loads: 1.5 times the width by the ground factor, 0.3 m by the others. */
    @Test
    void theLeastDepths() {
        assertThat(hold(Kind.PIER, true, Map.of("width", "0.5 m", "ground", "good"), load(1, 1)).depth()).isEqualTo(0.75);
        assertThat(hold(Kind.PIER, true, Map.of("width", "0.5 m", "ground", "gravel"), load(1, 1)).depth()).isEqualTo(0.3);
        assertThat(hold(Kind.PIER, true, Map.of("width", "0.5 m", "ground", "gravel"), load(0, 0)).depth()).isEqualTo(0.3);
        assertThat(hold(Kind.PIER, true, Map.of("width", "0.5 m", "depth", "0.7 m", "ground", "good"), load(1, 1)).remarks())
            .anyMatch(r -> r.contains("1.5 times the width"));
    }

    /** Service load for IBC: 3 kN and 7.5 kN m; the check at the depth chosen is that of the same depth typed. */
    @ParameterizedTest
    @CsvSource({"ground, gravel", "ground, average", "cohesion, 40 kPa", "friction-angle, 32 deg", "lateral, 150 psf/ft"})
    void aCheckedSizeIsTheSizedOne(String name, String value) {
        FootingResult sized = planted(Map.of("width", "0.5 m", name, value));
        FootingResult typed = planted(Map.of("width", "0.5 m", name, value, "depth", sized.depth() + " m"));
        assertThat(sized.passes()).isTrue();
        assertThat(typed.sized()).isFalse();
        assertThat(typed.checks().get(0).utilisation()).isCloseTo(sized.checks().get(0).utilisation(), within(1e-12));
        FootingResult less = planted(Map.of("width", "0.5 m", name, value, "depth", sized.depth() - 0.05 + " m"));
        assertThat(less.passes()).as("a step less does not hold").isFalse();
    }

    /** A square pad is sized in steps of 50 mm: a step less fails one of the checks. */
    @ParameterizedTest
    @CsvSource({"sand", "clay", "rock", "poor"})
    void aCheckedPadIsTheSizedOne(String ground) {
        FootingResult sized = hold(Kind.PAD, false, Map.of("ground", ground, "depth", "0.5 m"), load(3000, 7500));
        assertThat(sized.passes()).isTrue();
        assertThat(sized.checks()).extracting(Check::name).containsExactly("overturning", "sliding", "bearing");
        assertThat(sized.width() / 0.05).isCloseTo(Math.rint(sized.width() / 0.05), within(1e-9));
        FootingResult typed = hold(Kind.PAD, false, Map.of("ground", ground, "depth", "0.5 m", "width", sized.width() + " m"), load(3000, 7500));
        for (int i = 0; i < 3; i++) {
            assertThat(typed.checks().get(i).utilisation()).isCloseTo(sized.checks().get(i).utilisation(), within(1e-12));
        }
        FootingResult less = hold(Kind.PAD, false, Map.of("ground", ground, "depth", "0.5 m", "width", sized.width() - 0.05 + " m"), load(3000, 7500));
        assertThat(less.passes()).isFalse();
    }

    /** The worst case governs each check: one with the greatest shear for sliding, one with the greatest moment for overturning. */
    @Test
    void eachCheckNamesItsCase() {
        FootingResult pad = hold(Kind.PAD, false, Map.of("ground", "sand", "width", "1.6 m", "depth", "0.5 m"), new FootLoad("low", 4000, 3000),
            new FootLoad("high", 1000, 9000));
        assertThat(pad.checks()).extracting(Check::named).containsExactly("high", "low", "high");
    }

    @Test
    void groundsWithoutPresumptiveValues() {
        for (String ground : List.of("mud", "organic", "fill", "peat")) {
            for (Kind kind : Kind.values()) {
                assertThatThrownBy(() -> hold(kind, false, Map.of("ground", ground), load(100, 100))).isInstanceOf(NoAnswer.class)
                    .hasMessageContaining("no presumptive value");
            }
        }
        assertThat(planted(Map.of("ground", "fill", "cohesion", "20 kPa")).assumed()).anyMatch(a -> a.warns() && a.text().contains("must come from tests"));
        assertThatThrownBy(() -> planted(Map.of("ground", "lava"))).isInstanceOf(UnfitAnswer.class).hasMessageContaining("none of rock, soft rock");
    }

    @ParameterizedTest
    @CsvSource({
        "PLANTED, width, 0 m, footing.width", "PLANTED, width, 0.1 m, footing.width", "PIER, depth, 0 m, footing.depth", "PIER, depth, -1 m, footing.depth",
        "PAD, width, 0 m, footing.width", "PAD, width, 0.1 m, footing.width", "PAD, length, 0.1 m, footing.length", "PAD, depth, -0.5 m, footing.depth",
        "PIER, rule, guess, footing.rule", "PIER, rule, broms-clay, footing.cohesion", "PIER, rule, broms-sand, footing.friction-angle",
        "PIER, lateral, 0 kPa/m, footing.lateral-bearing", "PAD, bearing, 0 kPa, footing.bearing", "PAD, friction, 0, footing.friction",
        "PIER, cohesion, 0 kPa, footing.cohesion", "PIER, friction-angle, 15 deg, footing.friction-angle"})
    void answersThatDoNotFit(Kind kind, String name, String value, String field) {
        assertThatThrownBy(() -> hold(kind, false, Map.of(name, value), load(1000, 2000))).isInstanceOfSatisfying(UnfitAnswer.class,
            e -> assertThat(e.field()).isEqualTo(field));
    }

    @Test
    void padsThatCannotBe() {
        assertThatThrownBy(() -> hold(Kind.PAD, true, Map.of(), load(1000, 2000))).isInstanceOfSatisfying(UnfitAnswer.class,
            e -> assertThat(e.field()).isEqualTo("footing.shape"));
        assertThatThrownBy(() -> hold(Kind.PAD, false, Map.of("depth", "5 m"), load(1000, 2000))).as("its own weight is too much for the ground")
            .isInstanceOf(NoAnswer.class).hasMessageContaining("no pad of this depth");
        assertThatThrownBy(() -> hold(Kind.PIER, true, Map.of("rule", "broms-clay", "cohesion", "0.001 Pa"), load(1000, 2000))).isInstanceOf(NoAnswer.class)
            .hasMessageContaining("6 m deep does not hold");
        FootingResult over = hold(Kind.PAD, false, Map.of("width", "0.5 m", "depth", "0.5 m"), load(3000, 7500));
        assertThat(over.checks()).extracting(Check::passes).containsExactly(false, false, false);
        assertThat(over.checks().get(2).utilisation()).isEqualTo(Check.MOST);
    }

    @Test
    void theGroundAroundIsSpokenOf() {
        FootingResult bare = planted(Map.of("ground", "sand"));
        assertThat(bare.assumed()).extracting(Assumed::text).anyMatch(t -> t.contains("flat")).anyMatch(t -> t.contains("water"))
            .anyMatch(t -> t.contains("services"));
        FootingResult told = planted(Map.of("ground", "sand", "slope", "sloping", "water", "high", "services", "not located", "frost", "9 m",
            "paved", "", "doubled", "",
            "increased", ""));
        assertThat(told.assumed()).filteredOn(Assumed::warns).extracting(Assumed::text).anyMatch(t -> t.contains("slopes")).anyMatch(t -> t.contains("water"))
            .anyMatch(t -> t.contains("do not dig")).anyMatch(t -> t.contains("frost"));
        assertThat(told.remarks()).anyMatch(t -> t.contains("pavement must be rigid")).anyMatch(t -> t.contains("doubling")).anyMatch(t -> t.contains("one third"));
        FootingResult calm = planted(Map.of("ground", "sand", "slope", "flat", "water", "deep", "services", "located", "frost", "0.1 m", "width", "0.5 m"));
        assertThat(calm.assumed()).isEmpty();
        assertThat(calm.remarks()).isEmpty();
        FootingResult both = planted(Map.of("ground", "sand", "doubled", "", "increased", ""));
        assertThat(both.remarks()).anyMatch(t -> t.contains("on top of the doubling"));
    }

    /** Paved needs less, doubled needs less; high water needs more of a pad and of sand. */
    @Test
    void whatHelpsAndWhatHarms() {
        double plain = planted(Map.of("ground", "sand")).depth();
        assertThat(planted(Map.of("ground", "sand", "paved", "")).depth()).isLessThan(plain);
        assertThat(planted(Map.of("ground", "sand", "doubled", "")).depth()).isLessThan(plain);
        assertThat(planted(Map.of("friction-angle", "30 deg", "water", "high")).depth()).isGreaterThan(planted(Map.of("friction-angle", "30 deg")).depth());
        assertThat(hold(Kind.PAD, false, Map.of("ground", "sand", "water", "high"), load(3000, 7500)).width())
            .isGreaterThan(hold(Kind.PAD, false, Map.of("ground", "sand"), load(3000, 7500)).width());
    }
}
