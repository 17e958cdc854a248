package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.sampling.Runs.MILLION;
import static shuntwright.sampling.Runs.fixed;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Equation;
import shuntwright.accuracy.Estimate;
import shuntwright.accuracy.Expression;
import shuntwright.accuracy.Propagation;
import shuntwright.accuracy.Table;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Examples of JCGM 100:2008, annex H, and of EA-4/02 M by sampling, against the law of propagation and exact convolutions. */
class PropagationExamplesTest {

    private static final NormalDistribution NORMAL = new NormalDistribution(0, 1);

    /** H.1: products of inputs whose first order vanishes, so that the second order is needed, and is all there is. */
    @Test
    void endGauge() {
        Equation equation = new Expression(x -> x[0].add(x[1]).add(x[2]).add(x[3])
                .subtract(x[0].multiply(x[7].multiply(x[5].add(x[6])).add(x[4].multiply(x[8])))));
        Model model = Formula.of(9,
                x -> x[0] + x[1] + x[2] + x[3] - x[0] * (x[7] * (x[5] + x[6]) + x[4] * x[8]) - 50e6);
        List<Estimate> estimates = new ArrayList<>();
        List<Variable> variables = new ArrayList<>();
        for (String[] row : Table.rows("/shuntwright/accuracy/gum-h1.csv")) {
            double value = Double.parseDouble(row[1]);
            double standard = Double.parseDouble(row[2]);
            estimates.add(Estimate.of(value, standard));
            variables.add(switch (row[0]) {
                case "alphaS", "deltaAlpha", "deltaTheta" -> Runs.uniform(row[0], value, standard * Math.sqrt(3));
                case "delta" -> Runs.of(row[0], value, standard * Math.sqrt(2), new Distribution.ArcSine());
                default -> Variable.normal(row[0], value, standard);
            });
        }
        Sampled found = Runs.only(model, variables, 0.99, fixed(MILLION, 5));
        Propagation second = Propagation.secondOrder(equation, estimates);
        assertThat(found.mean() + 50e6).isCloseTo(second.value(), within(4 * 33.8 / 1000));
        assertThat(found.standard()).isCloseTo(second.standard(), within(4 * 33.8 / 1000 / Math.sqrt(2)));
        assertThat(Math.abs(found.standard() - Propagation.firstOrder(equation, estimates).standard()))
                .isGreaterThan(1);
    }

    /** H.2: three inputs measured together; correlated draws as combinations of independent ones (Cholesky). */
    @Test
    void resistanceReactanceAndImpedance() {
        double[][] observations = Table.rows("/shuntwright/accuracy/gum-h2.csv").stream()
                .map(row -> new double[]{Double.parseDouble(row[0]), Double.parseDouble(row[1]),
                        Double.parseDouble(row[2])})
                .toArray(double[][]::new);
        double[] mean = new double[3];
        double[][] covariance = covariance(observations, mean);
        double[][] root = cholesky(covariance);
        Model model = new Formula(3, List.of(z -> resistance(correlated(z, mean, root)),
                z -> reactance(correlated(z, mean, root)), z -> impedance(correlated(z, mean, root)),
                z -> resistance(correlated(z, mean, root)) + reactance(correlated(z, mean, root)),
                z -> reactance(correlated(z, mean, root)) + impedance(correlated(z, mean, root))), List.of());
        List<Range> anything = List.of(Formula.ANYTHING, Formula.ANYTHING, Formula.ANYTHING, Formula.ANYTHING,
                Formula.ANYTHING);
        int trials = 200_000;
        List<Sampled> found = MonteCarlo.run(model, Runs.many(3, key -> Variable.normal(key, 0, 1)), anything, 0.95,
                fixed(trials, 6), Watch.NONE).outputs();
        List<Expression> equations = List.of(
                new Expression(x -> x[0].multiply(x[2].cos()).divide(x[1])),
                new Expression(x -> x[0].multiply(x[2].sin()).divide(x[1])),
                new Expression(x -> x[0].divide(x[1])),
                new Expression(x -> x[0].multiply(x[2].cos().add(x[2].sin())).divide(x[1])),
                new Expression(x -> x[0].multiply(x[2].sin().add(1)).divide(x[1])));
        double[] published = {0.071, 0.295, 0.236};
        for (int i = 0; i < equations.size(); i++) {
            Propagation propagation = propagate(equations.get(i), mean, covariance);
            double u = propagation.standard();
            assertThat(found.get(i).mean()).isCloseTo(propagation.value(), within(4 * u / Math.sqrt(trials)));
            // The equations are all but linear over such uncertainties.
            assertThat(found.get(i).standard()).isCloseTo(u, within(4 * u / Math.sqrt(2.0 * trials) + 1e-4 * u));
            if (i < published.length) {
                assertThat(found.get(i).standard()).isCloseTo(published[i], within(0.0015));
            }
        }
        // Correlations published: r(R, X) = -0.588, r(X, Z) = 0.993.
        assertThat(correlation(found.get(0), found.get(1), found.get(3))).isCloseTo(-0.588, within(0.005));
        assertThat(correlation(found.get(1), found.get(2), found.get(4))).isCloseTo(0.993, within(0.001));
    }

    private static double[] correlated(double[] z, double[] mean, double[][] root) {
        double[] x = mean.clone();
        for (int i = 0; i < x.length; i++) {
            for (int j = 0; j <= i; j++) {
                x[i] += root[i][j] * z[j];
            }
        }
        return x;
    }

    private static double resistance(double[] x) {
        return x[0] * Math.cos(x[2]) / x[1];
    }

    private static double reactance(double[] x) {
        return x[0] * Math.sin(x[2]) / x[1];
    }

    private static double impedance(double[] x) {
        return x[0] / x[1];
    }

    private static double correlation(Sampled a, Sampled b, Sampled sum) {
        double both = sum.standard() * sum.standard() - a.standard() * a.standard() - b.standard() * b.standard();
        return both / (2 * a.standard() * b.standard());
    }

    /** Of means of the observations; writes the means. */
    private static double[][] covariance(double[][] observations, double[] mean) {
        int n = observations.length;
        for (double[] row : observations) {
            for (int i = 0; i < 3; i++) {
                mean[i] += row[i] / n;
            }
        }
        double[][] covariance = new double[3][3];
        for (double[] row : observations) {
            for (int i = 0; i < 3; i++) {
                for (int j = 0; j < 3; j++) {
                    covariance[i][j] += (row[i] - mean[i]) * (row[j] - mean[j]) / (n * (n - 1.0));
                }
            }
        }
        return covariance;
    }

    private static double[][] cholesky(double[][] matrix) {
        double[][] root = new double[3][3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j <= i; j++) {
                double rest = matrix[i][j];
                for (int k = 0; k < j; k++) {
                    rest -= root[i][k] * root[j][k];
                }
                root[i][j] = i == j ? Math.sqrt(rest) : rest / root[j][j];
            }
        }
        return root;
    }

    private static Propagation propagate(Equation equation, double[] mean, double[][] covariance) {
        List<Estimate> estimates = new ArrayList<>();
        double[][] correlation = new double[3][3];
        for (int i = 0; i < 3; i++) {
            estimates.add(Estimate.of(mean[i], Math.sqrt(covariance[i][i])));
            for (int j = 0; j < 3; j++) {
                correlation[i][j] = covariance[i][j] / Math.sqrt(covariance[i][i] * covariance[j][j]);
            }
        }
        return Propagation.correlated(equation, estimates, correlation);
    }

    private static double published(String example, boolean tolerance) {
        return Table.rows("/shuntwright/sampling/calibration-examples.csv").stream()
                .filter(row -> row[0].equals(example))
                .mapToDouble(row -> Double.parseDouble(row[tolerance ? 4 : 1])).findFirst().orElseThrow();
    }

    private static void checkPublished(String example, Sampled found) {
        Range range = found.symmetric().range();
        assertThat(range.width() / 2).as(example).isCloseTo(published(example, false),
                within(published(example, true)));
    }

    /** S3: uniform, triangular, normal and t inputs. The t input's variance is ν/(ν−2) times what its scale counts. */
    @Test
    void standardResistor() {
        Model resistance = Formula.of(6, x -> (x[0] + x[1] + x[2]) * x[4] * x[5] - x[3] - 10_000);
        List<Variable> variables = List.of(Runs.of("standard", 10_000.053, 5e-3, new Distribution.Normal(2)),
                Runs.uniform("drift", 0.020, 10e-3), Runs.uniform("temperature of the standard", 0, 2.75e-3),
                Runs.uniform("temperature", 0, 5.5e-3), Runs.of("parasitic", 1, 1e-6, new Distribution.Triangular()),
                Runs.student("ratio", 1.0000105, 0.07e-6, 4));
        Sampled found = Runs.only(resistance, variables, 0.9545, fixed(MILLION, 7));
        Propagation first = Propagation.firstOrder(
                new Expression(x -> x[0].add(x[1]).add(x[2]).multiply(x[4]).multiply(x[5]).subtract(x[3])),
                variables.stream().map(each -> Estimate.of(each.limits().mid(),
                        each.distribution().standardUncertainty(each.limits()))).toList());
        double byRatio = 0.07e-6 * 10_000.073;
        double standard = Math.sqrt(first.standard() * first.standard() + byRatio * byRatio * (4.0 / 2 - 1));
        assertThat(first.standard()).isCloseTo(8.328e-3, within(2e-6));
        assertThat(found.mean() + 10_000).isCloseTo(10_000.1780007665, within(4 * standard / 1000));
        assertThat(found.standard()).isCloseTo(standard, within(4 * standard / 1000));
        checkPublished("standard resistor", found);
    }

    /** P(S + σZ ≤ s) for a normal Z, by quadrature. */
    private static DoubleUnaryOperator blurred(UniformSum sum, double sigma) {
        return s -> Grid.mean(-8, 8, 8, z -> 16 * NORMAL.density(z) * sum.below(s - sigma * z));
    }

    private static double end(DoubleUnaryOperator below, double probability, double most) {
        return Bisection.root(s -> below.applyAsDouble(s) - (1 + probability) / 2, 0, most);
    }

    private static void checkEnds(Sampled found, double exact) {
        CoverageInterval interval = found.symmetric();
        assertThat(interval.range().min()).isCloseTo(-exact, within(4 * interval.standardErrors().low()));
        assertThat(interval.range().max()).isCloseTo(exact, within(4 * interval.standardErrors().high()));
    }

    /** S9: 1.0 mV normal, 29 mV and 6.4 mV uniform; V. */
    @Test
    void multimeter() {
        UniformSum uniform = UniformSum.of(29e-3 * Math.sqrt(3), 6.4e-3 * Math.sqrt(3));
        Sampled found = Runs.only(Formula.sum(3), List.of(Variable.normal("standard", 0, 1e-3),
                Runs.uniform("resolution", 29e-3), Runs.uniform("calibrator", 6.4e-3)), 0.95, fixed(MILLION, 8));
        assertThat(found.standard()).isCloseTo(29.715e-3, within(4 * 0.03e-3));
        checkEnds(found, end(blurred(uniform, 1e-3), 0.95, 0.1));
        checkPublished("multimeter", found);
    }

    /** S10: 0.46 µm, 1.15·1.7 µm, 15 µm and 29 µm uniform; the two large ones also as the trapezoid that they make. */
    @Test
    void caliper() {
        double root = Math.sqrt(3);
        UniformSum sum = UniformSum.of(0.46 * root, 1.15 * 1.7 * root, 15 * root, 29 * root);
        double exact = sum.quantile(0.975);
        Sampled four = Runs.only(Formula.of(4, x -> x[0] + 1.7 * x[1] + x[2] + x[3]),
                List.of(Runs.uniform("block", 0.46), Runs.uniform("temperature", 1.15), Runs.uniform("resolution", 15),
                        Runs.uniform("mechanical", 29)),
                0.95, fixed(MILLION, 9));
        Distribution trapezoid = new Distribution.Trapezoid((29.0 - 15) / (29 + 15));
        Sampled three = Runs.only(Formula.of(3, x -> x[0] + 1.7 * x[1] + x[2]),
                List.of(Runs.uniform("block", 0.46), Runs.uniform("temperature", 1.15),
                        Runs.of("resolution and mechanical", 0, 44 * root, trapezoid)),
                0.95, fixed(MILLION, 10));
        for (Sampled found : List.of(four, three)) {
            assertThat(found.standard()).isCloseTo(32.71, within(4 * 0.033));
            checkEnds(found, exact);
            checkPublished("caliper", found);
        }
    }

    /**
     * S12: 0.6e-3 with 2 degrees of freedom and 0.68e-3 normal. A t of 2 degrees has no variance and is refused as a distribution
     * of limits; its quantile has a closed form, by which it is drawn here. The published U = 2.0e-3 rests on the formula of Welch
     * and Satterthwaite; what the two distributions give together is larger.
     */
    @Test
    void fewDegreesOfFreedom() {
        assertThatIllegalArgumentException().isThrownBy(() -> new Distribution.StudentT(2, 1));
        Sampled found = Runs.only(
                Formula.of(2, x -> 0.6e-3 * (2 * x[0] - 1) / Math.sqrt(2 * x[0] * (1 - x[0])) + x[1]),
                List.of(Runs.uniform("probability", 0.5, 0.5), Variable.normal("rest", 0, 0.68e-3)), 0.9545,
                fixed(MILLION, 11));
        TDistribution t = new TDistribution(2);
        DoubleUnaryOperator below = s -> Grid.mean(-8, 8, 8,
                z -> 16 * NORMAL.density(z) * t.cumulativeProbability((s - 0.68e-3 * z) / 0.6e-3));
        double exact = end(below, 0.9545, 0.05);
        checkEnds(found, exact);
        assertThat(exact).isBetween(2.0e-3, 3.5e-3);
    }

    /** A large and a small t together with a normal input: sums of independent variances, of which t has ν/(ν−2). */
    @Test
    void sumsOfStudentInputs() {
        Sampled found = Runs.only(Formula.sum(3), List.of(Runs.student("few", 1, 2, 6), Runs.student("many", 2, 1, 40),
                Variable.normal("rest", 3, 1)), 0.95, fixed(MILLION, 12));
        double variance = 4 * 6 / 4.0 + 40 / 38.0 + 1;
        assertThat(found.mean()).isCloseTo(6, within(4 * Math.sqrt(variance) / 1000));
        // Kurtosis of the sum: 3 plus excess by share of variance squared.
        double excess = (6 / 2.0) * Math.pow(6 / variance, 2) + (6 / 36.0) * Math.pow(40 / 38.0 / variance, 2);
        double slip = Math.sqrt(variance) * Math.sqrt((2 + excess) / 4 / MILLION);
        assertThat(found.standard()).isCloseTo(Math.sqrt(variance), within(4 * slip));
    }
}
