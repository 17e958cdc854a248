package shuntwright.choice;

import shuntwright.circuit.SourceVoltage;
import shuntwright.quantity.Range;

/** Extremes of source voltages and dividers. */
final class SourceTerms {

    private SourceTerms() {
    }

    /** Extremes of a source at a distance from 25 °C, K; of the supply its whole range, V. */
    static Range extremes(SourceVoltage source, double distance) {
        if (source.isSupply()) {
            return source.voltage().range();
        }
        double nominal = source.voltage().nominal();
        double both = source.drift() * distance + source.ageing();
        return Range.of(nominal * (1 - source.voltage().tolerance().below() - both) - source.loadDrop(),
                nominal * (1 + source.voltage().tolerance().above() + both));
    }

    /** The largest (t &gt; 0) or smallest (t &lt; 0) ratio of a divider of ratio k whose resistors move by ±|t|. */
    static double moved(double k, double t) {
        return k * (1 + t) / (k * (1 + t) + (1 - k) * (1 - t));
    }
}
