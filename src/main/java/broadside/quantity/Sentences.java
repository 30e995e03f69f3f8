package broadside.quantity;

import java.util.List;

/** The sentences said about a text that cannot be read; each names the text, the fault and what fits. */
record Sentences(String text, Dimension dimension) {

    private QuantityException say(String fault) {
        return new QuantityException(Folding.quote(text) + " " + fault);
    }

    private String fits() {
        return dimension.phrase() + " is typed like " + dimension.examples();
    }

    private String fitsWithUnit() {
        return dimension.phrase() + " is typed with its unit, like " + dimension.examples();
    }

    QuantityException nothing() {
        return new QuantityException("nothing was typed: " + fitsWithUnit());
    }

    QuantityException tooLong() {
        return say("is longer than 100 characters: " + fits());
    }

    QuantityException unprintable() {
        return say("holds a character that does not print: " + fits());
    }

    QuantityException otherDigits() {
        return say("has digits other than 0 to 9: type the number with 0 to 9, like " + dimension.examples());
    }

    QuantityException noNumber() {
        return say("does not begin with a number: " + fits());
    }

    QuantityException notOneNumber() {
        return say("is not one clear number: " + fits());
    }

    QuantityException twoNumbers() {
        return say("holds more than one number: " + fits());
    }

    QuantityException exponent() {
        return say("uses an exponent: type the number in full digits, like " + dimension.examples());
    }

    QuantityException zeroDenominator() {
        return say("divides by zero: " + fits());
    }

    QuantityException noUnit() {
        return say("has no unit: " + fitsWithUnit());
    }

    QuantityException beaufort() {
        return say("stands for a range of speeds, not for one: " + fits());
    }

    QuantityException ton() {
        return say("does not say which ton: type t for 1000 kg, or the mass in kg or lb");
    }

    QuantityException otherKind(Dimension kind) {
        return say("is " + kind.phrase() + "; " + fits());
    }

    QuantityException letterCase(Unit unit) {
        return say("leaves the unit open, as small m and capital M differ: type " + unit.symbol()
                + " if that unit is meant");
    }

    QuantityException unknownUnit() {
        List<String> symbols = dimension.units().stream().map(Unit::symbol).toList();
        int last = symbols.size() - 1;
        return say("has no unit that is known: " + dimension.phrase() + " is typed in "
                + String.join(", ", symbols.subList(0, last)) + " or " + symbols.get(last)
                + ", like " + dimension.examples());
    }

    QuantityException feetNotWhole() {
        return say("has feet that are not a whole number before the inches: " + fits());
    }

    QuantityException inches() {
        return say("does not end in inches below 12 after the feet: feet and inches are typed like 8 ft 6 in");
    }

    QuantityException hyphen() {
        return say("does not say its units: feet and inches are typed like 8 ft 6 in");
    }
}
