package broadside.quantity;

import java.math.BigInteger;

/** Writes a whole number of eighths of an inch as feet, inches and a reduced fraction. */
final class FeetInchesText {
    private static final BigInteger PER_FOOT = BigInteger.valueOf(96);
    private static final int PER_INCH = 8;

    private FeetInchesText() {
    }

    static String of(BigInteger eighths) {
        BigInteger[] parts = eighths.abs().divideAndRemainder(PER_FOOT);
        int rest = parts[1].intValue();
        String inches = inches(rest / PER_INCH, rest % PER_INCH);
        String sign = eighths.signum() < 0 ? "-" : "";
        if (parts[0].signum() == 0) {
            return sign + inches;
        }
        return sign + parts[0] + " ft" + (rest == 0 ? "" : " " + inches);
    }

    private static String inches(int whole, int eighths) {
        if (eighths == 0) {
            return whole + " in";
        }
        int common = Integer.lowestOneBit(eighths);
        String fraction = eighths / common + "/" + PER_INCH / common;
        return (whole == 0 ? "" : whole + " ") + fraction + " in";
    }
}
