package broadside.action;

import static broadside.action.Cases.board;
import static broadside.action.Cases.even;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.codes.LoadCase;
import broadside.panel.Panel;
import broadside.trace.Trace;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class FootActionsTest {

    private static final Panel BOARD = board("", 3, 2, 2.5, 0.4);

    private static FootActions.Result of(PanelCases... panels) {
        return FootActions.of(List.of(panels), Cases.SYMBOLS, Cases.ALONE, new Trace());
    }

    private static CaseAction find(FootActions.Result result, String name, String direction) {
        return result.cases().stream().filter(c -> c.name().equals(name) && c.direction().equals(direction)).findFirst().orElseThrow();
    }

    @Test
    void anEvenPressureGivesForceMomentAndTorsion() {
        CaseAction action = find(of(new PanelCases(BOARD, List.of(even("centred", BOARD, 1000, 0)))), "centred", "front");
        assertThat(action.force()).isCloseTo(6000, within(1e-9));
        assertThat(action.baseShear()).isEqualTo(action.force());
        assertThat(action.height()).isCloseTo(3.5, within(1e-12));
        assertThat(action.baseMoment()).isCloseTo(21000, within(1e-9));
        assertThat(action.torsion()).as("the board stands 0.4 m to the right").isCloseTo(2400, within(1e-9));
        assertThat(action.side()).isCloseTo(0.4, within(1e-12));
    }

    @Test
    void ofTwoEndsTheWorseForTorsionIsKept() {
        LoadCase right = even("eccentric", BOARD, 1000, 0.75);
        List<LoadCase> cases = List.of(even("centred", BOARD, 1000, 0), right.mirrored(3), right);
        CaseAction action = find(of(new PanelCases(BOARD, cases)), "eccentric", "front");
        assertThat(action.torsion()).isCloseTo(6000 * (0.4 + 0.75), within(1e-9));
        assertThat(action.windward()).isEqualTo(LoadCase.Windward.RIGHT);
        Panel other = board("", 3, 2, 2.5, -0.4);
        assertThat(find(of(new PanelCases(other, cases)), "eccentric", "front").torsion()).isCloseTo(-6000 * (0.4 + 0.75), within(1e-9));
    }

    @Test
    void fromBehindTheForceIsTheSameAndTheTorsionTurnsTheOtherWay() {
        FootActions.Result result = of(new PanelCases(BOARD, List.of(even("centred", BOARD, 1000, 0))));
        CaseAction front = find(result, "centred", "front");
        CaseAction back = find(result, "centred", "back");
        assertThat(back.force()).isEqualTo(front.force());
        assertThat(back.baseMoment()).isEqualTo(front.baseMoment());
        assertThat(back.torsion()).isEqualTo(-front.torsion());
    }

    @Test
    void boardsAreAdded() {
        Panel upper = board("1", 3, 2, 5, 0);
        Panel lower = board("2", 2, 1, 2, 1);
        CaseAction action = find(of(new PanelCases(upper, List.of(even("centred", upper, 1000, 0))),
            new PanelCases(lower, List.of(even("centred", lower, 800, 0)))), "centred", "front");
        assertThat(action.force()).isCloseTo(6000 + 1600, within(1e-9));
        assertThat(action.baseMoment()).isCloseTo(6000 * 6 + 1600 * 2.5, within(1e-9));
        assertThat(action.torsion()).isCloseTo(1600, within(1e-9));
        assertThat(action.height()).isCloseTo((6000 * 6 + 1600 * 2.5) / 7600, within(1e-12));
        assertThat(action.zones()).extracting(CaseAction.PanelZones::part).containsExactly("1", "2");
    }

    @Test
    void aLeastForceCountsWhereTheZonesGiveLess() {
        LoadCase least = new LoadCase("case-a", "a", LoadCase.Windward.NONE, even("a", BOARD, 100, 0).zones(), 0, Optional.empty(), 0.1, 900);
        CaseAction action = find(of(new PanelCases(BOARD, List.of(least))), "case-a", "front");
        assertThat(action.force()).isCloseTo(900, within(1e-9));
        assertThat(action.height()).as("mid-height and the rise of the case").isCloseTo(3.6, within(1e-12));
        LoadCase more = new LoadCase("case-a", "a", LoadCase.Windward.NONE, even("a", BOARD, 200, 0).zones(), 0, Optional.empty(), 0, 900);
        assertThat(find(of(new PanelCases(BOARD, List.of(more))), "case-a", "front").force()).isCloseTo(1200, within(1e-9));
    }

    @Test
    void zonesGiveTheForceInTheirCentroid() {
        Panel wall = board("", 10, 2, 0, 0);
        CaseAction action = find(of(new PanelCases(wall, Cases.wall(wall))), "wall", "front");
        assertThat(action.force()).isCloseTo((3000 * 2 + 1000 * 8) * 2, within(1e-9));
        double first = (3000 * 2 * 1 + 1000 * 8 * 6) / (3000.0 * 2 + 1000 * 8) - 5;
        assertThat(Math.abs(action.torsion())).isCloseTo(Math.abs(first) * 28000, within(1e-6));
    }

    @Test
    void aBoardWithoutACaseOfTheNameGoesWithItsOwnOfTheKind() {
        Panel one = board("1", 3, 2, 5, 0);
        Panel two = board("2", 2, 1, 2, 0);
        LoadCase shifted = even("eccentric", two, 500, 0.5);
        FootActions.Result result = of(new PanelCases(one, List.of(even("wall", one, 1000, 0))),
            new PanelCases(two, List.of(even("centred", two, 700, 0), shifted, shifted.mirrored(2))));
        assertThat(find(result, "wall", "front").force()).isCloseTo(6000 + 1400, within(1e-9));
        assertThat(find(result, "centred", "front").force()).isCloseTo(6000 + 1400, within(1e-9));
        assertThat(find(result, "eccentric", "front").force()).isCloseTo(6000 + 1000, within(1e-9));
    }

    /** 1 kPa on average, resultant a tenth of the width off the middle: the straight line has 1 + 6 x 0.1 = 1.6 kPa at that edge; times 2 m, times an arm of 1 m. */
    @Test
    void pressureThatFallsInAStraightLineHasItsGreatestMomentPerMetreAtTheEdge() {
        Panel wall = new Panel("", Panel.Kind.WALL, 10, 2, 0, 0, 1, 0, 0, new Panel.AsTyped("", "", "", ""));
        Trace trace = new Trace();
        LoadCase line = even("oblique", wall, 1000, 1);
        CaseAction action = FootActions.of(List.of(new PanelCases(wall, List.of(even("normal", wall, 1000, 0), line, line.mirrored(10)))), Cases.SYMBOLS, Cases.ALONE,
            trace).cases().stream().filter(c -> c.name().equals("oblique")).findFirst().orElseThrow();
        assertThat(trace.find("moment-per-metre/oblique/all").orElseThrow().value()).isCloseTo(1600 * 2 * 1, within(1e-9));
        assertThat(action.zones().get(0).perMetre()).hasSize(1).allSatisfy(m -> assertThat(m).isCloseTo(3200, within(1e-9)));
        assertThat(trace.find("moment-per-metre/normal/all").orElseThrow().value()).isCloseTo(2000, within(1e-9));
    }
}
