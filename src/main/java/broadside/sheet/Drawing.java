package broadside.sheet;

import java.util.List;

/**
 * A drawing as one list of shapes, in points on paper (1/72 inch), origin at the upper left corner, y downward.
 * It is written as SVG text and as PDF operators without further calculation.
 */
public record Drawing(double width, double height, List<Shape> shapes) {

    public Drawing {
        if (!(width > 0 && height > 0)) {
            throw new IllegalArgumentException("a drawing needs a width and a height above zero");
        }
        shapes = List.copyOf(shapes);
    }

    /** One shape; {@code weight} is the width of the line in points. */
    public sealed interface Shape { }

    public record Line(double x1, double y1, double x2, double y2, double weight, Ink ink, boolean dashed) implements Shape { }

    /** A closed outline through the points x0, y0, x1, y1 and so on. */
    public record Outline(List<Double> points, double weight, Ink ink, Fill fill) implements Shape {
        public Outline {
            points = List.copyOf(points);
        }
    }

    public record Circle(double x, double y, double radius, double weight, Ink ink, Fill fill) implements Shape { }

    /** A line of text; y is the base line; {@code turn} is in degrees against the clock around x, y. */
    public record Text(double x, double y, String text, double size, Anchor anchor, boolean bold, double turn, Ink ink)
        implements Shape { }

    /** The colours in use: near black, the accent for wind and force, amber for cautions, grey for help lines. */
    public enum Ink { BLACK, ACCENT, AMBER, GREY }

    public enum Fill { NONE, PAPER, INK }

    public enum Anchor { START, MIDDLE, END }
}
