package shuntwright.planner.window.table;

import shuntwright.accuracy.Assessment;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;

/**
 * The trip interval inside its allowed window, on an axis on which every row's window has the same place: 0 is the
 * window's middle, -1 and 1 are its ends.
 *
 * @param limits   worst case
 * @param coverage coverage interval
 * @param nominal  with every input nominal
 * @param lower    lower limit in words
 * @param upper    upper limit in words
 * @param words    everything in words
 */
record TripDrawing(Range limits, Range coverage, double nominal, String lower, String upper, String words)
        implements
            Comparable<TripDrawing> {
    /** Half of the axis, in half-widths of the window; what lies beyond is cut off at the end. */
    static final double SPAN = 1.5;

    static TripDrawing of(Assessment trip) {
        Range allowed = trip.allowed();
        String words = "Trips between " + show(trip.limits().min()) + " and " + show(trip.limits().max())
                + " (coverage interval " + show(trip.coverage().min()) + " to "
                + show(trip.coverage().max()) + ", nominal " + show(trip.nominal()) + "); allowed are "
                + show(allowed.min()) + " to " + show(allowed.max()) + ".";
        return new TripDrawing(share(trip.limits(), allowed), share(trip.coverage(), allowed),
                share(trip.nominal(), allowed), show(trip.limits().min()), show(trip.limits().max()), words);
    }

    private static Range share(Range range, Range allowed) {
        return Range.of(share(range.min(), allowed), share(range.max(), allowed));
    }

    private static double share(double value, Range allowed) {
        return (value - allowed.mid()) / (allowed.width() / 2);
    }

    private static String show(double current) {
        return QuantityWriter.show(current, Dimension.CURRENT, 3);
    }

    @Override
    public int compareTo(TripDrawing other) {
        return Double.compare(limits.width(), other.limits.width());
    }
}
