package shuntwright.sampling;

import java.util.List;

import shuntwright.quantity.Range;

/** Which trials were outside what is allowed: counted for each output, remembered one by one for all outputs together. */
final class OutsideTrials {

    private final double[] low;
    private final double[] high;
    private final long[] counts;
    private final long[] words;
    private final int most;
    private int remembered;
    private long any;

    OutsideTrials(List<Range> allowed, int most) {
        this.low = allowed.stream().mapToDouble(Range::min).toArray();
        this.high = allowed.stream().mapToDouble(Range::max).toArray();
        this.counts = new long[low.length];
        this.most = most;
        this.words = new long[(most + Draws.BLOCK) / Long.SIZE + 1];
    }

    /** Looks at a block of outputs. */
    void add(double[][] y, int count) {
        boolean[] outside = new boolean[count];
        for (int i = 0; i < y.length; i++) {
            counts[i] += mark(y[i], low[i], high[i], outside);
        }
        boolean room = remembered + count <= most;
        for (int j = 0; j < count; j++) {
            if (outside[j]) {
                any++;
                if (room) {
                    int at = remembered + j;
                    words[at / Long.SIZE] |= 1L << at;
                }
            }
        }
        remembered += room ? count : 0;
    }

    private static int mark(double[] y, double low, double high, boolean[] outside) {
        int count = 0;
        for (int j = 0; j < outside.length; j++) {
            boolean out = !(y[j] >= low && y[j] <= high);
            outside[j] |= out;
            count += out ? 1 : 0;
        }
        return count;
    }

    /** How often that output was outside. */
    long of(int output) {
        return counts[output];
    }

    /** How often any output was outside. */
    long any() {
        return any;
    }

    /** How many trials are remembered, from the first. */
    int remembered() {
        return remembered;
    }

    /** Word {@code index} of the remembered trials, 64 each. */
    long word(int index) {
        return words[index];
    }
}
