package broadside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import broadside.assess.BadJob;
import broadside.assess.Carried;
import broadside.assess.Carried.Part;
import broadside.assess.Job;
import broadside.sheet.Block;
import broadside.sheet.SheetMaker;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What an engineer must settle first is said in the answer and on the site sheet, whatever the shares say. */
class CarriedWarningsTest {

    private static final String EN = "en-1991-1-4/2005";
    private static final String SIGN = "{'mark': 'S1', 'kind': 'post-sign', 'boards': [{'width': '2.4 m', 'height': '1.2 m', 'clearance': '2.2 m', 'depth': '60 mm', 'mass': '45 kg'}], ";
    private static final String BLADE = "{'mark': 'P1', 'kind': 'projecting-sign', 'projection': '0.6 m', 'height': '2.4 m', 'bottom': '3.2 m', 'depth': '0.12 m', 'mass': '34 kg', "
        + "'brackets': {'count': 2, 'spacing': '1.8 m'}, 'held-by': 'building wall', 'fixings': ";
    private static final String HOARDING = "{'mark': 'H1', 'kind': 'hoarding', 'length': '30 m', 'height': '2.4 m', 'posts': {'spacing': '2.4 m'}, ";

    private static Job job(String item) {
        return JobTexts.job(EN, JobTexts.EN, item);
    }

    private static Carried carried(String item) {
        return AllJobs.assess(job(item)).items().get(0).loads().orElseThrow().carried().orElseThrow();
    }

    /** The line of the answer, and the text of the site sheet. */
    private static String[] told(String item) {
        List<Block> blocks = SheetMaker.of(AllJobs.assess(job(item)), "2026-12-01").blocks();
        String answer = blocks.stream().filter(Block.Answer.class::isInstance).flatMap(b -> ((Block.Answer) b).lines().stream()).filter(f -> f.label().equals("What would carry it"))
            .map(f -> f.value() + " | " + f.remark()).findFirst().orElseThrow();
        StringBuilder site = new StringBuilder();
        boolean inside = false;
        for (Block block : blocks) {
            if (block instanceof Block.Heading h) {
                inside = h.text().startsWith("Site sheet");
            } else if (inside && block instanceof Block.Facts facts) {
                facts.facts().forEach(f -> site.append(f.label()).append(": ").append(f.value()).append('\n'));
            }
        }
        return new String[] {answer, site.toString()};
    }

    @ParameterizedTest
    @CsvSource({"slope, sloping, The ground slopes", "water, high, Ground water stands high", "services, not located, Buried services are not located", "frost-depth, 3 m, frost can lift it"})
    void badNewsAboutTheGroundDoesNotVanish(String field, String answer, String words) {
        String item = SIGN + "'posts': {'count': 1}, 'footing': {'kind': 'planted', 'ground': 'average', '" + field + "': '" + answer + "'}}";
        assertThat(carried(item).part("footing").orElseThrow().warnings()).anyMatch(w -> w.contains(words));
        String[] told = told(item);
        assertThat(told[0]).contains("AN ENGINEER FIRST").contains(words);
        assertThat(told[1]).contains("an engineer first: ").contains(words).contains("average");
    }

    @Test
    void fixingsThatGiveNoCoupleAreNotEnough() {
        String item = BLADE + "{'columns': 1, 'rows': 2, 'vertical-pitch': '140 mm', 'allowable-tension': '3 kN', 'allowable-shear': '2 kN'}}";
        assertThat(told(item)[0]).contains("AN ENGINEER FIRST").contains("NOT enough");
        assertThat(told(item)[1]).contains("NOT enough").contains("1 column by 2 rows");
    }

    @Test
    void whatAFixingMustHoldIsNoCapacity() {
        String item = BLADE + "{'columns': 2, 'rows': 2, 'horizontal-pitch': '100 mm', 'vertical-pitch': '140 mm'}}";
        assertThat(told(item)[0]).startsWith("Each fixing must hold a pull").contains("was not given: that part is not checked").contains("not checked");
        assertThat(carried(item).part("fixings").orElseThrow().assumed()).anyMatch(a -> a.startsWith("No gap between wall and blade"));
    }

    @Test
    void aHoardingOnItsOwnFeetIsNotPlanted() {
        Part part = carried(HOARDING + "'held-by': 'its own feet'}").parts().get(0);
        assertThat(part.key()).isEqualTo("ballast");
        assertThat(part.refused()).hasValueSatisfying(why -> assertThat(why).contains("distance from the face to the ballast"));
        assertThat(carried(HOARDING + "'held-by': 'own posts'}").part("footing")).isPresent();
    }

    @Test
    void aRuleForTheEvacuatedIsNoRuleForTheFullWind() {
        String fence = "{'broadside': 1, 'basis': {'code': 'en-1991-1-4', 'edition': '2005', 'stability': '%s'}, 'site': {" + JobTexts.EN + "}, 'items': [{'mark': 'F1', 'kind': 'banner-fence', "
            + "'panel-length': '3.45 m', 'panel-height': '2 m', 'panels': 40, 'cover-solidity': 0.8, 'panel-mass': '18 kg', 'foot-mass': '25 kg', 'ground': '%s', 'held-by': 'its own feet'}]}";
        assertThat(RandomJobs.result(fence.formatted("evacuation-1.2", "grass").replace('\'', '"')).loads().orElseThrow().carried().orElseThrow().parts().get(0).warnings())
            .anyMatch(w -> w.contains("limiting wind"));
        assertThat(RandomJobs.result(fence.formatted("factor-1.5", "ice").replace('\'', '"')).loads().orElseThrow().carried().orElseThrow().parts().get(0).refused())
            .hasValueSatisfying(why -> assertThat(why).contains("no friction can be counted on ice"));
    }

    @Test
    void whichSideFacesTheWindIsSaid() {
        String item = SIGN + "'posts': {'count': 1, 'section': 'RHS 120x80x5 cold'}}";
        assertThat(told(item)[0]).contains("120 mm along the wind");
        assertThat(told(item)[1]).contains("120 mm along the wind");
    }

    @Test
    void postsThatWouldOverlapAreRefused() {
        assertThat(carried(SIGN + "'posts': {'count': 2, 'spacing': '0.05 m'}}").parts().get(0).refused()).hasValueSatisfying(why -> assertThat(why).contains("overlap"));
    }

    @Test
    void aGroundWithoutAClassIsNotTakenInSilence() {
        assertThat(carried(SIGN + "'posts': {'count': 1}, 'footing': {'kind': 'pad', 'ground': 'average'}}").part("footing").orElseThrow().assumed())
            .anyMatch(a -> a.contains("\"average\" names no class of soil"));
    }

    @ParameterizedTest
    @CsvSource({"foot-length, 650 m", "brace, 25 m"})
    void aSlipOfAUnitIsRefused(String field, String length) {
        String value = field.equals("brace") ? "{'lever': '" + length + "', 'mass': '80 kg'}" : "'" + length + "'";
        String fence = "{'mark': 'F1', 'kind': 'banner-fence', 'panel-length': '3.45 m', 'panel-height': '2 m', 'panels': 40, 'cover-solidity': 0.8, '" + field + "': " + value + "}";
        assertThatThrownBy(() -> AllJobs.assess(job(fence))).isInstanceOfSatisfying(BadJob.class, e -> assertThat(e.problems().get(0).text()).contains("above").contains("650 mm"));
    }

    /** A demand of newton metres does not stand beside a capacity of kilonewton metres. */
    @Test
    void demandAndCapacityStandInOneUnit() {
        for (String name : AllJobs.files().keySet().stream().filter(n -> n.endsWith(".json") && !n.contains("/")).toList()) {
            for (Block block : SheetMaker.of(AllJobs.assess(AllJobs.demo(name)), "2026-12-01").blocks()) {
                if (block instanceof Block.Table table && table.caption().endsWith("demand against capacity")) {
                    table.rows().stream().filter(r -> !r.cells().get(2).equals("0") && !r.cells().get(3).equals("0")).forEach(row ->
                        assertThat(unit(row.cells().get(2))).as(name + ": " + row.cells()).isEqualTo(unit(row.cells().get(3))));
                }
            }
        }
    }

    private static String unit(String text) {
        return text.contains("ft ") && text.contains("in") ? "ft in" : text.replaceAll("[-0-9./,]", "").strip();
    }
}
