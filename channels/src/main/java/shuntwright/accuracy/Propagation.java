package shuntwright.accuracy;

import java.util.Arrays;
import java.util.List;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.distribution.continuous.TDistribution;

/**
 * Propagation of uncertainty by JCGM 100:2008, first order with correlation (eq. 13) and, where asked, the next terms of
 * the Taylor series (5.1.2, note); of correlated inputs these with their covariances, as they are for normal ones, where half a
 * quadratic form of matrix H has the variance ½·tr((HΣ)²) (A. M. Mathai, S. B. Provost, Quadratic Forms in Random Variables, 1992).
 *
 * <p>The next terms matter here: a drift multiplies a temperature difference whose expectation may be zero, so its first
 * order sensitivity is zero although its effect is not.
 */
public final class Propagation {

    /** Relative part of the last digit up to which an effective number of degrees of freedom counts as whole. */
    private static final double WHOLE = 1e-9;

    private final double value;
    private final double[] sensitivities;
    private final double[] variances;
    private final double variance;
    private final double effectiveDegrees;

    private Propagation(double value, double[] sensitivities, double[] variances, double variance,
            double effectiveDegrees) {
        this.value = value;
        this.sensitivities = sensitivities;
        this.variances = variances;
        this.variance = variance;
        this.effectiveDegrees = effectiveDegrees;
    }

    /** First order, independent inputs. */
    public static Propagation firstOrder(Equation f, List<Estimate> inputs) {
        return of(f, inputs, new double[0][], false);
    }

    /** With the next terms of the Taylor series, independent inputs. */
    public static Propagation secondOrder(Equation f, List<Estimate> inputs) {
        return of(f, inputs, new double[0][], true);
    }

    /** With the next terms of the Taylor series and correlation coefficients r[i][j], none if empty. */
    public static Propagation secondOrder(Equation f, List<Estimate> inputs, double[][] correlation) {
        return of(f, inputs, correlation, true);
    }

    /** First order with correlation coefficients r[i][j] (symmetric, ones on the diagonal). */
    public static Propagation correlated(Equation f, List<Estimate> inputs, double[][] correlation) {
        if (correlation.length != inputs.size()) {
            throw new IllegalArgumentException(
                    "the correlation matrix needs " + inputs.size() + " rows, got " + correlation.length);
        }
        return of(f, inputs, correlation, false);
    }

    private static Propagation of(Equation f, List<Estimate> inputs, double[][] correlation, boolean second) {
        int n = inputs.size();
        double[] x = new double[n];
        double[] u = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = inputs.get(i).value();
            u[i] = inputs.get(i).standard();
        }
        double[] c = new double[n];
        double y = f.gradient(x, c);
        double[] parts = new double[n];
        double fourth = 0;
        double first = 0;
        for (int i = 0; i < n; i++) {
            double ui = c[i] * u[i];
            parts[i] = ui * ui;
            first += ui * ui;
            fourth += parts[i] * parts[i] / inputs.get(i).degreesOfFreedom();
        }
        double cross = crossTerms(c, u, correlation, parts);
        double variance = first + cross;
        // The Welch-Satterthwaite formula is for the first order combination of independent inputs (G.4.1).
        double degrees = fourth > 0 ? first * first / fourth : Double.POSITIVE_INFINITY;
        if (second) {
            double[] next = nextTerms(f, x, u, c, correlation);
            for (int i = 0; i < n; i++) {
                parts[i] += next[i];
                variance += next[i];
            }
        }
        return new Propagation(y, c, parts, Math.max(0, variance), degrees);
    }

    /** The sum of 2·c_i·c_j·u_i·u_j·r_ij, of which each of the two inputs is given half. */
    private static double crossTerms(double[] c, double[] u, double[][] correlation, double[] parts) {
        double sum = 0;
        for (int i = 0; i < correlation.length; i++) {
            for (int j = i + 1; j < correlation.length; j++) {
                double half = c[i] * c[j] * u[i] * u[j] * correlation[i][j];
                parts[i] += half;
                parts[j] += half;
                sum += 2 * half;
            }
        }
        return sum;
    }

    /**
     * The terms [½ (∂²f/∂xi∂xj)² + ∂f/∂xi ∂³f/∂xi∂xj²] u²(xi) u²(xj), summed over j, by differences of the gradient over
     * ± u(xj).
     */
    private static double[] nextTerms(Equation f, double[] x, double[] u, double[] c, double[][] correlation) {
        int n = x.length;
        boolean correlated = correlation.length > 0;
        double[][] curvature = new double[correlation.length][correlation.length];
        double[] along = covariances(c, u, correlation);
        double[] terms = new double[n];
        double[] above = new double[n];
        double[] below = new double[n];
        double[] point = Arrays.copyOf(x, n);
        for (int j = 0; j < n; j++) {
            if (u[j] == 0) {
                continue;
            }
            point[j] = x[j] + u[j];
            f.gradient(point, above);
            point[j] = x[j] - u[j];
            f.gradient(point, below);
            point[j] = x[j];
            for (int i = 0; i < n; i++) {
                if (u[i] == 0) {
                    continue;
                }
                // Both differences already carry one factor of u(xj) each: h = u(xj).
                double mixed = (above[i] - below[i]) / 2;
                double third = above[i] - 2 * c[i] + below[i];
                terms[i] += 0.5 * mixed * mixed * u[i] * u[i] + third * u[i] * along[i];
                if (correlated) {
                    curvature[i][j] = mixed * u[i];
                }
            }
        }
        if (correlated) {
            addCovariances(curvature, correlation, terms);
        }
        return terms;
    }

    /** The covariance of the first order with each input, over u(xi): of independent inputs ∂f/∂xi·u(xi). */
    private static double[] covariances(double[] c, double[] u, double[][] correlation) {
        double[] along = new double[c.length];
        for (int i = 0; i < c.length; i++) {
            along[i] = c[i] * u[i];
            for (int j = 0; j < correlation.length; j++) {
                along[i] += j == i ? 0 : correlation[i][j] * c[j] * u[j];
            }
        }
        return along;
    }

    /** What ½·tr((MR)²) is more than ½·tr(M²), with M = ∂²f/∂xi∂xj·u(xi)·u(xj) and R the correlation. */
    private static void addCovariances(double[][] m, double[][] correlation, double[] terms) {
        int n = m.length;
        double[][] product = new double[n][];
        for (int i = 0; i < n; i++) {
            product[i] = m[i].clone();
        }
        for (int k = 0; k < n; k++) {
            for (int j = 0; j < n; j++) {
                double r = correlation[k][j];
                if (j != k && r != 0) {
                    for (int i = 0; i < n; i++) {
                        product[i][j] += m[i][k] * r;
                    }
                }
            }
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                terms[i] += 0.5 * (product[i][j] * product[j][i] - m[i][j] * m[j][i]);
            }
        }
    }

    /** y = f(expectations). */
    public double value() {
        return value;
    }

    /** u_c(y). */
    public double standard() {
        return Math.sqrt(variance);
    }

    /** ν_eff (eq. G.2b), infinite when every input's is. */
    public double effectiveDegreesOfFreedom() {
        return effectiveDegrees;
    }

    /** ∂f/∂xi. */
    public double sensitivity(int input) {
        return sensitivities[input];
    }

    /**
     * The part of u_c² that comes with an input: half of each mixed second order term, and of each covariance, so that it is
     * negative where an input takes more away than it adds.
     */
    public double variancePart(int input) {
        return variances[input];
    }

    /** Expanded with the coverage factor for {@code probability}; without bounds where there is no finite uncertainty. */
    public CombinedUncertainty expanded(double probability) {
        if (!Double.isFinite(value) || !Double.isFinite(variance)) {
            return new CombinedUncertainty(ChannelAccuracy.BEYOND, ChannelAccuracy.BEYOND, Double.POSITIVE_INFINITY,
                    probability, coverageFactor(Double.POSITIVE_INFINITY, probability));
        }
        return new CombinedUncertainty(value, standard(), effectiveDegrees, probability,
                coverageFactor(effectiveDegrees, probability));
    }

    /**
     * k for a two-sided probability: t-quantile with the degrees of freedom truncated to the next lower whole number
     * (G.4.1), normal quantile when they are infinite.
     */
    public static double coverageFactor(double degreesOfFreedom, double probability) {
        double upper = (1 + probability) / 2;
        if (degreesOfFreedom > 1e6) {
            return STANDARD_NORMAL.inverseCumulativeProbability(upper);
        }
        double whole = Math.max(1, Math.floor(degreesOfFreedom * (1 + WHOLE)));
        return new TDistribution(whole).inverseCumulativeProbability(upper);
    }

    private static final NormalDistribution STANDARD_NORMAL = new NormalDistribution(0, 1);
}
