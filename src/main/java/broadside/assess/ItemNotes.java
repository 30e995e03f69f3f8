package broadside.assess;

import broadside.codes.WindCode;
import broadside.panel.BannerFence;
import broadside.panel.Board;
import broadside.panel.FacadePanel;
import broadside.panel.Hoarding;
import broadside.panel.Item;
import broadside.panel.PostSign;
import broadside.panel.ProjectingSign;
import broadside.panel.SpannedBanner;
import broadside.trace.Trace;
import java.util.ArrayList;
import java.util.List;

/** What is assumed, to be minded and not checked for one kind of item. */
final class ItemNotes implements Item.Kinds<List<Note>> {

    private final Job job;
    private final WindCode code;
    private final Trace sheet;
    private final Loads loads;
    private final boolean carried;
    private final List<Note> notes = new ArrayList<>();

    ItemNotes(Job job, WindCode code, Trace sheet, Loads loads) {
        this.job = job;
        this.code = code;
        this.sheet = sheet;
        this.loads = loads;
        this.carried = loads.carried().isPresent();
    }

    private void add(Note.Kind kind, String text) {
        notes.add(new Note(kind, text));
    }

    @Override
    public List<Note> postSign(PostSign sign) {
        for (int i = 0; i < sign.boards().size(); i++) {
            Board board = sign.boards().get(i);
            if (board.shape() != Board.Shape.RECTANGLE) {
                add(Note.Kind.ASSUMPTION, "Board " + (board.mark().isEmpty() ? Integer.toString(i + 1) : board.mark()) + " is a "
                    + board.shape().word() + ": the code has no rule for it, and the rectangle around it is used, which is safe.");
            }
        }
        sizes(sign);
        if (sign.boards().size() > 1) {
            add(Note.Kind.ASSUMPTION, "Each board is assessed by itself and the forces are added; the wind between boards close to each other is not in any code. "
                + (sheet.find("stack-gap").isPresent() ? "Boards that hang close to each other are also taken as one closed board around them, and the worse counts."
                    : "No two boards hang so close that they would count as one."));
        }
        if (sign.boards().stream().anyMatch(b -> b.depth().metres() == 0)) {
            add(Note.Kind.ASSUMPTION, "The thickness of a board was not given: wind along the face counts friction on its faces only.");
        }
        if (sign.faces().opening() > 0) {
            add(Note.Kind.CAUTION, "The cases are those of one face alone. Two faces that open in a V take at most twice that: the upper bracket, which is no code result.");
        } else if (sign.faces().count() == 2) {
            add(Note.Kind.ASSUMPTION, "Two parallel faces back to back are taken as one board.");
        }
        if (sign.posts().count() > 1) {
            add(Note.Kind.ASSUMPTION, "The posts share force alike and take torsion as a couple: stiff board, equal posts.");
        }
        if (loads.supports().drag().isEmpty()) {
            add(carried ? Note.Kind.ASSUMPTION : Note.Kind.NOT_CHECKED, "The wind on the posts themselves is not in these loads, as their size was not given"
                + (carried ? "; the checks of post and footing count it." : "."));
        }
        if (sign.replaces().isPresent()) {
            add(Note.Kind.CAUTION, "The ratio of the new moment to the old one says nothing about what the old post, its welds and its footing can take.");
        }
        add(Note.Kind.NOT_CHECKED, "Torsion of the footing: the value is given, the check is the engineer's.");
        return notes;
    }

    /** Sizes that are possible but rarely meant: a slip of a digit or a unit. */
    private void sizes(PostSign sign) {
        double left = sign.boards().stream().mapToDouble(b -> b.offset().metres() - b.width().metres() / 2).min().orElseThrow();
        double right = sign.boards().stream().mapToDouble(b -> b.offset().metres() + b.width().metres() / 2).max().orElseThrow();
        double first = sign.posts().positions().get(0);
        double last = -first;
        if (last - first > 0 && (first < left - 0.1 || last > right + 0.1)) {
            add(Note.Kind.CAUTION, "A post stands outside the boards. Check the distance between the posts and its unit.");
        }
        if (left > last + 0.1 || right < first - 0.1) {
            add(Note.Kind.CAUTION, "All boards hang beside the posts. Check the offset and its unit.");
        }
        if (sign.boards().stream().anyMatch(b -> Math.max(b.width().metres(), b.height().metres()) > 15 || b.clearance().metres() > 20)) {
            add(Note.Kind.CAUTION, "A board is unusually large or high for a sign on posts. Check its sizes and their units.");
        }
        for (int i = 0; i < sign.boards().size(); i++) {
            for (int k = i + 1; k < sign.boards().size(); k++) {
                if (overlap(sign.boards().get(i), sign.boards().get(k))) {
                    add(Note.Kind.CAUTION, "Boards " + sign.part(i) + " and " + sign.part(k) + " overlap: the area they share is counted twice.");
                }
            }
        }
    }

    private static boolean overlap(Board a, Board b) {
        boolean across = Math.abs(a.offset().metres() - b.offset().metres()) < (a.width().metres() + b.width().metres()) / 2 - 0.001;
        double top = Math.min(a.clearance().metres() + a.height().metres(), b.clearance().metres() + b.height().metres());
        return across && top - Math.max(a.clearance().metres(), b.clearance().metres()) > 0.001;
    }

    @Override
    public List<Note> hoarding(Hoarding hoarding) {
        if (sheet.steps().stream().anyMatch(s -> s.name().startsWith("signboard-rule"))) {
            add(Note.Kind.CAUTION, "A hoarding with so large a gap below counts as a signboard: one coefficient over its whole length and no higher pressure at its ends. On the ground the first "
                + "bays would get more; so they do by other codes.");
        }
        if (hoarding.spacing().isEmpty()) {
            add(Note.Kind.ASSUMPTION, "The spacing of the posts was not given: there is no moment for each post.");
        }
        if (!hoarding.gates().isEmpty()) {
            add(Note.Kind.ASSUMPTION, "Both states of the gates count for the posts: open, where each gate makes two free ends, and shut, where the leaf hangs on the posts "
                + "beside it. The forces on the whole hoarding are given with the gates open.");
        }
        add(Note.Kind.ASSUMPTION, "The thickness of the hoarding is not known: wind along it counts friction on both faces only.");
        return notes;
    }

    @Override
    public List<Note> bannerFence(BannerFence fence) {
        add(Note.Kind.ASSUMPTION, "The cover counts with the solidity given for it; what the fence behind it adds is not counted. The line is closed from panel to panel and stands on the "
            + "ground.");
        if (!fence.fenceKnown()) {
            add(Note.Kind.ASSUMPTION, "The solidity of the bare fence was not given: " + fence.fenceSolidity() + " is taken.");
        }
        boolean bare = sheet.steps().stream().anyMatch(s -> s.name().startsWith("force/") && s.name().endsWith("/" + BannerFence.BARE));
        if (!bare) {
            add(Note.Kind.NOT_CHECKED, code.edition().property("title") + " has no rule for a fence as open as the bare one: its loads are not given.");
        }
        add(Note.Kind.CAUTION, "A cover turns a mesh fence into a sail. Cover, ties and fabric are not checked, nor their flutter.");
        if (!carried) {
            add(Note.Kind.NOT_CHECKED, "Tipping, sliding, ballast, braces and stakes.");
        }
        return notes;
    }

    @Override
    public List<Note> facadePanel(FacadePanel facade) {
        add(Note.Kind.ASSUMPTION, facade.backing() == FacadePanel.Backing.WALL
            ? "A solid wall stands behind the panel: external pressure only, and no relief from a gap behind it is counted."
            : "The panel is the skin of the building: external and internal pressure act together.");
        add(Note.Kind.ASSUMPTION, "Where the panel lies in two zones the worse pressure counts over all of it.");
        add(Note.Kind.NOT_CHECKED, (carried ? "Anchors and the wall." : "Fixings, anchors and the wall: loads only.") + " Pressure equalisation in a cavity, parapets, re-entrant corners and wraps around a corner are not covered.");
        return notes;
    }

    @Override
    public List<Note> projectingSign(ProjectingSign sign) {
        add(Note.Kind.CAUTION, "Indicative: no code has a rule for a sign that stands out from a wall. The rule for free-standing panels is used, as if the wall were not there.");
        add(Note.Kind.ASSUMPTION, "The wind may come from any direction: across the sign, and at right angles to the wall on its edge. The brackets share alike.");
        if (sign.depth().metres() == 0) {
            add(Note.Kind.ASSUMPTION, "The thickness was not given: wind on the edge counts friction on the faces only.");
        }
        add(Note.Kind.NOT_CHECKED, "Brackets, anchors and the wall; a pull-out test of the anchors is for a competent person.");
        return notes;
    }

    @Override
    public List<Note> spannedBanner(SpannedBanner banner) {
        add(Note.Kind.ASSUMPTION, "The banner is taut and bows out by the sag given; the load is even along the span. Both the parabola and the catenary are worked out, and the larger pull is "
            + "taken to the ends.");
        add(Note.Kind.CAUTION, "Less sag means more pull: half the sag doubles it. Slits in a banner are not counted.");
        add(Note.Kind.NOT_CHECKED, "Fabric, hems, eyelets, lines, and what the lines are fixed to: loads only. Flutter is not covered.");
        return notes;
    }
}
