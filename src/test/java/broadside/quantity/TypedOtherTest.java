package broadside.quantity;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Masses, angles, areas, densities and periods as people type them, and fields that show a unit. Expected values were worked out with exact fractions from the factors of NIST SP 811 (recalled);
 * {@code ?} stands before the readings offered, {@code !} before words of the refusal.
 */
class TypedOtherTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            120 kg | 120.0
            120kg | 120.0
            120 KG | 120.0
            120 kilograms | 120.0
            1.2 t | 1200.0
            1,2 t | 1200.0
            1.2 tonnes | 1200.0
            500 g | 0.5
            260 lb | 117.9340162
            260 lbs | 117.9340162
            260 pounds | 117.9340162
            260 LB | 117.9340162
            260 lbm | 117.9340162
            1,500 kg | ? 1500 kg; 1.5 kg
            1 500 kg | 1500.0
            1'500 kg | 1500.0
            1’500 kg | 1500.0
            12,345.6 kg | 12345.6
            12 N | ! is a force; a mass is typed like 120 kg or 260 lb
            1.2 kN | ! is a force
            300 lbf | ! is a force
            2 kips | ! is a force
            2 ton | ! which ton
            2 tons | ! which ton
            120 | ! no unit: a mass
            -5 kg | -5.0
            """)
    void mass(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.MASS), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            15 deg | 0.26179938779914946
            15° | 0.26179938779914946
            15 ° | 0.26179938779914946
            15º | 0.26179938779914946
            15 degrees | 0.26179938779914946
            1 degree | 0.017453292519943295
            22.5 DEG | 0.39269908169872414
            22½° | 0.39269908169872414
            0.5 rad | 0.5
            0.5 radians | 0.5
            -15° | -0.26179938779914946
            15 | ! no unit: an angle is typed with its unit, like 15 deg
            15 m | ! is a length; an angle is typed like 15 deg
            """)
    void angle(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.ANGLE), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            2.9 m2 | 2.9
            2.9 m² | 2.9
            2.9 m^2 | 2.9
            2.9m2 | 2.9
            2.9 sq m | 2.9
            29000 cm2 | 2.9
            2900000 mm2 | 2.9
            31 ft2 | 2.87999424
            31 ft² | 2.87999424
            31 sq ft | 2.87999424
            31 sq. ft. | 2.87999424
            31 SQ FT | 2.87999424
            31 sqft | 2.87999424
            31 square feet | 2.87999424
            100 in2 | 0.064516
            100 in² | 0.064516
            3 m | ! is a length; an area
            3 m3 | ! is a volume; an area
            3 m4 | ! an area
            3 | ! no unit: an area
            """)
    void area(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.AREA), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            2400 kg/m3 | 2400.0
            2400 kg/m³ | 2400.0
            2400 kg/m^3 | 2400.0
            1.225 kg/m3 | 1.225
            1,225 kg/m3 | ? 1225 kg/m3; 1.225 kg/m3
            150 lb/ft3 | 2402.769506094021
            150 lb/ft³ | 2402.769506094021
            150 pcf | 2402.769506094021
            150 PCF | 2402.769506094021
            25 kN/m3 | ! is a pressure per depth; a density
            2400 | ! no unit: a density
            """)
    void density(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.DENSITY), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            50 years | 50.0
            50 year | 50.0
            50 yr | 50.0
            50 yrs | 50.0
            50y | 50.0
            50 Years | 50.0
            1/2 year | 0.5
            6 months | 0.5
            1 month | 0.08333333333333333
            18 months | 1.5
            18 MONTHS | 1.5
            1,000 years | ? 1000 years; 1 years
            1 000 years | 1000.0
            50 | ! no unit: a period
            73.0485 days | 0.2
            52.1775 weeks | 1.0
            50 hours | ! no unit that is known
            """)
    void period(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.PERIOD), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            2400 | LENGTH | mm | 2.4
            2400 mm | LENGTH | mm | 2.4
            2,4 | LENGTH | m | 2.4
            2.4 | LENGTH | m | 2.4
            8 ft 6 in | LENGTH | mm | 2.5908
            8' 6 | LENGTH | mm | 2.5908
            8'6" | LENGTH | m | 2.5908
            1'500 | LENGTH | mm | 1.5
            1’500 | LENGTH | mm | 1.5
            1 500 | LENGTH | mm | 1.5
            1'500 | LENGTH | ft | ! inches below 12
            1,500 | LENGTH | mm | ? 1500 mm; 1.5 mm
            1.500 | LENGTH | mm | ? 1500 mm; 1.5 mm
            1,500 | LENGTH | m | ? 1500 m; 1.5 m
            1.500 | LENGTH | m | ? 1500 m; 1.5 m
            1.500 | LENGTH | ft | ? 1500 ft; 1.5 ft
            -1,500 | LENGTH | mm | ? -1500 mm; -1.5 mm
            0.500 | LENGTH | m | 0.5
            1.5000 | LENGTH | m | 1.5
            1.500,00 | LENGTH | mm | 1.5
            1,500.00 | LENGTH | mm | 1.5
            1,500 m | LENGTH | mm | 1.5
            1.500 m | LENGTH | mm | 1.5
            8-6 | LENGTH | ft | 2.5908
            8-6 | LENGTH | in | 2.5908
            8-6 | LENGTH | m | ! does not say its units
            8-6" | LENGTH | m | 2.5908
            8-1/2 | LENGTH | in | ? 8 1/2 in; 8 ft 1/2 in
            2400-2600 | LENGTH | mm | ! does not say its units
            8.5 | LENGTH | ft | 2.5908
            6 1/2 | LENGTH | in | 0.1651
            6½ | LENGTH | in | 0.1651
            102 | LENGTH | in | 2.5908
            3 | LENGTH | yd | 2.7432
            ~~ | LENGTH | m | ! nothing was typed
            -3 | LENGTH | m | -3.0
            25 | SPEED | m/s | 25.0
            56 | SPEED | mph | 25.03424
            90 km/h | SPEED | mph | 25.0
            50 | SPEED | kn | 25.72222222222222
            17 | PRESSURE | psf | 813.9644026657094
            0,8 | PRESSURE | kPa | 800.0
            1.2 | FORCE | kN | 1200.0
            300 | FORCE | lbf | 1334.46648457815
            12 kg | FORCE | kN | ! is a mass
            3.5 | MOMENT | kN m | 3500.0
            120 | MASS | kg | 120.0
            260 | MASS | lb | 117.9340162
            12 kN | MASS | kg | ! is a force
            15 | ANGLE | deg | 0.26179938779914946
            2.9 | AREA | m2 | 2.9
            2400 | DENSITY | kg/m3 | 2400.0
            2.400 | DENSITY | kg/m3 | ? 2400 kg/m3; 2.4 kg/m3
            50 | PERIOD | years | 50.0
            6 | PERIOD | months | 0.5
            Bft 7 | SPEED | m/s | ! range of speeds
            """)
    void field(String typed, Dimension dimension, String unit, String expected) {
        Unit bare = Unit.of(dimension, unit).orElseThrow();
        Expected.check(Typed.read(typed, dimension, bare), expected);
    }
}
