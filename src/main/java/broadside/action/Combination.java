package broadside.action;

import broadside.codes.LoadCase.Windward;
import broadside.codes.LoadCase;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** One load case on all panels of an item at once, the wind meeting them all from the same end. */
record Combination(String name, String label, Windward windward, List<PanelForce> panels) {

    /** All combinations of an item: each named case, and each end where the case depends on it. */
    static List<Combination> all(List<PanelCases> panels) {
        Set<String> names = new LinkedHashSet<>();
        Set<String> square = new LinkedHashSet<>();
        for (PanelCases each : panels) {
            each.cases().forEach(c -> names.add(c.name()));
            square.add(each.cases().get(0).name());
        }
        List<Combination> all = new ArrayList<>();
        for (String name : names) {
            for (Windward windward : sides(panels, name, square.contains(name))) {
                all.add(combine(panels, name, square.contains(name), windward));
            }
        }
        return all;
    }

    private static List<Windward> sides(List<PanelCases> panels, String name, boolean square) {
        boolean sided = panels.stream().map(p -> p.matching(name, square, Windward.RIGHT)).anyMatch(c -> c.windward() != Windward.NONE);
        return sided ? List.of(Windward.RIGHT, Windward.LEFT) : List.of(Windward.NONE);
    }

    private static Combination combine(List<PanelCases> panels, String name, boolean square, Windward windward) {
        List<PanelForce> forces = new ArrayList<>();
        String label = "";
        for (PanelCases each : panels) {
            LoadCase load = each.matching(name, square, windward);
            label = load.name().equals(name) && label.isEmpty() ? load.label() : label;
            forces.add(PanelForce.of(each.panel(), load));
        }
        return new Combination(name, label, windward, forces);
    }

    /** Whether pressures are measured from the windward end; a case that only moves an even pressure's resultant is not. */
    boolean measuredFromTheEnd() {
        return panels.stream().anyMatch(p -> p.load().windward() != Windward.NONE && p.load().rule().isEmpty());
    }

    /** Whether this is the mirror image of the same case met from the other end. */
    boolean mirrors(Combination other) {
        return near(force(), other.force()) && near(moment(), other.moment()) && near(torsion(), -other.torsion())
            && panels.stream().allMatch(p -> p.panel().endsAlike());
    }

    private static boolean near(double a, double b) {
        return Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b));
    }

    double force() {
        return panels.stream().mapToDouble(PanelForce::force).sum();
    }

    double moment() {
        return panels.stream().mapToDouble(p -> p.force() * p.height()).sum();
    }

    double torsion() {
        return panels.stream().mapToDouble(p -> p.force() * p.side()).sum();
    }

    /** Sum of force times height times side distance: what shifts moment from one post to another. */
    double couple() {
        return panels.stream().mapToDouble(p -> p.force() * p.height() * p.side()).sum();
    }

    /** The worse of two ends: by moment at the foot, then by torsion; equal ones stay. */
    Combination worse(Combination other) {
        double tolerance = 1e-9 * Math.max(moment(), other.moment());
        if (Math.abs(moment() - other.moment()) > tolerance) {
            return moment() > other.moment() ? this : other;
        }
        double mine = Math.abs(torsion());
        double theirs = Math.abs(other.torsion());
        return theirs > mine + 1e-9 * Math.max(mine, theirs) ? other : this;
    }
}
