package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Reel;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Effect indices against models whose indices are known in closed form. */
class SobolTest {

    private static final int SEEDS = 40;

    private static List<EffectSampler.Index> indices(Model model, List<Variable> variables, long seed) {
        return new EffectSampler(model, variables, seed).indices(Watch.NONE).getFirst();
    }

    private static void check(String name, Model model, List<Variable> variables, double[] first, double[] total) {
        List<Honesty> firsts = new ArrayList<>();
        List<Honesty> totals = new ArrayList<>();
        for (int i = 0; i < first.length; i++) {
            firsts.add(new Honesty("first order index " + i + " of " + name));
            totals.add(new Honesty("total index " + i + " of " + name));
        }
        for (int seed = 1; seed <= SEEDS; seed++) {
            List<EffectSampler.Index> found = indices(model, variables, seed);
            for (int i = 0; i < first.length; i++) {
                EffectSampler.Index index = found.get(i);
                assertThat(index.firstError()).isLessThan(0.03);
                assertThat(index.totalError()).isLessThan(0.03);
                firsts.get(i).add(index.first(), index.firstError(), first[i]);
                totals.get(i).add(index.total(), index.totalError(), total[i]);
            }
        }
        for (int i = 0; i < first.length; i++) {
            // The error is that of the numerator; what the variance in the denominator adds or takes away is left out of it.
            firsts.get(i).check(0.3);
            totals.get(i).check(0.3);
        }
    }

    /** sin x₁ + 7 sin² x₂ + 0.1 x₃⁴ sin x₁ over ±π: T. Ishigami, T. Homma, ISUMA 1990; indices in closed form. */
    @Test
    void ishigami() {
        double a = 7;
        double b = 0.1;
        double pi4 = Math.pow(Math.PI, 4);
        double v1 = 0.5 * Math.pow(1 + b * pi4 / 5, 2);
        double v2 = a * a / 8;
        double v13 = b * b * pi4 * pi4 * (1 / 18.0 - 1 / 50.0);
        double v = v1 + v2 + v13;
        // 0.3139, 0.4424, 0 and 0.5576, 0.4424, 0.2437 as printed in A. Saltelli et al., Global Sensitivity Analysis (memory).
        assertThat(v1 / v).isCloseTo(0.3139, within(5e-5));
        assertThat(v2 / v).isCloseTo(0.4424, within(5e-5));
        assertThat((v1 + v13) / v).isCloseTo(0.5576, within(5e-5));
        assertThat(v13 / v).isCloseTo(0.2437, within(5e-5));
        ToDoubleFunction<double[]> formula = x -> Math.sin(x[0]) + a * Math.pow(Math.sin(x[1]), 2)
                + b * Math.pow(x[2], 4) * Math.sin(x[0]);
        check("Ishigami", Formula.of(3, formula), Runs.many(3, key -> Runs.uniform(key, 0, Math.PI)),
                new double[]{v1 / v, v2 / v, 0}, new double[]{(v1 + v13) / v, v2 / v, v13 / v});
    }

    /** Linear: both indices are the share of the variance, whatever the distributions. */
    @Test
    void linear() {
        double[] variances = {4, 1.0 / 3, 9.0 / 6, 0.5};
        double sum = variances[0] + variances[1] + variances[2] + variances[3];
        double[] shares = {variances[0] / sum, variances[1] / sum, variances[2] / sum, variances[3] / sum};
        check("a sum", Formula.sum(4), List.of(Variable.normal("a", 10, 2), Runs.uniform("b", 3, 1),
                Runs.of("c", -2, 3, new Distribution.Triangular()), Runs.of("d", 0, 1, new Distribution.ArcSine())),
                shares, shares);
    }

    /** (μ₁ + x₁)·(μ₂ + x₂): V₁ = μ₂²σ₁², V₂ = μ₁²σ₂², V₁₂ = σ₁²σ₂². Without means all is joint. */
    @Test
    void product() {
        for (double mean : new double[]{0, 1}) {
            double v1 = mean * mean * 4;
            double v2 = mean * mean;
            double v12 = 4;
            double v = v1 + v2 + v12;
            check("a product about " + mean, Formula.of(2, x -> x[0] * x[1]),
                    List.of(Variable.normal("a", mean, 2), Variable.normal("b", mean, 1)),
                    new double[]{v1 / v, v2 / v}, new double[]{(v1 + v12) / v, (v2 + v12) / v});
        }
    }

    /** Pieces of one reel have one index: two of variance 1 and correlation r give 2 + 2r together. */
    @Test
    void piecesOfAReelHaveOneIndex() {
        double r = 0.5;
        Optional<Reel> reel = Optional.of(new Reel("reel", r));
        Range limits = Range.of(-1, 1);
        Distribution normal = new Distribution.Normal(1);
        double share = (2 + 2 * r) / (2 + 2 * r + 1);
        List<Variable> variables = List.of(new Variable("a", limits, normal, reel),
                new Variable("b", limits, normal, reel), Variable.normal("c", 0, 1));
        check("a reel", Formula.sum(3), variables, new double[]{share, share, 1 - share},
                new double[]{share, share, 1 - share});
    }

    @Test
    void constantsAndOutputsWithoutVarianceHaveNoIndex() {
        List<EffectSampler.Index> some = indices(Formula.sum(2),
                List.of(Variable.of("a", Range.exactly(2), Runs.UNIFORM), Runs.uniform("b", 0, 1)), 1);
        assertThat(some.get(0).total()).isZero();
        assertThat(some.get(1).total()).isCloseTo(1, within(4 * some.get(1).totalError()));
        List<EffectSampler.Index> none = indices(Formula.of(1, x -> 5), List.of(Runs.uniform("b", 0, 1)), 1);
        assertThat(none.getFirst().total()).isZero();
        assertThat(none.getFirst().first()).isZero();
    }

    @Test
    void theSameSeedGivesTheSameIndices() {
        List<Variable> variables = Runs.many(3, key -> Runs.uniform(key, 0, 1));
        assertThat(indices(Formula.sum(3), variables, 4)).isEqualTo(indices(Formula.sum(3), variables, 4))
                .isNotEqualTo(indices(Formula.sum(3), variables, 5));
    }
}
