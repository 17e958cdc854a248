package shuntwright.quantity;

/** The probability distribution assigned to an input's limits (JCGM 100:2008, 4.3; JCGM 101:2008, 6.4). */
public sealed interface Distribution {

    /** Equal probability between the limits; u = a/√3 for half-width a (JCGM 100, 4.3.7; JCGM 101, 6.4.2). */
    record Uniform() implements Distribution {}

    /** @param k limits are k standard deviations from the mean; u = a/k (JCGM 100, 4.3.3; JCGM 101, 6.4.7) */
    record Normal(double k) implements Distribution {
        /** @throws IllegalArgumentException unless k &gt; 0 */
        public Normal {
            if (!Finite.positive(k)) {
                throw new IllegalArgumentException("k must be > 0, got " + k);
            }
        }
    }

    /** u = a/√6 (JCGM 100, 4.3.9; JCGM 101, 6.4.5). */
    record Triangular() implements Distribution {}

    /** U-shaped; u = a/√2 (JCGM 101, 6.4.6). */
    record ArcSine() implements Distribution {}

    /** @param ratio width of the top over width of the base, 0 to 1; u = a·√((1+ratio²)/6) (JCGM 100, 4.3.9) */
    record Trapezoid(double ratio) implements Distribution {
        /** @throws IllegalArgumentException unless 0 ≤ ratio ≤ 1 */
        public Trapezoid {
            if (!(ratio >= 0 && ratio <= 1)) {
                throw new IllegalArgumentException("the ratio must be from 0 to 1, got " + ratio);
            }
        }
    }

    /**
     * Scaled and shifted t (JCGM 101, 6.4.9): the limits are k scale units from the mean.
     *
     * @param degreesOfFreedom of the standard uncertainty a/k, above 2 so that the variance exists
     * @param k                as the certificate states it
     */
    record StudentT(double degreesOfFreedom, double k) implements Distribution {
        /** @throws IllegalArgumentException unless degreesOfFreedom &gt; 2 and k &gt; 0 */
        public StudentT {
            if (!Finite.positive(k) || !(degreesOfFreedom > 2) || !Double.isFinite(degreesOfFreedom)) {
                throw new IllegalArgumentException("degrees of freedom must be > 2 and k > 0, got " + degreesOfFreedom
                        + ", " + k);
            }
        }
    }

    /** The standard uncertainty that belongs to these limits, in their unit; for t the scale a/k, as JCGM 100 counts it. */
    default double standardUncertainty(Range limits) {
        double a = limits.width() / 2;
        return switch (this) {
            case Uniform _ -> a / Math.sqrt(3);
            case Normal(double k) -> a / k;
            case Triangular _ -> a / Math.sqrt(6);
            case ArcSine _ -> a / Math.sqrt(2);
            case Trapezoid(double ratio) -> a * Math.sqrt((1 + ratio * ratio) / 6);
            case StudentT(double _, double k) -> a / k;
        };
    }

    /** Degrees of freedom of that uncertainty; infinite where the limits are taken as certain. */
    default double degreesOfFreedom() {
        return this instanceof StudentT(double degrees, double _) ? degrees : Double.POSITIVE_INFINITY;
    }

    /** True when no value lies beyond the limits. */
    default boolean bounded() {
        return switch (this) {
            case Uniform _,Triangular _,ArcSine _,Trapezoid _ -> true;
            case Normal _,StudentT _ -> false;
        };
    }

    /** One word for tables. */
    default String word() {
        return switch (this) {
            case Uniform _ -> "uniform";
            case Normal _ -> "normal";
            case Triangular _ -> "triangular";
            case ArcSine _ -> "arcsine";
            case Trapezoid _ -> "trapezoid";
            case StudentT _ -> "t";
        };
    }
}
