package shuntwright.sampling;

import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.quantity.Range;

/** The numerical tolerance of JCGM 101:2008, 7.9.2, and the validation of clause 8 that rests on it. */
final class Tolerances {

    private Tolerances() {
    }

    /** δ = ½·10^l of a standard uncertainty written as c·10^l with c a whole number of {@code digits} digits. */
    static double of(double standard, int digits) {
        if (!(standard > 0)) {
            return 0;
        }
        int power = (int) Math.floor(Math.log10(standard)) - digits + 1;
        double unit = Math.pow(10, power);
        // 0.0996 with two digits is 0.10, one power higher.
        if (Math.rint(standard / unit) >= Math.pow(10, digits)) {
            unit *= 10;
        }
        return unit / 2;
    }

    /** Clause 8.1: the ends of y ± U against those of the probabilistically symmetric interval. */
    static Validation validate(CombinedUncertainty combined, Range symmetric, int digits) {
        double tolerance = of(combined.standard(), digits);
        double low = Math.abs(combined.estimate() - combined.expanded() - symmetric.min());
        double high = Math.abs(combined.estimate() + combined.expanded() - symmetric.max());
        return new Validation(low <= tolerance && high <= tolerance, digits, tolerance, low, high);
    }
}
