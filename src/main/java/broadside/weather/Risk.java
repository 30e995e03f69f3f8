package broadside.weather;

import broadside.trace.Status;
import broadside.trace.Trace;

/** Chance that the speed of a return period is reached once or more in a number of years. */
public final class Risk {

    private static final String BOOKS = "independent years: r = 1 - (1 - 1/T)^n, several texts";

    /** r = 1 - (1 - 1/T)^n; recorded as "risk". {@code returnPeriod} in years, longer than one. */
    public static double of(double returnPeriod, double years, Trace trace) {
        if (!(returnPeriod > 1) || !Double.isFinite(returnPeriod)) {
            throw new UnfitWeather("return-period", "a return period is longer than 1 year");
        }
        requireYears(years);
        trace.given("T", "return period", returnPeriod, "years", Plain.number(returnPeriod) + " years");
        trace.given("n", "years", years, "1", Plain.number(years));
        return trace.line("risk", "r", "chance of once or more in n years").in("T", returnPeriod, "years").in("n", years).from(BOOKS, Status.READ)
            .gives("1 - (1 - 1 / T)^n", 1 - Math.pow(1 - 1 / returnPeriod, years), "1");
    }

    /** T = 1/(1 - (1 - r)^(1/n)); recorded as "return-period" in years, and "annual-chance". */
    public static double returnPeriod(double risk, double years, Trace trace) {
        if (!(risk > 0 && risk < 1)) {
            throw new UnfitWeather("risk", "a chance is a number between 0 and 1");
        }
        requireYears(years);
        trace.given("r", "chance of once or more in n years", risk, "1", Plain.number(risk));
        trace.given("n", "years", years, "1", Plain.number(years));
        double annual = trace.line("annual-chance", "p", "chance in one year").in("r", risk).in("n", years).from(BOOKS, Status.READ)
            .gives("1 - (1 - r)^(1 / n)", 1 - Math.pow(1 - risk, 1 / years), "1");
        if (!(annual > 0)) {
            throw new UnfitWeather("risk", "so small a chance in so many years has no return period that can be worked out");
        }
        return trace.line("return-period", "T", "return period").in("p", annual).from(BOOKS, Status.READ).gives("1 / p", 1 / annual, "years");
    }

    private static void requireYears(double years) {
        if (!(years > 0) || !Double.isFinite(years)) {
            throw new UnfitWeather("years", "a number of years above zero is needed");
        }
    }

    private Risk() { }
}
