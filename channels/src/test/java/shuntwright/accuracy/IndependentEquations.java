package shuntwright.accuracy;

import org.hipparchus.analysis.differentiation.Gradient;

import shuntwright.board.Calibration;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.fixture.RandomCircuits;
import shuntwright.parts.Hysteresis;

/**
 * A channel's equations written anew for a differentiation library: the threshold by Thévenin's theorem, the shunts by
 * their conductance, the current by Newton's method on the heated shunts' voltage, calibration by the gain and offset that
 * firmware would store.
 */
final class IndependentEquations {

    private final RandomCircuits.Drawn drawn;
    private final Gradient[] inputs;
    /** Distance from 25 °C of the board's air and of the channel's own parts, K. */
    private final Gradient air;
    private final Gradient kelvin;

    IndependentEquations(RandomCircuits.Drawn drawn, double[] at) {
        this(drawn, variables(at));
    }

    private IndependentEquations(RandomCircuits.Drawn drawn, Gradient[] inputs) {
        this.drawn = drawn;
        this.inputs = inputs;
        this.air = x(Slot.AMBIENT).subtract(25);
        this.kelvin = air.add(x(Slot.ZONE_RISE));
    }

    private static Gradient[] variables(double[] at) {
        Gradient[] inputs = new Gradient[at.length];
        for (int i = 0; i < at.length; i++) {
            inputs[i] = Gradient.variable(at.length, i, at[i]);
        }
        return inputs;
    }

    private Gradient x(Slot slot) {
        return x(slot, 0);
    }

    private Gradient x(Slot slot, int piece) {
        return inputs[Layout.index(slot, piece)];
    }

    private Gradient constant(double value) {
        return Gradient.constant(inputs.length, value);
    }

    Gradient threshold(boolean tripped) {
        Gradient node = node(tripped).add(x(Slot.COMPARATOR_OFFSET)).add(x(Slot.COMPARATOR_DRIFT).multiply(kelvin));
        if (tripped) {
            node = node.subtract(x(Slot.BUILT_IN));
        }
        if (drawn.circuit().network() instanceof HysteresisNetwork.SenseResistor(double nominal)) {
            Gradient resistance = varied(nominal, kelvin, Slot.SENSE_RESISTOR_TOLERANCE, Slot.SENSE_RESISTOR_DRIFT,
                    Slot.SENSE_RESISTOR_AGEING);
            // The sense input draws its bias current, and drives out I_H while tripped.
            node = node.add(resistance.multiply(x(Slot.SENSE_BIAS)));
            if (tripped && drawn.circuit().comparator().hysteresis() instanceof Hysteresis.InjectedCurrent) {
                node = node.subtract(resistance.multiply(x(Slot.INJECTED_CURRENT)));
            }
        }
        return node;
    }

    private Gradient varied(double nominal, Gradient distance, Slot tolerance, Slot drift, Slot ageing) {
        return x(tolerance).add(x(drift).multiply(distance)).add(x(ageing)).add(1).multiply(nominal);
    }

    private Gradient node(boolean tripped) {
        return switch (drawn.circuit().threshold()) {
            case Threshold.DacOutput dac -> source(dac.source(), Slot.REFERENCE_TOLERANCE, Slot.REFERENCE_DRIFT,
                    Slot.REFERENCE_AGEING, Slot.REFERENCE_LOAD).multiply(dac.code() * Math.pow(2, -dac.dac().bits()))
                    .multiply(x(Slot.DAC_GAIN).add(1)).add(x(Slot.DAC_OFFSET));
            case Threshold.Divider divider -> divider(divider, tripped);
        };
    }

    /** A tap's divider is at ambient temperature, like the references; an own one among the channel's parts. */
    private Gradient divider(Threshold.Divider divider, boolean tripped) {
        Gradient distance = divider.tap().isEmpty() ? kelvin : air;
        Gradient top = varied(divider.top(), distance, Slot.TOP_TOLERANCE, Slot.TOP_DRIFT, Slot.TOP_AGEING);
        Gradient bottom = varied(divider.bottom(), distance, Slot.BOTTOM_TOLERANCE, Slot.BOTTOM_DRIFT,
                Slot.BOTTOM_AGEING);
        Gradient ratio = bottom.divide(top.add(bottom));
        Gradient open = source(divider.source(), Slot.REFERENCE_TOLERANCE, Slot.REFERENCE_DRIFT, Slot.REFERENCE_AGEING,
                Slot.REFERENCE_LOAD).multiply(ratio);
        Gradient inner = top.multiply(ratio);
        Gradient loaded = open.subtract(inner.multiply(x(Slot.COMPARATOR_BIAS)).multiply(divider.users()));
        if (!(drawn.circuit().network() instanceof HysteresisNetwork.Feedback feedback)) {
            return loaded;
        }
        Gradient back = varied(feedback.resistance(), kelvin, Slot.FEEDBACK_TOLERANCE, Slot.FEEDBACK_DRIFT,
                Slot.FEEDBACK_AGEING);
        Gradient far = x(Slot.OUTPUT_LOW);
        if (!tripped) {
            back = back.add(x(Slot.PULL_UP_TOLERANCE).add(1).multiply(feedback.pullUp()));
            far = x(feedback.supplied() ? Slot.SUPPLY : Slot.PULL_UP_VOLTAGE);
        }
        return loaded.add(far.subtract(loaded).multiply(inner).divide(inner.add(back)));
    }

    private Gradient source(SourceVoltage source, Slot tolerance, Slot drift, Slot ageing, Slot load) {
        return source.isSupply()
                ? x(Slot.SUPPLY)
                : varied(source.voltage().nominal(), air, tolerance, drift, ageing).subtract(x(load));
    }

    Gradient gain() {
        return varied(drawn.circuit().amplifier().gain(), kelvin, Slot.GAIN_ERROR, Slot.GAIN_DRIFT, Slot.GAIN_AGEING);
    }

    Gradient inputError() {
        var input = drawn.circuit().amplifier().input();
        var rules = drawn.around().rules();
        return x(Slot.OFFSET).add(x(Slot.OFFSET_DRIFT).multiply(kelvin))
                .add(x(Slot.RAIL).subtract(input.commonModeSpec()).multiply(x(Slot.COMMON_MODE)))
                .add(x(Slot.SUPPLY).subtract(input.supplySpec()).multiply(x(Slot.SUPPLY_REJECTION)))
                .add(x(Slot.INPUT_BIAS).multiply(rules.inputResistance() * rules.inputMismatch()))
                .add(x(Slot.THERMAL_EMF));
    }

    /** Resistance of all shunts at the temperature that a current gives them. */
    private Gradient heated(Gradient current) {
        var shunt = drawn.circuit().shunt();
        Gradient conductance = constant(0);
        Gradient change = constant(0);
        for (int i = 0; i < drawn.circuit().shuntCount(); i++) {
            Gradient own = x(Slot.SHUNT_TOLERANCE, i).add(1).multiply(x(Slot.SHUNT_AGEING, i).add(1))
                    .multiply(shunt.resistance());
            // Copper by its resistance at 20 °C, taken to 25 °C.
            Gradient each = own.add(x(Slot.MOUNTING, i).multiply(1 + 0.00393 * 5));
            Gradient slope = own.multiply(x(Slot.SHUNT_DRIFT, i)).add(x(Slot.MOUNTING, i).multiply(0.00393));
            conductance = conductance.add(each.reciprocal());
            change = change.subtract(slope.divide(each.square()));
        }
        Gradient resistance = conductance.reciprocal();
        Gradient slope = change.divide(conductance.square()).negate();
        Gradient cold = resistance.add(slope.multiply(kelvin));
        // T - T_a = θ·I²·R(T)/n, solved for R(T).
        Gradient rise = current.square().multiply(shunt.rating().thermalResistance() / drawn.circuit().shuntCount());
        return cold.divide(constant(1).subtract(slope.multiply(rise)));
    }

    Gradient crossing(boolean tripped) {
        Gradient wanted = threshold(tripped).divide(gain()).subtract(inputError());
        Gradient current = wanted.divide(drawn.circuit().resistance());
        for (int step = 0; step < 25; step++) {
            // Secant slope: the shunt's own resistance is close to the derivative of its voltage.
            Gradient missing = wanted.subtract(current.multiply(heated(current)));
            current = current.add(missing.divide(heated(current)));
        }
        return current;
    }

    Gradient reading(double actual) {
        Surroundings.Converter converter = drawn.around().adc().orElseThrow();
        Gradient output = heated(constant(actual)).multiply(actual).add(inputError()).multiply(gain());
        Gradient full = source(converter.source(), Slot.ADC_REFERENCE_TOLERANCE, Slot.ADC_REFERENCE_DRIFT,
                Slot.ADC_REFERENCE_AGEING, Slot.ADC_REFERENCE_LOAD);
        Gradient steps = output.add(x(Slot.ADC_OFFSET)).multiply(x(Slot.ADC_GAIN).add(1)).divide(full)
                .multiply(Math.pow(2, converter.adc().bits())).add(x(Slot.ADC_STEP).divide(converter.step()));
        return steps.multiply(converter.step()).divide(drawn.circuit().amplifier().gain())
                .divide(drawn.circuit().resistance());
    }

    /**
     * The reading that firmware corrects by a gain (and an offset): those that made the readings at production equal to the
     * currents it was told, each wrong by the same share.
     */
    Gradient calibrated(double actual) {
        Calibration calibration = drawn.demand().channel().reading().calibration().orElseThrow();
        double load = drawn.demand().load();
        double set = calibration.upper().orElse(load);
        Gradient told = x(Slot.CALIBRATION_CURRENT).add(1);
        Gradient raw = reading(actual);
        Gradient rawAtUpper = atProduction(Slot.CALIBRATION_STEP_UPPER, Slot.CALIBRATION_EMF_UPPER).reading(set);
        if (calibration.points() == Calibration.Points.ONE) {
            return raw.multiply(told.multiply(set).divide(rawAtUpper));
        }
        double low = calibration.lower().orElse(set / 10);
        Gradient rawAtLower = atProduction(Slot.CALIBRATION_STEP_LOWER, Slot.CALIBRATION_EMF_LOWER).reading(low);
        Gradient gain = told.multiply(set - low).divide(rawAtUpper.subtract(rawAtLower));
        Gradient offset = told.multiply(low).subtract(gain.multiply(rawAtLower));
        return gain.multiply(raw).add(offset);
    }

    /** The same circuit new, in the production hall. */
    private IndependentEquations atProduction(Slot step, Slot emf) {
        Gradient[] then = inputs.clone();
        then[Slot.AMBIENT.place()] = x(Slot.CALIBRATION_TEMPERATURE);
        then[Slot.SUPPLY.place()] = x(Slot.CALIBRATION_SUPPLY);
        then[Slot.RAIL.place()] = x(Slot.CALIBRATION_RAIL);
        then[Slot.ADC_STEP.place()] = x(step);
        then[Slot.THERMAL_EMF.place()] = x(emf);
        then[Slot.ZONE_RISE.place()] = constant(0);
        then[Slot.GAIN_AGEING.place()] = constant(0);
        then[Slot.ADC_REFERENCE_AGEING.place()] = constant(0);
        for (int i = 0; i < drawn.circuit().shuntCount(); i++) {
            then[Layout.index(Slot.SHUNT_AGEING, i)] = constant(0);
        }
        return new IndependentEquations(drawn, then);
    }
}
