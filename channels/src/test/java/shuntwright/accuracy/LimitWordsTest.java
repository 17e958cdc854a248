package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import shuntwright.quantity.Range;

class LimitWordsTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            24.51 | 31.2 | 24.51 .. 31.2 A
            24.51 | 1e9  | 24.51 A .. thermal runaway
            1e9   | 1e9  | thermal runaway
            -1e9  | 1e9  | no limits
            """)
    void whatIsNoLimitIsNoNumber(double low, double high, String words) {
        assertThat(LimitWords.show(Range.of(low, high), 4)).isEqualTo(words);
    }
}
