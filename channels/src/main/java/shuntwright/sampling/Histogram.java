package shuntwright.sampling;

import java.util.List;

import shuntwright.quantity.Range;

/**
 * Trials counted in cells of equal width.
 *
 * @param range  from the first cell to the last, A
 * @param counts of each cell; what lies beyond the range is in neither
 * @param trials all of them
 */
public record Histogram(Range range, List<Long> counts, long trials) {

    public Histogram {
        counts = List.copyOf(counts);
    }
}
