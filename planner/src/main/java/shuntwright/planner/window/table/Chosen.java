package shuntwright.planner.window.table;

import shuntwright.circuit.SenseCircuit;
import shuntwright.planner.window.circuit.CircuitWords;

/**
 * Chosen parts in words; all empty where nothing could be chosen.
 *
 * @param shunt      part number
 * @param amplifier  part number
 * @param comparator part number
 * @param hysteresis kind and value
 * @param threshold  where it comes from
 */
record Chosen(String shunt, String amplifier, String comparator, String hysteresis, String threshold) {
    static final Chosen NOTHING = new Chosen("", "", "", "", "");

    static Chosen of(SenseCircuit circuit) {
        return new Chosen(circuit.shunt().partNumber(), circuit.amplifier().partNumber(),
                circuit.comparator().partNumber(), CircuitWords.hysteresis(circuit), CircuitWords.threshold(circuit));
    }
}
