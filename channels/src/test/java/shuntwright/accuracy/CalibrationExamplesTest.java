package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Worked examples of EA-4/02 M and JCGM 101:2008, and the divisors of the distributions. */
class CalibrationExamplesTest {

    private static final Distribution UNIFORM = new Distribution.Uniform();

    private static Estimate of(double value, double halfWidth, Distribution distribution) {
        return Estimate.of(value, distribution.standardUncertainty(Range.of(value - halfWidth, value + halfWidth)));
    }

    /** EA-4/02 S3, standard resistor of 10 kΩ: R = (R_S + δR_D + δR_TS)·r_C·r - δR_TX. */
    @Test
    void standardResistor() {
        Equation resistance = new Expression(
                x -> x[0].add(x[1]).add(x[2]).multiply(x[4]).multiply(x[5]).subtract(x[3]));
        Estimate certificate = Estimate.of(10000.053, new Distribution.Normal(2).standardUncertainty(
                Range.of(10000.053 - 5e-3, 10000.053 + 5e-3)));
        Propagation found = Propagation.firstOrder(resistance,
                List.of(certificate, of(0.020, 10e-3, UNIFORM), of(0, 2.75e-3, UNIFORM), of(0, 5.5e-3, UNIFORM),
                        of(1, 1e-6, new Distribution.Triangular()), new Estimate(1.0000105, 0.07e-6, 4)));
        assertThat(found.value()).isCloseTo(10000.1780007665, within(1e-9));
        assertThat(found.standard()).isCloseTo(8.328e-3, within(2e-6));
        assertThat(found.expanded(0.9545).expanded()).isCloseTo(17e-3, within(0.5e-3));
    }

    /** EA-4/02 S9, hand-held multimeter at 100 V: 1.0 mV, 29 mV, 6.4 mV. */
    @Test
    void multimeter() {
        assertThat(sum(Estimate.of(0, 1.0e-3), Estimate.of(0, 29e-3), Estimate.of(0, 6.4e-3)).standard())
                .isCloseTo(29.715e-3, within(1e-6));
    }

    /** EA-4/02 S10, caliper: 0.46, 1.15·1.7, 15 and 29 µm. */
    @Test
    void caliper() {
        Equation length = new Expression(x -> x[0].add(x[1].multiply(1.7)).add(x[2]).add(x[3]));
        Propagation found = Propagation.firstOrder(length, List.of(Estimate.of(0, 0.46), Estimate.of(0, 1.15),
                Estimate.of(0, 15), Estimate.of(0, 29)));
        assertThat(found.standard()).isCloseTo(32.71, within(0.005));
    }

    /** EA-4/02 S12: 0.6e-3 with 2 degrees of freedom, 0.68e-3 with infinitely many; k = 2.28. */
    @Test
    void fewDegreesOfFreedom() {
        CombinedUncertainty found = sum(new Estimate(0, 0.6e-3, 2), Estimate.of(0, 0.68e-3)).expanded(0.9545);
        assertThat(found.standard()).isCloseTo(0.91e-3, within(0.005e-3));
        assertThat(found.coverageFactor()).isCloseTo(2.28, within(0.005));
        // Printed rounded down from 2.07e-3.
        assertThat(found.expanded()).isCloseTo(2.0e-3, within(0.1e-3));
    }

    private static Propagation sum(Estimate... inputs) {
        return Propagation.firstOrder(new Expression(x -> {
            var sum = x[0];
            for (int i = 1; i < x.length; i++) {
                sum = sum.add(x[i]);
            }
            return sum;
        }), List.of(inputs));
    }

    /** JCGM 101:2008 9.3, deviation of a weight in mg: an input without first order sensitivity that matters. */
    @Test
    void massCalibration() {
        Equation deviation = new Expression(x -> x[0].add(x[1])
                .multiply(x[2].subtract(1.2).multiply(x[3].reciprocal().subtract(x[4].reciprocal())).add(1))
                .subtract(100000));
        List<Estimate> inputs = List.of(Estimate.of(100000, 0.050), Estimate.of(1.234, 0.020), of(1.2, 0.1, UNIFORM),
                of(8000, 1000, UNIFORM), of(8000, 50, UNIFORM));
        Propagation second = Propagation.secondOrder(deviation, inputs);
        assertThat(second.value()).isCloseTo(1.2340, within(5e-5));
        assertThat(Propagation.firstOrder(deviation, inputs).standard()).isCloseTo(0.0538516, within(1e-7));
        assertThat(second.standard()).isCloseTo(0.0749630, within(1e-4));
    }

    /** JCGM 101:2008 9.4; correlated inputs as a combination of independent ones. */
    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/sum-of-squares.csv", delimiter = ';', useHeadersInDisplayName = true)
    void sumOfSquares(double x1, double r, double firstOrder, double secondOrder) {
        double rest = Math.sqrt(1 - r * r);
        Equation y = new Expression(
                x -> x[0].square().add(x[0].subtract(x1).multiply(r).add(x[1].multiply(rest)).square()));
        List<Estimate> inputs = List.of(Estimate.of(x1, 0.005), Estimate.of(0, 0.005));
        assertThat(Propagation.firstOrder(y, inputs).standard()).isCloseTo(firstOrder, within(1e-12));
        double exact = Math.sqrt(4 * 25e-6 * x1 * x1 + 4 * 25e-6 * 25e-6 * (1 + r * r));
        assertThat(Propagation.secondOrder(y, inputs).standard()).isCloseTo(secondOrder, within(0.5e-6))
                .isCloseTo(exact, within(1e-15));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/divisors.csv", delimiter = ';', useHeadersInDisplayName = true)
    void divisors(String word, double parameter, double standard) {
        Distribution distribution = switch (word) {
            case "uniform" -> new Distribution.Uniform();
            case "triangular" -> new Distribution.Triangular();
            case "arcsine" -> new Distribution.ArcSine();
            case "trapezoid" -> new Distribution.Trapezoid(parameter);
            case "normal" -> new Distribution.Normal(parameter);
            default -> throw new IllegalArgumentException(word);
        };
        assertThat(distribution.word()).isEqualTo(word);
        assertThat(distribution.standardUncertainty(Range.of(-1, 1))).isCloseTo(standard, within(1e-14));
        assertThat(distribution.standardUncertainty(Range.of(3, 7))).isCloseTo(2 * standard, within(1e-14));
    }
}
