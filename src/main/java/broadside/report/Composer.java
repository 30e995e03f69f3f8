package broadside.report;

import broadside.sheet.Block;
import broadside.sheet.Sheet;
import java.util.ArrayList;
import java.util.List;

/** Turns the blocks of a sheet into measured parts, places them on pages and writes the margins of each page. */
final class Composer {

    private static final String MARGIN_OF_PAGE = "<</Type /Pagination /Subtype /%s>>";

    private final Sheet sheet;
    private final Flow flow;
    private final Tag top;
    private final TextParts texts;
    private final List<HeadingPart> headings = new ArrayList<>();

    Composer(Sheet sheet, Flow flow, Tag top) {
        this.sheet = sheet;
        this.flow = flow;
        this.top = top;
        texts = new TextParts(flow, top);
    }

    /** Fills the pages; returns the headings in order, each with its place. */
    List<HeadingPart> compose() {
        List<Part> parts = new ArrayList<>();
        sheet.blocks().forEach(block -> parts.addAll(parts(block)));
        for (int i = 0; i < parts.size(); i++) {
            if (parts.get(i) instanceof HeadingPart) {
                flow.keep(withNext(parts, i));
            }
            parts.get(i).place(flow);
        }
        for (int i = 0; i < flow.leaves().size(); i++) {
            margins(flow.leaves().get(i).content(), i + 1, flow.leaves().size());
        }
        return headings;
    }

    /** Returns the height of a heading, of those that follow it directly, and of the beginning of what they head. */
    private static double withNext(List<Part> parts, int from) {
        double sum = 0;
        int i = from;
        while (i < parts.size() && parts.get(i) instanceof HeadingPart) {
            sum += parts.get(i++).first();
        }
        return i < parts.size() ? sum + parts.get(i).first() : sum;
    }

    private List<Part> parts(Block block) {
        if (block instanceof Block.Heading heading) {
            return heading(heading);
        } else if (block instanceof Block.Paragraph paragraph) {
            return texts.paragraph(paragraph);
        } else if (block instanceof Block.Answer answer) {
            return texts.answer(answer);
        } else if (block instanceof Block.Facts facts) {
            return texts.facts(facts);
        } else if (block instanceof Block.Notes notes) {
            return texts.notes(notes);
        } else if (block instanceof Block.Table table) {
            return List.of(new TableParts(flow, top, table));
        } else if (block instanceof Block.Steps steps) {
            return new StepParts(flow, top).steps(steps);
        } else if (block instanceof Block.Picture picture) {
            return List.of(new PicturePart(flow, top, picture));
        }
        return List.of(new PageBreak());
    }

    /** Levels begin at 1 and go down by one at a time, as PDF/UA asks. */
    private List<Part> heading(Block.Heading block) {
        int deepest = headings.isEmpty() ? 1 : Math.min(3, headings.get(headings.size() - 1).level() + 1);
        String text = flow.typeset().words().add(block.text(), true).isEmpty() ? "Untitled" : block.text();
        HeadingPart heading = new HeadingPart(Math.max(1, Math.min(deepest, block.level())), text, flow, top);
        headings.add(heading);
        return List.of(heading);
    }

    private void margins(Content content, int page, int pages) {
        double left = flow.left();
        double right = left + flow.width();
        content.openArtifact(MARGIN_OF_PAGE.formatted("Header"));
        Words.Line caution = words(sheet.caution(), true).fitted(Type.MARGIN.size(), flow.width());
        content.line(caution, left, flow.y(36), Type.MARGIN);
        content.rule(left, flow.y(42), right, flow.y(42), 0.5, Colour.GREY);
        content.close();
        content.openArtifact(MARGIN_OF_PAGE.formatted("Footer"));
        content.rule(left, 50, right, 50, 0.5, Colour.GREY);
        footer(content, words(sheet.title(), true), words("page " + page + " of " + pages, false), 38);
        footer(content, words("Reference " + sheet.reference() + ", revision " + sheet.revision() + ", " + sheet.date(),
            false), words(sheet.made(), false), 26);
        content.close();
    }

    private Words words(String text, boolean bold) {
        return flow.typeset().words().add(text, bold);
    }

    /** One line of the footer; the text on the left gives way to the one on the right. */
    private void footer(Content content, Words left, Words right, double base) {
        double size = Type.MARGIN.size();
        Words.Line end = right.fitted(size, flow.width() * 0.6);
        content.line(left.fitted(size, flow.width() - end.width() - 12), flow.left(), base, Type.MARGIN);
        content.line(end, flow.left() + flow.width() - end.width(), base, Type.MARGIN);
    }

    /** What follows stands on a new page. */
    private record PageBreak() implements Part {

        @Override
        public double first() {
            return 0;
        }

        @Override
        public void place(Flow flow) {
            flow.breakNext();
        }
    }
}
