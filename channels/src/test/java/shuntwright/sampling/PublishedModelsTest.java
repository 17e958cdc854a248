package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.sampling.Runs.MILLION;
import static shuntwright.sampling.Runs.fixed;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

import shuntwright.accuracy.Reel;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Mass calibration, comparison loss and end gauge of JCGM 101:2008, 9.3 to 9.5. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class PublishedModelsTest {

    private static final NormalDistribution NORMAL = new NormalDistribution(0, 1);

    private static double quantity(Sampled found, String name) {
        return switch (name) {
            case "mean" -> found.mean();
            case "standard" -> found.standard();
            case "low" -> found.shortest().range().min();
            case "high" -> found.shortest().range().max();
            default -> throw new IllegalArgumentException(name);
        };
    }

    private final Sampled mass = sampledMass();
    private final Sampled gauge = sampledGauge();

    /** dm = (m_Rc + dm_Rc)·(1 + (ρ_a − 1.2)·(1/ρ_W − 1/ρ_R)) − 100 g, in mg. */
    private static Sampled sampledMass() {
        Model deviation = Formula.of(5, x -> (x[0] + x[1]) * (1 + (x[2] - 1.2) * (1 / x[3] - 1 / x[4])) - 100_000);
        return Runs.only(deviation, List.of(Variable.normal("reference", 100_000, 0.050),
                Variable.normal("balance", 1.234, 0.020), Runs.uniform("air", 1.2, 0.1),
                Runs.uniform("weight", 8000, 1000), Runs.uniform("reference density", 8000, 50)), 0.95,
                fixed(MILLION, 2));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/mass-calibration.csv", delimiter = ';', useHeadersInDisplayName = true)
    void massCalibrationIsThePublished(String quantity, double value, double tolerance) {
        assertThat(quantity(mass, quantity)).isCloseTo(value, within(4 * 0.0754 / 1000 + tolerance));
    }

    /** For given densities the deviation is normal; averaged over the densities by quadrature. */
    @Test
    void massCalibrationIsTheQuadrature() {
        double spread = Math.sqrt(0.050 * 0.050 + 0.020 * 0.020);
        DoubleUnaryOperator below = y -> Grid.mean(1.1, 1.3, air -> Grid.mean(7000, 9000,
                weight -> Grid.mean(7950, 8050, reference -> {
                    double factor = 1 + (air - 1.2) * (1 / weight - 1 / reference);
                    return NORMAL.cumulativeProbability(((y + 100_000) / factor - 100_001.234) / spread);
                })));
        CoverageInterval found = mass.symmetric();
        // The distribution function at the ends found: its error is that of a share of a million trials.
        double slip = Math.sqrt(0.025 * 0.975 / MILLION);
        assertThat(below.applyAsDouble(found.range().min())).isCloseTo(0.025, within(4 * slip));
        assertThat(below.applyAsDouble(found.range().max())).isCloseTo(0.975, within(4 * slip));
        assertThat(found.standardErrors().low()).isBetween(0.0001, 0.0004);
    }

    /** The correlation as that of two pieces of one reel. */
    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/comparison-loss.csv", delimiter = ';', useHeadersInDisplayName = true)
    void comparisonLoss(double r, double x1, double mean, double standard, double exactLow, double exactHigh,
            double printedLow, double printedHigh) {
        Model loss = Formula.of(2, x -> 1e6 * (x[0] * x[0] + x[1] * x[1]));
        Optional<Reel> reel = r > 0 ? Optional.of(new Reel("pair", r)) : Optional.empty();
        Distribution normal = new Distribution.Normal(1);
        Sampled found = Runs.only(loss, List.of(
                new Variable("x1", Range.of(x1 - 0.005, x1 + 0.005), normal, reel),
                new Variable("x2", Range.of(-0.005, 0.005), normal, reel)), 0.95, fixed(MILLION, 3));
        assertThat(found.mean()).isCloseTo(mean, within(4 * standard / 1000));
        assertThat(found.standard()).isCloseTo(standard, within(4 * 2 * standard / 1000));
        Range shortest = found.shortest().range();
        assertThat(shortest.min()).isCloseTo(exactLow, within(10.0)).isCloseTo(printedLow, within(10.0));
        assertThat(shortest.max()).isCloseTo(exactHigh, within(10.0)).isCloseTo(printedHigh, within(10.0));
        assertThat(shortest.width()).isCloseTo(exactHigh - exactLow, within(0.01 * standard))
                .isLessThan(found.symmetric().range().width());
    }

    /**
     * Lengths in nm over 50 mm. A curvilinear trapezoid is a uniform deviation between limits of which the width is uniform
     * (JCGM 101, 6.4.3), so it is written as a product of two uniform inputs.
     */
    private static Sampled sampledGauge() {
        Model length = Formula.of(11, x -> {
            double expansion = x[7] * x[8];
            double temperature = x[9] * x[10];
            double ls = 50_000_623 + x[0];
            return 623 + x[0] + x[1] + x[2] + x[3] - ls * (expansion * (x[5] + x[6]) + x[4] * temperature);
        });
        return Runs.only(length, List.of(Runs.student("standard", 0, 25, 18), Runs.student("difference", 215, 6, 24),
                Runs.student("random", 0, 4, 5), Runs.student("systematic", 0, 7, 8),
                Runs.uniform("expansion", 11.5e-6, 2e-6), Variable.normal("mean temperature", -0.1, 0.2),
                Runs.of("cycle", 0, 0.5, new Distribution.ArcSine()), Runs.uniform("expansions", 0, 1),
                Runs.uniform("width of expansions", 1e-6, 0.1e-6), Runs.uniform("temperatures", 0, 1),
                Runs.uniform("width of temperatures", 0.05, 0.025)), 0.99, fixed(MILLION, 4));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/end-gauge.csv", delimiter = ';', useHeadersInDisplayName = true)
    void endGauge(String quantity, double value, double tolerance) {
        assertThat(quantity(gauge, quantity)).isCloseTo(value, within(tolerance));
    }

    /** The law of propagation covers 838 ± 93 nm, which is close to what it should be. */
    @Test
    void endGaugeIntervalIsNearThatOfThePropagation() {
        assertThat(gauge.symmetric().range().min()).isCloseTo(838 - 93, within(3.0));
        assertThat(gauge.symmetric().range().max()).isCloseTo(838 + 93, within(3.0));
        assertThat(gauge.symmetric().standardErrors().low()).isBetween(0.1, 0.5);
    }
}
