package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.Comparator;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import java.util.stream.IntStream;

import org.junit.jupiter.api.Test;

/** Selection by weight against sorting and adding up. */
class WeightedRankTest {

    private final RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(17);

    @Test
    void findsWhatSortingFinds() {
        for (int round = 0; round < 3000; round++) {
            int n = random.nextInt(1, 60);
            boolean ties = random.nextBoolean();
            // whole and half numbers add up without rounding in any order
            double[] values = random.doubles(n, -5, 5).map(each -> ties ? Math.floor(each) : each).toArray();
            double[] weights = random.ints(n, 0, 7).mapToDouble(each -> each / 2.0).toArray();
            double all = Arrays.stream(weights).sum();
            double wanted = random.nextInt(-1, (int) (2 * all) + 4) / 2.0;
            assertThat(WeightedRank.value(values.clone(), weights.clone(), wanted)).as("round %d", round)
                    .isEqualTo(sorted(values, weights, wanted));
        }
    }

    private static double sorted(double[] values, double[] weights, double wanted) {
        int[] order = IntStream.range(0, values.length).boxed().sorted(Comparator.comparingDouble(i -> values[i]))
                .mapToInt(i -> i).toArray();
        double sum = 0;
        for (int at : order) {
            sum += weights[at];
            double here = values[at];
            if (sum >= wanted) {
                return here;
            }
        }
        return values[order[order.length - 1]];
    }

    @Test
    void sortedAndEqualValuesTakeNoLonger() {
        double[] rising = IntStream.range(0, 1 << 20).asDoubleStream().toArray();
        double[] ones = new double[1 << 20];
        Arrays.fill(ones, 1);
        assertThat(WeightedRank.value(rising, ones.clone(), 1000)).isEqualTo(999);
        assertThat(WeightedRank.value(new double[1 << 20], ones, 5e5)).isZero();
    }
}
