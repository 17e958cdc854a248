package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.fixture.RandomCircuits;

/** The combined standard uncertainty of a channel against the spread of its equations at uniform inputs. */
class PropagationAgainstSamplesTest {

    private static final int SAMPLES = 8000;

    /**
     * The spread of 8000 samples has a standard error of about 0.8 %; the rest of the 5 % is for what the second order
     * leaves out.
     */
    @Test
    void standardUncertaintyIsTheSpreadOfTheOutcome() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(83);
        RandomCircuits circuits = RandomCircuits.full(random);
        for (int i = 0; i < 100; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            ChannelAccuracy accuracy = ChannelAccuracy.of(drawn.circuit(), drawn.around(), drawn.demand());
            ChannelEquations equations = new ChannelEquations(drawn.circuit(), drawn.around());
            check(accuracy, new ChannelAccuracy.Asked(Outcome.TRIP, 0, drawn.demand().tripWindow()), equations.trip(),
                    drawn, random);
            check(accuracy, new ChannelAccuracy.Asked(Outcome.RELEASE, 0, drawn.demand().tripWindow()),
                    equations.release(), drawn, random);
        }
    }

    private static void check(ChannelAccuracy accuracy, ChannelAccuracy.Asked asked, Equation equation,
            RandomCircuits.Drawn drawn, RandomGenerator random) {
        InputDescription description = RandomPoints.describe(drawn);
        double[] x = description.nominal();
        double middle = accuracy.nominal(asked);
        double sum = 0;
        double squares = 0;
        for (int sample = 0; sample < SAMPLES; sample++) {
            RandomPoints.move(description, x, random);
            double deviation = equation.value(x) - middle;
            sum += deviation;
            squares += deviation * deviation;
        }
        double spread = Math.sqrt((squares - sum * sum / SAMPLES) / (SAMPLES - 1));
        double standard = accuracy.combined(asked, 0.95).standard();
        assertThat(standard).as("%s %s", asked.outcome(), description.inputs()).isCloseTo(spread,
                within(0.05 * spread));
    }
}
