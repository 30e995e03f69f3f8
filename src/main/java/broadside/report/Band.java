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
        private int next;
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

        private void rewind() {
            next = 0;
        }

        private boolean isDrawn() {
            return next == rows.size();
        }

        /** Draws lines down to the end of the page; returns the height reached, or 0 when none fits. */
        private double draw(Flow flow, double pad, boolean tagged) {
            double down = pad + (next == 0 ? drop : 0);
            Content content = flow.leaf().content();
            int from = next;
            while (next < rows.size() && down + rows.get(next).type().leading() <= flow.room() + TOLERANCE) {
                Row row = rows.get(next);
                if (next == from || tagged && row.tag() != rows.get(next - 1).tag()) {
                    open(flow, row.tag(), tagged, next > from);
                }
                double start = flow.left() + x + (right ? width - row.line().width() : 0);
                content.line(row.line(), start, flow.y(flow.top() + down + row.type().base()), row.type());
                down += row.type().leading();
                next++;
            }
            if (next > from) {
                content.close();
            }
            return next > from ? down : 0;
        }

        private static void open(Flow flow, Tag tag, boolean tagged, boolean afterAnother) {
            if (afterAnother) {
                flow.leaf().content().close();
            }
            if (tagged) {
                flow.leaf().open(tag);
            } else {
                flow.leaf().content().openArtifact("<</Type /Pagination>>");
            }
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
        cells.forEach(Cell::rewind);
        while (!stretch(flow, true)) {
            flow.turn();
        }
    }

    /** Draws the band once more as decoration, outside the text. */
    void placeAgain(Flow flow) {
        cells.forEach(Cell::rewind);
        stretch(flow, false);
    }

    /** Draws the lines that fit on this page; returns whether that was all. */
    private boolean stretch(Flow flow, boolean tagged) {
        double used = 0;
        for (Cell cell : cells) {
            used = Math.max(used, cell.draw(flow, pad, tagged));
        }
        boolean all = cells.stream().allMatch(Cell::isDrawn);
        if (used > 0 || all) {
            double top = flow.top();
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
}
