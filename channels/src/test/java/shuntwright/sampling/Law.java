package shuntwright.sampling;

import java.util.List;
import java.util.function.DoubleUnaryOperator;

import org.hipparchus.distribution.RealDistribution;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.hipparchus.distribution.continuous.TriangularDistribution;
import org.hipparchus.distribution.continuous.UniformRealDistribution;

import shuntwright.quantity.Distribution;

/**
 * What is known in closed form of a distribution whose limits are ±1: from a library where it has it, else written out.
 *
 * @param distribution that is sampled
 * @param below        distribution function
 * @param variance     its variance
 * @param kurtosis     its fourth central moment over the square of the variance; infinite where there is none
 */
record Law(Distribution distribution, DoubleUnaryOperator below, double variance, double kurtosis) {

    static List<Law> all() {
        return List.of(
                of(new Distribution.Uniform(), new UniformRealDistribution(-1, 1), 1.8),
                of(new Distribution.Normal(1), new NormalDistribution(0, 1), 3),
                of(new Distribution.Normal(2.576), new NormalDistribution(0, 1 / 2.576), 3),
                of(new Distribution.Triangular(), new TriangularDistribution(-1, 0, 1), 2.4),
                // JCGM 101:2008, 6.4.6.
                new Law(new Distribution.ArcSine(), x -> 0.5 + Math.asin(Math.clamp(x, -1, 1)) / Math.PI, 0.5, 1.5),
                trapezoid(0.2), trapezoid(0.5), trapezoid(0.9),
                of(new Distribution.Trapezoid(0), new TriangularDistribution(-1, 0, 1), 2.4),
                of(new Distribution.Trapezoid(1), new UniformRealDistribution(-1, 1), 1.8),
                student(2.5, 1), student(4, 2), student(9, 2.262), student(50, 2));
    }

    private static Law of(Distribution distribution, RealDistribution law, double kurtosis) {
        return new Law(distribution, law::cumulativeProbability, law.getNumericalVariance(), kurtosis);
    }

    /** The sum of two uniform deviations (JCGM 101:2008, 6.4.4); moments of sums of independent ones. */
    private static Law trapezoid(double ratio) {
        double a = (1 + ratio) / 2;
        double b = (1 - ratio) / 2;
        double variance = (a * a + b * b) / 3;
        double fourth = (Math.pow(a, 4) + Math.pow(b, 4)) / 5 + 6 * a * a * b * b / 9;
        UniformSum sum = UniformSum.of(a, b);
        return new Law(new Distribution.Trapezoid(ratio), x -> sum.below(Math.clamp(x, -1, 1)), variance,
                fourth / (variance * variance));
    }

    private static Law student(double degrees, double k) {
        TDistribution t = new TDistribution(degrees);
        double kurtosis = degrees > 4 ? 3 + 6 / (degrees - 4) : Double.POSITIVE_INFINITY;
        return new Law(new Distribution.StudentT(degrees, k), x -> t.cumulativeProbability(x * k),
                degrees / (degrees - 2) / (k * k), kurtosis);
    }

    double quantile(double p) {
        return Bisection.root(x -> below.applyAsDouble(x) - p, -1e3, 1e3);
    }

    /** Probability density by a difference, as good as a check of standard errors needs. */
    double density(double x) {
        double step = 1e-5;
        return (below.applyAsDouble(x + step) - below.applyAsDouble(x - step)) / (2 * step);
    }

    @Override
    public String toString() {
        return distribution.toString();
    }
}
