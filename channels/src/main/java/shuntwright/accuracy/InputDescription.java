package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.board.Calibration;
import shuntwright.board.Demand;
import shuntwright.board.StatedDistribution;
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
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Toleranced;

/**
 * The one description of a channel's uncertain inputs: each with limits, distribution and owner. Limits, combined
 * uncertainty and budgets all read this list. Inputs that cannot move are left out.
 *
 * <p>Data-sheet limits are taken as uniform, unless the user states what more is known of them: a part that has passed its
 * maker's test may lie anywhere between its limits (JCGM 100:2008, 4.3.7).
 */
final class InputDescription {

    private static final Distribution UNIFORM = new Distribution.Uniform();
    /** Tolerance and drift of a pull-up resistor of the 1 % class, a fraction (common practice). */
    private static final double PULL_UP_TOLERANCE = 0.015;

    private static final ResistorSlots TOP = new ResistorSlots(Slot.TOP_TOLERANCE, Slot.TOP_DRIFT, Slot.TOP_AGEING);
    private static final ResistorSlots BOTTOM = new ResistorSlots(Slot.BOTTOM_TOLERANCE, Slot.BOTTOM_DRIFT,
            Slot.BOTTOM_AGEING);
    private static final ResistorSlots FEEDBACK = new ResistorSlots(Slot.FEEDBACK_TOLERANCE, Slot.FEEDBACK_DRIFT,
            Slot.FEEDBACK_AGEING);
    private static final ResistorSlots SENSE_RESISTOR = new ResistorSlots(Slot.SENSE_RESISTOR_TOLERANCE,
            Slot.SENSE_RESISTOR_DRIFT, Slot.SENSE_RESISTOR_AGEING);

    private record ResistorSlots(Slot tolerance, Slot drift, Slot ageing) {}

    private final List<Input> inputs = new ArrayList<>();
    private final List<StatedDistribution> stated;
    private final double[] nominal;
    /** Part number whose inputs are being described; empty where no part of a catalogue is. */
    private String part = "";

    private InputDescription(int size, List<StatedDistribution> stated) {
        this.nominal = new double[size];
        this.stated = stated;
    }

    /** Describes the inputs of this circuit for this demand. */
    static InputDescription of(SenseCircuit circuit, Surroundings around, Demand demand) {
        InputDescription d = new InputDescription(Layout.size(circuit.shuntCount()), around.stated());
        d.surroundings(around, demand.commonMode());
        d.shunts(circuit.shunt(), circuit.shuntCount());
        d.thermalEmf(circuit.shunt(), around, demand);
        d.amplifier(circuit, around);
        d.threshold(circuit);
        d.comparator(circuit);
        around.adc().ifPresent(adc -> d.converter(adc, demand, around));
        return d;
    }

    List<Input> inputs() {
        return inputs;
    }

    /** Correlation coefficients of x; empty when all inputs are independent. */
    double[][] correlation() {
        if (inputs.stream().allMatch(each -> each.reel().isEmpty())) {
            return new double[0][];
        }
        double[][] r = new double[nominal.length][nominal.length];
        for (int i = 0; i < r.length; i++) {
            r[i][i] = 1;
        }
        for (Input a : inputs) {
            for (Input b : inputs) {
                if (!a.equals(b) && a.reel().isPresent() && a.reel().equals(b.reel()) && alike(a.slot(), b.slot())) {
                    r[Layout.index(a)][Layout.index(b)] = a.reel().get().correlation();
                }
            }
        }
        return r;
    }

    /** True when both are tolerances or both are drifts. */
    static boolean alike(Slot a, Slot b) {
        return a.unit().equals(b.unit());
    }

    /** The vector x with every input at its nominal value; a copy. */
    double[] nominal() {
        return nominal.clone();
    }

    private void surroundings(Surroundings around, Spread rail) {
        Range ambient = around.ambient();
        add(Slot.AMBIENT, 0, new Owner.Shared("ambient"), nominal(ambient), ambient);
        around.zone().ifPresent(zone -> add(Slot.ZONE_RISE, 0, new Owner.Shared("zone " + zone.zone()), 0,
                Range.of(0, zone.most())));
        add(Slot.SUPPLY, 0, new Owner.Shared("supply"), around.supply().nominal(), around.supply().range());
        add(Slot.RAIL, 0, new Owner.Own("rail"), rail.nominal(), rail.range());
    }

    private static double nominal(Range temperature) {
        return temperature.contains(Surroundings.REFERENCE_TEMPERATURE)
                ? Surroundings.REFERENCE_TEMPERATURE
                : temperature.mid();
    }

    private void shunts(Shunt shunt, int count) {
        part = shunt.partNumber();
        Optional<Reel> reel = reel("reel of " + shunt.partNumber(), shunt.correlation());
        for (int i = 0; i < count; i++) {
            Owner owner = new Owner.Own(count == 1 ? "shunt" : "shunt " + (i + 1));
            add(Slot.SHUNT_TOLERANCE, i, owner, 0, Range.of(-shunt.tolerance().below(), shunt.tolerance().above()),
                    reel);
            double coefficient = shunt.temperatureCoefficient();
            add(Slot.SHUNT_DRIFT, i, owner, 0, Range.of(-coefficient, coefficient), reel);
            plusMinus(Slot.SHUNT_AGEING, i, owner, shunt.ageing());
            if (shunt.terminals() == Terminals.TWO) {
                add(Slot.MOUNTING, i, owner, shunt.mountingResistance().mid(), shunt.mountingResistance());
            }
        }
    }

    /** In service and at each point of a calibration another part of the gradient's limit, as other heat flows. */
    private void thermalEmf(Shunt shunt, Surroundings around, Demand demand) {
        Owner owner = new Owner.Own("shunt");
        double most = shunt.thermalEmf() * around.rules().shuntGradient();
        plusMinus(Slot.THERMAL_EMF, 0, owner, most);
        Optional<Calibration> calibration = demand.channel().reading().calibration();
        if (around.adc().isPresent() && calibration.isPresent()) {
            plusMinus(Slot.CALIBRATION_EMF_UPPER, 0, owner, most);
            if (calibration.get().points() == Calibration.Points.TWO) {
                plusMinus(Slot.CALIBRATION_EMF_LOWER, 0, owner, most);
            }
        }
    }

    private void amplifier(SenseCircuit circuit, Surroundings around) {
        part = circuit.amplifier().partNumber();
        Owner owner = new Owner.Own("amplifier");
        InputErrors errors = circuit.amplifier().input();
        plusMinus(Slot.GAIN_ERROR, 0, owner, circuit.amplifier().gainError());
        plusMinus(Slot.GAIN_DRIFT, 0, owner, circuit.amplifier().gainDrift());
        plusMinus(Slot.GAIN_AGEING, 0, owner, circuit.amplifier().gainAgeing());
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
                resistor(TOP, owner(divider.tap(), "divider top"), circuit.resistors(), divider.top());
                resistor(BOTTOM, owner(divider.tap(), "divider bottom"), circuit.resistors(), divider.bottom());
            }
            case Threshold.DacOutput dac -> {
                Owner owner = new Owner.Shared("tap " + dac.tap());
                part = "";
                double step = dac.source().voltage().nominal() / (1 << dac.dac().bits());
                plusMinus(Slot.DAC_GAIN, 0, owner, dac.dac().gainError());
                plusMinus(Slot.DAC_OFFSET, 0, owner, dac.dac().offset() + dac.dac().nonlinearity() * step);
            }
        }
        if (circuit.network() instanceof HysteresisNetwork.Feedback feedback) {
            resistor(FEEDBACK, new Owner.Own("feedback resistor"), circuit.resistors(), feedback.resistance());
            part = "";
            plusMinus(Slot.PULL_UP_TOLERANCE, 0, new Owner.Shared("alert line pull-up"), PULL_UP_TOLERANCE);
            if (!feedback.supplied()) {
                Toleranced io = feedback.pullVoltage();
                add(Slot.PULL_UP_VOLTAGE, 0, new Owner.Shared("alert line supply"), io.nominal(), io.range());
            }
            part = circuit.comparator().partNumber();
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
        part = "";
        Owner owner = new Owner.Shared("reference " + source.source().word());
        add(slots.get(0), 0, owner, 0,
                Range.of(-source.voltage().tolerance().below(), source.voltage().tolerance().above()));
        plusMinus(slots.get(1), 0, owner, source.drift());
        plusMinus(slots.get(2), 0, owner, source.ageing());
        add(slots.get(3), 0, owner, 0, Range.of(0, source.loadDrop()));
    }

    private void resistor(ResistorSlots slots, Owner owner, ResistorSeries series, double value) {
        part = series.partNumber();
        Optional<Reel> reel = reel("reel of " + series.partNumber() + " " + value, series.correlation());
        double drift = series.temperatureCoefficient();
        add(slots.tolerance(), 0, owner, 0, Range.of(-series.tolerance(), series.tolerance()), reel);
        add(slots.drift(), 0, owner, 0, Range.of(-drift, drift), reel);
        plusMinus(slots.ageing(), 0, owner, series.ageing());
    }

    private static Optional<Reel> reel(String name, double correlation) {
        return correlation > 0 ? Optional.of(new Reel(name, correlation)) : Optional.empty();
    }

    private void comparator(SenseCircuit circuit) {
        part = circuit.comparator().partNumber();
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
        if (circuit.network() instanceof HysteresisNetwork.SenseResistor(double resistance)) {
            // The two inputs of a comparator need not draw alike.
            add(Slot.SENSE_BIAS, 0, owner, bias.mid(), bias);
            resistor(SENSE_RESISTOR, new Owner.Own("hysteresis resistor"), circuit.resistors(), resistance);
        }
    }

    private void converter(Surroundings.Converter converter, Demand demand, Surroundings around) {
        part = "";
        Owner owner = new Owner.Shared("ADC");
        double step = (converter.adc().nonlinearity() + 0.5) * converter.step();
        plusMinus(Slot.ADC_GAIN, 0, owner, converter.adc().gainError());
        plusMinus(Slot.ADC_OFFSET, 0, owner, converter.adc().offset());
        // Non-linearity and rounding differ from code to code, so from channel to channel.
        plusMinus(Slot.ADC_STEP, 0, new Owner.Own("ADC"), step);
        source(converter.source(), List.of(Slot.ADC_REFERENCE_TOLERANCE, Slot.ADC_REFERENCE_DRIFT,
                Slot.ADC_REFERENCE_AGEING, Slot.ADC_REFERENCE_LOAD));
        demand.channel().reading().calibration().ifPresent(each -> calibration(each, step, demand, around));
    }

    private void calibration(Calibration calibration, double step, Demand demand, Surroundings around) {
        Owner owner = new Owner.Own("calibration");
        plusMinus(Slot.CALIBRATION_CURRENT, 0, owner, calibration.uncertainty());
        Range temperature = calibration.temperature();
        add(Slot.CALIBRATION_TEMPERATURE, 0, owner, nominal(temperature), temperature);
        add(Slot.CALIBRATION_SUPPLY, 0, owner, around.supply().nominal(), around.supply().range());
        add(Slot.CALIBRATION_RAIL, 0, owner, demand.commonMode().nominal(), demand.commonMode().range());
        plusMinus(Slot.CALIBRATION_STEP_UPPER, 0, owner, step);
        if (calibration.points() == Calibration.Points.TWO) {
            plusMinus(Slot.CALIBRATION_STEP_LOWER, 0, owner, step);
        }
    }

    private void plusMinus(Slot slot, int piece, Owner owner, double magnitude) {
        add(slot, piece, owner, 0, Range.of(-magnitude, magnitude));
    }

    private void add(Slot slot, int piece, Owner owner, double value, Range limits) {
        add(slot, piece, owner, value, limits, Optional.empty());
    }

    private void add(Slot slot, int piece, Owner owner, double value, Range limits, Optional<Reel> reel) {
        nominal[Layout.index(slot, piece)] = value;
        if (limits.width() > 0) {
            inputs.add(new Input(slot, piece, owner, value, limits, distribution(slot), reel));
        }
    }

    /** What the user states of this input of this part, else of this input, else uniform. */
    private Distribution distribution(Slot slot) {
        Distribution found = UNIFORM;
        boolean byPart = false;
        for (StatedDistribution each : stated) {
            boolean names = each.part().isPresent();
            boolean suits = each.input().equals(slot.words()) && (!names || each.names(part));
            if (suits && (names || !byPart)) {
                found = each.distribution();
                byPart |= names;
            }
        }
        return found;
    }
}
