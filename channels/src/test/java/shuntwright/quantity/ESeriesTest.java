package shuntwright.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.Arrays;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import java.util.stream.DoubleStream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class ESeriesTest {

    private final RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(192);

    @Test
    void membersAreTheExactDecimals() {
        assertThat(ESeries.E24.nearest(4699)).isEqualTo(4700.0);
        assertThat(ESeries.E24.nearest(0.00471)).isEqualTo(0.0047);
        for (int power = -28; power <= 28; power++) {
            double[] members = ESeries.E192.within(Range.of(Double.parseDouble("1e" + power),
                    Double.parseDouble("9.88e" + power)));
            assertThat(members).hasSize(192);
            for (double member : members) {
                assertThat(Double.toString(member).replaceAll("E.*|[.]", "").replaceAll("^0+|0+$", ""))
                        .hasSizeLessThanOrEqualTo(3);
            }
        }
    }

    @Test
    void aMemberComputedWithRoundingErrorIsThatMember() {
        double off = 0.1 * 3 * 11;
        assertThat(off).isGreaterThan(3.3);
        assertThat(ESeries.E24.atLeast(off)).isEqualTo(3.3);
        assertThat(ESeries.E24.atMost(3.3 * (1 - 5e-10))).isEqualTo(3.3);
        assertThat(ESeries.E24.contains(off)).isTrue();
        assertThat(ESeries.E24.within(Range.of(off, 3.6 * (1 - 5e-10)))).containsExactly(3.3, 3.6);
        assertThat(ESeries.E24.atLeast(3.3 * (1 + 2e-9))).isEqualTo(3.6);
        assertThat(ESeries.E24.atMost(3.3 * (1 - 2e-9))).isEqualTo(3.0);
    }

    @ParameterizedTest
    @EnumSource
    void looksUpAsCountingThroughAllMembersDoes(ESeries series) {
        double[] all = DoubleStream.of(1e-4, 1e-3, 1e-2, 0.1, 1, 10, 100, 1000, 1e4)
                .flatMap(power -> Arrays.stream(series.decade()).map(member -> member * power)).toArray();
        for (int i = 0; i < 5_000; i++) {
            double value = Math.pow(10, random.nextDouble(-3, 4));
            double above = Arrays.stream(all).filter(member -> member >= value).min().orElseThrow();
            double below = Arrays.stream(all).filter(member -> member <= value).max().orElseThrow();
            double nearest = value / below < above / value ? below : above;
            assertThat(series.atLeast(value)).isCloseTo(above, within(above));
            assertThat(series.atMost(value)).isCloseTo(below, within(below));
            assertThat(series.nearest(value)).isCloseTo(nearest, within(nearest));
        }
    }

    private static org.assertj.core.data.Offset<Double> within(double value) {
        return org.assertj.core.data.Offset.offset(value * 1e-12);
    }

    @ParameterizedTest
    @EnumSource
    void everyMemberIsItsOwnNeighbour(ESeries series) {
        double[] members = series.within(Range.of(1e-12, 1e12));
        assertThat(members).hasSize(24 * series.decade().length + 1).isSorted().doesNotHaveDuplicates();
        for (double member : members) {
            assertThat(series.nearest(member)).isEqualTo(member);
            assertThat(series.atLeast(member)).isEqualTo(member);
            assertThat(series.atMost(member)).isEqualTo(member);
            assertThat(series.contains(member)).isTrue();
        }
    }

    @Test
    void withinHoldsMembersOnlyAndAscending() {
        assertThat(ESeries.E24.within(Range.of(4650, 5650))).containsExactly(4700, 5100, 5600);
        assertThat(ESeries.E6.within(Range.of(8, 12))).containsExactly(10);
        assertThat(ESeries.E6.within(Range.of(7, 9))).isEmpty();
        assertThat(ESeries.E3.within(Range.of(1, 100))).containsExactly(1, 2.2, 4.7, 10, 22, 47, 100);
    }

    @Test
    void decadeIsACopy() {
        ESeries.E3.decade()[0] = 7;
        assertThat(ESeries.E3.decade()).containsExactly(1, 2.2, 4.7);
    }

    @Test
    void reachesTheEndsOfItsDomain() {
        assertThat(ESeries.E12.nearest(1e-300)).isEqualTo(1e-300);
        assertThat(ESeries.E12.atLeast(9e299)).isEqualTo(1e300);
        assertThat(ESeries.E12.atMost(1e300)).isEqualTo(1e300);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -0.0, -1, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, 1e-301, 1e301})
    void refusesWhatHasNoPreferredNumber(double value) {
        assertThatIllegalArgumentException().isThrownBy(() -> ESeries.E24.nearest(value))
                .withMessageContaining("1e-300");
        assertThatIllegalArgumentException().isThrownBy(() -> ESeries.E24.atLeast(value));
        assertThatIllegalArgumentException().isThrownBy(() -> ESeries.E24.atMost(value));
        assertThatIllegalArgumentException().isThrownBy(() -> ESeries.E24.contains(value));
        assertThatIllegalArgumentException().isThrownBy(() -> ESeries.E24.within(Range.of(value, 1)));
        assertThatIllegalArgumentException().isThrownBy(() -> ESeries.E24.within(Range.of(1, value)));
    }
}
