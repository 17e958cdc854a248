package shuntwright.choice;

import java.util.Arrays;

/**
 * Combinations of shunts and an amplifier that respect every limit on their own and leave room for a threshold, by
 * ascending heat; structure of arrays.
 */
final class Candidates {

    private static final int START = 256;

    private int size;
    private int[] shunt = new int[START];
    private int[] amplifier = new int[START];
    private double[] edges = new double[4 * START];

    void add(int shuntTerm, int amplifierTerm, double low0, double high0, double low1, double high1) {
        if (size == shunt.length) {
            shunt = Arrays.copyOf(shunt, 2 * size);
            amplifier = Arrays.copyOf(amplifier, 2 * size);
            edges = Arrays.copyOf(edges, 8 * size);
        }
        shunt[size] = shuntTerm;
        amplifier[size] = amplifierTerm;
        edges[4 * size] = low0;
        edges[4 * size + 1] = high0;
        edges[4 * size + 2] = low1;
        edges[4 * size + 3] = high1;
        size++;
    }

    /** Forgets all of them. */
    void clear() {
        size = 0;
    }

    int size() {
        return size;
    }

    int shunt(int candidate) {
        return shunt[candidate];
    }

    int amplifier(int candidate) {
        return amplifier[candidate];
    }

    /** The threshold must not be below this at the given end of ambient, V. */
    double low(int candidate, int end) {
        return edges[4 * candidate + 2 * end];
    }

    /** The threshold must not be above this at the given end of ambient, V. */
    double high(int candidate, int end) {
        return edges[4 * candidate + 2 * end + 1];
    }
}
