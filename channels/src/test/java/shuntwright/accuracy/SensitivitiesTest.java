package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Optional;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.hipparchus.analysis.differentiation.Gradient;
import org.junit.jupiter.api.Test;

import shuntwright.board.Calibration;
import shuntwright.fixture.RandomCircuits;

/** Values and partial derivatives of the equations against a differentiation library. */
class SensitivitiesTest {

    private static final int CIRCUITS = 400;

    @Test
    void valuesAndDerivativesAreThoseOfAutomaticDifferentiation() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(23);
        RandomCircuits circuits = RandomCircuits.full(random);
        int read = 0;
        EnumMap<Calibration.Points, Integer> calibrated = new EnumMap<>(Calibration.Points.class);
        for (int i = 0; i < CIRCUITS; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            double[] x = RandomPoints.within(drawn, random);
            ChannelEquations equations = new ChannelEquations(drawn.circuit(), drawn.around());
            IndependentEquations independent = new IndependentEquations(drawn, x);
            compare("trip", equations.trip(), independent.crossing(false), x);
            compare("release", equations.release(), independent.crossing(true), x);
            compare("threshold", new ThresholdVoltage(equations, false), independent.threshold(false), x);
            compare("release voltage", new ThresholdVoltage(equations, true), independent.threshold(true), x);
            if (drawn.around().adc().isPresent()) {
                read++;
                double load = drawn.demand().load();
                compare("reading", equations.reading(load), independent.reading(load), x);
                Optional<Calibration> calibration = drawn.demand().channel().reading().calibration();
                if (calibration.isPresent()) {
                    calibrated.merge(calibration.get().points(), 1, Integer::sum);
                    double at = load * random.nextDouble(0.05, 1.2);
                    compare("calibrated " + calibration, new CalibratedReading(equations, calibration.get(), load, at),
                            independent.calibrated(at), x);
                }
            }
        }
        assertThat(calibrated.values()).hasSize(2).allMatch(count -> count > CIRCUITS / 20);
        assertThat(read).isGreaterThan(CIRCUITS / 4);
    }

    private static void compare(String what, Equation equation, Gradient expected, double[] x) {
        double[] gradient = new double[x.length];
        Arrays.fill(gradient, Double.NaN);
        double value = equation.gradient(x, gradient);
        assertThat(value).as(what).isCloseTo(expected.getValue(), within(1e-10 * Math.abs(value)));
        assertThat(equation.value(x)).as(what).isEqualTo(value);
        double[] derivatives = expected.getGradient();
        for (int i = 0; i < x.length; i++) {
            // Terms of opposite sign may nearly cancel, as with the ambient temperature: measured against all terms.
            double scale = Math.abs(derivatives[i]) + Math.abs(value) * 1e-6;
            assertThat(gradient[i]).as("%s by input %d", what, i).isCloseTo(derivatives[i], within(1e-8 * scale));
        }
    }
}
