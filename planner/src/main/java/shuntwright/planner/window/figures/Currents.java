package shuntwright.planner.window.figures;

import shuntwright.accuracy.LimitWords;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageInterval;

/** Currents in words. */
public final class Currents {
    private static final int DIGITS = 5;
    private static final int MOST = 9;

    private Currents() {
    }

    /** With five digits. */
    public static String show(double current) {
        return LimitWords.none(current) ? "thermal runaway" : QuantityWriter.show(current, Dimension.CURRENT, DIGITS);
    }

    /** An uncertainty or a difference, with three digits. */
    public static String small(double current) {
        return LimitWords.none(current) ? show(current) : QuantityWriter.show(current, Dimension.CURRENT, 3);
    }

    /** Both ends with five digits, "24.51 .. 31.2 A". */
    public static String show(Range range) {
        return LimitWords.show(range, DIGITS);
    }

    /** A sampled interval down to the first digit of its standard errors, "27.191 .. 28.012 A ± 4 mA" with the larger of both. */
    public static String show(CoverageInterval interval) {
        double low = interval.standardErrors().low();
        double high = interval.standardErrors().high();
        Range rounded = Range.of(rounded(interval.range().min(), low), rounded(interval.range().max(), high));
        return QuantityWriter.show(rounded, Dimension.CURRENT, MOST) + " ± "
                + error(Math.max(low, high));
    }

    /** Both standard errors, "3 mA and 4 mA". */
    public static String errors(CoverageInterval interval) {
        return error(interval.standardErrors().low()) + " and " + error(interval.standardErrors().high());
    }

    private static String error(double current) {
        return QuantityWriter.show(current, Dimension.CURRENT, 2);
    }

    /** To the first digit of the standard error, or to five digits without one. */
    private static double rounded(double value, double error) {
        double size = error > 0 ? error : Math.abs(value) * 1e-4;
        double unit = Math.pow(10, Math.floor(Math.log10(size)));
        double round = Math.rint(value / unit) * unit;
        return unit > 0 && Double.isFinite(round) ? round : value;
    }
}
