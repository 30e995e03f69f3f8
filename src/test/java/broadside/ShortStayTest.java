package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.BadJob;
import broadside.sheet.SheetMaker;
import org.junit.jupiter.api.Test;

/** A fence that stands for three days, with the code's own rule for a short stay asked for and no return period typed. */
class ShortStayTest {

    @Test
    void a_document_is_made_by_every_code_or_the_field_is_named() {
        int made = 0;
        for (String[] code : JobTexts.CODES) {
            for (String stay : new String[] {"3 days", "3 months", "2 years"}) {
                try {
                    var job = JobTexts.job(code[0], code[1] + ", 'stands-for': '" + stay + "', 'duration-rule': 'code'", "{'mark': 'F1', 'kind': 'banner-fence', 'panel-length': '3.45 m', "
                        + "'panel-height': '2 m', 'panels': 40, 'cover-solidity': 0.8, 'panel-mass': '18 kg', 'foot-mass': '25 kg', 'ground': 'grass', 'held-by': 'its own feet'}");
                    assertThat(SheetMaker.of(AllJobs.assess(job), "2026-12-01").blocks()).isNotEmpty();
                    made++;
                } catch (BadJob e) {
                    assertThat(e.problems()).allSatisfy(p -> assertThat(p.path()).startsWith("site."));
                }
            }
        }
        assertThat(made).isGreaterThanOrEqualTo(3);
    }
}
