package shuntwright.accuracy;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

import shuntwright.board.Adc;
import shuntwright.board.DesignRules;
import shuntwright.board.Source;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.RandomCircuits;
import shuntwright.parts.Shunt;
import shuntwright.parts.Terminals;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;

/** Heated shunts: known cases, runaway, and plain iteration of temperature and resistance. */
class SelfHeatingTest {

    private static final double GAIN = 50;

    @ParameterizedTest
    @CsvFileSource(resources = "/shuntwright/accuracy/self-heating.csv", delimiter = ';', useHeadersInDisplayName = true)
    void heatedShuntTripsAtItsCurrent(double ohms, double coefficient, double amperes, double ambient,
            double reference, double kelvinPerWatt, double temperature, double heatedOhms, double watts) {
        boolean copper = reference == 20;
        Shunt shunt = copper
                ? copper(ohms, kelvinPerWatt)
                : IdealParts.shunt(ohms, Tolerance.NONE, coefficient, kelvinPerWatt);
        double threshold = GAIN * amperes * heatedOhms;
        SenseCircuit circuit = IdealParts.circuit(shunt, IdealParts.amplifier(GAIN),
                IdealParts.divider(2 * threshold, 1e4, 1e4));
        Surroundings around = reading(ambient, 2 * threshold);
        ChannelEquations equations = new ChannelEquations(circuit, around);
        double[] x = InputDescription.of(circuit, around, IdealParts.demand(12)).nominal();
        if (!copper) {
            x[Layout.index(Slot.SHUNT_DRIFT, 0)] = coefficient;
        }
        assertThat(equations.trip().value(x)).isCloseTo(amperes, within(1e-8 * amperes));
        double indicated = equations.reading(amperes).value(x);
        assertThat(indicated * circuit.resistance()).isCloseTo(amperes * heatedOhms, within(1e-9 * amperes));
        assertThat(ambient + kelvinPerWatt * watts).isCloseTo(temperature, within(1e-5));
        assertThat(amperes * amperes * heatedOhms).isCloseTo(watts, within(1e-6));
    }

    /** All of the resistance in copper joints, which refer to 20 °C. */
    private static Shunt copper(double ohms, double kelvinPerWatt) {
        return new Shunt("copper", "", ohms * 1e-12, Tolerance.NONE, 0, 0, 0, Terminals.TWO, Range.exactly(ohms), 0,
                IdealParts.rating(kelvinPerWatt), IdealParts.PURCHASE);
    }

    private static Surroundings reading(double ambient, double supply) {
        return new Surroundings(Range.exactly(ambient), IdealParts.exactly(supply), DesignRules.DEFAULT,
                Optional.of(new Surroundings.Converter(new Adc(new Source.Supply(), 24, 0, 0, 0),
                        IdealParts.supply(supply))),
                List.of(), Optional.empty());
    }

    /** 1 mΩ of copper at 50 K/W has no steady temperature from 71.34 A on; a threshold it cannot reach by then trips. */
    @Test
    void copperRunsAwayAtItsCurrent() {
        SenseCircuit circuit = IdealParts.circuit(copper(1e-3, 50), IdealParts.amplifier(GAIN),
                IdealParts.divider(1e6, 1e4, 1e4));
        Surroundings around = reading(25, 1e6);
        ChannelEquations equations = new ChannelEquations(circuit, around);
        double[] x = InputDescription.of(circuit, around, IdealParts.demand(12)).nominal();
        assertThat(equations.reading(71.33).value(x)).isFinite();
        assertThat(equations.reading(71.35).value(x)).isInfinite();
        assertThat(equations.trip().value(x)).isCloseTo(71.34, within(0.005));
    }

    /** A shunt whose resistance falls with temperature may never reach the threshold's voltage. */
    @Test
    void fallingResistanceMayNeverTrip() {
        SenseCircuit circuit = IdealParts.circuit(IdealParts.shunt(1e-3, Tolerance.NONE, 1e-3, 50),
                IdealParts.amplifier(GAIN), IdealParts.divider(20, 1e4, 1e4));
        ChannelEquations equations = new ChannelEquations(circuit, IdealParts.around(20));
        double[] x = InputDescription.of(circuit, IdealParts.around(20), IdealParts.demand(12)).nominal();
        assertThat(equations.trip().value(x)).isCloseTo(200, within(1e-9));
        x[Layout.index(Slot.SHUNT_DRIFT, 0)] = -1e-3;
        // I·R/(1 + α·θ·R·I²) is at most √(R/(4·α·θ)) = 70.7 mV, below the 200 mV of the threshold.
        assertThat(equations.trip().value(x)).isInfinite();
    }

    /** 100 mm x 2.5 mm x 35 µm of copper (IEC 60028:1925): 19.7044 mΩ at 20 °C, 24.7379 mΩ at 85 °C. */
    @Test
    void copperTraceAt85Degrees() {
        SenseCircuit circuit = IdealParts.circuit(copper(0.0197044335, 0), IdealParts.amplifier(GAIN),
                IdealParts.divider(2, 1e4, 1e4));
        Surroundings around = reading(85, 2);
        double[] x = InputDescription.of(circuit, around, IdealParts.demand(12)).nominal();
        assertThat(1 / GAIN / new ChannelEquations(circuit, around).trip().value(x)).isCloseTo(0.02473793103,
                within(1e-11));
    }

    /**
     * Temperature from power, resistance from temperature, until nothing changes. The equations take the parallel
     * resistance as linear in temperature, which is exact for equal shunts and else differs by the square of what their
     * relative slopes differ by, always upwards.
     */
    @Test
    void closedFormIsTheFixedPointOfPlainIteration() {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(31);
        RandomCircuits circuits = RandomCircuits.full(random);
        for (int i = 0; i < 500; i++) {
            RandomCircuits.Drawn drawn = circuits.next();
            double[] x = RandomPoints.within(drawn, random);
            int n = drawn.circuit().shuntCount();
            check(drawn, x, n == 1 ? 1e-10 : 1e-3);
            for (int piece = 1; piece < n; piece++) {
                for (Slot slot : new Slot[]{Slot.SHUNT_TOLERANCE, Slot.SHUNT_DRIFT, Slot.SHUNT_AGEING,
                        Slot.MOUNTING}) {
                    x[Layout.index(slot, piece)] = x[Layout.index(slot, 0)];
                }
            }
            check(drawn, x, 1e-10);
        }
    }

    private static void check(RandomCircuits.Drawn drawn, double[] x, double relative) {
        ChannelEquations equations = new ChannelEquations(drawn.circuit(), drawn.around());
        double current = equations.trip().value(x);
        IndependentEquations independent = new IndependentEquations(drawn, x);
        double gain = independent.gain().getValue();
        double error = independent.inputError().getValue();
        double shunts = equations.outputVoltage(false, x) / gain - error;
        assertThat(current * iterated(drawn, x, current)).isBetween((1 - relative) * shunts, (1 + 1e-10) * shunts);
    }

    private static double iterated(RandomCircuits.Drawn drawn, double[] x, double current) {
        double ambient = x[Slot.AMBIENT.place()] + x[Slot.ZONE_RISE.place()];
        int n = drawn.circuit().shuntCount();
        double temperature = ambient;
        double resistance = 0;
        for (int step = 0; step < 60; step++) {
            double conductance = 0;
            for (int i = 0; i < n; i++) {
                double own = drawn.circuit().shunt().resistance() * (1 + x[Layout.index(Slot.SHUNT_TOLERANCE, i)])
                        * (1 + x[Layout.index(Slot.SHUNT_AGEING, i)]);
                double joints = x[Layout.index(Slot.MOUNTING, i)] * (1 + 0.00393 * (temperature - 20));
                conductance += 1
                        / (own * (1 + x[Layout.index(Slot.SHUNT_DRIFT, i)] * (temperature - 25)) + joints);
            }
            resistance = 1 / conductance;
            temperature = ambient
                    + drawn.circuit().shunt().rating().thermalResistance() * current * current * resistance / n;
        }
        return resistance;
    }
}
