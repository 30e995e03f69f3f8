package broadside.support;

/**
 * How a rule writes the loads that it checks.
 *
 * @param moment      about the strong axis
 * @param shear       along the wind on the face
 * @param weakMoment  about the weak axis
 * @param weakShear   along the face
 */
public record LoadSymbols(String moment, String shear, String torsion, String weakMoment, String weakShear, String axial) {

    static final LoadSymbols EN = new LoadSymbols("M_Ed", "V_Ed", "T_Ed", "M_{z,Ed}", "V_{y,Ed}", "N_Ed");
    static final LoadSymbols US = new LoadSymbols("M_r", "V_r", "T_r", "M_{ry}", "V_{ry}", "P_r");
}
