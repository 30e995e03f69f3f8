package broadside.support;

/**
 * What reaches the foot of one post in one case. Wind parts are at the level of the code and unfactored; weights are
 * permanent and unfactored. Magnitudes, N and N m.
 *
 * @param named         the case
 * @param shear         along the wind on the face
 * @param moment        about the strong axis of the post
 * @param torsion       about the post itself
 * @param weakShear     wind along the face
 * @param weakMoment    about the weak axis, wind along the face
 * @param weight        of boards, and of the post itself where it is known
 * @param weightMoment  of boards that hang to one side, about the weak axis
 * @param bending       sum of wind force times the square of its height, N m2: for the deflection
 * @param cubes         sum of wind force times the cube of its height, N m3
 */
public record PostLoad(String named, double shear, double moment, double torsion, double weakShear, double weakMoment, double weight, double weightMoment,
                       double bending, double cubes) { }
