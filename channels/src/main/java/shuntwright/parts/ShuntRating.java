package shuntwright.parts;

import java.util.OptionalDouble;

import shuntwright.quantity.Finite;

/**
 * What a shunt endures. The rated power holds to the rated temperature and then falls linearly to zero at the maximum
 * temperature (the convention of IEC 60115-1).
 *
 * @param power              rated dissipation of one piece, W
 * @param ratedTemperature   ambient temperature to which the rating is constant, °C
 * @param maximumTemperature temperature at which the rating has fallen to zero, °C
 * @param thermalResistance  element to ambient, mounted, K/W
 * @param pulseEnergy        energy of a single short pulse, J; empty when the data sheet does not state it
 */
public record ShuntRating(double power, double ratedTemperature, double maximumTemperature, double thermalResistance,
        OptionalDouble pulseEnergy) {

    /** @throws IllegalArgumentException unless power &gt; 0, rated &lt; maximum temperature, resistance ≥ 0, energy &gt; 0 */
    public ShuntRating {
        if (!Finite.positive(power) || !(ratedTemperature < maximumTemperature)
                || Double.isInfinite(ratedTemperature) || Double.isInfinite(maximumTemperature)
                || !Finite.notNegative(thermalResistance)
                || !Finite.positive(pulseEnergy.orElse(1))) {
            throw new IllegalArgumentException("a shunt rating needs power > 0, rated temperature below maximum, "
                    + "thermal resistance ≥ 0 and pulse energy > 0, got " + power + ", " + ratedTemperature + ", "
                    + maximumTemperature + ", " + thermalResistance + ", " + pulseEnergy);
        }
    }

    /** Allowed dissipation of one piece at an ambient temperature in °C, W; never negative. */
    public double powerAt(double ambient) {
        if (ambient <= ratedTemperature) {
            return power;
        }
        return Math.max(0, power * (maximumTemperature - ambient) / (maximumTemperature - ratedTemperature));
    }
}
