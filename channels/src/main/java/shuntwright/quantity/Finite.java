package shuntwright.quantity;

/** Conditions for constructors: false also for what is not a number or infinite. */
public final class Finite {

    private Finite() {
    }

    /** True when 0 &lt; value &lt; ∞. */
    public static boolean positive(double value) {
        return value > 0 && value <= Double.MAX_VALUE;
    }

    /** True when 0 ≤ value &lt; ∞. */
    public static boolean notNegative(double value) {
        return value >= 0 && value <= Double.MAX_VALUE;
    }
}
