package broadside.report;

import broadside.sheet.Block.Answer;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Facts;
import broadside.sheet.Block.Notes;
import broadside.sheet.Block.Paragraph;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Paragraphs, lists, facts and the answer, measured and tagged. */
final class TextParts {

    private static final double GAP = 7;
    private static final double INDENT = 12;
    private static final double LABEL_SHARE = 0.32;
    private static final double VALUE_SHARE = 0.28;

    private final Flow flow;
    private final Tag parent;

    TextParts(Flow flow, Tag parent) {
        this.flow = flow;
        this.parent = parent;
    }

    private Words words(String text, boolean bold) {
        return flow.typeset().words().add(text, bold);
    }

    List<Part> paragraph(Paragraph paragraph) {
        if (words(paragraph.text(), false).isEmpty()) {
            return List.of();
        }
        Tag tag = parent.child("P");
        return List.of(switch (paragraph.tone()) {
            case PLAIN -> text(words(paragraph.text(), false), Type.BODY, tag);
            case SMALL -> text(words(paragraph.text(), false), Type.QUIET, tag);
            case CAUTION -> caution(paragraph.text(), tag);
        });
    }

    private Band text(Words words, Type type, Tag tag) {
        return new Band(GAP, 0, List.of(new Band.Cell(0, flow.width()).add(words, type, tag)));
    }

    private Band caution(String text, Tag tag) {
        Words words = flow.typeset().words();
        if (!text.strip().toLowerCase(Locale.ROOT).startsWith("caution")) {
            words.add("Caution: ", true);
        }
        words.add(text, false);
        Band.Cell cell = new Band.Cell(INDENT, flow.width() - INDENT).add(words, Type.BODY, tag);
        return new Band(GAP + 1, 3, List.of(cell), (content, f, top, bottom) ->
            content.block(f.left(), f.y(bottom), 3, bottom - top, Colour.AMBER));
    }

    List<Part> notes(Notes notes) {
        List<Part> parts = new ArrayList<>();
        if (notes.items().isEmpty()) {
            return parts;
        }
        Tag list = parent.child("L").attribute(Tag.Attribute.DISC);
        for (String item : notes.items()) {
            Tag entry = list.child("LI");
            Band.Cell bullet = new Band.Cell(0, INDENT).add(words("\u2022", false), Type.BODY, entry.child("Lbl"));
            Band.Cell body = new Band.Cell(INDENT, flow.width() - INDENT)
                .add(words(item, false), Type.BODY, entry.child("LBody"));
            parts.add(new Band(parts.isEmpty() ? GAP : 3, 0, List.of(bullet, body)));
        }
        return parts;
    }

    List<Part> facts(Facts facts) {
        List<Part> parts = new ArrayList<>();
        if (facts.facts().isEmpty()) {
            return parts;
        }
        Tag list = parent.child("L").attribute(Tag.Attribute.UNNUMBERED);
        Words caption = words(facts.caption(), true);
        Optional<Tag> captionTag = caption.isEmpty() ? Optional.empty() : Optional.of(list.child("Caption"));
        boolean remarks = facts.facts().stream().anyMatch(fact -> !fact.remark().isBlank());
        for (Fact fact : facts.facts()) {
            parts.add(fact(fact, list.child("LI"), parts.isEmpty() ? (caption.isEmpty() ? GAP : 2) : 0, remarks));
        }
        captionTag.ifPresent(tag -> parts.set(0, new Part.Kept(text(caption, Type.TABLE, tag), parts.get(0))));
        return parts;
    }

    private Part fact(Fact fact, Tag item, double gap, boolean remarks) {
        double label = flow.width() * LABEL_SHARE;
        double value = flow.width() * (remarks ? VALUE_SHARE : 1 - LABEL_SHARE);
        List<Band.Cell> cells = new ArrayList<>();
        cells.add(new Band.Cell(0, label - INDENT).add(words(fact.label(), fact.strong()), Type.TABLE,
            item.child("Lbl")));
        Tag body = item.child("LBody");
        cells.add(new Band.Cell(label, value - (remarks ? INDENT : 0))
            .add(words(fact.value(), fact.strong()), Type.TABLE, body));
        cells.add(new Band.Cell(label + value, flow.width() - label - value)
            .add(words(fact.remark(), fact.strong()), Type.TABLE, body));
        return new Band(gap, 2.5, cells, TextParts::hairline);
    }

    static void hairline(Content content, Flow flow, double top, double bottom) {
        content.rule(flow.left(), flow.y(bottom), flow.left() + flow.width(), flow.y(bottom), 0.5, Colour.HAIR);
    }

    List<Part> answer(Answer answer) {
        List<Part> parts = new ArrayList<>();
        if (answer.lines().isEmpty()) {
            return parts;
        }
        Tag list = parent.child("L").attribute(Tag.Attribute.UNNUMBERED);
        int last = answer.lines().size() - 1;
        for (int i = 0; i <= last; i++) {
            parts.add(answerLine(answer.lines().get(i), list.child("LI"), i == 0, i == last));
        }
        return parts;
    }

    private Part answerLine(Fact fact, Tag item, boolean first, boolean last) {
        double label = flow.width() * LABEL_SHARE;
        Band.Cell left = new Band.Cell(0, label - INDENT, false, Type.LARGE.base() - Type.BODY.base())
            .add(words(fact.label(), false), Type.BODY, item.child("Lbl"));
        Tag body = item.child("LBody");
        Band.Cell right = new Band.Cell(label, flow.width() - label).add(words(fact.value(), true), Type.LARGE, body)
            .add(words(fact.remark(), false), Type.TABLE, body);
        return new Band(first ? GAP + 3 : 0, 5, List.of(left, right), (content, f, top, bottom) -> {
            if (first) {
                content.rule(f.left(), f.y(top), f.left() + f.width(), f.y(top), 1.4, Colour.ACCENT);
            }
            content.rule(f.left(), f.y(bottom), f.left() + f.width(), f.y(bottom), last ? 1.4 : 0.5,
                last ? Colour.ACCENT : Colour.HAIR);
        });
    }
}
