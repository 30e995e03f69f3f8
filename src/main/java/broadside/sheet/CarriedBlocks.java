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
import java.util.Locale;

/** What carries an item: what it is, demand against capacity, what was tried, what must be confirmed. */
final class CarriedBlocks {

    /** What stands before a warning, whatever the shares say. */
    static final String WARNED = "an engineer first";

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
            part.warnings().forEach(w -> facts.add(new Fact(WARNED, w, "", true)));
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
            List<String> pair = format.pair(check.demand(), check.capacity(), check.unit());
            String rule = check.rule() + "; " + check.status().shown();
            if (!rules.contains(rule)) {
                rules.add(rule);
            }
            rows.add(new Row(List.of(check.name(), ofCase(check.named()), pair.get(0), pair.get(1), share(check.utilisation()), (check.passes() ? "met" : "NOT met") + (governs ? ", governs" : ""), Integer.toString(rules.indexOf(rule) + 1)), governs));
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

    /** The whole of it in one line for the answer: what was found part by part, whether it is enough, and the greatest share. */
    static Fact answer(Carried carried, Format format) {
        String found = String.join("; ", carried.parts().stream().filter(p -> p.refused().isEmpty() && !p.results().isEmpty()).map(p -> brief(p, format)).toList());
        String refused = String.join(" ", carried.parts().stream().flatMap(p -> p.refused().stream().map(why -> p.title() + ": " + why)).toList());
        List<String> warnings = carried.parts().stream().flatMap(p -> p.warnings().stream()).toList();
        String worst = carried.checks().stream().reduce((a, b) -> b.utilisation() > a.utilisation() ? b : a)
            .map(c -> (c.passes() ? (warnings.isEmpty() ? "every" : "Otherwise every") + " check named is met, greatest share " : "NOT ENOUGH: share ") + share(c.utilisation()) + ", " + c.name()).orElse("not checked");
        String small = (warnings.isEmpty() ? "" : WARNED.toUpperCase(Locale.ROOT) + ": " + String.join(" ", warnings) + " ") + (refused.isEmpty() ? "" : refused + " ")
            + (carried.checks().isEmpty() && !refused.isEmpty() ? "" : worst + "; ") + "pre-sizing for an engineer's review";
        return Fact.of("What would carry it", found.isEmpty() ? "not pre-sized" : found, small);
    }

    /** One part in a few words, with the sizes that a price needs. */
    private static String brief(Carried.Part part, Format format) {
        Carried.Result first = part.results().get(0);
        if (part.key().equals("footing")) {
            return value(first, format) + ", " + size(part, "depth", format) + " deep, " + size(part, "width", format) + (part.results().stream().anyMatch(r -> r.key().equals("length"))
                ? " by " + size(part, "length", format) : " wide") + ", " + size(part, "concrete", format) + " of concrete each";
        }
        return first.unit().isEmpty() ? value(first, format) : first.label() + " " + value(first, format);
    }

    private static String size(Carried.Part part, String key, Format format) {
        return part.results().stream().filter(r -> r.key().equals(key)).findFirst().map(r -> value(r, format)).orElse("");
    }

    private CarriedBlocks() { }
}
