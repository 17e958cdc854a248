package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.List;

import shuntwright.board.Demand;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.InputErrors;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.Shunt;
import shuntwright.parts.Terminals;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Toleranced;

/**
 * The one description of a channel's uncertain inputs: each with limits, distribution and owner. Limits, combined
 * uncertainty and budgets all read this list. Inputs that cannot move are left out.
 *
 * <p>Data-sheet limits are taken as uniform: nothing more is known of a part that has passed its maker's test (JCGM
 * 100:2008, 4.3.7). Resistor ageing is added to the tolerance.
 */
final class InputDescription {

    private static final Distribution UNIFORM = new Distribution.Uniform();
    /** Tolerance and drift of a pull-up resistor of the 1 % class, a fraction (common practice). */
    private static final double PULL_UP_TOLERANCE = 0.015;

    private final List<Input> inputs = new ArrayList<>();
    private final double[] nominal;

    private InputDescription(int size) {
        nominal = new double[size];
    }

    /** Describes the inputs of this circuit for this demand. */
    static InputDescription of(SenseCircuit circuit, Surroundings around, Demand demand) {
        InputDescription d = new InputDescription(Layout.size(circuit.shuntCount()));
        d.surroundings(around, demand.commonMode());
        d.shunts(circuit.shunt(), circuit.shuntCount(), around);
        d.amplifier(circuit, around);
        d.threshold(circuit);
        d.comparator(circuit);
        around.adc().ifPresent(d::converter);
        return d;
    }

    List<Input> inputs() {
        return inputs;
    }

    /** The vector x with every input at its nominal value; a copy. */
    double[] nominal() {
        return nominal.clone();
    }

    private void surroundings(Surroundings around, Spread rail) {
        Range ambient = around.ambient();
        double middle = ambient.contains(Surroundings.REFERENCE_TEMPERATURE)
                ? Surroundings.REFERENCE_TEMPERATURE
                : ambient.mid();
        add(Slot.AMBIENT, 0, new Owner.Shared("ambient"), middle, ambient);
        add(Slot.SUPPLY, 0, new Owner.Shared("supply"), around.supply().nominal(), around.supply().range());
        add(Slot.RAIL, 0, new Owner.Own("rail"), rail.nominal(), rail.range());
    }

    private void shunts(Shunt shunt, int count, Surroundings around) {
        for (int i = 0; i < count; i++) {
            Owner owner = new Owner.Own(count == 1 ? "shunt" : "shunt " + (i + 1));
            add(Slot.SHUNT_TOLERANCE, i, owner, 0, Range.of(-shunt.tolerance().below(), shunt.tolerance().above()));
            plusMinus(Slot.SHUNT_DRIFT, i, owner, shunt.temperatureCoefficient());
            plusMinus(Slot.SHUNT_AGEING, i, owner, shunt.ageing());
            if (shunt.terminals() == Terminals.TWO) {
                add(Slot.MOUNTING, i, owner, shunt.mountingResistance().mid(), shunt.mountingResistance());
            }
        }
        plusMinus(Slot.THERMAL_EMF, 0, new Owner.Own("shunt"), shunt.thermalEmf() * around.rules().shuntGradient());
    }

    private void amplifier(SenseCircuit circuit, Surroundings around) {
        Owner owner = new Owner.Own("amplifier");
        InputErrors errors = circuit.amplifier().input();
        plusMinus(Slot.GAIN_ERROR, 0, owner, circuit.amplifier().gainError());
        plusMinus(Slot.GAIN_DRIFT, 0, owner, circuit.amplifier().gainDrift());
        plusMinus(Slot.OFFSET, 0, owner, errors.offset());
        plusMinus(Slot.OFFSET_DRIFT, 0, owner, errors.offsetDrift());
        plusMinus(Slot.COMMON_MODE, 0, owner, errors.perCommonModeVolt());
        plusMinus(Slot.SUPPLY_REJECTION, 0, owner, errors.perSupplyVolt());
        if (around.rules().inputResistance() * around.rules().inputMismatch() > 0) {
            plusMinus(Slot.INPUT_BIAS, 0, owner, errors.biasCurrent());
        }
    }

    private void threshold(SenseCircuit circuit) {
        Threshold threshold = circuit.threshold();
        source(threshold.source(), List.of(Slot.REFERENCE_TOLERANCE, Slot.REFERENCE_DRIFT, Slot.REFERENCE_AGEING,
                Slot.REFERENCE_LOAD));
        switch (threshold) {
            case Threshold.Divider divider -> {
                resistor(Slot.TOP_TOLERANCE, Slot.TOP_DRIFT, owner(divider.tap(), "divider top"), circuit.resistors());
                resistor(Slot.BOTTOM_TOLERANCE, Slot.BOTTOM_DRIFT, owner(divider.tap(), "divider bottom"),
                        circuit.resistors());
            }
            case Threshold.DacOutput dac -> {
                Owner owner = new Owner.Shared("tap " + dac.tap());
                double step = dac.source().voltage().nominal() / (1 << dac.dac().bits());
                plusMinus(Slot.DAC_GAIN, 0, owner, dac.dac().gainError());
                plusMinus(Slot.DAC_OFFSET, 0, owner, dac.dac().offset() + dac.dac().nonlinearity() * step);
            }
        }
        if (circuit.network() instanceof HysteresisNetwork.Feedback feedback) {
            resistor(Slot.FEEDBACK_TOLERANCE, Slot.FEEDBACK_DRIFT, new Owner.Own("feedback resistor"),
                    circuit.resistors());
            plusMinus(Slot.PULL_UP_TOLERANCE, 0, new Owner.Shared("alert line pull-up"), PULL_UP_TOLERANCE);
            if (!feedback.supplied()) {
                Toleranced io = feedback.pullVoltage();
                add(Slot.PULL_UP_VOLTAGE, 0, new Owner.Shared("alert line supply"), io.nominal(), io.range());
            }
            Range low = circuit.comparator().output().lowLevel();
            add(Slot.OUTPUT_LOW, 0, new Owner.Own("comparator"), low.mid(), low);
        }
    }

    private static Owner owner(String tap, String part) {
        return tap.isEmpty() ? new Owner.Own(part) : new Owner.Shared("tap " + tap + " " + part);
    }

    private void source(SourceVoltage source, List<Slot> slots) {
        if (source.isSupply()) {
            return;
        }
        Owner owner = new Owner.Shared("reference " + source.source().word());
        add(slots.get(0), 0, owner, 0,
                Range.of(-source.voltage().tolerance().below(), source.voltage().tolerance().above()));
        plusMinus(slots.get(1), 0, owner, source.drift());
        plusMinus(slots.get(2), 0, owner, source.ageing());
        add(slots.get(3), 0, owner, 0, Range.of(0, source.loadDrop()));
    }

    private void resistor(Slot tolerance, Slot drift, Owner owner, ResistorSeries series) {
        plusMinus(tolerance, 0, owner, series.tolerance() + series.ageing());
        plusMinus(drift, 0, owner, series.temperatureCoefficient());
    }

    private void comparator(SenseCircuit circuit) {
        Owner owner = new Owner.Own("comparator");
        plusMinus(Slot.COMPARATOR_OFFSET, 0, owner, circuit.comparator().inputs().offset());
        plusMinus(Slot.COMPARATOR_DRIFT, 0, owner, circuit.comparator().inputs().offsetDrift());
        Range bias = circuit.comparator().inputs().biasCurrent();
        add(Slot.COMPARATOR_BIAS, 0, owner, bias.mid(), bias);
        Hysteresis hysteresis = circuit.comparator().hysteresis();
        add(Slot.BUILT_IN, 0, owner, hysteresis.builtIn().mid(), hysteresis.builtIn());
        if (hysteresis instanceof Hysteresis.InjectedCurrent injected) {
            add(Slot.INJECTED_CURRENT, 0, owner, injected.current().nominal(), injected.current().range());
        }
        if (circuit.network() instanceof HysteresisNetwork.SenseResistor) {
            // The two inputs of a comparator need not draw alike.
            add(Slot.SENSE_BIAS, 0, owner, bias.mid(), bias);
            resistor(Slot.SENSE_RESISTOR_TOLERANCE, Slot.SENSE_RESISTOR_DRIFT, new Owner.Own("hysteresis resistor"),
                    circuit.resistors());
        }
    }

    private void converter(Surroundings.Converter converter) {
        Owner owner = new Owner.Shared("ADC");
        plusMinus(Slot.ADC_GAIN, 0, owner, converter.adc().gainError());
        plusMinus(Slot.ADC_OFFSET, 0, owner, converter.adc().offset());
        plusMinus(Slot.ADC_STEP, 0, owner, (converter.adc().nonlinearity() + 0.5) * converter.step());
        source(converter.source(), List.of(Slot.ADC_REFERENCE_TOLERANCE, Slot.ADC_REFERENCE_DRIFT,
                Slot.ADC_REFERENCE_AGEING, Slot.ADC_REFERENCE_LOAD));
    }

    private void plusMinus(Slot slot, int piece, Owner owner, double magnitude) {
        add(slot, piece, owner, 0, Range.of(-magnitude, magnitude));
    }

    private void add(Slot slot, int piece, Owner owner, double value, Range limits) {
        nominal[Layout.index(slot, piece)] = value;
        if (limits.width() > 0) {
            inputs.add(new Input(slot, piece, owner, value, limits, UNIFORM));
        }
    }
}
