package broadside.report;

import java.util.ArrayList;
import java.util.List;

/**
 * Texts side by side. A band stays on one page; one that is taller than a page goes on at the top of the next, line by
 * line.
 */
final class Band implements Part {

    /** A line of a cell with the element that it belongs to. */
    private record Row(Words.Line line, Type type, Tag tag) { }

    /** One text of the band; {@code x} counts from the left edge of the text. */
    static final class Cell {

        private final double x;
        private final double width;
        private final boolean right;
        private double drop;
        private final List<Row> rows = new ArrayList<>();

        /** @param drop how much lower than the others the first line stands, so that base lines agree */
        Cell(double x, double width, boolean right, double drop) {
            this.x = x;
            this.width = width;
            this.right = right;
            this.drop = drop;
        }

        Cell(double x, double width) {
            this(x, width, false, 0);
        }

        Cell add(Words words, Type type, Tag tag) {
            for (Words.Line line : words.lines(type.size(), width)) {
                rows.add(new Row(line, type, tag));
            }
            return this;
        }

        private double height() {
            double sum = rows.isEmpty() ? 0 : drop;
            for (Row row : rows) {
                sum += row.type().leading();
            }
            return sum;
        }
    }

    /** Lowers the shorter cells so that all end on the same line, as the headings of columns do. */
    static List<Cell> level(List<Cell> cells) {
        double tallest = cells.stream().mapToDouble(Cell::height).max().orElse(0);
        if (tallest <= TALLEST_LEVEL) {
            cells.forEach(cell -> cell.drop += cell.rows.isEmpty() ? 0 : tallest - cell.height());
        }
        return cells;
    }

    /** Draws what goes with a stretch of the band on one page: a rule below it, a bar beside it. */
    interface Trim {
        void draw(Content content, Flow flow, double top, double bottom);
    }

    /** Cells taller than this may go on to the next page and begin at the top, all of them. */
    private static final double TALLEST_LEVEL = 150;
    private static final double TOLERANCE = 0.01;
    private static final Trim NONE = (content, flow, top, bottom) -> { };

    private final double gap;
    private final double pad;
    private final List<Cell> cells;
    private final Trim trim;

    /**
     * @param gap space above the band, left out at the top of a page
     * @param pad space above and below the text inside the band
     */
    Band(double gap, double pad, List<Cell> cells, Trim trim) {
        this.gap = gap;
        this.pad = pad;
        this.cells = List.copyOf(cells);
        this.trim = trim;
    }

    Band(double gap, double pad, List<Cell> cells) {
        this(gap, pad, cells, NONE);
    }

    double height() {
        return cells.stream().mapToDouble(Cell::height).max().orElse(0) + 2 * pad;
    }

    @Override
    public double first() {
        return gap + height();
    }

    @Override
    public void place(Flow flow) {
        flow.begin(gap, height());
        int[] next = new int[cells.size()];
        while (!stretch(flow, next, true)) {
            flow.turn();
        }
    }

    /** Draws the band once more as decoration, outside the text. */
    void placeAgain(Flow flow) {
        stretch(flow, new int[cells.size()], false);
    }

    /** Draws the lines that fit on this page; returns whether that was all. */
    private boolean stretch(Flow flow, int[] next, boolean tagged) {
        double top = flow.top();
        double used = 0;
        boolean all = true;
        boolean any = false;
        for (int i = 0; i < cells.size(); i++) {
            int from = next[i];
            double start = pad + (from == 0 ? cells.get(i).drop : 0);
            double end = column(flow, cells.get(i), from, next, i, start, tagged);
            any |= next[i] > from;
            used = Math.max(used, next[i] > from ? end : 0);
            all &= next[i] == cells.get(i).rows.size();
        }
        if (any || all) {
            double height = used == 0 ? 2 * pad : used + pad;
            decorate(flow, top, top + height);
            flow.advance(height);
        }
        return all;
    }

    private void decorate(Flow flow, double top, double bottom) {
        if (trim != NONE) {
            Content content = flow.leaf().content();
            content.openArtifact("<</Type /Layout>>");
            trim.draw(content, flow, top, bottom);
            content.close();
        }
    }

    /** Draws lines of one cell down to the end of the page; returns the height reached. */
    private static double column(Flow flow, Cell cell, int from, int[] next, int index, double start, boolean tagged) {
        double down = start;
        Tag open = null;
        Flow.Leaf leaf = flow.leaf();
        int i = from;
        if (!tagged && !cell.rows.isEmpty()) {
            leaf.content().openArtifact("<</Type /Pagination>>");
        }
        while (i < cell.rows.size() && down + cell.rows.get(i).type().leading() <= flow.room() + TOLERANCE) {
            Row row = cell.rows.get(i);
            if (tagged && row.tag() != open) {
                if (open != null) {
                    leaf.content().close();
                }
                open = row.tag();
                leaf.open(open);
            }
            double x = flow.left() + cell.x + (cell.right ? cell.width - row.line().width() : 0);
            leaf.content().line(row.line(), x, flow.y(flow.top() + down + row.type().base()), row.type());
            down += row.type().leading();
            i++;
        }
        if (open != null || !tagged && !cell.rows.isEmpty()) {
            leaf.content().close();
        }
        next[index] = i;
        return down;
    }
}
