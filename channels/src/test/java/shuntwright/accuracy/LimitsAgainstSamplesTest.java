package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.fixture.RandomCircuits;
import shuntwright.quantity.Range;

/** Nothing inside the box lies outside the limits: neither inner ambient temperatures nor mixed corners. */
class LimitsAgainstSamplesTest {

    private static final int CIRCUITS = 400;
    private static final int SAMPLES = 1500;

    private final RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(1717);

    @Test
    void samplesOfFullCircuitsStayWithinTheLimits() {
        RandomCircuits circuits = RandomCircuits.full(random);
        for (int i = 0; i < CIRCUITS; i++) {
            check(circuits.next());
        }
    }

    @Test
    void samplesOfSparseCircuitsStayWithinTheLimits() {
        for (int i = 0; i < CIRCUITS; i++) {
            check(RandomCircuits.sparse(random, 0.2).next());
        }
    }

    private void check(RandomCircuits.Drawn drawn) {
        InputDescription description = RandomPoints.describe(drawn);
        for (Outcomes.Named outcome : Outcomes.of(drawn)) {
            LimitsReader reader = new LimitsReader(outcome.equation(), description);
            LimitsReader.Corner lowest = reader.lowest();
            LimitsReader.Corner highest = reader.highest();
            double slack = 1e-12 * highest.value();
            Range limits = Range.of(lowest.value() - slack, highest.value() + slack);
            double[] x = description.nominal();
            for (int sample = 0; sample < SAMPLES; sample++) {
                switch (sample % 4) {
                    case 0 -> RandomPoints.move(description, x, random);
                    case 1 -> RandomPoints.corner(description, x, random);
                    case 2 -> RandomPoints.near(description, x, lowest.x(), random);
                    default -> RandomPoints.near(description, x, highest.x(), random);
                }
                double value = outcome.equation().value(x);
                if (!limits.contains(value)) {
                    assertThat(value).as("%s of %s", outcome.name(), description.inputs()).isBetween(limits.min(),
                            limits.max());
                }
            }
        }
    }
}
