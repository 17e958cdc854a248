package shuntwright.bench;

import java.util.List;
import java.util.random.RandomGenerator;

import shuntwright.accuracy.Input;
import shuntwright.accuracy.Layout;
import shuntwright.accuracy.Slot;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.plan.SolvedChannel;

/**
 * The trip current of a channel with one shunt and a divider at the supply, trial by trial with a generator of the library: how one
 * writes it at first. {@link SamplingBenchmark} checks that it gives the same currents.
 */
final class PlainTrials {
    private final double[] nominal;
    private final int[] places;
    private final double[] from;
    private final double[] to;
    private final double resistance;
    private final double heating;
    private final double gain;
    private final double commonModeSpec;
    private final double supplySpec;
    private final double mismatch;
    private final double top;
    private final double bottom;
    private final double senseResistor;

    PlainTrials(SolvedChannel solved, List<Input> moving) {
        SenseCircuit circuit = solved.circuit();
        Surroundings around = solved.around();
        Threshold.Divider divider = (Threshold.Divider) circuit.threshold();
        nominal = new double[Layout.size(1)];
        for (Input each : solved.inputs()) {
            nominal[Layout.index(each)] = each.nominal();
        }
        places = moving.stream().mapToInt(Layout::index).toArray();
        from = moving.stream().mapToDouble(each -> each.limits().min()).toArray();
        to = moving.stream().mapToDouble(each -> each.limits().max()).toArray();
        resistance = circuit.shunt().resistance();
        heating = circuit.shunt().rating().thermalResistance();
        gain = circuit.amplifier().gain();
        commonModeSpec = circuit.amplifier().input().commonModeSpec();
        supplySpec = circuit.amplifier().input().supplySpec();
        mismatch = around.rules().inputResistance() * around.rules().inputMismatch();
        top = divider.top();
        bottom = divider.bottom();
        senseResistor = circuit.network() instanceof HysteresisNetwork.SenseResistor(double r) ? r : 0;
    }

    /** A vector with everything that moves drawn, and all else nominal. */
    double[] vector() {
        return nominal.clone();
    }

    /** Draws and evaluates all; A. */
    double[] run(RandomGenerator generator, int trials) {
        double[] currents = new double[trials];
        double[] x = nominal.clone();
        for (int trial = 0; trial < trials; trial++) {
            for (int i = 0; i < places.length; i++) {
                x[places[i]] = from[i] + (to[i] - from[i]) * generator.nextDouble();
            }
            currents[trial] = trip(x);
        }
        return currents;
    }

    /** The trip current (docs/equations.md, "Trip and release"), A. */
    double trip(double[] x) {
        double air = x[Slot.AMBIENT.place()] - Surroundings.REFERENCE_TEMPERATURE;
        double local = air + x[Slot.ZONE_RISE.place()];
        double amplification = gain * (1 + x[Slot.GAIN_ERROR.place()] + x[Slot.GAIN_DRIFT.place()] * local
                + x[Slot.GAIN_AGEING.place()]);
        double error = x[Slot.OFFSET.place()] + x[Slot.OFFSET_DRIFT.place()] * local + x[Slot.THERMAL_EMF.place()]
                + x[Slot.COMMON_MODE.place()] * (x[Slot.RAIL.place()] - commonModeSpec)
                + x[Slot.SUPPLY_REJECTION.place()] * (x[Slot.SUPPLY.place()] - supplySpec)
                + x[Slot.INPUT_BIAS.place()] * mismatch;
        double own = resistance * (1 + x[Layout.index(Slot.SHUNT_TOLERANCE, 0)])
                * (1 + x[Layout.index(Slot.SHUNT_AGEING, 0)]);
        double joint = x[Layout.index(Slot.MOUNTING, 0)];
        double slope = own * x[Layout.index(Slot.SHUNT_DRIFT, 0)] + joint * Surroundings.COPPER_COEFFICIENT;
        double warm = own + joint * (1 + Surroundings.COPPER_COEFFICIENT
                * (Surroundings.REFERENCE_TEMPERATURE - Surroundings.COPPER_TEMPERATURE)) + slope * local;
        double gTop = 1 / (top * (1 + x[Slot.TOP_TOLERANCE.place()] + x[Slot.TOP_DRIFT.place()] * local
                + x[Slot.TOP_AGEING.place()]));
        double gBottom = 1 / (bottom * (1 + x[Slot.BOTTOM_TOLERANCE.place()] + x[Slot.BOTTOM_DRIFT.place()] * local
                + x[Slot.BOTTOM_AGEING.place()]));
        double node = (x[Slot.SUPPLY.place()] * gTop - x[Slot.COMPARATOR_BIAS.place()]) / (gTop + gBottom);
        double output = node + x[Slot.COMPARATOR_OFFSET.place()] + x[Slot.COMPARATOR_DRIFT.place()] * local
                + x[Slot.SENSE_BIAS.place()] * senseResistor * (1 + x[Slot.SENSE_RESISTOR_TOLERANCE.place()]
                        + x[Slot.SENSE_RESISTOR_DRIFT.place()] * local + x[Slot.SENSE_RESISTOR_AGEING.place()]);
        double v = output / amplification - error;
        return 2 * v / (warm + Math.sqrt(warm * warm + 4 * slope * heating * v * v));
    }
}
