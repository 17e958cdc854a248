package shuntwright.sampling;

import shuntwright.quantity.Range;

/**
 * A coverage interval read from trials.
 *
 * @param range         A
 * @param standardErrors of its ends, A
 */
public record CoverageInterval(Range range, Ends standardErrors) {

    /**
     * Standard errors.
     *
     * @param low  of the lower end, A
     * @param high of the upper end, A
     */
    public record Ends(double low, double high) {}
}
