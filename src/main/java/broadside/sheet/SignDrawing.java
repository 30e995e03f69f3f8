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

/** Elevation and side view of a sign on posts. */
final class SignDrawing {

    private static final double TALLEST = 122;
    private static final double ROOM = 220;

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
        double scale = Math.min(TALLEST / top, ROOM / (right - left));
        double tall = top * scale;
        double ground = 46 + tall;
        double margin = sign.boards().size() == 1 ? 78 : 110;
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
        front.text(front.x((left + right) / 2), 12, "elevation, seen from the front", Anchor.MIDDLE, Ink.BLACK);
        front.text(ItemDrawing.WIDTH - 78, 12, "side view", Anchor.MIDDLE, Ink.BLACK);
        return new Drawing(ItemDrawing.WIDTH, ground + 44, front.shapes());
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
        double most = governing.zones().stream().flatMap(p -> p.zones().stream()).mapToDouble(ZonePressure::pressure).max().orElseThrow();
        for (int i = 0; i < governing.zones().size(); i++) {
            PanelZones panel = governing.zones().get(i);
            Board board = sign.boards().get(i);
            for (ZonePressure zone : panel.zones()) {
                if (board.shape() == Board.Shape.RECTANGLE) {
                    front.hatch(panel.left() + zone.from(), board.clearance().metres(), zone.width(), board.height().metres(), 5 * most / zone.pressure());
                }
                if (panel.zones().size() > 1) {
                    front.line(front.x(panel.left() + zone.from()), front.y(board.clearance().metres()), front.x(panel.left() + zone.from()),
                        front.y(board.clearance().metres() + board.height().metres()), Canvas.THIN, Ink.BLACK, true);
                    String name = HoardingDrawing.shortName(zone.zone());
                    boolean narrow = zone.width() * front.scale() < 5.2 * name.length();
                    front.boldText(front.x(panel.left() + (zone.from() + zone.to()) / 2), front.y(board.clearance().metres()) + (narrow ? 11 : -4),
                        name, Anchor.MIDDLE, Ink.BLACK);
                }
            }
        }
        CaseAction turning = loads.get().governs("torsion");
        double beside = sign.boards().size() == 1 ? front.x(right) + 6 : front.x(turning.side()) + 8;
        front.target(turning.side(), turning.height(), beside, clear(front, front.y(turning.height()) - 5), "F of " + Format.caseName(turning.name()));
    }

    /** The height on paper nearest to the one wanted at which a label does not stand on the width of one of several boards. */
    private double clear(Canvas front, double wanted) {
        List<Double> taken = sign.boards().size() == 1 ? List.of()
            : sign.boards().stream().map(b -> front.y(b.clearance().metres() + b.height().metres() / 2) + 3).toList();
        for (int i = 0; i < 60; i++) {
            double y = wanted + (i % 2 == 0 ? -i : i) / 2.0;
            if (taken.stream().allMatch(t -> Math.abs(t - y) >= 10)) {
                return y;
            }
        }
        return wanted;
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
            String aside = middle == 0 ? "" : middle > 0 ? ", " + board.offset().typed() + " to the right" : ", " + board.offset().typed().replace("-", "")
                + " to the left";
            if (boards.size() == 1) {
                front.across(middle - w / 2, middle + w / 2, at, board.width().typed() + aside);
            } else {
                front.text(front.x(middle + w / 2) + 5, front.y(y + h / 2) + 3, board.width().typed() + " wide" + aside, Anchor.START, Ink.BLACK);
            }
        }
        if (boards.size() > 1) {
            front.help(dim - 42, front.y(top), dim, front.y(top));
            front.upward(0, top, dim - 38, format.length(top));
        }
        List<Double> posts = sign.posts().positions();
        if (posts.size() > 1) {
            front.across(posts.get(0), posts.get(1), front.y(0) + 20, sign.posts().spacing().orElseThrow().typed());
        }
    }

    private void side(Canvas side) {
        double[][] panels = sign.boards().stream().map(b -> new double[] {b.clearance().metres(), b.height().metres(), b.depth().metres()})
            .toArray(double[][]::new);
        SideView view = new SideView(side, ItemDrawing.WIDTH - 150, ItemDrawing.WIDTH - 8, top, 0);
        view.draw(panels);
        loads.map(l -> l.governs("base-moment")).ifPresent(c -> view.force(panels[0][2], c.height(), "F " + format.force(c.force()),
            format.length(c.height())));
    }
}
