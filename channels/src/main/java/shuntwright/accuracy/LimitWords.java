package shuntwright.accuracy;

import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;

/** Ranges of currents in words; where there is no limit they say so instead of a number. */
public final class LimitWords {

    /** A sum or difference with a current that stands for none may be less than {@link ChannelAccuracy#BEYOND}. */
    private static final double NONE = ChannelAccuracy.BEYOND / 10;

    private LimitWords() {
    }

    /** True where the number stands for no limit at all, or comes of one that does. */
    public static boolean none(double current) {
        return Math.abs(current) > NONE;
    }

    /**
     * "24.51 .. 31.2 A", "24.51 A .. thermal runaway", or "no limits" where calibration cannot give any.
     *
     * @param digits at most
     */
    public static String show(Range range, int digits) {
        if (!none(range.max())) {
            return QuantityWriter.show(range, Dimension.CURRENT, digits);
        }
        if (range.min() < -NONE) {
            return "no limits";
        }
        return none(range.min())
                ? "thermal runaway"
                : QuantityWriter.show(range.min(), Dimension.CURRENT, digits) + " .. thermal runaway";
    }
}
