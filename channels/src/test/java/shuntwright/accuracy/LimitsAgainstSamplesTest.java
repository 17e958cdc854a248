package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.fixture.RandomCircuits;
import shuntwright.quantity.Range;

/** Nothing inside the box lies outside the limits: neither inner ambient temperatures nor mixed corners. */
class LimitsAgainstSamplesTest {

    private static final int CIRCUITS = 400;
    private static final int SAMPLES = 1500;
    private static final int CLIMBS = 20;

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
            if (!Outcomes.hasLimits(outcome.equation(), description)) {
                continue;
            }
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

    /** From corners anywhere, one input after the other goes to its other end as long as that leads further out. */
    @Test
    void climbsFromRandomCornersEndWithinTheLimits() {
        RandomCircuits circuits = RandomCircuits.full(random);
        int calibrated = 0;
        int without = 0;
        for (int i = 0; i < CIRCUITS; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            InputDescription description = RandomPoints.describe(drawn);
            for (Outcomes.Named outcome : Outcomes.of(drawn)) {
                calibrated += outcome.equation() instanceof CalibratedReading ? 1 : 0;
                if (!Outcomes.hasLimits(outcome.equation(), description)) {
                    without++;
                    continue;
                }
                List<LimitsReader.Corner> extremes = new LimitsReader(outcome.equation(), description).extremes();
                for (int climb = 0; climb < CLIMBS; climb++) {
                    boolean up = climb % 2 == 0;
                    double found = extremes.get(up ? 1 : 0).value();
                    double reached = climb(outcome.equation(), description, up);
                    double slack = Math.abs(found) * 1e-12;
                    assertThat(reached).as(outcome.name()).isBetween(up ? Double.NEGATIVE_INFINITY : found - slack,
                            up ? found + slack : Double.POSITIVE_INFINITY);
                }
            }
        }
        assertThat(calibrated).isGreaterThan(CIRCUITS / 2);
        assertThat(without).isLessThan(calibrated / 20);
    }

    private double climb(Equation equation, InputDescription description, boolean up) {
        double[] x = description.nominal();
        for (Input input : description.inputs()) {
            x[Layout.index(input)] = random.nextBoolean() ? input.limits().min() : input.limits().max();
        }
        double value = equation.value(x);
        boolean moved = true;
        while (moved) {
            moved = false;
            for (Input input : description.inputs()) {
                int at = Layout.index(input);
                double before = x[at];
                x[at] = before == input.limits().min() ? input.limits().max() : input.limits().min();
                double now = equation.value(x);
                if (up ? now > value : now < value) {
                    value = now;
                    moved = true;
                } else {
                    x[at] = before;
                }
            }
        }
        return value;
    }
}
