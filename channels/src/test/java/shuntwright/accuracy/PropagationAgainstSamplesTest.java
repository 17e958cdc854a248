package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.fixture.RandomCircuits;

/** The combined standard uncertainty of a channel against the spread of its equations at inputs drawn from their distributions. */
class PropagationAgainstSamplesTest {

    private static final int SAMPLES = 8000;

    /**
     * The spread of 8000 samples has a standard error of about 0.8 %; the rest of the 4 % is for what the second order
     * leaves out.
     */
    @Test
    void standardUncertaintyIsTheSpreadOfTheOutcome() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(83);
        RandomCircuits circuits = RandomCircuits.full(random);
        int calibrated = 0;
        int correlated = 0;
        for (int i = 0; i < 100; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            boolean reads = drawn.around().adc().isPresent();
            calibrated += reads && drawn.demand().channel().reading().calibration().isPresent() ? 1 : 0;
            correlated += RandomPoints.describe(drawn).correlation().length > 0 ? 1 : 0;
            for (ChannelAccuracy.Asked asked : ChannelAccuracy.asked(drawn.demand(), reads)) {
                // At the least current errors may be as large as the signal, and then no second order describes them.
                if (asked.outcome() != Outcome.READING_AT_LEAST) {
                    check(drawn, asked, random);
                }
            }
        }
        assertThat(calibrated).isGreaterThan(15);
        assertThat(correlated).isGreaterThan(30);
    }

    private static Equation equation(RandomCircuits.Drawn drawn, ChannelAccuracy.Asked asked) {
        ChannelEquations equations = new ChannelEquations(drawn.circuit(), drawn.around());
        return switch (asked.outcome()) {
            case TRIP -> equations.trip();
            case RELEASE -> equations.release();
            case READING_AT_LEAST, READING_AT_LOAD -> drawn.demand().channel().reading().calibration()
                    .<Equation>map(each -> new CalibratedReading(equations, each, drawn.demand().load(),
                            asked.current()))
                    .orElseGet(() -> equations.reading(asked.current()));
        };
    }

    private static void check(RandomCircuits.Drawn drawn, ChannelAccuracy.Asked asked, RandomGenerator random) {
        ChannelAccuracy accuracy = ChannelAccuracy.of(drawn.circuit(), drawn.around(), drawn.demand());
        Equation equation = equation(drawn, asked);
        InputDescription description = RandomPoints.describe(drawn);
        double[] x = description.nominal();
        double middle = accuracy.nominal(asked);
        double sum = 0;
        double squares = 0;
        for (int sample = 0; sample < SAMPLES; sample++) {
            RandomPoints.draw(description, x, random);
            double deviation = equation.value(x) - middle;
            sum += deviation;
            squares += deviation * deviation;
        }
        double spread = Math.sqrt((squares - sum * sum / SAMPLES) / (SAMPLES - 1));
        double standard = accuracy.combined(asked, 0.95).standard();
        assertThat(standard).as("%s %s", asked.outcome(), description.inputs()).isCloseTo(spread,
                within(0.04 * spread));
    }
}
