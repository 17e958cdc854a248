package shuntwright.sampling;

import static shuntwright.circuit.Surroundings.COPPER_COEFFICIENT;
import static shuntwright.circuit.Surroundings.COPPER_TEMPERATURE;
import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import java.util.List;

import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.Layout;
import shuntwright.accuracy.Outcome;
import shuntwright.accuracy.Slot;
import shuntwright.board.Calibration;
import shuntwright.board.Demand;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.parts.Hysteresis;

/**
 * The equations of one channel, column by column: the same as those that limits and combined uncertainty read trial by trial
 * (docs/equations.md; a test holds the two together), written as small loops that the compiler turns into vector instructions.
 * Outcomes share what they have in common.
 */
public final class ChannelModel implements Model {

    private static final int LOCAL = 0;
    private static final int AIR = 1;
    private static final int GAIN = 2;
    private static final int ERROR = 3;
    private static final int RESISTANCE = 4;
    private static final int SLOPE = 5;
    private static final int OUTPUT = 6;
    private static final int HELP = 7;
    private static final int LOWER = 8;
    private static final int UPPER = 9;
    private static final int THRESHOLD = 10;

    private static final double JOINT = 1 + COPPER_COEFFICIENT * (REFERENCE_TEMPERATURE - COPPER_TEMPERATURE);

    private final SenseCircuit circuit;
    private final Surroundings around;
    private final Demand demand;
    private final List<ChannelAccuracy.Asked> asked;
    private final ThresholdColumns threshold;
    private final double heating;
    private final double[] zeros = new double[Draws.BLOCK];

    /**
     * @param circuit the chosen parts and values
     * @param around  what it shares
     * @param demand  what is asked; decides the outputs, in the order of {@link ChannelAccuracy#asked}
     */
    public ChannelModel(SenseCircuit circuit, Surroundings around, Demand demand) {
        this.circuit = circuit;
        this.around = around;
        this.demand = demand;
        this.asked = ChannelAccuracy.asked(demand, around.adc().isPresent());
        this.threshold = new ThresholdColumns(circuit);
        this.heating = circuit.shunt().rating().thermalResistance() / circuit.shuntCount();
    }

    /** What its outputs are. */
    public List<ChannelAccuracy.Asked> asked() {
        return asked;
    }

    @Override
    public int inputs() {
        return Layout.size(circuit.shuntCount());
    }

    @Override
    public int outputs() {
        return asked.size();
    }

    @Override
    public List<Integer> multiplying() {
        return List.of(Slot.AMBIENT.place(), Slot.ZONE_RISE.place());
    }

    @Override
    public void evaluate(double[][] x, int count, double[][] y, Scratch scratch) {
        common(x, count, scratch);
        for (int i = 0; i < asked.size(); i++) {
            ChannelAccuracy.Asked each = asked.get(i);
            switch (each.outcome()) {
                case TRIP -> current(output(x, count, false, scratch), count, scratch, y[i]);
                case RELEASE -> current(output(x, count, true, scratch), count, scratch, y[i]);
                case READING_AT_LEAST, READING_AT_LOAD -> reading(each.current(), x, count, scratch, y[i]);
            }
        }
        if (calibrated()) {
            calibrate(x, count, y, scratch);
        }
    }

    private boolean calibrated() {
        return demand.channel().reading().calibration().isPresent() && asked.stream().anyMatch(ChannelModel::reads);
    }

    private static boolean reads(ChannelAccuracy.Asked each) {
        return each.outcome() == Outcome.READING_AT_LEAST || each.outcome() == Outcome.READING_AT_LOAD;
    }

    /** Temperatures, gain, input error and shunts, on which all outcomes rest. */
    private void common(double[][] x, int count, Scratch scratch) {
        double[] air = scratch.column(AIR);
        double[] local = scratch.column(LOCAL);
        temperatures(x[Slot.AMBIENT.place()], x[Slot.ZONE_RISE.place()], count, air, local);
        gain(x[Slot.GAIN_ERROR.place()], x[Slot.GAIN_DRIFT.place()], x[Slot.GAIN_AGEING.place()], local, count,
                scratch.column(GAIN));
        inputError(x, local, count, scratch.column(ERROR));
        shunts(x, local, count, scratch);
    }

    private static void temperatures(double[] ambient, double[] rise, int count, double[] air, double[] local) {
        for (int j = 0; j < count; j++) {
            double above = ambient[j] - REFERENCE_TEMPERATURE;
            air[j] = above;
            local[j] = above + rise[j];
        }
    }

    private void gain(double[] error, double[] drift, double[] ageing, double[] local, int count, double[] gain) {
        double nominal = circuit.amplifier().gain();
        for (int j = 0; j < count; j++) {
            gain[j] = nominal * (1 + error[j] + drift[j] * local[j] + ageing[j]);
        }
    }

    private void inputError(double[][] x, double[] local, int count, double[] error) {
        double mismatch = around.rules().inputResistance() * around.rules().inputMismatch();
        offset(x[Slot.OFFSET.place()], x[Slot.OFFSET_DRIFT.place()], x[Slot.THERMAL_EMF.place()], local, count, error);
        rejection(x[Slot.COMMON_MODE.place()], x[Slot.RAIL.place()], circuit.amplifier().input().commonModeSpec(),
                count,
                error);
        rejection(x[Slot.SUPPLY_REJECTION.place()], x[Slot.SUPPLY.place()], circuit.amplifier().input().supplySpec(),
                count, error);
        if (mismatch > 0) {
            add(x[Slot.INPUT_BIAS.place()], mismatch, count, error);
        }
    }

    private static void offset(double[] offset, double[] drift, double[] emf, double[] local, int count,
            double[] error) {
        for (int j = 0; j < count; j++) {
            error[j] = offset[j] + drift[j] * local[j] + emf[j];
        }
    }

    private static void rejection(double[] perVolt, double[] voltage, double specified, int count, double[] error) {
        for (int j = 0; j < count; j++) {
            error[j] += perVolt[j] * (voltage[j] - specified);
        }
    }

    private static void add(double[] column, double factor, int count, double[] to) {
        for (int j = 0; j < count; j++) {
            to[j] += factor * column[j];
        }
    }

    /** Resistance of all shunts at 25 °C around them and no current, then at the local temperature; and its slope by temperature. */
    private void shunts(double[][] x, double[] local, int count, Scratch scratch) {
        double[] resistance = scratch.column(RESISTANCE);
        double[] slope = scratch.column(SLOPE);
        double[] help = scratch.column(HELP);
        int n = circuit.shuntCount();
        for (int i = 0; i < n; i++) {
            double[] own = i == 0 ? resistance : help;
            own(x[Layout.index(Slot.SHUNT_TOLERANCE, i)], x[Layout.index(Slot.SHUNT_AGEING, i)], count, own);
            if (i == 0) {
                single(x[Layout.index(Slot.SHUNT_DRIFT, 0)], x[Layout.index(Slot.MOUNTING, 0)], count, resistance,
                        slope);
                if (n > 1) {
                    conductance(count, resistance, slope);
                }
            } else {
                further(x[Layout.index(Slot.SHUNT_DRIFT, i)], x[Layout.index(Slot.MOUNTING, i)], help, count,
                        resistance,
                        slope);
            }
        }
        if (n > 1) {
            parallel(count, resistance, slope);
        }
        for (int j = 0; j < count; j++) {
            resistance[j] += slope[j] * local[j];
        }
    }

    private void own(double[] tolerance, double[] ageing, int count, double[] own) {
        double nominal = circuit.shunt().resistance();
        for (int j = 0; j < count; j++) {
            own[j] = nominal * (1 + tolerance[j]) * (1 + ageing[j]);
        }
    }

    private static void single(double[] drift, double[] mounting, int count, double[] resistance, double[] slope) {
        for (int j = 0; j < count; j++) {
            slope[j] = resistance[j] * drift[j] + mounting[j] * COPPER_COEFFICIENT;
            resistance[j] += mounting[j] * JOINT;
        }
    }

    /** From resistance and slope to conductance and its share of the slope. */
    private static void conductance(int count, double[] resistance, double[] slope) {
        for (int j = 0; j < count; j++) {
            double g = 1 / resistance[j];
            resistance[j] = g;
            slope[j] *= g * g;
        }
    }

    private static void further(double[] drift, double[] mounting, double[] own, int count, double[] conductance,
            double[] slope) {
        for (int j = 0; j < count; j++) {
            double at25 = own[j] + mounting[j] * JOINT;
            double g = 1 / at25;
            conductance[j] += g;
            slope[j] += (own[j] * drift[j] + mounting[j] * COPPER_COEFFICIENT) * g * g;
        }
    }

    private static void parallel(int count, double[] resistance, double[] slope) {
        for (int j = 0; j < count; j++) {
            double r = 1 / resistance[j];
            resistance[j] = r;
            slope[j] *= r * r;
        }
    }

    /** Amplifier output voltage at which the comparator changes over, V. */
    private double[] output(double[][] x, int count, boolean tripped, Scratch scratch) {
        double[] output = scratch.column(OUTPUT);
        double[] local = scratch.column(LOCAL);
        threshold.voltage(tripped, x, scratch.column(AIR), local, count, scratch.column(THRESHOLD), output);
        offset(x[Slot.COMPARATOR_OFFSET.place()], x[Slot.COMPARATOR_DRIFT.place()], local, count, output);
        double resistance = threshold.senseResistor();
        boolean injects = tripped && circuit.comparator().hysteresis() instanceof Hysteresis.InjectedCurrent;
        if (resistance > 0) {
            double[] injected = injects ? x[Slot.INJECTED_CURRENT.place()] : zeros;
            senseResistor(x[Slot.SENSE_BIAS.place()], injected, resistance, x, local, count, output);
        }
        if (tripped) {
            add(x[Slot.BUILT_IN.place()], -1, count, output);
        }
        return output;
    }

    private static void offset(double[] offset, double[] drift, double[] local, int count, double[] output) {
        for (int j = 0; j < count; j++) {
            output[j] += offset[j] + drift[j] * local[j];
        }
    }

    private static void senseResistor(double[] bias, double[] injected, double nominal, double[][] x, double[] local,
            int count, double[] output) {
        double[] tolerance = x[Slot.SENSE_RESISTOR_TOLERANCE.place()];
        double[] drift = x[Slot.SENSE_RESISTOR_DRIFT.place()];
        double[] ageing = x[Slot.SENSE_RESISTOR_AGEING.place()];
        for (int j = 0; j < count; j++) {
            output[j] += (bias[j] - injected[j]) * nominal * (1 + tolerance[j] + drift[j] * local[j] + ageing[j]);
        }
    }

    /** The current at which the amplifier's output reaches a voltage, self-heating included; not a number in thermal runaway. */
    private void current(double[] output, int count, Scratch scratch, double[] y) {
        double[] gain = scratch.column(GAIN);
        double[] error = scratch.column(ERROR);
        double[] a = scratch.column(RESISTANCE);
        double[] slope = scratch.column(SLOPE);
        double four = 4 * heating;
        for (int j = 0; j < count; j++) {
            double v = output[j] / gain[j] - error[j];
            y[j] = 2 * v / (a[j] + Math.sqrt(a[j] * a[j] + four * slope[j] * v * v));
        }
    }

    /** What firmware with nominal constants reads; not a number in thermal runaway. */
    private void reading(double current, double[][] x, int count, Scratch scratch, double[] y) {
        Surroundings.Converter converter = around.adc().orElseThrow();
        double full = converter.source().voltage().nominal();
        double[] scale = scratch.column(HELP);
        if (converter.source().isSupply()) {
            scaleBySupply(full, x[Slot.SUPPLY.place()], count, scale);
        } else {
            scaleByReference(full, x, scratch.column(AIR), count, scale);
        }
        amplified(current, scratch, count, y);
        converted(x, scale, 1 / (circuit.amplifier().gain() * circuit.resistance()), count, y);
    }

    private static void scaleBySupply(double full, double[] supply, int count, double[] scale) {
        for (int j = 0; j < count; j++) {
            scale[j] = full / supply[j];
        }
    }

    private static void scaleByReference(double full, double[][] x, double[] air, int count, double[] scale) {
        double[] tolerance = x[Slot.ADC_REFERENCE_TOLERANCE.place()];
        double[] drift = x[Slot.ADC_REFERENCE_DRIFT.place()];
        double[] ageing = x[Slot.ADC_REFERENCE_AGEING.place()];
        double[] load = x[Slot.ADC_REFERENCE_LOAD.place()];
        for (int j = 0; j < count; j++) {
            scale[j] = full / (full * (1 + tolerance[j] + drift[j] * air[j] + ageing[j]) - load[j]);
        }
    }

    private void amplified(double current, Scratch scratch, int count, double[] y) {
        double[] gain = scratch.column(GAIN);
        double[] error = scratch.column(ERROR);
        double[] resistance = scratch.column(RESISTANCE);
        double[] slope = scratch.column(SLOPE);
        double heat = heating * current * current;
        for (int j = 0; j < count; j++) {
            double room = 1 - slope[j] * heat;
            double r = room > 0 ? resistance[j] / room : Double.NaN;
            y[j] = gain[j] * (current * r + error[j]);
        }
    }

    private static void converted(double[][] x, double[] scale, double constant, int count, double[] y) {
        double[] gain = x[Slot.ADC_GAIN.place()];
        double[] offset = x[Slot.ADC_OFFSET.place()];
        double[] step = x[Slot.ADC_STEP.place()];
        for (int j = 0; j < count; j++) {
            y[j] = ((y[j] + offset[j]) * (1 + gain[j]) * scale[j] + step[j]) * constant;
        }
    }

    /** Turns the plain readings into those of firmware that was calibrated; the columns of the channel are used up. */
    private void calibrate(double[][] x, int count, double[][] y, Scratch scratch) {
        Calibration calibration = demand.channel().reading().calibration().orElseThrow();
        double upper = calibration.upperCurrent(demand.load());
        double lower = calibration.lowerCurrent(demand.load());
        double[] atUpper = scratch.column(UPPER);
        double[] atLower = scratch.column(LOWER);
        double[][] then = atCalibration(x);
        then[Slot.THERMAL_EMF.place()] = x[Slot.CALIBRATION_EMF_UPPER.place()];
        common(then, count, scratch);
        then[Slot.ADC_STEP.place()] = x[Slot.CALIBRATION_STEP_UPPER.place()];
        reading(upper, then, count, scratch, atUpper);
        boolean two = calibration.points() == Calibration.Points.TWO;
        if (two) {
            then[Slot.ADC_STEP.place()] = x[Slot.CALIBRATION_STEP_LOWER.place()];
            then[Slot.THERMAL_EMF.place()] = x[Slot.CALIBRATION_EMF_LOWER.place()];
            inputError(then, scratch.column(LOCAL), count, scratch.column(ERROR));
            reading(lower, then, count, scratch, atLower);
        }
        double[] error = x[Slot.CALIBRATION_CURRENT.place()];
        for (int i = 0; i < asked.size(); i++) {
            if (reads(asked.get(i))) {
                if (two) {
                    byTwo(lower, upper, atLower, atUpper, error, count, y[i]);
                } else {
                    byOne(upper, atUpper, error, count, y[i]);
                }
            }
        }
    }

    private static void byOne(double upper, double[] atUpper, double[] error, int count, double[] y) {
        for (int j = 0; j < count; j++) {
            y[j] = atUpper[j] > 0 ? y[j] * upper * (1 + error[j]) / atUpper[j] : Double.NaN;
        }
    }

    private static void byTwo(double lower, double upper, double[] atLower, double[] atUpper, double[] error, int count,
            double[] y) {
        for (int j = 0; j < count; j++) {
            double span = atUpper[j] - atLower[j];
            y[j] = span > 0
                    ? (1 + error[j]) * (lower + (upper - lower) * (y[j] - atLower[j]) / span)
                    : Double.NaN;
        }
    }

    /** The columns as they were at calibration. */
    private double[][] atCalibration(double[][] x) {
        double[][] then = x.clone();
        then[Slot.AMBIENT.place()] = x[Slot.CALIBRATION_TEMPERATURE.place()];
        then[Slot.SUPPLY.place()] = x[Slot.CALIBRATION_SUPPLY.place()];
        then[Slot.RAIL.place()] = x[Slot.CALIBRATION_RAIL.place()];
        then[Slot.ZONE_RISE.place()] = zeros;
        then[Slot.GAIN_AGEING.place()] = zeros;
        then[Slot.ADC_REFERENCE_AGEING.place()] = zeros;
        for (int i = 0; i < circuit.shuntCount(); i++) {
            then[Layout.index(Slot.SHUNT_AGEING, i)] = zeros;
        }
        return then;
    }
}
