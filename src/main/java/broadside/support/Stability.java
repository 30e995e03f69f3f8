package broadside.support;

import broadside.trace.Status;
import broadside.trace.Trace;

/** A rule of stability with its factors recorded, and the level of the wind that goes with it. */
record Stability(StabilityRule rule, double onWeight, double onWind, double level, double required) {

    static Stability of(StabilityRule rule, WindLevels levels, Trace trace) {
        String place = rule.title() + ": " + rule.place();
        double weight = trace.line("stability-weight-factor", "γ_g", "factor on the weight that holds").from(place, rule.status())
            .reads("by the rule", rule.onWeight(), "1");
        double wind = trace.line("stability-wind-factor", "γ_w", "factor on the wind").from(place, rule.status()).reads("by the rule", rule.onWind(), "1");
        double level = trace.line("stability-wind-level", "k_w", "to the level of the rule").from(levels.place(), levels.status())
            .reads(rule.strength() ? "level of strength" : "level of service", rule.strength() ? levels.strength() : levels.service(), "1");
        double required = trace.line("stability-required", "r", "ratio that must be reached").from(place, rule.status())
            .reads("by the rule", rule.required(), "1");
        return new Stability(rule, weight, wind, level, required);
    }

    String title() {
        return rule.title();
    }

    String place() {
        return rule.place();
    }

    Status status() {
        return rule.status();
    }

    /** What is asked, with the factors and the ratio that must be reached. */
    double demand(String what, String symbol, String load, double value, String unit, Trace trace) {
        return trace.line(what + "-demand", symbol, "what " + what + " asks, with the factors").in("r", required).in("γ_w", onWind).in("k_w", level)
            .in(load, value, unit).from(place(), status()).gives("r γ_w k_w " + load, required * onWind * level * value, unit);
    }

    /** What resists over what acts, with the factors. */
    double ratio(String what, double capacity, String capacitySymbol, double value, String load, String unit, Trace trace) {
        Trace.Line line = trace.line(what + "-ratio", "n_" + what.charAt(0), "what resists over what acts, with the factors")
            .in(capacitySymbol, capacity, unit).in("γ_w", onWind).in("k_w", level).in(load, value, unit).from(place(), status());
        double acts = onWind * level * value;
        return acts > 0 && capacity / acts < Check.MOST ? line.gives(capacitySymbol + " / (γ_w k_w " + load + ")", capacity / acts, "1")
            : line.reads("next to nothing acts; " + (int) Check.MOST + " is written in place of the ratio", Check.MOST, "1");
    }
}
