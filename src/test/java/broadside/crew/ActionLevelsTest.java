package broadside.crew;

import static broadside.crew.Crews.CREW;
import static broadside.crew.Crews.value;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.table.TableFormat;
import broadside.trace.Status;
import broadside.trace.Trace;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Levels of wind for a crew, and when work begins so that it ends in time. */
class ActionLevelsTest {

    private static List<ActionLevels.Level> levels(double limit, Trace trace) {
        return CREW.levels().of(limit, Optional.empty(), trace);
    }

    /** Limit 20 m/s: 60, 80 and 90 % are 12, 16 and 18 m/s; of the load 20 times the roots of 0.6, 0.8 and 0.9. */
    @Test
    void bothReadingsAreGivenAndTheSaferHolds() {
        Trace trace = new Trace();
        List<ActionLevels.Level> levels = levels(20, trace);
        assertThat(levels).extracting(ActionLevels.Level::key).containsExactly("prepare", "act", "clear");
        double[][] hand = {{12, 15.4919, 0.36, 0.774597}, {16, 17.8885, 0.64, 0.894427}, {18, 18.9737, 0.81, 0.948683}};
        for (int i = 0; i < 3; i++) {
            ActionLevels.Level level = levels.get(i);
            assertThat(level.bySpeed()).isCloseTo(hand[i][0], within(1e-9));
            assertThat(level.byLoad()).isCloseTo(hand[i][1], within(1e-4));
            assertThat(level.loadBySpeed()).isCloseTo(hand[i][2], within(1e-9));
            assertThat(level.speedByLoad()).isCloseTo(hand[i][3], within(1e-6));
            assertThat(level.gust()).isEqualTo(level.bySpeed()).isLessThan(level.byLoad());
            assertThat(value(trace, "level/" + level.key())).isEqualTo(level.gust());
        }
        assertThat(trace.find("share/act").orElseThrow().status()).isEqualTo(Status.READ);
        assertThat(trace.find("share/clear").orElseThrow().status()).isEqualTo(Status.DERIVED);
        SheetCheck.holds(trace);
    }

    /** Sixty and eighty per cent of the load for the Danish limits of 32.7, 28.5 and 24.5 m/s. */
    @ParameterizedTest
    @CsvSource({"32.7, 25.3, 29.2", "28.5, 22.1, 25.5", "24.5, 19.0, 21.9"})
    void sharesOfTheLoadOfTheDanishClasses(double limit, double prepare, double act) {
        Trace trace = new Trace();
        List<ActionLevels.Level> levels = CREW.levels().of(limit, Optional.of(ActionLevels.Reading.LOAD), trace);
        assertThat(levels.get(0).gust()).isCloseTo(prepare, within(0.05));
        assertThat(levels.get(1).gust()).isCloseTo(act, within(0.05));
        assertThat(CREW.levels().of(limit, Optional.of(ActionLevels.Reading.SPEED), new Trace()).get(1).gust()).isCloseTo(0.8 * limit, within(1e-9));
        SheetCheck.holds(trace);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
    void aLimitThatIsNoneIsRefused(double limit) {
        assertThatThrownBy(() -> levels(limit, new Trace())).isInstanceOf(UnfitFigure.class).extracting("field").isEqualTo("limit");
    }

    /** A share above 1, or one below that of the level before it, would put a level over the limit or turn the order round. */
    @ParameterizedTest
    @ValueSource(strings = {"1.80", "0.50", "0.60"})
    void sharesThatDoNotRiseToOneStopTheStart(String share) {
        assertThatThrownBy(() -> Crews.with("action-levels", t -> t.replace("act    , 0.80", "act    , " + share))).isInstanceOf(TableFormat.class)
            .hasMessageContaining("act has");
    }

    private static List<LeadTime.Start> starts(LeadTime.Plan plan, Trace trace) {
        return CREW.leadTime().starts(levels(20, trace), 20, plan, trace);
    }

    /**
     * Limit 20 m/s, half an hour to take down, 10 m/s in an hour. Clear: 10 min cost 1.667 m/s, 18.33, so the level of 18 stands.
     * Act: 18 - 5 = 13 instead of 16. Prepare: 5 min cost 0.833, 12.17, so the level of 12 stands.
     */
    @Test
    void workBeginsEarlyEnough() {
        Trace trace = new Trace();
        List<LeadTime.Start> starts = starts(new LeadTime.Plan(Map.of("act", 1800.0), Optional.empty(), Optional.empty(), Optional.empty()), trace);
        assertThat(starts).extracting(LeadTime.Start::key).containsExactly("prepare", "act", "clear");
        assertThat(starts.get(0).gust()).isCloseTo(12, within(1e-9));
        assertThat(starts.get(1).gust()).isCloseTo(13, within(1e-9));
        assertThat(starts.get(2).gust()).isCloseTo(18, within(1e-9));
        assertThat(starts).noneMatch(LeadTime.Start::beforehand);
        assertThat(value(trace, "rise-rate")).isCloseTo(10.0 / 3600, within(1e-12));
        assertThat(trace.find("start/act").orElseThrow().status()).isEqualTo(Status.COMMON_PRACTICE);
        SheetCheck.holds(trace);
    }

    /** The sheets are held up to 10 m/s: down before that, 10 - 5 = 5 m/s, and prepared at 5 - 0.833. */
    @Test
    void sheetsAreDownBeforeTheyCannotBeHeld() {
        Trace trace = new Trace();
        List<LeadTime.Start> starts = starts(new LeadTime.Plan(Map.of("act", 1800.0), Optional.of("front"), Optional.empty(), Optional.of(10.0)), trace);
        assertThat(starts.get(1).gust()).isCloseTo(5, within(1e-9));
        assertThat(starts.get(0).gust()).isCloseTo(4.166667, within(1e-6));
        assertThat(starts.get(2).gust()).isCloseTo(18, within(1e-9));
        SheetCheck.holds(trace);
    }

    /** 15 m/s in 10 min: 20 - 15 = 5 m/s to clear, and nothing is left for half an hour of work. */
    @Test
    void aThunderstormIsMetByTheForecast() {
        Trace trace = new Trace();
        List<LeadTime.Start> starts = starts(new LeadTime.Plan(Map.of("act", 1800.0), Optional.of("thunderstorm"), Optional.empty(), Optional.empty()), trace);
        assertThat(starts.get(2).gust()).isCloseTo(5, within(1e-9));
        assertThat(starts.subList(0, 2)).allMatch(LeadTime.Start::beforehand).extracting(LeadTime.Start::gust).containsOnly(0.0);
        SheetCheck.holds(trace);
    }

    /** 0.001 m/s in a second for 1000 s, and no time for the rest: 18 - 1 = 17 leaves the level of 16. */
    @Test
    void aTypedRateTakesTheTablesPlace() {
        Trace trace = new Trace();
        LeadTime.Plan plan = new LeadTime.Plan(Map.of("act", 1000.0, "prepare", 0.0, "clear", 0.0), Optional.empty(), Optional.of(0.001), Optional.empty());
        assertThat(starts(plan, trace)).extracting(LeadTime.Start::gust)
            .usingComparatorForType((a, b) -> Math.abs(a - b) < 1e-9 ? 0 : Double.compare(a, b), Double.class)
            .containsExactly(12.0, 16.0, 18.0);
        assertThat(starts(new LeadTime.Plan(Map.of("act", 3000.0), Optional.empty(), Optional.of(0.001), Optional.empty()), new Trace()).get(1).gust())
            .isCloseTo(15, within(1e-9));
        SheetCheck.holds(trace);
    }

    @Test
    void aPlanThatDoesNotAddUpIsRefused() {
        assertRefused(new LeadTime.Plan(Map.of(), Optional.empty(), Optional.empty(), Optional.empty()), "times.act");
        assertRefused(new LeadTime.Plan(Map.of("act", -1.0), Optional.empty(), Optional.empty(), Optional.empty()), "times.act");
        assertRefused(new LeadTime.Plan(Map.of("act", 1.0, "pray", 1.0), Optional.empty(), Optional.empty(), Optional.empty()), "times");
        assertRefused(new LeadTime.Plan(Map.of("act", 1.0), Optional.of("snow"), Optional.empty(), Optional.empty()), "weather");
        assertRefused(new LeadTime.Plan(Map.of("act", 1.0), Optional.empty(), Optional.of(0.0), Optional.empty()), "rise");
        assertRefused(new LeadTime.Plan(Map.of("act", 1.0), Optional.empty(), Optional.empty(), Optional.of(Double.NaN)), "work-limit");
    }

    private static void assertRefused(LeadTime.Plan plan, String field) {
        assertThatThrownBy(() -> starts(plan, new Trace())).isInstanceOf(UnfitFigure.class).extracting("field").isEqualTo(field);
    }
}
