package broadside.sheet;

import broadside.assess.Assessment;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Tone;
import java.util.ArrayList;
import java.util.List;

/** Makes the document of an assessment: the answer first, the reasons after it, the calculation last. */
public final class SheetMaker {

    /** The line that stands on every page of every output. */
    public static final String PRELIMINARY = "PRELIMINARY - not for construction - for review by a licensed engineer";

    /**
     * The document.
     *
     * @param date  date of the document, ISO 8601; a date in the job comes first
     */
    public static Sheet of(Assessment assessment, String date) {
        Job job = assessment.job();
        Format format = new Format(job.units());
        boolean many = assessment.items().size() > 1;
        List<Block> blocks = answers(assessment, format);
        for (int i = 0; i < assessment.items().size(); i++) {
            blocks.addAll(SiteSheet.of(assessment, assessment.items().get(i), format, many ? "item-" + (i + 1) + "-" : ""));
        }
        blocks.add(new Block.NewPage());
        blocks.addAll(CheckList.of(assessment, format, job.head("date").orElse(date)));
        for (int i = 0; i < assessment.items().size(); i++) {
            blocks.addAll(CalculationBlocks.of(assessment.items().get(i), format, many ? "item-" + (i + 1) + "-" : "", many));
        }
        return sheet(assessment, date, blocks);
    }

    /** The document as far as the notes, without site sheets, check list and calculation: for a screen of text. */
    public static Sheet answer(Assessment assessment) {
        return sheet(assessment, "", answers(assessment, new Format(assessment.job().units())));
    }

    private static Sheet sheet(Assessment assessment, String date, List<Block> blocks) {
        Job job = assessment.job();
        return new Sheet(title(job), job.head("reference").orElse("not given"), job.head("revision").orElse("not given"), job.head("date").orElse(date), PRELIMINARY,
            assessment.about().line(), blocks);
    }

    private static String title(Job job) {
        return job.head("title").orElse("Wind load summary");
    }

    private static List<Block> answers(Assessment assessment, Format format) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Heading(1, title(assessment.job()), "top"));
        blocks.add(new Paragraph("Preliminary wind load summary to " + assessment.code().edition().property("title") + ".", Tone.PLAIN));
        blocks.add(new Paragraph(PRELIMINARY + ". The local building code, the authority and the engineer of record decide. Wind can kill: a sign, fence or "
            + "panel that comes loose is dangerous far below design speed.", Tone.CAUTION));
        boolean many = assessment.items().size() > 1;
        if (many) {
            blocks.addAll(Overview.of(assessment, format));
        }
        int number = 0;
        for (ItemResult item : assessment.items()) {
            String anchor = many ? "item-" + ++number + "-" : "";
            if (many) {
                blocks.add(new Heading(2, "Item " + item.item().mark(), anchor + "item"));
            }
            blocks.addAll(ItemBlocks.of(assessment, item, format, anchor, many ? 3 : 2));
        }
        return blocks;
    }

    private SheetMaker() { }
}
