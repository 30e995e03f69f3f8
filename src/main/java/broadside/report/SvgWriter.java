package broadside.report;

import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Circle;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import broadside.sheet.Drawing.Line;
import broadside.sheet.Drawing.Outline;
import broadside.sheet.Drawing.Shape;
import broadside.sheet.Drawing.Text;
import broadside.sheet.Drawing;
import java.util.List;

/**
 * Writes a drawing as SVG text. Colours and weights are presentation attributes, so a page whose security policy
 * forbids inline styles shows the drawing unchanged.
 */
public final class SvgWriter {

    private final StringBuilder out = new StringBuilder(4096);

    private SvgWriter() { }

    /**
     * Returns one {@code svg} element.
     *
     * @param title       the name of the drawing, read out first
     * @param description the content of the drawing in words
     */
    public static String svg(Drawing drawing, String title, String description) {
        SvgWriter writer = new SvgWriter();
        writer.open(drawing, title, description);
        for (Shape shape : drawing.shapes()) {
            writer.shape(shape);
        }
        return writer.out.append("</svg>").toString();
    }

    private void open(Drawing drawing, String title, String description) {
        out.append("<svg xmlns=\"http://www.w3.org/2000/svg\" role=\"img\" viewBox=\"0 0 ");
        Texts.number(out, drawing.width());
        out.append(' ');
        Texts.number(out, drawing.height());
        out.append("\" width=\"");
        Texts.number(out, drawing.width());
        out.append("pt\" height=\"");
        Texts.number(out, drawing.height());
        out.append("pt\" font-family=\"system-ui, sans-serif\"><title>");
        escape(title);
        out.append("</title><desc>");
        escape(description);
        out.append("</desc>");
    }

    private void shape(Shape shape) {
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
        out.append("<line");
        number("x1", line.x1());
        number("y1", line.y1());
        number("x2", line.x2());
        number("y2", line.y2());
        stroke(line.weight(), line.ink());
        if (line.dashed()) {
            out.append(" stroke-dasharray=\"3 2\"");
        }
        out.append("/>");
    }

    private void outline(Outline outline) {
        List<Double> points = Shapes.checked(outline);
        out.append("<polygon points=\"");
        for (int i = 0; i < points.size(); i++) {
            if (i > 0) {
                out.append(i % 2 == 0 ? ' ' : ',');
            }
            Texts.number(out, points.get(i));
        }
        out.append('"');
        fill(outline.fill(), outline.ink());
        stroke(outline.weight(), outline.ink());
        out.append("/>");
    }

    private void circle(Circle circle) {
        out.append("<circle");
        number("cx", circle.x());
        number("cy", circle.y());
        number("r", Math.max(0, circle.radius()));
        fill(circle.fill(), circle.ink());
        stroke(circle.weight(), circle.ink());
        out.append("/>");
    }

    private void text(Text text) {
        out.append("<text");
        number("x", text.x());
        number("y", text.y());
        number("font-size", text.size());
        if (text.anchor() != Anchor.START) {
            out.append(" text-anchor=\"").append(text.anchor() == Anchor.MIDDLE ? "middle" : "end").append('"');
        }
        if (text.bold()) {
            out.append(" font-weight=\"bold\"");
        }
        if (text.turn() != 0) {
            out.append(" transform=\"rotate(");
            Texts.number(out, -text.turn());
            out.append(' ');
            Texts.number(out, text.x());
            out.append(' ');
            Texts.number(out, text.y());
            out.append(")\"");
        }
        out.append(" fill=\"").append(Colour.of(text.ink()).hex()).append("\">");
        escape(text.text());
        out.append("</text>");
    }

    private void number(String name, double value) {
        out.append(' ').append(name).append("=\"");
        Texts.number(out, value);
        out.append('"');
    }

    private void stroke(double weight, Ink ink) {
        if (weight > 0) {
            out.append(" stroke=\"").append(Colour.of(ink).hex()).append('"');
            number("stroke-width", weight);
        }
    }

    private void fill(Fill fill, Ink ink) {
        out.append(" fill=\"").append(switch (fill) {
            case NONE -> "none";
            case PAPER -> Colour.PAPER.hex();
            case INK -> Colour.of(ink).hex();
        }).append('"');
    }

    private void escape(String text) {
        Texts.xml(out, text);
    }
}
