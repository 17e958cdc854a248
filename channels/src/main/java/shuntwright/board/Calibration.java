package shuntwright.board;

import java.util.OptionalDouble;

import shuntwright.quantity.Range;

/**
 * Calibration of a channel's reading at production: firmware constants are set so that the reading equals the current injected.
 * It removes what is the same at calibration and in service; drift, ageing, changed supply and rail, and its own uncertainty stay.
 *
 * @param points      one point corrects the gain, two correct gain and offset
 * @param lower       current of the first of two points, A; empty for a tenth of the upper; unused with one point
 * @param upper       current of the only or second point, A; empty for the load current
 * @param uncertainty limit of the relative error of the injected current, a fraction; one draw for both points of a channel
 * @param temperature at which production calibrates, °C
 */
public record Calibration(Points points, OptionalDouble lower, OptionalDouble upper, double uncertainty,
        Range temperature) {

    /** A production hall (common practice). */
    public static final Range DEFAULT_TEMPERATURE = Range.of(20, 30);

    /** How many currents are injected. */
    public enum Points {
        ONE, TWO
    }

    /** @throws IllegalArgumentException unless currents are &gt; 0, lower is below upper and the uncertainty is 0 to below 1 */
    public Calibration {
        boolean positive = lower.orElse(1) > 0 && upper.orElse(1) > 0;
        boolean ordered = lower.isEmpty() || upper.isEmpty() || lower.getAsDouble() < upper.getAsDouble();
        if (!positive || !ordered || !(uncertainty >= 0 && uncertainty < 1)) {
            throw new IllegalArgumentException("a calibration needs currents > 0, the lower below the upper, and an "
                    + "uncertainty from 0 to below 1, got " + lower + ", " + upper + ", " + uncertainty);
        }
    }

    /** Current of the only or second point, A. */
    public double upperCurrent(double load) {
        return upper.orElse(load);
    }

    /** Current of the first of two points, A. */
    public double lowerCurrent(double load) {
        return lower.orElse(upperCurrent(load) / 10);
    }
}
