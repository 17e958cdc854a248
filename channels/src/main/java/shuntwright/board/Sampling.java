package shuntwright.board;

/**
 * How a propagated distribution is sampled (JCGM 101:2008). The same board, seed and trials give the same numbers to the last
 * digit on any number of threads.
 *
 * @param trials fixed number or adaptive
 * @param seed   of all draws
 */
public record Sampling(Trials trials, long seed) {

    /** Fewest trials of a fixed number. */
    public static final int LEAST = 10_000;
    /** Most trials of one channel. */
    public static final int MOST = 100_000_000;

    /** A million trials (JCGM 101, 7.2.2: often enough for 95 %), seed 1. */
    public static final Sampling DEFAULT = new Sampling(new Trials.Fixed(1_000_000), 1);

    /** How many trials. */
    public sealed interface Trials {

        /** At most so many of each channel. */
        default int atMost() {
            return switch (this) {
                case Fixed(int count) -> count;
                case Adaptive(int _, int most) -> most;
            };
        }

        /** @param count of each channel, 10,000 to 100 million */
        record Fixed(int count) implements Trials {
            /** @throws IllegalArgumentException unless count is within the range */
            public Fixed {
                check(count);
            }
        }

        /**
         * Until the results are stable in the statistical sense (JCGM 101, 7.9).
         *
         * @param digits significant digits of the standard uncertainty that must be stable, 1 or 2
         * @param most   trials after which it ends in any case
         */
        record Adaptive(int digits, int most) implements Trials {
            /** @throws IllegalArgumentException unless digits is 1 or 2 and most is within the range */
            public Adaptive {
                if (digits != 1 && digits != 2) {
                    throw new IllegalArgumentException("digits must be 1 or 2, got " + digits);
                }
                check(most);
            }
        }
    }

    private static void check(int count) {
        if (count < LEAST || count > MOST) {
            throw new IllegalArgumentException("trials must be from " + LEAST + " to " + MOST + ", got " + count);
        }
    }
}
