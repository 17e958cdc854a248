package shuntwright.planner.window.figures;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;

import shuntwright.sampling.Probability;

/**
 * Probabilities in words. Trials cannot tell that something never or always happens, so neither 0 nor 100 % is ever said: then a
 * bound stands there, rounded away from what is claimed.
 */
public final class Chance {
    /** Fractions below this are written with an exponent, others in per cent. */
    private static final double SMALL = 1e-3;
    /** A fraction nearer to 1 than this cannot be told from it. */
    private static final BigDecimal LEAST = BigDecimal.valueOf(Math.ulp(1.0));
    private static final String CONFIDENCE = " (" + Math.round(Probability.CONFIDENCE * 100) + " %)";

    private Chance() {
    }

    /** "1.2 % [1.1 .. 1.3 %]", "below 3.7e-6 (95 %)" or "above 99.9996 % (95 %)". */
    public static String of(Probability probability) {
        double low = probability.interval().min();
        double high = probability.interval().max();
        boolean tiny = probability.estimate() < SMALL;
        if (!(probability.estimate() > 0)) {
            return below(high) + CONFIDENCE;
        }
        if (!(probability.estimate() < 1)) {
            return above(low) + CONFIDENCE;
        }
        String about = text(probability.estimate(), 2, RoundingMode.HALF_UP, tiny);
        if (!(low > 0)) {
            return about + ", " + below(high) + CONFIDENCE;
        }
        if (!(high < 1)) {
            return about + ", " + above(low) + CONFIDENCE;
        }
        String from = text(low, 2, RoundingMode.FLOOR, tiny);
        String to = text(high, 2, RoundingMode.CEILING, tiny);
        return about + " [" + (tiny ? from : from.substring(0, from.length() - 2)) + " .. " + to + "]";
    }

    /** A fraction without an interval of its own, such as a product; where it is 1 the bound stands for it. */
    public static String about(double fraction, double atLeast) {
        return fraction < 1 && fraction > 0
                ? text(fraction, 2, RoundingMode.HALF_UP, fraction < SMALL)
                : above(atLeast);
    }

    /** A difference of probabilities with its standard error, "1.3 % ± 0.1 %". */
    public static String difference(double value, double standardError) {
        return difference(value) + " ± " + percent(BigDecimal.valueOf(standardError).round(new MathContext(1)))
                + " %";
    }

    /** A difference of probabilities, "1.3 %". */
    public static String difference(double value) {
        return (value < 0 ? "−" : "") + percent(BigDecimal.valueOf(Math.abs(value)).round(new MathContext(2))) + " %";
    }

    private static String below(double bound) {
        return "below " + text(bound, 2, RoundingMode.CEILING, bound < SMALL);
    }

    private static String above(double bound) {
        return "above " + text(bound, 1, RoundingMode.FLOOR, bound < SMALL);
    }

    /** Rounded so that its distance from the nearer of 0 and 1 keeps so many digits. */
    private static String text(double fraction, int digits, RoundingMode mode, boolean tiny) {
        if (fraction > 0.5) {
            BigDecimal rest = BigDecimal.ONE.subtract(BigDecimal.valueOf(fraction)).max(LEAST);
            BigDecimal away = rest.round(new MathContext(digits, opposite(mode)));
            return percent(BigDecimal.ONE.subtract(away)) + " %";
        }
        BigDecimal rounded = BigDecimal.valueOf(fraction).round(new MathContext(digits, mode));
        return tiny && rounded.signum() > 0 ? exponent(rounded) : percent(rounded) + " %";
    }

    private static RoundingMode opposite(RoundingMode mode) {
        return mode == RoundingMode.FLOOR
                ? RoundingMode.CEILING
                : mode == RoundingMode.CEILING ? RoundingMode.FLOOR : mode;
    }

    private static String percent(BigDecimal fraction) {
        BigDecimal brief = fraction.movePointRight(2).stripTrailingZeros();
        return brief.signum() == 0 ? "0" : brief.toPlainString();
    }

    private static String exponent(BigDecimal fraction) {
        BigDecimal brief = fraction.stripTrailingZeros();
        int exponent = brief.precision() - brief.scale() - 1;
        return String.format(Locale.ROOT, "%se%d", brief.scaleByPowerOfTen(-exponent).toPlainString(), exponent);
    }
}
