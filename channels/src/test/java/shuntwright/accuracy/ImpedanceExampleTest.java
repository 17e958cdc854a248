package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;

import org.junit.jupiter.api.Test;

/** Resistance, reactance and impedance of JCGM 100:2008, H.2: propagation with correlation. */
class ImpedanceExampleTest {

    private static final Expression RESISTANCE = new Expression(x -> x[0].multiply(x[2].cos()).divide(x[1]));
    private static final Expression REACTANCE = new Expression(x -> x[0].multiply(x[2].sin()).divide(x[1]));
    private static final Expression IMPEDANCE = new Expression(x -> x[0].divide(x[1]));

    private final double[][] observations = Table.rows("/shuntwright/accuracy/gum-h2.csv").stream()
            .map(row -> new double[]{Double.parseDouble(row[0]), Double.parseDouble(row[1]),
                    Double.parseDouble(row[2])})
            .toArray(double[][]::new);

    private Propagation propagate(Equation equation) {
        int n = observations.length;
        double[] mean = new double[3];
        double[][] covariance = new double[3][3];
        for (int i = 0; i < 3; i++) {
            for (double[] row : observations) {
                mean[i] += row[i] / n;
            }
        }
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                for (double[] row : observations) {
                    covariance[i][j] += (row[i] - mean[i]) * (row[j] - mean[j]) / (n * (n - 1.0));
                }
            }
        }
        double[][] correlation = new double[3][3];
        Estimate[] estimates = new Estimate[3];
        for (int i = 0; i < 3; i++) {
            estimates[i] = Estimate.of(mean[i], Math.sqrt(covariance[i][i]));
            for (int j = 0; j < 3; j++) {
                correlation[i][j] = covariance[i][j] / Math.sqrt(covariance[i][i] * covariance[j][j]);
            }
        }
        return Propagation.correlated(equation, List.of(estimates), correlation);
    }

    @Test
    void estimatesAndUncertaintiesAreThePublished() {
        check(propagate(RESISTANCE), 127.7321699, 0.07107141);
        check(propagate(REACTANCE), 219.8465119, 0.29558168);
        check(propagate(IMPEDANCE), 254.2597019, 0.23633613);
    }

    private static void check(Propagation found, double value, double standard) {
        assertThat(found.value()).isCloseTo(value, within(1e-6));
        assertThat(found.standard()).isCloseTo(standard, within(1e-7));
    }

    @Test
    void correlationsOfTheResultsAreThePublished() {
        assertThat(correlation(RESISTANCE, REACTANCE)).isCloseTo(-0.5884297844, within(1e-7));
        assertThat(correlation(RESISTANCE, IMPEDANCE)).isCloseTo(-0.4852592242, within(1e-7));
        assertThat(correlation(REACTANCE, IMPEDANCE)).isCloseTo(0.992511649, within(1e-7));
    }

    /** From u²(a + b) = u²(a) + u²(b) + 2·r·u(a)·u(b). */
    private double correlation(Expression a, Expression b) {
        double ua = propagate(a).standard();
        double ub = propagate(b).standard();
        double sum = propagate(new Expression(x -> a.formula().apply(x).add(b.formula().apply(x)))).standard();
        return (sum * sum - ua * ua - ub * ub) / (2 * ua * ub);
    }

    @Test
    void fullCorrelationAddsOrSubtracts() {
        Equation sum = new Expression(x -> x[0].add(x[1]));
        List<Estimate> inputs = List.of(Estimate.of(0, 3), Estimate.of(0, 4));
        assertThat(Propagation.correlated(sum, inputs, matrix(1)).standard()).isCloseTo(7, within(1e-12));
        assertThat(Propagation.correlated(sum, inputs, matrix(0)).standard()).isCloseTo(5, within(1e-12));
        assertThat(Propagation.correlated(sum, inputs, matrix(-1)).standard()).isCloseTo(1, within(1e-12));
    }

    private static double[][] matrix(double r) {
        return new double[][]{{1, r}, {r, 1}};
    }
}
