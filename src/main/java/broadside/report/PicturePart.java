package broadside.report;

import broadside.sheet.Block.Picture;
import broadside.sheet.Drawing;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSFloat;
import org.apache.pdfbox.cos.COSName;

/** A drawing with its caption, reduced where it is wider or higher than the text. */
final class PicturePart implements Part {

    private static final double GAP = 9;

    private final Flow flow;
    private final Picture picture;
    private final Tag figure;
    private final double scale;
    private final List<Band> caption = new ArrayList<>();

    PicturePart(Flow flow, Tag parent, Picture picture) {
        this.flow = flow;
        this.picture = picture;
        figure = parent.child("Figure");
        String words = picture.alternative().isBlank() ? picture.caption() : picture.alternative();
        figure.element().setItem(COSName.ALT, Texts.pdf(words.isBlank() ? "Drawing" : words, 8_000));
        Words line = flow.typeset().words().add(picture.caption(), false);
        if (!line.isEmpty()) {
            Band.Cell cell = new Band.Cell(0, flow.width()).add(line, Type.QUIET, parent.child("P"));
            caption.add(new Band(4, 0, List.of(cell)));
        }
        Drawing drawing = picture.drawing();
        double below = Math.min(captionHeight(), flow.body() / 2);
        scale = Math.min(1, Math.min(flow.width() / drawing.width(), (flow.body() - below - 1) / drawing.height()));
    }

    private double captionHeight() {
        return caption.isEmpty() ? 0 : caption.get(0).first();
    }

    @Override
    public double first() {
        double drawing = GAP + picture.drawing().height() * scale;
        return drawing + captionHeight() <= flow.body() ? drawing + captionHeight() : drawing;
    }

    @Override
    public void place(Flow target) {
        double width = picture.drawing().width() * scale;
        double height = picture.drawing().height() * scale;
        target.keep(first());
        target.begin(GAP, height);
        double top = target.y(target.top());
        Flow.Leaf leaf = target.leaf();
        figure.element().setItem(COSName.A, box(target.left(), top - height, target.left() + width, top));
        leaf.open(figure);
        new Shapes(leaf.content(), target.typeset(), target.left(), top, scale).draw(picture.drawing());
        leaf.content().close();
        target.advance(height);
        caption.forEach(band -> band.place(target));
    }

    private static COSDictionary box(double... edges) {
        COSArray box = new COSArray();
        for (double edge : edges) {
            box.add(new COSFloat((float) (Math.round(edge * 100) / 100.0)));
        }
        box.setDirect(true);
        COSDictionary layout = new COSDictionary();
        layout.setDirect(true);
        layout.setItem(COSName.O, COSName.getPDFName("Layout"));
        layout.setItem(COSName.BBOX, box);
        layout.setItem(COSName.getPDFName("Placement"), COSName.getPDFName("Block"));
        return layout;
    }
}
