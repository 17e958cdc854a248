package shuntwright.accuracy;

import static shuntwright.circuit.Surroundings.COPPER_COEFFICIENT;
import static shuntwright.circuit.Surroundings.COPPER_TEMPERATURE;
import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import java.util.Arrays;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.parts.Hysteresis;

/**
 * The equations of one channel: trip, release and reading as functions of its inputs, with exact partial derivatives.
 *
 * <p>Shunts: R(T) = R_p + B_p·(T − 25 °C), T = T_a + θ·I²·R/n, solved in closed form, so that for a given voltage v the
 * current is I = 2v/(A + √(A² + 4Kv²)) with A = R_p + B_p·(T_a − 25 °C) and K = B_p·θ/n; without such a current (thermal
 * runaway) the value is infinite. The n shunts are in parallel, each with its own deviation, at one temperature.
 *
 * <p>The channel's own parts are at ambient plus the rise of their zone; references, ADC and taps at ambient.
 *
 * <p>Amplifier: V_o = V_B + G·(I·R + V_e). Threshold node by Kirchhoff's current law. See docs/equations.md.
 */
final class ChannelEquations {

    /** Output bias V_B, V: 0 for rails that only deliver. */
    private static final double OUTPUT_BIAS = 0;

    private final SenseCircuit circuit;
    private final Surroundings around;
    private final int size;
    private final double heating;

    ChannelEquations(SenseCircuit circuit, Surroundings around) {
        this.circuit = circuit;
        this.around = around;
        this.size = Layout.size(circuit.shuntCount());
        this.heating = circuit.shunt().rating().thermalResistance() / circuit.shuntCount();
    }

    int size() {
        return size;
    }

    int shuntCount() {
        return circuit.shuntCount();
    }

    /** The trip current. */
    Equation trip() {
        return crossing(false);
    }

    /** The current at which the comparator releases. */
    Equation release() {
        return crossing(true);
    }

    /** The current that firmware with nominal constants reads when {@code current} flows, A. */
    Equation reading(double current) {
        return new Equation() {
            @Override
            public double value(double[] x) {
                return read(current, x, new double[0]);
            }

            @Override
            public double gradient(double[] x, double[] gradient) {
                Arrays.fill(gradient, 0);
                return read(current, x, gradient);
            }
        };
    }

    private Equation crossing(boolean tripped) {
        return new Equation() {
            @Override
            public double value(double[] x) {
                return cross(tripped, x, new double[0]);
            }

            @Override
            public double gradient(double[] x, double[] gradient) {
                Arrays.fill(gradient, 0);
                return cross(tripped, x, gradient);
            }
        };
    }

    /** Amplifier output voltage at which the comparator changes over, V. */
    double outputVoltage(boolean tripped, double[] x) {
        return output(tripped, x, 0, new double[0]);
    }

    /** The same, adding its partial derivatives to g. */
    double outputSlopes(boolean tripped, double[] x, double[] g) {
        return output(tripped, x, 1, g);
    }

    private double cross(boolean tripped, double[] x, double[] g) {
        boolean slopes = g.length > 0;
        double dT = ThresholdNode.local(x);
        double vo = output(tripped, x, 0, new double[0]);
        double gain = gain(x, dT);
        double v = (vo - OUTPUT_BIAS) / gain - inputError(x, dT);
        Parallel p = Parallel.of(circuit, x);
        double a = p.resistance + p.slope * dT;
        double k = p.slope * heating;
        double square = a * a + 4 * k * v * v;
        if (!(square >= 0)) {
            return Double.POSITIVE_INFINITY;
        }
        double s = Math.sqrt(square);
        double current = 2 * v / (a + s);
        if (slopes) {
            double byV = (1 - k * current * current) / s;
            double byA = -current / s;
            double byK = -v * current * current / s;
            output(tripped, x, byV / gain, g);
            gainSlopes(x, dT, -byV * (vo - OUTPUT_BIAS) / (gain * gain), g);
            inputErrorSlopes(x, dT, -byV, g);
            ThresholdNode.warm(byA * p.slope, g);
            p.slopes(circuit, x, byA, byA * dT + byK * heating, g);
        }
        return current;
    }

    private double read(double current, double[] x, double[] g) {
        boolean slopes = g.length > 0;
        Surroundings.Converter converter = around.adc().orElseThrow();
        double dT = ThresholdNode.local(x);
        Parallel p = Parallel.of(circuit, x);
        double a = p.resistance + p.slope * dT;
        double k = p.slope * heating;
        double room = 1 - k * current * current;
        if (!(room > 0)) {
            return Double.POSITIVE_INFINITY;
        }
        double r = a / room;
        double gain = gain(x, dT);
        double input = current * r + inputError(x, dT);
        double vo = OUTPUT_BIAS + gain * input;
        double full = converter.source().voltage().nominal();
        double tol = x[Slot.ADC_REFERENCE_TOLERANCE.place()];
        double drift = x[Slot.ADC_REFERENCE_DRIFT.place()];
        double age = x[Slot.ADC_REFERENCE_AGEING.place()];
        boolean bySupply = converter.source().isSupply();
        double reference = bySupply
                ? x[Slot.SUPPLY.place()]
                : full * (1 + tol + drift * ThresholdNode.air(x) + age) - x[Slot.ADC_REFERENCE_LOAD.place()];
        double adcGain = 1 + x[Slot.ADC_GAIN.place()];
        double seen = vo + x[Slot.ADC_OFFSET.place()];
        double scale = full / reference;
        double indicated = seen * adcGain * scale + x[Slot.ADC_STEP.place()];
        double constant = 1 / (circuit.amplifier().gain() * circuit.resistance());
        if (slopes) {
            double bySeen = adcGain * scale * constant;
            g[Slot.ADC_OFFSET.place()] += bySeen;
            g[Slot.ADC_GAIN.place()] += seen * scale * constant;
            g[Slot.ADC_STEP.place()] += constant;
            double byReference = -seen * adcGain * scale / reference * constant;
            if (bySupply) {
                g[Slot.SUPPLY.place()] += byReference;
            } else {
                g[Slot.ADC_REFERENCE_TOLERANCE.place()] += byReference * full;
                g[Slot.ADC_REFERENCE_DRIFT.place()] += byReference * full * ThresholdNode.air(x);
                g[Slot.ADC_REFERENCE_AGEING.place()] += byReference * full;
                g[Slot.ADC_REFERENCE_LOAD.place()] -= byReference;
                g[Slot.AMBIENT.place()] += byReference * full * drift;
            }
            gainSlopes(x, dT, bySeen * input, g);
            inputErrorSlopes(x, dT, bySeen * gain, g);
            double byR = bySeen * gain * current;
            double byA = byR / room;
            double byK = byR * a * current * current / (room * room);
            ThresholdNode.warm(byA * p.slope, g);
            p.slopes(circuit, x, byA, byA * dT + byK * heating, g);
        }
        return (indicated - OUTPUT_BIAS) * constant;
    }

    private double gain(double[] x, double dT) {
        return circuit.amplifier().gain() * (1 + x[Slot.GAIN_ERROR.place()] + x[Slot.GAIN_DRIFT.place()] * dT
                + x[Slot.GAIN_AGEING.place()]);
    }

    private void gainSlopes(double[] x, double dT, double weight, double[] g) {
        double nominal = circuit.amplifier().gain() * weight;
        g[Slot.GAIN_ERROR.place()] += nominal;
        g[Slot.GAIN_DRIFT.place()] += nominal * dT;
        g[Slot.GAIN_AGEING.place()] += nominal;
        ThresholdNode.warm(nominal * x[Slot.GAIN_DRIFT.place()], g);
    }

    /** V_e, the sum of errors that act like a voltage at the amplifier's input, V. */
    private double inputError(double[] x, double dT) {
        return x[Slot.OFFSET.place()] + x[Slot.OFFSET_DRIFT.place()] * dT
                + x[Slot.COMMON_MODE.place()]
                        * (x[Slot.RAIL.place()] - circuit.amplifier().input().commonModeSpec())
                + x[Slot.SUPPLY_REJECTION.place()]
                        * (x[Slot.SUPPLY.place()] - circuit.amplifier().input().supplySpec())
                + x[Slot.INPUT_BIAS.place()] * mismatch() + x[Slot.THERMAL_EMF.place()];
    }

    private void inputErrorSlopes(double[] x, double dT, double weight, double[] g) {
        g[Slot.OFFSET.place()] += weight;
        g[Slot.OFFSET_DRIFT.place()] += weight * dT;
        ThresholdNode.warm(weight * x[Slot.OFFSET_DRIFT.place()], g);
        g[Slot.COMMON_MODE.place()] += weight
                * (x[Slot.RAIL.place()] - circuit.amplifier().input().commonModeSpec());
        g[Slot.RAIL.place()] += weight * x[Slot.COMMON_MODE.place()];
        g[Slot.SUPPLY_REJECTION.place()] += weight
                * (x[Slot.SUPPLY.place()] - circuit.amplifier().input().supplySpec());
        g[Slot.SUPPLY.place()] += weight * x[Slot.SUPPLY_REJECTION.place()];
        g[Slot.INPUT_BIAS.place()] += weight * mismatch();
        g[Slot.THERMAL_EMF.place()] += weight;
    }

    private double mismatch() {
        return around.rules().inputResistance() * around.rules().inputMismatch();
    }

    /** V_o at which the comparator changes over; adds weight·∂V_o/∂x to g unless g is empty. */
    private double output(boolean tripped, double[] x, double weight, double[] g) {
        double dT = ThresholdNode.local(x);
        double node = ThresholdNode.voltage(circuit, tripped, x, weight, g);
        double offset = x[Slot.COMPARATOR_OFFSET.place()] + x[Slot.COMPARATOR_DRIFT.place()] * dT;
        double bias = x[Slot.SENSE_BIAS.place()];
        double rh = circuit.network() instanceof HysteresisNetwork.SenseResistor(double nominal) ? nominal : 0;
        double tol = x[Slot.SENSE_RESISTOR_TOLERANCE.place()];
        double drift = x[Slot.SENSE_RESISTOR_DRIFT.place()];
        double resistance = rh * (1 + tol + drift * dT + x[Slot.SENSE_RESISTOR_AGEING.place()]);
        boolean injects = tripped && circuit.comparator().hysteresis() instanceof Hysteresis.InjectedCurrent;
        double current = bias - (injects ? x[Slot.INJECTED_CURRENT.place()] : 0);
        double builtIn = tripped ? x[Slot.BUILT_IN.place()] : 0;
        if (g.length > 0) {
            g[Slot.COMPARATOR_OFFSET.place()] += weight;
            g[Slot.COMPARATOR_DRIFT.place()] += weight * dT;
            g[Slot.SENSE_BIAS.place()] += weight * resistance;
            g[Slot.SENSE_RESISTOR_TOLERANCE.place()] += weight * current * rh;
            g[Slot.SENSE_RESISTOR_AGEING.place()] += weight * current * rh;
            g[Slot.SENSE_RESISTOR_DRIFT.place()] += weight * current * rh * dT;
            ThresholdNode.warm(weight * (x[Slot.COMPARATOR_DRIFT.place()] + current * rh * drift), g);
            if (injects) {
                g[Slot.INJECTED_CURRENT.place()] -= weight * resistance;
            }
            if (tripped) {
                g[Slot.BUILT_IN.place()] -= weight;
            }
        }
        return node + offset + current * resistance - builtIn;
    }

    /** The n shunts in parallel: resistance at 25 °C and its slope, with what their slopes need. */
    private static final class Parallel {
        private final double resistance;
        private final double slope;
        private final double[] at25;
        private final double[] slopes;

        private Parallel(double resistance, double slope, double[] at25, double[] slopes) {
            this.resistance = resistance;
            this.slope = slope;
            this.at25 = at25;
            this.slopes = slopes;
        }

        static Parallel of(SenseCircuit circuit, double[] x) {
            int n = circuit.shuntCount();
            double nominal = circuit.shunt().resistance();
            double[] at25 = new double[n];
            double[] slopes = new double[n];
            double conductance = 0;
            for (int i = 0; i < n; i++) {
                double own = nominal * (1 + x[Layout.index(Slot.SHUNT_TOLERANCE, i)])
                        * (1 + x[Layout.index(Slot.SHUNT_AGEING, i)]);
                double mounting = x[Layout.index(Slot.MOUNTING, i)];
                at25[i] = own + mounting
                        * (1 + COPPER_COEFFICIENT * (REFERENCE_TEMPERATURE - COPPER_TEMPERATURE));
                slopes[i] = own * x[Layout.index(Slot.SHUNT_DRIFT, i)] + mounting * COPPER_COEFFICIENT;
                conductance += 1 / at25[i];
            }
            double resistance = 1 / conductance;
            double sum = 0;
            for (int i = 0; i < n; i++) {
                sum += slopes[i] / (at25[i] * at25[i]);
            }
            return new Parallel(resistance, resistance * resistance * sum, at25, slopes);
        }

        void slopes(SenseCircuit circuit, double[] x, double byResistance, double bySlope, double[] g) {
            double nominal = circuit.shunt().resistance();
            for (int i = 0; i < at25.length; i++) {
                double share = resistance * resistance / (at25[i] * at25[i]);
                double byAt25 = byResistance * share
                        + bySlope * (2 * slope / resistance * share - 2 * share * slopes[i] / at25[i]);
                double byOwnSlope = bySlope * share;
                double tolerance = 1 + x[Layout.index(Slot.SHUNT_TOLERANCE, i)];
                double ageing = 1 + x[Layout.index(Slot.SHUNT_AGEING, i)];
                double drift = x[Layout.index(Slot.SHUNT_DRIFT, i)];
                g[Layout.index(Slot.SHUNT_TOLERANCE, i)] += nominal * ageing * (byAt25 + byOwnSlope * drift);
                g[Layout.index(Slot.SHUNT_AGEING, i)] += nominal * tolerance * (byAt25 + byOwnSlope * drift);
                g[Layout.index(Slot.SHUNT_DRIFT, i)] += nominal * tolerance * ageing * byOwnSlope;
                g[Layout.index(Slot.MOUNTING, i)] += byAt25
                        * (1 + COPPER_COEFFICIENT * (REFERENCE_TEMPERATURE - COPPER_TEMPERATURE))
                        + byOwnSlope * COPPER_COEFFICIENT;
            }
        }
    }
}
