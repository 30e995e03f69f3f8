package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.assess.Limits;
import broadside.assess.Limits.Limit;
import broadside.job.JobText;
import broadside.quantity.Speed;
import broadside.support.Check;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Assessed in its limiting wind an item has a share of 1, and what holds better stands a stronger wind. */
class LimitTest {

    private static final int TRIES = Integer.getInteger("broadside.tries", 1500);

    private final Random random = new Random(5);

    private double between(double least, double most) {
        return Math.round((least + random.nextDouble() * (most - least)) * 100) / 100.0;
    }

    private String any(String... of) {
        return of[random.nextInt(of.length)];
    }

    /** A whole job; the speed is put in for %s. */
    private static String job(boolean en, String item) {
        return ("{'broadside': 1, 'basis': {'code': '" + (en ? "en-1991-1-4', 'edition': '2005" : "is-875-3', 'edition': '2015") + "'}, 'site': {'basic-speed': '%s m/s', 'averaging': '"
            + (en ? "10 min mean', 'terrain': 'II" : "3 s gust', 'terrain': '2") + "'}, 'items': [{'mark': 'X', " + item + "}]}").replace('\'', '"');
    }

    private static Job read(String job, double speed) {
        return AllJobs.TOOL.reader().read(JobText.read(job.formatted(Double.toString(speed)).getBytes(StandardCharsets.UTF_8))).orThrow();
    }

    private static Limits limits(String job, double speed) {
        Assessment with = AllJobs.TOOL.assessor().withLimits(AllJobs.assess(read(job, speed)));
        return with.items().get(0).limits().orElseThrow(() -> new AssertionError("no limits: " + job));
    }

    private String draw(int kind, double ballast) {
        return switch (kind) {
            case 0 -> "'kind': 'post-sign', 'boards': [{'width': '" + between(1, 4) + " m', 'height': '" + between(0.5, 2) + " m', 'clearance': '" + between(0.5, 3) + " m', 'offset': '"
                + between(0, 0.5) + " m', 'depth': '0.1 m', 'mass': '40 kg'}], 'posts': {'count': " + (1 + random.nextInt(2)) + ", 'spacing': '0.8 m', 'section': 'CHS 168.3x5', 'grade': 'S355'}, "
                + "'footing': {'kind': " + any("'planted', 'ground': 'average', 'width': '0.6 m', 'depth': '1.4 m'", "'pad', 'ground': 'sand', 'width': '2 m', 'length': '1.6 m', 'depth': '0.8 m'") + "}";
            case 1 -> "'kind': 'banner-fence', 'panel-length': '" + between(2, 4) + " m', 'panel-height': '" + between(1, 2.5) + " m', 'panels': " + (5 + random.nextInt(40)) + ", 'cover-solidity': "
                + any("1", "0.85") + ", 'panel-mass': '18 kg', 'foot-mass': '25 kg', 'foot-length': '0.65 m', 'ground': 'asphalt', 'blocks': [{'mass': '" + ballast + " kg', 'lever': '0 m'}]";
            case 2 -> "'kind': 'hoarding', 'length': '" + between(5, 40) + " m', 'height': '" + between(1.5, 3) + " m', 'posts': {'spacing': '2 m'}, 'ballast': {'mass': '" + 8 * ballast
                + " kg', 'lever': '1.5 m', 'front-mass': '" + 3 * ballast + " kg', 'face-mass': '100 kg', 'ground': 'concrete'}";
            default -> "'kind': 'projecting-sign', 'projection': '" + between(0.4, 1) + " m', 'height': '" + between(1, 3) + " m', 'bottom': '3 m', 'gap': '0.1 m', 'depth': '0.1 m', 'mass': '30 kg', "
                + "'brackets': {'count': 2, 'spacing': '0.8 m'}, 'fixings': {'columns': 2, 'rows': 2, 'horizontal-pitch': '0.1 m', 'vertical-pitch': '0.15 m', 'allowable-tension': '3 kN', "
                + "'allowable-shear': '2 kN'}";
        };
    }

    @Test
    void in_its_limiting_wind_the_share_is_one() {
        int seen = 0;
        for (int i = 0; i < TRIES; i++) {
            String job = job(i % 8 < 4 || i % 4 == 3, draw(i % 4, between(5, 200)));
            double speed = between(15, 50);
            for (Limit limit : limits(job, speed).list()) {
                if (limit.bySquare()) {
                    continue;
                }
                Job typed = read(job, speed);
                ItemResult back = AllJobs.assess(typed.withSite(typed.site().withSpeed(new Speed(speed * limit.multiple(), "")))).items().get(0);
                double share = back.loads().orElseThrow().carried().orElseThrow().checks().stream().filter(c -> c.name().equals(limit.check())
                    && c.named().contains("cover taken off") == limit.state().equals("cover taken off")).mapToDouble(Check::utilisation).max().orElseThrow();
                assertThat(share).as("%s at %s of %s in %s", limit.check(), limit.multiple(), speed, job).isCloseTo(1, within(1e-9));
                seen++;
            }
        }
        assertThat(seen).isGreaterThan(2 * TRIES);
    }

    /** The first check to fail does not depend on the speed that the job was typed with. */
    @Test
    void the_limit_is_the_same_whatever_wind_was_typed() {
        for (int i = 0; i < 60; i++) {
            String job = job(i % 2 == 0 || i % 4 == 3, draw(i % 4, between(5, 200)));
            Limit slow = limits(job, 18).first().orElseThrow();
            Limit fast = limits(job, 41).first().orElseThrow();
            assertThat(fast.inTheOpen()).as(job).isCloseTo(slow.inTheOpen(), within(1e-8 * slow.inTheOpen()));
            assertThat(fast.check()).isEqualTo(slow.check());
        }
    }

    @Test
    void more_ballast_never_lowers_the_limit() {
        for (int i = 0; i < 100; i++) {
            long seed = random.nextLong();
            double ballast = between(5, 150);
            random.setSeed(seed);
            String less = job(true, draw(1 + i % 2, ballast));
            random.setSeed(seed);
            String more = job(true, draw(1 + i % 2, ballast + 20));
            assertThat(limits(more, 26).first().orElseThrow().inTheOpen()).as(more).isGreaterThanOrEqualTo(limits(less, 26).first().orElseThrow().inTheOpen() * (1 - 1e-9));
        }
    }

    /**
     * One post, EN, terrain II, by hand: all shares go with the square of the wind but for the weight. Overturning of a fence on feet: R over M is the ratio, so
     * that the wind that uses it up is the typed one times the root of R/M; a mean of 26 m/s is a gust of 26 x 1.5128/1.0672 (Durst, as tabled) at 10 m.
     */
    @Test
    void a_fence_by_hand() {
        String job = job(true, "'kind': 'banner-fence', 'panel-length': '3.45 m', 'panel-height': '2 m', 'panels': 40, 'cover-solidity': 1, 'panel-mass': '18 kg', 'foot-mass': '25 kg', "
            + "'foot-length': '0.65 m', 'friction': 0.9");
        ItemResult at = AllJobs.assess(read(job, 26)).items().get(0);
        double share = at.loads().orElseThrow().carried().orElseThrow().checks().stream().filter(c -> c.name().equals("overturning") && !c.named().contains("taken off"))
            .mapToDouble(Check::utilisation).max().orElseThrow();
        Limit limit = limits(job, 26).list().stream().filter(l -> l.check().equals("overturning") && l.state().isEmpty()).findFirst().orElseThrow();
        assertThat(limit.multiple()).isCloseTo(1 / Math.sqrt(share), within(1e-9));
        assertThat(limit.mean()).isCloseTo(26 / Math.sqrt(share), within(1e-8));
        assertThat(limit.inTheOpen() / limit.mean()).isBetween(1.4, 1.5);
    }

    @Test
    void a_strength_level_is_brought_to_the_wind_that_blows() {
        String sign = "{'mark': 'X', 'kind': 'post-sign', 'boards': [{'width': '2 m', 'height': '1 m', 'clearance': '2 m', 'mass': '40 kg'}], 'posts': {'count': 1, 'section': 'CHS 168.3x5'}, "
            + "'footing': {'kind': 'planted', 'ground': 'sand', 'width': '0.6 m', 'depth': '3 m'}}";
        Job job = JobTexts.job("asce-7/16", "'basic-speed': '45 m/s', 'averaging': '3 s gust', 'terrain': 'C'", sign);
        Limit limit = AllJobs.TOOL.assessor().withLimits(AllJobs.assess(job)).items().get(0).limits().orElseThrow().first().orElseThrow();
        assertThat(limit.inTheOpen()).isCloseTo(45 * limit.multiple() * Math.sqrt(0.6), within(1e-9));
    }

    @Test
    void what_holds_better_stands_more() {
        Limits depot = AllJobs.TOOL.assessor().withLimits(AllJobs.assess(AllJobs.demo("depot-hoarding.json"))).items().get(0).limits().orElseThrow();
        assertThat(depot.changes()).singleElement().satisfies(c -> assertThat(c.first().orElseThrow().inTheOpen()).isGreaterThan(depot.first().orElseThrow().inTheOpen()));
        Limits fence = limits(job(true, draw(1, 50)), 26);
        assertThat(fence.changes()).extracting(Limits.Change::what).anyMatch(w -> w.contains("more blocks of 25 kg (55.12 lb)")).anyMatch(w -> w.contains("a brace that reaches 1.2 m (3 ft 11 1/4 in)"))
            .anyMatch(w -> w.contains("mesh that is 70 % closed"));
        fence.changes().stream().filter(c -> c.what().contains("blocks")).forEach(c -> assertThat(c.first().orElseThrow().inTheOpen()).isGreaterThan(fence.first().orElseThrow().inTheOpen()));
        assertThat(fence.list()).anyMatch(l -> l.state().equals("cover taken off"));
    }

    @Test
    void limits_stand_in_the_result_and_in_order() {
        for (String name : List.of("bakery-sign.json", "riverside-fence.json", "depot-hoarding.json", "optician-blade.json", "stacked-signs.json")) {
            Limits limits = AllJobs.TOOL.assessor().withLimits(AllJobs.assess(AllJobs.demo(name))).items().get(0).limits().orElseThrow();
            assertThat(limits.list()).as(name).isNotEmpty().isSortedAccordingTo((a, b) -> Double.compare(a.inTheOpen(), b.inTheOpen()));
            limits.list().forEach(l -> assertThat(l.atItem()).as(String.format(Locale.ROOT, "%s %s", name, l)).isPositive().isFinite());
        }
    }
}
