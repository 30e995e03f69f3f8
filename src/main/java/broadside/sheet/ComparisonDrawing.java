package broadside.sheet;

import broadside.assess.Comparison.Line;
import broadside.assess.Comparison;
import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.quantity.Units;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import broadside.sheet.Drawing.Shape;
import java.util.ArrayList;
import java.util.List;

/** One row for each code, a dot on a common axis of pressure, the number beside it. */
final class ComparisonDrawing {

    private static final double ROW = 20;
    private static final double LEFT = 168;
    private static final double RIGHT = 66;

    static Drawing of(Comparison comparison, Format format) {
        List<Line> lines = comparison.lines().stream().filter(l -> l.found().isPresent()).toList();
        List<Shape> shapes = new ArrayList<>();
        boolean us = format.units() == Units.US;
        double unit = Unit.of(Dimension.PRESSURE, us ? "psf" : "kPa").orElseThrow().toSi();
        double most = lines.stream().mapToDouble(l -> l.found().orElseThrow().pressure()).max().orElse(unit) / unit;
        double step = step(most);
        double end = Math.ceil(most / step - 1e-9) * step;
        double width = ItemDrawing.WIDTH - LEFT - RIGHT;
        double height = ROW * lines.size() + 44;
        double bottom = ROW * lines.size() + 10;
        for (int i = 0; i <= Math.round(end / step); i++) {
            double x = LEFT + width * i * step / end;
            shapes.add(new Drawing.Line(x, i == 0 ? 4 : bottom - 4, x, bottom, Canvas.THIN, Ink.BLACK, false));
            shapes.add(text(x, bottom + 12, Format.count(Math.round(i * step * 1000) / 1000.0), Anchor.MIDDLE, false));
        }
        shapes.add(new Drawing.Line(LEFT, bottom, LEFT + width, bottom, Canvas.THIN, Ink.BLACK, false));
        shapes.add(text(LEFT + width / 2, bottom + 26, "mean wind pressure on the panel, " + (us ? "psf" : "kPa"), Anchor.MIDDLE, false));
        for (int i = 0; i < lines.size(); i++) {
            row(lines.get(i), ROW * i + 14, new Axis(LEFT, width / (end * unit)), format, shapes);
        }
        return new Drawing(ItemDrawing.WIDTH, height, shapes);
    }

    /** Where the axis begins on paper, and points for each pascal. */
    private record Axis(double start, double scale) { }

    private static void row(Line line, double y, Axis axis, Format format, List<Shape> shapes) {
        double pressure = line.found().orElseThrow().pressure();
        double x = axis.start() + pressure * axis.scale();
        shapes.add(text(axis.start() - 8, y + 3, line.name(), Anchor.END, line.chosen()));
        shapes.add(new Drawing.Line(axis.start(), y, x, y, Canvas.THIN, Ink.BLACK, true));
        shapes.add(new Drawing.Circle(x, y, line.chosen() ? 5 : 3.6, Canvas.THICK, line.plain() ? Ink.ACCENT : Ink.BLACK, line.plain() ? Fill.PAPER : Fill.INK));
        shapes.add(text(x + 9, y + 3, ComparisonBlocks.shown(pressure, Dimension.PRESSURE, format), Anchor.START, line.chosen()));
    }

    private static Shape text(double x, double y, String text, Anchor anchor, boolean bold) {
        return new Drawing.Text(x, y, text, Canvas.SMALL, anchor, bold, 0, Ink.BLACK);
    }

    /** A round step that gives at most six parts. */
    private static double step(double most) {
        double power = Math.pow(10, Math.floor(Math.log10(most)));
        for (double each : new double[] {0.1, 0.2, 0.5, 1, 2, 5}) {
            if (most / (each * power) <= 6) {
                return each * power;
            }
        }
        return 10 * power;
    }

    private ComparisonDrawing() { }
}
