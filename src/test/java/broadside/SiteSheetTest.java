package broadside;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.assess.Assessment;
import broadside.assess.Job;
import broadside.report.Attachment;
import broadside.report.Paper;
import broadside.report.PdfWriter;
import broadside.sheet.SheetMaker;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Those who build get one page for each item, with all that they need and without the calculation. */
class SiteSheetTest {

    static Stream<String> demos() {
        return AllJobs.files().keySet().stream().filter(n -> n.endsWith(".json") && !n.contains("/")).sorted();
    }

    private static List<String> pages(Job job, Assessment assessment, Paper paper) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        new PdfWriter().write(SheetMaker.of(assessment, "2026-12-01"), paper, new Attachment("job.json", "the job", new byte[] {'{', '}'}), out);
        List<String> pages = new ArrayList<>();
        try (PDDocument pdf = Loader.loadPDF(out.toByteArray())) {
            PDFTextStripper stripper = new PDFTextStripper();
            for (int i = 1; i <= pdf.getNumberOfPages(); i++) {
                stripper.setStartPage(i);
                stripper.setEndPage(i);
                pages.add(stripper.getText(pdf).replaceAll("\\s+", " "));
            }
        }
        return pages;
    }

    @ParameterizedTest
    @MethodSource("demos")
    void one_page_for_each_item_on_both_papers(String name) throws IOException {
        Job job = AllJobs.demo(name);
        Assessment assessment = AllJobs.assess(job);
        long items = assessment.items().stream().filter(i -> i.loads().isPresent()).count();
        for (Paper paper : Paper.values()) {
            List<String> sheets = pages(job, assessment, paper).stream().filter(p -> p.contains("Site sheet, ")).toList();
            assertThat(sheets).hasSize((int) items);
            assertThat(sheets).allSatisfy(sheet -> assertThat(sheet).contains("Where it stands").contains("What carries it").contains("Comes down at").contains("Order of work")
                .contains("the engineer of record").contains("who stops the work").contains("PRELIMINARY").doesNotContain("Check list").doesNotContain("EN 1993"));
        }
    }

    @ParameterizedTest
    @MethodSource("demos")
    void what_was_found_stands_on_it(String name) throws IOException {
        Job job = AllJobs.demo(name);
        Assessment assessment = AllJobs.assess(job);
        String all = String.join(" ", pages(job, assessment, Paper.A4).stream().filter(p -> p.contains("Site sheet, ")).toList());
        assessment.items().stream().flatMap(i -> i.loads().stream()).flatMap(l -> l.carried().stream()).flatMap(c -> c.parts().stream()).forEach(part -> {
            part.results().stream().filter(r -> r.key().equals("section") || r.key().equals("standing")).forEach(r -> assertThat(all).contains(r.text()));
            part.assumed().forEach(a -> assertThat(all).contains(a));
            assertThat(all.contains("NOT ENOUGH") || part.passes() || part.refused().isPresent()).isTrue();
        });
    }
}
