package shuntwright.sampling;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;

/** The raw numbers of one block of one stream: signed words, each value equally probable. One object for each thread. */
public final class Draws {

    /** Trials of one block. */
    public static final int BLOCK = 1024;

    private static final int HALF = Threefry.HALF;
    /** Width of a step of a 32-bit number as a share of the whole. */
    private static final double STEP = 0x1p-32;

    private final int[] low = new int[HALF];
    private final int[] high = new int[HALF];

    /** The key of a stream: a hash of seed and name, so that different names have unrelated streams. */
    static long key(long seed, String name) {
        try {
            byte[] hash = MessageDigest.getInstance("SHA-256")
                    .digest((seed + "\n" + name).getBytes(StandardCharsets.UTF_8));
            long key = 0;
            for (int i = 0; i < Long.BYTES; i++) {
                key = (key << 8) | (hash[i] & 0xFF);
            }
            return key;
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    /** Draws a block of numbers equally distributed over {@code from} .. {@code from + width}, ends excluded. */
    void uniform(long key, int block, int stream, double from, double width, double[] into) {
        Threefry.fill(key, block, stream, low, high);
        double scale = width * STEP;
        double offset = from + width / 2 + scale / 2;
        scaled(low, offset, scale, into, 0);
        scaled(high, offset, scale, into, HALF);
    }

    private static void scaled(int[] words, double offset, double scale, double[] into, int at) {
        for (int j = 0; j < HALF; j++) {
            into[at + j] = offset + scale * words[j];
        }
    }

    /** Puts the other number in place of its own with a given probability. */
    void choose(long key, int block, int stream, double probability, double[] other, double[] own) {
        Threefry.fill(key, block, stream, low, high);
        // Signed words: those below this one are the wanted share of all; halves keep the difference within a word.
        int below = (int) Math.rint((probability - 0.5) * 0x1p31);
        chosen(low, below, other, own, 0);
        chosen(high, below, other, own, HALF);
    }

    private static void chosen(int[] words, int below, double[] other, double[] own, int at) {
        for (int j = 0; j < HALF; j++) {
            words[j] = ((words[j] >> 1) - below) >>> 31;
        }
        for (int j = 0; j < HALF; j++) {
            own[at + j] += (other[at + j] - own[at + j]) * words[j];
        }
    }
}
