package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

import shuntwright.board.Adc;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.DesignRules;
import shuntwright.board.Source;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.Records;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;

/** A shunt's thermal EMF follows the heat that flows through it, so calibration elsewhere does not remove it. */
class CalibratedEmfTest {

    private static final double OHMS = 1e-3;
    private static final double LEAST = 0.8;
    private static final double LOAD = 8;

    /** With e = ±EMF/R in service, and draws of their own at I₁ and I₂: the worst of each, by hand. */
    @ParameterizedTest
    @EnumSource(Calibration.Points.class)
    void remainsWhereNothingElseErrs(Calibration.Points points) {
        Shunt shunt = Records.withPath(IdealParts.shunt(OHMS), "thermalEmf", 2e-6);
        double e = 2e-6 * DesignRules.DEFAULT.shuntGradient() / OHMS;
        assertThat(e).isPositive();
        SenseCircuit circuit = IdealParts.circuit(shunt, IdealParts.amplifier(50), IdealParts.divider(1, 1e4, 1e4));
        Surroundings around = new Surroundings(Range.exactly(25), IdealParts.exactly(1), DesignRules.DEFAULT,
                Optional.of(new Surroundings.Converter(new Adc(new Source.Supply(), 24, 0, 0, 0),
                        IdealParts.supply(1))),
                List.of(), Optional.empty());
        List<Assessment> found = ChannelAccuracy.of(circuit, around, demand(points)).assess(0.95).stream()
                .filter(each -> each.outcome() == Outcome.READING_AT_LEAST
                        || each.outcome() == Outcome.READING_AT_LOAD)
                .toList();
        assertThat(found).hasSize(2);
        for (Assessment each : found) {
            double current = each.outcome() == Outcome.READING_AT_LOAD ? LOAD : LEAST;
            double high = Double.NEGATIVE_INFINITY;
            double low = Double.POSITIVE_INFINITY;
            for (int corner = 0; corner < 8; corner++) {
                double r = current + ((corner & 1) == 0 ? e : -e);
                double lower = LEAST + ((corner & 2) == 0 ? e : -e);
                double upper = LOAD + ((corner & 4) == 0 ? e : -e);
                double reading = points == Calibration.Points.ONE
                        ? r * LOAD / upper
                        : LEAST + (LOAD - LEAST) * (r - lower) / (upper - lower);
                high = Math.max(high, reading);
                low = Math.min(low, reading);
            }
            assertThat(each.limits().max()).isCloseTo(high, within(1e-5));
            assertThat(each.limits().min()).isCloseTo(low, within(1e-5));
            assertThat(high - current).isGreaterThan(1.1 * e);
        }
    }

    private static Demand demand(Calibration.Points points) {
        Calibration calibration = new Calibration(points, OptionalDouble.empty(), OptionalDouble.empty(), 0,
                Range.exactly(25));
        Channel channel = Channel.named("channel").withCurrents(new Channel.Currents(OptionalDouble.of(LOAD),
                OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.of(LEAST),
                OptionalDouble.empty()));
        channel = Records.withPath(channel, "reading", new Channel.ReadingDemand(OptionalDouble.of(0.3),
                OptionalDouble.of(0.05), Optional.of(calibration)));
        return Records.withPath(IdealParts.demand(12), "channel", channel);
    }
}
