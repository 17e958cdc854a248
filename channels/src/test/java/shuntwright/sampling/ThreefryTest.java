package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.hipparchus.distribution.continuous.ChiSquaredDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** The generator against known answers, and its numbers against what independent uniform ones would do. */
class ThreefryTest {

    private static final int HALF = Threefry.HALF;
    private static final int[] ROTATIONS = {13, 15, 26, 6, 17, 29, 16, 24};

    /** Written from the definition for any number of rounds: Salmon et al. 2011, section 4.2, table 2 (two 32-bit words). */
    private static int[] threefry(int rounds, int first, int second, int key0, int key1) {
        int[] keys = {key0, key1, 0x1BD11BDA ^ key0 ^ key1};
        int a = first + keys[0];
        int b = second + keys[1];
        for (int round = 0; round < rounds; round++) {
            a += b;
            b = Integer.rotateLeft(b, ROTATIONS[round % 8]) ^ a;
            if (round % 4 == 3) {
                int injection = round / 4 + 1;
                a += keys[injection % 3];
                b += keys[(injection + 1) % 3] + injection;
            }
        }
        return new int[]{a, b};
    }

    private static int word(String hex) {
        return Integer.parseUnsignedInt(hex, 16);
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/known-answers.csv", delimiter = ';', useHeadersInDisplayName = true)
    void definitionAndBlocksGiveTheKnownAnswers(int rounds, String counter0, String counter1, String key0, String key1,
            String first, String second) {
        assertThat(threefry(rounds, word(counter0), word(counter1), word(key0), word(key1))).containsExactly(
                word(first),
                word(second));
        if (rounds == 13) {
            int[] low = new int[HALF];
            int[] high = new int[HALF];
            int counter = word(counter0);
            long key = (long) word(key1) << 32 | Integer.toUnsignedLong(word(key0));
            Threefry.fill(key, Math.floorDiv(counter, HALF), word(counter1), low, high);
            int at = Math.floorMod(counter, HALF);
            assertThat(low[at]).isEqualTo(word(first));
            assertThat(high[at]).isEqualTo(word(second));
        }
    }

    @Test
    void blocksAreTheDefinitionEverywhere() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(3);
        int[] low = new int[HALF];
        int[] high = new int[HALF];
        for (int i = 0; i < 300; i++) {
            long key = random.nextLong();
            int block = random.nextInt(1 << 20);
            int stream = random.nextInt();
            Threefry.fill(key, block, stream, low, high);
            for (int j = 0; j < HALF; j++) {
                int[] expected = threefry(13, block * HALF + j, stream, (int) key, (int) (key >>> 32));
                if (low[j] != expected[0] || high[j] != expected[1]) {
                    assertThat(new int[]{low[j], high[j]}).as("key %x block %d place %d", key, block, j)
                            .containsExactly(expected);
                }
            }
        }
    }

    private static double[] column(long key, int block, int stream) {
        double[] column = new double[Draws.BLOCK];
        new Draws().uniform(key, block, stream, 0, 1, column);
        return column;
    }

    /** The probability that a right generator is this far out or further is 10⁻⁶ on either side. */
    private static void checkChiSquare(long[] counts, double expected, String what) {
        double sum = 0;
        for (long count : counts) {
            sum += (count - expected) * (count - expected) / expected;
        }
        ChiSquaredDistribution law = new ChiSquaredDistribution(counts.length - 1.0);
        assertThat(sum).as(what).isBetween(law.inverseCumulativeProbability(1e-6),
                law.inverseCumulativeProbability(1 - 1e-6));
    }

    @Test
    void numbersAreEquallyDistributed() {
        int blocks = 1000;
        long[] counts = new long[500];
        for (int block = 0; block < blocks; block++) {
            for (double value : column(Draws.key(1, "x"), block, 0)) {
                counts[(int) (value * counts.length)]++;
            }
        }
        checkChiSquare(counts, blocks * (double) Draws.BLOCK / counts.length, "one column");
    }

    @Test
    void neighboursAreIndependent() {
        int blocks = 1000;
        for (int lag : new int[]{1, 2, HALF - 1}) {
            long[] counts = new long[400];
            for (int block = 0; block < blocks; block++) {
                double[] column = column(Draws.key(2, "x"), block, 0);
                // Pairs that do not overlap.
                for (int j = 0; j + lag < column.length; j += 2 * lag) {
                    for (int i = j; i < Math.min(j + lag, column.length - lag); i++) {
                        counts[((int) (column[i] * 20)) * 20 + (int) (column[i + lag] * 20)]++;
                    }
                }
            }
            long pairs = 0;
            for (long count : counts) {
                pairs += count;
            }
            assertThat(pairs).isGreaterThan(400_000);
            checkChiSquare(counts, pairs / 400.0, "pairs at lag " + lag);
        }
    }

    /** The two words of one counter stand in the two halves of a block. */
    @Test
    void wordsOfOneCounterAreIndependent() {
        int blocks = 1000;
        long[] counts = new long[400];
        for (int block = 0; block < blocks; block++) {
            double[] column = column(Draws.key(3, "x"), block, 0);
            for (int j = 0; j < HALF; j++) {
                counts[((int) (column[j] * 20)) * 20 + (int) (column[HALF + j] * 20)]++;
            }
        }
        checkChiSquare(counts, blocks * (double) HALF / 400, "words of one counter");
    }

    @Test
    void columnsOfLikeKeysStreamsAndSeedsAreUncorrelated() {
        long key = Draws.key(1, "x");
        for (int bit = 0; bit < Long.SIZE; bit++) {
            checkUncorrelated(key, 0, key ^ 1L << bit, 0);
        }
        for (int stream = 1; stream < 20; stream++) {
            checkUncorrelated(key, 0, key, stream);
        }
        for (int seed = 2; seed < 20; seed++) {
            checkUncorrelated(key, 0, Draws.key(seed, "x"), 0);
            checkUncorrelated(key, 0, Draws.key(1, "x" + seed), 0);
        }
    }

    /** Correlation coefficient of 64 blocks: standard error 1/√65536 = 0.0039, five of them allowed in some 120 tries. */
    private static void checkUncorrelated(long key, int stream, long otherKey, int otherStream) {
        int blocks = 64;
        double sum = 0;
        for (int block = 0; block < blocks; block++) {
            double[] a = column(key, block, stream);
            double[] b = column(otherKey, block, otherStream);
            for (int j = 0; j < a.length; j++) {
                sum += 12 * (a[j] - 0.5) * (b[j] - 0.5);
            }
        }
        double n = blocks * (double) Draws.BLOCK;
        assertThat(sum / n).as("key %x stream %d with key %x stream %d", key, stream, otherKey, otherStream)
                .isCloseTo(0, within(5 / Math.sqrt(n)));
    }

    @Test
    void eachNumberIsInsideItsLimits() {
        double[] column = new double[Draws.BLOCK];
        for (int block = 0; block < 2000; block++) {
            new Draws().uniform(Draws.key(5, "x"), block, 0, 2, 0.5, column);
            for (double value : column) {
                if (!(value > 2 && value < 2.5)) {
                    assertThat(value).isStrictlyBetween(2.0, 2.5);
                }
            }
        }
    }

    @Test
    void seedAndNameMakeTheKey() {
        assertThat(Draws.key(1, "x")).isEqualTo(Draws.key(1, "x")).isNotEqualTo(Draws.key(2, "x"))
                .isNotEqualTo(Draws.key(1, "y"));
        // First eight bytes of SHA-256 of the text "1", line feed, "x", computed with another tool.
        assertThat(Draws.key(1, "x")).isEqualTo(KEY_OF_1_X);
    }

    private static final long KEY_OF_1_X = 0x16c10dfd2a1bf252L;
}
