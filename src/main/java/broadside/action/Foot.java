package broadside.action;

/** Where the loads of an item end: what its moment is taken about. */
public enum Foot {

    /** The ground line below the item; torsion about the vertical line in its middle. */
    GROUND("moment at the ground line"),
    /** The wall that brackets stand on; the moment is about the vertical line in the wall. */
    WALL("moment at the wall"),
    /** Fixings over the whole panel, or two ends: no moment at one place. */
    NONE("");

    private final String moment;

    Foot(String moment) {
        this.moment = moment;
    }

    /** What the moment is, in words; empty where there is none. */
    public String moment() {
        return moment;
    }
}
