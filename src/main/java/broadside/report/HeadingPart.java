package broadside.report;

import java.util.List;

/** A heading that remembers where it came to stand, for the bookmarks. */
final class HeadingPart implements Part {

    private final int level;
    private final String text;
    private final Band band;
    private int page;
    private double top;

    /** @param level 1 for the title, 2 and 3 below it */
    HeadingPart(int level, String text, Flow flow, Tag parent) {
        this.level = level;
        this.text = text;
        Type type = level == 1 ? Type.TITLE : level == 2 ? Type.SECTION : Type.PART;
        Words words = flow.typeset().words().add(text, true);
        Band.Cell cell = new Band.Cell(0, flow.width()).add(words, type, parent.child("H" + level));
        band = new Band(level == 1 ? 0 : level == 2 ? 20 : 13, 0, List.of(cell));
    }

    int level() {
        return level;
    }

    String text() {
        return text;
    }

    int page() {
        return page;
    }

    /** Returns the distance from the upper edge of the page, in points. */
    double top() {
        return top;
    }

    @Override
    public double first() {
        return band.first();
    }

    @Override
    public void place(Flow flow) {
        flow.keep(first());
        page = flow.pageIndex();
        top = flow.top();
        band.place(flow);
    }
}
