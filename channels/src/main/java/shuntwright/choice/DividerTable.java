package shuntwright.choice;

import java.util.Arrays;

import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

/**
 * All pairs of one resistor series as dividers, sorted by ratio R_b/(R_t + R_b), so that the best pair is found by
 * searching outwards from the wanted ratio and none is overlooked.
 */
final class DividerTable {

    /** Smallest and largest total of a pair, Ω; above a megohm leakage on the board decides (common practice). */
    static final Range TOTAL = Range.of(500, 1e6);
    /** Smallest single value, Ω: below it the copper of the board counts (common practice). */
    private static final double SMALLEST = 47;
    private static final int INDEX_BITS = 21;
    private static final long INDEX_MASK = (1L << INDEX_BITS) - 1;

    private final double[] values;
    private final double[] ratios;
    private final int[] pairs;

    private DividerTable(double[] values, double[] ratios, int[] pairs) {
        this.values = values;
        this.ratios = ratios;
        this.pairs = pairs;
    }

    /** All pairs of preferred values within {@code made}, Ω. */
    static DividerTable of(ESeries series, Range made) {
        double least = Math.max(made.min(), SMALLEST);
        double most = Math.min(made.max(), TOTAL.max());
        double[] values = least <= most ? series.within(Range.of(least, most)) : new double[0];
        int n = values.length;
        long[] keys = new long[n * n];
        int count = 0;
        for (int top = 0; top < n; top++) {
            for (int bottom = 0; bottom < n; bottom++) {
                double total = values[top] + values[bottom];
                if (TOTAL.contains(total)) {
                    long bits = Double.doubleToLongBits(values[bottom] / total);
                    keys[count++] = (bits & ~INDEX_MASK) | ((long) top * n + bottom);
                }
            }
        }
        Arrays.sort(keys, 0, count);
        double[] ratios = new double[count];
        int[] pairs = new int[count];
        for (int i = 0; i < count; i++) {
            pairs[i] = (int) (keys[i] & INDEX_MASK);
            double bottom = values[pairs[i] % n];
            ratios[i] = bottom / (values[pairs[i] / n] + bottom);
        }
        return new DividerTable(values, ratios, pairs);
    }

    int size() {
        return ratios.length;
    }

    double ratio(int index) {
        return ratios[index];
    }

    double top(int index) {
        return values[pairs[index] / values.length];
    }

    double bottom(int index) {
        return values[pairs[index] % values.length];
    }

    /** The values that stand in the table, ascending, Ω; a copy. */
    double[] values() {
        return values.clone();
    }

    /** Index of the first pair whose ratio is not below {@code ratio}; the size when there is none. */
    int from(double ratio) {
        int low = 0;
        int high = ratios.length;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (ratios[middle] < ratio) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** True when some pair's ratio lies in the interval. */
    boolean has(double least, double most) {
        int at = from(least);
        return at < ratios.length && ratios[at] <= most;
    }
}
