package broadside;

import static broadside.CarriedJobs.ASCE;
import static broadside.CarriedJobs.EN;
import static broadside.CarriedJobs.carried;
import static broadside.CarriedJobs.enSite;
import static broadside.CarriedJobs.job;
import static broadside.CarriedJobs.part;
import static broadside.CarriedJobs.result;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import broadside.action.CaseAction;
import broadside.assess.Carried;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.support.Check;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The same item asked for in another way has the same checks: chosen or typed, in metres or in feet, seen from the front or from behind. */
class CarriedAlikeTest {

    private static void alike(List<Check> a, List<Check> b, double share, String what) {
        assertThat(b).as(what).extracting(Check::name).isEqualTo(a.stream().map(Check::name).toList());
        for (int i = 0; i < a.size(); i++) {
            Check one = a.get(i);
            Check other = b.get(i);
            assertThat(other.demand()).as("demand of %s, %s", one.name(), what).isCloseTo(one.demand(), within(share * Math.abs(one.demand()) + 1e-12));
            assertThat(other.capacity()).as("capacity of %s, %s", one.name(), what).isCloseTo(one.capacity(), within(share * Math.abs(one.capacity()) + 1e-12));
            assertThat(other.utilisation()).as("share of %s, %s", one.name(), what).isCloseTo(one.utilisation(), within(share * one.utilisation() + 1e-12));
            assertThat(other.named()).as("case of %s, %s", one.name(), what).isEqualTo(one.named());
        }
    }

    private final Random random = new Random(11);

    private String any(String... of) {
        return of[random.nextInt(of.length)];
    }

    private String metres(double least, double most) {
        return Math.round((least + random.nextDouble() * (most - least)) * 100) / 100.0 + " m";
    }

    /** A random sign or hoarding in which %s stands for the post and %s for the sizes of the footing. */
    private String draw(boolean en, boolean wall) {
        String board = wall ? "'length': '30 m', 'height': '" + metres(1.5, 3) + "', 'posts': {'spacing': '2 m', %s}"
            : "'boards': [{'width': '" + metres(1, 4) + "', 'height': '" + metres(0.6, 2) + "', 'clearance': '" + metres(1, 3) + "', 'offset': '" + any("0 m", "0 m", "0.3 m")
            + "'" + any("", ", 'mass': '40 kg'") + "}], 'posts': {'count': " + (1 + random.nextInt(3)) + ", 'spacing': '" + metres(0.5, 1.5) + "', %s}";
        String ground = any("'ground': 'average'", "'ground': 'good'", "'cohesion': '40 kPa'", "'friction-angle': '32 deg'", "'ground': 'clay'");
        boolean pad = random.nextInt(3) == 0;
        String footing = ", 'footing': {'kind': '" + (pad ? "pad" : any("planted", "pier")) + "', " + (pad ? "'ground': 'sand'" : ground) + "%s}";
        return job(en ? EN : ASCE, en ? enSite(24) : "'basic-speed': '45 m/s', 'averaging': '3 s gust', 'terrain': 'C'", wall ? "hoarding" : "post-sign", board + footing);
    }

    private static String with(String draw, String post, String footing) {
        return draw.formatted(post.replace('\'', '"'), footing.replace('\'', '"'));
    }

    @Test
    void whatWasChosenTypedBackHasTheSameChecks() {
        int seen = 0;
        int typedFootings = 0;
        for (int i = 0; i < 250; i++) {
            boolean wall = i % 4 == 0;
            boolean en = random.nextInt(3) > 0;
            String draw = draw(en, wall);
            String series = any("chs-hot", "shs-hot", "rhs-cold", "us-pipe", "us-hss-square", en ? "timber-metric" : "timber-us", "alu-round", "alu-square");
            // The post of a hoarding is chosen where none is typed; "auto" of a sign counts in the loads, as a typed section does.
            String automatic = with(draw, (wall ? "" : "'section': 'auto', ") + "'series': '" + series + "'", "");
            if (!CarriedJobs.problems(automatic).isEmpty()) {
                continue;
            }
            Carried chosen = carried(automatic);
            if (chosen.part("posts").orElseThrow().refused().isPresent()) {
                continue;
            }
            String[] section = part(chosen, "posts", "section").text().split(", ");
            String typedPost = "'section': '" + section[0] + "', 'grade': '" + section[1] + "'";
            String typed = with(draw, typedPost, "");
            Carried checked = carried(typed);
            alike(chosen.checks(), checked.checks(), 0, automatic + " and " + typed);
            assertThat(chosen.part("posts").orElseThrow().choices()).filteredOn(Carried.Choice::chosen).singleElement()
                .satisfies(c -> assertThat(c.designation()).isEqualTo(section[0])).satisfies(c -> assertThat(c.passes()).isTrue());
            for (String key : List.of("depth", "width", "concrete")) {
                assertThat(part(checked, "footing", key).value()).as(key + " of " + typed).isEqualTo(part(chosen, "footing", key).value());
            }
            seen++;
            String sizes = ", 'depth': '" + part(chosen, "footing", "depth").value() + " m', 'width': '" + part(chosen, "footing", "width").value() + " m'";
            Carried footed = carried(with(draw, typedPost, sizes));
            List<Check> sized = chosen.part("footing").orElseThrow().checks();
            List<Check> held = footed.part("footing").orElseThrow().checks();
            for (int k = 0; k < sized.size(); k++) {
                assertThat(held.get(k).utilisation()).as(sized.get(k).name() + " of " + typed + sizes).isLessThanOrEqualTo(sized.get(k).utilisation() * (1 + 1e-9));
                typedFootings++;
            }
        }
        assertThat(seen).isGreaterThan(150);
        assertThat(typedFootings).isGreaterThan(150);
    }

    private static final String METRES = "'boards': [{'width': '2.4384 m', 'height': '1.2192 m', 'clearance': '2.1336 m', 'depth': '0.0762 m', 'offset': '0.3048 m', 'mass': '45.359237 kg'}], "
        + "'posts': {'count': %s, 'spacing': '1.524 m', %s}, 'footing': {'kind': %s}";
    private static final String FEET = "'boards': [{'width': '8 ft', 'height': '48 in', 'clearance': '7 ft', 'depth': '3 in', 'offset': '1 ft', 'mass': '100 lb'}], "
        + "'posts': {'count': %s, 'spacing': '5 ft', %s}, 'footing': {'kind': %s}";

    /** 1 ft = 0.3048 m, 1 lb = 0.45359237 kg, 1 mph = 0.44704 m/s; 1 psf = 4.4482216152605 N / 0.3048^2 m2 = 47.88025898 Pa. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "1 | 'section': 'CHS 168.3x6.3', 'grade': 'S275' | 'planted', 'width': '0.6096 m', 'depth': '1.2192 m', 'cohesion': '47.88025898 kPa' | 'planted', 'width': '24 in', 'depth': '4 ft', 'cohesion': '1000 psf'",
        "2 | 'section': 'PIPE 5 STD', 'grade': 'A53 B' | 'pier', 'width': '0.6096 m', 'depth': '2.4384 m', 'lateral-bearing': '23.5631195769 kPa/m' | 'pier', 'width': '2 ft', 'depth': '8 ft', 'lateral-bearing': '150 psf/ft'",
        "3 | 'section': 'RHS 120x80x5 cold' | 'planted', 'ground': 'poor', 'width': '0.4572 m', 'depth': '1.8288 m' | 'planted', 'ground': 'poor', 'width': '18 in', 'depth': '6 ft'",
        "1 | 'section': 'HSS 5x5x1/4' | 'pad', 'width': '2.1336 m', 'length': '1.8288 m', 'depth': '0.762 m', 'bearing': '71.82038847 kPa', 'friction': 0.4 "
            + "| 'pad', 'width': '7 ft', 'length': '6 ft', 'depth': '2 ft 6 in', 'bearing': '1500 psf', 'friction': 0.4"})
    void bothSystemsOfUnits(String posts, String section, String footing, String usFooting) {
        for (String[] code : new String[][] {{EN, "'averaging': '10 min mean', 'terrain': 'II'", "22.352 m/s", "50 mph"}, {ASCE, "'averaging': '3 s gust', 'terrain': 'C'", "44.704 m/s", "100 mph"}}) {
            String si = job(code[0], "'basic-speed': '" + code[2] + "', " + code[1], "post-sign", METRES.formatted(posts, section, footing));
            String us = job(code[0], "'basic-speed': '" + code[3] + "', " + code[1], "post-sign", FEET.formatted(posts, section, usFooting));
            alike(carried(si).checks(), carried(us).checks(), 1e-6, si);
            assertThat(part(carried(us), "footing", "depth").value()).isCloseTo(part(carried(si), "footing", "depth").value(), within(1e-9));
        }
    }

    @Test
    void bothSystemsOfUnitsForBallastAndFixings() {
        String[][] pairs = {
            {"hoarding", "'length': '24.384 m', 'height': '2.4384 m', 'posts': {'spacing': '2.4384 m'}, 'ballast': {'mass': '907.18474 kg', 'lever': '1.524 m', 'face-mass': '113.3980925 kg'}",
                "'length': '80 ft', 'height': '8 ft', 'posts': {'spacing': '8 ft'}, 'ballast': {'mass': '2000 lb', 'lever': '5 ft', 'face-mass': '250 lb'}"},
            {"banner-fence", "'panel-length': '3.048 m', 'panel-height': '1.8288 m', 'panels': 9, 'cover-solidity': 1.0, 'panel-mass': '22.6796185 kg', 'foot-length': '0.6096 m', "
                + "'blocks': [{'mass': '45.359237 kg', 'lever': '-0.1524 m'}], 'brace': {'lever': '1.2192 m', 'mass': '45.359237 kg'}",
                "'panel-length': '10 ft', 'panel-height': '6 ft', 'panels': 9, 'cover-solidity': 1.0, 'panel-mass': '50 lb', 'foot-length': '2 ft', "
                + "'blocks': [{'mass': '100 lb', 'lever': '-6 in'}], 'brace': {'lever': '4 ft', 'mass': '100 lb'}"},
            {"projecting-sign", "'projection': '0.9144 m', 'height': '1.8288 m', 'bottom': '3.048 m', 'gap': '0.1524 m', 'depth': '0.1524 m', 'mass': '45.359237 kg', "
                + "'brackets': {'count': 2, 'spacing': '1.2192 m'}, 'fixings': {'columns': 2, 'rows': 2, 'horizontal-pitch': '0.1524 m', 'vertical-pitch': '0.2032 m', "
                + "'allowable-tension': '4448.2216152605 N', 'allowable-shear': '2224.11080763025 N'}",
                "'projection': '3 ft', 'height': '6 ft', 'bottom': '10 ft', 'gap': '6 in', 'depth': '6 in', 'mass': '100 lb', 'brackets': {'count': 2, 'spacing': '4 ft'}, "
                + "'fixings': {'columns': 2, 'rows': 2, 'horizontal-pitch': '6 in', 'vertical-pitch': '8 in', 'allowable-tension': '1000 lbf', 'allowable-shear': '500 lbf'}"}};
        for (String[] pair : pairs) {
            String si = job(EN, enSite(22.352), pair[0], pair[1]);
            String us = job(EN, "'basic-speed': '50 mph', 'averaging': '10 min mean', 'terrain': 'II'", pair[0], pair[2]);
            alike(carried(si).checks(), carried(us).checks(), 1e-6, si);
        }
    }

    /** Wind on the back turns a sign the other way and asks the same of its posts; a mirror image of a sign is the sign seen from behind. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3})
    void frontAndBackAskTheSame(int posts) {
        for (String basis : List.of(EN, ASCE)) {
            String site = basis.equals(EN) ? enSite(25) : CarriedJobs.US_SITE;
            for (String offset : List.of("0", "0.4")) {
                String sign = "'boards': [{'width': '2.5 m', 'height': '1.4 m', 'clearance': '1.9 m', 'offset': '%s m', 'mass': '50 kg'}], 'posts': {'count': " + posts
                    + ", 'spacing': '0.9 m', 'section': 'CHS 168.3x6.3', 'grade': 'S275'}, 'footing': {'kind': 'planted', 'ground': 'average'}";
                String one = job(basis, site, "post-sign", sign.formatted(offset));
                String other = job(basis, site, "post-sign", sign.formatted("-" + offset));
                ItemResult item = result(one);
                alike(carried(item, one).checks(), carried(other).checks(), 1e-12, one);
                Loads loads = item.loads().orElseThrow();
                for (CaseAction front : loads.cases()) {
                    Optional<CaseAction> back = loads.cases().stream().filter(c -> c.name().equals(front.name()) && c.windward() == front.windward() && !c.direction().equals(front.direction()))
                        .findFirst();
                    assertThat(back).as(front.name()).isPresent();
                    assertThat(back.get().baseShear()).isEqualTo(front.baseShear());
                    assertThat(back.get().baseMoment()).isEqualTo(front.baseMoment());
                    assertThat(back.get().torsion()).isEqualTo(-front.torsion() + 0.0);
                }
                for (int i = 0; offset.equals("0") && i < posts; i++) {
                    assertThat(loads.posts().get(posts - 1 - i).moment()).isCloseTo(loads.posts().get(i).moment(), within(1e-9 * loads.posts().get(i).moment()));
                    assertThat(loads.posts().get(posts - 1 - i).shear()).isCloseTo(loads.posts().get(i).shear(), within(1e-9 * loads.posts().get(i).shear()));
                }
            }
        }
    }
}
