package broadside.codes;

import broadside.codes.Asce7Velocity.Directionality;
import broadside.table.Edition;

/** ASCE/SEI 7-16: K_d stands in the velocity pressure. */
final class Asce716 extends Asce7 {

    Asce716(Edition edition) {
        super(edition, Directionality.IN_VELOCITY_PRESSURE);
    }
}
