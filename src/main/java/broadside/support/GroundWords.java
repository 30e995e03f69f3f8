package broadside.support;

import broadside.panel.Footing;
import broadside.table.Rows;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** What the typed word for the ground stands for, and the presumptive values that go with it. */
final class GroundWords {

    private final GroundTables tables;
    private final Optional<String> word;
    private final List<Assumed> assumed;

    /**
     * Looks the word up.
     *
     * @param assumed  takes what had to be assumed
     * @throws UnfitAnswer when the word is not in the table
     */
    GroundWords(GroundTables tables, Footing.Soil soil, List<Assumed> assumed) {
        this.tables = tables;
        this.assumed = assumed;
        this.word = soil.ground().map(w -> w.strip().toLowerCase(Locale.ROOT)).filter(w -> !w.isEmpty());
        Rows words = tables.words();
        word.filter(w -> !words.has(w)).ifPresent(w -> {
            throw new UnfitAnswer("footing.ground", "this word for the ground is none of " + String.join(", ", words.keys()));
        });
    }

    /** Class of the presumptive values, such as "4"; empty for a word of the ground factor or none. */
    Optional<String> soilClass() {
        return word.map(w -> tables.words().text(w, "class")).filter(c -> !c.equals("-"));
    }

    /** Ground of the ground factor; empty for a class of the presumptive values or none. */
    Optional<String> ground() {
        return word.map(w -> tables.words().text(w, "ground")).filter(c -> !c.equals("-"));
    }

    /** Mud, organic soil, fill: nothing can be presumed. */
    boolean isBad() {
        return word.isPresent() && soilClass().isEmpty() && ground().isEmpty();
    }

    /** The class whose values are presumed, the lowest where it is not known. */
    String presumedClass() {
        refuseBad();
        return soilClass().orElseGet(() -> {
            String lowest = tables.lowestSoil();
            note((word.isPresent() ? "\"" + word.get() + "\" names no class of soil. " : "") + "The soil is assumed to be class " + lowest + " of the presumptive values (" + tables.soil(lowest)
                + "), the lowest of the table. Confirm the soil.");
            return lowest;
        });
    }

    /** The ground whose factor is presumed, the poorest where it is not known. */
    String presumedGround() {
        refuseBad();
        return ground().orElseGet(() -> {
            String lowest = tables.lowestGround();
            note((word.isPresent() ? "\"" + word.get() + "\" has no ground factor. " : "") + "The ground is assumed to be " + lowest + ", the lowest ground factor. Confirm the ground.");
            return lowest;
        });
    }

    private void note(String text) {
        if (assumed.stream().noneMatch(a -> a.text().equals(text))) {
            assumed.add(new Assumed(text));
        }
    }

    private void refuseBad() {
        if (isBad()) {
            throw new NoAnswer("there is no presumptive value for " + word.orElseThrow() + ": the soil must be tested, and its values typed");
        }
    }
}
