package shuntwright.choice;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.SplittableRandom;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

class DividerTableTest {

    private static DividerTable table(ESeries series, double least, double most) {
        return DividerTable.of(series, Range.of(least, most));
    }

    @ParameterizedTest
    @CsvSource({"E6, 10, 1e7", "E12, 100, 22e3", "E24, 1e3, 100e3", "E96, 1e3, 20e3", "E3, 220, 220"})
    void holdsEveryPairOnce(ESeries series, double least, double most) {
        DividerTable table = table(series, least, most);
        Set<List<Double>> pairs = new HashSet<>();
        for (int i = 0; i < table.size(); i++) {
            assertThat(pairs.add(List.of(table.top(i), table.bottom(i)))).isTrue();
            assertThat(table.ratio(i)).isEqualTo(table.bottom(i) / (table.top(i) + table.bottom(i)));
        }
        Set<List<Double>> expected = new HashSet<>();
        double smallest = Math.max(47, least);
        double largest = Math.min(1e6, most);
        for (double top : series.within(Range.of(smallest, largest))) {
            for (double bottom : series.within(Range.of(smallest, largest))) {
                if (top + bottom >= 500 && top + bottom <= 1e6) {
                    expected.add(List.of(top, bottom));
                }
            }
        }
        assertThat(pairs).isEqualTo(expected);
    }

    @ParameterizedTest
    @CsvSource({"E6, 10, 1e7", "E24, 1e3, 100e3", "E96, 1e3, 20e3", "E192, 1e3, 10e3"})
    void findsRatiosFromBelow(ESeries series, double least, double most) {
        DividerTable table = table(series, least, most);
        SplittableRandom random = new SplittableRandom(7);
        List<Double> wanted = new ArrayList<>(List.of(0.0, 1.0, 0.5));
        for (int i = 0; i < 500; i++) {
            wanted.add(random.nextDouble());
            wanted.add(table.ratio(random.nextInt(table.size())));
        }
        for (double ratio : wanted) {
            int at = table.from(ratio);
            for (int i = Math.max(0, at - 3); i < at; i++) {
                assertThat(table.ratio(i)).isLessThan(ratio);
            }
            for (int i = at; i < Math.min(table.size(), at + 3); i++) {
                assertThat(table.ratio(i)).isGreaterThanOrEqualTo(ratio);
            }
            double next = ratio + 0.001;
            boolean there = at < table.size() && table.ratio(at) <= next;
            assertThat(table.has(ratio, next)).isEqualTo(there);
        }
    }

    @ParameterizedTest
    @CsvSource({"E24, 1e3, 100e3", "E96, 100, 1e5", "E192, 1e3, 10e3"})
    void ascends(ESeries series, double least, double most) {
        DividerTable table = table(series, least, most);
        assertThat(table.size()).isPositive();
        for (int i = 1; i < table.size(); i++) {
            assertThat(table.ratio(i)).isGreaterThanOrEqualTo(table.ratio(i - 1));
        }
    }

    @ParameterizedTest
    @CsvSource({"E24, 1, 46", "E24, 2e6, 1e7", "E24, 101, 109"})
    void isEmptyWithoutValues(ESeries series, double least, double most) {
        DividerTable table = table(series, least, most);
        assertThat(table.size()).isZero();
        assertThat(table.from(0.5)).isZero();
        assertThat(table.has(0, 1)).isFalse();
    }
}
