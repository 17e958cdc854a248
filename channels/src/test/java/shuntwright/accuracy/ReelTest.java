package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.Records;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Tolerance;

/** Inputs that deviate alike, by JCGM 100:2008, 5.2. */
class ReelTest {

    private static final ChannelAccuracy.Asked TRIP = new ChannelAccuracy.Asked(Outcome.TRIP, 0,
            IdealParts.demand(12).tripWindow());

    private static double standard(Equation f, List<Estimate> inputs, double r) {
        return Propagation.secondOrder(f, inputs, new double[][]{{1, r}, {r, 1}}).standard();
    }

    /** Eq. 16: u_c² = Σ c_i²u_i² + 2·c_1·c_2·u_1·u_2·r; with 3 and 4 a right angle, a straight line or a fold. */
    @ParameterizedTest
    @CsvSource({"0, 5", "1, 7", "-1, 1", "0.5, 6.082762530298219"})
    void aSumOfThreeAndFour(double r, double expected) {
        Expression sum = new Expression(x -> x[0].add(x[1]));
        List<Estimate> inputs = List.of(Estimate.of(10, 3), Estimate.of(20, 4));
        assertThat(standard(sum, inputs, r)).isCloseTo(expected, within(1e-12));
        Expression difference = new Expression(x -> x[0].subtract(x[1]));
        assertThat(standard(difference, inputs, -r)).isCloseTo(expected, within(1e-12));
        double[][] correlation = {{1, r}, {r, 1}};
        Propagation both = Propagation.correlated(sum, inputs, correlation);
        assertThat(both.standard()).isCloseTo(expected, within(1e-12));
        assertThat(both.variancePart(0) + both.variancePart(1)).isCloseTo(expected * expected, within(1e-12));
        assertThat(both.variancePart(0)).isCloseTo(9 + 12 * r, within(1e-12));
    }

    /**
     * Two drifts of one reel times a temperature difference of expectation 0: nothing in first order, u² = u_T²·(u_1² + u_2² +
     * 2·r·u_1·u_2) in second; a product of two correlated normal inputs of expectation 0 has u² = u_1²·u_2²·(1 + r²).
     */
    @ParameterizedTest
    @ValueSource(doubles = {-1, -0.3, 0, 0.5, 1})
    void whatIsMultipliedByTemperatureDeviatesAlikeToo(double r) {
        Expression drifts = new Expression(x -> x[0].add(x[1]).multiply(x[2]));
        List<Estimate> inputs = List.of(Estimate.of(0, 3), Estimate.of(0, 4), Estimate.of(0, 2));
        Propagation found = Propagation.secondOrder(drifts, inputs, new double[][]{{1, r, 0}, {r, 1, 0}, {0, 0, 1}});
        assertThat(found.standard()).isCloseTo(2 * Math.sqrt(9 + 16 + 24 * r), within(1e-12));
        assertThat(found.variancePart(0) + found.variancePart(1) + found.variancePart(2))
                .isCloseTo(found.standard() * found.standard(), within(1e-12));
        Expression product = new Expression(x -> x[0].multiply(x[1]));
        assertThat(standard(product, inputs.subList(0, 2), r)).isCloseTo(12 * Math.sqrt(1 + r * r), within(1e-12));
    }

    /** 5.2.2, example, as remembered: ten resistors of 1000 Ω calibrated with one standard of 100 mΩ in series: 1 Ω, not √10 times 0.1 Ω. */
    @Test
    void tenResistorsCalibratedWithOneStandard() {
        Expression series = new Expression(x -> {
            var sum = x[0];
            for (int i = 1; i < x.length; i++) {
                sum = sum.add(x[i]);
            }
            return sum;
        });
        List<Estimate> ten = java.util.Collections.nCopies(10, Estimate.of(1000, 0.1));
        double[][] alike = new double[10][10];
        for (double[] row : alike) {
            java.util.Arrays.fill(row, 1);
        }
        assertThat(Propagation.correlated(series, ten, alike).standard()).isCloseTo(1, within(1e-12));
        // The guide gives 0.32 Ω for independent ones.
        assertThat(Propagation.firstOrder(series, ten).standard()).isCloseTo(0.32, within(0.005));
    }

    private static SenseCircuit divided(double top, double bottom, double correlation) {
        ResistorSeries series = Records.with(IdealParts.resistors(0.01), "correlation", correlation);
        Threshold threshold = IdealParts.divider(10, top, bottom);
        return new SenseCircuit(IdealParts.shunt(0.01), 1, IdealParts.amplifier(50), IdealParts.comparator(), threshold,
                new HysteresisNetwork.None(), series);
    }

    private static CombinedUncertainty trip(SenseCircuit circuit) {
        return ChannelAccuracy.of(circuit, IdealParts.around(10), IdealParts.demand(12)).combined(TRIP, 0.95);
    }

    /**
     * Both resistors of 10 kΩ off by up to 1 %: each moves the 5 V by half of that, u = 0.5 %/√3 of the trip current each. Of one
     * reel with r = 1 they move together and the ratio stays, but for products of both errors.
     */
    @Test
    void aDividerOfOneReelKeepsItsRatio() {
        double each = 0.005 / Math.sqrt(3) * 10;
        assertThat(trip(divided(1e4, 1e4, 0)).standard()).isCloseTo(each * Math.sqrt(2), within(1e-3 * each));
        assertThat(trip(divided(1e4, 1e4, 0.5)).standard()).isCloseTo(each, within(1e-3 * each));
        assertThat(trip(divided(1e4, 1e4, 1)).standard()).isLessThan(0.02 * each);
        // Limits do not rest on it: a reel may end within a board.
        ChannelAccuracy alike = ChannelAccuracy.of(divided(1e4, 1e4, 1), IdealParts.around(10), IdealParts.demand(12));
        ChannelAccuracy strangers = ChannelAccuracy.of(divided(1e4, 1e4, 0), IdealParts.around(10),
                IdealParts.demand(12));
        assertThat(alike.limits(TRIP)).isEqualTo(strangers.limits(TRIP));
    }

    /** Resistors of two values come from two reels. */
    @Test
    void otherValuesAreOfOtherReels() {
        assertThat(trip(divided(1e4, 2e4, 1)).standard()).isEqualTo(trip(divided(1e4, 2e4, 0)).standard());
    }

    /** n alike in parallel: u² = u₁²·(1 + (n - 1)·r)/n. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 0.25, 0.8, 1})
    void shuntsOfOneReelAverageLess(double r) {
        for (int n = 1; n <= 4; n++) {
            Shunt shunt = Records.with(IdealParts.shunt(0.01 * n, Tolerance.symmetric(0.01), 0, 0), "correlation", r);
            SenseCircuit circuit = new SenseCircuit(shunt, n, IdealParts.amplifier(50), IdealParts.comparator(),
                    IdealParts.divider(10, 1e4, 1e4), new HysteresisNetwork.None(), IdealParts.resistors(0));
            double one = 0.01 / Math.sqrt(3) * 10;
            double expected = one * Math.sqrt((1 + (n - 1) * r) / n);
            assertThat(trip(circuit).standard()).as("%d shunts", n).isCloseTo(expected, within(2e-4 * one));
        }
    }
}
