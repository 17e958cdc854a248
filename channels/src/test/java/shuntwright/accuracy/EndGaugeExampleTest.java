package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;

import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** The end gauge of JCGM 100:2008, H.1: combination, degrees of freedom, next terms of the Taylor series. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class EndGaugeExampleTest {

    /** l = ls + d + d1 + d2 - ls·(δα·(θ + Δ) + αs·δθ), in the order of the table (H.1.2, eq. H.3). */
    private static final Equation LENGTH = new Expression(x -> x[0].add(x[1]).add(x[2]).add(x[3])
            .subtract(x[0].multiply(x[7].multiply(x[5].add(x[6])).add(x[4].multiply(x[8])))));

    private final List<Estimate> inputs = new ArrayList<>();

    @BeforeAll
    void read() {
        for (String[] row : Table.rows("/shuntwright/accuracy/gum-h1.csv")) {
            inputs.add(new Estimate(Double.parseDouble(row[1]), Double.parseDouble(row[2]),
                    Double.parseDouble(row[3])));
        }
    }

    @Test
    void combinedUncertaintyAndDegreesOfFreedomAreThePublished() {
        Propagation first = Propagation.firstOrder(LENGTH, inputs);
        assertThat(first.value()).isCloseTo(50000838, within(1e-6));
        assertThat(first.standard()).isCloseTo(31.66387911, within(1e-6));
        assertThat(Math.round(first.standard())).isEqualTo(32);
        assertThat(first.effectiveDegreesOfFreedom()).isCloseTo(16.75185574, within(1e-6));
        CombinedUncertainty expanded = first.expanded(0.99);
        assertThat(expanded.expanded()).isCloseTo(92.4832762, within(1e-5));
        assertThat(Math.round(expanded.coverageFactor() * 32)).isEqualTo(93);
    }

    @Test
    void contributionsAreThePublished() {
        Propagation first = Propagation.firstOrder(LENGTH, inputs);
        assertThat(Math.sqrt(first.variancePart(0))).isCloseTo(25, within(0.05));
        assertThat(Math.sqrt(first.variancePart(1) + first.variancePart(2) + first.variancePart(3)))
                .isCloseTo(9.68194, within(1e-5));
        assertThat(first.variancePart(4) + first.variancePart(5) + first.variancePart(6)).isZero();
        assertThat(Math.sqrt(first.variancePart(7))).isCloseTo(2.88679, within(1e-5));
        assertThat(Math.sqrt(first.variancePart(8))).isCloseTo(16.59903, within(1e-5));
    }

    @Test
    void nextTermsAreThePublished() {
        Propagation second = Propagation.secondOrder(LENGTH, inputs);
        assertThat(second.standard()).isCloseTo(33.8065, within(5e-4));
        assertThat(Math.round(second.standard())).isEqualTo(34);
        double added = 0;
        for (int i = 0; i < inputs.size(); i++) {
            added += second.variancePart(i);
        }
        assertThat(added).isCloseTo(second.standard() * second.standard(), within(1e-9));
        // H.1.7: 11.7 nm from δα·(θ + Δ), 1.7 nm from αs·δθ; half of each stands with either factor.
        assertThat(Math.sqrt(2 * (second.variancePart(5) + second.variancePart(6)))).isCloseTo(11.7, within(0.05));
        assertThat(Math.sqrt(2 * second.variancePart(4))).isCloseTo(1.7, within(0.05));
    }

    /** G.4.1: three relative uncertainties in per cent with 9, 4 and 14 degrees of freedom. */
    @Test
    void effectiveDegreesOfAProductAreThePublished() {
        Equation product = new Expression(x -> x[0].multiply(x[1]).multiply(x[2]));
        Propagation first = Propagation.firstOrder(product,
                List.of(new Estimate(1, 0.0025, 9), new Estimate(1, 0.0057, 4), new Estimate(1, 0.0082, 14)));
        assertThat(first.standard()).isCloseTo(0.0103, within(5e-5));
        assertThat(first.effectiveDegreesOfFreedom()).isCloseTo(18.99874231, within(1e-8));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/coverage-factors.csv", delimiter = ';', useHeadersInDisplayName = true)
    void coverageFactorsAreThePublished(double degrees, double probability, double k, double tolerance) {
        assertThat(Propagation.coverageFactor(degrees, probability)).isCloseTo(k, within(tolerance));
    }
}
