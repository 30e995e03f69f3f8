package broadside.web;

import broadside.assess.Assessment;
import broadside.assess.Assessor;
import broadside.assess.Loads;
import broadside.crew.ActionLevels;
import broadside.panel.Item;
import broadside.quantity.Units;
import broadside.sheet.Drawing;
import broadside.sheet.Sheet;
import broadside.sheet.WindCard;
import java.util.Optional;

/** The makers of documents that the pages hand out: the one place where this package meets them. */
public interface Documents {

    /** The document of an assessed job. */
    Sheet sheet(Assessment assessment);

    /** What a crew reads at arm's length, by the levels at which it acts. */
    WindCard card(Assessment assessment, ActionLevels levels);

    /** The document that holds one item against every code. */
    Sheet sideBySide(Assessor assessor, Assessment assessment, Item item);

    /** The drawing of one item, with its loads when they are known. */
    Drawing drawing(Item item, Optional<Loads> loads, Units units);

    /** What that drawing shows, in words. */
    String words(Item item, Optional<Loads> loads, Units units);

    /**
     * The document as a PDF that holds its job file.
     *
     * @param paper  "a4" or "letter"
     */
    byte[] pdf(Sheet sheet, String paper, byte[] jobJson);

    /** A drawing as SVG text without styles or scripts, with a title and a description for those who cannot see it. */
    String svg(Drawing drawing, String title, String description);

    /** The job file inside a PDF that this tool wrote, or nothing when there is none. */
    Optional<byte[]> jobInPdf(byte[] pdf);

    /** The JSON Schema of the job file. */
    byte[] schema();
}
