package shuntwright.parts;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;

/**
 * The output of a comparator that can only pull down.
 *
 * @param lowLevel       output voltage while it pulls down, up to the sink current, V
 * @param sinkCurrent    largest current at which the low level holds, A
 * @param leakage        largest current into the output while it is off, A
 * @param maximumVoltage largest voltage the output may be pulled up to, V
 */
public record OpenDrainOutput(Range lowLevel, double sinkCurrent, double leakage, double maximumVoltage) {

    /** @throws IllegalArgumentException unless levels and leakage are ≥ 0 and the others &gt; 0 */
    public OpenDrainOutput {
        if (!(lowLevel.min() >= 0) || !Finite.positive(sinkCurrent) || !Finite.notNegative(leakage)
                || !Finite.positive(maximumVoltage)) {
            throw new IllegalArgumentException("an open-drain output needs low level and leakage ≥ 0, sink current and "
                    + "maximum voltage > 0, got " + lowLevel + ", " + leakage + ", " + sinkCurrent + ", "
                    + maximumVoltage);
        }
    }
}
