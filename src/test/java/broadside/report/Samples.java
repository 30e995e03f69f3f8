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
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Circle;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import broadside.sheet.Drawing.Line;
import broadside.sheet.Drawing.Outline;
import broadside.sheet.Drawing.Text;
import broadside.sheet.Sheet;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** A sheet with every kind of block on several pages; its figures are made up. */
final class Samples {

    static final String CAUTION = "PRELIMINARY - not for construction - for review by a licensed engineer";

    static Sheet sheet() {
        List<Block> blocks = new ArrayList<>();
        opening(blocks);
        cases(blocks);
        assumptions(blocks);
        blocks.add(new NewPage());
        blocks.add(new Heading(2, "The calculation", "calculation"));
        blocks.add(new Paragraph("Every step in the order in which it was worked out, with its formula, the numbers put "
            + "in, and the place in the code.", Tone.PLAIN));
        blocks.add(steps(24));
        return sheet(blocks);
    }

    static Sheet sheet(List<Block> blocks) {
        return new Sheet("Sign at the corner of Mill Lane, Harrowby", "HB-0417", "B", "2026-03-14", CAUTION,
            "Broadside 0.1.0, tables 3f9a61c2", blocks);
    }

    static Attachment job() {
        return new Attachment("job.json", "The job that this summary was made from",
            "{\"name\": \"Sign at the corner of Mill Lane\", \"height\": \"6.5 m\"}".getBytes(StandardCharsets.UTF_8));
    }

    private static void opening(List<Block> blocks) {
        blocks.add(new Heading(1, "Sign at the corner of Mill Lane, Harrowby", "top"));
        blocks.add(new Answer(List.of(
            Fact.of("What governs", "Wind at an angle, case 2", "EN 1991-1-4 with the national annex of the place"),
            Fact.of("Force on the board", "11.4 kN (2.56 kip)", "characteristic, at 0.25 of the width from the middle"),
            Fact.of("Moment at the foot", "24.7 kN m (18.2 kip ft)", "for each of two posts"),
            Fact.of("What would carry it", "CHS 168.3 \u00d7 6.3, S355", "to be checked by the engineer"),
            Fact.of("Act at a gust of", "24 m/s (54 mph)"))));
        blocks.add(new Paragraph("This summary is preliminary. It is no design and no approval.", Tone.CAUTION));
        blocks.add(new Heading(2, "The drawing", "drawing"));
        blocks.add(new Picture(drawing(), "Front view, to scale. The force acts 0.625 m from the middle of the board.",
            "Front view of a board 5.00 m wide and 2.50 m high on two posts, with its middle 5.25 m above the ground."));
        blocks.add(new Heading(2, "Where it stands", "site"));
        blocks.add(new Facts("To be confirmed by the client", List.of(
            new Fact("Basic wind velocity", "v_b,0 = 24 m/s", "read from the map; to be confirmed", true),
            Fact.of("Terrain", "Category II", "open fields with single trees"),
            Fact.of("Altitude", "85 m (279 ft)"),
            new Fact("Orography", "none", "the ground is flat within 500 m; to be confirmed", true),
            Fact.of("Address", "Corner of Mill Lane and the old post road, Harrowby, opposite the water tower"))));
    }

    private static void cases(List<Block> blocks) {
        blocks.add(new Heading(2, "Load cases", "cases"));
        blocks.add(new Table("Load cases with characteristic values", List.of(new Column("Case", false, 3),
            new Column("Pressure kPa", true, 1), new Column("Force kN", true, 1), new Column("Off centre m", true, 1),
            new Column("Moment at foot kN m", true, 1), new Column("Note", false, 3)), List.of(
            new Row(List.of("1 Wind square on", "0.912", "11.4", "0.000", "23.9", ""), false),
            new Row(List.of("2 Wind at an angle, from the left", "0.912", "11.4", "0.625", "24.7", "governs"), true),
            new Row(List.of("3 Wind along the board", "0.046", "0.57", "-", "1.2", "friction on both faces"), false))));
        blocks.add(new Heading(3, "Gusts and what to do", "gusts"));
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < 40; i++) {
            rows.add(new Row(List.of("Gust " + (10 + i), Integer.toString(10 + i),
                String.format(Locale.ROOT, "%.3f", 0.000613 * (10 + i) * (10 + i)),
                i == 14 ? "act: lower the banner" : "watch"), i == 14));
        }
        blocks.add(new Table("", List.of(new Column("Step", false, 1), new Column("Gust m/s", true, 1),
            new Column("Pressure kPa", true, 1), new Column("What to do", false, 2)), rows));
    }

    private static void assumptions(List<Block> blocks) {
        blocks.add(new Heading(2, "What was assumed", "assumed"));
        blocks.add(new Notes(List.of("The board is flat, solid and stiff.", "The ground is level around the posts; a "
            + "slope within ten times the height of the sign would change the pressure and has to be told to the engineer.",
            "Written by Zo\u00eb \u0141ukasik, \u0394p = 0.6 kPa, \u221a2, 5 \u2265 3, \ud83c\udf2c wind, "
                + "\u0627\u0644\u0631\u064a\u0627\u062d.",
            "See https://example.org/a/very/long/address/that/has/no/space/in/it/and/goes/on/and/on/until/it/is/wider/"
                + "than/the/paper?with=parameters&and=more")));
        blocks.add(new Heading(2, "What was not checked", "unchecked"));
        blocks.add(new Paragraph("Fatigue, vortex shedding, ice, impact, the soil, the bolts and the welds.", Tone.PLAIN));
        blocks.add(new Paragraph("Values in brackets are the same values in the other system of units.", Tone.SMALL));
    }

    static Steps steps(int count) {
        List<StepLine> lines = new ArrayList<>();
        for (int i = 0; i < count; i += 3) {
            lines.add(new StepLine(i + 1, "turbulence", "I_v", "turbulence at the middle of the board",
                "= k_I / (c_o ln(z / z_0))", "k_I = 1.00, c_o = 1.00, z = 5.25 m, z_0 = 0.05 m", "0.2149", "", "",
                "EN 1991-1-4, 4.4 (4.7)", "read"));
            lines.add(new StepLine(i + 2, "peak pressure", "q_p", "peak velocity pressure at the middle of the board",
                "= (1 + 7 I_v) \u00bd \u03c1 v_m\u00b2",
                "I_v = 0.2149, \u03c1 = 1.25 kg/m\u00b3, v_m = 21.23 m/s", "0.7055",
                "kPa", "14.74 psf", "EN 1991-1-4, 4.5 (4.8)", "read"));
            lines.add(new StepLine(i + 3, "force", "F_{w,net}", "force on the board, square on",
                "= c_{p,net} q_p A", "c_{p,net} = 1.80, q_p = 0.7055 kPa, A = 12.50 m\u00b2", "15.87", "kN",
                "3.569 kip", "EN 1991-1-4, 7.4.3",
                "second-hand"));
        }
        return new Steps(lines.subList(0, count));
    }

    static Drawing drawing() {
        return new Drawing(440, 270, List.of(
            new Outline(List.of(100d, 40d, 340d, 40d, 340d, 160d, 100d, 160d), 1.4, Ink.BLACK, Fill.PAPER),
            new Outline(List.of(155d, 160d, 161d, 160d, 161d, 235d, 155d, 235d), 1.0, Ink.BLACK, Fill.INK),
            new Outline(List.of(279d, 160d, 285d, 160d, 285d, 235d, 279d, 235d), 1.0, Ink.BLACK, Fill.INK),
            new Line(40, 235, 400, 235, 1.4, Ink.BLACK, false),
            new Line(220, 30, 220, 170, 0.7, Ink.GREY, true),
            new Line(100, 24, 340, 24, 0.7, Ink.BLACK, false),
            new Line(100, 18, 100, 38, 0.7, Ink.BLACK, false), new Line(340, 18, 340, 38, 0.7, Ink.BLACK, false),
            new Text(220, 20, "5.00 m", 9, Anchor.MIDDLE, false, 0, Ink.BLACK),
            new Line(368, 40, 368, 160, 0.7, Ink.BLACK, false),
            new Text(364, 100, "2.50 m", 9, Anchor.MIDDLE, false, 90, Ink.BLACK),
            new Circle(250, 100, 4, 1.4, Ink.ACCENT, Fill.INK),
            new Line(250, 100, 290, 100, 1.4, Ink.ACCENT, false),
            new Outline(List.of(298d, 100d, 288d, 96d, 288d, 104d), 0, Ink.ACCENT, Fill.INK),
            new Text(256, 92, "F = 11.4 kN", 9, Anchor.START, true, 0, Ink.ACCENT),
            new Text(108, 54, "A", 9, Anchor.START, true, 0, Ink.BLACK),
            new Text(392, 252, "ground", 9, Anchor.END, false, 0, Ink.GREY),
            new Text(40, 262, "check the ground before digging", 9, Anchor.START, false, 0, Ink.AMBER)));
    }

    private Samples() { }
}
