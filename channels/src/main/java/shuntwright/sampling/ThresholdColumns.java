package shuntwright.sampling;

import shuntwright.accuracy.Slot;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;

/** The voltage of the threshold node, column by column (docs/equations.md, "Threshold"). */
final class ThresholdColumns {

    private final SenseCircuit circuit;

    ThresholdColumns(SenseCircuit circuit) {
        this.circuit = circuit;
    }

    /** Nominal resistor between amplifier output and comparator, Ω; 0 for none. */
    double senseResistor() {
        return circuit.network() instanceof HysteresisNetwork.SenseResistor(double resistance) ? resistance : 0;
    }

    /**
     * @param tripped for release instead of trip
     * @param x       inputs
     * @param air     ambient above 25 °C, K
     * @param local   temperature around the channel's own parts above 25 °C, K
     * @param help    for use in between
     * @param v       V, overwritten
     */
    void voltage(boolean tripped, double[][] x, double[] air, double[] local, int count, double[] help, double[] v) {
        switch (circuit.threshold()) {
            case Threshold.Divider divider -> {
                source(divider.source(), x, air, count, v);
                divider(divider, tripped, x, divider.tap().isEmpty() ? local : air, local, count, help, v);
            }
            case Threshold.DacOutput dac -> {
                source(dac.source(), x, air, count, v);
                dac(dac.code() / (double) (1 << dac.dac().bits()), x[Slot.DAC_GAIN.place()], x[Slot.DAC_OFFSET.place()],
                        count, v);
            }
        }
    }

    private static void source(SourceVoltage source, double[][] x, double[] air, int count, double[] v) {
        if (source.isSupply()) {
            System.arraycopy(x[Slot.SUPPLY.place()], 0, v, 0, count);
            return;
        }
        double nominal = source.voltage().nominal();
        double[] tolerance = x[Slot.REFERENCE_TOLERANCE.place()];
        double[] drift = x[Slot.REFERENCE_DRIFT.place()];
        double[] ageing = x[Slot.REFERENCE_AGEING.place()];
        double[] load = x[Slot.REFERENCE_LOAD.place()];
        for (int j = 0; j < count; j++) {
            v[j] = nominal * (1 + tolerance[j] + drift[j] * air[j] + ageing[j]) - load[j];
        }
    }

    private static void dac(double share, double[] gain, double[] offset, int count, double[] v) {
        for (int j = 0; j < count; j++) {
            v[j] = v[j] * share * (1 + gain[j]) + offset[j];
        }
    }

    /** Kirchhoff's current law at the node: v holds the source on entry, the node's voltage on return. */
    private void divider(Threshold.Divider divider, boolean tripped, double[][] x, double[] temperature, double[] local,
            int count, double[] help, double[] v) {
        conductance(divider.top(), x, Slot.TOP_TOLERANCE, Slot.TOP_DRIFT, Slot.TOP_AGEING, temperature, count, help);
        for (int j = 0; j < count; j++) {
            v[j] *= help[j];
        }
        double[] bias = x[Slot.COMPARATOR_BIAS.place()];
        double users = divider.users();
        for (int j = 0; j < count; j++) {
            v[j] -= users * bias[j];
        }
        bottom(divider.bottom(), x, temperature, count, help);
        if (circuit.network() instanceof HysteresisNetwork.Feedback feedback) {
            feedback(feedback, tripped, x, local, count, help, v);
        }
        for (int j = 0; j < count; j++) {
            v[j] /= help[j];
        }
    }

    private static void conductance(double nominal, double[][] x, Slot tolerance, Slot drift, Slot ageing,
            double[] temperature, int count, double[] into) {
        double[] t = x[tolerance.place()];
        double[] d = x[drift.place()];
        double[] a = x[ageing.place()];
        for (int j = 0; j < count; j++) {
            into[j] = 1 / (nominal * (1 + t[j] + d[j] * temperature[j] + a[j]));
        }
    }

    /** Adds the bottom resistor's conductance. */
    private static void bottom(double nominal, double[][] x, double[] temperature, int count, double[] total) {
        double[] t = x[Slot.BOTTOM_TOLERANCE.place()];
        double[] d = x[Slot.BOTTOM_DRIFT.place()];
        double[] a = x[Slot.BOTTOM_AGEING.place()];
        for (int j = 0; j < count; j++) {
            total[j] += 1 / (nominal * (1 + t[j] + d[j] * temperature[j] + a[j]));
        }
    }

    /** Adds the feedback's current to v and its conductance to the total. */
    private static void feedback(HysteresisNetwork.Feedback feedback, boolean tripped, double[][] x, double[] local,
            int count, double[] total, double[] v) {
        Slot far = tripped ? Slot.OUTPUT_LOW : feedback.supplied() ? Slot.SUPPLY : Slot.PULL_UP_VOLTAGE;
        double[] voltage = x[far.place()];
        double[] t = x[Slot.FEEDBACK_TOLERANCE.place()];
        double[] d = x[Slot.FEEDBACK_DRIFT.place()];
        double[] a = x[Slot.FEEDBACK_AGEING.place()];
        double[] pull = x[Slot.PULL_UP_TOLERANCE.place()];
        double nominal = feedback.resistance();
        double pullUp = tripped ? 0 : feedback.pullUp();
        for (int j = 0; j < count; j++) {
            double g = 1 / (nominal * (1 + t[j] + d[j] * local[j] + a[j]) + pullUp * (1 + pull[j]));
            v[j] += voltage[j] * g;
            total[j] += g;
        }
    }
}
