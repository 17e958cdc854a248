package shuntwright.planner.window.figures;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import shuntwright.quantity.Range;
import shuntwright.sampling.Probability;

class ChanceTest {
    private static Probability probability(double estimate, double low, double high) {
        return new Probability(estimate, Range.of(low, high), 0, Probability.Method.COUNTED, 1000);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0        | 0        | 3.689e-6 | below 3.7e-6 (95 %)
            0        | 0        | 0.00368  | below 0.37 % (95 %)
            0.0123   | 0.0121   | 0.01256  | 1.2 % [1.2 .. 1.3 %]
            0.00098  | 0.00092  | 0.00104  | 9.8e-4 [9.2e-4 .. 1.1e-3]
            6.3e-5   | 4.9e-5   | 8.06e-5  | 6.3e-5 [4.9e-5 .. 8.1e-5]
            0.992    | 0.9893   | 0.9941   | 99.2 % [98.9 .. 99.41 %]
            1        | 0.9999963| 1        | above 99.9996 % (95 %)
            0.9999993| 0.999997 | 0.99999999 | 99.99993 % [99.9997 .. 99.999999 %]
            2e-9     | 0        | 5e-9     | 2e-9, below 5e-9 (95 %)
            0.5      | 0.469    | 0.5314   | 50 % [46 .. 54 %]
            """)
    void saysTheEstimateWithItsInterval(double estimate, double low, double high, String words) {
        assertThat(Chance.of(probability(estimate, low, high))).isEqualTo(words);
    }

    @Test
    void neverSaysNeverOrAlways() {
        Random random = new Random(20);
        for (int i = 0; i < 2000; i++) {
            double near = Math.pow(10, -17 * random.nextDouble());
            double other = near * random.nextDouble();
            double low = random.nextBoolean() ? other : 1 - near;
            double high = Math.max(low, random.nextBoolean() ? near : 1 - other);
            for (double estimate : new double[]{low, high, 0, 1}) {
                assertThat(Chance.of(probability(estimate, low, high))).doesNotStartWith("0 %")
                        .doesNotStartWith("100 %").doesNotContain("above 100 %").doesNotContain("below 0 %");
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"0.0131, 0.0012, 1.3 % ± 0.1 %", "-0.00002, 0.0001, −0.002 % ± 0.01 %", "0, 0, 0 % ± 0 %"})
    void differencesKeepTheirSign(double value, double error, String words) {
        assertThat(Chance.difference(value, error)).isEqualTo(words);
    }

    @ParameterizedTest
    @CsvSource({"0.9712, 0.9, 97.1 %", "1, 0.99998, above 99.998 %"})
    void aProductOfOneIsABound(double product, double atLeast, String words) {
        assertThat(Chance.about(product, atLeast)).isEqualTo(words);
    }
}
