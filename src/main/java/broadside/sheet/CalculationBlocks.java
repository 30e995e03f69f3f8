package broadside.sheet;

import broadside.action.CaseAction;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Shown;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Heading;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.StepLine;
import broadside.sheet.Block.Steps;
import broadside.sheet.Block.Table;
import broadside.sheet.Block.Tone;
import broadside.trace.Step;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** The calculation of one item: what was given, one line to redo by hand, the balance, and every recorded step. */
final class CalculationBlocks {

    static List<Block> of(ItemResult item, Format format, String anchor, boolean many) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Block.NewPage());
        blocks.add(new Heading(2, "Calculation" + (many ? ", item " + item.item().mark() : ""), anchor + "calculation"));
        item.loads().ifPresent(loads -> {
            blocks.add(new Heading(3, "To redo by hand", anchor + "hand"));
            blocks.add(new Paragraph(handCheck(item.sheet(), loads, format), Tone.PLAIN));
            loads.balance().forEach(b -> blocks.add(new Paragraph(balance(b), Tone.PLAIN)));
        });
        blocks.add(new Heading(3, "Given", anchor + "given"));
        blocks.add(given(item.sheet()));
        blocks.add(new Heading(3, "Steps", anchor + "steps"));
        blocks.add(new Paragraph("Values are in SI with four figures; what was calculated was not rounded. The status says how well the source is known: read means seen in print, in the code "
            + "or in a guide or national copy that the note of the table names; second-hand means seen quoted, or in another edition.",
            Tone.SMALL));
        steps(item.sheet(), format, step -> CheckList.part(item.item(), step)).ifPresent(blocks::add);
        return blocks;
    }

    /** The governing load, written out. */
    private static String handCheck(Trace sheet, Loads loads, Format format) {
        CaseAction c = loads.governs("base-moment");
        String suffix = c.name() + (c.state().isEmpty() ? "" : "/" + c.state());
        int step = 1;
        for (Step each : sheet.steps()) {
            if (each.name().equals("force/" + suffix)) {
                break;
            }
            step++;
        }
        String pressure = "Pressure times area gives the force: see step " + step + ".";
        return switch (loads.foot()) {
            case NONE -> "Force of " + CaseTables.name(c) + ": " + both(c.force(), "N", format) + ". " + pressure;
            case WALL -> "Moment at the wall, " + CaseTables.name(c) + Format.end(c) + ": force times its distance from the wall = " + both(c.force(), "N", format)
                + " x " + both(c.side(), "m", format) + " = " + both(c.baseMoment(), "N m", format) + ". " + pressure;
            case GROUND -> "Moment at the ground line, " + CaseTables.name(c) + Format.end(c) + ": force times height = " + both(c.force(), "N", format) + " x "
                + both(c.height(), "m", format) + " = " + sheet.find("panel-moment/" + suffix).map(s -> both(s.value(), "N m", format) + ", and with the wind on the posts "
                    + both(c.baseMoment(), "N m", format)).orElseGet(() -> both(c.baseMoment(), "N m", format)) + ". " + pressure;
        };
    }

    private static String both(double si, String unit, Format format) {
        String other = format.other(si, unit);
        return value(si, unit) + (other.isEmpty() ? "" : " (" + other + ")");
    }

    private static String balance(Loads.Balance balance) {
        return "Equilibrium, " + balance.what() + ": sum of loads " + value(balance.loads(), balance.unit()) + " = sum of reactions "
            + value(balance.reactions(), balance.unit()) + ".";
    }

    private static Table given(Trace sheet) {
        List<Row> rows = sheet.givens().stream().map(g -> new Row(List.of(g.meaning(), plainSymbol(g.symbol()), g.typed().isEmpty() ? "-" : g.typed(),
            g.unit().equals("1") ? Format.count(g.value()) : value(g.value(), g.unit())), false)).toList();
        return new Table("What the calculation starts from", List.of(new Column("Meaning", false, 6), new Column("Symbol", false, 2),
            new Column("As typed", false, 3), new Column("In SI", true, 3)), rows);
    }

    /** A symbol in running text, its subscript on the line. */
    static String plainSymbol(String symbol) {
        return symbol.replace("_", "").replace("{", "").replace("}", "");
    }

    /** Every recorded step; {@code part} says what it belongs to. Nothing when there are none. */
    static Optional<Steps> steps(Trace sheet, Format format, Function<Step, String> part) {
        List<StepLine> lines = new ArrayList<>();
        int number = 0;
        for (Step step : sheet.steps()) {
            Shown shown = shown(step.value(), step.unit());
            String formula = step.way() == Step.Way.RELATION ? "= " + step.formula() : step.formula();
            lines.add(new StepLine(++number, step.name(), step.symbol(), step.meaning() + part.apply(step), formula, numbers(step), shown.number(), shown.unit(),
                format.other(step.value(), step.unit()), step.place(), step.status().shown() + "; " + step.name()));
        }
        return lines.isEmpty() ? Optional.empty() : Optional.of(new Steps(lines));
    }

    /** The values put in; a step that only takes over one value needs no line for it. */
    private static String numbers(Step step) {
        if (step.inputs().size() == 1 && step.formula().equals(step.inputs().get(0).symbol())) {
            return "";
        }
        StringBuilder numbers = new StringBuilder();
        for (Step.Input input : step.inputs()) {
            numbers.append(numbers.isEmpty() ? "" : ", ").append(input.symbol()).append(" = ").append(value(input.value(), input.unit()));
        }
        step.replaced().ifPresent(r -> numbers.append("calculated: ").append(value(r.calculated(), step.unit())));
        return numbers.toString();
    }

    private static String value(double si, String unit) {
        return shown(si, unit).text();
    }

    private static Shown shown(double si, String unit) {
        return unit.equals("1") ? new Shown(Show.number(si, 4, Rounding.NEAREST), "") : Show.step(si, unit, 4);
    }

    private CalculationBlocks() { }
}
