package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Threshold;
import shuntwright.fixture.RandomCircuits;
import shuntwright.fixture.Records;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/** Circuits that differ by a scale only have results that differ by it only. */
class ScaleInvarianceTest {

    private final RandomCircuits circuits = RandomCircuits
            .full(RandomGeneratorFactory.of("L64X128MixRandom").create(53));

    /** Twice the resistance and thermal resistance at half the current: same voltages, same temperatures. */
    @Test
    void doubledResistanceHalvesEveryCurrent() {
        for (int i = 0; i < 200; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            Shunt shunt = drawn.circuit().shunt();
            RandomCircuits.Drawn scaled = Records.withPath(drawn, "circuit.shunt.resistance", 2 * shunt.resistance());
            scaled = Records.withPath(scaled, "circuit.shunt.mountingResistance",
                    scale(shunt.mountingResistance(), 2));
            scaled = Records.withPath(scaled, "circuit.shunt.rating.thermalResistance",
                    2 * shunt.rating().thermalResistance());
            scaled = Records.withPath(scaled, "demand", half(drawn.demand()));
            compare(drawn, scaled, 0.5);
        }
    }

    private static Demand half(Demand demand) {
        Channel channel = Records.withPath(demand.channel(), "currents.least",
                half(demand.channel().currents().least()));
        channel = Records.withPath(channel, "reading.calibration",
                channel.reading().calibration().map(each -> new Calibration(each.points(), half(each.lower()),
                        half(each.upper()), each.uncertainty(), each.temperature())));
        return new Demand(channel, demand.commonMode(), demand.load() / 2, scale(demand.tripWindow(), 0.5),
                demand.tripTarget() / 2, demand.rearm().map(window -> scale(window, 0.5)), demand.fullScale() / 2);
    }

    private static OptionalDouble half(OptionalDouble current) {
        return current.isPresent() ? OptionalDouble.of(current.getAsDouble() / 2) : current;
    }

    /** Threshold and hysteresis resistors three times as large with a third of the currents: same voltages. */
    @Test
    void impedanceOfTheThresholdDoesNotMatterByItself() {
        for (int i = 0; i < 200; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            RandomCircuits.Drawn scaled = Records.withPath(drawn, "circuit.comparator.inputs.biasCurrent",
                    scale(drawn.circuit().comparator().inputs().biasCurrent(), 1 / 3.0));
            if (drawn.circuit().threshold() instanceof Threshold.Divider divider) {
                scaled = Records.withPath(scaled, "circuit.threshold", new Threshold.Divider(divider.source(),
                        3 * divider.top(), 3 * divider.bottom(), divider.tap(), divider.users()));
            }
            HysteresisNetwork network = switch (drawn.circuit().network()) {
                case HysteresisNetwork.None none -> none;
                case HysteresisNetwork.SenseResistor(double resistance) ->
                    new HysteresisNetwork.SenseResistor(3 * resistance);
                case HysteresisNetwork.Feedback feedback -> new HysteresisNetwork.Feedback(3 * feedback.resistance(),
                        3 * feedback.pullUp(), feedback.pullVoltage(), feedback.supplied());
            };
            scaled = Records.withPath(scaled, "circuit.network", network);
            if (drawn.circuit().comparator().hysteresis() instanceof Hysteresis.InjectedCurrent injected) {
                scaled = Records.withPath(scaled, "circuit.comparator.hysteresis", new Hysteresis.InjectedCurrent(
                        new Toleranced(injected.current().nominal() / 3, injected.current().tolerance()),
                        injected.builtIn()));
            }
            compare(drawn, scaled, 1);
        }
    }

    private static Range scale(Range range, double factor) {
        return Range.of(range.min() * factor, range.max() * factor);
    }

    private static void compare(RandomCircuits.Drawn drawn, RandomCircuits.Drawn scaled, double factor) {
        boolean reads = drawn.around().adc().isPresent();
        List<ChannelAccuracy.Asked> former = ChannelAccuracy.asked(drawn.demand(), reads);
        List<ChannelAccuracy.Asked> now = ChannelAccuracy.asked(scaled.demand(), reads);
        assertThat(former).hasSize(reads ? 4 : 2);
        ChannelAccuracy before = ChannelAccuracy.of(drawn.circuit(), drawn.around(), drawn.demand());
        ChannelAccuracy after = ChannelAccuracy.of(scaled.circuit(), scaled.around(), scaled.demand());
        for (int i = 0; i < former.size(); i++) {
            Range limits = before.limits(former.get(i));
            double tolerance = 1e-11 * limits.max();
            Range found = after.limits(now.get(i));
            if (limits.max() == ChannelAccuracy.BEYOND) {
                assertThat(found).isEqualTo(limits);
                continue;
            }
            assertThat(found.min()).isCloseTo(limits.min() * factor, within(tolerance));
            assertThat(found.max()).isCloseTo(limits.max() * factor, within(tolerance));
            assertThat(after.nominal(now.get(i))).isCloseTo(before.nominal(former.get(i)) * factor, within(tolerance));
            double standard = before.combined(former.get(i), 0.95).standard();
            assertThat(after.combined(now.get(i), 0.95).standard()).isCloseTo(standard * factor,
                    within(Math.max(tolerance, 1e-9 * standard)));
        }
    }
}
