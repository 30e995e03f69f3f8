package broadside.quantity;

/** The two systems of units in which values are typed and shown. */
public enum Units {
    /** Metres, newtons, kilograms. */
    METRIC,
    /** Feet and inches, pounds-force, pounds. */
    US
}
