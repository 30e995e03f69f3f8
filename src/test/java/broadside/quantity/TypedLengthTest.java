package broadside.quantity;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Lengths as people type them. Expected values were worked out with exact fractions from the factors of NIST SP 811 (recalled);
 * {@code ?} stands before the readings offered, {@code !} before words of the refusal.
 */
class TypedLengthTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            2.4 m | 2.4
            2.4m | 2.4
            2,4 m | 2.4
            2,4m | 2.4
            2400 mm | 2.4
            2400mm | 2.4
            240 cm | 2.4
            240cm | 2.4
            0.0024 km | 2.4
            2.4 metres | 2.4
            2.4 metre | 2.4
            2.4 meters | 2.4
            2.4 meter | 2.4
            2.4 Meters | 2.4
            2400 MM | 2.4
            240 CM | 2.4
            1 KM | 1000.0
            240 centimetres | 2.4
            2400 millimeters | 2.4
            1 kilometre | 1000.0
            2.4 m. | 2.4
            2.4 m | 2.4
            2.4 m | 2.4
            2.4 m | 2.4
            ~  2.4   m  ~ | 2.4
            +2.4 m | 2.4
            -2.4 m | -2.4
            −2.4 m | -2.4
            –2.4 m | -2.4
            - 2.4 m | -2.4
            0 m | 0.0
            -0 m | 0.0
            0.5 m | 0.5
            .5 m | 0.5
            ,5 m | 0.5
            5. m | 5.0
            5.m | 5.0
            0,500 m | 0.5
            0.500 m | 0.5
            1.500 m | 1.5
            12.345 m | 12.345
            1500.000 mm | 1.5
            1500,000 mm | 1.5
            1,5000 m | 1.5
            01,500 m | 1.5
            1.500,00 mm | 1.5
            1,500.00 mm | 1.5
            1.500,5 mm | 1.5005
            1,500.5 mm | 1.5005
            1,234,567 mm | 1234.567
            1.234.567 mm | 1234.567
            1.234.567,8 mm | 1234.5678
            1,234,567.8 mm | 1234.5678
            1 500 mm | 1.5
            1 500 mm | 1.5
            1 500 mm | 1.5
            1 500 mm | 1.5
            1 500 mm | 1.5
            1'500 mm | 1.5
            1’500 mm | 1.5
            1'234'567 mm | 1234.567
            1 234 567 mm | 1234.567
            1 500,5 mm | 1.5005
            1 500.250 mm | 1.50025
            1'500.5 mm | 1.5005
            1/2 m | 0.5
            2 1/2 m | 2.5
            ½ m | 0.5
            2½ m | 2.5
            2 ½ m | 2.5
            3/2 m | 1.5
            2⅓ m | 2.3333333333333335
            1 ⁄ 2 m | ! not one clear number
            1⁄2 m | 0.5
            """)
    void metric(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.LENGTH), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            8 ft 6 in | 2.5908
            8' 6" | 2.5908
            8'6" | 2.5908
            8’6” | 2.5908
            8’ 6” | 2.5908
            8′6″ | 2.5908
            8′ 6″ | 2.5908
            8‘6“ | 2.5908
            8-6 | 2.5908
            8-6" | 2.5908
            8-6 in | 2.5908
            8‑6 | 2.5908
            8ft6 | 2.5908
            8ft 6 | 2.5908
            8 ft 6 | 2.5908
            8ft6in | 2.5908
            8FT6IN | 2.5908
            8 FT 6 IN | 2.5908
            8 Ft 6 In | 2.5908
            8 ft. 6 in. | 2.5908
            8ft.6in. | ? 8 ft 6 in; 8 ft 0.6 in
            8 ft .5 in | 2.4511
            8'.5" | 2.4511
            8 feet 6 inches | 2.5908
            8 foot 6 inches | 2.5908
            8 feet, 6 inches | 2.5908
            8 feet and 6 inches | 2.5908
            8 ft - 6 in | 2.5908
            8 ft-6 in | 2.5908
            8'-6" | 2.5908
            8' - 6" | 2.5908
            8'6'' | 2.5908
            8'6 | 2.5908
            8' 6 | 2.5908
            8´6 | 2.5908
            8`6 | 2.5908
            8.5' | 2.5908
            8,5' | 2.5908
            8.5 ft | 2.5908
            8.5 feet | 2.5908
            8½' | 2.5908
            8 1/2 ft | 2.5908
            102" | 2.5908
            102” | 2.5908
            102″ | 2.5908
            102'' | 2.5908
            102 in | 2.5908
            102in | 2.5908
            102 inches | 2.5908
            102 In. | 2.5908
            1 inch | 0.0254
            1 foot | 0.3048
            8' | 2.4384
            8 ft | 2.4384
            8’ | 2.4384
            8 FEET | 2.4384
            6 1/2" | 0.1651
            6½" | 0.1651
            6 ½ in | 0.1651
            6.5" | 0.1651
            6 1/2in | 0.1651
            1/2" | 0.0127
            ½" | 0.0127
            3/8 in | 0.009525
            ⅜ in | 0.009525
            ¼" | 0.00635
            ¾" | 0.01905
            ⅛" | 0.003175
            ⅝" | 0.015875
            ⅞" | 0.022225
            5/16 in | 0.0079375
            7'-11 1/2" | 2.4257
            7' 11 1/2" | 2.4257
            7'11½" | 2.4257
            7’-11½” | 2.4257
            7-11 1/2 | 2.4257
            7-11½ | 2.4257
            7-11½" | 2.4257
            7 ft 11 1/2 in | 2.4257
            7 ft 11.5 in | 2.4257
            7 ft 11,5 in | 2.4257
            7 ft 6.125 in | 2.289175
            8' 1/2" | 2.4511
            8 ft ½ in | 2.4511
            0'6" | 0.1524
            0-6 | 0.1524
            8'0" | 2.4384
            8-0 | 2.4384
            8 ft 0 in | 2.4384
            10-11 | 3.3274
            -8 ft 6 in | -2.5908
            −8' 6" | -2.5908
            -8-6 | -2.5908
            -6" | -0.1524
            1 200 ft 6 in | 365.9124
            8 ft 06 in | 2.5908
            3 yd | 2.7432
            3 yards | 2.7432
            1 yard | 0.9144
            8ft2 | 2.4892
            """)
    void feetAndInches(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.LENGTH), expected);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', ignoreLeadingAndTrailingWhitespace = true, textBlock = """
            1,500 mm | ? 1500 mm; 1.5 mm
            -1,500 mm | ? -1500 mm; -1.5 mm
            1,500 m | 1.5
            2,400 mm | ? 2400 mm; 2.4 mm
            150,000 mm | ? 150000 mm; 150 mm
            8-1/2 | ? 8 1/2 in; 8 ft 1/2 in
            8-1/2" | ? 8 1/2 in; 8 ft 1/2 in
            8-½ | ? 8 1/2 in; 8 ft 1/2 in
            4,000 ft | 1.2192
            1,500 in | ? 1500 in; 1.5 in
            2.4 | ! has no unit: a length is typed with its unit, like 2.4 m or 8 ft 6 in
            1,500 | ! no unit
            1.500 | ! no unit
            6 1/2 | ! no unit
            8 6 | ! more than one number
            2.4 M | ! small m and capital M
            2 Mm | ! small m and capital M
            3 kg | ! is a mass
            3 kN | ! is a force
            3 m2 | ! is an area
            8 ft2 | ! is an area
            8 m/s | ! is a speed
            8 ft/s | ! is a speed
            2.4 q | ! no unit that is known
            2d | ! no unit that is known
            0x1p3 | ! no unit that is known
            1e3 mm | ! exponent
            1E3 mm | ! exponent
            1e400 | ! exponent
            1e-3 m | ! exponent
            NaN | ! does not begin with a number
            Infinity | ! does not begin with a number
            -Infinity m | ! does not begin with a number
            ∞ m | ! does not begin with a number
            m | ! does not begin with a number
            abc | ! does not begin with a number
            - | ! does not begin with a number
            + | ! does not begin with a number
            --2 m | ! does not begin with a number
            +-2 m | ! does not begin with a number
            . | ! does not begin with a number
            , m | ! does not begin with a number
            ' | ! does not begin with a number
            about 2 m | ! does not begin with a number
            ~ ~ | ! nothing was typed
            ~~ | ! nothing was typed
            ٢.٤ m | ! digits other than 0 to 9
            ۲ m | ! digits other than 0 to 9
            २ m | ! digits other than 0 to 9
            ２.4 m | ! digits other than 0 to 9
            1,23,456 mm | ! not one clear number
            1,500,00 mm | ! not one clear number
            1.2.3 m | ! not one clear number
            1.500.00 m | ! not one clear number
            1 234,567.8 mm | ! not one clear number
            1'234 567 mm | ! not one clear number
            12345,678.9 m | ! not one clear number
            1/0 m | ! divides by zero
            1 5/4 in | ! not one clear number
            1/2/3 m | ! not one clear number
            ½½ m | ! more than one number
            ½8 m | ! more than one number
            5² m | ! no unit that is known
            8' 14" | ! inches below 12
            8 ft 12 in | ! inches below 12
            8'102" | ! inches below 12
            8 ft 6 ft | ! inches below 12
            8' 6 m | ! inches below 12
            8.5' 6" | ! not a whole number
            8½ ft 6 in | ! not a whole number
            1,200 ft 6 in | ! not a whole number
            8-14 | ! inches below 12
            2-3 m | ! more than one number
            2 - 3 m | ! more than one number
            2 to 3 m | ! no unit that is known
            1 m 50 cm | ! no unit that is known
            8" 6' | ! no unit that is known
            2.4 m (8 ft) | ! no unit that is known
            5% | ! no unit that is known
            2 x 3 m | ! no unit that is known
            1 50 m | ! more than one number
            3 mm2 | ! is an area
            """)
    void openOrRefused(String typed, String expected) {
        Expected.check(Typed.read(typed, Dimension.LENGTH), expected);
    }
}
