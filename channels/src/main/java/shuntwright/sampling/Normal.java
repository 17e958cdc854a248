package shuntwright.sampling;

import org.hipparchus.distribution.continuous.NormalDistribution;

/** Quantiles and probabilities of the standard normal distribution, fast enough to be taken for every trial. */
final class Normal {

    /** Beyond every quantile of a 32-bit number, and of a sum of such. */
    private static final double REACH = 9;
    private static final int CELLS = 1800;
    private static final double CELL = REACH / CELLS;
    private static final double[] BELOW = new double[CELLS + 1];
    private static final double[] SLOPES = new double[CELLS + 1];

    static {
        NormalDistribution exact = new NormalDistribution(0, 1);
        for (int i = 0; i <= CELLS; i++) {
            BELOW[i] = exact.cumulativeProbability(-i * CELL);
            SLOPES[i] = -CELL * exact.density(i * CELL);
        }
    }

    private Normal() {
    }

    /**
     * The quantile of {@code p} to about 16 digits (M. J. Wichura, algorithm AS 241, PPND16, Applied Statistics 37, 1988).
     *
     * @param p above 0 to below 1
     */
    static double quantile(double p) {
        double q = p - 0.5;
        if (Math.abs(q) <= 0.425) {
            double r = 0.180625 - q * q;
            return q * (((((((2509.0809287301226727 * r + 33430.575583588128105) * r + 67265.770927008700853) * r
                    + 45921.953931549871457) * r + 13731.693765509461125) * r + 1971.5909503065514427) * r
                    + 133.14166789178437745) * r + 3.387132872796366608)
                    / (((((((5226.495278852545925 * r + 28729.085735721942674) * r + 39307.89580009271061) * r
                            + 21213.794301586595867) * r + 5394.1960214247511077) * r + 687.1870074920579083) * r
                            + 42.313330701600911252) * r + 1);
        }
        double r = Math.sqrt(-Math.log(q < 0 ? p : 1 - p));
        double z;
        if (r <= 5) {
            r -= 1.6;
            z = (((((((7.7454501427834140764e-4 * r + 0.0227238449892691845833) * r + 0.24178072517745061177) * r
                    + 1.27045825245236838258) * r + 3.64784832476320460504) * r + 5.7694972214606914055) * r
                    + 4.6303378461565452959) * r + 1.42343711074968357734)
                    / (((((((1.05075007164441684324e-9 * r + 5.475938084995344946e-4) * r
                            + 0.0151986665636164571966) * r + 0.14810397642748007459) * r + 0.68976733498510000455)
                            * r + 1.6763848301838038494) * r + 2.05319162663775882187) * r + 1);
        } else {
            r -= 5;
            z = (((((((2.01033439929228813265e-7 * r + 2.71155556874348757815e-5) * r + 0.0012426609473880784386)
                    * r + 0.026532189526576123093) * r + 0.29656057182850489123) * r + 1.7848265399172913358) * r
                    + 5.4637849111641143699) * r + 6.6579046435011037772)
                    / (((((((2.04426310338993978564e-15 * r + 1.4215117583164458887e-7) * r
                            + 1.8463183175100546818e-5) * r + 7.868691311456132591e-4) * r + 0.0148753612908506148525)
                            * r + 0.13692988092273580531) * r + 0.59983220655588793769) * r + 1);
        }
        return q < 0 ? -z : z;
    }

    /** The probability of a value below {@code z}, by cubic Hermite interpolation of exact values; error below 10⁻¹¹ (tested). */
    static double probability(double z) {
        double at = Math.abs(z) / CELL;
        double tail = 0;
        if (at < CELLS) {
            int i = (int) at;
            double t = at - i;
            double s = 1 - t;
            tail = s * s * ((1 + 2 * t) * BELOW[i] + t * SLOPES[i])
                    + t * t * ((1 + 2 * s) * BELOW[i + 1] - s * SLOPES[i + 1]);
        }
        return z < 0 ? tail : 1 - tail;
    }
}
