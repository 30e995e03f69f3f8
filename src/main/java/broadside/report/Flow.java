package broadside.report;

import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.common.PDRectangle;

/** Fills page after page from top to bottom. Heights are in points; {@code top} counts from the upper edge down. */
final class Flow {

    /** One page while it fills: its operators and the elements that its marked stretches belong to. */
    static final class Leaf {

        private final PDPage page;
        private final Content content;
        private final COSArray owners = new COSArray();

        Leaf(PDPage page, Content content) {
            this.page = page;
            this.content = content;
        }

        PDPage page() {
            return page;
        }

        COSDictionary dictionary() {
            return page.getCOSObject();
        }

        Content content() {
            return content;
        }

        COSArray owners() {
            return owners;
        }

        /** Begins a stretch of the page that belongs to the element; end it with {@link Content#close}. */
        void open(Tag tag) {
            int number = owners.size();
            owners.add(tag.element());
            tag.mark(dictionary(), number);
            content.open(tag.kind(), number);
        }
    }

    /** 18 mm. */
    static final double MARGIN = 51;
    private static final double ABOVE = 57;
    private static final double BELOW = 62;

    private final Paper paper;
    private final Typeset typeset;
    private final PDResources resources = new PDResources();
    private final List<Leaf> leaves = new ArrayList<>();
    private double top;
    private boolean fresh;
    private boolean breakDue;
    private Runnable repeated = () -> { };

    Flow(Paper paper, Typeset typeset) {
        this.paper = paper;
        this.typeset = typeset;
        turn();
    }

    Paper paper() {
        return paper;
    }

    Typeset typeset() {
        return typeset;
    }

    PDResources resources() {
        return resources;
    }

    List<Leaf> leaves() {
        return leaves;
    }

    Leaf leaf() {
        return leaves.get(leaves.size() - 1);
    }

    int pageIndex() {
        return leaves.size() - 1;
    }

    double left() {
        return MARGIN;
    }

    /** Width of the text. */
    double width() {
        return paper.width() - 2 * MARGIN;
    }

    /** Height of the text on an empty page. */
    double body() {
        return paper.height() - ABOVE - BELOW;
    }

    double top() {
        return top;
    }

    double room() {
        return paper.height() - BELOW - top;
    }

    /** Turns a distance from the upper edge into the coordinate of the page. */
    double y(double fromTop) {
        return paper.height() - fromTop;
    }

    /** What is drawn again at the top of each new page, such as the head of a table, until it is set anew. */
    void repeat(Runnable drawing) {
        repeated = drawing;
    }

    /** The next part begins on a new page. */
    void breakNext() {
        breakDue = !fresh;
    }

    /** Turns the page when this height does not fit below, and would fit on an empty one. */
    void keep(double height) {
        boolean fits = height <= room() + 0.01;
        if (breakDue || !fits && !fresh && height <= body()) {
            turn();
        }
    }

    /** Makes room for a part, with a gap above it unless it stands first on its page. */
    void begin(double gap, double height) {
        keep(gap + height);
        if (!fresh) {
            top += gap;
        }
    }

    void advance(double height) {
        top += height;
        fresh = false;
    }

    void turn() {
        PDPage page = new PDPage(new PDRectangle((float) paper.width(), (float) paper.height()));
        page.setResources(resources);
        page.getCOSObject().setItem(COSName.STRUCT_PARENTS, COSInteger.get(leaves.size()));
        leaves.add(new Leaf(page, new Content(typeset)));
        top = ABOVE;
        breakDue = false;
        repeated.run();
        fresh = true;
    }
}
