package shuntwright.accuracy;

import static shuntwright.circuit.Surroundings.REFERENCE_TEMPERATURE;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;

/**
 * The voltage of the threshold node by Kirchhoff's current law: V = (V_X/R_t + i_F − m·I_B)/(1/R_t + 1/R_b + g_F), where
 * g_F = 1/(R_F + R_PU), i_F = V_IO·g_F while not tripped, g_F = 1/R_F, i_F = V_OL·g_F while tripped, both 0 without
 * feedback, and m comparators draw their bias current I_B.
 */
final class ThresholdNode {

    private ThresholdNode() {
    }

    /** Temperature of the ambient air above 25 °C, K. */
    static double air(double[] x) {
        return x[Slot.AMBIENT.place()] - REFERENCE_TEMPERATURE;
    }

    /** Temperature around the channel's own parts above 25 °C, K. */
    static double local(double[] x) {
        return air(x) + x[Slot.ZONE_RISE.place()];
    }

    /** Adds a slope by the temperature around the channel's own parts to g. */
    static void warm(double slope, double[] g) {
        g[Slot.AMBIENT.place()] += slope;
        g[Slot.ZONE_RISE.place()] += slope;
    }

    /** V at x; adds weight·∂V/∂x to g unless g is empty. */
    static double voltage(SenseCircuit circuit, boolean tripped, double[] x, double weight, double[] g) {
        return switch (circuit.threshold()) {
            case Threshold.Divider divider -> divider(circuit, divider, tripped, x, weight, g);
            case Threshold.DacOutput dac -> dac(dac, x, weight, g);
        };
    }

    private static double dac(Threshold.DacOutput dac, double[] x, double weight, double[] g) {
        double share = dac.code() / (double) (1 << dac.dac().bits());
        double source = source(dac.source(), x);
        double gain = 1 + x[Slot.DAC_GAIN.place()];
        if (g.length > 0) {
            g[Slot.DAC_GAIN.place()] += weight * source * share;
            g[Slot.DAC_OFFSET.place()] += weight;
            sourceSlopes(dac.source(), x, weight * share * gain, g);
        }
        return source * share * gain + x[Slot.DAC_OFFSET.place()];
    }

    private static double divider(SenseCircuit circuit, Threshold.Divider divider, boolean tripped, double[] x,
            double weight, double[] g) {
        boolean own = divider.tap().isEmpty();
        double dT = own ? local(x) : air(x);
        double source = source(divider.source(), x);
        double topFactor = 1 + x[Slot.TOP_TOLERANCE.place()] + x[Slot.TOP_DRIFT.place()] * dT
                + x[Slot.TOP_AGEING.place()];
        double bottomFactor = 1 + x[Slot.BOTTOM_TOLERANCE.place()] + x[Slot.BOTTOM_DRIFT.place()] * dT
                + x[Slot.BOTTOM_AGEING.place()];
        double gTop = 1 / (divider.top() * topFactor);
        double gBottom = 1 / (divider.bottom() * bottomFactor);
        double bias = divider.users() * x[Slot.COMPARATOR_BIAS.place()];
        double gFeedback = 0;
        double far = 0;
        Slot farSlot = Slot.OUTPUT_LOW;
        if (circuit.network() instanceof HysteresisNetwork.Feedback feedback) {
            double factor = 1 + x[Slot.FEEDBACK_TOLERANCE.place()] + x[Slot.FEEDBACK_DRIFT.place()] * local(x)
                    + x[Slot.FEEDBACK_AGEING.place()];
            double series = feedback.resistance() * factor
                    + (tripped ? 0 : feedback.pullUp() * (1 + x[Slot.PULL_UP_TOLERANCE.place()]));
            gFeedback = 1 / series;
            farSlot = tripped ? Slot.OUTPUT_LOW : feedback.supplied() ? Slot.SUPPLY : Slot.PULL_UP_VOLTAGE;
            far = x[farSlot.place()];
        }
        double total = gTop + gBottom + gFeedback;
        double v = (source * gTop + far * gFeedback - bias) / total;
        if (g.length > 0) {
            double w = weight / total;
            double byTop = -w * (source - v) * gTop / topFactor;
            double byBottom = -w * (0 - v) * gBottom / bottomFactor;
            g[Slot.TOP_TOLERANCE.place()] += byTop;
            g[Slot.TOP_DRIFT.place()] += byTop * dT;
            g[Slot.TOP_AGEING.place()] += byTop;
            g[Slot.BOTTOM_TOLERANCE.place()] += byBottom;
            g[Slot.BOTTOM_DRIFT.place()] += byBottom * dT;
            g[Slot.BOTTOM_AGEING.place()] += byBottom;
            g[Slot.COMPARATOR_BIAS.place()] -= w * divider.users();
            double byTemperature = byTop * x[Slot.TOP_DRIFT.place()] + byBottom * x[Slot.BOTTOM_DRIFT.place()];
            if (circuit.network() instanceof HysteresisNetwork.Feedback feedback) {
                double bySeries = -w * (far - v) * gFeedback * gFeedback;
                double byFactor = bySeries * feedback.resistance();
                g[Slot.FEEDBACK_TOLERANCE.place()] += byFactor;
                g[Slot.FEEDBACK_DRIFT.place()] += byFactor * local(x);
                g[Slot.FEEDBACK_AGEING.place()] += byFactor;
                warm(byFactor * x[Slot.FEEDBACK_DRIFT.place()], g);
                g[farSlot.place()] += w * gFeedback;
                if (!tripped) {
                    g[Slot.PULL_UP_TOLERANCE.place()] += bySeries * feedback.pullUp();
                }
            }
            if (own) {
                warm(byTemperature, g);
            } else {
                g[Slot.AMBIENT.place()] += byTemperature;
            }
            sourceSlopes(divider.source(), x, w * gTop, g);
        }
        return v;
    }

    private static double source(SourceVoltage source, double[] x) {
        if (source.isSupply()) {
            return x[Slot.SUPPLY.place()];
        }
        double dT = air(x);
        return source.voltage().nominal() * (1 + x[Slot.REFERENCE_TOLERANCE.place()]
                + x[Slot.REFERENCE_DRIFT.place()] * dT + x[Slot.REFERENCE_AGEING.place()])
                - x[Slot.REFERENCE_LOAD.place()];
    }

    private static void sourceSlopes(SourceVoltage source, double[] x, double weight, double[] g) {
        if (source.isSupply()) {
            g[Slot.SUPPLY.place()] += weight;
            return;
        }
        double dT = air(x);
        double nominal = weight * source.voltage().nominal();
        g[Slot.REFERENCE_TOLERANCE.place()] += nominal;
        g[Slot.REFERENCE_DRIFT.place()] += nominal * dT;
        g[Slot.REFERENCE_AGEING.place()] += nominal;
        g[Slot.REFERENCE_LOAD.place()] -= weight;
        g[Slot.AMBIENT.place()] += nominal * x[Slot.REFERENCE_DRIFT.place()];
    }
}
