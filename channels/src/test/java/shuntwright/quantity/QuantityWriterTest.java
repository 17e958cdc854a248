package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static shuntwright.quantity.Readings.meaning;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityWriterTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0.004     | RESISTANCE              | 4 mΩ
            33200     | RESISTANCE              | 33.2 kΩ
            999.5     | RESISTANCE              | 999.5 Ω
            0         | CURRENT                 | 0 A
            -0.0      | CURRENT                 | -0 A
            -35       | CURRENT                 | -35 A
            1e-20     | CURRENT                 | 1e-20 A
            -2.5e15   | CURRENT                 | -2.5e15 A
            999e12    | CURRENT                 | 999 TA
            1e-15     | CURRENT                 | 1 fA
            0.005     | RATIO                   | 0.5 %
            1         | RATIO                   | 100 %
            0         | RATIO                   | 0 %
            2.5e-5    | RATIO                   | 25 ppm
            2.5e-5    | TEMPERATURE_COEFFICIENT | 25 ppm/K
            0.00393   | TEMPERATURE_COEFFICIENT | 3930 ppm/K
            1e-7      | VOLTAGE_PER_KELVIN      | 100 nV/K
            2e6       | SLEW_RATE               | 2 V/µs
            600000    | SLEW_RATE               | 0.6 V/µs
            20        | SLEW_RATE               | 20 V/s
            50        | GAIN                    | 50 V/V
            110       | DECIBEL                 | 110 dB
            -20       | TEMPERATURE             | -20 °C
            0.05      | TEMPERATURE             | 0.05 °C
            1500      | TIME                    | 1500 s
            0.00005   | TIME                    | 50 µs
            3500      | CHARGE_HEAT             | 3500 A²s
            1500      | THERMAL_RESISTANCE      | 1500 K/W
            0.12      | MONEY                   | 0.12
            1e-8      | CAPACITANCE             | 10 nF
            """)
    void writesEngineeringNotation(double value, Dimension dimension, String expected) {
        assertThat(QuantityWriter.write(value, dimension)).isEqualTo(expected);
    }

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void zeroIsOneDigitInEveryUnit(Dimension dimension) {
        assertThat(QuantityWriter.show(0, dimension)).matches("0(\\D.*)?");
    }

    @Test
    void writesCompounds() {
        assertThat(QuantityWriter.write(Range.of(-20, 60), Dimension.TEMPERATURE)).isEqualTo("-20 .. 60 °C");
        assertThat(QuantityWriter.write(Range.of(0.2, 12), Dimension.VOLTAGE)).isEqualTo("0.2 .. 12 V");
        assertThat(QuantityWriter.write(Range.of(0, 0.01), Dimension.CURRENT)).isEqualTo("0 .. 10 mA");
        assertThat(QuantityWriter.write(Range.of(1e-6, 10), Dimension.RESISTANCE)).isEqualTo("1 µΩ .. 10 Ω");
        assertThat(QuantityWriter.write(Range.exactly(12), Dimension.VOLTAGE)).isEqualTo("12 V");
        assertThat(QuantityWriter.write(new Spread(10.5, 12, 14.4), Dimension.VOLTAGE))
                .isEqualTo("10.5 .. 12 .. 14.4 V");
        assertThat(QuantityWriter.write(Spread.exactly(12), Dimension.VOLTAGE)).isEqualTo("12 V");
        assertThat(QuantityWriter.write(Tolerance.symmetric(0.005))).isEqualTo("±0.5 %");
        assertThat(QuantityWriter.write(Tolerance.NONE)).isEqualTo("±0 %");
        assertThat(QuantityWriter.write(Tolerance.symmetric(2e-5))).isEqualTo("±20 ppm");
        assertThat(QuantityWriter.write(new Tolerance(0.03, 0.01))).isEqualTo("+1/-3 %");
        assertThat(QuantityWriter.write(new Toleranced(3.3, Tolerance.symmetric(0.02)), Dimension.VOLTAGE))
                .isEqualTo("3.3 V ±2 %");
        assertThat(QuantityWriter.write(new Toleranced(3.3, Tolerance.NONE), Dimension.VOLTAGE)).isEqualTo("3.3 V");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0.99996    | CURRENT     | 4 | 1 A
            0.99994    | CURRENT     | 4 | 999.9 mA
            -0.99996   | CURRENT     | 4 | -1 A
            0.9995     | CURRENT     | 3 | 1 A
            1.2345     | VOLTAGE     | 4 | 1.235 V
            -1.2345    | VOLTAGE     | 4 | -1.235 V
            123456     | RESISTANCE  | 3 | 123 kΩ
            123.4      | CURRENT     | 1 | 100 A
            0          | CURRENT     | 3 | 0 A
            -0.0       | CURRENT     | 3 | 0 A
            12.00001   | VOLTAGE     | 4 | 12 V
            0.0099996  | RATIO       | 4 | 1 %
            0.000099999| RATIO       | 3 | 0.01 %
            1e-30      | CURRENT     | 4 | 1e-30 A
            9.9999e14  | CURRENT     | 4 | 1e15 A
            0.1        | VOLTAGE     | 15| 100 mV
            """)
    void showsRounded(double value, Dimension dimension, int digits, String expected) {
        assertThat(QuantityWriter.show(value, dimension, digits)).isEqualTo(expected);
    }

    @Test
    void showsRangesUnderOneUnit() {
        assertThat(QuantityWriter.show(Range.of(0.99996, 12.3456), Dimension.VOLTAGE, 4)).isEqualTo("1 .. 12.35 V");
        assertThat(QuantityWriter.show(Range.exactly(1.23456), Dimension.VOLTAGE, 3)).isEqualTo("1.23 V");
        assertThat(QuantityWriter.show(1.23456, Dimension.VOLTAGE)).isEqualTo("1.235 V");
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refusesWhatIsNotFinite(double value) {
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.write(value, Dimension.CURRENT));
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.show(value, Dimension.CURRENT, 3));
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.letterCode(value));
    }

    @Test
    void refusesSenselessDigitsAndCodes() {
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.show(1, Dimension.CURRENT, 0));
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.show(1, Dimension.CURRENT, 16));
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.letterCode(0));
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.letterCode(-4));
        assertThatIllegalArgumentException().isThrownBy(() -> QuantityWriter.letterCode(1e12));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/quantity/letter-codes.csv", delimiter = ';', useHeadersInDisplayName = true)
    void writesPublishedLetterCodes(String code, double ohm, boolean written) {
        assertThat(QuantityWriter.letterCode(ohm).equals(code)).isEqualTo(written);
    }

    @Test
    void letterCodesOfAllFineMembersReadBack() {
        double[] members = ESeries.E192.within(Range.of(1e-3, 10e6));
        assertThat(members).hasSize(10 * 192 + 1);
        for (double ohm : members) {
            String code = QuantityWriter.letterCode(ohm);
            assertThat(meaning(QuantityReader.number(code, Dimension.RESISTANCE))).as(code).isEqualTo(ohm);
            assertThat(code).matches("[0-9]*[RKM][0-9]*").hasSizeBetween(3, 7);
        }
    }
}
