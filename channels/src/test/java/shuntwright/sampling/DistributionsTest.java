package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.distribution.continuous.TDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.accuracy.Reel;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Draws of every distribution against its closed form. */
class DistributionsTest {

    private static final int TRIALS = 400_000;
    private static final double COVERAGE = 0.95;
    /** Between limits that are not symmetric about 0: the distribution lies around their middle. */
    private static final Range LIMITS = Range.of(-1, 3);
    private static final double MID = 1;
    private static final double HALF = 2;
    /** Critical value of √n·D for a probability of 0.001: √(ln(2/0.001)/2) (Smirnov 1948). */
    private static final double KOLMOGOROV = Math.sqrt(Math.log(2 / 0.001) / 2);

    static List<Law> laws() {
        return Law.all();
    }

    private static Sampled sample(Law law) {
        return Runs.only(Formula.sum(1), List.of(Variable.of("x", LIMITS, law.distribution())), COVERAGE,
                Runs.fixed(TRIALS, 7));
    }

    @ParameterizedTest
    @MethodSource("laws")
    void momentsAreThoseOfTheClosedForm(Law law) {
        Sampled sampled = sample(law);
        double standard = HALF * Math.sqrt(law.variance());
        assertThat(sampled.trials()).isEqualTo(TRIALS);
        assertThat(sampled.runaways()).isZero();
        assertThat(sampled.mean()).isCloseTo(MID, within(4 * standard / Math.sqrt(TRIALS)));
        if (Double.isFinite(law.kurtosis())) {
            double error = standard * Math.sqrt((law.kurtosis() - 1) / 4 / TRIALS);
            assertThat(sampled.standard()).isCloseTo(standard, within(4 * error));
        }
    }

    /** The error of an end is √(q(1−q)/M)/f at the quantile of q. */
    @ParameterizedTest
    @MethodSource("laws")
    void coverageIntervalIsThatOfTheClosedForm(Law law) {
        CoverageInterval found = sample(law).symmetric();
        double tail = (1 - COVERAGE) / 2;
        double low = law.quantile(tail);
        double error = Math.sqrt(tail * (1 - tail) / TRIALS) / law.density(low) * HALF;
        assertThat(found.range().min()).isCloseTo(MID + HALF * low, within(4 * error));
        assertThat(found.range().max()).isCloseTo(MID - HALF * low, within(4 * error));
        assertThat(found.standardErrors().low()).isCloseTo(error, within(0.1 * error));
        assertThat(found.standardErrors().high()).isCloseTo(error, within(0.1 * error));
    }

    /** To a millionth of the probability; near its ends the arcsine is as steep as numbers of 53 bits can resolve. */
    @ParameterizedTest
    @MethodSource("laws")
    void quantilesInvertTheDistributionFunction(Law law) {
        for (double p : new double[]{1e-9, 1e-6, 1e-4, 0.01, 0.1, 0.2, 0.3, 0.49, 0.5}) {
            double low = Shape.quantile(law.distribution(), p);
            assertThat(law.below().applyAsDouble(low)).as("p = %s", p).isCloseTo(p,
                    within(1e-6 * p + (law.distribution() instanceof Distribution.ArcSine ? 1e-8 : 0)));
            assertThat(Shape.quantile(law.distribution(), 1 - p)).as("p = %s", p).isCloseTo(-low,
                    within(1e-6 * Math.max(1e-6, Math.abs(low))));
        }
    }

    @ParameterizedTest
    @MethodSource("laws")
    void drawsHaveTheDistribution(Law law) {
        checkDrawn(law, Optional.empty());
    }

    @ParameterizedTest
    @MethodSource("laws")
    void piecesOfAReelHaveTheDistributionToo(Law law) {
        checkDrawn(law, Optional.of(new Reel("reel", 0.7)));
    }

    private static void checkDrawn(Law law, Optional<Reel> reel) {
        int blocks = 64;
        double[] values = draw(new Variable("x", LIMITS, law.distribution(), reel), 11, blocks);
        Arrays.sort(values);
        double n = values.length;
        double distance = 0;
        for (int i = 0; i < values.length; i++) {
            double p = law.below().applyAsDouble((values[i] - MID) / HALF);
            distance = Math.max(distance, Math.max(p - i / n, (i + 1) / n - p));
        }
        assertThat(distance * Math.sqrt(n)).isLessThan(KOLMOGOROV);
        if (law.distribution().bounded()) {
            assertThat(values[0]).isGreaterThanOrEqualTo(LIMITS.min());
            assertThat(values[values.length - 1]).isLessThanOrEqualTo(LIMITS.max());
        }
    }

    private static double[] draw(Variable variable, long seed, int blocks) {
        Columns columns = new Columns(List.of(variable), seed);
        double[] values = new double[blocks * Draws.BLOCK];
        double[][] x = columns.allocate();
        for (int block = 0; block < blocks; block++) {
            columns.draw(block, 0, new Draws(), new Scratch(), x);
            System.arraycopy(x[0], 0, values, block * Draws.BLOCK, Draws.BLOCK);
        }
        return values;
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 5, -1e-12, 1e9})
    void limitsWithoutWidthAreAConstant(double value) {
        for (Law law : Law.all()) {
            Variable constant = Variable.of("x", Range.exactly(value), law.distribution());
            Sampled sampled = Runs.only(Formula.sum(1), List.of(constant), Range.exactly(value), 0.99,
                    Runs.fixed(10_000, 1));
            assertThat(sampled.mean()).isEqualTo(value);
            assertThat(sampled.standard()).isZero();
            for (Range range : List.of(sampled.symmetric().range(), sampled.shortest().range())) {
                assertThat(range.min()).isCloseTo(value, within(1e-300));
                assertThat(range.max()).isCloseTo(value, within(1e-300));
            }
            assertThat(sampled.outside().estimate()).isZero();
            assertThat(sampled.outside().interval().max()).isPositive();
        }
    }

    @Test
    void normalQuantilesAreThoseOfTheLibrary() {
        NormalDistribution law = new NormalDistribution(0, 1);
        for (double exponent = -10; exponent < -0.31; exponent += 0.01) {
            double p = Math.pow(10, exponent);
            double z = normal(p);
            assertThat(law.cumulativeProbability(z)).as("p = %s", p).isCloseTo(p, within(1e-7 * p));
        }
        assertThat(normal(0.5)).isCloseTo(0, within(1e-12));
        assertThat(normal(0.975)).isCloseTo(1.959963984540054, within(1e-8));
    }

    private static double normal(double p) {
        return Shape.quantile(new Distribution.Normal(1), p);
    }

    /** For four degrees of freedom the quantile has a closed form (W. T. Shaw, J. Comput. Finance 9, 2006). */
    @Test
    void studentTableIsTheClosedFormOfFourDegrees() {
        NormalDistribution law = new NormalDistribution(0, 1);
        for (double z = 0.001; z < 6.4; z += z < 0.05 ? 0.0007 : 0.0077) {
            double p = law.cumulativeProbability(-z);
            double root = Math.sqrt(4 * p * (1 - p));
            double exact = 2 * Math.sqrt(Math.cos(Math.acos(root) / 3) / root - 1);
            assertThat(StudentTable.of(4).quantile(z)).as("z = %s", z).isCloseTo(exact,
                    within(1e-8 * exact));
            assertThat(StudentTable.of(4).quantile(-z)).as("z = %s", -z).isCloseTo(-exact,
                    within(1e-8 * exact));
        }
        assertThat(StudentTable.of(4).quantile(0)).isZero();
    }

    @ParameterizedTest
    @ValueSource(doubles = {2.1, 3, 5, 18, 50, 1000})
    void studentTableInvertsTheDistributionFunction(double degrees) {
        NormalDistribution law = new NormalDistribution(0, 1);
        TDistribution t = new TDistribution(degrees);
        for (double z = -6.4; z < 0; z += 0.0133) {
            double p = law.cumulativeProbability(z);
            assertThat(t.cumulativeProbability(StudentTable.of(degrees).quantile(z))).as("z = %s", z).isCloseTo(p,
                    within(1e-7 * p));
        }
        for (double z = 0.001; z < 0.5; z += 0.0033) {
            double half = law.cumulativeProbability(z) - 0.5;
            assertThat(t.cumulativeProbability(StudentTable.of(degrees).quantile(z)) - 0.5).as("z = %s", z)
                    .isCloseTo(half, within(1e-8 * half));
        }
    }

    /**
     * Of bounded and of normal pieces Pearson's coefficient is the stated one. Of ranks it is so for bounded pieces; for normal and
     * t, whose normal numbers have the stated one, it is 6/π·asin(r/2) (K. Pearson 1907).
     */
    @ParameterizedTest
    @MethodSource("laws")
    void piecesOfAReelAreCorrelatedAsStated(Law law) {
        int blocks = 64;
        for (double wanted : new double[]{0.2, 0.5, 0.9, 1}) {
            Optional<Reel> reel = Optional.of(new Reel("reel", wanted));
            double[] a = draw(new Variable("a", LIMITS, law.distribution(), reel), 11, blocks);
            double[] b = draw(new Variable("b", LIMITS, law.distribution(), reel), 11, blocks);
            double slip = 4 * Math.sqrt((1 - wanted) / a.length) + 1e-9;
            double byRank = law.distribution().bounded() ? wanted : 6 / Math.PI * Math.asin(wanted / 2);
            assertThat(correlation(ranks(law, a), ranks(law, b))).as("wanted %s", wanted).isCloseTo(byRank,
                    within(slip));
            if (!(law.distribution() instanceof Distribution.StudentT)) {
                assertThat(correlation(a, b)).as("wanted %s", wanted).isCloseTo(wanted, within(slip));
            }
            double[] other = draw(new Variable("b", LIMITS, law.distribution(), Optional.of(new Reel("other", wanted))),
                    11, blocks);
            if (wanted < 1) {
                assertThat(correlation(ranks(law, a), ranks(law, other))).isCloseTo(0, within(4 / Math.sqrt(a.length)));
            }
        }
    }

    private static double[] ranks(Law law, double[] values) {
        return Arrays.stream(values).map(each -> law.below().applyAsDouble((each - MID) / HALF)).toArray();
    }

    static double correlation(double[] a, double[] b) {
        double meanA = Arrays.stream(a).average().orElseThrow();
        double meanB = Arrays.stream(b).average().orElseThrow();
        double aa = 0;
        double bb = 0;
        double ab = 0;
        for (int i = 0; i < a.length; i++) {
            aa += (a[i] - meanA) * (a[i] - meanA);
            bb += (b[i] - meanB) * (b[i] - meanB);
            ab += (a[i] - meanA) * (b[i] - meanB);
        }
        return ab / Math.sqrt(aa * bb);
    }
}
