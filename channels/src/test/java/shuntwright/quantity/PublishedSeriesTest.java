package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** The preferred number series against the lists of the standard; the source stands on each row. */
class PublishedSeriesTest {

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/quantity/series.csv", delimiter = ';', useHeadersInDisplayName = true, maxCharsPerColumn = 8192)
    void decadesAreTheListed(ESeries series, String values, int sum) {
        int scale = series.compareTo(ESeries.E24) <= 0 ? 10 : 100;
        double[] listed = Arrays.stream(values.split(" ")).mapToDouble(text -> Integer.parseInt(text) / (double) scale)
                .toArray();
        assertThat(series.decade()).containsExactly(listed);
        assertThat(Math.round(Arrays.stream(series.decade()).sum() * scale)).isEqualTo(sum);
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/quantity/series-irregular.csv", delimiter = ';', useHeadersInDisplayName = true)
    void irregularMembersAreTheStandardsOwn(ESeries series, int index, int rounded, int standard) {
        double scale = series == ESeries.E24 ? 10 : 100;
        assertThat(series.decade()[index]).isEqualTo(standard / scale);
        assertThat(Math.round(scale * Math.pow(10, index / (double) series.decade().length))).isEqualTo(rounded);
        assertThat(series.contains(standard)).isTrue();
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/quantity/series-lookups.csv", delimiter = ';', useHeadersInDisplayName = true)
    void looksUpAsPublished(String operation, ESeries series, double value, double expected) {
        double found = switch (operation) {
            case "nearest" -> series.nearest(value);
            case "atLeast" -> series.atLeast(value);
            case "atMost" -> series.atMost(value);
            default -> throw new IllegalArgumentException(operation);
        };
        assertThat(found).isEqualTo(expected);
    }

    @Test
    void fourMilliohmIsInNoSeriesAnd919IsNotAMember() {
        for (ESeries series : ESeries.values()) {
            assertThat(series.contains(0.004)).as(series.name()).isFalse();
        }
        assertThat(ESeries.E192.contains(919)).isFalse();
        assertThat(ESeries.E192.contains(920)).isTrue();
    }
}
