package shuntwright.quantity;

/**
 * A nominal value with its own least and largest value, such as a rail voltage "10.5 .. 12 .. 14.4 V".
 *
 * @param min     in the quantity's SI unit
 * @param nominal not below {@code min}
 * @param max     not below {@code nominal}
 */
public record Spread(double min, double nominal, double max) {

    /** @throws IllegalArgumentException unless all are finite and min ≤ nominal ≤ max */
    public Spread {
        if (!(min <= nominal && nominal <= max) || Double.isInfinite(min) || Double.isInfinite(max)) {
            throw new IllegalArgumentException(
                    "a spread needs finite min ≤ nominal ≤ max, got " + min + " .. " + nominal + " .. " + max);
        }
    }

    public static Spread exactly(double value) {
        return new Spread(value, value, value);
    }

    public Range range() {
        return Range.of(min, max);
    }
}
