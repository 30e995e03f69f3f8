package broadside.codes;

import broadside.aero.Screen;
import broadside.table.Coefficient;
import broadside.table.Curve;
import broadside.table.Edition;
import broadside.table.Source;
import broadside.trace.Status;
import broadside.trace.Trace;

/**
 * What is left of the load on a closed plate when it has openings, by the loss of pressure through them. The loss depends
 * on the kind of openings, which is mostly not known: both ends are worked out and the larger counts.
 */
final class OpenFlowScreens {

    private static final String OPEN = "Taylor and Davies (1944), Hoerner: open screens";
    private static final String DENSE = "Richards and Robinson (1999): a closed plate less its effective openings";

    private final Constants constants;
    private final Curve perforated;

    OpenFlowScreens(Edition edition) {
        this.constants = new Constants(edition);
        this.perforated = edition.curve("perforated-plates");
    }

    /** Load over that of the closed plate with the coefficient C_0; recorded as "porosity-factor". */
    double factor(double solidity, double closed, Trace trace) {
        double s = trace.given("s", "solidity", solidity, "1", "");
        Source own = constants.source("least-open-share");
        double open = trace.line("open-share", "β", "open area over gross area").in("s", s).from("definition of solidity", own.status())
            .gives("1 - s", 1 - s, "1");
        double least = constants.number("least-open-share");
        if (!Numbers.atLeast(open, least)) {
            return trace.line("porosity-factor", "k_s", "part of the load of a closed plate that is left").from(own.citation(), own.status())
                .reads("1: no reduction below " + Numbers.plain(least) + " open", 1, "1");
        }
        double sheet = perforated(open, closed, trace);
        double mesh = mesh(open, closed, trace);
        Source rule = constants.source("open-mesh-from");
        trace.line("porosity-factor/least", "k_l", "the same for the kind of openings that lets more wind through; not used in the loads")
            .in("C_{sheet}", sheet).in("C_{mesh}", mesh).in("C_0", closed).from(rule.citation(), rule.status())
            .gives("min(C_{sheet}; C_{mesh}) / C_0", Math.min(sheet, mesh) / closed, "1");
        return trace.line("porosity-factor", "k_s", "part of the load of a closed plate that is left: the larger of perforated sheet and round wire mesh")
            .in("C_{sheet}", sheet).in("C_{mesh}", mesh).in("C_0", closed).from(rule.citation(), rule.status())
            .gives("max(C_{sheet}; C_{mesh}) / C_0", Math.max(sheet, mesh) / closed, "1");
    }

    private double perforated(double open, double closed, Trace trace) {
        Coefficient printed = perforated.at("K", open);
        double k = printed.into(trace.line("loss-coefficient/perforated", "K_{sheet}", "loss coefficient of perforated sheet").in("β", open));
        double change = constants.number("open-mesh-from");
        return gross(open, k, perforated.at("K", change).value(), closed, "perforated", "sheet", "perforated sheet", trace);
    }

    private double mesh(double open, double closed, Trace trace) {
        double b = constants.number("wire-loss");
        Source place = constants.source("wire-loss");
        double k = trace.line("loss-coefficient/mesh", "K_{mesh}", "loss coefficient of round wire mesh").in("β", open).from(place.citation(), place.status())
            .gives(Numbers.plain(b) + " (1 - β²) / β²", Screen.wireLoss(open, b), "1");
        return gross(open, k, Screen.wireLoss(constants.number("open-mesh-from"), b), closed, "mesh", "mesh", "round wire mesh", trace);
    }

    /** Coefficient on the gross area: the drag of an open screen, or for a dense one the closed plate less its effective openings. */
    private double gross(double open, double loss, double lossAtChange, double closed, String name, String mark, String words, Trace trace) {
        String k = "K_{" + mark + "}";
        String c = "C_{" + mark + "}";
        if (Numbers.atLeast(open, constants.number("open-mesh-from"))) {
            return trace.line("coefficient/" + name, c, "coefficient of " + words + " on the gross area, at most that of the closed plate").in(k, loss)
                .in("C_0", closed).from(OPEN, Status.RECALLED)
                .gives("min(C_0; " + k + " / (1 + " + k + " / 4)²)", Math.min(closed, Screen.openDrag(loss)), "1");
        }
        double b = constants.number("wire-loss");
        String e = "β_{" + mark + "}";
        double effective = trace.line("effective-open-share/" + name, e, "open share of the round wire mesh with the same loss as " + words).in(k, loss)
            .from(DENSE, constants.source("wire-loss").status())
            .gives("1 / (1 + " + k + " / " + Numbers.plain(b) + ")^0.5", Screen.effectiveOpenShare(loss, b), "1");
        String floor = "C_{" + mark + ",h}";
        double half = trace.line("coefficient-half-open/" + name, floor, "coefficient of " + words + " that is half open, at most that of the closed plate")
            .in("C_0", closed).from(OPEN, Status.RECALLED).reads("the smaller of C_0 and K / (1 + K/4)² with K = " + Numbers.plain(lossAtChange),
                Math.min(closed, Screen.openDrag(lossAtChange)), "1");
        return trace.line("coefficient/" + name, c, "coefficient of " + words + " on the gross area, not below that of one half open").in("C_0", closed)
            .in(e, effective).in(floor, half).from(DENSE, Status.RECALLED)
            .gives("max(C_0 (1 - " + e + "); " + floor + ")", Math.max(closed * (1 - effective), half), "1");
    }
}
