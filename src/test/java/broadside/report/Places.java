package broadside.report;

import java.io.IOException;
import java.io.StringWriter;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;

/** Where the characters of a PDF stand. */
final class Places {

    /** Returns left edge, right edge and base line, from the upper left corner in points, of each run with the text. */
    static List<double[]> of(byte[] pdf, String text) throws IOException {
        List<double[]> places = new ArrayList<>();
        try (PDDocument document = Loader.loadPDF(pdf)) {
            new PDFTextStripper() {
                @Override
                protected void writeString(String run, List<TextPosition> positions) {
                    if (run.contains(text)) {
                        TextPosition last = positions.get(positions.size() - 1);
                        places.add(new double[] {positions.get(0).getXDirAdj(),
                            last.getXDirAdj() + last.getWidthDirAdj(), positions.get(0).getYDirAdj()});
                    }
                }
            }.writeText(document, new StringWriter());
        }
        return places;
    }

    private Places() { }
}
