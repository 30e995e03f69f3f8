package broadside.report;

import broadside.sheet.Block;
import broadside.sheet.Block.Answer;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Facts;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.NewPage;
import broadside.sheet.Block.Notes;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Picture;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.StepLine;
import broadside.sheet.Block.Steps;
import broadside.sheet.Block.Table;
import broadside.sheet.Block.Tone;
import broadside.sheet.Drawing;
import broadside.sheet.Sheet;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;

/** Makes sheets of all kinds of blocks whose texts are as odd as texts can be; the seed decides what comes. */
final class OddSheets {

    private static final List<String> ODD = List.of(
        "\ud83d\ude80\ud83c\udffd\u200d\u2708\ufe0f", "\u0627\u0644\u0631\u064a\u0627\u062d",
        "\u05e9\u05dc\u05d5\u05dd (\u05e8\u05d5\u05d7)", "\u0000\u0001\u0007\u001b\u007f\u0085", "\ud800", "\udc00x",
        "\ufffe\uffff\ufeff", "a\tb\r\nc\u2028d\u2029e", "e\u0301\u0327", "\u202e\u2066abc\u2069",
        "<script>alert('&\"')</script>", "]]>", "%PDF-1.7 endstream endobj", "\\()\\\\(((", "\u98a8\u901f",
        "\u0e25\u0e21", "q_p c_{p,net} _{ __ _{}_{x", "\ue000\uf8ff", "\u20ac\u00b5\u03a9\u2126\u2206",
        "\u00a0\u202f\u3000\u200b", "\u2082\u209a\u26a0\u2610");

    private final Random random;

    OddSheets(long seed) {
        random = new Random(seed);
    }

    Sheet next() {
        List<Block> blocks = new ArrayList<>();
        int count = random.nextInt(9);
        for (int i = 0; i < count; i++) {
            blocks.add(block(random.nextInt(9)));
        }
        return new Sheet(text(), text(), text(), random.nextBoolean() ? "2026-02-30" : text(), text(), text(), blocks);
    }

    private Block block(int kind) {
        return switch (kind) {
            case 0 -> new Heading(random.nextInt(7) - 1, text(), text());
            case 1 -> new Paragraph(text(), Tone.values()[random.nextInt(3)]);
            case 2 -> new Answer(facts());
            case 3 -> new Facts(text(), facts());
            case 4 -> table();
            case 5 -> new Picture(drawing(), text(), text());
            case 6 -> new Steps(IntStream.range(0, random.nextInt(4)).mapToObj(i -> new StepLine(random.nextInt(),
                text(), text(), text(), text(), text(), text(), text(), text(), text(), text())).toList());
            case 7 -> new Notes(IntStream.range(0, random.nextInt(4)).mapToObj(i -> text()).toList());
            default -> new NewPage();
        };
    }

    private List<Fact> facts() {
        return IntStream.range(0, random.nextInt(4))
            .mapToObj(i -> new Fact(text(), text(), text(), random.nextBoolean())).toList();
    }

    private Table table() {
        int width = 1 + random.nextInt(9);
        List<Column> columns = IntStream.range(0, width).mapToObj(i -> new Column(text(), random.nextBoolean(),
            random.nextInt(5) - 1)).toList();
        List<Row> rows = IntStream.range(0, random.nextInt(4)).mapToObj(i -> new Row(IntStream.range(0, width)
            .mapToObj(k -> text()).toList(), random.nextBoolean())).toList();
        return new Table(text(), columns, rows);
    }

    private Drawing drawing() {
        return new Drawing(1 + random.nextInt(3_000), 1 + random.nextInt(3_000), List.of(
            new Drawing.Text(random.nextGaussian() * 900, random.nextGaussian() * 900, text(), random.nextDouble() * 30,
                Drawing.Anchor.values()[random.nextInt(3)], random.nextBoolean(), random.nextInt(720) - 360,
                Drawing.Ink.values()[random.nextInt(4)]),
            new Drawing.Line(random.nextGaussian() * 9_000, 0, 1, 1, random.nextDouble(), Drawing.Ink.GREY, true)));
    }

    private String text() {
        int kind = random.nextInt(40);
        if (kind == 0) {
            return ODD.get(random.nextInt(ODD.size())).repeat(10_000 / 6);
        }
        StringBuilder out = new StringBuilder();
        int pieces = random.nextInt(8);
        for (int i = 0; i < pieces; i++) {
            out.append(random.nextInt(3) > 0 ? "word " : random.nextBoolean() ? ODD.get(random.nextInt(ODD.size()))
                : new String(Character.toChars(random.nextInt(0x110000))));
        }
        return out.toString();
    }
}
