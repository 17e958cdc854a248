package shuntwright.parts;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;

/**
 * A comparator with an open-drain output: pulls its alert line low while the sense voltage is above the threshold.
 *
 * @param partNumber    unique within the catalogue
 * @param description   free text
 * @param inputs        input errors and range
 * @param hysteresis    how release is separated from trip
 * @param output        the open-drain output
 * @param supply        supply voltage, V
 * @param supplyCurrent largest of the whole package, A
 * @param delay         input to output, s
 * @param sections      comparators in one package, ≥ 1
 * @param purchase      how it is sold
 */
public record Comparator(String partNumber, String description, ComparatorInputs inputs, Hysteresis hysteresis,
        OpenDrainOutput output, Range supply, double supplyCurrent, Range delay, int sections, Purchase purchase)
        implements
            Part {

    /** @throws IllegalArgumentException unless supply current and delay are ≥ 0 and sections ≥ 1 */
    public Comparator {
        if (!Finite.notNegative(supplyCurrent) || !(delay.min() >= 0) || sections < 1) {
            throw new IllegalArgumentException(
                    "comparator " + partNumber + " needs supply current and delay ≥ 0 and at least one section");
        }
    }
}
