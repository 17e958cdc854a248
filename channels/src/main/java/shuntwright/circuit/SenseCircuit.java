package shuntwright.circuit;

import shuntwright.parts.Comparator;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;

/**
 * One channel's chosen parts and values.
 *
 * @param shunt      part
 * @param shuntCount in parallel, ≥ 1
 * @param amplifier  part
 * @param comparator part
 * @param threshold  how the threshold is made
 * @param network    hysteresis parts
 * @param resistors  the series of divider and hysteresis resistors
 */
public record SenseCircuit(Shunt shunt, int shuntCount, SenseAmplifier amplifier, Comparator comparator,
        Threshold threshold, HysteresisNetwork network, ResistorSeries resistors) {

    /** @throws IllegalArgumentException unless shuntCount ≥ 1 */
    public SenseCircuit {
        if (shuntCount < 1) {
            throw new IllegalArgumentException("a circuit needs at least one shunt, got " + shuntCount);
        }
    }

    /** Nominal resistance of all shunts in parallel with their mounting, at 25 °C (mounting at 20 °C), Ω. */
    public double resistance() {
        return shunt.inParallel(shuntCount);
    }
}
