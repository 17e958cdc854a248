package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static shuntwright.quantity.Readings.meaning;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CompoundReadingTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            -20 °C .. 60 °C | TEMPERATURE | -20   | 60
            −20…60 °C       | TEMPERATURE | -20   | 60
            -20..60         | TEMPERATURE | -20   | 60
            -20 to 60 C     | TEMPERATURE | -20   | 60
            20 °C .. 60     | TEMPERATURE | 20    | 60
            0.2 .. 12 V     | VOLTAGE     | 0.2   | 12
            5 .. 10 mA      | CURRENT     | 0.005 | 0.01
            5 A .. 10 kA    | CURRENT     | 5     | 10000
            5m .. 10 A      | CURRENT     | 0.005 | 10
            0 ... 5 A       | CURRENT     | 0     | 5
            12 V            | VOLTAGE     | 12    | 12
            12 V ±10 %      | VOLTAGE     | 10.8  | 13.2
            10 .. 33k       | RESISTANCE  | 10000 | 33000
            10 .. 33K       | RESISTANCE  | 10000 | 33000
            10R .. 33K2     | RESISTANCE  | 10    | 33200
            0 .. 33K2       | RESISTANCE  | 0     | 33200
            1 .. 4R7        | RESISTANCE  | 1     | 4.7
            0.5 .. 1 %      | RATIO       | 0.005 | 0.01
            1e-3 .. 1e+3 V  | VOLTAGE     | 0.001 | 1000
            """)
    void readsRanges(String text, Dimension dimension, double min, double max) {
        assertThat(meaning(QuantityReader.range(text, dimension))).isEqualTo(Range.of(min, max));
    }

    @ParameterizedTest
    @ValueSource(strings = {"±0.5 %", "±0.5%", "+/-0.5%", "+/- 0.5 %", "+-0.5 %", "-/+0.5 %", "0.5 %", "0.005",
            "± 5000 ppm", "+0.5/-0.5 %", "+0.5 % / -0.5 %", "-0.5/+0.5 %", "±5e-1 %", "+0.5−0.5 %"})
    void readsOneToleranceInManyForms(String text) {
        assertThat(meaning(QuantityReader.tolerance(text))).isEqualTo(Tolerance.symmetric(0.005));
        if (!Character.isDigit(text.charAt(0))) {
            assertThat(meaning(QuantityReader.toleranced("4 mΩ " + text, Dimension.RESISTANCE)))
                    .isEqualTo(new Toleranced(0.004, Tolerance.symmetric(0.005)));
        }
    }

    @ParameterizedTest
    @CsvSource({"+1/-3 %", "+1%/-3%", "-3/+1 %", "+ 1 % - 3 %", "+0.01/-0.03", "+10000 ppm / -3 %"})
    void readsLopsidedTolerances(String text) {
        assertThat(meaning(QuantityReader.tolerance(text))).isEqualTo(new Tolerance(0.03, 0.01));
        assertThat(meaning(QuantityReader.toleranced("3.3V" + text, Dimension.VOLTAGE)))
                .isEqualTo(new Toleranced(3.3, new Tolerance(0.03, 0.01)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            3.3 V ±2 %      | 3.3  | 0.02
            3.3±2%          | 3.3  | 0.02
            3.3 V           | 3.3  | 0
            1e-3 V ± 1 %    | 1e-3 | 0.01
            1e+3V+/-1%      | 1e3  | 0.01
            -5 V ±1 %       | -5   | 0.01
            2.5 V ±200 ppm  | 2.5  | 0.0002
            """)
    void readsToleratedValues(String text, double nominal, double fraction) {
        assertThat(meaning(QuantityReader.toleranced(text, Dimension.VOLTAGE)))
                .isEqualTo(new Toleranced(nominal, Tolerance.symmetric(fraction)));
    }

    @Test
    void readsSpreads() {
        assertThat(meaning(QuantityReader.spread("10.5 .. 12 .. 14.4 V", Dimension.VOLTAGE)))
                .isEqualTo(new Spread(10.5, 12, 14.4));
        assertThat(meaning(QuantityReader.spread("10..14 V", Dimension.VOLTAGE))).isEqualTo(new Spread(10, 12, 14));
        assertThat(meaning(QuantityReader.spread("12 V", Dimension.VOLTAGE))).isEqualTo(Spread.exactly(12));
        assertThat(meaning(QuantityReader.spread("10 V +20/-10 %", Dimension.VOLTAGE)))
                .isEqualTo(new Spread(9, 10, 12));
        assertThat(meaning(QuantityReader.spread("-1.7e308 .. 1.7e308", Dimension.VOLTAGE)).nominal()).isZero();
        assertThat(QuantityReader.spread("14 .. 12 .. 15 V", Dimension.VOLTAGE).ifProblem()).isPresent();
        assertThat(QuantityReader.spread("1 .. 2 .. 3 .. 4 V", Dimension.VOLTAGE).ifProblem()).isPresent();
    }
}
