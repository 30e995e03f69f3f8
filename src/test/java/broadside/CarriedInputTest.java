package broadside;

import static broadside.CarriedJobs.EN;
import static broadside.CarriedJobs.enSite;
import static broadside.CarriedJobs.job;
import static broadside.CarriedJobs.problems;
import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.Assessment;
import broadside.assess.BadJob;
import broadside.assess.Carried;
import broadside.assess.Problem;
import broadside.job.ResultText;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Answers about what carries an item that cannot be: one clear line for each, with its place; and no answer leads to a number that is none. */
class CarriedInputTest {

    private static final String BOARD = "'boards': [{'width': '2 m', 'height': '1.2 m', 'clearance': '2.2 m'}], ";
    private static final String FENCE = "'panel-length': '3.5 m', 'panel-height': '2 m', 'panels': 6, 'cover-solidity': 1.0, 'fence-solidity': 0.25, ";
    private static final String PANEL = "'backing': 'wall', 'width': '1.2 m', 'height': '2.5 m', 'bottom': '6 m', 'distance-from-corner': '0.3 m', "
        + "'building': {'width': '30 m', 'depth': '20 m', 'height': '12 m', 'roof-slope': '2 deg'}, ";
    private static final String BLADE = "'projection': '0.6 m', 'height': '2.4 m', 'bottom': '3.2 m', 'mass': '34 kg', ";
    private static final String WALL = "'length': '24 m', 'height': '2.4 m', ";

    private static String of(String kind, String fields) {
        String head = switch (kind) {
            case "post-sign" -> BOARD;
            case "hoarding" -> WALL;
            case "banner-fence" -> FENCE;
            case "facade-panel" -> PANEL;
            default -> BLADE;
        };
        return job(EN, enSite(26), kind, head + fields);
    }

    /** Fields that go with the item, the place of the problem inside it, and words that the line must hold. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 100x60'} | posts.section | wall is thicker than half the diameter",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 100x50'} | posts.section | wall is thicker than half the diameter",
        "hoarding | 'posts': {'spacing': '2 m', 'section': 'CHS 100x60'} | posts.section | wall is thicker than half the diameter",
        "post-sign | 'posts': {'count': 1, 'section': 'RHS 100x50x30'} | posts.section | thicker than half the smaller side",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 100x0'} | posts.section | above zero",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS -100x5'} | posts.section | above zero",
        "post-sign | 'posts': {'count': 2, 'spacing': '0 m'} | posts.spacing | between 5 mm and 2000 m",
        "post-sign | 'posts': {'count': 2} | posts.spacing | is missing",
        "hoarding | 'posts': {'spacing': '-2 m'} | posts.spacing | between 5 mm and 2000 m",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 323.9x5'}, 'footing': {'kind': 'pad', 'width': '0.3 m'} | footing.width | not smaller than its post",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 139.7x5'}, 'footing': {'kind': 'pad', 'width': '2 m', 'length': '0.1 m'} | footing.length | not smaller than its post",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 139.7x5'}, 'footing': {'kind': 'planted', 'width': '0.1 m'} | footing.width | not narrower than its post (140 mm)",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'pad', 'friction': 1.2} | footing.friction | is above 1",
        "hoarding | 'posts': {'spacing': '2 m'}, 'ballast': {'mass': '900 kg', 'lever': '1.6 m', 'friction': 1.2} | ballast.friction | say beside it why",
        "banner-fence | 'friction': 1.2 | friction | say beside it why",
        "banner-fence | 'friction': 1.2, 'friction-reason': ' ' | friction | say beside it why",
        "banner-fence | 'friction': 0 | friction | must be above 0",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'rule': 'broms-clay', 'cohesion': '0 kPa'} | footing.cohesion | must be above zero",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'cohesion': '0 kPa'} | footing.cohesion | must be above zero",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'rule': 'broms-clay'} | footing.cohesion | needs the undrained shear strength",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'friction-angle': '90 deg'} | footing.friction-angle | between 20 and 50 degrees",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'lateral-bearing': '0 kPa/m'} | footing.lateral-bearing | must be above zero",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'safety-factor': 0} | footing.safety-factor | between 1 and 10",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'pad', 'bearing': '0 kPa'} | footing.bearing | must be above zero",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'ground': 'moon'} | footing.ground | is none of rock",
        "post-sign | 'posts': {'count': 1}, 'footing': {'kind': 'planted', 'rule': 'nonsense'} | footing.rule | does not fit",
        "facade-panel | 'fixings': {'columns': 2, 'rows': 1, 'horizontal-pitch': '1 m', 'allowable-tension': '0 kN'} | fixings.allowable-tension | must be above zero",
        "facade-panel | 'fixings': {'columns': 2, 'rows': 1, 'horizontal-pitch': '1 m', 'allowable-shear': '-1 kN'} | fixings.allowable-shear | must be above zero",
        "facade-panel | 'fixings': {'columns': 2, 'rows': 1, 'horizontal-pitch': '0 m'} | fixings.horizontal-pitch | between 5 mm and 2000 m",
        "facade-panel | 'fixings': {'columns': 1, 'rows': 2, 'vertical-pitch': '-1 m'} | fixings.vertical-pitch | between 5 mm and 2000 m",
        "facade-panel | 'fixings': {'columns': 2, 'rows': 1} | fixings.horizontal-pitch | is missing",
        "facade-panel | 'fixings': {'columns': 0, 'rows': 1} | fixings.columns | between 1 and 100",
        "facade-panel | 'fixings': {'columns': 2, 'rows': 1, 'horizontal-pitch': '1.3 m'} | fixings.horizontal-pitch | do not fit on the width",
        "projecting-sign | 'brackets': {'count': 2, 'spacing': '0 m'} | brackets.spacing | between 5 mm and 2000 m",
        "projecting-sign | 'brackets': {'count': 1}, 'fixings': {'columns': 2, 'rows': 1, 'horizontal-pitch': '0 mm'} | fixings.horizontal-pitch | between 5 mm and 2000 m",
        "hoarding | 'posts': {'spacing': '2 m'}, 'ballast': {'mass': '900 kg', 'lever': '0 m'} | ballast.lever | between 5 mm and 2000 m",
        "hoarding | 'posts': {'spacing': '2 m'}, 'ballast': {'mass': '900 kg'} | ballast.lever | is needed",
        "hoarding | 'posts': {'spacing': '2 m'}, 'ballast': {'mass': '0 kg', 'lever': '1 m'} | ballast.mass | must be above zero",
        "banner-fence | 'brace': {'lever': '0.2 m', 'mass': '80 kg'} | brace.lever | farther from the line",
        "banner-fence | 'brace': {'lever': '0 m', 'mass': '80 kg'} | brace.lever | between 5 mm and 2000 m",
        "banner-fence | 'blocks': [{'mass': '-1 kg', 'lever': '0 m'}] | blocks[0].mass | must not be below zero",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 139.7x5', 'grade': 'S999'} | posts.grade | is not known for steel",
        "hoarding | 'posts': {'spacing': '2 m', 'grade': 'S999'} | posts.grade | is not known for steel",
        "post-sign | 'posts': {'count': 1, 'section': 'CHS 139.7x5', 'grade': 'C24'} | posts.grade | is not known for steel",
        "post-sign | 'posts': {'count': 1, 'section': 'auto', 'series': 'chs-cold'} | posts.series | is not among the tables",
        "hoarding | 'posts': {'spacing': '2 m', 'series': 'none'} | posts.series | is not among the tables",
        "post-sign | 'posts': {'count': 1, 'deflection-limit': 'x'} | posts.deflection-limit | is no limit of the deflection"})
    void oneLineForWhatCannotBe(String kind, String fields, String place, String words) {
        List<Problem> problems = problems(of(kind, fields));
        assertThat(problems).as(problems.toString()).hasSize(1);
        assertThat(problems.get(0).path()).isEqualTo("items[0]." + place);
        assertThat(problems.get(0).text()).contains(words).doesNotContain("\n").doesNotContain("Exception").doesNotContain("NaN");
    }

    @Test
    void anUnknownRuleOfStabilityOrOfPosts() {
        List<Problem> stability = problems(job(EN + ", 'stability': 'nonsense'", enSite(26), "post-sign", BOARD + "'posts': {'count': 1}"));
        assertThat(stability).hasSize(1);
        assertThat(stability.get(0).line()).startsWith("basis.stability: \"nonsense\" is not a rule of stability; known are en-1990-equ, ");
        List<Problem> design = problems(job(EN + ", 'design': 'nonsense'", enSite(26), "post-sign", BOARD + "'posts': {'count': 1}"));
        assertThat(design).hasSize(1);
        assertThat(design.get(0).line()).startsWith("basis.design: \"nonsense\" does not fit");
    }

    /** A text that names no section is no error of the job: the loads stay, and the part says why it is not checked. */
    @Test
    void aTextThatNamesNoSectionKeepsTheLoads() {
        for (String text : List.of("gibberish", "CHS 1e400x5", "IPE 200", "CHS")) {
            Carried carried = CarriedJobs.carried(of("post-sign", "'posts': {'count': 1, 'section': '" + text + "'}"));
            assertThat(carried.parts()).hasSize(1);
            assertThat(carried.parts().get(0).refused().orElseThrow()).startsWith("\"" + text + "\" names no section that is known here").contains("Loads only");
            assertThat(carried.passes()).isFalse();
        }
    }

    private final Random random = new Random(3);

    private String any(String... of) {
        return of[random.nextInt(of.length)];
    }

    /** A size from the smallest that is read to one that is too large for its place. */
    private String size(double least, double most) {
        return Math.exp(Math.log(least) + random.nextDouble() * Math.log(most / least)) + " m";
    }

    private String extreme() {
        return switch (random.nextInt(5)) {
            case 0 -> job(basis(), enSite(1 + random.nextInt(90)), "post-sign", "'boards': [{'width': '" + size(0.01, 15) + "', 'height': '" + size(0.01, 6) + "', 'clearance': '"
                + any("0 m", size(0.005, 14)) + "', 'offset': '" + any("0 m", "-1 m", "3 m") + "'" + any("", ", 'mass': '0.001 kg'", ", 'mass': '5000 kg'") + "}], 'posts': {'count': "
                + (1 + random.nextInt(3)) + ", 'spacing': '" + size(0.005, 8) + "'" + any("", ", 'section': 'auto'", ", 'section': 'CHS 33.7x2.6'", ", 'section': 'CHS 900x1'",
                ", 'section': 'TIMBER 100x100'", ", 'section': 'PIPE 12 XS'", ", 'section': 'RHS 120x80x5 cold', 'grade': 'S355'", ", 'series': 'alu-round'") + "}" + footing());
            case 1 -> job(basis(), enSite(1 + random.nextInt(90)), "hoarding", "'length': '" + size(0.5, 200) + "', 'height': '" + size(0.05, 6) + "', 'posts': {'spacing': '"
                + size(0.5, 8) + "'}" + (random.nextBoolean() ? footing() : ", 'ballast': {'lever': '" + size(0.005, 50) + "'" + any("", ", 'mass': '0.001 kg'", ", 'front-mass': '0 kg'")
                + any("", ", 'ground': 'moon'", ", 'friction': 0.000001") + "}"));
            case 2 -> job(basis(), enSite(1 + random.nextInt(90)), "banner-fence", "'panel-length': '" + size(0.05, 10) + "', 'panel-height': '" + size(0.05, 4) + "', 'panels': "
                + (1 + random.nextInt(30)) + ", 'cover-solidity': " + any("1.0", "0.3") + any("", ", 'panel-mass': '0 kg', 'foot-mass': '0 kg'", ", 'foot-length': '5 mm'")
                + any("", ", 'brace': {'lever': '30 m', 'mass': '0 kg'}", ", 'blocks': [{'mass': '100 kg', 'lever': '-19 m'}]") + any("", ", 'friction': 0.000001"));
            case 3 -> job(basis(), enSite(1 + random.nextInt(90)), "facade-panel", "'backing': 'wall', 'width': '" + size(0.01, 20) + "', 'height': '" + size(0.01, 8)
                + "', 'bottom': '0 m', 'distance-from-corner': '0 m', 'building': {'width': '30 m', 'depth': '20 m', 'height': '12 m', 'roof-slope': '2 deg'}, " + fixings());
            default -> job(basis(), enSite(1 + random.nextInt(90)), "projecting-sign", "'projection': '" + size(0.01, 3) + "', 'height': '" + size(0.01, 6) + "', 'bottom': '"
                + size(0.01, 12) + "'" + any("", ", 'mass': '0 kg'", ", 'mass': '9000 kg'") + ", 'brackets': {'count': " + (1 + random.nextInt(3)) + ", 'spacing': '" + size(0.005, 3)
                + "'}, " + fixings());
        };
    }

    private String basis() {
        return EN + any("", ", 'stability': 'asd-0.6'", ", 'stability': 'factor-1.5'") + any("", ", 'design': 'us-asd'", ", 'design': 'us-strength'");
    }

    private String footing() {
        return random.nextInt(4) == 0 ? "" : ", 'footing': {'kind': '" + any("planted", "pier", "pad") + "'" + any("", ", 'width': '" + size(0.3, 9) + "'")
            + any("", ", 'depth': '" + size(0.005, 9) + "'") + any("", ", 'cohesion': '20 kPa'", ", 'friction-angle': '30 deg'", ", 'ground': 'clay'", ", 'ground': 'mud'",
            ", 'lateral-bearing': '0.0001 kPa/m'", ", 'paved': 'yes', 'rule': 'ibc'", ", 'water': 'high'", ", 'friction': 0.000001", ", 'bearing': '0.001 Pa'") + "}";
    }

    private String fixings() {
        return "'fixings': {'columns': " + (1 + random.nextInt(4)) + ", 'rows': " + (1 + random.nextInt(4)) + ", 'horizontal-pitch': '" + size(0.005, 3) + "', 'vertical-pitch': '"
            + size(0.005, 3) + "'" + any("", ", 'allowable-tension': '0.000001 N'", ", 'allowable-shear': '1000 kN'") + "}";
    }

    @Test
    void noAnswerLeadsToANumberThatIsNone() {
        int told = 0;
        for (int i = 0; i < 1500; i++) {
            String job = extreme();
            try {
                Assessment assessment = CarriedJobs.assessment(job);
                assertThat(ResultText.of(assessment).toString()).as(job).doesNotContain("NaN").doesNotContain("Infinity");
                told += assessment.items().get(0).loads().flatMap(l -> l.carried()).isPresent() ? 1 : 0;
            } catch (BadJob e) {
                assertThat(e.problems()).as(job).allSatisfy(p -> assertThat(p.line()).doesNotContain("NaN").doesNotContain("Infinity").doesNotContain("lead to no result"));
            }
        }
        assertThat(told).as("jobs with supports").isGreaterThan(700);
    }
}
