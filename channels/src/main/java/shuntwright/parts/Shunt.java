package shuntwright.parts;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;

/**
 * A current sense resistor.
 *
 * @param partNumber             unique within the catalogue
 * @param description            free text
 * @param resistance             nominal at 25 °C, Ω
 * @param tolerance              as delivered, at 25 °C
 * @param temperatureCoefficient limit of its magnitude, 1/K, referred to 25 °C
 * @param ageing                 largest relative change over life, a fraction
 * @param correlation            correlation coefficient of tolerance and temperature coefficient between pieces of one reel, 0 to 1
 * @param terminals              two or four
 * @param mountingResistance     series resistance of the joints at 20 °C that a two-terminal part adds, Ω; 0..0 for four
 * @param thermalEmf             limit of its magnitude against copper, V/K
 * @param rating                 power, temperatures, pulse
 * @param purchase               how it is sold
 */
public record Shunt(String partNumber, String description, double resistance, Tolerance tolerance,
        double temperatureCoefficient, double ageing, double correlation, Terminals terminals, Range mountingResistance,
        double thermalEmf,
        ShuntRating rating, Purchase purchase) implements Part {

    /** @throws IllegalArgumentException unless resistance &gt; 0 and the limits are ≥ 0 */
    public Shunt {
        if (!Finite.positive(resistance) || !Finite.notNegative(temperatureCoefficient) || !Finite.notNegative(ageing)
                || !(ageing < 1) || !(correlation >= 0 && correlation <= 1) || !(mountingResistance.min() >= 0)
                || !Finite.notNegative(thermalEmf)) {
            throw new IllegalArgumentException(
                    "shunt " + partNumber + " needs resistance > 0, limits ≥ 0 and a correlation from 0 to 1");
        }
    }

    /** Nominal resistance of {@code count} in parallel with their mounting, at 25 °C (mounting at 20 °C), Ω. */
    public double inParallel(int count) {
        return (resistance + mountingResistance.mid()) / count;
    }
}
