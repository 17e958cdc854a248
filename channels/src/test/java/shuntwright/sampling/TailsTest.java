package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

import shuntwright.accuracy.Reel;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Rare events of known probability: estimates, their standard errors, and that nothing is ever impossible. */
class TailsTest {

    private static final NormalDistribution NORMAL = new NormalDistribution(0, 1);
    private static final int SEEDS = 15;
    private static final int TRIALS = 100_000;

    /**
     * An event of known probability.
     *
     * @param name      what it is
     * @param model     with one output
     * @param variables its inputs
     * @param allowed   the event is being outside
     * @param exact     its probability
     */
    record Rare(String name, Model model, List<Variable> variables, Range allowed, double exact) {
        @Override
        public String toString() {
            return name;
        }
    }

    static Stream<Rare> events() {
        return Stream.of(1e-4, 1e-6, 1e-9).flatMap(p -> Stream.of(
                equalUniform(4, p, true), equalUniform(6, p, false), unequalUniform(p), normal(p, false),
                normal(p, true), triangular(p), trapezoids(p), normalAndUniform(p),
                product(Math.max(p, 1e-6)), productBesideNormal(p))).distinct();
    }

    private static Rare twoSided(String name, Model model, List<Variable> variables, double bound, double exact) {
        return new Rare(name + " both sides " + exact, model, variables, Range.of(-bound, bound), exact);
    }

    private static Rare upper(String name, Model model, List<Variable> variables, double bound, double exact) {
        return new Rare(name + " above " + exact, model, variables, Range.of(-1e6, bound), exact);
    }

    /** Irwin-Hall: n uniform deviations of half-width 1 are within z of their largest sum with probability zⁿ/(2ⁿ·n!), z ≤ 2. */
    private static Rare equalUniform(int n, double p, boolean both) {
        double factorial = 1;
        for (int i = 2; i <= n; i++) {
            factorial *= i;
        }
        double z = 2 * Math.pow((both ? p / 2 : p) * factorial, 1.0 / n);
        assertThat(z).isLessThan(2);
        List<Variable> variables = Runs.many(n, key -> Runs.uniform(key, 0, 1));
        return both
                ? twoSided(n + " uniform", Formula.sum(n), variables, n - z, p)
                : upper(n + " uniform", Formula.sum(n), variables, n - z, p);
    }

    private static Rare unequalUniform(double p) {
        UniformSum sum = UniformSum.of(1, 0.6, 0.3, 0.2, 0.1, 0.02);
        double bound = -sum.quantile(p);
        return upper("unequal uniform", Formula.sum(6),
                List.of(Runs.uniform("a", 0, 1), Runs.uniform("b", 0, 0.6), Runs.uniform("c", 0, 0.3),
                        Runs.uniform("d", 0, 0.2), Runs.uniform("e", 0, 0.1), Runs.uniform("f", 0, 0.02)),
                bound, sum.above(bound));
    }

    private static Rare normal(double p, boolean both) {
        double z = -NORMAL.inverseCumulativeProbability(both ? p / 2 : p);
        double exact = NORMAL.cumulativeProbability(-z) * (both ? 2 : 1);
        List<Variable> variables = List.of(Variable.normal("a", 0, 3), Variable.normal("b", 0, 4));
        return both
                ? twoSided("normal", Formula.sum(2), variables, 5 * z, exact)
                : upper("normal", Formula.sum(2), variables, 5 * z, exact);
    }

    /** Each triangular deviation is the sum of two uniform ones of half its width. */
    private static Rare triangular(double p) {
        UniformSum sum = UniformSum.of(0.5, 0.5, 0.5, 0.5, 0.5, 0.5);
        double bound = -sum.quantile(p);
        return upper("triangular", Formula.sum(3),
                Runs.many(3, key -> Runs.of(key, 0, 1, new Distribution.Triangular())), bound, sum.above(bound));
    }

    /** Each trapezoid is the sum of two uniform deviations. */
    private static Rare trapezoids(double p) {
        UniformSum sum = UniformSum.of(0.7, 0.3, 0.6, 0.4, 1);
        double bound = -sum.quantile(p);
        return upper("trapezoids", Formula.sum(3),
                List.of(Runs.of("a", 0, 1, new Distribution.Trapezoid(0.4)),
                        Runs.of("b", 0, 1, new Distribution.Trapezoid(0.2)), Runs.uniform("c", 0, 1)),
                bound, sum.above(bound));
    }

    private static Rare normalAndUniform(double p) {
        double bound = Bisection.root(s -> p - normalAndUniformAbove(s), 0, 20);
        return twoSided("normal and uniform", Formula.sum(2),
                List.of(Variable.normal("a", 0, 1), Runs.uniform("b", 0, 2)), bound, 2 * normalAndUniformAbove(bound));
    }

    private static double normalAndUniformAbove(double bound) {
        return Grid.mean(-2, 2, 4, b -> NORMAL.cumulativeProbability(b - bound));
    }

    /**
     * a + b·c with three uniform deviations of half-widths A, B, 1, like an offset and a drift: two ways out on each side. With
     * s = bound − A the probability of being above is ((s²/2)·ln(B/s) + (B² − s²)/4 − s·(B − s))/(4·A·B).
     */
    private static Rare product(double p) {
        double a = 1;
        double b = 2;
        double s = Bisection.root(at -> p - productAbove(at, a, b), 1e-9, b * (1 - 1e-6));
        return new Rare("product both sides " + 2 * p,
                new Formula(3, List.of(x -> x[0] + x[1] * x[2]), List.of(2)),
                List.of(Runs.uniform("a", 0, a), Runs.uniform("b", 0, b), Runs.uniform("c", 0, 1)),
                Range.of(-a - s, a + s), 2 * productAbove(s, a, b));
    }

    /** ∫ (z − s)·ln(B/z) dz from s to B, over 4AB; by quadrature, as the closed form loses all its digits. */
    private static double productAbove(double s, double a, double b) {
        return (b - s) * Grid.mean(s, b, z -> (z - s) * -Math.log1p((z - b) / b)) / (4 * a * b);
    }

    /** The same with a normal a, which alone could reach the bound too, but seldom does: the product must not be overlooked. */
    private static Rare productBesideNormal(double p) {
        double bound = Bisection.root(s -> p - productBesideNormalAbove(s), 1, 8);
        return new Rare("product beside normal both sides " + 2 * p,
                new Formula(3, List.of(x -> x[0] + x[1] * x[2]), List.of(2)),
                List.of(Variable.normal("a", 0, 0.3), Runs.uniform("b", 0, 2), Runs.uniform("c", 0, 1)),
                Range.of(-bound, bound), 2 * productBesideNormalAbove(bound));
    }

    private static double productBesideNormalAbove(double bound) {
        return Grid.mean(0, 1, 4, c -> Grid.mean(-2, 2, 8, b -> NORMAL.cumulativeProbability((b * c - bound) / 0.3)));
    }

    /** Numerical agreement of quadrature and closed form where the latter is good. */
    @Test
    void theProductsProbabilityIsTheClosedForm() {
        double s = 0.7;
        double closed = (s * s / 2 * Math.log(2 / s) + (4 - s * s) / 4 - s * (2 - s)) / 8;
        assertThat(productAbove(s, 1, 2)).isCloseTo(closed, within(1e-12));
    }

    @ParameterizedTest
    @MethodSource("events")
    void weightedEstimatesAreUnbiasedAndTheirErrorsHonest(Rare rare) {
        Honesty honesty = new Honesty(rare.name());
        int covered = 0;
        for (int seed = 1; seed <= SEEDS; seed++) {
            Probability found = new TailSampler(rare.model(), rare.variables(), seed).outside(0, rare.allowed())
                    .orElseThrow();
            assertThat(found.method()).isEqualTo(Probability.Method.WEIGHTED);
            assertThat(found.standardError()).isLessThan(0.15 * found.estimate());
            assertThat(found.estimate()).isPositive();
            assertThat(found.interval().min()).isPositive();
            covered += found.interval().contains(rare.exact()) ? 1 : 0;
            honesty.add(found.estimate(), found.standardError(), rare.exact());
        }
        honesty.check();
        // 95 %, less three and a half standard errors.
        assertThat(covered / (double) SEEDS).isGreaterThan(0.95 - 3.5 * Math.sqrt(0.95 * 0.05 / SEEDS));
    }

    /** The way that everyone takes chooses the weighted estimate where few trials were outside. */
    @ParameterizedTest
    @MethodSource("events")
    void runsReportRareEventsByWeightedTrials(Rare rare) {
        MonteCarlo.Run run = MonteCarlo.run(rare.model(), rare.variables(), List.of(rare.allowed()), 0.95,
                Runs.fixed(TRIALS, 3), Watch.NONE);
        Probability found = run.outputs().getFirst().outside();
        assertThat(found.method()).isEqualTo(Probability.Method.WEIGHTED);
        assertThat(found.estimate()).isCloseTo(rare.exact(), within(4.5 * found.standardError()));
        assertThat(run.outside().estimate()).isCloseTo(found.estimate(), within(1e-12 * found.estimate()));
        assertThat(run.outside().interval().min()).isPositive();
    }

    /** What cannot be tilted, or lies beyond what any input reaches, is counted: its interval does not end at 0. */
    @Test
    void nothingIsEverImpossible() {
        List<Variable> uniform = Runs.many(2, key -> Runs.uniform(key, 0, 1));
        List<Variable> arcsine = Runs.many(2, key -> Runs.of(key, 0, 1, new Distribution.ArcSine()));
        List<Variable> reel = Runs.many(2, key -> new Variable(key, Range.of(-1, 1), Runs.UNIFORM,
                Optional.of(new Reel("reel", 0.5))));
        for (List<Variable> variables : List.of(uniform, arcsine, reel)) {
            for (double bound : new double[]{2.5, 1e6}) {
                Probability found = Runs.only(Formula.sum(2), variables, Range.of(-bound, bound), 0.9973,
                        Runs.fixed(TRIALS, 1)).outside();
                assertThat(found.interval().max()).isPositive();
                assertThat(found.interval().min()).isLessThanOrEqualTo(found.estimate());
                assertThat(found.trials()).isPositive();
            }
        }
    }

    /** Several outputs: the event that any is outside is at least as probable as each, at most as their sum. */
    @Test
    void anyOutputOutsideIsBetweenTheLargestAndTheSum() {
        Model model = new Formula(2, List.of(x -> x[0], x -> x[1]), List.of());
        double bound = -NORMAL.inverseCumulativeProbability(5e-7);
        MonteCarlo.Run run = MonteCarlo.run(model,
                List.of(Variable.normal("a", 0, 1), Variable.normal("b", 0, 1)),
                List.of(Range.of(-bound, bound), Range.of(-bound, bound)), 0.95, Runs.fixed(TRIALS, 4), Watch.NONE);
        double each = 1e-6;
        double exact = 2 * each - each * each;
        for (Sampled output : run.outputs()) {
            assertThat(output.outside().estimate()).isCloseTo(each, within(4.5 * output.outside().standardError()));
        }
        assertThat(run.outside().interval().contains(exact)).isTrue();
        assertThat(run.outside().estimate()).isCloseTo(exact, within(0.2 * exact));
    }

    /** Where many are outside, plain counting decides, for each and for any. */
    @Test
    void frequentEventsAreCounted() {
        MonteCarlo.Run run = MonteCarlo.run(new Formula(2, List.of(x -> x[0], x -> x[1]), List.of()),
                Runs.many(2, key -> Runs.uniform(key, 0, 1)), List.of(Range.of(-0.9, 0.9), Range.of(-0.8, 2)), 0.95,
                Runs.fixed(TRIALS, 5), Watch.NONE);
        assertThat(run.outputs().get(0).outside().estimate()).isCloseTo(0.1, within(4 * 0.001));
        assertThat(run.outputs().get(1).outside().estimate()).isCloseTo(0.1, within(4 * 0.001));
        assertThat(run.outside().method()).isEqualTo(Probability.Method.COUNTED);
        assertThat(run.outside().estimate()).isCloseTo(1 - 0.9 * 0.9, within(4 * 0.00125));
        assertThat(run.outside().interval().contains(0.19)).isTrue();
    }
}
