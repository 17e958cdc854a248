package shuntwright.parts;

import shuntwright.quantity.ESeries;
import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;

/**
 * A family of capacitors sold in the values of an E-series, each value under its own part number.
 *
 * @param partNumber  stem of the part numbers
 * @param description free text
 * @param series      preferred values
 * @param values      smallest and largest value made, F
 * @param tolerance   relative deviation including temperature and bias
 * @param voltage     rated voltage, V
 * @param dielectric  class of the dielectric, free text
 * @param purchase    how each value is sold
 */
public record CapacitorSeries(String partNumber, String description, ESeries series, Range values,
        Tolerance tolerance, double voltage, String dielectric, Purchase purchase) implements Part {

    /** @throws IllegalArgumentException unless values and voltage are &gt; 0 */
    public CapacitorSeries {
        if (!(values.min() > 0) || !Finite.positive(voltage)) {
            throw new IllegalArgumentException("capacitor series " + partNumber + " needs values and voltage > 0");
        }
    }
}
