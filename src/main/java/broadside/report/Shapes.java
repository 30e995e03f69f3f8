package broadside.report;

import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Circle;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Line;
import broadside.sheet.Drawing.Outline;
import broadside.sheet.Drawing.Shape;
import broadside.sheet.Drawing.Text;
import broadside.sheet.Drawing;
import java.util.List;

/** Draws the shapes of a drawing on a page, turned upright and to the scale that fits. */
final class Shapes {

    /** Control points at this share of the radius make four curves a circle. */
    private static final double ROUND = 0.5523;

    private final Content content;
    private final Typeset typeset;
    private final double left;
    private final double top;
    private final double scale;
    private double longest;

    /** The drawing's upper left corner stands at {@code left}, {@code top} in the coordinates of the page. */
    Shapes(Content content, Typeset typeset, double left, double top, double scale) {
        this.content = content;
        this.typeset = typeset;
        this.left = left;
        this.top = top;
        this.scale = scale;
    }

    /** Returns the points of an outline, or refuses them when they are no list of pairs. */
    static List<Double> checked(Outline outline) {
        int count = outline.points().size();
        if (count < 4 || count % 2 != 0) {
            throw new IllegalArgumentException("an outline needs at least two points of two coordinates each, not "
                + count + " coordinates");
        }
        return outline.points();
    }

    void draw(Drawing drawing) {
        longest = 2 * (drawing.width() + drawing.height()) * scale;
        content.openClip(left, top - drawing.height() * scale, drawing.width() * scale, drawing.height() * scale);
        for (Shape shape : drawing.shapes()) {
            draw(shape);
        }
        content.closeClip();
    }

    private void draw(Shape shape) {
        if (shape instanceof Line line) {
            line(line);
        } else if (shape instanceof Outline outline) {
            outline(outline);
        } else if (shape instanceof Circle circle) {
            circle(circle);
        } else if (shape instanceof Text text) {
            text(text);
        }
    }

    private void line(Line line) {
        if (line.weight() <= 0) {
            return;
        }
        Colour colour = Colour.of(line.ink());
        double weight = line.weight() * scale;
        if (line.dashed()) {
            content.dashed(x(line.x1()), y(line.y1()), x(line.x2()), y(line.y2()), weight, colour);
        } else {
            content.rule(x(line.x1()), y(line.y1()), x(line.x2()), y(line.y2()), weight, colour);
        }
    }

    private void outline(Outline outline) {
        List<Double> points = checked(outline);
        prepare(outline.fill(), outline.weight(), Colour.of(outline.ink()));
        content.moveTo(x(points.get(0)), y(points.get(1)));
        for (int i = 2; i < points.size(); i += 2) {
            content.lineTo(x(points.get(i)), y(points.get(i + 1)));
        }
        content.paint(outline.fill() != Fill.NONE, outline.weight() > 0);
    }

    private void circle(Circle circle) {
        prepare(circle.fill(), circle.weight(), Colour.of(circle.ink()));
        double r = Math.max(0, circle.radius()) * scale;
        double x = x(circle.x());
        double y = y(circle.y());
        double k = r * ROUND;
        content.moveTo(x + r, y);
        content.curveTo(x + r, y + k, x + k, y + r, x, y + r);
        content.curveTo(x - k, y + r, x - r, y + k, x - r, y);
        content.curveTo(x - r, y - k, x - k, y - r, x, y - r);
        content.curveTo(x + k, y - r, x + r, y - k, x + r, y);
        content.paint(circle.fill() != Fill.NONE, circle.weight() > 0);
    }

    /** Colours are set before the outline begins, as PDF asks. */
    private void prepare(Fill fill, double weight, Colour ink) {
        if (fill != Fill.NONE) {
            content.fill(fill == Fill.PAPER ? Colour.PAPER : ink);
        }
        if (weight > 0) {
            content.stroke(ink, weight * scale);
        }
    }

    private void text(Text text) {
        double size = text.size() * scale;
        Words words = typeset.words().add(text.text(), text.bold());
        if (words.isEmpty() || size <= 0) {
            return;
        }
        Words.Line line = words.fitted(size, longest);
        double back = line.width() * (text.anchor() == Anchor.START ? 0 : text.anchor() == Anchor.MIDDLE ? 0.5 : 1);
        double turn = Math.toRadians(text.turn());
        content.turned(line, x(text.x()) - back * Math.cos(turn), y(text.y()) - back * Math.sin(turn), size,
            text.turn(), Colour.of(text.ink()));
    }

    private double x(double fromLeft) {
        return left + fromLeft * scale;
    }

    private double y(double fromTop) {
        return top - fromTop * scale;
    }
}
