package broadside.sheet;

import broadside.action.CaseAction.PanelZones;
import broadside.action.CaseAction;
import broadside.assess.Loads;
import broadside.codes.ZonePressure;
import broadside.panel.Board;
import broadside.panel.PostSign;
import broadside.sheet.Drawing.Anchor;
import broadside.sheet.Drawing.Fill;
import broadside.sheet.Drawing.Ink;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/** Elevation and side view of a sign on posts. */
final class SignDrawing {

    private static final double TALLEST = 122;
    /** Points from the lowest of the footing to the top. */
    private static final double DEEPEST = 250;
    private static final double ROOM = 220;
    /** Where the words of the side view begin. */
    private static final double BESIDE = 323;

    private final PostSign sign;
    private final Optional<Loads> loads;
    private final Format format;
    private final double left;
    private final double right;
    private final double top;

    SignDrawing(PostSign sign, Optional<Loads> loads, Format format) {
        this.sign = sign;
        this.loads = loads;
        this.format = format;
        List<Double> posts = sign.posts().positions();
        double half = 0.06;
        this.left = Math.min(posts.get(0) - half, sign.boards().stream().mapToDouble(b -> b.offset().metres() - b.width().metres() / 2).min().orElseThrow());
        this.right = Math.max(posts.get(posts.size() - 1) + half,
            sign.boards().stream().mapToDouble(b -> b.offset().metres() + b.width().metres() / 2).max().orElseThrow());
        this.top = sign.boards().stream().mapToDouble(b -> b.clearance().metres() + b.height().metres()).max().orElseThrow();
    }

    Drawing make() {
        double scale = scale();
        double tall = top * scale;
        double ground = 46 + tall;
        double margin = margin();
        Canvas front = new Canvas(margin - left * scale, ground, scale);
        front.ground(margin - 30, margin + (right - left) * scale + 30);
        posts(front);
        sign.boards().forEach(b -> board(front, b));
        zones(front);
        dimensions(front);
        Canvas side = front.view(ItemDrawing.WIDTH - 78, ground, scale);
        side(side);
        double bar = ItemDrawing.barLength(right - left, format.units());
        front.scaleBar(margin, ground + 34, bar, ItemDrawing.barText(bar, format));
        front.text(front.x((left + right) / 2), 12, ItemDrawing.elevation(loads), Anchor.MIDDLE, Ink.BLACK);
        front.text(ItemDrawing.WIDTH - 78, 12, "side view", Anchor.MIDDLE, Ink.BLACK);
        double below = FootingDrawing.of(loads).map(f -> f.room(scale, format)).orElse(0.0);
        return new Drawing(ItemDrawing.WIDTH, ground + Math.max(44, below), front.shapes());
    }

    /** Room on the left for the dimensions upward, points. */
    private double margin() {
        double widest = sign.boards().stream().flatMap(b -> Stream.of(b.height().typed(), b.clearance().typed())).mapToDouble(Canvas::width).max().orElseThrow();
        return sign.boards().size() == 1 ? Math.max(78, 26 + widest) : Math.max(98, 46 + widest);
    }

    /** Points for each metre: the boards leave room for the side view, and several boards for their widths beside them. */
    private double scale() {
        double scale = Math.min(TALLEST / top, DEEPEST / (top + FootingDrawing.of(loads).map(FootingDrawing::depth).orElse(0.0)));
        if (sign.boards().size() == 1) {
            return Math.min(scale, Math.min(ROOM, BESIDE - 25 - margin()) / (right - left));
        }
        for (Board board : sign.boards()) {
            scale = Math.min(scale, Math.max(40, BESIDE - 5 - margin() - Canvas.width(wide(board))) / (edge(board) - left));
        }
        return scale;
    }

    private void posts(Canvas front) {
        for (double x : sign.posts().positions()) {
            front.box(x - 0.05, 0, 0.1, top, Canvas.THIN, Fill.PAPER);
        }
    }

    private void board(Canvas front, Board board) {
        double w = board.width().metres();
        double h = board.height().metres();
        double x = board.offset().metres() - w / 2;
        double y = board.clearance().metres();
        switch (board.shape()) {
            case RECTANGLE -> front.box(x, y, w, h, Canvas.THICK, Fill.PAPER);
            case DISC -> front.circle(x + w / 2, y + h / 2, w / 2);
            case TRIANGLE -> front.outline(List.of(x, y, x + w, y, x + w / 2, y + h), Canvas.THICK, Fill.PAPER);
        }
    }

    /** Zones of the governing case: hatched the denser the higher the pressure, and named. */
    private void zones(Canvas front) {
        if (loads.isEmpty()) {
            return;
        }
        CaseAction governing = ItemDrawing.shown(loads.get());
        CaseAction turning = ItemDrawing.fromLeft(loads.get(), loads.get().governs("torsion"));
        double most = governing.zones().stream().flatMap(p -> p.zones().stream()).mapToDouble(ZonePressure::pressure).max().orElseThrow();
        for (int i = 0; i < sign.boards().size(); i++) {
            Board board = sign.boards().get(i);
            PanelZones panel = zones(governing, i);
            for (ZonePressure zone : panel.zones()) {
                if (board.shape() == Board.Shape.RECTANGLE) {
                    front.hatch(panel.left() + zone.from(), board.clearance().metres(), zone.width(), board.height().metres(), 5 * most / zone.pressure());
                }
                if (panel.zones().size() > 1) {
                    front.line(front.x(panel.left() + zone.from()), front.y(board.clearance().metres()), front.x(panel.left() + zone.from()),
                        front.y(board.clearance().metres() + board.height().metres()), Canvas.THIN, Ink.BLACK, true);
                }
            }
            if (panel.zones().size() > 1) {
                new ZoneNames(front, board, turning).write(panel);
            }
        }
        force(front, turning);
    }

    /** The zones of one board, from its left edge: its own, or what lies on it of the panel that it is part of where boards close together count as one. */
    private PanelZones zones(CaseAction action, int index) {
        Optional<PanelZones> own = action.zones().stream().filter(p -> p.part().equals(sign.part(index))).findFirst();
        Board board = sign.boards().get(index);
        double from = board.offset().metres() - board.width().metres() / 2;
        double to = from + board.width().metres();
        List<String> parts = IntStream.range(0, sign.boards().size()).mapToObj(sign::part).toList();
        return own.or(() -> action.zones().stream().filter(p -> !parts.contains(p.part()) && p.left() <= from + 1e-6
            && p.left() + p.zones().get(p.zones().size() - 1).to() >= to - 1e-6).findFirst().map(p -> onBoard(p, from, to)))
            .orElseGet(() -> new PanelZones(sign.part(index), from, List.of(), List.of()));
    }

    private static PanelZones onBoard(PanelZones panel, double from, double to) {
        List<ZonePressure> zones = new ArrayList<>();
        for (ZonePressure zone : panel.zones()) {
            double start = Math.max(from, panel.left() + zone.from());
            double end = Math.min(to, panel.left() + zone.to());
            if (end > start) {
                zones.add(new ZonePressure(zone.zone(), zone.symbol(), start - from, end - from, end - start, zone.coefficient(), zone.pressure()));
            }
        }
        return new PanelZones(panel.part(), from, zones, List.of());
    }

    /** The point at which the force acts; its label stands beside a single board where there is room, else above all boards and dimensions. */
    private void force(Canvas front, CaseAction turning) {
        String label = "F, " + Format.caseWords(turning.name());
        boolean single = sign.boards().size() == 1;
        if (single && front.x(right) + 6 + Canvas.width(label) < BESIDE) {
            front.target(turning.side(), turning.height(), front.x(right) + 6, front.y(turning.height()) - 5, label);
            return;
        }
        double above = front.y(top) - (single ? 22 : 11);
        double at = front.x(turning.side());
        front.line(at, front.y(turning.height()) - 6, at, above + 3, Canvas.THIN, Ink.ACCENT, false);
        front.target(turning.side(), turning.height(), Math.max(4, at - label.length() * 2.6), above, label);
    }

    private void dimensions(Canvas front) {
        double x0 = front.x(left);
        double dim = x0 - 18;
        List<Board> boards = new ArrayList<>(sign.boards());
        boards.sort(java.util.Comparator.comparing(Board::clearance));
        double below = 0;
        for (Board board : boards) {
            double y = board.clearance().metres();
            double h = board.height().metres();
            front.help(dim - 4, front.y(y), front.x(board.offset().metres() - board.width().metres() / 2), front.y(y));
            front.help(dim - 4, front.y(y + h), front.x(board.offset().metres() - board.width().metres() / 2), front.y(y + h));
            if (y - below > 12 / front.scale()) {
                front.upward(below, y, dim, below == 0 ? board.clearance().typed() : format.length(y - below));
            }
            if (y >= below - 1e-9) {
                front.upward(y, y + h, dim, board.height().typed());
                below = y + h;
            }
            double w = board.width().metres();
            double at = boards.size() == 1 ? front.y(y + h) - 8 : front.y(y + h) + 11;
            double middle = board.offset().metres();
            if (boards.size() == 1) {
                front.across(middle - w / 2, middle + w / 2, at, board.width().typed() + aside(board));
            } else {
                front.text(front.x(edge(board)) + 5, front.y(y + h / 2) + 3, wide(board), Anchor.START, Ink.BLACK);
            }
        }
        if (boards.size() > 1) {
            double whole = 24;
            front.help(whole - 4, front.y(top), dim, front.y(top));
            front.upwardPaper(front.y(0), front.y(top), whole);
            front.turnedText(whole - 5, front.y(top / 2), format.length(top));
        }
        List<Double> posts = sign.posts().positions();
        if (posts.size() > 1) {
            front.across(posts.get(0), posts.get(1), front.y(0) + 20, sign.posts().spacing().orElseThrow().typed());
        }
    }

    /** The right edge of a board, or of the last post where that stands out beside it, m. */
    private double edge(Board board) {
        List<Double> posts = sign.posts().positions();
        return Math.max(board.offset().metres() + board.width().metres() / 2, posts.get(posts.size() - 1) + 0.05);
    }

    private static String wide(Board board) {
        return board.width().typed() + " wide" + aside(board).replace(" to the ", " ");
    }

    private static String aside(Board board) {
        double middle = board.offset().metres();
        return middle == 0 ? "" : ", " + board.offset().typed().replace("-", "") + (middle > 0 ? " to the right" : " to the left");
    }

    private void side(Canvas side) {
        double[][] panels = sign.boards().stream().map(b -> new double[] {b.clearance().metres(), b.height().metres(), b.depth().metres()})
            .toArray(double[][]::new);
        SideView view = new SideView(side, ItemDrawing.WIDTH - 150, ItemDrawing.WIDTH - 8, top, 0);
        view.draw(panels);
        FootingDrawing.of(loads).ifPresent(f -> f.draw(side, format));
        loads.map(l -> l.governs("base-moment")).ifPresent(c -> view.force(panels[0][2], c.height(), "F " + format.force(c.force()),
            ItemDrawing.otherCase(loads.get()), format.length(c.height())));
    }
}
