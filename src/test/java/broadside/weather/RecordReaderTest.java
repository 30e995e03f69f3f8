package broadside.weather;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import broadside.quantity.Dimension;
import broadside.quantity.Unit;
import broadside.table.TableLibrary;
import broadside.weather.WindRecord.Kind;
import broadside.weather.WindRecord.Row;
import broadside.weather.WindRecord.Series;
import java.time.Duration;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RecordReaderTest {

    private static final WeatherTables TABLES = new WeatherTables(TableLibrary.shipped());
    private static final RecordReader READER = new RecordReader(TABLES);

    @ParameterizedTest
    @ValueSource(strings = {
        "time,mean (km/h),gust (km/h)\n2026-08-14 15:00,36,54\n2026-08-14 16:00,37.8,55\n",
        "Gust [KM/H];TIME;Mean (km/h)\n54;2026-08-14T15:00Z;36\n55;2026-08-14T16:00Z;37,8\n",
        "\uFEFFTime\tWind speed (kmh)\tWind gust (km/h)\r\n2026-08-14T15:00:00+02:00\t36\t54\r\n2026-08-14T16:00:00+02:00\t37,8\t55\r\n",
        "Station;7\n\nDate;Time;Mean (m/s);Gust (kn)\n14.08.2026;15:00;10;29,15766739\n14.08.2026;16:00;10,5;29,7\n",
        "time,mean (km/h),gust (km/h)\n2026-08-14 15:00,\"36,0\",54\n2026-08-14 16:00,\"37,8\",55\n"})
    void all_usual_ways_of_writing(String text) {
        WindRecord record = READER.read(text, Optional.empty());
        assertThat(record.rows()).hasSize(2);
        Row first = record.rows().get(0);
        assertThat(first.time()).isEqualTo(LocalDateTime.of(2026, 8, 14, 15, 0));
        assertThat(first.mean().orElseThrow()).isCloseTo(10, within(1e-9));
        assertThat(first.gust().orElseThrow()).isCloseTo(15, within(1e-6));
        assertThat(record.rows().get(1).mean().orElseThrow()).isCloseTo(10.5, within(1e-9));
        assertThat(record.step()).isEqualTo(Duration.ofHours(1));
        assertThat(record.problems()).allMatch(p -> p.kind() == Kind.UNITS);
    }

    @Test
    void problems_are_told_with_their_rows_and_the_rest_is_kept() {
        WindRecord record = READER.read("""
            time;mean (m/s);gust (m/s)
            2026-01-01 00:00;5;8
            2026-01-01 01:00;5;8
            2026-01-01 01:00;6;9
            2026-01-01 02:00;-1;8
            2026-01-01 03:00;5;900
            2026-01-01 04:00;9;8
            yesterday;5;8
            2026-01-01 05:00;abc;8
            2026-01-01 06:00;;8
            2026-01-01 07:00;;8
            2026-01-01 08:00;10 kn;8
            2026-01-01 12:00;5;8
            2026-01-01 13:00;5;8;7
            01/02/2026 14:00;5;8
            """, Optional.empty());
        assertThat(record.problems()).extracting(p -> p.kind() + " " + p.row() + "-" + p.toRow()).containsExactly("DUPLICATE 4-4", "NEGATIVE 5-5",
            "ABSURD 6-6",
            "MEAN_ABOVE_GUST 7-7", "TIME 8-8", "VALUE 9-9", "GAP 9-9", "MISSING 10-11", "UNITS 12-12", "GAP 13-13", "VALUE 14-14", "TIME 15-15");
        assertThat(record.rows()).extracting(Row::row).containsExactly(2, 3, 5, 6, 9, 10, 11, 12, 13);
        assertThat(record.rows().get(2).mean()).isEmpty();
        assertThat(record.rows().get(2).gust()).hasValue(8);
        assertThat(record.dropped()).isEqualTo(8);
        assertThat(record.problems().stream().filter(p -> p.row() == 13).findFirst().orElseThrow().text()).contains("3 times are missing");
    }

    @ParameterizedTest
    @ValueSource(strings = {"2026-02-29 00:00", "2026-13-01 00:00", "2026-01-01 24:30", "2026-01-01 10:60", "2026-01-01 1500",
        "01/02/2026 15:00", "2026-01-01x15:00"})
    void times_that_are_none_are_told(String time) {
        WindRecord record = READER.read("time,gust (m/s)\n2026-01-01 00:00,5\n" + time + ",6\n", Optional.empty());
        assertThat(record.problems()).anyMatch(p -> p.kind() == Kind.TIME && p.row() == 3);
        assertThat(record.rows()).hasSize(1);
    }

    @ParameterizedTest
    @ValueSource(strings = {"2028-02-29 00:00", "2028-02-29T00:00:00Z", "2028-02-28 24:00", "2028-02-29", "29.02.2028 0:00", "2028-02-29T01:00+01:00"})
    void times_of_all_kinds(String time) {
        WindRecord record = READER.read("time,gust (m/s)\n" + time + ",6\n", Optional.empty());
        assertThat(record.rows().get(0).instant()).isEqualTo(java.time.Instant.parse("2028-02-29T00:00:00Z"));
    }

    @Test
    void times_out_of_order_are_put_in_order() {
        WindRecord record = READER.read("time,gust (mph)\n2026-01-01T02:00Z,20\n2026-01-01T00:00Z,18\n2026-01-01T01:00Z,19\n", Optional.empty());
        assertThat(record.rows()).extracting(Row::row).containsExactly(3, 4, 2);
        assertThat(record.problems()).extracting(WindRecord.RowProblem::kind).containsExactly(Kind.ORDER);
    }

    @Test
    void clock_change_is_no_gap_when_the_zone_is_written() {
        WindRecord record = READER.read("""
            time,gust (m/s)
            2026-10-25T01:00+02:00,5
            2026-10-25T02:00+02:00,5
            2026-10-25T02:00+01:00,6
            2026-10-25T03:00+01:00,5
            """, Optional.empty());
        assertThat(record.problems()).isEmpty();
        assertThat(record.rows()).hasSize(4);
    }

    @Test
    void unit_comes_from_the_heading_or_from_the_caller() {
        String bare = "time,gust\n2026-01-01 00:00,10\n2026-01-01 01:00,10\n";
        assertThatThrownBy(() -> READER.read(bare, Optional.empty())).isInstanceOfSatisfying(UnfitWeather.class,
            e -> assertThat(e.field()).isEqualTo("unit"));
        Optional<Unit> knots = Unit.of(Dimension.SPEED, "kn");
        assertThat(READER.read(bare, knots).rows().get(0).gust().orElseThrow()).isCloseTo(5.1444, within(0.0001));
        WindRecord both = READER.read(bare.replace("gust", "gust (m/s)"), knots);
        assertThat(both.rows().get(0).gust()).hasValue(10);
        assertThat(both.problems()).extracting(WindRecord.RowProblem::kind).containsExactly(Kind.UNITS);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "a,b\n1,2\n", "time,mean (furlongs)\n2026-01-01 00:00,3\n", "time,mean (m/s)\n",
        "time,mean (m/s)\n\"2026-01-01 00:00,3\n", "\u0000\u0001;;;\n"})
    void text_that_is_no_record_is_refused_in_words(String text) {
        assertThatThrownBy(() -> READER.read(text, Optional.empty())).isInstanceOf(UnfitWeather.class);
    }

    /** Two days, ten-hour blow from 08:00 of the first day; levels and days by hand. */
    @Test
    void hours_days_and_time_to_act() {
        WindRecord record = READER.read(days(), Optional.empty());
        LevelCounts.Above above = LevelCounts.above(record, Series.GUST, List.of(15.0)).get(0);
        assertThat(above.hours()).isEqualTo(10);
        assertThat(above.knownHours()).isEqualTo(48);
        assertThat(above.days()).isEqualTo(1);
        assertThat(above.knownDays()).isEqualTo(2);
        assertThat(above.first()).hasValue(LocalDateTime.of(2026, 3, 1, 8, 0));
        LevelCounts.ActionTime act = LevelCounts.firstToAct(record, Series.GUST, 15, Duration.ofHours(3)).orElseThrow();
        assertThat(act.actBy()).isEqualTo(LocalDateTime.of(2026, 3, 1, 5, 0));
        assertThat(act.atOnce()).isFalse();
        assertThat(LevelCounts.firstToAct(record, Series.GUST, 15, Duration.ofHours(9)).orElseThrow().atOnce()).isTrue();
        assertThat(LevelCounts.firstToAct(record, Series.GUST, 16, Duration.ZERO)).isEmpty();
    }

    @Test
    void days_lost_count_hours_of_work() {
        WindRecord record = READER.read(days(), Optional.empty());
        assertThat(LevelCounts.daysLost(record, Series.GUST, 15, work(7, 17, 9)).lost()).isEqualTo(1);
        assertThat(LevelCounts.daysLost(record, Series.GUST, 15, work(7, 17, 9.5)).lost()).isZero();
        assertThat(LevelCounts.daysLost(record, Series.GUST, 15, work(18, 7, 0)).lost()).isZero();
        assertThat(LevelCounts.daysLost(record, Series.GUST, 15, work(0, 0, 0)).known()).isEqualTo(2);
    }

    private static LevelCounts.WorkingDay work(int from, int to, double hours) {
        return new LevelCounts.WorkingDay(LocalTime.of(from, 0), LocalTime.of(to, 0), hours);
    }

    private static String days() {
        StringBuilder text = new StringBuilder("time,gust (m/s)\n");
        for (int h = 0; h < 48; h++) {
            text.append(LocalDateTime.of(2026, 3, 1, 0, 0).plusHours(h)).append(',').append(h >= 8 && h < 18 ? 15 : 9).append('\n');
        }
        return text.toString();
    }

    @Test
    void a_year_of_hours_is_read_well_within_a_tenth_of_a_second() {
        String text = year(2025);
        long best = Long.MAX_VALUE;
        for (int i = 0; i < 10; i++) {
            long start = System.nanoTime();
            assertThat(READER.read(text, Optional.empty()).rows()).hasSize(8760);
            best = Math.min(best, System.nanoTime() - start);
        }
        System.out.println("8760 rows in " + best / 1e6 + " ms");
        assertThat(best).isLessThan(100_000_000L);
    }

    @Test
    void annual_maxima_tell_how_much_of_the_year_is_known() {
        AnnualMaxima maxima = AnnualMaxima.of(READER.read(year(2025) + "2026-01-01 00:00,20,40\n", Optional.empty()), Series.GUST, TABLES);
        assertThat(maxima.years()).hasSize(2);
        assertThat(maxima.years().get(0).complete()).isCloseTo(1, within(1e-9));
        assertThat(maxima.years().get(0).speed()).isCloseTo(30, within(1e-9));
        assertThat(maxima.years().get(0).time()).isEqualTo(LocalDateTime.of(2025, 2, 11, 16, 0));
        assertThat(maxima.years().get(1).complete()).isCloseTo(1 / 8760.0, within(1e-12));
        assertThat(maxima.complete()).extracting(AnnualMaxima.OneYear::year).containsExactly(2025);
        assertThat(maxima.length()).isCloseTo(1, within(0.001));
    }

    /** Gusts of 5 to 14 m/s, but 30 m/s in hour 1000. */
    private static String year(int year) {
        StringBuilder text = new StringBuilder("time,mean (m/s),gust (m/s)\n");
        LocalDateTime at = LocalDateTime.of(year, 1, 1, 0, 0);
        for (int h = 0; h < 8760; h++) {
            text.append(at.plusHours(h).toString().replace('T', ' ')).append(",4.5,").append(h == 1000 ? 30 : 5 + h % 10).append('\n');
        }
        return text.toString();
    }
}
