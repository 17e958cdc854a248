package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Comparator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.RandomCircuits;
import shuntwright.fixture.Records;
import shuntwright.parts.InputErrors;
import shuntwright.parts.SenseAmplifier;
import shuntwright.quantity.Tolerance;

/** What the budget's contributions add up to, and how limits and combined uncertainty relate. */
class ErrorBudgetTest {

    /** Errors of about 0.1 % each: what is not linear in them is about their sum, 0.4 %, of the half-width. */
    @Test
    void contributionsOfANearlyLinearChannelAddUpToItsLimits() {
        SenseAmplifier amplifier = Records.with(
                IdealParts.amplifier(50, new InputErrors(0.5e-3, 0, 90, 0, Double.POSITIVE_INFINITY, 0, 0)),
                "gainError", 1e-3);
        SenseCircuit circuit = new SenseCircuit(IdealParts.shunt(0.01, Tolerance.symmetric(2e-3), 0, 0), 1, amplifier,
                IdealParts.comparator(), IdealParts.divider(10, 1e4, 1e4), new HysteresisNetwork.None(),
                IdealParts.resistors(1e-3));
        Assessment trip = ChannelAccuracy.of(circuit, IdealParts.around(10), IdealParts.demand(12)).assess(0.95)
                .getFirst();
        double high = trip.limits().max() - trip.nominal();
        double low = trip.limits().min() - trip.nominal();
        assertThat(trip.budget()).hasSize(6);
        assertThat(trip.budget().stream().mapToDouble(BudgetLine::towardsHigh).sum()).isCloseTo(high,
                within(0.015 * high));
        assertThat(trip.budget().stream().mapToDouble(BudgetLine::towardsLow).sum()).isCloseTo(low,
                within(-0.015 * low));
        // Offset 0.5 mV on 10 mΩ is 0.05 A; the shunt's 0.2 % of 10 A is 0.02 A.
        assertThat(trip.budget().getFirst().input().slot()).isEqualTo(Slot.OFFSET);
        assertThat(trip.budget().getFirst().towardsHigh()).isCloseTo(0.05, within(0.001));
        assertThat(trip.budget().getFirst().sensitivity()).isCloseTo(-100, within(1e-9));
    }

    @Test
    void sharesOfTheVarianceAddUpToOneAndLinesAreSorted() {
        RandomCircuits circuits = RandomCircuits.full(RandomGeneratorFactory.of("L64X128MixRandom").create(61));
        for (int i = 0; i < 200; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            for (Assessment each : ChannelAccuracy.of(drawn.circuit(), drawn.around(), drawn.demand()).assess(0.95)) {
                assertThat(each.budget().stream().mapToDouble(BudgetLine::varianceShare).sum()).isCloseTo(1,
                        within(1e-9));
                assertThat(each.budget()).isSortedAccordingTo(
                        Comparator.comparingDouble(BudgetLine::widest).reversed());
                assertThat(each.limits().contains(each.nominal())).isTrue();
            }
        }
    }

    /** One uniform input of half-width a: u = a/√3, so U = a when k = √3. */
    @ParameterizedTest
    @CsvSource({"0.9, false", "0.95, true", "0.9973, true"})
    void coverageIntervalOfASingleInputPassesItsLimitsFromTheSquareRootOfThreeOn(double coverage, boolean wider) {
        SenseCircuit circuit = IdealParts.circuit(IdealParts.shunt(0.01),
                IdealParts.amplifier(50, new InputErrors(2e-3, 0, Double.POSITIVE_INFINITY, 0, Double.POSITIVE_INFINITY,
                        0, 0)),
                IdealParts.divider(10, 1e4, 1e4));
        Assessment trip = ChannelAccuracy.of(circuit, IdealParts.around(10), IdealParts.demand(12)).assess(coverage)
                .getFirst();
        assertThat(trip.limits().width() / 2).isCloseTo(0.2, within(1e-12));
        assertThat(trip.combined().standard()).isCloseTo(0.2 / Math.sqrt(3), within(1e-12));
        assertThat(trip.combined().coverageFactor() > Math.sqrt(3)).isEqualTo(wider);
        assertThat(trip.combined().interval().contains(trip.limits())).isEqualTo(wider);
        assertThat(trip.limits().contains(trip.combined().interval())).isEqualTo(!wider);
    }
}
