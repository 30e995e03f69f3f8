package broadside.weather;

import java.math.BigDecimal;

/** Numbers in formulas and sentences, without exponents and trailing zeros. */
final class Plain {

    static String number(double value) {
        String text = new BigDecimal(Double.toString(value)).stripTrailingZeros().toPlainString();
        return text.equals("-0") ? "0" : text;
    }

    private Plain() { }
}
