package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;

/**
 * Whether stated standard errors are those that estimates really have: (estimate − truth)/error over many seeds must scatter with a
 * standard deviation near 1 around 0. Of n scores the standard deviation is itself uncertain by 1/√(2n), the mean by 1/√n.
 */
final class Honesty {

    private final String what;
    private final List<Double> scores = new ArrayList<>();

    Honesty(String what) {
        this.what = what;
    }

    void add(double estimate, double standardError, double truth) {
        assertThat(standardError).as("standard error of %s", what).isPositive().isFinite();
        scores.add((estimate - truth) / standardError);
    }

    double mean() {
        return scores.stream().mapToDouble(Double::doubleValue).average().orElseThrow();
    }

    double deviation() {
        double mean = mean();
        return Math.sqrt(scores.stream().mapToDouble(z -> (z - mean) * (z - mean)).sum() / (scores.size() - 1));
    }

    /** Within 0.8 and 1.2 for a hundred scores, wider for fewer; no bias beyond four standard errors of the mean. */
    void check() {
        check(0.2);
    }

    /** The same with another room for a hundred scores. */
    void check(double room) {
        int n = scores.size();
        assertThat(deviation()).as("standard deviation of the %d scores of %s (mean %.3f)", n, what, mean()).isCloseTo(
                1,
                within(room * Math.max(1, Math.sqrt(100.0 / n))));
        assertThat(mean()).as("mean of the %d scores of %s", n, what).isCloseTo(0, within(4 / Math.sqrt(n)));
    }
}
