package shuntwright.sampling;

import org.hipparchus.distribution.continuous.BetaDistribution;

import shuntwright.quantity.Range;

/** Exact confidence intervals of a counted probability (C. J. Clopper, E. S. Pearson, Biometrika 26, 1934). */
final class Binomial {

    /** Of the limits; far below one in the most trials there can be. */
    private static final double ACCURACY = 1e-15;

    private Binomial() {
    }

    /** The probability of which {@code count} of {@code trials} were found. */
    static Probability of(long count, long trials) {
        double tail = (1 - Probability.CONFIDENCE) / 2;
        double low = count == 0 ? 0 : quantile((double) count, trials - count + 1.0, tail);
        double high = count == trials ? 1 : quantile(count + 1.0, (double) (trials - count), 1 - tail);
        double share = count / (double) trials;
        return new Probability(share, Range.of(low, high), Math.sqrt(share * (1 - share) / trials),
                Probability.Method.COUNTED, trials);
    }

    private static double quantile(double a, double b, double p) {
        return new BetaDistribution(a, b, ACCURACY).inverseCumulativeProbability(p);
    }
}
