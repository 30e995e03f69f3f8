package broadside.support;

import static broadside.support.Stands.RULES;
import static broadside.support.Stands.STABILITY;
import static broadside.support.Stands.brace;
import static broadside.support.Stands.feet;
import static broadside.support.Stands.fixings;
import static broadside.support.Stands.friction;
import static broadside.support.Stands.in;
import static broadside.support.Stands.kentledge;
import static broadside.support.Stands.mass;
import static broadside.support.Stands.staked;
import static broadside.support.Stands.wind;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.panel.FenceFeet;
import broadside.panel.ProjectingSign.Brackets;
import broadside.quantity.Length;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** What must hold for any ballast and any fixings, tried on random ones from fixed seeds. */
class StabilityPropertyTest {

    private static final int TRIES = 20_000;
    private static final FenceStability FENCES = new FenceStability(STABILITY);
    private static final KentledgeStability KENTLEDGE = new KentledgeStability(STABILITY);

    /** One random fence; the blocks and the mass on the brace can be set. */
    private record Case(double panel, double foot, double length, double mu, double reach, double stake, String rule, WindLevels levels, double force,
        double height) {

        static Case random(Random random, boolean braced) {
            double length = 0.3 + random.nextDouble();
            return new Case(random.nextInt(4) == 0 ? 0 : 40 * random.nextDouble(), random.nextInt(4) == 0 ? 0 : 40 * random.nextDouble(), length, 0.05
                + 0.9 * random.nextDouble(),
                braced ? length / 2 + 0.1 + 2 * random.nextDouble() : 0, random.nextInt(3) == 0 ? 2000 * random.nextDouble() + 1 : 0,
                RULES.keys().get(random.nextInt(RULES.keys().size())), new WindLevels(0.5 + random.nextDouble(), 1 + random.nextDouble(), "any", Status.READ),
                3000 * random.nextDouble(), 0.2 + 2 * random.nextDouble());
        }

        StabilityResult with(double times, double onBrace, double... blocks) {
            FenceFeet feet = feet(panel, foot, length, friction(mu), reach > 0 ? brace(reach, onBrace) : Optional.empty(), blocks);
            Trace trace = new Trace();
            return FENCES.assess(stake > 0 ? staked(feet, stake, 2) : feet, 3.5, List.of(wind("any", times * force, height, true, trace)), RULES.of(rule),
                levels, trace);
        }
    }

    private static void noneBelow(StabilityResult more, StabilityResult less, String what) {
        for (int i = 0; i < less.panels().get(0).turns().size(); i++) {
            assertThat(more.panels().get(0).turns().get(i).ratio()).as(what).isGreaterThanOrEqualTo(less.panels().get(0).turns().get(i).ratio() * (1 - 1e-12));
        }
        assertThat(more.panels().get(0).sliding()).as(what).isGreaterThanOrEqualTo(less.panels().get(0).sliding() * (1 - 1e-12));
    }

    @Test
    void moreBallastNeverLowersARatioAndMoreWindNeverRaisesIt() {
        Random random = new Random(1);
        for (int i = 0; i < TRIES / 4; i++) {
            Case any = Case.random(random, i % 2 == 0);
            double block = 100 * random.nextDouble();
            double lever = random.nextDouble() - 0.5;
            StabilityResult base = any.with(1, 50, block, lever);
            noneBelow(any.with(1, 50, block + 20, lever), base, "a heavier block");
            noneBelow(any.with(1, 80, block, lever), base, "more on the brace");
            noneBelow(base, any.with(1.3, 50, block, lever), "more wind");
        }
    }

    @Test
    void whatIsFoundHoldsAndALittleLessDoesNot() {
        Random random = new Random(2);
        int needed = 0;
        for (int i = 0; i < TRIES; i++) {
            Case any = Case.random(random, i % 2 == 0);
            BallastNeed need = any.with(1, 0).need();
            assertThat(any.with(1, need.brace() * (1 + 1e-9), need.line() * (1 + 1e-9), 0).checks()).as("%s %s", any, need).allMatch(Check::passes);
            if (need.total() > 1) {
                needed++;
                assertThat(any.with(1, need.brace() * 0.99, need.line() * 0.99, 0).checks()).as("%s %s", any, need).anyMatch(c -> c.utilisation() > 1 + 1e-6);
            }
        }
        assertThat(needed).isGreaterThan(TRIES / 2);
    }

    @Test
    void kentledgeThatIsFoundHoldsAndALittleLessDoesNot() {
        Random random = new Random(3);
        for (int i = 0; i < TRIES / 2; i++) {
            double lever = 0.5 + 3 * random.nextDouble();
            double face = random.nextInt(4) == 0 ? 0 : 300 * random.nextDouble();
            double mu = 0.05 + 0.9 * random.nextDouble();
            double force = 10 + 5000 * random.nextDouble();
            String rule = RULES.keys().get(random.nextInt(RULES.keys().size()));
            BallastNeed need = hoarding(0, lever, 0, face, mu, force, rule).need();
            StabilityResult held = hoarding(need.brace() * (1 + 1e-9), lever, need.line() * (1 + 1e-9), face, mu, force, rule);
            assertThat(held.checks()).allMatch(Check::passes);
            assertThat(hoarding(need.brace() * 0.99, lever, need.line() * 0.99, face, mu, force, rule).checks()).anyMatch(c -> c.utilisation() > 1 + 1e-6);
            noneBelow(hoarding(need.brace() + 50, lever, need.line() + 50, face, mu, force, rule), held, "more kentledge");
            noneBelow(held, hoarding(need.brace() * (1 + 1e-9), lever, need.line() * (1 + 1e-9), face, mu, force * 1.2, rule), "more wind");
        }
    }

    private static StabilityResult hoarding(double mass, double lever, double front, double face, double mu, double force, String rule) {
        Trace trace = new Trace();
        return KENTLEDGE.assess(kentledge(mass, lever, front, face, mu), 2.4, List.of(wind("any", force, 1.2, true, trace)), RULES.of(rule), Stands.PLAIN,
            trace);
    }

    /** Forces and moments of a group about its centroid give the load back. */
    @Test
    void theForcesOfAGroupAreTheLoad() {
        Random random = new Random(4);
        for (int i = 0; i < TRIES; i++) {
            List<EccentricGroup.At> places = new ArrayList<>();
            for (int k = 0; k < 2 + random.nextInt(8); k++) {
                places.add(new EccentricGroup.At(random.nextDouble(), random.nextDouble()));
            }
            double x = random.nextDouble() * 2000 - 1000;
            double y = random.nextDouble() * 2000 - 1000;
            double m = random.nextInt(5) == 0 ? 0 : random.nextDouble() * 2000 - 1000;
            Trace trace = new Trace();
            EccentricGroup.Result result = EccentricGroup.of(places, new EccentricGroup.Load(in("P_x", x, "N", trace), in("P_y", y, "N", trace), in("M_1", m,
                "N m", trace)), trace);
            double cx = places.stream().mapToDouble(EccentricGroup.At::x).average().orElseThrow();
            double cy = places.stream().mapToDouble(EccentricGroup.At::y).average().orElseThrow();
            double back = 0;
            double most = 0;
            for (int k = 0; k < places.size(); k++) {
                EccentricGroup.At force = result.forces().get(k);
                back += force.y() * (places.get(k).x() - cx) - force.x() * (places.get(k).y() - cy);
                most = Math.max(most, Math.hypot(force.x(), force.y()));
            }
            assertThat(result.forces().stream().mapToDouble(EccentricGroup.At::x).sum()).isCloseTo(x, within(1e-6));
            assertThat(result.forces().stream().mapToDouble(EccentricGroup.At::y).sum()).isCloseTo(y, within(1e-6));
            assertThat(back).isCloseTo(m, within(1e-6));
            assertThat(result.most()).isCloseTo(most, within(1e-6 * Math.max(1, most)));
        }
    }

    /** Without edges and without a rail over several spans the shares of a grid add up to the suction; the hardest takes at least the mean. */
    @Test
    void noFixingTakesLessThanTheMeanAndMoreSuctionPullsMore() {
        Random random = new Random(5);
        for (int i = 0; i < TRIES; i++) {
            int columns = 1 + random.nextInt(5);
            int rows = 1 + random.nextInt(5);
            double across = 0.1 + random.nextDouble();
            double along = 0.1 + random.nextDouble();
            double width = (columns - 1) * across + 0.05 + random.nextDouble();
            double height = (rows - 1) * along + 0.05 + random.nextDouble();
            double suction = 2000 * random.nextDouble();
            double mean = suction * width * height / (columns * rows);
            double pull = pull(columns, rows, across, along, width, height, suction);
            assertThat(pull).isFinite().isGreaterThanOrEqualTo(mean * (1 - 1e-9));
            assertThat(pull(columns, rows, across, along, width, height, suction * 1.1)).isGreaterThanOrEqualTo(pull);
            Trace trace = new Trace();
            FixingPulls blade = new BracketFixings(STABILITY).assess(fixings(columns, rows, across, along), new Brackets(1 + random.nextInt(3),
                Optional.of(Length.metres(along))),
                new BracketFixings.BladeLoad(in("F_w", suction, "N", trace), in("F_e", across, "N", trace), width, mass(height)), trace);
            assertThat(blade.shear()).isFinite();
            assertThat(blade.tension().isPresent()).isEqualTo(columns > 1 && (rows > 1 || trace.find("fixing-tension/weight").isPresent()));
        }
    }

    private static double pull(int columns, int rows, double across, double along, double width, double height, double suction) {
        Trace trace = new Trace();
        return new FixingGroup(STABILITY).assess(fixings(columns, rows, across, along), new FixingGroup.PanelLoad(in("p_s", suction, "Pa", trace), width,
            height, 0.1, 0, mass(20),
            in("S", 10, "N", trace)), FixingGroup.Sharing.BY_AREA, trace).tension().orElseThrow();
    }
}
