package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.sampling.Runs.MILLION;
import static shuntwright.sampling.Runs.fixed;

import java.util.ArrayList;
import java.util.List;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** The additive models of JCGM 101:2008, 9.2, and whether what is printed as standard errors is what ends really scatter by. */
class AdditiveModelsTest {

    private static final double COVERAGE = 0.95;
    private static final double TAIL = 0.025;
    private static final Model SUM = Formula.sum(4);

    private static List<Variable> variables(String distribution, double... standards) {
        List<Variable> variables = new ArrayList<>();
        for (double standard : standards) {
            String key = "x" + variables.size();
            variables.add(distribution.equals("normal")
                    ? Variable.normal(key, 0, standard)
                    : Runs.uniform(key, standard));
        }
        return variables;
    }

    private static UniformSum law(double... standards) {
        double[] halves = new double[standards.length];
        for (int i = 0; i < halves.length; i++) {
            halves[i] = standards[i] * Math.sqrt(3);
        }
        return UniformSum.of(halves);
    }

    /** Density at the upper end. */
    private static double density(String distribution, double standard, double end, double... standards) {
        return distribution.equals("normal")
                ? new NormalDistribution(0, standard).density(end)
                : law(standards).density(end);
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/additive-models.csv", delimiter = ';', useHeadersInDisplayName = true)
    void areThePublished(String example, String distribution, double sd1, double sd2, double sd3, double sd4,
            double standard, double exact, double printed, double tolerance) {
        Sampled found = Runs.only(SUM, variables(distribution, sd1, sd2, sd3, sd4), COVERAGE, fixed(MILLION, 1));
        double slip = Math.sqrt(TAIL * (1 - TAIL) / MILLION)
                / density(distribution, standard, exact, sd1, sd2, sd3, sd4);
        CoverageInterval symmetric = found.symmetric();
        assertThat(found.mean()).isCloseTo(0, within(4 * standard / 1000));
        assertThat(found.standard()).isCloseTo(standard, within(4 * standard / 1000 / Math.sqrt(2)));
        assertThat(symmetric.range().min()).isCloseTo(-exact, within(4 * slip)).isCloseTo(-printed,
                within(4 * slip + tolerance));
        assertThat(symmetric.range().max()).isCloseTo(exact, within(4 * slip)).isCloseTo(printed,
                within(4 * slip + tolerance));
        assertThat(symmetric.standardErrors().low()).isCloseTo(slip, within(0.1 * slip));
        assertThat(symmetric.standardErrors().high()).isCloseTo(slip, within(0.1 * slip));
        // Symmetric about 0, so the shortest interval is the same one; its ends are less sharp.
        assertThat(found.shortest().range().max()).isCloseTo(exact, within(20 * slip));
        assertThat(found.shortest().range().min()).isCloseTo(-exact, within(20 * slip));
        assertThat(found.shortest().range().width()).isLessThanOrEqualTo(symmetric.range().width() * (1 + 1e-4));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/additive-models.csv", delimiter = ';', useHeadersInDisplayName = true)
    void exactEndsAreThoseOfTheClosedForms(String example, String distribution, double sd1, double sd2, double sd3,
            double sd4, double standard, double exact) {
        double end = distribution.equals("normal")
                ? 2 * new NormalDistribution(0, 1).inverseCumulativeProbability(1 - TAIL)
                : law(sd1, sd2, sd3, sd4).quantile(1 - TAIL);
        assertThat(end).isCloseTo(exact, within(1e-6));
        assertThat(standard).isCloseTo(Math.sqrt(sd1 * sd1 + sd2 * sd2 + sd3 * sd3 + sd4 * sd4), within(1e-6));
    }

    @Test
    void theEndOfFourEqualUniformIsAFormula() {
        assertThat(law(1, 1, 1, 1).quantile(1 - TAIL)).isCloseTo(2 * Math.sqrt(3) * (2 - Math.pow(0.6, 0.25)),
                within(1e-12));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/additive-models.csv", delimiter = ';', useHeadersInDisplayName = true)
    void printedErrorsOfTheEndsAreHonest(String example, String distribution, double sd1, double sd2, double sd3,
            double sd4, double standard, double exact) {
        int trials = 20_000;
        Honesty low = new Honesty("low end of " + example);
        Honesty high = new Honesty("high end of " + example);
        Honesty mean = new Honesty("mean of " + example);
        for (int seed = 1; seed <= 100; seed++) {
            Sampled found = Runs.only(SUM, variables(distribution, sd1, sd2, sd3, sd4), COVERAGE,
                    fixed(trials, seed));
            CoverageInterval interval = found.symmetric();
            low.add(interval.range().min(), interval.standardErrors().low(), -exact);
            high.add(interval.range().max(), interval.standardErrors().high(), exact);
            mean.add(found.mean(), found.standard() / Math.sqrt(trials), 0);
        }
        low.check();
        high.check();
        mean.check();
    }

    /** Where too few plain trials lie beyond an end, weighted ones decide. */
    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/sampling/additive-models.csv", delimiter = ';', useHeadersInDisplayName = true)
    void printedErrorsOfFarEndsAreHonestToo(String example, String distribution, double sd1, double sd2, double sd3,
            double sd4, double standard) {
        double tail = 1e-6;
        double exact = distribution.equals("normal")
                ? standard * -new NormalDistribution(0, 1).inverseCumulativeProbability(tail)
                : -law(sd1, sd2, sd3, sd4).quantile(tail);
        List<Variable> variables = variables(distribution, sd1, sd2, sd3, sd4);
        Honesty end = new Honesty("far end of " + example);
        for (int seed = 1; seed <= 50; seed++) {
            // From a guess that is as wrong as a normal distribution of the same spread would be.
            double guess = standard * -new NormalDistribution(0, 1).inverseCumulativeProbability(tail);
            TailSampler.Estimate found = new TailSampler(SUM, variables, seed).quantile(0, tail, guess, true)
                    .orElseThrow();
            end.add(found.value(), found.standardError(), exact);
        }
        end.check();
        // The same by the way that everyone takes; a hundred thousand plain trials know nothing of one in a million.
        CoverageInterval interval = Runs.only(SUM, variables, 1 - 2 * tail, fixed(100_000, 51)).symmetric();
        assertThat(interval.standardErrors().low()).isLessThan(0.005 * exact);
        assertThat(interval.range().min()).isCloseTo(-exact, within(4 * interval.standardErrors().low()));
        assertThat(interval.range().max()).isCloseTo(exact, within(4 * interval.standardErrors().high()));
    }
}
