package broadside.report;

import broadside.sheet.Block.Column;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.Table;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A table, measured and tagged. Its head is drawn again on each page that it goes on to. */
final class TableParts implements Part {

    private static final double GUTTER = 10;
    /** A little more than the sum of the widths, so that rounding does not break a line that fits. */
    private static final double ROUNDING = 0.1;
    private static final double PAD = 2.5;
    /** A head taller than this share of a page is not repeated. */
    private static final double TALLEST_HEAD = 0.3;

    private final Flow flow;
    private final Table table;
    private final double[] widths;
    private final Band head;
    private final List<Band> rows = new ArrayList<>();
    private final List<Band> caption = new ArrayList<>();

    TableParts(Flow flow, Tag parent, Table table) {
        this.flow = flow;
        this.table = table;
        check(table);
        Tag tag = parent.child("Table");
        Words title = words(table.caption(), true);
        if (!title.isEmpty()) {
            Band.Cell cell = new Band.Cell(0, flow.width()).add(title, Type.TABLE, tag.child("Caption"));
            caption.add(new Band(9, 0, List.of(cell)));
        }
        widths = widths();
        // A head stands only above a body; without rows the headings are the one row of the table.
        head = head((table.rows().isEmpty() ? tag : tag.child("THead")).child("TR"));
        if (!table.rows().isEmpty()) {
            Tag body = tag.child("TBody");
            table.rows().forEach(row -> rows.add(row(row, body.child("TR"))));
        }
    }

    private static void check(Table table) {
        if (table.columns().isEmpty()) {
            throw new IllegalArgumentException("a table needs at least one column: " + table.caption());
        }
        for (Row row : table.rows()) {
            if (row.cells().size() != table.columns().size()) {
                throw new IllegalArgumentException("a row has " + row.cells().size() + " cells and its table "
                    + table.columns().size() + " columns: " + table.caption());
            }
        }
    }

    /** Headings stand on one line where there is room for all; else those above numbers give way first. */
    private double[] widths() {
        int count = table.columns().size();
        int[] weights = table.columns().stream().mapToInt(Column::weight).toArray();
        double room = flow.width();
        for (int i = 1; i < count; i++) {
            room -= gutter(i);
        }
        double[] least = new double[count];
        double[] cells = new double[count];
        double[] whole = new double[count];
        for (int i = 0; i < count; i++) {
            Column column = table.columns().get(i);
            Words heading = words(column.heading(), true);
            least[i] = heading.widestWord(Type.TABLE.size());
            cells[i] = column.number() ? least[i] : heading.wholeWidth(Type.TABLE.size());
            measure(i, cells, least);
            whole[i] = Math.max(cells[i], heading.wholeWidth(Type.TABLE.size()) + ROUNDING);
        }
        boolean roomForCells = Arrays.stream(cells).sum() <= room;
        return Columns.fit(roomForCells ? whole : cells, roomForCells ? cells : least, weights, room);
    }

    private void measure(int i, double[] whole, double[] least) {
        for (Row row : table.rows()) {
            Words words = words(row.cells().get(i), row.marked());
            whole[i] = Math.max(whole[i], words.wholeWidth(Type.TABLE.size()));
            least[i] = Math.max(least[i], words.widestWord(Type.TABLE.size()));
        }
        whole[i] += ROUNDING;
        least[i] += ROUNDING;
    }

    private Words words(String text, boolean bold) {
        return flow.typeset().words().add(text, bold);
    }

    /** The space before a column; text does not stand close beside a number. */
    private double gutter(int column) {
        boolean close = table.columns().get(column - 1).number() && !table.columns().get(column).number();
        return close ? GUTTER * 2 : GUTTER;
    }

    private Band head(Tag tag) {
        List<Band.Cell> cells = new ArrayList<>();
        for (int i = 0; i < widths.length; i++) {
            Tag cell = tag.child("TH").attribute(Tag.Attribute.COLUMN_HEADING);
            cells.add(cell(i).add(words(table.columns().get(i).heading(), true), Type.TABLE, cell));
        }
        return new Band(caption.isEmpty() ? 9 : 2, PAD, Band.level(cells), (content, f, top, bottom) ->
            content.rule(f.left(), f.y(bottom), f.left() + f.width(), f.y(bottom), 1, Colour.INK));
    }

    private Band row(Row row, Tag tag) {
        List<Band.Cell> cells = new ArrayList<>();
        for (int i = 0; i < widths.length; i++) {
            Tag cell = tag.child(i == 0 ? "TH" : "TD");
            if (i == 0) {
                cell.attribute(Tag.Attribute.ROW_HEADING);
            }
            cells.add(cell(i).add(words(row.cells().get(i), row.marked()), Type.TABLE, cell));
        }
        return new Band(0, PAD, cells, TextParts::hairline);
    }

    private Band.Cell cell(int i) {
        double x = 0;
        for (int k = 0; k < i; k++) {
            x += widths[k] + gutter(k + 1);
        }
        return new Band.Cell(x, widths[i], table.columns().get(i).number(), 0);
    }

    @Override
    public double first() {
        double above = caption.isEmpty() ? 0 : caption.get(0).first();
        return above + head.first() + (rows.isEmpty() ? 0 : rows.get(0).first());
    }

    @Override
    public void place(Flow target) {
        target.keep(first());
        caption.forEach(band -> band.place(target));
        head.place(target);
        if (head.height() < target.body() * TALLEST_HEAD) {
            target.repeat(() -> head.placeAgain(target));
        }
        rows.forEach(band -> band.place(target));
        target.repeat(() -> { });
    }
}
