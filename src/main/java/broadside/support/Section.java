package broadside.support;

import broadside.panel.PostSection;

/**
 * A section of a post with its properties, in metres and kilograms. The strong axis bends under wind on the face of the
 * board; {@code depth} stands along that wind.
 *
 * @param designation  as typed and as printed on the sheet, such as "CHS 114.3x5"
 * @param series       key of the series it belongs to, such as "chs-hot"
 * @param wall         wall by which it is checked (design wall); 0 for a solid section
 * @param nominalWall  wall as sold
 * @param properties   what follows from the sizes
 */
public record Section(String designation, String series, Form form, Material material, double depth, double width, double wall, double nominalWall,
                      Properties properties) {

    /** Outline of the section. */
    public enum Form { ROUND_TUBE, RECTANGULAR_TUBE, SOLID_RECTANGLE }

    /** What it is made of. */
    public enum Material { STEEL, ALUMINIUM, TIMBER }

    /**
     * Properties of the section, SI.
     *
     * @param area            m2
     * @param inertia         about the strong axis, m4
     * @param weakInertia     about the other, m4
     * @param elastic         section modulus about the strong axis, m3
     * @param plastic         plastic modulus about the strong axis, m3
     * @param torsionInertia  m4
     * @param torsionModulus  m3
     * @param mass            kg/m
     */
    public record Properties(double area, double inertia, double weakInertia, double elastic, double weakElastic, double plastic, double weakPlastic,
                             double torsionInertia, double torsionModulus, double mass) { }

    /** The outline that the wind meets. */
    public PostSection outline() {
        return new PostSection(form == Form.ROUND_TUBE ? PostSection.Shape.ROUND : PostSection.Shape.RECTANGULAR, width, depth);
    }

    public double mass() {
        return properties.mass();
    }
}
