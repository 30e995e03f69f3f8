package broadside.report;

import broadside.sheet.Block.StepLine;
import broadside.sheet.Block.Steps;
import java.util.ArrayList;
import java.util.List;

/**
 * The calculation sheet: for each step its number, the value with formula and numbers, and beside them what it means
 * and where it comes from.
 */
final class StepParts {

    private static final double NUMBER = 26;
    private static final double GUTTER = 14;
    private static final double SHARE = 0.58;

    private final Flow flow;
    private final Tag parent;

    StepParts(Flow flow, Tag parent) {
        this.flow = flow;
        this.parent = parent;
    }

    List<Part> steps(Steps steps) {
        List<Part> parts = new ArrayList<>();
        if (!steps.lines().isEmpty()) {
            Tag list = parent.child("L").attribute(Tag.Attribute.DECIMAL);
            for (StepLine step : steps.lines()) {
                parts.add(step(step, list.child("LI"), parts.isEmpty() ? 7 : 0));
            }
        }
        return parts;
    }

    private Part step(StepLine step, Tag item, double gap) {
        double text = flow.width() - NUMBER;
        double left = text * SHARE - GUTTER;
        Band.Cell number = new Band.Cell(0, NUMBER - 4)
            .add(words().add(Integer.toString(step.number()), false), Type.QUIET, item.child("Lbl"));
        Tag body = item.child("LBody");
        Band.Cell work = new Band.Cell(NUMBER, left);
        add(work, value(step), Type.TABLE, body);
        add(work, words().addFormula(step.found(), false), Type.TABLE, body);
        Band.Cell source = new Band.Cell(NUMBER + left + GUTTER, text - left - GUTTER);
        add(source, words().add(step.meaning(), false), Type.TABLE, body);
        add(source, source(step), Type.QUIET, body);
        return new Band(gap, 3, List.of(number, work, source), TextParts::hairline);
    }

    private Words words() {
        return flow.typeset().words();
    }

    /** An empty line makes no element. */
    private static void add(Band.Cell cell, Words words, Type type, Tag body) {
        if (!words.isEmpty()) {
            cell.add(words, type, body);
        }
    }

    private Words value(StepLine step) {
        String symbol = step.symbol().isBlank() ? step.name() : step.symbol();
        Words words = words().addFormula(symbol, true);
        if (step.relation()) {
            words.addFormula(" " + step.formula(), false);
        }
        words.add(" = " + step.value() + " " + step.unit(), true);
        return step.other().isBlank() ? words : words.add(" (" + step.other() + ")", false);
    }

    private Words source(StepLine step) {
        boolean both = !step.place().isBlank() && !step.status().isBlank();
        return words().add(both ? step.place() + " (" + step.status() + ")" : step.place() + step.status(), false);
    }
}
