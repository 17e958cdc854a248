package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;

import org.hipparchus.distribution.continuous.BetaDistribution;
import org.hipparchus.distribution.discrete.BinomialDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

import shuntwright.quantity.Range;

/** Counted probabilities and their exact confidence intervals. */
class BinomialTest {

    private static final double HALF_ALPHA = 0.025;

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/binomial-intervals.csv", delimiter = ';', useHeadersInDisplayName = true)
    void intervalsAreThePublished(int count, int trials, double low, double high, double tolerance) {
        Probability found = Binomial.of(count, trials);
        assertThat(found.interval().min()).isCloseTo(low, within(tolerance));
        assertThat(found.interval().max()).isCloseTo(high, within(tolerance));
        assertThat(found.estimate()).isEqualTo(count / (double) trials);
        assertThat(found.method()).isEqualTo(Probability.Method.COUNTED);
        assertThat(found.trials()).isEqualTo(trials);
    }

    /** The definition: at the ends, as few or as many as were counted have a probability of α/2. */
    @ParameterizedTest
    @CsvSource({"1,29", "7,1000", "50,100", "99,100", "100,1000000", "1,1000000", "999999,1000000", "5000,1000000"})
    void endsAreWhereTheCountBecomesRare(int count, int trials) {
        Range interval = Binomial.of(count, trials).interval();
        double asMany = 1 - new BinomialDistribution(trials, interval.min()).cumulativeProbability(count - 1);
        double asFew = new BinomialDistribution(trials, interval.max()).cumulativeProbability(count);
        assertThat(asMany).isCloseTo(HALF_ALPHA, within(1e-6));
        assertThat(asFew).isCloseTo(HALF_ALPHA, within(1e-6));
    }

    /** For nothing counted the limit is 1 − (α/2)^(1/n), in closed form; for everything counted it is mirrored. */
    @ParameterizedTest
    @CsvSource({"1", "10", "10000", "1000000", "100000000"})
    void nothingCountedIsNotZero(long trials) {
        double limit = -Math.expm1(Math.log(HALF_ALPHA) / trials);
        Probability none = Binomial.of(0, trials);
        assertThat(none.estimate()).isZero();
        assertThat(none.interval().min()).isZero();
        assertThat(none.interval().max()).isCloseTo(limit, within(1e-6 * limit + 1e-12)).isPositive();
        Probability all = Binomial.of(trials, trials);
        assertThat(all.interval().max()).isEqualTo(1);
        assertThat(1 - all.interval().min()).isCloseTo(limit, within(1e-6 * limit + 1e-12));
        assertThat(all.opposite().interval()).satisfies(mirrored -> {
            assertThat(mirrored.min()).isZero();
            assertThat(mirrored.max()).isCloseTo(limit, within(1e-6 * limit + 1e-12));
        });
    }

    /** Many trials: near the normal approximation, whose half-width is 1.96 standard errors. */
    @Test
    void hundredMillionTrials() {
        Probability found = Binomial.of(1_000_000, 100_000_000);
        double error = Math.sqrt(0.01 * 0.99 / 1e8);
        assertThat(found.standardError()).isCloseTo(error, within(1e-3 * error));
        assertThat(found.interval().width() / 2).isCloseTo(1.959964 * error, within(0.01 * error));
    }

    /** The interval contains the truth in at least 95 % of the cases, and not in all, which would say that it is too wide. */
    @Test
    void intervalsCoverTheTruthAsOftenAsTheySay() {
        int seeds = 400;
        double half = 0.05;
        int covered = 0;
        Honesty errors = new Honesty("counted probabilities");
        for (int seed = 1; seed <= seeds; seed++) {
            Probability found = Runs.only(Formula.sum(1), List.of(Runs.uniform("x", 0, 1)),
                    Range.of(-1 + half, 1 - half), 0.9, Runs.fixed(10_000, seed)).outside();
            assertThat(found.method()).isEqualTo(Probability.Method.COUNTED);
            covered += found.interval().contains(half) ? 1 : 0;
            errors.add(found.estimate(), found.standardError(), half);
        }
        // Exact coverage of the method for this probability and number of trials, by its definition.
        BinomialDistribution law = new BinomialDistribution(10_000, half);
        double exact = 0;
        for (int count = 350; count < 650; count++) {
            double low = new BetaDistribution(count, 10_001 - count).inverseCumulativeProbability(HALF_ALPHA);
            double high = new BetaDistribution(count + 1, 10_000 - count).inverseCumulativeProbability(1 - HALF_ALPHA);
            exact += low <= half && half <= high ? law.probability(count) : 0;
        }
        assertThat(exact).isBetween(0.95, 0.96);
        assertThat(covered / (double) seeds).isCloseTo(exact, within(3.5 * Math.sqrt(exact * (1 - exact) / seeds)));
        errors.check();
    }
}
