package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * One check of what carries an item: what is asked of it over what it can give.
 *
 * @param name         such as "post bending"
 * @param rule         the rule in words, with its publication
 * @param demand       what is asked, in {@code unit}
 * @param capacity     what can be given, in the same unit
 * @param unit         SI unit of both; "1" for ratios
 * @param utilisation  demand over capacity, not above {@link #MOST}
 * @param named        the load case that gives it; empty where there is none
 * @param status       how well the rule and its figures are known
 */
public record Check(String name, String rule, double demand, double capacity, String unit, double utilisation, String named, Status status) {

    /** What is written where nothing resists: no ratio leaves as infinity. */
    public static final double MOST = 999;

    private static final double ROUNDING = 1e-9;

    /**
     * Makes a check and records its ratio as "utilisation/NAME".
     *
     * @param demandSymbol    symbol under which the demand was recorded
     * @param capacitySymbol  symbol under which the capacity was recorded
     */
    public static Check of(String name, String rule, In demand, In capacity, String unit, String named, Status status, Trace trace) {
        double ratio = demand.value() <= 0 ? 0 : capacity.value() <= 0 ? MOST : Math.min(MOST, demand.value() / capacity.value());
        Trace.Line line = trace.line("utilisation/" + name.replace(' ', '-'), "η", name + ", share of what it can take").in(demand.symbol(), demand.value(), unit)
            .in(capacity.symbol(), capacity.value(), unit).from(rule, status);
        double kept = demand.value() > 0 && capacity.value() > 0 && ratio < MOST ? line.gives(demand.symbol() + " / " + capacity.symbol(), ratio, "1")
            : line.reads(demand.value() <= 0 ? "nothing is asked of it" : "it gives nothing that counts; " + (int) MOST + " is written in place of the ratio", ratio, "1");
        return new Check(name, rule, demand.value(), capacity.value(), unit, kept, named, status);
    }

    /** A recorded value under its symbol. */
    public record In(String symbol, double value) { }

    public boolean passes() {
        return utilisation <= 1 + ROUNDING;
    }
}
