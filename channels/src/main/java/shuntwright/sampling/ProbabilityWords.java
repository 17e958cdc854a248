package shuntwright.sampling;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

/**
 * A probability as people read it, always with its interval: "0.0123 (95 %: 0.0121 to 0.0126)". One of which no trial was counted
 * is "below 3.7e-6 (95 %)", one of which every trial was "above 1 - 3.7e-6 (95 %)". Interval ends are rounded outwards.
 */
public final class ProbabilityWords {

    private static final int DIGITS = 3;
    private static final int BOUND_DIGITS = 2;
    /** Smaller ones are written with an exponent. */
    private static final double PLAIN = 1e-3;

    private ProbabilityWords() {
    }

    public static String of(Probability probability) {
        String confidence = Math.round(100 * Probability.CONFIDENCE) + " %";
        double low = probability.interval().min();
        double high = probability.interval().max();
        if (probability.estimate() <= 0) {
            return "below " + text(rounded(high, BOUND_DIGITS, RoundingMode.CEILING)) + " (" + confidence + ")";
        }
        if (probability.estimate() >= 1) {
            return "above 1 - " + text(rounded(1 - low, BOUND_DIGITS, RoundingMode.CEILING)) + " (" + confidence + ")";
        }
        return near(probability.estimate(), RoundingMode.HALF_UP) + " (" + confidence + ": "
                + near(low, RoundingMode.FLOOR) + " to " + near(high, RoundingMode.CEILING) + ")";
    }

    /** What the product of the channels' own probabilities claims for the board; a bound where it would be a certainty. */
    public static String product(BoardStudy study) {
        double product = study.yield().product();
        if (product >= 1) {
            return "above 1 - " + text(rounded(1 - study.productAtLeast(), BOUND_DIGITS, RoundingMode.CEILING));
        }
        return product <= 0
                ? "below " + text(rounded(study.productAtMost(), BOUND_DIGITS, RoundingMode.CEILING))
                : estimate(product);
    }

    /** The estimate alone, for where its interval stands beside it. */
    public static String estimate(double probability) {
        return near(probability, RoundingMode.HALF_UP);
    }

    /** Rounded so that its distance from the nearer of 0 and 1 keeps its digits. */
    private static String near(double value, RoundingMode mode) {
        return value <= 0.5
                ? text(rounded(value, DIGITS, mode))
                : text(BigDecimal.ONE.subtract(rounded(1 - value, DIGITS, opposite(mode))));
    }

    private static RoundingMode opposite(RoundingMode mode) {
        return switch (mode) {
            case FLOOR -> RoundingMode.CEILING;
            case CEILING -> RoundingMode.FLOOR;
            default -> mode;
        };
    }

    private static BigDecimal rounded(double value, int digits, RoundingMode mode) {
        return new BigDecimal(value).round(new MathContext(digits, mode));
    }

    private static String text(BigDecimal value) {
        BigDecimal brief = value.stripTrailingZeros();
        if (brief.signum() == 0 || brief.doubleValue() >= PLAIN) {
            return brief.toPlainString();
        }
        int exponent = brief.precision() - brief.scale() - 1;
        return String.format(Locale.ROOT, "%se%d", brief.scaleByPowerOfTen(-exponent).toPlainString(), exponent);
    }
}
