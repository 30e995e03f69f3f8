package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.action.Foot;
import broadside.action.PostAction;
import broadside.action.Reaction;
import broadside.assess.Loads;
import broadside.codes.ZonePressure;
import broadside.panel.BannerFence;
import broadside.panel.FacadePanel;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.Panel;
import broadside.panel.PostSign;
import broadside.quantity.Dimension;
import broadside.quantity.Rounding;
import broadside.quantity.Show;
import broadside.quantity.Units;
import broadside.sheet.Block.Column;
import broadside.sheet.Block.Paragraph;
import broadside.sheet.Block.Row;
import broadside.sheet.Block.Table;
import broadside.sheet.Block.Tone;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The tables of an item: cases at both levels, pressures by zone, posts, wind along the face. */
final class CaseTables {

    /** More posts than this are shown by the worst of each zone only. */
    private static final int MOST_POSTS = 60;

    static List<Block> of(Item item, Loads loads, Format format) {
        List<Block> blocks = new ArrayList<>();
        boolean sign = item instanceof PostSign;
        blocks.add(cases(item, loads, format, loads.level().name()));
        blocks.add(cases(item, loads.companion(), format, loads.level().shown() + ", " + loads.level().rule()));
        blocks.add(new Paragraph(directions(item, loads) + " Loads are rounded up from unrounded values, at display only.", Tone.SMALL));
        blocks.add(zones(item, loads, format));
        if (!loads.posts().isEmpty()) {
            blocks.add(posts(item, loads, format));
        }
        if (loads.reactions().stream().anyMatch(r -> !r.unit().equals("1"))) {
            blocks.add(reactions(loads, format));
        }
        loads.reactions().stream().filter(r -> r.unit().equals("1")).forEach(r -> blocks.add(new Paragraph(r.label() + ": " + ratio(r) + ".", Tone.PLAIN)));
        loads.supports().drag().ifPresent(drag -> blocks.add(new Paragraph("Wind on the posts themselves, inside the base shear and base moment above: force "
            + format.both(drag.force(), Dimension.FORCE) + ", moment at the ground " + format.both(drag.moment(), Dimension.MOMENT) + ", "
            + loads.level().name() + ".", Tone.PLAIN)));
        loads.edgeOn().ifPresent(edge -> blocks.add(new Paragraph("Wind on the edge and along both faces (own rule, of no code): force "
            + format.both(edge.force(), Dimension.FORCE) + (loads.foot() == Foot.GROUND ? ", moment at the ground " + format.both(edge.moment(), Dimension.MOMENT) : "")
            + ", " + loads.level().name() + ".", Tone.PLAIN)));
        if (loads.selfWeight() > 0) {
            blocks.add(new Paragraph("Weight: " + format.both(loads.selfWeight(), Dimension.FORCE) + ", unfactored" + (sign ? ", without posts." : "."), Tone.PLAIN));
        }
        return blocks;
    }

    private static String directions(Item item, Loads loads) {
        boolean sign = item instanceof PostSign;
        if (loads.governs("base-shear").direction().endsWith("ward")) {
            return "Forces are magnitudes; pressures that pull the panel off the wall are negative.";
        }
        String both = "Forces are magnitudes. The wind was taken on the front and on the back and from both ends; where a case is not shown for an end, "
            + "the end shown is the worse.";
        return loads.foot() != Foot.GROUND || item instanceof BannerFence ? both : both + " Torsion is about the middle" + (sign ? " of the posts" : item instanceof Hoarding ? "; the posts are not worked out from it" : "")
            + "; it is positive when it turns the right side backwards, seen from the front.";
    }

    private static Table cases(Item item, Loads loads, Format format, String level) {
        boolean sign = item instanceof PostSign;
        boolean torsion = sign || item instanceof Hoarding;
        List<Row> rows = new ArrayList<>();
        for (CaseAction c : loads.cases()) {
            List<String> governs = new ArrayList<>();
            if (same(loads.governs("base-moment"), c)) {
                governs.add(loads.foot() == Foot.NONE ? "force" : "moment");
            }
            if (sign && same(loads.governs("torsion"), c) && c.torsion() != 0) {
                governs.add("torsion");
            }
            boolean marked = !governs.isEmpty();
            List<String> cells = new ArrayList<>(List.of(name(c), c.direction() + Format.end(c), format.force(c.force()), format.length(c.height())));
            if (loads.foot() != Foot.NONE) {
                cells.add(format.force(c.baseShear()));
                cells.add(format.moment(c.baseMoment()));
            }
            if (torsion) {
                cells.add(torsion(c, format));
            }
            cells.add(marked ? String.join(", ", governs) : "-");
            rows.add(new Row(cells, marked));
        }
        List<Column> columns = new ArrayList<>(List.of(new Column("Case", false, 4), new Column("Wind on", false, 4), new Column("Wind force", true, 3),
            new Column("Height of force", true, 3)));
        if (loads.foot() != Foot.NONE) {
            columns.add(new Column(loads.foot() == Foot.WALL ? "Shear" : "Base shear", true, 3));
            columns.add(new Column(loads.foot() == Foot.WALL ? "Moment at the wall" : "Base moment", true, 3));
        }
        if (torsion) {
            columns.add(new Column("Torsion", true, 3));
        }
        columns.add(new Column("Governs", false, 3));
        String what = loads.foot() == Foot.GROUND ? "Loads at the ground line, " : loads.foot() == Foot.WALL ? "Loads at the wall, " : "Loads, ";
        return new Table(what + level, columns, rows);
    }

    /** The case, and the arrangement of the item that it belongs to. */
    static String name(CaseAction c) {
        return Format.caseName(c.name()) + arrangement(c.state());
    }

    /** An arrangement of the item, behind a comma. */
    static String arrangement(String state) {
        return switch (state) {
            case PostSign.ENVELOPE -> ", as one board";
            case BannerFence.BARE -> ", bare fence";
            default -> "";
        };
    }

    private static Table reactions(Loads loads, Format format) {
        List<Row> rows = new ArrayList<>();
        List<Reaction> companion = loads.companion().reactions();
        for (int i = 0; i < loads.reactions().size(); i++) {
            Reaction r = loads.reactions().get(i);
            if (r.unit().equals("1")) {
                continue;
            }
            rows.add(new Row(List.of(r.label(), value(r, format), value(companion.get(i), format)), false));
        }
        return new Table("What its supports must take; weights are unfactored", List.of(new Column("What", false, 9),
            new Column(loads.level().name(), true, 3), new Column(loads.level().shown(), true, 3)), rows);
    }

    private static String value(Reaction r, Format format) {
        return r.unit().equals("N") ? format.force(r.value()) : format.moment(r.value());
    }

    /** A ratio in words. */
    static String ratio(Reaction r) {
        return Show.number(r.value(), 3, Rounding.UP) + " times";
    }

    private static boolean same(CaseAction a, CaseAction b) {
        return a.state().equals(b.state()) && a.name().equals(b.name()) && a.direction().equals(b.direction()) && a.windward() == b.windward();
    }

    private static String torsion(CaseAction c, Format format) {
        return c.torsion() < 0 ? "-" + format.moment(-c.torsion()) : format.moment(c.torsion());
    }

    private static Table zones(Item item, Loads loads, Format format) {
        boolean wall = item.panels().stream().anyMatch(p -> p.kind() == Panel.Kind.WALL);
        List<CaseAction> companions = loads.companion().cases();
        List<Row> rows = new ArrayList<>();
        for (int k = 0; k < loads.cases().size(); k++) {
            CaseAction c = loads.cases().get(k);
            for (int i = 0; i < c.zones().size() && !c.direction().equals("back"); i++) {
                rows.addAll(zoneRows(item, c, companions.get(k), i, format));
            }
        }
        List<Column> columns = new ArrayList<>(List.of(new Column("Case", false, 6), new Column("Zone", false, 4), new Column("From, to", false, 6),
            new Column("Coefficient", true, 3), new Column("Pressure, " + loads.level().name(), true, 3),
            new Column("Pressure, " + loads.level().shown(), true, 3)));
        if (wall) {
            columns.add(new Column("Moment per " + (format.units() == Units.US ? "foot" : "metre") + ", " + loads.level().name(), true, 4));
        }
        return new Table(item instanceof FacadePanel ? "Pressures by zone; places are measured from the nearer corner of the building"
            : "Net pressures by zone, both faces together; places are measured from the left end, seen from the front", columns, rows);
    }

    private static List<Row> zoneRows(Item item, CaseAction c, CaseAction companion, int index, Format format) {
        PanelZones panel = c.zones().get(index);
        boolean board = panel.perMetre().isEmpty();
        double start = item instanceof Hoarding hoarding ? panel.left() + hoarding.length().metres() / 2 : item instanceof FacadePanel ? panel.left() : 0;
        List<Row> rows = new ArrayList<>();
        for (int i = 0; i < panel.zones().size(); i++) {
            ZonePressure z = panel.zones().get(i);
            String zone = panel.zones().size() == 1 && board && c.direction().equals("front") ? "whole board" : HoardingDrawing.shortName(z.zone());
            List<String> cells = new ArrayList<>(List.of(name(c) + Format.end(c),
                (panel.part().isEmpty() ? "" : panel.part() + ", ") + zone, format.length(start + z.from()) + " to " + format.length(start + z.to()),
                format.plain(z.coefficient()), pressure(z.pressure(), format), pressure(companion.zones().get(index).zones().get(i).pressure(), format)));
            if (!board) {
                cells.add(format.momentPerLength(panel.perMetre().get(i)));
            }
            rows.add(new Row(cells, false));
        }
        return rows;
    }

    private static String pressure(double pascals, Format format) {
        return pascals < 0 ? "-" + format.pressure(-pascals) : format.pressure(pascals);
    }

    private static Table posts(Item item, Loads loads, Format format) {
        boolean sign = item instanceof PostSign;
        List<PostAction> shown = loads.posts().size() <= MOST_POSTS ? loads.posts() : worstOfEachZone(loads.posts());
        double most = loads.posts().stream().mapToDouble(PostAction::moment).max().orElse(0);
        List<Row> rows = new ArrayList<>();
        for (PostAction p : shown) {
            boolean worst = p.moment() >= most * (1 - 1e-9);
            String carries = p.share().map(s -> format.length(s) + (p.gate() > 0 ? " and " + format.length(p.gate()) + " of gate" : "")).orElse("by statics");
            rows.add(new Row(List.of(Integer.toString(p.post()), format.length(p.position()), p.zone().isEmpty() ? Format.caseName(p.named()) + arrangement(p.state())
                : HoardingDrawing.shortName(p.zone()), carries, format.force(p.shear())
                + (p.shearCase().equals(p.named()) ? "" : " (" + Format.caseName(p.shearCase()) + ")"), format.moment(p.moment()),
                format.moment(p.atLevel(loads.level().factor()).moment()), String.join(", ", remarks(p, worst))), worst));
        }
        String more = shown.size() < loads.posts().size() ? ", the worst of each zone of " + loads.posts().size() + " posts" : "";
        return new Table("What reaches the foot of each post, the worst of all cases" + more, List.of(new Column("Post", true, 2),
            new Column(sign ? "From the middle" : "From the left end", true, 3), new Column(sign ? "Case" : "Zone", false, 3), new Column("Carries", false, 5),
            new Column("Shear", true, 3), new Column("Moment, " + loads.level().name(), true, 4), new Column("Moment, " + loads.level().shown(), true, 4),
            new Column("Remark", false, 2)), rows);
    }

    private static List<String> remarks(PostAction post, boolean worst) {
        List<String> remarks = new ArrayList<>();
        if (worst) {
            remarks.add("worst");
        }
        if (post.gate() > 0) {
            remarks.add("gates shut");
        }
        return remarks.isEmpty() ? List.of("-") : remarks;
    }

    private static List<PostAction> worstOfEachZone(List<PostAction> posts) {
        Map<String, PostAction> worst = new LinkedHashMap<>();
        posts.forEach(p -> worst.merge(p.zone(), p, (a, b) -> b.moment() > a.moment() ? b : a));
        return List.copyOf(worst.values());
    }

    private CaseTables() { }
}
