package shuntwright.sampling;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.distribution.continuous.TDistribution;

/**
 * Quantiles of t as a function of the normal quantile of the same probability, which is smooth: cubic Hermite interpolation
 * between exact values and slopes. The relative error is below 10⁻⁸ (tested).
 */
final class StudentTable {

    /** Beyond every normal quantile of a 32-bit number. */
    private static final double REACH = 6.5;
    private static final int CELLS = 1300;
    private static final double CELL = REACH / CELLS;
    private static final NormalDistribution NORMAL = new NormalDistribution(0, 1);
    private static final Map<Double, StudentTable> KNOWN = new ConcurrentHashMap<>();

    private final TDistribution exact;
    private final double[] values = new double[CELLS + 1];
    private final double[] slopes = new double[CELLS + 1];

    private StudentTable(double degrees) {
        exact = new TDistribution(degrees);
        for (int i = 0; i <= CELLS; i++) {
            double z = i * CELL;
            values[i] = i == 0 ? 0 : exactly(z);
            slopes[i] = CELL * NORMAL.density(z) / exact.density(values[i]);
        }
    }

    /** By the lower tail, where small probabilities keep their digits; a step of Newton's method brings those of small quantiles. */
    private double exactly(double z) {
        double p = NORMAL.cumulativeProbability(-z);
        double about = exact.inverseCumulativeProbability(p);
        return (exact.cumulativeProbability(about) - p) / exact.density(about) - about;
    }

    static StudentTable of(double degrees) {
        return KNOWN.computeIfAbsent(degrees, StudentTable::new);
    }

    /** The quantile of t for the probability of which {@code z} is the normal quantile. */
    double quantile(double z) {
        double at = Math.abs(z) / CELL;
        if (!(at < CELLS)) {
            return Math.copySign(exactly(Math.abs(z)), z);
        }
        int i = (int) at;
        double t = at - i;
        double s = 1 - t;
        double value = s * s * ((1 + 2 * t) * values[i] + t * slopes[i])
                + t * t * ((1 + 2 * s) * values[i + 1] - s * slopes[i + 1]);
        return Math.copySign(value, z);
    }
}
