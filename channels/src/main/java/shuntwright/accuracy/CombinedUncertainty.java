package shuntwright.accuracy;

import shuntwright.quantity.Range;

/**
 * The result of JCGM 100: estimate, combined standard uncertainty and expanded uncertainty.
 *
 * @param estimate            y = f(expectations of the inputs)
 * @param standard            u_c, same unit
 * @param degreesOfFreedom    effective, by Welch-Satterthwaite (G.4); infinite without type-A inputs
 * @param coverageProbability p asked for
 * @param coverageFactor      k for p: quantile of t with the truncated degrees of freedom, or of the normal distribution
 */
public record CombinedUncertainty(double estimate, double standard, double degreesOfFreedom,
        double coverageProbability, double coverageFactor) {

    /** U = k·u_c. */
    public double expanded() {
        return coverageFactor * standard;
    }

    /** y - U .. y + U. */
    public Range interval() {
        return Range.of(estimate - expanded(), estimate + expanded());
    }
}
