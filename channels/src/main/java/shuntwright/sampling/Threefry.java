package shuntwright.sampling;

/**
 * The counter-based generator Threefry-2x32 with 13 rounds (J. K. Salmon, M. A. Moraes, R. O. Dror, D. E. Shaw: Parallel random
 * numbers: as easy as 1, 2, 3; SC 2011): a number depends on key and counter only, so any part of any stream can be drawn by any
 * thread. Thirteen rounds are the fewest its authors found to pass all tests of BigCrush.
 *
 * <p>Loops over arrays of a block, four rounds each: the compiler turns these into vector instructions, but not one long loop.
 */
final class Threefry {

    /** Counters of one block; each gives two numbers. */
    static final int HALF = Draws.BLOCK / 2;

    private static final int PARITY = 0x1BD11BDA;

    private Threefry() {
    }

    /**
     * The numbers of one block.
     *
     * @param key    of the stream
     * @param block  from 0; the counters are block·{@link #HALF} and following
     * @param stream second word of the counter
     * @param low    first number of each counter, overwritten
     * @param high   second number of each counter, overwritten
     */
    static void fill(long key, int block, int stream, int[] low, int[] high) {
        int k0 = (int) key;
        int k1 = (int) (key >>> 32);
        int k2 = PARITY ^ k0 ^ k1;
        start(block * HALF + k0, stream + k1, low, high);
        even(low, high, k1, k2 + 1);
        odd(low, high, k2, k0 + 2);
        even(low, high, k0, k1 + 3);
        last(low, high);
    }

    private static void start(int first, int second, int[] low, int[] high) {
        for (int j = 0; j < HALF; j++) {
            low[j] = first + j;
            high[j] = second;
        }
    }

    private static void even(int[] low, int[] high, int addLow, int addHigh) {
        for (int j = 0; j < HALF; j++) {
            int a = low[j];
            int b = high[j];
            a += b;
            b = ((b << 13) | (b >>> 19)) ^ a;
            a += b;
            b = ((b << 15) | (b >>> 17)) ^ a;
            a += b;
            b = ((b << 26) | (b >>> 6)) ^ a;
            a += b;
            b = ((b << 6) | (b >>> 26)) ^ a;
            low[j] = a + addLow;
            high[j] = b + addHigh;
        }
    }

    private static void odd(int[] low, int[] high, int addLow, int addHigh) {
        for (int j = 0; j < HALF; j++) {
            int a = low[j];
            int b = high[j];
            a += b;
            b = ((b << 17) | (b >>> 15)) ^ a;
            a += b;
            b = ((b << 29) | (b >>> 3)) ^ a;
            a += b;
            b = ((b << 16) | (b >>> 16)) ^ a;
            a += b;
            b = ((b << 24) | (b >>> 8)) ^ a;
            low[j] = a + addLow;
            high[j] = b + addHigh;
        }
    }

    private static void last(int[] low, int[] high) {
        for (int j = 0; j < HALF; j++) {
            int a = low[j] + high[j];
            int b = high[j];
            low[j] = a;
            high[j] = ((b << 17) | (b >>> 15)) ^ a;
        }
    }
}
