package shuntwright.accuracy;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;

/** The probability distribution assigned to an input's limits (JCGM 100:2008, 4.3). */
public sealed interface Distribution {

    /** Equal probability between the limits; u = a/√3 for half-width a (4.3.7). */
    record Uniform() implements Distribution {}

    /** @param k limits are k standard deviations from the mean; u = a/k (4.3.3, 4.3.4) */
    record Normal(double k) implements Distribution {
        /** @throws IllegalArgumentException unless k &gt; 0 */
        public Normal {
            if (!Finite.positive(k)) {
                throw new IllegalArgumentException("k must be > 0, got " + k);
            }
        }
    }

    /** u = a/√6 (4.3.9). */
    record Triangular() implements Distribution {}

    /** U-shaped; u = a/√2. */
    record ArcSine() implements Distribution {}

    /** @param ratio width of the top over width of the base, 0 to 1; u = a·√((1+ratio²)/6) (4.3.9) */
    record Trapezoid(double ratio) implements Distribution {
        /** @throws IllegalArgumentException unless 0 ≤ ratio ≤ 1 */
        public Trapezoid {
            if (!(ratio >= 0 && ratio <= 1)) {
                throw new IllegalArgumentException("the ratio must be from 0 to 1, got " + ratio);
            }
        }
    }

    /** The standard uncertainty that belongs to these limits, in their unit. */
    default double standardUncertainty(Range limits) {
        double a = limits.width() / 2;
        return switch (this) {
            case Uniform _ -> a / Math.sqrt(3);
            case Normal(double k) -> a / k;
            case Triangular _ -> a / Math.sqrt(6);
            case ArcSine _ -> a / Math.sqrt(2);
            case Trapezoid(double ratio) -> a * Math.sqrt((1 + ratio * ratio) / 6);
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
        };
    }
}
