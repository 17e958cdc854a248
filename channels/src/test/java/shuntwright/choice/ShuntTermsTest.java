package shuntwright.choice;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Acceptance;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.fixture.RandomCircuits;
import shuntwright.fixture.Records;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;

/** What the search works out beforehand for shunts and amplifiers, against iteration and against exact limits. */
class ShuntTermsTest {

    private final RandomCircuits circuits = RandomCircuits
            .full(RandomGeneratorFactory.of("L64X128MixRandom").create(71));

    private static ChannelProblem problem(RandomCircuits.Drawn drawn) {
        return new ChannelProblem(drawn.demand(), drawn.around(), Catalogue.EMPTY, List.of(), Optional.empty(),
                List.of(), new PullUp(1e4, drawn.around().supply(), true, false), Acceptance.DEFAULT, 1);
    }

    @Test
    void extremeVoltagesAreThoseOfAllCornersByIteration() {
        for (int i = 0; i < 300; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            ShuntTerms terms = new ShuntTerms(drawn.circuit().shunt(), drawn.circuit().shuntCount(), problem(drawn));
            for (int end = 0; end < 2; end++) {
                Range local = drawn.around().local();
                double temperature = end == 0 ? local.min() : local.max();
                Range window = drawn.demand().tripWindow();
                check(terms.noTripHigh[end], corners(drawn, window.min(), temperature).max());
                check(terms.mustTripLow[end], corners(drawn, window.max(), temperature).min());
                Range rearm = drawn.demand().rearm().orElseThrow();
                check(terms.rearmLowHigh[end], corners(drawn, rearm.min(), temperature).max());
                check(terms.rearmHighLow[end], corners(drawn, rearm.max(), temperature).min());
            }
        }
    }

    private static void check(double found, double expected) {
        assertThat(found).isCloseTo(expected, within(1e-10 * expected));
    }

    /** All shunts at the same corner: tolerance, ageing, coefficient and joints. */
    private static Range corners(RandomCircuits.Drawn drawn, double current, double ambient) {
        Shunt shunt = drawn.circuit().shunt();
        double each = current / drawn.circuit().shuntCount();
        double low = Double.POSITIVE_INFINITY;
        double high = 0;
        for (int corner = 0; corner < 16; corner++) {
            double tolerance = (corner & 1) == 0 ? shunt.tolerance().above() : -shunt.tolerance().below();
            double ageing = (corner & 2) == 0 ? shunt.ageing() : -shunt.ageing();
            double drift = (corner & 4) == 0 ? shunt.temperatureCoefficient() : -shunt.temperatureCoefficient();
            Range joints = shunt.mountingResistance();
            double joint = (corner & 8) == 0 ? joints.max() : joints.min();
            double temperature = ambient;
            double resistance = 0;
            for (int step = 0; step < 60; step++) {
                resistance = shunt.resistance() * (1 + tolerance) * (1 + ageing) * (1 + drift * (temperature - 25))
                        + joint * (1 + 0.00393 * (temperature - 20));
                temperature = ambient + shunt.rating().thermalResistance() * each * each * resistance;
            }
            low = Math.min(low, each * resistance);
            high = Math.max(high, each * resistance);
        }
        return Range.of(low, high);
    }

    /** The search may exclude a pair by its readings only when the exact limits fail too. */
    @Test
    void roomOfReadingsIsNeverLessThanTheExactOne() {
        int compared = 0;
        for (int i = 0; i < 400; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            if (drawn.around().adc().isEmpty()) {
                continue;
            }
            drawn = Records.with(drawn, "demand", reading(drawn.demand()));
            ChannelProblem problem = problem(drawn);
            AmplifierTerms amplifiers = new AmplifierTerms(List.of(drawn.circuit().amplifier()), problem);
            ShuntTerms shunts = new ShuntTerms(drawn.circuit().shunt(), drawn.circuit().shuntCount(), problem);
            double room = new Readings(problem, amplifiers).room(shunts, 0);
            ChannelAccuracy accuracy = ChannelAccuracy.of(drawn.circuit(), drawn.around(), drawn.demand());
            double exact = Double.POSITIVE_INFINITY;
            for (ChannelAccuracy.Asked asked : ChannelAccuracy.asked(drawn.demand(), true)) {
                if (asked.outcome() == Outcome.READING_AT_LEAST || asked.outcome() == Outcome.READING_AT_LOAD) {
                    compared++;
                    Range limits = accuracy.limits(asked);
                    exact = Math.min(exact, Math.min(asked.allowed().max() - limits.max(),
                            limits.min() - asked.allowed().min()) / asked.current());
                }
            }
            assertThat(room).isGreaterThanOrEqualTo(exact - 1e-12);
        }
        assertThat(compared).isGreaterThan(200);
    }

    private static Demand reading(Demand demand) {
        double load = demand.load();
        Channel.Currents currents = Records.with(Channel.Currents.NONE, "least", OptionalDouble.of(load / 10));
        Channel channel = demand.channel().withCurrents(currents)
                .withReading(
                        new Channel.ReadingDemand(OptionalDouble.of(0.1), OptionalDouble.of(0.02), Optional.empty()));
        return Records.with(demand, "channel", channel);
    }
}
