package broadside.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.action.Foot;
import broadside.assess.Assessor;
import broadside.assess.ItemResult;
import broadside.assess.Loads;
import broadside.codes.Level;
import broadside.codes.LoadCase.Windward;
import broadside.codes.ZonePressure;
import broadside.job.JobReader;
import broadside.panel.FacadePanel;
import broadside.panel.Item;
import broadside.quantity.Units;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Circle;
import broadside.sheet.Drawing.Line;
import broadside.sheet.Drawing.Outline;
import broadside.sheet.Drawing.Shape;
import broadside.sheet.Drawing.Text;
import broadside.site.SpeedConversion;
import broadside.table.TableLibrary;
import broadside.trace.Status;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class DrawingTest {

    private static final TableLibrary TABLES = TableLibrary.shipped();
    private static final Assessor ASSESSOR = new Assessor(TABLES);
    private static final JobReader READER = new JobReader(ASSESSOR.codes(), new SpeedConversion(TABLES.edition("gust-factors/1").orElseThrow().curve("durst")));

    private static final String EN = "\"basis\":{\"code\":\"en-1991-1-4\",\"edition\":\"2005\"},\"site\":{\"basic-speed\":\"26 m/s\",\"averaging\":\"10 min mean\",\"terrain\":\"II\"}";
    private static final String US = "\"units\":\"us\",\"basis\":{\"code\":\"asce-7\",\"edition\":\"16\"},\"site\":{\"basic-speed\":\"115 mph\",\"averaging\":\"3 s gust\",\"terrain\":\"C\"}";

    private static final String FENCE = "'kind':'banner-fence','panel-length':'3.45 m','panel-height':'2 m','panels':40";
    private static final String CARRIED = ",'panel-mass':'18 kg','foot-mass':'25 kg','foot-length':'0.7 m','blocks':[{'mass':'25 kg','lever':'0.6 m'}],"
        + "'brace':{'lever':'1.2 m','mass':'80 kg'},'ground':'grass','stakes':'none'";
    private static final String BUILDING = "'building':{'width':'20 m','depth':'12 m','height':'8 m'}";
    private static final String FACADE = "'kind':'facade-panel','backing':'wall','width':'4 m','height':'2 m','bottom':'4 m','distance-from-corner':'1.5 m'," + BUILDING;
    private static final String BLADE = "'kind':'projecting-sign','projection':'0.9 m','height':'2.4 m','bottom':'3 m','gap':'0.1 m','brackets':{'count':2,'spacing':'1.8 m'}";
    private static final String BANNER = "'kind':'spanned-banner','width':'10 m','height':'1.2 m','bottom':'5.5 m','sag':'0.5 m'";

    private static final String BOARD = "{'width':'3 m','height':'2 m','clearance':'2.5 m'}";
    private static final String SIGN = "'kind':'post-sign','boards':[" + BOARD + "],'posts':{'count':2,'spacing':'1.6 m'}";
    private static final String STACK = SIGN.replace(BOARD, "{'mark':'a','width':'3 m','height':'0.6 m','clearance':'3.2 m'},"
        + "{'mark':'b','width':'2 m','height':'0.6 m','clearance':'2.5 m'},{'mark':'c','width':'1.2 m','height':'0.4 m','clearance':'2 m','offset':'0.3 m'}");
    private static final String US_STACK = STACK.replace("'3 m'", "'9 ft 11 1/4 in'").replace("'3.2 m'", "'10 ft 11 1/4 in'").replace("'0.6 m'", "'1 ft 11 1/2 in'")
        .replace("'2.5 m'", "'8 ft 2 1/2 in'").replace("'2 m'", "'6 ft 6 1/2 in'").replace("'0.3 m'", "'-1 ft 1 1/4 in'");

    /** Sizes that are usual, and sizes at which something could leave the paper. */
    static List<String> items() {
        return List.of(SIGN, SIGN.replace("'3 m'", "'23 ft 11 1/4 in'").replace("'2 m'", "'6 ft 11 1/4 in'").replace("'2.5 m'", "'8 ft 2 1/2 in'"), STACK, US_STACK,
            FENCE, FENCE + CARRIED, FENCE.replace(":40", ":1") + CARRIED, FENCE.replace(":40", ":5"), FENCE.replace(":40", ":1000").replace("3.45 m", "0.5 m"),
            FENCE.replace("3.45 m", "11 ft 4 in").replace("'2 m'", "'6 ft 6 in'") + CARRIED.replace("1.2 m", "3 ft 11 1/4 in"),
            FENCE + CARRIED.replace("1.2 m", "15 m"), FENCE.replace("'2 m'", "'0.4 m'"),
            FACADE, FACADE.replace("4 m", "0.3 m").replace("2 m", "0.3 m").replace("1.5 m", "41 m").replace("20 m", "60 m"),
            FACADE.replace("'4 m','height':'2 m','bottom':'4 m','distance-from-corner':'1.5 m'", "'12 m','height':'0.6 m','bottom':'180 m','distance-from-corner':'0 m'")
                .replace("'8 m'", "'200 m'"),
            FACADE.replace("'4 m','height':'2 m','bottom':'4 m'", "'3 ft','height':'23 ft 4 1/2 in','bottom':'1 ft'").replace("1.5 m", "61 ft 3 in").replace("12 m", "130 ft"),
            BLADE, BLADE.replace("0.9 m", "3 m").replace("2.4 m", "0.5 m").replace("'3 m','gap':'0.1 m'", "'22 m','gap':'0 m'").replace("{'count':2,'spacing':'1.8 m'}", "{'count':1}"),
            BLADE.replace("0.9 m", "0.4 m").replace("2.4 m", "6 m").replace("'3 m'", "'0.2 m'").replace("'count':2,'spacing':'1.8 m'", "'count':5,'spacing':'1.4 m'"),
            BLADE.replace("2.4 m", "8 ft 2 1/2 in").replace("0.9 m", "2 ft 11 1/2 in").replace("1.8 m", "5 ft 11 1/2 in"),
            BANNER, BANNER.replace("10 m", "20 m").replace("1.2 m", "0.5 m").replace("'0.5 m'}", "'20 mm'}"), BANNER.replace("10 m", "2 m").replace("1.2 m", "3 m").replace("0.5 m", "2 m"),
            BANNER.replace("10 m", "33 ft").replace("1.2 m", "3 ft 6 1/2 in").replace("5.5 m", "18 ft 11 1/2 in"));
    }

    private static ItemResult assessed(String item, String head) {
        String job = "{\"broadside\":1," + head + ",\"items\":[{\"mark\":\"X1\"," + item.replace('\'', '"') + "}]}";
        return ASSESSOR.assess(READER.read(job.getBytes(StandardCharsets.UTF_8))).items().get(0);
    }

    /** Loads of a panel in two zones, pulled off harder than it is pushed on. */
    private static Loads onWall(FacadePanel facade) {
        double width = facade.width().metres();
        double area = width * facade.height().metres();
        CaseAction pushed = onWall(facade, "pushed", "inward", 1000 * area, List.of(new ZonePressure("D", "p_D", 0, width, width, 1, 1000)));
        CaseAction pulled = onWall(facade, "pulled", "outward", 1400 * area, List.of(new ZonePressure("A", "p_A", 0, 0.3 * width, 0.3 * width, -1.4, -1400),
            new ZonePressure("B", "p_B", 0.3 * width, width, 0.7 * width, -0.8, -700)));
        return new Loads(new Loads.Velocity(8, 1000), List.of(pushed, pulled), Map.of("base-shear", pulled),
            new Loads.Supports(List.of(), Optional.empty(), List.of(), List.of(), Optional.empty()), Optional.empty(),
            new Level("characteristic", "factored", "factored", 1.5, "1.5", "clause", Status.DERIVED), 0, Foot.NONE);
    }

    private static CaseAction onWall(FacadePanel facade, String name, String direction, double force, List<ZonePressure> zones) {
        return new CaseAction("", name, name, direction, Windward.NONE, List.of(new PanelZones("", facade.fromCorner().metres(), zones, List.of())), force,
            facade.bottom().metres() + facade.height().metres() / 2, facade.fromCorner().metres() + facade.width().metres() / 2, force, 0, 0);
    }

    @ParameterizedTest
    @MethodSource("items")
    void everything_stands_on_the_paper_with_loads_and_without(String item) {
        List<String> heads = new ArrayList<>(List.of(US));
        ASSESSOR.codes().editions().forEach(key -> heads.add("\"basis\":{\"code\":\"" + key.replace("/", "\",\"edition\":\"") + "\"},\"site\":{\"basic-speed\":\"30 m/s\","
            + "\"averaging\":\"" + ASSESSOR.codes().code(key).orElseThrow().terms().averaging().words() + "\",\"terrain\":\"unknown\"}"));
        for (String head : heads) {
            ItemResult result = assessed(item, head);
            Units units = head.equals(US) ? Units.US : Units.METRIC;
            for (Optional<Loads> loads : List.of(result.loads(), zoned(result), Optional.<Loads>empty())) {
                Drawing drawing = ItemDrawing.of(result.item(), loads, units);
                assertThat(drawing.width()).isEqualTo(480);
                assertThat(drawing.height()).isBetween(120.0, 420.0);
                drawing.shapes().forEach(shape -> onPaper(drawing, shape));
                assertThat(touching(drawing)).as(head).isEmpty();
            }
        }
    }

    private static Optional<Loads> zoned(ItemResult result) {
        return result.item() instanceof FacadePanel facade ? Optional.of(onWall(facade)) : Optional.empty();
    }

    private static void onPaper(Drawing drawing, Shape shape) {
        List<Double> points = new ArrayList<>();
        if (shape instanceof Line line) {
            points.addAll(List.of(line.x1(), line.y1(), line.x2(), line.y2()));
        } else if (shape instanceof Outline outline) {
            points.addAll(outline.points());
        } else if (shape instanceof Circle circle) {
            points.addAll(List.of(circle.x(), circle.y()));
        } else if (shape instanceof Text text) {
            double[] box = box(text);
            points.addAll(List.of(box[0], box[1], box[2], box[3]));
        }
        for (int i = 0; i + 1 < points.size(); i += 2) {
            assertThat(points.get(i)).as(shape.toString()).isBetween(0.0, drawing.width());
            assertThat(points.get(i + 1)).as(shape.toString()).isBetween(0.0, drawing.height());
        }
    }

    /** About where a text stands: left, top, right, bottom. */
    private static double[] box(Text text) {
        double wide = text.text().length() * (text.bold() ? 5.2 : 4.8);
        double left = text.anchor() == Anchor.START ? text.x() : text.anchor() == Anchor.END ? text.x() - wide : text.x() - wide / 2;
        return text.turn() == 90 ? new double[] {text.x() - 6.5, text.y() - wide / 2, text.x() + 1, text.y() + wide / 2}
            : new double[] {left, text.y() - 6.5, left + wide, text.y() + 1};
    }

    private static List<String> touching(Drawing drawing) {
        List<Text> texts = drawing.shapes().stream().filter(Text.class::isInstance).map(Text.class::cast).toList();
        List<String> found = new ArrayList<>();
        for (int i = 0; i < texts.size(); i++) {
            for (int k = i + 1; k < texts.size(); k++) {
                double[] a = box(texts.get(i));
                double[] b = box(texts.get(k));
                if (a[0] < b[2] && b[0] < a[2] && a[1] < b[3] && b[1] < a[3]) {
                    found.add(texts.get(i).text() + " on " + texts.get(k).text());
                }
            }
        }
        return found;
    }

    private static List<String> texts(String item, String head) {
        ItemResult result = assessed(item, head);
        return ItemDrawing.of(result.item(), zoned(result).or(result::loads), Units.METRIC).shapes().stream().filter(Text.class::isInstance).map(s -> ((Text) s).text()).toList();
    }

    @Test
    void names_on_stacked_boards_stand_inside_them_and_the_force_above() {
        ItemResult result = assessed(STACK, US.replace("\"units\":\"us\",", ""));
        Drawing drawing = ItemDrawing.of(result.item(), result.loads(), Units.METRIC);
        List<double[]> boards = drawing.shapes().stream().filter(s -> s instanceof Outline o && o.weight() == 1.4).map(s -> ((Outline) s).points())
            .map(p -> new double[] {p.get(0), p.get(5), p.get(2), p.get(1)}).toList();
        List<Text> names = drawing.shapes().stream().filter(s -> s instanceof Text t && t.bold() && t.text().matches("(\\d?s-\\d+s|0-s)")).map(Text.class::cast).toList();
        assertThat(names).hasSizeGreaterThan(1).allSatisfy(name -> {
            double[] box = box(name);
            assertThat(boards).anyMatch(b -> b[0] <= box[0] && b[1] <= box[1] && box[2] <= b[2] && box[3] <= b[3]);
        });
        Text force = drawing.shapes().stream().filter(s -> s instanceof Text t && t.text().startsWith("F, case ")).map(Text.class::cast).findFirst().orElseThrow();
        assertThat(force.y()).isLessThan(boards.stream().mapToDouble(b -> b[1]).min().orElseThrow());
        assertThat(names).extracting(Text::text).contains("0-s");
        assertThat(texts(STACK, EN)).contains("F, case eccentric");
    }

    @Test
    void boards_that_count_as_one_are_hatched_as_such() {
        ItemResult result = assessed(STACK, EN);
        assertThat(result.loads().orElseThrow().governs("base-moment").state()).isEqualTo("envelope");
        Drawing drawing = ItemDrawing.of(result.item(), result.loads(), Units.METRIC);
        for (Outline board : drawing.shapes().stream().filter(s -> s instanceof Outline o && o.weight() == 1.4).map(Outline.class::cast).limit(3).toList()) {
            List<Double> p = board.points();
            assertThat(drawing.shapes()).as("strokes in " + p).anyMatch(s -> s instanceof Line l && l.weight() == 0.4 && l.x1() < l.x2() && l.y1() > l.y2() && l.x1() >= p.get(0) - 0.01
                && l.x2() <= p.get(2) + 0.01 && l.y1() <= p.get(1) + 0.01 && l.y2() >= p.get(5) - 0.01);
        }
    }

    @Test
    void a_force_of_another_case_than_the_zones_says_so() {
        List<String> texts = texts(STACK, US);
        assertThat(texts).contains("elevation, zones of case C").anyMatch(t -> t.matches("case [AB]"));
        assertThat(texts(SIGN, EN)).contains("elevation, seen from the front").noneMatch(t -> t.startsWith("case "));
    }

    @Test
    void a_line_with_ends_alike_is_met_from_the_left() {
        Loads loads = assessed(FENCE, EN).loads().orElseThrow();
        assertThat(ItemDrawing.shown(loads).windward()).isEqualTo(Windward.LEFT);
        List<ZonePressure> zones = ItemDrawing.shown(loads).zones().get(0).zones();
        assertThat(zones.get(0).zone()).isEqualTo("A");
        assertThat(zones.get(0).pressure()).isEqualTo(zones.stream().mapToDouble(ZonePressure::pressure).max().orElseThrow());
    }

    @Test
    void a_long_fence_leaves_its_middle_out_and_says_so() {
        assertThat(texts(FENCE + CARRIED, EN)).contains("40 panels of 3.45 m, 138 m in all", "32 panels left out", "2 m", "A", "B", "C", "D", "brace lever 1.2 m",
            "block 25 kg at 0.6 m", "1.2 m", "0.6 m");
        assertThat(texts(FENCE.replace(":40", ":5"), EN)).contains("5 panels of 3.45 m, 17.25 m in all").noneMatch(t -> t.contains("left out"));
    }

    @Test
    void a_panel_on_a_wall_shows_its_zones_and_both_forces() {
        assertThat(texts(FACADE, EN)).contains("1.5 m from the corner", "20 m", "8 m", "12 m", "4 m", "2 m", "A", "B", "pushed on: F 8.00 kN", "pulled off: F 11.2 kN",
            "wind onto the wall", "wind along");
        List<String> without = ItemDrawing.of(assessed(FACADE, EN).item(), Optional.empty(), Units.METRIC).shapes().stream().filter(Text.class::isInstance)
            .map(s -> ((Text) s).text()).toList();
        assertThat(without).contains("1.5 m from the corner").doesNotContain("A").noneMatch(t -> t.contains("F "));
    }

    @Test
    void the_force_on_a_blade_stands_at_its_distance_from_the_wall() {
        ItemResult result = assessed(BLADE, EN);
        CaseAction turning = result.loads().orElseThrow().governs("base-moment");
        Drawing drawing = ItemDrawing.of(result.item(), result.loads(), Units.METRIC);
        Circle target = drawing.shapes().stream().filter(Circle.class::isInstance).map(Circle.class::cast).findFirst().orElseThrow();
        Outline board = drawing.shapes().stream().filter(s -> s instanceof Outline o && o.weight() == 1.4).map(Outline.class::cast).findFirst().orElseThrow();
        double scale = (board.points().get(2) - board.points().get(0)) / 0.9;
        assertThat((target.x() - board.points().get(0)) / scale + 0.1).isCloseTo(turning.side(), org.assertj.core.api.Assertions.within(1e-6));
        assertThat(texts(BLADE, EN)).contains("gap 0.1 m", "2 brackets", "1.8 m", "0.9 m", "2.4 m", "3 m", "wind on edge");
    }

    @Test
    void a_banner_shows_its_sag_and_the_pull_at_both_ends() {
        List<String> texts = texts(BANNER, EN);
        Loads loads = assessed(BANNER, EN).loads().orElseThrow();
        double pull = loads.reactions().stream().filter(r -> r.step().startsWith("line-pull")).mapToDouble(r -> r.value()).max().orElseThrow();
        assertThat(texts).contains("sag 0.5 m", "10 m", "1.2 m", "5.5 m").filteredOn(t -> t.equals("pull " + new Format(Units.METRIC).force(pull))).hasSize(2);
    }

    @Test
    void each_drawing_has_its_words() {
        for (String item : items()) {
            ItemResult result = assessed(item, EN);
            Item of = result.item();
            assertThat(ItemDrawing.words(of, zoned(result).or(result::loads), Units.METRIC)).contains("The force of the governing case").doesNotContain("NaN");
            assertThat(ItemDrawing.words(of, Optional.empty(), Units.METRIC)).endsWith(".").contains(" high");
        }
    }
}
