package shuntwright.quantity;

/**
 * A closed interval of one quantity, in that quantity's SI unit.
 *
 * @param min lower end, finite
 * @param max upper end, finite, not below {@code min}
 */
public record Range(double min, double max) {

    /** @throws IllegalArgumentException unless both ends are finite and min ≤ max */
    public Range {
        if (!(min <= max) || Double.isInfinite(min) || Double.isInfinite(max)) {
            throw new IllegalArgumentException("a range needs finite ends with min ≤ max, got " + min + " .. " + max);
        }
    }

    public static Range of(double min, double max) {
        return new Range(min, max);
    }

    /** The range that holds one value only. */
    public static Range exactly(double value) {
        return new Range(value, value);
    }

    public double mid() {
        double width = max - min;
        return Double.isInfinite(width) ? min / 2 + max / 2 : min + width / 2;
    }

    public double width() {
        return max - min;
    }

    public boolean contains(double value) {
        return min <= value && value <= max;
    }

    public boolean contains(Range other) {
        return min <= other.min && other.max <= max;
    }
}
