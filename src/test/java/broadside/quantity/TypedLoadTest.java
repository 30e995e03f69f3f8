package broadside.quantity;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Speeds, pressures, forces and moments as people type them. Expected values were worked out with exact fractions from the factors of NIST SP 811 (recalled);
 * {@code ?} stands before the readings offered, {@code !} before words of the refusal.
 */
class TypedLoadTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            25 m/s | 25.0
            25m/s | 25.0
            25 M/S | 25.0
            25 m / s | 25.0
            25 m/sec | 25.0
            25 metres per second | 25.0
            90 km/h | 25.0
            90km/h | 25.0
            90 kph | 25.0
            90 kmh | 25.0
            90 KM/H | 25.0
            90 Km/h | 25.0
            54 km/h | 15.0
            100 km/h | 27.77777777777778
            56 mph | 25.03424
            56MPH | 25.03424
            56 miles per hour | 25.03424
            115 mph | 51.4096
            80 ft/s | 24.384
            80 fps | 24.384
            50 kn | 25.72222222222222
            50kn | 25.72222222222222
            50 KN | 25.72222222222222
            50 kN | 25.72222222222222
            50 kt | 25.72222222222222
            50 knots | 25.72222222222222
            1 knot | 0.5144444444444445
            50 Knots | 25.72222222222222
            22,5 m/s | 22.5
            1,500 m/s | 1.5
            −5 m/s | -5.0
            22 1/2 mph | 10.0584
            Bft 7 | ! range of speeds
            7 Bft | ! range of speeds
            BFT7 | ! range of speeds
            Beaufort 7 | ! range of speeds
            25 | ! no unit
            25 m | ! is a length
            25 s | ! no unit that is known
            20-25 m/s | ! more than one number
            8-6 | ! more than one number
            """)
    void speed(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.SPEED), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            800 Pa | 800.0
            0.8 kPa | 800.0
            0.8kPa | 800.0
            0.8 KPA | 800.0
            0,8 kPa | 800.0
            800 N/m2 | 800.0
            800 N/m² | 800.0
            800 N/m^2 | 800.0
            800 n/m2 | 800.0
            0.8 kN/m2 | 800.0
            0.8 kN/m² | 800.0
            0.8 KN/m2 | 800.0
            0.8 kN/m^2 | 800.0
            30 MPa | 30000000.0
            30 MPA | 30000000.0
            17 psf | 813.9644026657094
            17 PSF | 813.9644026657094
            17 lb/ft2 | 813.9644026657094
            17 lbf/ft2 | 813.9644026657094
            17 lb/ft² | 813.9644026657094
            17 lbf/ft^2 | 813.9644026657094
            17 lb/sq ft | 813.9644026657094
            17 lb / sq. ft. | 813.9644026657094
            50 kgf/m2 | 490.3325
            50 kgf/m² | 490.3325
            20 psi | 137895.14586336722
            355 N/mm2 | 355000000.0
            2 ksi | 13789514.586336722
            20 lbf/in2 | 137895.14586336722
            1,500 Pa | 1500.0
            1,500 kPa | ? 1500 kPa; 1.5 kPa
            1,500 psf | ? 1500 psf; 1.5 psf
            30 mPa | ! small m and capital M
            30 mpa | ! small m and capital M
            50 kg/m2 | ! is a mass per area
            800 | ! no unit: a pressure
            800 N | ! is a force
            8 bar | ! no unit that is known
            """)
    void pressure(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.PRESSURE), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            1200 N | 1200.0
            1.2 kN | 1200.0
            1.2kN | 1200.0
            1,2 kN | 1200.0
            1.2 KN | 1200.0
            1.2 kn | 1200.0
            1.2 kilonewtons | 1200.0
            12 newtons | 12.0
            300 lbf | 1334.46648457815
            300lbf | 1334.46648457815
            300 LBF | 1334.46648457815
            300 pounds force | 1334.46648457815
            300 pounds-force | 1334.46648457815
            2 kip | 8896.443230521
            2 kips | 8896.443230521
            2.5 KIPS | 11120.55403815125
            50 kgf | 490.3325
            1,500 N | 1500.0
            1,500 lbf | 6672.33242289075
            1,500 kN | ? 1500 kN; 1.5 kN
            1.500 kN | 1500.0
            300 lb | ! is a mass; a force is typed like 1.2 kN or 300 lbf
            300 lbs | ! is a mass
            12 kg | ! is a mass; a force is typed like 1.2 kN or 300 lbf
            2 t | ! is a mass
            300 pounds | ! is a mass
            1200 | ! no unit: a force is typed with its unit, like 1.2 kN or 300 lbf
            3 MN | ! no unit that is known
            3 kN m | ! is a moment
            """)
    void force(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.FORCE), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            3500 N m | 3500.0
            3500 Nm | 3500.0
            3500 N·m | 3500.0
            3500 N.m | 3500.0
            3500 N-m | 3500.0
            3500 N⋅m | 3500.0
            3.5 kN m | 3500.0
            3.5 kNm | 3500.0
            3.5 kN·m | 3500.0
            3.5 KNm | 3500.0
            3.5 kN-m | 3500.0
            2600 lbf ft | 3525.1266656616413
            2600 lb-ft | 3525.1266656616413
            2600 lbf-ft | 3525.1266656616413
            2600 ft-lb | 3525.1266656616413
            2600 ft-lbf | 3525.1266656616413
            2600 ft·lbf | 3525.1266656616413
            2600 lb ft | 3525.1266656616413
            2600 ft lbs | 3525.1266656616413
            2600 lbf·ft | 3525.1266656616413
            3 kip ft | 4067.453844994201
            3 kip-ft | 4067.453844994201
            3 kips-ft | 4067.453844994201
            3 ft-kip | 4067.453844994201
            3 k-ft | 4067.453844994201
            3 kN | ! is a force
            3500 | ! no unit: a moment
            30 kg m | ! no unit that is known
            """)
    void moment(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.MOMENT), expected);
    }
}
