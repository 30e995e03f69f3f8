package broadside.sheet;

import broadside.assess.Assessment;
import broadside.assess.Assessor;
import broadside.assess.Comparison.Found;
import broadside.assess.Comparison.Line;
import broadside.assess.Comparison;
import broadside.assess.ItemResult;
import broadside.assess.Job;
import broadside.panel.Item;
import broadside.quantity.Dimension;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.sheet.Block.Answer;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.Notes;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Picture;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.Steps;
import broadside.sheet.Block.Table;
import broadside.sheet.Block.Tone;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The document "side by side": one item by every code, with the spread and why the codes differ. */
public final class ComparisonBlocks {

    private final Format format;
    private final List<Block> blocks = new ArrayList<>();

    private ComparisonBlocks(Format format) {
        this.format = format;
    }

    /** The document of one item. */
    public static Sheet sheet(Assessor assessor, Assessment assessment, Item item, String date) {
        Job job = assessment.job();
        Format format = new Format(job.units());
        String title = job.head("title").map(t -> t + ", side by side").orElse("Side by side");
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Heading(1, title, "top"));
        blocks.add(new Paragraph(SheetMaker.PRELIMINARY + ". The local building code, the authority and the engineer of record decide. Wind can kill: a sign, fence or "
            + "panel that comes loose is dangerous far below design speed.", Tone.CAUTION));
        blocks.addAll(of(assessor.sideBySide(job, item), format, job.items().size() > 1, "side-"));
        return new Sheet(title, job.head("reference").orElse("not given"), job.head("revision").orElse("not given"), job.head("date").orElse(date),
            SheetMaker.PRELIMINARY, assessment.about().line(), blocks);
    }

    /** A document with the comparison of every item behind it, each on a new page. */
    public static Sheet behind(Sheet sheet, Assessor assessor, Assessment assessment) {
        Format format = new Format(assessment.job().units());
        List<Block> blocks = new ArrayList<>(sheet.blocks());
        List<Item> items = assessment.job().items();
        for (int i = 0; i < items.size(); i++) {
            blocks.add(new Block.NewPage());
            blocks.addAll(of(assessor.sideBySide(assessment.job(), items.get(i)), format, items.size() > 1, "side-" + (i + 1) + "-"));
        }
        return new Sheet(sheet.title(), sheet.reference(), sheet.revision(), sheet.date(), sheet.caution(), sheet.made(), blocks);
    }

    /** The blocks of one comparison. */
    static List<Block> of(Comparison comparison, Format format, boolean many, String anchor) {
        ComparisonBlocks made = new ComparisonBlocks(format);
        made.answer(comparison, many, anchor);
        made.table(comparison, anchor);
        made.why(comparison, anchor);
        made.conversion(comparison, anchor);
        return made.blocks;
    }

    private void answer(Comparison comparison, boolean many, String anchor) {
        blocks.add(new Heading(2, many ? "What the codes say, " + comparison.item().mark() : "What the codes say", anchor + "answer"));
        List<Line> codes = comparison.codes();
        comparison.lines().get(0).refusal().filter(ItemResult.Refusal::ofScope).ifPresent(r -> blocks.add(new Paragraph(ItemResult.OUTSIDE + ". " + r.clause() + ": " + r.reason()
            + " Send to the engineer: " + r.instead() + ".", Tone.CAUTION)));
        if (codes.isEmpty()) {
            blocks.add(new Answer(List.of(Fact.of("Codes", "no code covers this item", "see the reasons below"))));
            return;
        }
        Line most = codes.stream().max(Comparator.comparingDouble(ComparisonBlocks::pressure)).orElseThrow();
        Line least = codes.stream().min(Comparator.comparingDouble(ComparisonBlocks::pressure)).orElseThrow();
        List<Fact> facts = new ArrayList<>();
        facts.add(Fact.of("Wind pressure, mean over the panel", codes.size() == 1 ? nearest(most) : nearest(least) + " to " + nearest(most),
            codes.size() == 1 ? most.name() : "smallest " + least.name() + ", largest " + most.name()));
        comparison.spread().ifPresent(s -> facts.add(Fact.of("How far apart", "the largest is " + Show.number(s, 3, Rounding.NEAREST) + " times the smallest",
            codes.size() + " editions cover this item")));
        comparison.lines().stream().filter(l -> l.chosen() && l.found().isPresent()).findFirst().ifPresent(l -> facts.add(Fact.of("The code of this job", nearest(l), l.name())));
        comparison.plain().ifPresent(l -> facts.add(Fact.of("Plain fluid mechanics", nearest(l), "no code: the independent check")));
        blocks.add(new Answer(facts));
        blocks.add(new Picture(ComparisonDrawing.of(comparison, format), "Mean wind pressure on the panel, 50-year wind, characteristic. A full dot is a code, the ring is plain fluid "
            + "mechanics; the larger dot is the code of this job.", "Pressures: " + String.join("; ", comparison.lines().stream().filter(l -> l.found().isPresent())
            .map(l -> l.name() + " " + nearest(l)).toList()) + "."));
    }

    private static double pressure(Line line) {
        return line.found().orElseThrow().pressure();
    }

    private String nearest(Line line) {
        return format.nearest(pressure(line), Dimension.PRESSURE);
    }

    private void table(Comparison comparison, String anchor) {
        blocks.add(new Heading(2, "Line by line", anchor + "lines"));
        List<Row> rows = new ArrayList<>();
        for (Line line : comparison.lines()) {
            rows.add(line.found().map(f -> row(line, f)).orElseGet(() -> new Row(List.of(line.name(), line.terrain(), speed(line), "-", "-", "not covered", "-", "-"), false)));
        }
        blocks.add(new Table("Loads by each code, 50-year wind, characteristic", List.of(new Column("Code", false, 6), new Column("Terrain", false, 3),
            new Column("Basic speed", true, 3), new Column("Velocity pressure", true, 3), new Column("All factors together", true, 3),
            new Column("Mean pressure", true, 3), new Column("Greatest of any zone", true, 3), new Column("Force", true, 3)), rows));
        List<String> refused = comparison.lines().stream().filter(l -> l.found().isEmpty()).map(l -> l.name() + ": " + l.refusal().map(ComparisonBlocks::reason)
            .orElse("no result")).toList();
        if (!refused.isEmpty()) {
            blocks.add(new Notes(refused));
        }
    }

    private static String reason(ItemResult.Refusal refusal) {
        return refusal.ofScope() ? ItemResult.OUTSIDE + ": " + refusal.reason() : refusal.clause() + ": " + refusal.reason();
    }

    private Row row(Line line, Found found) {
        return new Row(List.of(line.name() + (line.chosen() ? " (this job)" : ""), line.terrain(), speed(line), shown(found.velocity(), Dimension.PRESSURE, format),
            format.plain(found.coefficient()), shown(found.pressure(), Dimension.PRESSURE, format), shown(found.greatest(), Dimension.PRESSURE, format),
            shown(found.force(), Dimension.FORCE, format)), line.chosen());
    }

    /** To the nearest: what is compared is no load to design with. */
    static String shown(double si, Dimension dimension, Format format) {
        return Show.of(si, dimension, format.units(), 3, Rounding.NEAREST).text();
    }

    private String speed(Line line) {
        return shown(line.speed(), Dimension.SPEED, format);
    }

    private void why(Comparison comparison, String anchor) {
        if (comparison.codes().isEmpty()) {
            return;
        }
        blocks.add(new Heading(2, "Why they differ", anchor + "why"));
        double velocity = median(comparison.codes().stream().map(l -> l.found().orElseThrow().velocity()).toList());
        double factor = median(comparison.codes().stream().map(l -> l.found().orElseThrow().coefficient()).toList());
        List<String> sentences = new ArrayList<>();
        for (Line line : comparison.lines()) {
            line.found().ifPresent(f -> sentences.add(line.name() + ": velocity pressure " + off(f.velocity(), velocity) + " the middle of the codes, everything else together "
                + off(f.coefficient(), factor) + " it." + (line.why().isEmpty() ? "" : " " + line.why())
                + (f.recalled() > 0 ? " " + Math.round(f.recalled() * 100) + " % of its steps rest on figures not yet checked against print." : "")));
        }
        blocks.add(new Notes(sentences));
    }

    private static String off(double value, double middle) {
        long percent = Math.round((value / middle - 1) * 100);
        return percent == 0 ? "at" : Math.abs(percent) + " % " + (percent > 0 ? "above" : "below");
    }

    private static double median(List<Double> values) {
        List<Double> sorted = values.stream().sorted().toList();
        int n = sorted.size();
        return n % 2 == 1 ? sorted.get(n / 2) : (sorted.get(n / 2 - 1) + sorted.get(n / 2)) / 2;
    }

    private static String method(Comparison.Gust gust) {
        double more = Math.pow(gust.largest() / gust.used(), 2) - 1;
        double less = 1 - Math.pow(gust.smallest() / gust.used(), 2);
        return "Every code is given its own basic speed for the same wind, and its loads are brought to the wind that is passed once in 50 years: all stand at one level, characteristic. A least pressure or speed of a code counts before that. From a mean to a gust "
            + "the speed is converted by the ratios after Durst for open country, which give " + Show.number(gust.used(), 3, Rounding.NEAREST) + " for the 3 s gust over the 10 minute mean. Other "
            + "sources give " + Format.count(gust.smallest()) + " to " + Format.count(gust.largest()) + ": a pressure from a converted speed may be up to " + Math.round(more * 100)
            + " % larger or " + Math.round(less * 100) + " % smaller than shown. A speed of the place as each code defines it is better: it can be typed for each code.";
    }

    private void conversion(Comparison comparison, String anchor) {
        blocks.add(new Heading(2, "How the speeds were converted", anchor + "speeds"));
        blocks.add(new Paragraph(method(comparison.gust()), Tone.PLAIN));
        blocks.add(new Notes(comparison.lines().stream().map(l -> l.name() + ": " + l.how() + "; " + speed(l) + ", terrain " + l.terrain() + ".").toList()));
        blocks.add(new Paragraph("Left out of the comparison: the user's own factors, an authority's least pressure, season and duration, risk categories. The classes of terrain were matched "
            + "by their roughness; hills are counted by each code's own rule.", Tone.SMALL));
        Map<Steps, List<Line>> bySteps = new LinkedHashMap<>();
        comparison.lines().forEach(l -> CalculationBlocks.steps(l.steps(), format, step -> "").ifPresent(s -> bySteps.computeIfAbsent(s, k -> new ArrayList<>()).add(l)));
        int number = 0;
        for (Map.Entry<Steps, List<Line>> each : bySteps.entrySet()) {
            blocks.add(new Heading(3, "Speed for " + String.join("; ", each.getValue().stream().map(Line::name).toList()), anchor + "speed-" + number++));
            blocks.add(each.getKey());
        }
    }
}
