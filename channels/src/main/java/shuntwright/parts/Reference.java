package shuntwright.parts;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/**
 * A precision voltage reference.
 *
 * @param partNumber       unique within the catalogue
 * @param description      free text
 * @param voltage          at 25 °C without load, V
 * @param drift            limit of its magnitude, 1/K, referred to 25 °C
 * @param ageing           largest relative change over life, a fraction
 * @param loadRegulation   largest fall of the voltage per load current, V/A (that is Ω)
 * @param availableCurrent largest load, A
 * @param supply           supply voltage, V
 * @param supplyCurrent    own consumption without load, A
 * @param purchase         how it is sold
 */
public record Reference(String partNumber, String description, Toleranced voltage, double drift, double ageing,
        double loadRegulation, double availableCurrent, Range supply, double supplyCurrent, Purchase purchase)
        implements
            Part {

    /** @throws IllegalArgumentException unless the voltage and available current are &gt; 0 and the limits ≥ 0 */
    public Reference {
        if (!(voltage.min() > 0) || !Finite.notNegative(drift) || !(ageing >= 0 && ageing < 1)
                || !Finite.notNegative(loadRegulation)
                || !Finite.positive(availableCurrent) || !Finite.notNegative(supplyCurrent)) {
            throw new IllegalArgumentException(
                    "reference " + partNumber + " needs voltage and available current > 0 and limits ≥ 0");
        }
    }
}
