package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.board.Calibration;
import shuntwright.circuit.Surroundings;
import shuntwright.fixture.RandomCircuits;
import shuntwright.fixture.Records;
import shuntwright.parts.Hysteresis;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** Tightening any single limit never widens the limits of any outcome. */
class TighteningTest {

    private static final double LEFT = 0.6;

    @ParameterizedTest
    @ValueSource(strings = {"circuit.shunt.tolerance", "circuit.shunt.temperatureCoefficient", "circuit.shunt.ageing",
            "circuit.shunt.mountingResistance", "circuit.shunt.thermalEmf", "circuit.amplifier.gainError",
            "circuit.amplifier.gainDrift",
            "circuit.amplifier.gainAgeing", "circuit.amplifier.input.offset", "circuit.amplifier.input.offsetDrift",
            "circuit.amplifier.input.rejection", "circuit.amplifier.input.supplyRejection",
            "circuit.amplifier.input.biasCurrent", "circuit.comparator.inputs.offset",
            "circuit.comparator.inputs.offsetDrift", "circuit.comparator.inputs.biasCurrent",
            "circuit.comparator.output.lowLevel", "circuit.resistors.tolerance",
            "circuit.resistors.temperatureCoefficient", "circuit.resistors.ageing", "around.ambient", "around.supply",
            "around.zone", "demand.commonMode", "demand.channel.reading.calibration"})
    void limitsStayWithinTheFormer(String path) {
        RandomCircuits circuits = RandomCircuits.full(RandomGeneratorFactory.of("L64X128MixRandom").create(41));
        int narrower = 0;
        for (int i = 0; i < 60; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            boolean decibel = path.endsWith("ejection");
            Object value = Records.getPath(drawn, path);
            RandomCircuits.Drawn tight = Records.withPath(drawn, path,
                    decibel ? (Object) ((double) value + 6) : tightened(value));
            narrower += compare(drawn, tight);
        }
        assertThat(narrower).isPositive();
    }

    @Test
    void narrowerHysteresisStaysWithin() {
        RandomCircuits circuits = RandomCircuits.full(RandomGeneratorFactory.of("L64X128MixRandom").create(43));
        int narrower = 0;
        for (int i = 0; i < 200; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            Hysteresis tight = switch (drawn.circuit().comparator().hysteresis()) {
                case Hysteresis.InjectedCurrent injected -> new Hysteresis.InjectedCurrent(
                        (Toleranced) tightened(injected.current()), (Range) tightened(injected.builtIn()));
                case Hysteresis.PositiveFeedback feedback ->
                    new Hysteresis.PositiveFeedback((Range) tightened(feedback.builtIn()));
                case Hysteresis.BuiltIn builtIn -> new Hysteresis.BuiltIn((Range) tightened(builtIn.builtIn()));
                case Hysteresis.Latched latched -> latched;
            };
            narrower += compare(drawn, Records.withPath(drawn, "circuit.comparator.hysteresis", tight));
        }
        assertThat(narrower).isPositive();
    }

    private static Object tightened(Object limit) {
        return switch (limit) {
            case Double magnitude -> magnitude * LEFT;
            case Tolerance tolerance -> new Tolerance(tolerance.below() * LEFT, tolerance.above() * LEFT);
            case Toleranced toleranced ->
                new Toleranced(toleranced.nominal(), (Tolerance) tightened(toleranced.tolerance()));
            case Range range ->
                Range.of(range.mid() - LEFT / 2 * range.width(), range.mid() + LEFT / 2 * range.width());
            case Spread spread -> new Spread(spread.nominal() - LEFT * (spread.nominal() - spread.min()),
                    spread.nominal(), spread.nominal() + LEFT * (spread.max() - spread.nominal()));
            case Optional<?> maybe -> maybe.map(TighteningTest::tightened);
            case Surroundings.ZoneRise rise -> new Surroundings.ZoneRise(rise.zone(), LEFT * rise.most());
            case Calibration c -> new Calibration(c.points(), c.lower(), c.upper(), LEFT * c.uncertainty(),
                    (Range) tightened(c.temperature()));
            default -> throw new IllegalArgumentException(limit.toString());
        };
    }

    /** How many outcomes became narrower. */
    private static int compare(RandomCircuits.Drawn wide, RandomCircuits.Drawn tight) {
        List<Outcomes.Named> before = Outcomes.of(wide);
        List<Outcomes.Named> after = Outcomes.of(tight);
        int narrower = 0;
        for (int i = 0; i < before.size(); i++) {
            Range former = limits(before.get(i), wide);
            Range now = limits(after.get(i), tight);
            double slack = 1e-12 * Math.abs(former.max());
            assertThat(now.min()).as(before.get(i).name()).isGreaterThanOrEqualTo(former.min() - slack);
            assertThat(now.max()).as(before.get(i).name()).isLessThanOrEqualTo(former.max() + slack);
            if (now.width() < former.width()) {
                narrower++;
            }
        }
        return narrower;
    }

    private static Range limits(Outcomes.Named outcome, RandomCircuits.Drawn drawn) {
        InputDescription description = RandomPoints.describe(drawn);
        if (!Outcomes.hasLimits(outcome.equation(), description)) {
            return Range.of(-ChannelAccuracy.BEYOND, ChannelAccuracy.BEYOND);
        }
        List<LimitsReader.Corner> extremes = new LimitsReader(outcome.equation(), description).extremes();
        return Range.of(extremes.get(0).value(), extremes.get(1).value());
    }
}
