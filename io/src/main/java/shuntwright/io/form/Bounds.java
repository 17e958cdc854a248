package shuntwright.io.form;

import java.util.function.DoubleFunction;

import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/**
 * Which numbers are allowed.
 *
 * @param least       lower end; -∞ for none
 * @param withLeast   whether the lower end itself is allowed
 * @param most        upper end; +∞ for none
 * @param withMost    whether the upper end itself is allowed
 */
public record Bounds(double least, boolean withLeast, double most, boolean withMost) {
    public static final Bounds ANY = new Bounds(Double.NEGATIVE_INFINITY, false, Double.POSITIVE_INFINITY, false);
    public static final Bounds POSITIVE = new Bounds(0, false, Double.POSITIVE_INFINITY, false);
    public static final Bounds NOT_NEGATIVE = new Bounds(0, true, Double.POSITIVE_INFINITY, false);
    /** From 0 to below 1. */
    public static final Bounds BELOW_ONE = new Bounds(0, true, 1, false);
    /** From 0 to 1. */
    public static final Bounds SHARE = new Bounds(0, true, 1, true);
    /** Above 0 to below 1. */
    public static final Bounds BETWEEN_ZERO_AND_ONE = new Bounds(0, false, 1, false);
    /** Above 0 to 1. */
    public static final Bounds POSITIVE_SHARE = new Bounds(0, false, 1, true);

    public boolean allow(double value) {
        return (withLeast ? value >= least : value > least) && (withMost ? value <= most : value < most);
    }

    /** In words, for example "above 0 A" or "from 0 % to below 100 %"; empty when any number will do. */
    String words(Dimension dimension) {
        return words(value -> QuantityWriter.show(value, dimension));
    }

    /** The same for numbers without a unit. */
    String plainWords() {
        return words(value -> value == Math.rint(value) ? String.valueOf(Math.round(value)) : String.valueOf(value));
    }

    private String words(DoubleFunction<String> show) {
        if (Double.isInfinite(least)) {
            return Double.isInfinite(most) ? "" : (withMost ? "up to " : "below ") + show.apply(most);
        }
        if (Double.isInfinite(most)) {
            return (withLeast ? "at least " : "above ") + show.apply(least);
        }
        return (withLeast ? "from " : "above ") + show.apply(least) + (withMost ? " to " : " to below ")
                + show.apply(most);
    }
}
