package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.Assessment;
import broadside.assess.Comparison;
import broadside.assess.Comparison.Line;
import broadside.assess.Job;
import broadside.job.JobText;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** One item by every code: speeds converted in the open, pressures at one level. */
class SideBySideTest {

    private static final String SIGN = "{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'width': '3 m', 'height': '2 m', 'clearance': '2.5 m'}], 'posts': {'count': 2, 'spacing': '2 m'}}";

    private static Comparison compare(String key, String site) {
        Job job = JobTexts.job(key, site, SIGN);
        return AllJobs.TOOL.assessor().sideBySide(job, job.items().get(0));
    }

    private static Line line(Comparison comparison, String key) {
        return comparison.lines().stream().filter(l -> l.key().equals(key)).findFirst().orElseThrow();
    }

    @Test
    void every_edition_has_a_line_and_the_chosen_one_comes_first() {
        Comparison comparison = compare("asce-7/16", "'basic-speed': '115 mph', 'averaging': '3 s gust', 'terrain': 'C'");
        assertThat(comparison.lines()).extracting(Line::key).containsExactlyInAnyOrderElementsOf(AllJobs.TOOL.assessor().codes().editions());
        assertThat(comparison.lines().get(0).key()).isEqualTo("asce-7/16");
        assertThat(comparison.lines().get(0).chosen()).isTrue();
        assertThat(comparison.plain().orElseThrow().key()).isEqualTo("open-flow/1");
    }

    /** 26 m/s as a 10 min mean is 26 x 1.53 / 1.05 = 37.886 m/s as a 3 s gust after Durst. */
    @Test
    void a_mean_becomes_a_gust() {
        Comparison comparison = compare("en-1991-1-4/2005", JobTexts.EN);
        assertThat(line(comparison, "is-875-3/2015").speed()).isCloseTo(37.886, within(0.001));
        assertThat(line(comparison, "as-nzs-1170-2/2021").speed()).as("brought to 500 years by region A").isCloseTo(37.886 / 0.8732, within(0.01));
        assertThat(line(comparison, "asce-7/22").speed()).as("brought to 700 years").isCloseTo(37.886 * 1.26359, within(0.002));
        assertThat(line(comparison, "en-1991-1-4/2005").speed()).isEqualTo(26);
    }

    /** Risk category II is 700 years: V50 = V / (0.36 + 0.10 ln 8400) = V / 1.26359; 51.41 m/s becomes 40.69 m/s, and 27.92 m/s as a mean. */
    @Test
    void the_wind_of_700_years_becomes_that_of_50() {
        Comparison comparison = compare("asce-7/22", "'basic-speed': '51.41 m/s', 'averaging': '3 s gust', 'terrain': 'C', 'risk-category': 'II'");
        assertThat(line(comparison, "asce-7/22").speed()).isEqualTo(51.41);
        assertThat(line(comparison, "is-875-3/2015").speed()).isCloseTo(40.686, within(0.002));
        assertThat(line(comparison, "en-1991-1-4/2005").speed()).isCloseTo(40.686 * 1.05 / 1.53, within(0.002));
    }

    /** Region A: V_500 = 67 - 41 x 500^-0.1 = 44.98, V_50 = 67 - 41 x 50^-0.1 = 39.28; ratio 0.8732. */
    @Test
    void an_ultimate_regional_speed_becomes_that_of_50_years() {
        Comparison comparison = compare("as-nzs-1170-2/2021", "'regional-speed': '45 m/s', 'return-period': '500 years', 'terrain': '2'");
        assertThat(line(comparison, "as-nzs-1170-2/2021").speed()).isEqualTo(45);
        assertThat(line(comparison, "is-875-3/2015").speed()).isCloseTo(45 * 0.8732, within(0.01));
    }

    @Test
    void terrain_is_matched_by_its_roughness() {
        Comparison comparison = compare("en-1991-1-4/2005", "'basic-speed': '26 m/s', 'averaging': '10 min mean', 'terrain': 'III'");
        assertThat(line(comparison, "asce-7/22").terrain()).isEqualTo("B");
        assertThat(line(comparison, "is-875-3/2015").terrain()).isEqualTo("3");
        assertThat(line(comparison, "open-flow/1").terrain()).isEqualTo("0.3 m");
        assertThat(line(compare("as-nzs-1170-2/2011", "'basic-speed': '40 m/s', 'averaging': '3 s gust', 'terrain': '2.5'"), "en-1991-1-4/2005").terrain())
            .as("between two classes the smoother").isEqualTo("II");
    }

    @Test
    void a_typed_speed_comes_first() {
        String text = ("{'broadside': 1, 'basis': {'code': 'en-1991-1-4', 'edition': '2005'}, 'site': {" + JobTexts.EN + "}, 'items': [" + SIGN + "], "
            + "'comparison': [{'code': 'is-875-3', 'edition': '2015', 'basic-speed': '44 m/s', 'terrain': '1'}]}").replace('\'', '"');
        Job job = AllJobs.TOOL.reader().read(JobText.read(text.getBytes(StandardCharsets.UTF_8))).orThrow();
        Line line = line(AllJobs.TOOL.assessor().sideBySide(job, job.items().get(0)), "is-875-3/2015");
        assertThat(line.speed()).isEqualTo(44);
        assertThat(line.terrain()).isEqualTo("1");
        assertThat(line.how()).contains("typed");
    }

    /** What the comparison says of a code is what a job in that code with that speed gets, brought to 50 years. */
    @Test
    void each_line_is_the_assessment_of_its_own_code() {
        Comparison comparison = compare("en-1991-1-4/2005", JobTexts.EN);
        for (Line line : comparison.lines()) {
            String site = "'basic-speed': '" + line.speed() + " m/s', 'averaging': '" + AllJobs.TOOL.assessor().codes().code(line.key()).orElseThrow().terms().averaging().words()
                + "', 'terrain': '" + line.terrain() + "'";
            Assessment own = AllJobs.assess(JobTexts.job(line.key(), site, SIGN));
            double force = own.items().get(0).loads().orElseThrow().governs("base-shear").force();
            double other = line.chosen() ? line.steps().find("fifty-year-ratio").orElseThrow().value() : line.steps().find("fifty-year-ratio/other").orElseThrow().value();
            assertThat(line.found().orElseThrow().force()).as(line.key()).isCloseTo(force * other * other, within(1e-3 * force));
        }
    }

    /** The codes lie within a factor of two of each other for a plain sign, and plain fluid mechanics not far from them. */
    @Test
    void the_codes_do_not_lie_far_apart() {
        Comparison comparison = compare("en-1991-1-4/2005", JobTexts.EN);
        assertThat(comparison.codes()).hasSizeGreaterThanOrEqualTo(6);
        assertThat(comparison.spread().orElseThrow()).isBetween(1.1, 2.0);
        double plain = comparison.plain().orElseThrow().found().orElseThrow().pressure();
        double least = comparison.codes().stream().mapToDouble(l -> l.found().orElseThrow().pressure()).min().orElseThrow();
        assertThat(plain / least).isBetween(0.6, 1.5);
    }

    /** In a weak wind the least pressure of 16 psf and the least speed of 30 m/s count at strength level, and not as a 50-year wind: 16 psf comes to 16 x 47.88 x 0.7914² = 480 Pa. */
    @Test
    void a_least_pressure_counts_at_the_level_of_its_code() {
        Comparison comparison = compare("en-1991-1-4/2005", "'basic-speed': '18 m/s', 'averaging': '10 min mean', 'terrain': 'IV'");
        assertThat(line(comparison, "asce-7/22").found().orElseThrow().pressure()).isCloseTo(16 * 47.880259 / (1.26359 * 1.26359), within(0.5));
    }

    @Test
    void a_code_that_does_not_cover_the_item_says_why() {
        Job job = JobTexts.job("en-1991-1-4/2005", JobTexts.EN, "{'mark': 'W1', 'kind': 'facade-panel', 'backing': 'wall', 'width': '1.2 m', 'height': '2.5 m', 'bottom': '3 m', "
            + "'distance-from-corner': '0.3 m', 'building': {'width': '30 m', 'depth': '20 m', 'height': '12 m'}}");
        Line plain = line(AllJobs.TOOL.assessor().sideBySide(job, job.items().get(0)), "open-flow/1");
        assertThat(plain.found()).isEmpty();
        assertThat(plain.refusal()).isPresent();
    }
}
