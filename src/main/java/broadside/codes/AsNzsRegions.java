package broadside.codes;

import broadside.quantity.Period;
import broadside.table.Coefficient;
import broadside.table.Edition;
import broadside.table.Rows;
import broadside.table.Source;
import broadside.trace.Trace;
import java.util.Optional;

/** Regional gust speeds of AS/NZS 1170.2, section 3: a formula for each region, rounded, and in one edition a factor on it. */
final class AsNzsRegions {

    private final Rows regions;
    private final Optional<Rows> factors;
    private final double formulaFrom;
    private final String title;

    AsNzsRegions(Edition edition) {
        this.regions = edition.rows("regional-speeds");
        this.factors = edition.hasProperty("region-factors") ? Optional.of(edition.rows("region-factors")) : Optional.empty();
        this.formulaFrom = new Constants(edition).number("region-formula-from");
        this.title = edition.property("title");
    }

    /** Throws with words for the person who typed it when there is no such region. */
    void checkName(String region) {
        if (!regions.has(region)) {
            throw new IllegalArgumentException("must be one of the regions of " + title + " that are known here: " + String.join(", ", regions.keys()));
        }
    }

    boolean has(String region) {
        return regions.has(region);
    }

    /** Whether a return period has a speed: by the formula, or the value that the table has for one year. */
    boolean covers(String region, double years) {
        return Numbers.atLeast(years, formulaFrom) || isOneYear(years) && regions.isPrinted(region, "once-a-year");
    }

    /**
     * Regional gust speed V_R, m/s.
     *
     * @throws IllegalArgumentException with words for the person who typed it when there is none
     */
    double speed(String region, double years) {
        if (!covers(region, years)) {
            throw new IllegalArgumentException("the formula of region " + region + " holds for a return-period of " + Numbers.plain(formulaFrom) + " years or more"
                + (regions.isPrinted(region, "once-a-year") ? "; for 1 year the table has " + regions.text(region, "once-a-year") + " m/s" : ""));
        }
        if (isOneYear(years)) {
            return regions.number(region, "once-a-year").value();
        }
        return factor(region, years).map(Coefficient::value).orElse(1.0) * Math.round(byFormula(region, years));
    }

    /** Records how V_R comes about and hands it back, m/s. */
    double record(String region, Period period, Trace trace) {
        Source place = regions.number(region, "a").source();
        double years = trace.given("R", "return period", period.years(), "years", period.typed());
        String meaning = "regional gust speed of region " + region;
        if (isOneYear(years)) {
            return trace.line("regional-speed", "V_R", meaning).in("R", years, "years").from(place.citation(), place.status())
                .reads("read in the table for 1 year, where the formula does not hold", regions.number(region, "once-a-year").value(), "m/s");
        }
        Optional<Coefficient> factor = factor(region, years);
        String rounded = factor.isPresent() ? "V_R'" : "V_R";
        double exact = trace.line("regional-speed-by-formula", rounded + "'", meaning + ", not rounded").in("R", years, "years").from(place.citation(), place.status())
            .gives(regions.text(region, "a") + " - " + regions.text(region, "b") + " R^(" + regions.text(region, "exponent") + ")", byFormula(region, years), "m/s");
        double whole = trace.line(factor.isPresent() ? "regional-speed-rounded" : "regional-speed", rounded, meaning).in(rounded + "'", exact, "m/s")
            .from(place.citation(), place.status()).reads("rounded to 1 m/s", Math.round(exact), "m/s");
        if (factor.isEmpty()) {
            return whole;
        }
        String symbol = factors.orElseThrow().text(region, "symbol");
        double f = factor.get().into(trace.line("region-factor", symbol, "factor on the speed of region " + region + " from a return period of "
            + factors.orElseThrow().text(region, "from") + " years"));
        return trace.line("regional-speed", "V_R", meaning).in(symbol, f).in(rounded, whole, "m/s").from(factor.get().source().citation(), factor.get().source().status())
            .gives(symbol + " " + rounded, f * whole, "m/s");
    }

    /** The speed of one return period over that of another, both as the formulas or the table for one year give them, not rounded. */
    double ratio(String region, double years, double over) {
        return exact(region, years) / exact(region, over);
    }

    private double exact(String region, double years) {
        return isOneYear(years) ? speed(region, years) : factor(region, years).map(Coefficient::value).orElse(1.0) * byFormula(region, years);
    }

    private double byFormula(String region, double years) {
        return regions.number(region, "a").value() - regions.number(region, "b").value() * Math.pow(years, regions.number(region, "exponent").value());
    }

    private Optional<Coefficient> factor(String region, double years) {
        return factors.filter(f -> f.has(region) && Numbers.atLeast(years, f.number(region, "from").value())).map(f -> f.number(region, "value"));
    }

    /** A speed as it stands in a text, m/s, without the noise of binary products. */
    static String text(double speed) {
        return Numbers.plain(Math.round(speed * 1000) / (double) 1000);
    }

    private static boolean isOneYear(double years) {
        return Math.abs(years - 1) < 1e-9;
    }
}
