package broadside.quantity;

/** How a number is rounded when it is shown; nothing is rounded before that. */
public enum Rounding {
    /** To the nearest figure, halves away from zero. */
    NEAREST,
    /** Away from zero, for loads. */
    UP,
    /** Toward zero, for limits. */
    DOWN
}
