package broadside.sheet;

import broadside.assess.Carried;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Fact;
import broadside.sheet.Block.Facts;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.Notes;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.Table;
import broadside.sheet.Block.Tone;
import broadside.support.Check;
import java.util.ArrayList;
import java.util.List;

/** What carries an item: what it is, demand against capacity, what was tried, what must be confirmed. */
final class CarriedBlocks {

    static List<Block> of(Carried carried, Format format, String anchor, int level) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Heading(level, "What carries it, pre-sized", anchor + "carries"));
        blocks.add(new Paragraph("Pre-sizing for an engineer's review. A share of 1 or less means that the check named is met by the rule named, and nothing more.", Tone.SMALL));
        for (Carried.Part part : carried.parts()) {
            blocks.addAll(part(part, format));
        }
        return blocks;
    }

    private static List<Block> part(Carried.Part part, Format format) {
        List<Block> blocks = new ArrayList<>();
        part.refused().ifPresent(why -> blocks.add(new Paragraph(part.title() + ": " + why, Tone.CAUTION)));
        if (!part.results().isEmpty()) {
            List<Fact> facts = new ArrayList<>();
            part.results().forEach(r -> facts.add(Fact.of(r.label(), value(r, format))));
            part.assumed().forEach(a -> facts.add(new Fact("assumed, to be confirmed", a, "", true)));
            blocks.add(new Facts(part.title(), facts));
        }
        if (!part.checks().isEmpty()) {
            blocks.addAll(checks(part, format));
        }
        if (!part.choices().isEmpty()) {
            blocks.add(choices(part, format));
        }
        if (!part.remarks().isEmpty()) {
            blocks.add(new Notes(part.remarks()));
        }
        return blocks;
    }

    /** Demand against capacity, with the rules numbered and told once below. */
    private static List<Block> checks(Carried.Part part, Format format) {
        List<Row> rows = new ArrayList<>();
        List<String> rules = new ArrayList<>();
        double most = part.checks().stream().mapToDouble(Check::utilisation).max().orElse(0);
        for (Check check : part.checks()) {
            boolean governs = check.utilisation() == most;
            String rule = check.rule() + "; " + check.status().shown();
            if (!rules.contains(rule)) {
                rules.add(rule);
            }
            rows.add(new Row(List.of(check.name(), ofCase(check.named()), format.amount(check.demand(), check.unit()), format.capacity(check.capacity(), check.unit()),
                share(check.utilisation()), (check.passes() ? "met" : "NOT met") + (governs ? ", governs" : ""), Integer.toString(rules.indexOf(rule) + 1)), governs));
        }
        List<String> told = new ArrayList<>();
        rules.forEach(rule -> told.add("Rule " + (told.size() + 1) + ": " + rule));
        return List.of(new Table(part.title() + ": demand against capacity", List.of(new Column("Check", false, 5), new Column("Case", false, 5), new Column("Demand", true, 3),
            new Column("Capacity", true, 3), new Column("Share", true, 2), new Column("Result", false, 4), new Column("Rule", true, 1)), rows),
            new Paragraph(String.join(". ", told) + ".", Tone.SMALL));
    }

    private static String ofCase(String named) {
        return named.isEmpty() ? "-" : Format.caseName(named);
    }

    private static Table choices(Carried.Part part, Format format) {
        List<Row> rows = new ArrayList<>();
        for (Carried.Choice choice : part.choices()) {
            rows.add(new Row(List.of(choice.designation(), format.massPerLength(choice.mass()), share(choice.utilisation()), choice.by(), ofCase(choice.named()),
                choice.chosen() ? "chosen: the lightest that passes" : choice.passes() ? "passes" : "fails"), choice.chosen()));
        }
        return new Table("Sections tried, from light to heavy", List.of(new Column("Section", false, 4), new Column("Mass", true, 3), new Column("Greatest share", true, 3),
            new Column("By", false, 4), new Column("Case", false, 3), new Column("Result", false, 5)), rows);
    }

    /** A share of what can be taken, rounded up. */
    static String share(double ratio) {
        return ratio >= Check.MOST ? "above " + (int) (Check.MOST - 1) : Show.number(ratio, 3, Rounding.UP);
    }

    /** One result in words. */
    static String value(Carried.Result result, Format format) {
        return result.unit().isEmpty() ? result.text() : format.amount(result.value(), result.unit());
    }

    /** The whole of it in one line for the answer: what was found part by part, and the greatest share. */
    static Fact answer(Carried carried, Format format) {
        List<String> found = new ArrayList<>();
        for (Carried.Part part : carried.parts()) {
            if (part.refused().isEmpty() && !part.results().isEmpty()) {
                Carried.Result first = part.results().get(0);
                found.add((first.unit().isEmpty() ? "" : first.label() + " ") + value(first, format));
            }
        }
        String refused = carried.parts().stream().flatMap(p -> p.refused().stream()).findFirst().orElse("");
        String worst = carried.checks().stream().reduce((a, b) -> b.utilisation() > a.utilisation() ? b : a)
            .map(c -> (c.passes() ? "greatest share " : "NOT ENOUGH: share ") + share(c.utilisation()) + ", " + c.name()).orElse("no check: loads only");
        return Fact.of("What would carry it", refused.isEmpty() ? String.join("; ", found) : "not pre-sized", refused.isEmpty()
            ? worst + "; pre-sizing for an engineer's review" : refused);
    }

    private CarriedBlocks() { }
}
