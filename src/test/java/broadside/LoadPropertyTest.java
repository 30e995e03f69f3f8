package broadside;

import static broadside.RandomJobs.hoarding;
import static broadside.RandomJobs.job;
import static broadside.RandomJobs.loads;
import static broadside.RandomJobs.sign;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.RandomJobs.Board;
import broadside.RandomJobs.Wall;
import broadside.action.CaseAction;
import broadside.action.PostAction;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.codes.ZonePressure;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What must hold for any job, tried on random ones from fixed seeds: both codes, both kinds. */
class LoadPropertyTest {

    private static final int TRIES = 400;
    private static final double EXACT = 1e-9;

    private static void near(double actual, double expected, String what) {
        assertThat(actual).as(what).isCloseTo(expected, within(EXACT * Math.max(1e-6, Math.abs(expected))));
    }

    private static String anyItem(RandomJobs random, boolean en) {
        return random.chance() ? hoarding(random.wall(en)) : sign(boards(random, en, 1 + random.upTo(2)), 1 + random.upTo(3), random.between(0.5, 4));
    }

    private static List<Board> boards(RandomJobs random, boolean en, int count) {
        List<Board> boards = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            boards.add(random.board(en));
        }
        return boards;
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2})
    void twice_the_speed_gives_four_times_the_pressure(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            String item = anyItem(random, en);
            String terrain = random.terrain(en);
            // Above 45 m/s no least pressure of the code governs a case A or B.
            double speed = random.between(45, 60);
            Loads once = loads(job(en, speed, terrain, "", item));
            Loads twice = loads(job(en, 2 * speed, terrain, "", item));
            for (int c = 0; c < once.cases().size(); c++) {
                CaseAction a = once.cases().get(c);
                if (en || !governedByLeast(a)) {
                    near(twice.cases().get(c).force(), 4 * a.force(), a.name() + " of " + item);
                    near(twice.cases().get(c).baseMoment(), 4 * a.baseMoment(), a.name() + " of " + item);
                }
            }
        }
    }

    /** Whether the code's least of 16 psf holds the force of a case up: then it does not follow the speed. */
    private static boolean governedByLeast(CaseAction c) {
        double least = 16 * 47.88025898;
        double sum = c.zones().stream().flatMap(p -> p.zones().stream()).mapToDouble(z -> z.pressure() * z.width()).sum();
        double width = c.zones().stream().flatMap(p -> p.zones().stream()).mapToDouble(ZonePressure::width).sum();
        return c.zones().stream().flatMap(p -> p.zones().stream()).anyMatch(z -> z.pressure() <= least * (1 + 1e-9)) || sum <= least * width * (1 + 1e-9);
    }

    @ParameterizedTest
    @ValueSource(longs = {3, 4})
    void a_mirror_image_turns_the_torsion_round_and_nothing_else(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            String terrain = random.terrain(en);
            List<Board> boards = boards(random, en, 1 + random.upTo(2));
            List<Board> mirrored = boards.stream().map(b -> new Board(b.width(), b.height(), b.clearance(), -b.offset(), b.depth(), b.solidity())).toList();
            int posts = 1 + random.upTo(2);
            Loads one = loads(job(en, 30, terrain, "", sign(boards, posts, 2)));
            Loads other = loads(job(en, 30, terrain, "", sign(mirrored, posts, 2)));
            for (int c = 0; c < one.cases().size(); c++) {
                near(other.cases().get(c).force(), one.cases().get(c).force(), "force");
                near(other.cases().get(c).baseMoment(), one.cases().get(c).baseMoment(), "moment");
                if (boards.stream().anyMatch(b -> Math.abs(b.offset()) > 0.01)) {
                    near(other.cases().get(c).torsion(), -one.cases().get(c).torsion(), "torsion of " + one.cases().get(c).name());
                }
            }
            for (int p = 0; p < posts; p++) {
                near(other.posts().get(posts - 1 - p).moment(), one.posts().get(p).moment(), "post " + p);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {5, 6})
    void a_hoarding_seen_from_behind_is_the_same_hoarding(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            Wall w = random.wall(en);
            double bays = Math.max(1, Math.round(w.length() / w.spacing()));
            double spacing = w.length() / bays;
            String terrain = random.terrain(en);
            Loads one = loads(job(en, 30, terrain, "", hoarding(new Wall(w.length(), w.height(), w.clearance(), w.solidity(), w.left(), w.right(), spacing))));
            Loads other = loads(job(en, 30, terrain, "", hoarding(new Wall(w.length(), w.height(), w.clearance(), w.solidity(), w.right(), w.left(), spacing))));
            for (int c = 0; c < one.cases().size(); c++) {
                near(other.cases().get(c).force(), one.cases().get(c).force(), one.cases().get(c).name() + " of " + w);
            }
            int n = one.posts().size();
            assertThat(other.posts()).hasSize(n);
            for (int p = 0; p < n; p++) {
                assertThat(other.posts().get(n - 1 - p).moment()).as("post " + p + " of " + w).isCloseTo(one.posts().get(p).moment(),
                    within(1e-6 * one.posts().get(p).moment()));
            }
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {7, 8})
    void reactions_balance_loads(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            String text = job(en, random.between(20, 60), random.terrain(en), "", anyItem(random, en));
            Loads loads = loads(text);
            assertThat(loads.balance()).isNotEmpty();
            for (Loads.Balance balance : loads.balance()) {
                near(balance.reactions(), balance.loads(), balance.what() + " of " + text);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {9, 10})
    void more_speed_or_more_board_never_gives_less_force(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            Board b = random.board(en);
            // The same shape, larger, with the same gap in proportion; the case is the one that stands square on.
            double k = 1 + random.between(0, 1);
            Board larger = new Board(b.width() * k, b.height() * k, b.clearance() * k, b.offset(), b.depth(), b.solidity());
            String terrain = random.terrain(en);
            double speed = random.between(20, 60);
            double force = loads(job(en, speed, terrain, "", sign(List.of(b), 1, 1))).cases().get(0).force();
            assertThat(loads(job(en, speed + random.between(0, 20), terrain, "", sign(List.of(b), 1, 1))).cases().get(0).force())
                .isGreaterThanOrEqualTo(force);
            assertThat(loads(job(en, speed, terrain, "", sign(List.of(larger), 1, 1))).cases().get(0).force()).isGreaterThanOrEqualTo(force * (1 - EXACT));
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12})
    void the_order_of_boards_does_not_matter(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            List<Board> boards = boards(random, en, 3);
            List<Board> shuffled = new ArrayList<>(boards);
            Collections.shuffle(shuffled, new Random(i));
            String terrain = random.terrain(en);
            Loads one = loads(job(en, 35, terrain, "", sign(boards, 2, 2)));
            Loads other = loads(job(en, 35, terrain, "", sign(shuffled, 2, 2)));
            near(other.governs("base-moment").baseMoment(), one.governs("base-moment").baseMoment(), "moment");
            near(Math.abs(other.governs("torsion").torsion()), Math.abs(one.governs("torsion").torsion()), "torsion");
            near(worst(other), worst(one), "worst post");
        }
    }

    private static double worst(Loads loads) {
        return loads.posts().stream().mapToDouble(PostAction::moment).max().orElseThrow();
    }

    @ParameterizedTest
    @ValueSource(longs = {13})
    void feet_and_metres_give_the_same_sheet(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            int inches = 24 + random.upTo(200);
            int high = 12 + random.upTo(90);
            int gap = random.upTo(120);
            int mph = 60 + random.upTo(90);
            String terrain = random.terrain(en);
            String feet = board(inches / 12 + " ft " + inches % 12 + " in", high / 12 + "' " + high % 12 + "\\\"", gap + " in");
            String metres = board(inches * 25.4 + " mm", high * 2.54 + " cm", gap * 0.0254 + " m");
            ItemResult us = RandomJobs.loadsOnly(job(en, 1, terrain, "", feet).replace("\"1.0 m/s\"", "\"" + mph + " mph\""));
            ItemResult si = RandomJobs.loadsOnly(job(en, mph * 0.44704, terrain, "", metres));
            for (int s = 0; s < us.sheet().steps().size(); s++) {
                near(us.sheet().steps().get(s).value(), si.sheet().steps().get(s).value(), us.sheet().steps().get(s).name());
            }
        }
    }

    private static String board(String width, String height, String clearance) {
        return "{\"mark\":\"X\",\"kind\":\"post-sign\",\"boards\":[{\"width\":\"" + width + "\",\"height\":\"" + height + "\",\"clearance\":\"" + clearance
            + "\"}],\"posts\":{\"count\":1}}";
    }

    @ParameterizedTest
    @ValueSource(longs = {14})
    void rougher_terrain_or_a_lower_authority_minimum_never_gives_more(long seed) {
        RandomJobs random = new RandomJobs(seed);
        List<List<String>> rougher = List.of(List.of("0", "I", "II", "III", "IV"), List.of("D", "C", "B"));
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            String item = anyItem(random, en);
            double before = Double.POSITIVE_INFINITY;
            for (String terrain : rougher.get(en ? 0 : 1)) {
                double force = loads(job(en, 30, terrain, "", item)).governs("base-shear").force();
                assertThat(force).as(terrain + " " + item).isLessThanOrEqualTo(before * (1 + EXACT));
                before = force;
            }
            double least = random.between(0, 3);
            String terrain = random.terrain(en);
            double low = loads(job(en, 30, terrain, ",\"authority-minimum-pressure\":\"" + least + " kPa\"", item)).governs("base-shear").force();
            double high = loads(job(en, 30, terrain, ",\"authority-minimum-pressure\":\"" + (least + 0.5) + " kPa\"", item)).governs("base-shear").force();
            assertThat(high).isGreaterThanOrEqualTo(low * (1 - EXACT));
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {15})
    void the_governing_case_is_not_less_than_any_other(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            Loads loads = loads(job(en, 30, random.terrain(en), "", anyItem(random, en)));
            for (CaseAction c : loads.cases()) {
                assertThat(c.baseMoment()).isLessThanOrEqualTo(loads.governs("base-moment").baseMoment() * (1 + EXACT));
                assertThat(c.baseShear()).isLessThanOrEqualTo(loads.governs("base-shear").baseShear() * (1 + EXACT));
                assertThat(Math.abs(c.torsion())).isLessThanOrEqualTo(Math.abs(loads.governs("torsion").torsion()) * (1 + EXACT) + 1e-9);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {16})
    void more_holes_never_give_more_force(long seed) {
        RandomJobs random = new RandomJobs(seed);
        for (int i = 0; i < TRIES; i++) {
            boolean en = i % 2 == 0;
            Wall w = random.wall(en);
            double less = random.between(en ? 0.8 : 0.701, 1);
            double more = random.between(less, 1);
            String terrain = random.terrain(en);
            double open = loads(job(en, 40, terrain, "", hoarding(with(w, less)))).cases().get(0).force();
            double closed = loads(job(en, 40, terrain, "", hoarding(with(w, more)))).cases().get(0).force();
            assertThat(open).as(w.toString()).isLessThanOrEqualTo(closed * (1 + EXACT));
        }
    }

    private static Wall with(Wall w, double solidity) {
        return new Wall(w.length(), w.height(), w.clearance(), solidity, w.left(), w.right(), w.spacing());
    }
}
