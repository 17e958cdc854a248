package shuntwright.accuracy;

import shuntwright.quantity.Finite;

/**
 * What JCGM 100 needs to know of an input.
 *
 * @param value            expectation
 * @param standard         standard uncertainty, ≥ 0
 * @param degreesOfFreedom of that uncertainty, &gt; 0; infinite for limits taken as certain
 */
public record Estimate(double value, double standard, double degreesOfFreedom) {

    /** @throws IllegalArgumentException unless standard ≥ 0 and degreesOfFreedom &gt; 0 */
    public Estimate {
        if (!Finite.notNegative(standard) || !(degreesOfFreedom > 0) || !Double.isFinite(value)) {
            throw new IllegalArgumentException("an estimate needs a finite value, standard uncertainty ≥ 0 and degrees "
                    + "of freedom > 0, got " + value + ", " + standard + ", " + degreesOfFreedom);
        }
    }

    public static Estimate of(double value, double standard) {
        return new Estimate(value, standard, Double.POSITIVE_INFINITY);
    }
}
