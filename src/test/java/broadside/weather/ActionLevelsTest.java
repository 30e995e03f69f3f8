package broadside.weather;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.SheetCheck;
import broadside.quantity.Speed;
import broadside.trace.Trace;
import java.util.List;
import org.junit.jupiter.api.Test;

class ActionLevelsTest {

    /** 60 % of the load is 77 % of the speed, 80 % is 89 %. */
    @Test
    void a_share_of_the_load_is_its_root_of_the_speed() {
        Trace trace = new Trace();
        List<ActionLevels.Level> levels = ActionLevels.of(Speed.metresPerSecond(20), List.of(0.6, 0.8), trace);
        assertThat(levels.get(0).ofSpeed()).isEqualTo(12);
        assertThat(levels.get(0).ofLoad()).isCloseTo(20 * 0.775, within(0.01));
        assertThat(levels.get(1).ofLoad()).isCloseTo(20 * 0.894, within(0.01));
        assertThat(trace.find("level-of-speed/0.8").orElseThrow().value()).isEqualTo(16);
        SheetCheck.holds(trace);
        assertThatThrownBy(() -> ActionLevels.of(Speed.metresPerSecond(20), List.of(60.0), trace)).isInstanceOf(UnfitWeather.class);
    }
}
