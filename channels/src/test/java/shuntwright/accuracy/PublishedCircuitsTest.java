package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

import shuntwright.board.Adc;
import shuntwright.board.Demand;
import shuntwright.board.DesignRules;
import shuntwright.board.Source;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.fixture.IdealParts;
import shuntwright.parts.Comparator;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.InputErrors;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/** Small circuits with known results, each through an otherwise ideal channel. */
class PublishedCircuitsTest {

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/divider-tolerance.csv", delimiter = ';', useHeadersInDisplayName = true)
    void dividerTolerance(double top, double bottom, double tolerance, double high, double low, double firstOrder) {
        Threshold.Divider divider = IdealParts.divider(1, top, bottom);
        SenseCircuit circuit = new SenseCircuit(IdealParts.shunt(1e-3), 1, IdealParts.amplifier(100),
                IdealParts.comparator(), divider, new HysteresisNetwork.None(), IdealParts.resistors(tolerance));
        Surroundings around = IdealParts.around(1);
        Demand demand = IdealParts.demand(12);
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, around, demand);
        double nominal = divider.openVoltage();
        assertThat(accuracy.outputVoltage(false)).isCloseTo(nominal, within(1e-15));
        assertThat((accuracy.thresholdLimits().max() / nominal - 1) * 100).isCloseTo(high, within(1e-5));
        assertThat((accuracy.thresholdLimits().min() / nominal - 1) * 100).isCloseTo(low, within(1e-5));

        // 2·t·(1 - k) for both at their limits, (1 - k)·t·√(2/3) as a standard uncertainty.
        InputDescription description = InputDescription.of(circuit, around, demand);
        List<Estimate> estimates = new ArrayList<>();
        for (double value : description.nominal()) {
            estimates.add(Estimate.of(value, 0));
        }
        double sum = 0;
        double[] gradient = new double[estimates.size()];
        Equation threshold = new ThresholdVoltage(new ChannelEquations(circuit, around), false);
        threshold.gradient(description.nominal(), gradient);
        for (Input input : description.inputs()) {
            estimates.set(Layout.index(input), Estimate.of(input.nominal(), input.standardUncertainty()));
            sum += Math.abs(gradient[Layout.index(input)]) * input.limits().max();
        }
        assertThat(sum / nominal * 100).isCloseTo(firstOrder, within(1e-6));
        assertThat(Propagation.firstOrder(threshold, estimates).standard() / nominal * 100)
                .isCloseTo(firstOrder / 2 * Math.sqrt(2.0 / 3), within(1e-6));
    }

    /** 100 nA into the comparator from 30.1 kΩ and 10 kΩ: 0.75062 mV less. */
    @Test
    void biasCurrentLowersTheThreshold() {
        Range bias = Range.exactly(100e-9);
        SenseCircuit circuit = new SenseCircuit(IdealParts.shunt(1e-3), 1, IdealParts.amplifier(100),
                IdealParts.comparator(new Hysteresis.BuiltIn(IdealParts.ZERO), bias, IdealParts.ZERO),
                IdealParts.divider(4.01, 30.1e3, 10e3), new HysteresisNetwork.None(), IdealParts.resistors(0));
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, IdealParts.around(4.01), IdealParts.demand(12));
        assertThat(1 - accuracy.outputVoltage(false)).isCloseTo(0.75062e-3, within(1e-8));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/common-mode.csv", delimiter = ';', useHeadersInDisplayName = true)
    void commonModeMovesTheTripCurrent(double volts, double decibel, double ohms, double errorVolts,
            double errorAmperes) {
        InputErrors errors = new InputErrors(0, 0, decibel, 0, Double.POSITIVE_INFINITY, 0, 0);
        SenseCircuit circuit = IdealParts.circuit(IdealParts.shunt(ohms), IdealParts.amplifier(50, errors),
                IdealParts.divider(2 * 50 * 10 * ohms, 1e4, 1e4));
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, IdealParts.around(2 * 50 * 10 * ohms),
                IdealParts.demand(volts));
        Assessment trip = accuracy.assess(0.95).getFirst();
        assertThat(trip.outcome()).isEqualTo(Outcome.TRIP);
        assertThat(trip.nominal()).isCloseTo(10, within(1e-12));
        assertThat(trip.limits().max() - 10).isCloseTo(errorAmperes, within(1e-5));
        assertThat(10 - trip.limits().min()).isCloseTo(errorAmperes, within(1e-5));
        assertThat(errorVolts / ohms).isCloseTo(errorAmperes, within(1e-5));
        assertThat(trip.combined().standard()).isCloseTo(errorAmperes / Math.sqrt(3), within(1e-5));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/comparator-thresholds.csv", delimiter = ';', useHeadersInDisplayName = true)
    void comparatorThresholds(double source, double top, double bottom, double feedback, double pull, double pullUp,
            double low, double high, double lower) {
        // A pull-up of 0 stands for a stiff output.
        HysteresisNetwork network = new HysteresisNetwork.Feedback(feedback, Math.max(pullUp, feedback * 1e-15),
                new Toleranced(pull, IdealParts.exactly(0).tolerance()), false);
        Comparator comparator = IdealParts.comparator(new Hysteresis.PositiveFeedback(IdealParts.ZERO),
                IdealParts.ZERO, Range.exactly(Math.max(0, low)));
        SenseCircuit circuit = new SenseCircuit(IdealParts.shunt(1e-3), 1, IdealParts.amplifier(100), comparator,
                IdealParts.divider(source, top, bottom), network, IdealParts.resistors(0));
        ChannelEquations equations = new ChannelEquations(circuit, IdealParts.around(source));
        double[] x = InputDescription.of(circuit, IdealParts.around(source), IdealParts.demand(12)).nominal();
        assertThat(x[Slot.OUTPUT_LOW.place()]).isEqualTo(Math.max(0, low));
        x[Slot.OUTPUT_LOW.place()] = low;
        assertThat(equations.outputVoltage(false, x)).isCloseTo(high, within(1e-7));
        assertThat(equations.outputVoltage(true, x)).isCloseTo(lower, within(1e-7));
        // The difference in amperes is that voltage over gain and resistance.
        assertThat(equations.trip().value(x) - equations.release().value(x))
                .isCloseTo((high - lower) / (100 * 1e-3), within(1e-5));
    }

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/converter-steps.csv", delimiter = ';', useHeadersInDisplayName = true)
    void converterSteps(double fullScale, int bits, double step, double standard) {
        Surroundings.Converter converter = new Surroundings.Converter(new Adc(new Source.Supply(), bits, 0, 0, 0),
                IdealParts.supply(fullScale));
        assertThat(converter.step()).isCloseTo(step, within(1e-5 * step));
        SenseCircuit circuit = IdealParts.circuit(IdealParts.shunt(1e-3), IdealParts.amplifier(100),
                IdealParts.divider(fullScale, 1e4, 1e4));
        Surroundings around = new Surroundings(Range.exactly(25), IdealParts.exactly(fullScale), DesignRules.DEFAULT,
                Optional.of(converter), List.of(), Optional.empty());
        List<Input> inputs = InputDescription.of(circuit, around, IdealParts.demand(12)).inputs();
        assertThat(inputs).singleElement().satisfies(input -> {
            assertThat(input.slot()).isEqualTo(Slot.ADC_STEP);
            assertThat(input.limits().width()).isCloseTo(step, within(1e-5 * step));
            assertThat(input.standardUncertainty()).isCloseTo(standard, within(1e-5 * standard));
        });
    }
}
