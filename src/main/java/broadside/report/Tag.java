package broadside.report;

import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSBase;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;

/** One element of the structure tree: a heading, a table cell, a figure. */
final class Tag {

    /** What helps a reader of the tags to read a table or a list. */
    enum Attribute {
        COLUMN_HEADING("Table", "Scope", "Column"),
        ROW_HEADING("Table", "Scope", "Row"),
        DISC("List", "ListNumbering", "Disc"),
        DECIMAL("List", "ListNumbering", "Decimal"),
        UNNUMBERED("List", "ListNumbering", "None");

        private final String owner;
        private final String key;
        private final String value;

        Attribute(String owner, String key, String value) {
            this.owner = owner;
            this.key = key;
            this.value = value;
        }

        private COSDictionary dictionary() {
            COSDictionary attribute = new COSDictionary();
            attribute.setDirect(true);
            attribute.setItem(COSName.O, COSName.getPDFName(owner));
            attribute.setItem(COSName.getPDFName(key), COSName.getPDFName(value));
            return attribute;
        }
    }

    private final String kind;
    private final COSDictionary element = new COSDictionary();
    private final COSArray kids = new COSArray();

    private Tag(String kind, COSDictionary parent) {
        this.kind = kind;
        kids.setDirect(true);
        element.setItem(COSName.S, COSName.getPDFName(kind));
        element.setItem(COSName.P, parent);
    }

    /** Returns the top element, below the root of the structure tree. */
    static Tag top(COSDictionary root) {
        Tag tag = new Tag("Document", root);
        root.setItem(COSName.K, tag.element);
        return tag;
    }

    Tag child(String childKind) {
        Tag tag = new Tag(childKind, element);
        add(tag.element);
        return tag;
    }

    private void add(COSBase kid) {
        if (kids.size() == 0) {
            element.setItem(COSName.K, kids);
        }
        kids.add(kid);
    }

    String kind() {
        return kind;
    }

    COSDictionary element() {
        return element;
    }

    Tag attribute(Attribute attribute) {
        element.setItem(COSName.A, attribute.dictionary());
        return this;
    }

    /** Says that the marked stretch with this number on this page belongs to the element. */
    void mark(COSDictionary page, int number) {
        COSBase first = element.getItem(COSName.PG);
        if (first == null) {
            element.setItem(COSName.PG, page);
        }
        if (first == null || first == page) {
            add(COSInteger.get(number));
            return;
        }
        COSDictionary reference = new COSDictionary();
        reference.setDirect(true);
        reference.setItem(COSName.TYPE, COSName.MCR);
        reference.setItem(COSName.PG, page);
        reference.setItem(COSName.MCID, COSInteger.get(number));
        add(reference);
    }
}
