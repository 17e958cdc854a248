package shuntwright.quantity;

/**
 * A nominal value with its relative tolerance ("3.3 V ±2 %").
 *
 * @param nominal   in the quantity's SI unit, finite
 * @param tolerance relative to the nominal
 */
public record Toleranced(double nominal, Tolerance tolerance) {

    /** @throws IllegalArgumentException unless nominal is finite */
    public Toleranced {
        if (!Double.isFinite(nominal)) {
            throw new IllegalArgumentException("a nominal value must be finite, got " + nominal);
        }
    }

    public double min() {
        return nominal - Math.abs(nominal) * tolerance.below();
    }

    public double max() {
        return nominal + Math.abs(nominal) * tolerance.above();
    }

    public Range range() {
        return Range.of(min(), max());
    }
}
