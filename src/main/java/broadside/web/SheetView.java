package broadside.web;

import broadside.sheet.Block;
import broadside.sheet.Runs;
import broadside.sheet.Sheet;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;

/** A document on the screen: the blocks of its sheet, each under the name of the fragment that shows it. */
public final class SheetView {

    private static final Pattern ANCHOR = Pattern.compile("(?:item-(\\d{1,3})-)?([a-z-]+)");

    /** Which questions stand behind which part of a sheet. */
    private static final Map<String, String> QUESTIONS = Map.of("drawing", "#item", "cases", "#support", "assumed", "#place", "check-list", "#paper",
        "calculation", "#code");

    /** The answer page. */
    public record Page(Sheet sheet, boolean titled, List<Jump> contents, List<Change> changes, List<Download> downloads, List<Piece> head,
                       List<Piece> rest) { }

    /** A line of the contents. */
    public record Jump(String anchor, String text) { }

    /** A link back to the questions behind a part. */
    public record Change(String href, String text) { }

    /** A file to take along. */
    public record Download(String href, String text) { }

    /** One block; {@code kind} names its fragment. {@code level} is that of a heading, {@code source} the address of a picture. */
    public record Piece(String kind, Block block, int level, String source, List<Step> steps, List<Change> changes) { }

    /** A line of the calculation with its subscripts split off. */
    public record Step(Block.StepLine line, List<Runs.Run> symbol, List<Runs.Run> formula, List<Runs.Run> found) { }

    /** The page of a sheet, its pictures at an address to which their number is added: what stands before its first part, the contents, and the parts. */
    static Page of(Sheet sheet, String pictures, List<Change> changes, List<Download> downloads) {
        List<Piece> pieces = pieces(sheet, pictures, changes);
        int first = 0;
        while (first < pieces.size() && pieces.get(first).level() < 2) {
            first++;
        }
        return new Page(sheet, titled(sheet), contents(sheet), changes, downloads, pieces.subList(0, first), pieces.subList(first, pieces.size()));
    }

    /** Whether the sheet itself says that it is preliminary. */
    static boolean cautioned(Sheet sheet) {
        return sheet.blocks().stream().anyMatch(b -> b instanceof Block.Paragraph text && text.tone() == Block.Tone.CAUTION
            && text.text().startsWith(sheet.caution()));
    }

    /** Turns the blocks of a sheet into the pieces of a page. */
    private static List<Piece> pieces(Sheet sheet, String address, List<Change> changes) {
        List<Piece> pieces = new ArrayList<>();
        int pictures = 0;
        for (Block block : sheet.blocks()) {
            String source = block instanceof Block.Picture ? address + "&picture=" + pictures++ : "";
            int level = block instanceof Block.Heading heading ? Math.max(1, Math.min(heading.level(), 4)) : 0;
            List<Change> own = block instanceof Block.Heading heading && level > 1 ? fitting(heading, changes) : List.of();
            pieces.add(new Piece(kind(block), block, level, source, block instanceof Block.Steps steps ? steps(steps) : List.of(), own));
        }
        return pieces;
    }

    private static List<Jump> contents(Sheet sheet) {
        return sheet.blocks().stream().filter(b -> b instanceof Block.Heading heading && heading.level() == 2)
            .map(b -> new Jump(((Block.Heading) b).anchor(), ((Block.Heading) b).text())).toList();
    }

    private static boolean titled(Sheet sheet) {
        return sheet.blocks().stream().anyMatch(b -> b instanceof Block.Heading heading && heading.level() == 1);
    }

    private static List<Step> steps(Block.Steps steps) {
        return steps.lines().stream().map(l -> new Step(l, Runs.of(l.symbol()), Runs.of(l.formula()), Runs.of(l.found()))).toList();
    }

    /** The questions behind a part, by the anchor of its heading; a part of a later item leads to that item. */
    private static List<Change> fitting(Block.Heading heading, List<Change> changes) {
        var found = ANCHOR.matcher(heading.anchor());
        String questions = found.matches() ? QUESTIONS.get(found.group(2)) : null;
        if (questions == null) {
            return List.of();
        }
        boolean ofItem = found.group(1) != null && (questions.equals("#item") || questions.equals("#support"));
        String item = "&item=" + (ofItem ? Integer.parseInt(found.group(1)) - 1 : 0);
        return changes.stream().filter(c -> c.href().endsWith(item + questions)).limit(1).toList();
    }

    private static String kind(Block block) {
        if (block instanceof Block.Heading) {
            return "heading";
        } else if (block instanceof Block.Paragraph) {
            return "paragraph";
        } else if (block instanceof Block.Answer) {
            return "answer";
        } else if (block instanceof Block.Facts) {
            return "facts";
        } else if (block instanceof Block.Table) {
            return "table";
        } else if (block instanceof Block.Picture) {
            return "picture";
        } else if (block instanceof Block.Steps) {
            return "steps";
        }
        return block instanceof Block.Notes ? "notes" : "new-page";
    }

    private SheetView() { }
}
