package broadside.web;

import broadside.sheet.Block;
import broadside.sheet.Runs;
import broadside.sheet.Sheet;
import java.util.ArrayList;
import java.util.List;

/** A document on the screen: the blocks of its sheet, each under the name of the fragment that shows it. */
public final class SheetView {

    /** The answer page. */
    public record Page(Sheet sheet, boolean titled, List<Jump> contents, List<Change> changes, List<Download> downloads, List<Piece> pieces) { }

    /** A line of the contents. */
    public record Jump(String anchor, String text) { }

    /** A link back to the questions behind a part. */
    public record Change(String href, String text) { }

    /** A file to take along. */
    public record Download(String href, String text) { }

    /** One block; {@code kind} names its fragment. {@code level} is that of a heading, {@code source} the address of a picture. */
    public record Piece(String kind, Block block, int level, String source, List<Step> steps, List<Change> changes) { }

    /** A line of the calculation with its subscripts split off. */
    public record Step(Block.StepLine line, List<Runs.Run> symbol, List<Runs.Run> formula, List<Runs.Run> numbers) { }

    /** Turns the blocks of a sheet into the pieces of a page. */
    static List<Piece> pieces(Sheet sheet, String token, List<Change> changes) {
        List<Piece> pieces = new ArrayList<>();
        int pictures = 0;
        for (Block block : sheet.blocks()) {
            String source = block instanceof Block.Picture ? "/drawing.svg?picture=" + pictures++ + "&j=" + token : "";
            int level = block instanceof Block.Heading heading ? Math.max(1, Math.min(heading.level(), 4)) : 0;
            List<Change> own = block instanceof Block.Heading heading && level > 1 ? fitting(heading, changes) : List.of();
            pieces.add(new Piece(kind(block), block, level, source, block instanceof Block.Steps steps ? steps(steps) : List.of(), own));
        }
        return pieces;
    }

    static List<Jump> contents(Sheet sheet) {
        return sheet.blocks().stream().filter(b -> b instanceof Block.Heading heading && heading.level() == 2)
            .map(b -> new Jump(((Block.Heading) b).anchor(), ((Block.Heading) b).text())).toList();
    }

    static boolean titled(Sheet sheet) {
        return sheet.blocks().stream().anyMatch(b -> b instanceof Block.Heading heading && heading.level() == 1);
    }

    private static List<Step> steps(Block.Steps steps) {
        return steps.lines().stream().map(l -> new Step(l, Runs.of(l.symbol()), Runs.of(l.formula()), Runs.of(l.numbers()))).toList();
    }

    /** The questions behind a part, by the words of its heading. */
    private static List<Change> fitting(Block.Heading heading, List<Change> changes) {
        String text = (heading.text() + " " + heading.anchor()).toLowerCase(java.util.Locale.ROOT);
        String part = text.contains("site") || text.contains("where") || text.contains("wind") ? "#place"
            : text.contains("code") || text.contains("basis") ? "#code"
            : text.contains("post") || text.contains("support") || text.contains("carr") ? "#support"
            : text.contains("drawing") || text.contains("panel") || text.contains("board") || text.contains("item") ? "#item" : "#none";
        return changes.stream().filter(c -> c.href().endsWith(part)).limit(1).toList();
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
