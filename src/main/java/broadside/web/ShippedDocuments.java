package broadside.web;

import broadside.assess.Assessment;
import broadside.assess.Assessor;
import broadside.assess.Loads;
import broadside.crew.ActionLevels;
import broadside.job.JobText;
import broadside.job.SchemaText;
import broadside.panel.Item;
import broadside.quantity.Units;
import broadside.report.Attachment;
import broadside.report.Paper;
import broadside.report.PdfReader;
import broadside.report.PdfWriter;
import broadside.report.ReportException;
import broadside.report.SvgWriter;
import broadside.sheet.ComparisonBlocks;
import broadside.sheet.Drawing;
import broadside.sheet.ItemDrawing;
import broadside.sheet.Sheet;
import broadside.sheet.SheetMaker;
import broadside.sheet.WindCard;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.Clock;
import java.time.LocalDate;
import java.util.Optional;

/** The documents of this tool: its sheet, its drawings, its PDF. */
public final class ShippedDocuments implements Documents {

    private final Clock clock;

    /** Made at the first PDF, since reading its fonts takes a while, and kept. */
    private static final class Writer {
        private static final PdfWriter SHARED = new PdfWriter();
    }

    /** The clock gives the date of a document whose job has none. */
    public ShippedDocuments(Clock clock) {
        this.clock = clock;
    }

    @Override
    public Sheet sheet(Assessment assessment) {
        return SheetMaker.of(assessment, LocalDate.now(clock).toString());
    }

    @Override
    public WindCard card(Assessment assessment, ActionLevels levels) {
        return WindCard.of(assessment, levels, LocalDate.now(clock).toString());
    }

    @Override
    public Sheet sideBySide(Assessor assessor, Assessment assessment, Item item) {
        return ComparisonBlocks.sheet(assessor, assessment, item, LocalDate.now(clock).toString());
    }

    @Override
    public Drawing drawing(Item item, Optional<Loads> loads, Units units) {
        return ItemDrawing.of(item, loads, units);
    }

    @Override
    public String words(Item item, Optional<Loads> loads, Units units) {
        return ItemDrawing.words(item, loads, units);
    }

    @Override
    public byte[] pdf(Sheet sheet, String paper, byte[] jobJson) {
        ByteArrayOutputStream out = new ByteArrayOutputStream(64 << 10);
        try {
            Writer.SHARED.write(sheet, paper.equals("letter") ? Paper.LETTER : Paper.A4,
                new Attachment("job.json", "the job that this document was made from", jobJson), out);
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public String svg(Drawing drawing, String title, String description) {
        return SvgWriter.svg(drawing, title, description);
    }

    @Override
    public Optional<byte[]> jobInPdf(byte[] pdf) {
        try {
            return PdfReader.job(pdf);
        } catch (ReportException e) {
            throw new Refused(400, "This PDF cannot be read", e.getMessage());
        }
    }

    @Override
    public byte[] schema() {
        return JobText.write(SchemaText.of());
    }
}
