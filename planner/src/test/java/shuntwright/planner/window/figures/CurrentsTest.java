package shuntwright.planner.window.figures;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageInterval;

class CurrentsTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            27.19118 | 28.01249 | 0.003 | 0.0041 | 27.191 .. 28.012 A ± 4.1 mA
            9.84803  | 10.14797 | 2e-4  | 2e-4   | 9.848 .. 10.148 A ± 200 µA
            0.1      | 0.2      | 0     | 0      | 100 .. 200 mA ± 0 A
            31.23456 | 32.3     | 0.5   | 0.05   | 31.2 .. 32.3 A ± 500 mA
            """)
    void endsAreRoundedToTheirStandardErrors(double low, double high, double lowError, double highError, String words) {
        assertThat(Currents.show(new CoverageInterval(Range.of(low, high),
                new CoverageInterval.Ends(lowError, highError)))).isEqualTo(words);
    }
}
