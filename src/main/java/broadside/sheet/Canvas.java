package broadside.sheet;

import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import broadside.sheet.Drawing.Shape;
import java.util.ArrayList;
import java.util.List;

/**
 * Shapes of a drawing to scale: metres to the right of and above an origin on the ground become points on paper.
 * Lines of the object are 1.4 points wide, help lines 0.7.
 */
final class Canvas {

    static final double THIN = 0.7;
    static final double THICK = 1.4;
    static final double SMALL = 9;
    /** Base line of a text that clears the strokes below the ground line. */
    private static final double BELOW_GROUND = 17;

    private final List<Shape> shapes;
    private final double originX;
    private final double originY;
    private final double scale;

    /** An origin on the ground at a point on paper, and the scale in points for each metre. */
    Canvas(List<Shape> shapes, double originX, double originY, double scale) {
        this.shapes = shapes;
        this.originX = originX;
        this.originY = originY;
        this.scale = scale;
    }

    Canvas(double originX, double originY, double scale) {
        this(new ArrayList<>(), originX, originY, scale);
    }

    /** A second view on the same paper. */
    Canvas view(double x, double y, double otherScale) {
        return new Canvas(shapes, x, y, otherScale);
    }

    List<Shape> shapes() {
        return shapes;
    }

    double x(double metres) {
        return originX + metres * scale;
    }

    double y(double metres) {
        return originY - metres * scale;
    }

    double scale() {
        return scale;
    }

    void line(double x1, double y1, double x2, double y2, double weight, Ink ink, boolean dashed) {
        shapes.add(new Drawing.Line(x1, y1, x2, y2, weight, ink, dashed));
    }

    void text(double x, double y, String text, Anchor anchor, Ink ink) {
        shapes.add(new Drawing.Text(x, y, text, SMALL, anchor, false, 0, ink));
    }

    void boldText(double x, double y, String text, Anchor anchor, Ink ink) {
        shapes.add(new Drawing.Text(x, y, text, SMALL, anchor, true, 0, ink));
    }

    void turnedText(double x, double y, String text) {
        shapes.add(new Drawing.Text(x, y, text, SMALL, Anchor.MIDDLE, false, 90, Ink.BLACK));
    }

    /** A rectangle in metres, its lower left corner given. */
    void box(double left, double bottom, double width, double height, double weight, Fill fill) {
        double x1 = x(left);
        double x2 = x(left + width);
        double y1 = y(bottom);
        double y2 = y(bottom + height);
        shapes.add(new Drawing.Outline(List.of(x1, y1, x2, y1, x2, y2, x1, y2), weight, Ink.BLACK, fill));
    }

    /** A closed outline through points in metres. */
    void outline(List<Double> metres, double weight, Fill fill) {
        List<Double> points = new ArrayList<>();
        for (int i = 0; i + 1 < metres.size(); i += 2) {
            points.add(x(metres.get(i)));
            points.add(y(metres.get(i + 1)));
        }
        shapes.add(new Drawing.Outline(points, weight, Ink.BLACK, fill));
    }

    /** A tipping edge: a small wedge below the ground line. */
    void tippingEdge(double at) {
        double x = x(at);
        double y = y(0) + 1;
        shapes.add(new Drawing.Outline(List.of(x, y, x - 4, y + 7, x + 4, y + 7), THIN, Ink.BLACK, Fill.INK));
    }

    void circle(double middle, double height, double radius) {
        shapes.add(new Drawing.Circle(x(middle), y(height), radius * scale, THICK, Ink.BLACK, Fill.PAPER));
    }

    /** Ground line between two points on paper, with short strokes below it. */
    void ground(double from, double to) {
        line(from, originY, to, originY, THICK, Ink.BLACK, false);
        for (double at = from + 2; at < to - 4; at += 7) {
            line(at + 4, originY + 1, at, originY + 6, THIN, Ink.GREY, false);
        }
    }

    /** Strokes across a rectangle in metres, at a distance in points: the denser, the higher the pressure. */
    void hatch(double left, double bottom, double width, double height, double distance) {
        double x1 = x(left);
        double x2 = x(left + width);
        double low = y(bottom);
        double high = y(bottom + height);
        double tall = low - high;
        for (double start = x1 - tall + distance / 2; start < x2; start += distance) {
            double fromX = Math.max(start, x1);
            double toX = Math.min(start + tall, x2);
            if (toX > fromX) {
                line(fromX, low - (fromX - start), toX, low - (toX - start), 0.4, Ink.GREY, false);
            }
        }
    }

    /** A wall that is cut, on paper: a line upward with short strokes on its left. */
    void wall(double atX, double fromY, double toY) {
        line(atX, fromY, atX, toY, THICK, Ink.BLACK, false);
        for (double at = Math.max(fromY, toY) - 2; at > Math.min(fromY, toY) + 4; at -= 7) {
            line(atX - 1, at - 4, atX - 6, at, THIN, Ink.GREY, false);
        }
    }

    /** A dimension across, at a height on paper, with end ticks and its text in the middle above the line. */
    void across(double from, double to, double atY, String text) {
        acrossPaper(x(from), x(to), atY);
        text((x(from) + x(to)) / 2, atY - 3, text, Anchor.MIDDLE, Ink.BLACK);
    }

    /** The same with its text behind the line, where the line is too short to hold it. */
    void acrossBeside(double from, double to, double atY, String text) {
        if (x(to) - x(from) > width(text) + 8) {
            across(from, to, atY, text);
        } else {
            acrossPaper(x(from), x(to), atY);
            text(x(to) + 6, atY + 3, text, Anchor.START, Ink.BLACK);
        }
    }

    /** A line with end ticks between two places on paper. */
    void acrossPaper(double x1, double x2, double atY) {
        line(x1, atY, x2, atY, THIN, Ink.BLACK, false);
        tick(x1, atY);
        tick(x2, atY);
    }

    /** A dimension upward, at a place on paper; its text stands to the left of it. */
    void upward(double from, double to, double atX, String text) {
        upwardPaper(y(from), y(to), atX);
        text(atX - 4, (y(from) + y(to)) / 2 + 3, text, Anchor.END, Ink.BLACK);
    }

    /** The same down from {@code to}, with its text to the right. */
    void upwardRight(double from, double to, double atX, String text) {
        upwardPaper(y(from), y(to), atX);
        beside(atX, y(to), y(from), text);
    }

    /** The text of a line upward, to its right; turned along it, from the ground on, where the paper ends. */
    void beside(double atX, double ground, double end, String text) {
        if (atX + 4 + width(text) > ItemDrawing.WIDTH) {
            double away = Math.max(Math.abs(end - ground), width(text)) / 2;
            turnedText(atX + 11, end < ground ? ground - away : ground + away, text);
        } else {
            double middle = (ground + end) / 2 + 3;
            text(atX + 4, end > ground ? Math.max(middle, ground + BELOW_GROUND) : middle, text, Anchor.START, Ink.BLACK);
        }
    }

    /** A line upward with end ticks between two heights on paper. */
    void upwardPaper(double y1, double y2, double atX) {
        line(atX, y1, atX, y2, THIN, Ink.BLACK, false);
        tick(atX, y1);
        tick(atX, y2);
    }

    /** The sign that a line upward is cut short here: the line is covered and a zigzag drawn in its place. */
    void cut(double atX, double atY) {
        shapes.add(new Drawing.Outline(List.of(atX - 4, atY - 5, atX + 4, atY - 5, atX + 4, atY + 5, atX - 4, atY + 5), 0, Ink.BLACK, Fill.PAPER));
        line(atX, atY + 5, atX - 3.5, atY + 1.5, THIN, Ink.BLACK, false);
        line(atX - 3.5, atY + 1.5, atX + 3.5, atY - 1.5, THIN, Ink.BLACK, false);
        line(atX + 3.5, atY - 1.5, atX, atY - 5, THIN, Ink.BLACK, false);
    }

    /** About how wide a line of text is on paper. */
    static double width(String text) {
        return 5.4 * text.length();
    }

    /** A help line from the object out to a dimension. */
    void help(double x1, double y1, double x2, double y2) {
        line(x1, y1, x2, y2, 0.4, Ink.GREY, false);
    }

    /** An arrow between two points on paper, its head at the second. */
    void arrow(double x1, double y1, double x2, double y2, double weight) {
        double length = Math.hypot(x2 - x1, y2 - y1);
        double ux = (x2 - x1) / length;
        double uy = (y2 - y1) / length;
        double head = 7;
        line(x1, y1, x2 - ux * head, y2 - uy * head, weight, Ink.ACCENT, false);
        shapes.add(new Drawing.Outline(List.of(x2, y2, x2 - ux * head - uy * 3, y2 - uy * head + ux * 3, x2 - ux * head + uy * 3,
            y2 - uy * head - ux * 3), 0.4, Ink.ACCENT, Fill.INK));
    }

    /** The point at which a force acts, seen along the wind; its label stands at a place on paper, clear of the hatching. */
    void target(double xMetres, double yMetres, double labelX, String text) {
        target(xMetres, yMetres, labelX, y(yMetres) - 5, text);
    }

    void target(double xMetres, double yMetres, double labelX, double labelY, String text) {
        double px = x(xMetres);
        double py = y(yMetres);
        shapes.add(new Drawing.Circle(px, py, 3.2, THICK, Ink.ACCENT, Fill.PAPER));
        line(px - 6, py, px + 6, py, THIN, Ink.ACCENT, false);
        line(px, py - 6, px, py + 6, THIN, Ink.ACCENT, false);
        boldText(labelX, labelY, text, Anchor.START, Ink.ACCENT);
    }

    /** A bar of a round length with that length beside it. */
    void scaleBar(double atX, double atY, double metres, String text) {
        double end = atX + metres * scale;
        line(atX, atY, end, atY, 2, Ink.BLACK, false);
        tick(atX, atY);
        tick(end, atY);
        text(end + 6, atY + 3, text, Anchor.START, Ink.BLACK);
    }

    private void tick(double atX, double atY) {
        line(atX - 2.5, atY + 2.5, atX + 2.5, atY - 2.5, THIN, Ink.BLACK, false);
    }
}
