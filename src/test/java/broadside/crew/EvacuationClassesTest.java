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
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Classes of structures cleared before a limiting wind, and the limits that others print. */
class EvacuationClassesTest {

    /** 0.625 v², and 1.2 of it. */
    @ParameterizedTest
    @CsvSource({"denmark-3, 668, 802", "denmark-4, 508, 609", "denmark-5, 375, 450"})
    void pressuresOfTheDanishClasses(String key, double peak, double design) {
        Trace trace = new Trace();
        EvacuationClasses.Design found = CREW.classes().design(key, Optional.empty(), 1.25, trace);
        assertThat(found.peak()).isCloseTo(peak, within(0.5));
        assertThat(found.design()).isCloseTo(design, within(0.6));
        assertThat(found.of().limit()).isPresent();
        assertThat(found.of().remark()).contains("farmland");
        assertThat(found.of().status()).isEqualTo(Status.READ);
        SheetCheck.holds(trace);
    }

    /** 800 Pa of the 50-year wind: 0.8 x 800 = 640, not 0.64 x 800 = 512; 1.5 of it 960. */
    @Test
    void theSeasonIsSquaredOnce() {
        Trace trace = new Trace();
        EvacuationClasses.Design found = CREW.classes().design("denmark-2", Optional.of(800.0), 1.25, trace);
        assertThat(found.peak()).isCloseTo(640, within(1e-9));
        assertThat(found.design()).isCloseTo(960, within(1e-9));
        assertThat(CREW.classes().design("denmark-1", Optional.of(800.0), 1.25, new Trace()).design()).isCloseTo(1200, within(1e-9));
        assertThat(CREW.classes().design("denmark-no-risk", Optional.of(800.0), 1.25, new Trace()).design()).isCloseTo(852, within(1e-9));
        SheetCheck.holds(trace);
    }

    /** 100 km/h is 473 Pa by 0.613 v² and 482 Pa at 1.25 kg/m3; 470 x 1.25 is 588 Pa, a gust of 30.7 m/s. */
    @Test
    void theFrenchPair() {
        Trace trace = new Trace();
        EvacuationClasses.Design found = CREW.classes().design("france-tent", Optional.empty(), 1.25, trace);
        assertThat(value(trace, "evacuation-pressure")).isCloseTo(482, within(0.5));
        assertThat(found.peak()).isCloseTo(470, within(1e-9));
        assertThat(found.design()).isCloseTo(588, within(0.6));
        assertThat(found.gust()).isCloseTo(30.7, within(0.05));
        SheetCheck.holds(trace);
        Trace light = new Trace();
        CREW.classes().design("france-tent", Optional.empty(), 1.226, light);
        assertThat(value(light, "evacuation-pressure")).isCloseTo(473, within(0.5));
    }

    @Test
    void limitAndPressureAreOnePair() {
        assertThatThrownBy(() -> CREW.classes().design("denmark-4", Optional.of(900.0), 1.25, new Trace())).isInstanceOf(UnfitFigure.class)
            .hasMessageContaining("one pair");
        assertThatThrownBy(() -> CREW.classes().design("denmark-1", Optional.empty(), 1.25, new Trace())).isInstanceOf(UnfitFigure.class)
            .hasMessageContaining("50-year");
        assertThatThrownBy(() -> CREW.classes().design("denmark-6", Optional.empty(), 1.25, new Trace())).isInstanceOf(UnfitFigure.class)
            .hasMessageContaining("denmark-5");
        assertThatThrownBy(() -> CREW.classes().design("denmark-4", Optional.empty(), 0, new Trace())).isInstanceOf(UnfitFigure.class);
        assertThat(CREW.classes().all()).filteredOn(EvacuationClasses.EvacuationClass::byFifty).extracting(EvacuationClasses.EvacuationClass::key)
            .containsExactly("denmark-1", "denmark-2", "denmark-no-risk");
    }

    @Test
    void publishedLimitsKeepTheirSourceAndStatus() {
        assertThat(CREW.limits().byTrade()).filteredOn(l -> l.key().equals("nfrc-sheets")).singleElement().satisfies(l -> {
            assertThat(l.status()).isEqualTo(Status.RECALLED);
            assertThat(l.kind()).isEqualTo("mean");
            assertThat(l.speed().orElseThrow().metresPerSecond()).isCloseTo(7.6, within(0.05));
        });
        assertThat(CREW.limits().byTrade()).extracting(PublishedLimits.Limit::kind).containsOnly("mean", "gust", "any", "not said");
        assertThat(CREW.limits().ofEvents()).filteredOn(l -> l.speed().isEmpty()).hasSize(6).allMatch(l -> !l.place().isBlank());
        Trace trace = new Trace();
        CREW.limits().record("fabrics-off", trace);
        assertThat(value(trace, "speed")).isCloseTo(13.41, within(0.005));
        assertThatThrownBy(() -> CREW.limits().record("osha-scaffold", new Trace())).isInstanceOf(UnfitFigure.class).hasMessageContaining("no number");
        assertThatThrownBy(() -> CREW.limits().record("guess", new Trace())).isInstanceOf(UnfitFigure.class);
    }

    @ParameterizedTest
    @ValueSource(strings = {"action-levels", "rise-of-wind", "evacuation-classes", "event-plans", "work-limits", "handling", "comfort",
        "lifting"})
    void aMissingTableStopsTheStart(String table) {
        assertThatThrownBy(() -> Crews.without("crew/1/" + table + ".csv")).isInstanceOf(TableFormat.class).hasMessageContaining(table);
    }
}
