package broadside.job;

import static broadside.job.Jobs.FEET;
import static broadside.job.Jobs.HOARDING;
import static broadside.job.Jobs.SIGN;
import static broadside.job.Jobs.changed;
import static broadside.job.Jobs.problems;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.assess.Job;
import broadside.assess.Problem;
import broadside.panel.Hoarding;
import broadside.panel.PostSign;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** What does not fit in a job is refused with the path at which it stands, all at once. */
class JobReaderTest {

    private static final String WIDTH = "\"width\": \"3 m\"";
    private static final String SOLIDITY = "\"solidity\": 1.0";
    private static final String GATES = "\"gates\": [{ \"from\": \"21.6 m\", \"width\": \"5 m\" }]";
    private static final String RETURNS = "\"returns\": { \"left\": \"2.4 m\", \"right\": \"2.4 m\" }";
    private static final String POSTS = "\"posts\": { \"count\": 2, \"spacing\": \"2 m\"";
    private static final String CLEARANCE = "\"clearance\": \"2.5 m\"";
    private static final String OVERLAY = "\"overlay\": null";
    private static final String BOARD = "items[0].boards[0].";

    static Stream<Arguments> misfits() {
        return Stream.of(
            Arguments.of(SIGN, WIDTH, "\"width\": \"3 m\", \"widht\": \"3 m\"", BOARD + "widht", "is not a key of board; its keys are mark, width, height"),
            Arguments.of(SIGN, "\"broadside\": 1,", "\"broadside\": 1, \"Title\": \"x\",", "Title", "is not a key of job; its keys are broadside, title"),
            Arguments.of(SIGN, WIDTH + ",", "", BOARD + "width", "is missing: across the wind, like \"2.4 m\""),
            Arguments.of(SIGN, WIDTH, "\"width\": null", BOARD + "width", "is missing: across the wind"),
            Arguments.of(SIGN, WIDTH, "\"width\": 3", BOARD + "width", "must be text with its unit, like \"2.4 m\""),
            Arguments.of(SIGN, WIDTH, "\"width\": \"3 kg\"", BOARD + "width", "\"3 kg\" is a mass; a length is typed like 2.4 m or 8 ft 6 in"),
            Arguments.of(SIGN, WIDTH, "\"width\": \"3\"", BOARD + "width", "\"3\" has no unit"),
            Arguments.of(SIGN, WIDTH, "\"width\": \"3e0 m\"", BOARD + "width", "\"3e0 m\" uses an exponent"),
            Arguments.of(SIGN, WIDTH, "\"width\": \"2001 m\"", BOARD + "width", "must lie between 5 mm and 2000 m; \"2001 m\" does not"),
            Arguments.of(SIGN, WIDTH, "\"width\": \"-3 m\"", BOARD + "width", "must lie between 5 mm and 2000 m; \"-3 m\" does not"),
            Arguments.of(SIGN, SOLIDITY, "\"solidity\": \"1\"", BOARD + "solidity", "must be a plain number without quotation marks"),
            Arguments.of(SIGN, SOLIDITY, "\"solidity\": 1.001", BOARD + "solidity", "must be above 0 and not above 1"),
            Arguments.of(SIGN, SOLIDITY, "\"solidity\": 0", BOARD + "solidity", "must be above 0 and not above 1"),
            Arguments.of(SIGN, SOLIDITY, "\"solidity\": -0", BOARD + "solidity", "must be above 0 and not above 1"),
            Arguments.of(SIGN, SOLIDITY, "\"solidity\": 1e-400", BOARD + "solidity", "must be above 0 and not above 1"),
            Arguments.of(SIGN, SOLIDITY, "\"solidity\": 1e400", BOARD + "solidity", "is too large to be a number"),
            Arguments.of(SIGN, CLEARANCE, "\"clearance\": \"-1 mm\"", BOARD + "clearance", "is below zero: the lower edge would lie below the ground"),
            Arguments.of(SIGN, "\"shape\": \"rectangle\"", "\"shape\": \"oval\"", BOARD + "shape", "\"oval\" does not fit: outline, one of rectangle, disc, triangle"),
            Arguments.of(SIGN, "\"shape\": \"rectangle\"", "\"shape\": \"disc\"", BOARD + "height", "must be 3 m like the width, as the board is a disc"),
            Arguments.of(SIGN, "\"offset\": \"0 m\"", "\"offset\": \"-51 m\"", BOARD + "offset", "must lie within 50 m of the posts"),
            Arguments.of(SIGN, "\"mass\": \"60 kg\"", "\"mass\": \"-60 kg\"", BOARD + "mass", "must not be below zero"),
            Arguments.of(SIGN, "\"depth\": \"0.05 m\"", "\"depth\": \"-5 mm\"", BOARD + "depth", "is below zero: a thickness is not below zero"),
            Arguments.of(SIGN, POSTS, "\"posts\": { \"count\": 2", "items[0].posts.spacing", "is missing: two or more posts need the distance between them"),
            Arguments.of(SIGN, POSTS, "\"posts\": { \"count\": 0", "items[0].posts.count", "must lie between 1 and 20"),
            Arguments.of(SIGN, POSTS, "\"posts\": { \"count\": 1.5", "items[0].posts.count", "must be a whole number"),
            Arguments.of(SIGN, POSTS, "\"posts\": { \"count\": \"2\"", "items[0].posts.count", "must be a plain number without quotation marks"),
            Arguments.of(SIGN, "\"kind\": \"post-sign\"", "\"faces\": 3, \"kind\": \"post-sign\"", "items[0].faces", "must be 1 or 2"),
            Arguments.of(SIGN, "\"kind\": \"post-sign\"", "\"kind\": \"tower\"", "items[0].kind", "is not a kind that this version assesses; it knows banner-fence, facade-panel, hoarding, post-sign, projecting-sign, spanned-banner"),
            Arguments.of(SIGN, "\"kind\": \"post-sign\",", "", "items[0].kind", "is missing: one of banner-fence, facade-panel, hoarding, post-sign, projecting-sign, spanned-banner"),
            Arguments.of(SIGN, "\"mark\": \"S1\"", "\"mark\": \" \"", "items[0].mark", "is empty: mark of the item"),
            Arguments.of(SIGN, "\"broadside\": 1", "\"broadside\": 2", "broadside", "is 2; this version reads job files of version 1"),
            Arguments.of(SIGN, "\"title\":", "\"units\": \"imperial\", \"title\":", "units", "\"imperial\" does not fit"),
            Arguments.of(SIGN, "en-1991-1-4", "en-1992", "basis.code", "\"en-1992/2005\" is not among the codes: as-nzs-1170-2/2011, as-nzs-1170-2/2021, asce-7/16, "),
            Arguments.of(SIGN, "\"edition\": \"2005\"", "\"edition\": \"2010\"", "basis.code", "\"en-1991-1-4/2010\" is not among the codes"),
            Arguments.of(SIGN, OVERLAY, "\"overlay\": \"xx\"", "basis.overlay", "\"xx\" is not an overlay of en-1991-1-4/2005; there are de, pt, uk"),
            Arguments.of(SIGN, "\"terrain\": \"II\"", "\"terrain\": \"C\"", "site.terrain", "\"C\" is not a terrain class of EN 1991-1-4:2005"),
            Arguments.of(SIGN, "\"basic-speed\": \"26 m/s\"", "\"basic-speed\": \"0.5 m/s\"", "site.basic-speed", "must lie between 1 m/s and 150 m/s"),
            Arguments.of(SIGN, "\"basic-speed\": \"26 m/s\"", "\"basic-speed\": \"0.7 kPa\"", "site.basic-speed", "\"0.7 kPa\" is a pressure"),
            Arguments.of(SIGN, "\"return-period\": \"50 years\"", "\"return-period\": \"1 year\"", "site.return-period", "must lie between 1.05 years and 10 000 years"),
            Arguments.of(SIGN, "\"altitude\": \"120 m\"", "\"altitude\": \"7 km\"", "site.altitude", "must lie between -500 m and 6000 m"),
            Arguments.of(SIGN, "\"upwind-length\": \"90 m\"", "\"upwind-length\": \"90 m\", \"half-length\": \"90 m\"", "site.topography.half-length",
                "must be shorter than upwind-length"),
            Arguments.of(SIGN, "\"name\": \"Larkmoor\"", "\"risk-category\": \"II\"", "site.risk-category", "is not a value of EN 1991-1-4:2005"),
            Arguments.of(FEET, "\"terrain\": \"C\"", "\"terrain\": \"II\"", "site.terrain", "\"II\" is not a terrain class of ASCE/SEI 7-16; it has B, C, D"),
            Arguments.of(FEET, "\"terrain\": \"C\"", "\"terrain\": \"C\", \"direction-factor\": 0.9", "site.direction-factor",
                "is not a value of ASCE/SEI 7-16; beside the wind and the ground it takes duration-rule, ground-elevation, gust-factor, risk-category, topographic-factor"),
            Arguments.of(FEET, "\"terrain\": \"C\"", "\"terrain\": \"C\", \"gust-factor\": \"auto\"", "site.gust-factor", "\"auto\" does not fit"),
            Arguments.of(FEET, "\"terrain\": \"C\"", "\"terrain\": \"C\", \"gust-factor\": 9", "site.gust-factor", "must lie between 0.3 and 5"),
            Arguments.of(HOARDING, RETURNS, "\"returns\": { \"left\": \"48.1 m\" }", "items[0].returns.left",
                "a return of 48.1 m is longer than the hoarding of 48 m"),
            Arguments.of(HOARDING, RETURNS, "\"returns\": { \"right\": \"-1 m\" }", "items[0].returns.right", "is below zero"),
            Arguments.of(HOARDING, GATES, "\"gates\": [{ \"from\": \"44 m\", \"width\": \"5 m\" }]", "items[0].gates[0].from", "ends beyond the hoarding of 48 m"),
            Arguments.of(HOARDING, GATES, "\"gates\": [{ \"from\": \"-1 m\", \"width\": \"5 m\" }]", "items[0].gates[0].from", "does not begin before the left end"),
            Arguments.of(HOARDING, GATES, "\"gates\": [{ \"from\": \"8 m\", \"width\": \"2 m\" }, { \"from\": \"5 m\", \"width\": \"4 m\" }]", "items[0].gates",
                "two gates overlap at 8 m"),
            Arguments.of(HOARDING, GATES, "\"gates\": [{ \"from\": \"0 m\", \"width\": \"48 m\" }]", "items[0].gates", "leaves no hoarding to assess"),
            Arguments.of(HOARDING, GATES, "\"gates\": { \"from\": \"5 m\" }", "items[0].gates", "must be a list in square brackets"),
            Arguments.of(HOARDING, GATES, "\"gates\": [\"5 m\"]", "items[0].gates[0]", "must be an object with the keys from, width"),
            Arguments.of(HOARDING, "\"spacing\": \"2.4 m\"", "\"spacing\": \"47 mm\"", "items[0].posts.spacing", "gives more than 1000 posts"));
    }

    @ParameterizedTest
    @MethodSource("misfits")
    void eachMisfitIsNamedWithItsPlace(String example, String old, String other, String path, String text) {
        List<Problem> found = problems(changed(example, old, other));
        assertThat(found).hasSize(1);
        assertThat(found.get(0).path()).isEqualTo(path);
        assertThat(found.get(0).text()).contains(text);
        assertThat(found.get(0).line()).isEqualTo(path + ": " + found.get(0).text()).doesNotContain("\n");
    }

    @Test
    void allMisfitsAreGatheredAtOnce() {
        String text = changed(SIGN, WIDTH, "\"widht\": \"3 m\", \"height\": 2").replace("\"height\": \"2 m\",", "").replace(CLEARANCE, "\"clearance\": \"-1 m\"")
            .replace("\"count\": 2", "\"count\": 2.5").replace("\"terrain\": \"II\"", "\"terrain\": \"C\"").replace("10 min mean", "3 s gust")
            .replace("26 m/s", "26 m").replace("\"broadside\": 1", "\"broadside\": 3").replace("\"title\":", "\"units\": 1, \"titel\":");
        assertThat(problems(text)).extracting(Problem::path).containsExactlyInAnyOrder("titel", "units", "broadside", "site.basic-speed", "site.terrain",
            "site.averaging", BOARD + "widht", BOARD + "width", BOARD + "height", BOARD + "clearance", "items[0].posts.count");
    }

    @Test
    void marksAreUnique() {
        String items = "\"items\": [" + "{ \"mark\": \"A\", \"kind\": \"hoarding\", \"length\": \"9 m\", \"height\": \"2 m\" },".repeat(2)
            + "{ \"mark\": \" A \", \"kind\": \"hoarding\", \"length\": \"9 m\", \"height\": \"2 m\" }]";
        String text = Jobs.text(HOARDING).replaceFirst("(?s)\"items\": \\[.*\\]", items);
        assertThat(problems(text)).extracting(Problem::path).containsExactly("items[1].mark", "items[2].mark");
        assertThat(problems(text).get(0).text()).isEqualTo("\"A\" stands twice; each item needs its own mark");
    }

    @Test
    void aJobHasOneTo200ItemsAndASign20Boards() {
        String head = Jobs.text(HOARDING).replaceFirst("(?s)\"items\": \\[.*\\]", "\"items\": [%]");
        String item = "{ \"mark\": \"A%d\", \"kind\": \"hoarding\", \"length\": \"9 m\", \"height\": \"2 m\" }";
        assertThat(problems(head.replace("%", ""))).extracting(Problem::line).containsExactly("items: is empty: what stands in the wind");
        String many = String.join(",", IntStream.range(0, 201).mapToObj(i -> item.replace("%d", "" + i)).toList());
        assertThat(problems(head.replace("%", many))).extracting(Problem::line).containsExactly("items: has 201 entries; a list has at most 200");
        String board = "{ \"width\": \"1 m\", \"height\": \"1 m\", \"clearance\": \"2 m\" }";
        String sign = "{ \"mark\": \"S\", \"kind\": \"post-sign\", \"boards\": [" + (board + ",").repeat(20) + board + "] }";
        assertThat(problems(head.replace("%", sign))).extracting(Problem::line)
            .containsExactly("items[0].boards: has 21 entries; a sign has at most 20 boards");
    }

    @Test
    void anotherAveragingOffersTheConversion() {
        assertThat(problems(changed(SIGN, "10 min mean", "3 s gust"))).extracting(Problem::line).containsExactly("site.averaging: EN 1991-1-4:2005 + A1:2010, "
            + "recommended values defines its basic speed as a 10 min mean, and this one is a 3 s gust. In open country at 10 m 26 m/s as a 3 s gust is about "
            + "17.85 m/s as a 10 min mean (ratios after Durst); type that with \"10 min mean\" if it is what you mean.");
        assertThat(problems(changed(FEET, "3 s gust", "10 min mean")).get(0).text()).contains("115 mph as a 10 min mean is about 167.6 mph as a 3 s gust");
        assertThat(26 * 1.05 / 1.53).as("printed ratios").isCloseTo(17.85, within(0.01));
        assertThat(115 * 1.53 / 1.05).isCloseTo(167.6, within(0.05));
        assertThat(problems(changed(SIGN, "10 min mean", "0.2 s gust")).get(0).text())
            .endsWith("There is no conversion from a 0.2 s gust here; type the speed as a 10 min mean.");
    }

    @Test
    void aTextWithTwoReadingsOffersBoth() {
        List<Problem> found = problems(changed(SIGN, WIDTH, "\"width\": \"1,500 mm\""));
        assertThat(found).hasSize(1);
        assertThat(found.get(0).path()).isEqualTo(BOARD + "width");
        assertThat(found.get(0).options()).containsExactly("1500 mm", "1.5 mm");
        assertThat(problems(changed(SIGN, WIDTH, "\"width\": \"" + found.get(0).options().get(0) + "\""))).isEmpty();
    }

    @Test
    void aTopographicFactorDoesNotStandBesideTopography() {
        String both = changed(FEET, "\"terrain\": \"C\"", "\"terrain\": \"C\", \"topographic-factor\": 1.2, \"topography\": { \"feature\": \"hill\", "
            + "\"height\": \"30 m\", \"upwind-length\": \"90 m\", \"distance-from-crest\": \"15 m\" }");
        assertThat(problems(both)).extracting(Problem::line).containsExactly("site.topographic-factor: stands beside topography; give one of the two");
    }

    @Test
    void textIsKeptToALength() {
        assertThat(problems(changed(SIGN, "\"reference\": \"LRP-014\"", "\"reference\": \"" + "x".repeat(2001) + "\""))).extracting(Problem::line)
            .containsExactly("reference: has 2001 characters; at most 2000 fit");
        assertThat(problems(changed(SIGN, "\"reference\": \"LRP-014\"", "\"reference\": 14")).get(0).line()).isEqualTo("reference: must be text: reference of the job");
    }

    @Test
    void foreignTextInAMessageIsCutAndStaysOnOneLine() {
        Problem problem = problems(changed(SIGN, "\"terrain\": \"II\"", "\"terrain\": \"a\\n\\u001b[31m" + "b".repeat(80) + "\"")).get(0);
        assertThat(problem.text()).doesNotContain("\n").doesNotContain("\u001b").contains("...").doesNotContain("b".repeat(70));
    }

    @Test
    void whatFitsIsReadAsTyped() {
        Job job = Jobs.READER.read(Jobs.text(SIGN).getBytes(StandardCharsets.UTF_8));
        assertThat(job.head("title")).contains("Larkmoor Retail Park, entrance sign");
        assertThat(job.basis().key()).isEqualTo("en-1991-1-4/2005");
        assertThat(job.site().basicSpeed().metresPerSecond()).isEqualTo(26);
        assertThat(job.site().ground().topography().orElseThrow().upwindLength().metres()).isEqualTo(90);
        assertThat(job.site().authorityMinimum().orElseThrow().pressure().pascals()).isEqualTo(700);
        PostSign sign = (PostSign) job.items().get(0);
        assertThat(sign.boards().get(0).width().typed()).isEqualTo("3 m");
        assertThat(sign.boards().get(0).mass().orElseThrow().kilograms()).isEqualTo(60);
        assertThat(sign.posts().positions()).containsExactly(-1.0, 1.0);
        assertThat(sign.carrying()).extracting(c -> c.name() + "=" + c.typed()).contains("posts section=auto", "footing width=0.6 m");
        Hoarding hoarding = (Hoarding) Jobs.READER.read(Jobs.text(HOARDING).getBytes(StandardCharsets.UTF_8)).items().get(0);
        assertThat(hoarding.gates().get(0).end()).isCloseTo(26.6, within(1e-12));
        assertThat(hoarding.returnLeft().metres()).isEqualTo(2.4);
        PostSign feet = (PostSign) Jobs.READER.read(Jobs.text(FEET).getBytes(StandardCharsets.UTF_8)).items().get(0);
        assertThat(feet.boards().get(0).width().metres()).isEqualTo(2.5908);
        assertThat(feet.boards().get(0).clearance().metres()).isEqualTo(0.9144);
    }

    @Test
    void aZeroWithASignIsZero() {
        assertThat(problems(changed(SIGN, CLEARANCE, "\"clearance\": \"-0 m\""))).isEmpty();
        Job job = Jobs.READER.read(changed(SIGN, CLEARANCE, "\"clearance\": \"-0 m\"").getBytes(StandardCharsets.UTF_8));
        assertThat(((PostSign) job.items().get(0)).boards().get(0).clearance().metres()).isEqualTo(0.0);
    }
}
