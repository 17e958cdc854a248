package shuntwright.parts;

import shuntwright.quantity.ESeries;
import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;

/**
 * A family of resistors sold in the values of an E-series, each value under its own part number.
 *
 * @param partNumber             stem of the part numbers; a value's own is the stem, a hyphen and its letter code
 * @param description            free text
 * @param series                 preferred values
 * @param values                 smallest and largest value made, Ω
 * @param tolerance              limit of the relative deviation as delivered, a fraction
 * @param temperatureCoefficient limit of its magnitude, 1/K, referred to 25 °C
 * @param ageing                 largest relative change over life, a fraction
 * @param correlation            correlation coefficient between pieces of one reel, 0 to 1
 * @param power                  rated dissipation, W
 * @param purchase               how each value is sold
 */
public record ResistorSeries(String partNumber, String description, ESeries series, Range values, double tolerance,
        double temperatureCoefficient, double ageing, double correlation, double power, Purchase purchase)
        implements
            Part {

    /** @throws IllegalArgumentException unless values and power are &gt; 0 and the limits within their ranges */
    public ResistorSeries {
        if (!(values.min() > 0) || !(tolerance >= 0 && tolerance < 1) || !Finite.notNegative(temperatureCoefficient)
                || !(ageing >= 0 && ageing < 1) || !(correlation >= 0 && correlation <= 1) || !Finite.positive(power)) {
            throw new IllegalArgumentException("resistor series " + partNumber
                    + " needs values and power > 0, tolerance and ageing below 1, correlation 0 to 1");
        }
    }
}
