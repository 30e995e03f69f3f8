package broadside.codes;

import broadside.codes.Asce7Velocity.Directionality;
import broadside.table.Edition;

/** ASCE/SEI 7-22: K_d stands in each load equation. */
final class Asce722 extends Asce7 {

    Asce722(Edition edition) {
        super(edition, Directionality.IN_LOAD_EQUATIONS);
    }
}
