package broadside.sheet;

import java.util.List;

/**
 * The document of one job: made once from the assessment, written as a page and as a PDF from the same blocks.
 * Its texts are finished: no writer computes, rounds or joins units.
 *
 * @param title      name of the job, as typed
 * @param reference  the job's own reference, or "not given"
 * @param revision   revision letter, or "not given"
 * @param date       date of the document, ISO 8601
 * @param caution    the line that stands on every page
 * @param made       name and version of the tool and the digest of its tables
 * @param blocks     the blocks in the order of reading
 */
public record Sheet(String title, String reference, String revision, String date, String caution, String made,
                    List<Block> blocks) {

    public Sheet {
        blocks = List.copyOf(blocks);
    }
}
