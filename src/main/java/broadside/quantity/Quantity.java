package broadside.quantity;

/** A physical value in the unit of calculation, together with the text it came from. */
public sealed interface Quantity
        permits Length, Speed, Pressure, Force, Moment, Mass, Angle, Area, Density, MassPerArea, Period, Measure {

    /** The value in the unit of calculation ({@link Dimension#siUnit()}); always finite. */
    double si();

    /** The text as typed, or a plain rendering in the unit of calculation when made from a number. */
    String typed();

    /** The kind of quantity. */
    Dimension dimension();
}
