package shuntwright.sampling;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Whether the results of one output are stable in the statistical sense (JCGM 101:2008, 7.9.4): mean, standard deviation and both
 * ends of the coverage interval are taken of each sequence of trials; twice the standard deviation of the average of each must not
 * exceed the numerical tolerance of the standard deviation of all.
 */
final class Stability {

    private final double coverage;
    private final int digits;
    private final List<double[]> sequences = new ArrayList<>();

    Stability(double coverage, int digits) {
        this.coverage = coverage;
        this.digits = digits;
    }

    /** Trials of one sequence: max(J, 10⁴), J the least whole number ≥ 100/(1 − p). */
    static long sequence(double coverage) {
        return (long) Math.max(10_000, Math.ceil(100 / (1 - coverage) * (1 - 1e-12)));
    }

    /** @param values of one sequence, all finite; sorted here */
    void add(double[] values) {
        double mean = Arrays.stream(values).average().orElse(0);
        double squares = 0;
        for (double value : values) {
            squares += (value - mean) * (value - mean);
        }
        Arrays.sort(values);
        int m = values.length;
        int inside = (int) Math.floor(coverage * m + 0.5);
        int below = (m - inside + 1) / 2;
        sequences.add(new double[]{mean, Math.sqrt(squares / (m - 1)), values[Math.max(0, below - 1)],
                values[Math.min(m - 1, below + inside - 1)]});
    }

    /** @param standard of all trials so far */
    boolean stable(double standard) {
        int h = sequences.size();
        if (h < 2) {
            return false;
        }
        double tolerance = Tolerances.of(standard, digits);
        for (int figure = 0; figure < 4; figure++) {
            double mean = 0;
            for (double[] each : sequences) {
                mean += each[figure] / h;
            }
            double squares = 0;
            for (double[] each : sequences) {
                squares += (each[figure] - mean) * (each[figure] - mean);
            }
            if (2 * Math.sqrt(squares / (h * (h - 1.0))) > tolerance) {
                return false;
            }
        }
        return true;
    }
}
