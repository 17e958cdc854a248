package shuntwright.sampling;

import java.util.ArrayList;
import java.util.List;

import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.quantity.Range;

/**
 * Counts the trials of one output: moments, and a histogram of 65,536 cells over 24 standard deviations from which quantiles are
 * read with an error far below that of sampling. Nothing is sorted and no trial is kept.
 */
final class Tally {

    private static final int CELLS = 1 << 16;
    private static final double HALF_REACH = 12;
    /** Cells of the histogram that is handed out. */
    private static final int DRAWN_CELLS = 120;

    private final double centre;
    private final double low;
    private final double width;
    private final int[] counts = new int[CELLS];
    private long trials;
    private long values;
    private double sum;
    private double squares;
    private double least = Double.POSITIVE_INFINITY;
    private double most = Double.NEGATIVE_INFINITY;

    /**
     * @param centre   about the mean
     * @param standard about the standard deviation; 0 for an output that does not move
     */
    Tally(double centre, double standard) {
        double unit = standard > 0 ? standard : Math.max(Math.abs(centre) * 1e-12, Double.MIN_NORMAL);
        this.centre = centre;
        this.low = centre - HALF_REACH * unit;
        this.width = 2 * HALF_REACH * unit / CELLS;
    }

    /** An empty one with the same cells. */
    Tally another() {
        return new Tally(centre, width * CELLS / (2 * HALF_REACH));
    }

    /** Counts a block. */
    void add(double[] y, int count) {
        double perWidth = 1 / width;
        double first = 0;
        double second = 0;
        double min = least;
        double max = most;
        long there = 0;
        for (int j = 0; j < count; j++) {
            double value = y[j];
            double away = value - centre;
            if (!(Math.abs(away) < Double.POSITIVE_INFINITY)) {
                continue;
            }
            there++;
            first += away;
            second += away * away;
            min = Math.min(min, value);
            max = Math.max(max, value);
            int cell = (int) ((value - low) * perWidth);
            counts[Math.min(CELLS - 1, Math.max(0, cell))]++;
        }
        least = min;
        most = max;
        sum += first;
        squares += second;
        values += there;
        trials += count;
    }

    /** Adds what another with the same cells has counted. */
    void add(Tally other) {
        for (int i = 0; i < CELLS; i++) {
            counts[i] += other.counts[i];
        }
        trials += other.trials;
        values += other.values;
        sum += other.sum;
        squares += other.squares;
        least = Math.min(least, other.least);
        most = Math.max(most, other.most);
    }

    long trials() {
        return trials;
    }

    /** Trials that have no value. */
    long runaways() {
        return trials - values;
    }

    double mean() {
        return values == 0 ? Double.POSITIVE_INFINITY : centre + sum / values;
    }

    double standard() {
        if (values < 2) {
            return 0;
        }
        return Math.sqrt(Math.max(0, (squares - sum * sum / values) / (values - 1)));
    }

    /** The value below which {@code rank} of the trials lie; trials without a value lie above all others. */
    double atRank(double rank) {
        if (rank <= 0 || values == 0) {
            return values == 0 ? Double.POSITIVE_INFINITY : least;
        }
        if (rank >= values) {
            return rank > values ? Double.POSITIVE_INFINITY : most;
        }
        double below = 0;
        int cell = 0;
        while (below + counts[cell] < rank) {
            below += counts[cell++];
        }
        return within(cell, (rank - below) / counts[cell]);
    }

    /** A place within a cell; the outermost cells also hold what lies beyond them. */
    private double within(int cell, double share) {
        double from = cell == 0 ? least : Math.max(least, low + cell * width);
        double to = cell == CELLS - 1 ? most : Math.min(most, low + (cell + 1) * width);
        return from + share * (to - from);
    }

    /** Probabilistically symmetric (JCGM 101:2008, 7.7.2); the errors are those of the two ranks. */
    CoverageInterval symmetric(double coverage) {
        double tail = (1 - coverage) / 2;
        double rank = tail * trials;
        double slip = Math.sqrt(rank * (1 - tail));
        double other = trials - rank;
        Range range = range(atRank(rank), atRank(other));
        return new CoverageInterval(range, new CoverageInterval.Ends(error(rank, slip), error(other, slip)));
    }

    private double error(double rank, double slip) {
        double from = atRank(Math.max(0, rank - slip));
        double to = atRank(Math.min((double) values, rank + slip));
        return Math.abs(finite(to) - finite(from)) / 2;
    }

    /** Shortest (JCGM 101:2008, 7.7.4): of all intervals that hold this many trials the one of least width. */
    Range shortest(double coverage) {
        double inside = coverage * trials;
        if (inside > (double) values) {
            return range(least, Double.POSITIVE_INFINITY);
        }
        double bestFrom = least;
        double bestTo = atRank(inside);
        double below = 0;
        int to = 0;
        double belowTo = 0;
        for (int from = 0; from < CELLS && below + inside <= values; from++) {
            if (counts[from] > 0) {
                double end = below + inside;
                while (to < CELLS - 1 && belowTo + counts[to] < end) {
                    belowTo += counts[to++];
                }
                double start = within(from, 0);
                double stop = counts[to] == 0 ? within(to, 0) : within(to, Math.min(1, (end - belowTo) / counts[to]));
                if (stop - start < bestTo - bestFrom) {
                    bestFrom = start;
                    bestTo = stop;
                }
            }
            below += counts[from];
        }
        return range(bestFrom, bestTo);
    }

    /** Thermal runaway is a current beyond any board, so that it stays a number. */
    static double finite(double value) {
        return Math.min(value, NO_VALUE);
    }

    /** Stands for the current of a trial without one, A. */
    static final double NO_VALUE = ChannelAccuracy.BEYOND;

    private static Range range(double low, double high) {
        return Range.of(finite(low), Math.max(finite(low), finite(high)));
    }

    Histogram histogram() {
        if (values == 0) {
            return new Histogram(Range.exactly(0), List.of(), trials);
        }
        int first = 0;
        int last = CELLS - 1;
        while (counts[first] == 0) {
            first++;
        }
        while (counts[last] == 0) {
            last--;
        }
        int per = Math.max(1, (last - first + DRAWN_CELLS) / DRAWN_CELLS);
        List<Long> drawn = new ArrayList<>();
        for (int from = first; from <= last; from += per) {
            long there = 0;
            for (int i = from; i < Math.min(CELLS, from + per); i++) {
                there += counts[i];
            }
            drawn.add(there);
        }
        double from = low + first * width;
        return new Histogram(Range.of(from, from + drawn.size() * per * width), drawn, trials);
    }
}
