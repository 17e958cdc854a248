package shuntwright.quantity;

import java.util.List;

/**
 * Writes quantities in engineering notation, the same under every locale. {@code write…} reads back as the same double;
 * {@code show} rounds. Values that the prefixes f to T do not reach get an exponent, "1e-20 A".
 */
public final class QuantityWriter {

    private QuantityWriter() {
    }

    /**
     * The shortest engineering notation that {@link QuantityReader#number} reads back as the same double, "4 mΩ".
     *
     * @throws IllegalArgumentException unless the value is finite
     */
    public static String write(double value, Dimension dimension) {
        return Scale.of(dimension).text(Decimal.exact(value));
    }

    /** Both ends, "-20 .. 60 °C", or one value where they are equal. */
    public static String write(Range range, Dimension dimension) {
        return Double.compare(range.min(), range.max()) == 0
                ? write(range.min(), dimension)
                : Scale.of(dimension).text(List.of(Decimal.exact(range.min()), Decimal.exact(range.max())));
    }

    /** "±0.5 %" or "+1/-3 %", small ones in ppm. */
    public static String write(Tolerance tolerance) {
        if (tolerance.isSymmetric()) {
            return "±" + write(tolerance.above(), Dimension.RATIO);
        }
        String unit = tolerance.widest() < 1e-4 ? "ppm" : "%";
        return "+" + relative(tolerance.above(), unit) + "/-" + relative(tolerance.below(), unit) + " " + unit;
    }

    private static String relative(double fraction, String unit) {
        int shift = unit.equals("ppm") ? -6 : -2;
        Decimal decimal = Decimal.exact(fraction);
        boolean far = !decimal.isZero() && (decimal.exponent() < -12 || decimal.exponent() > 5);
        return far ? decimal.scientific(shift) : decimal.plain(shift);
    }

    /** "3.3 V ±2 %", or the nominal value alone where it is exact. */
    public static String write(Toleranced value, Dimension dimension) {
        String nominal = write(value.nominal(), dimension);
        return value.tolerance().equals(Tolerance.NONE) ? nominal : nominal + " " + write(value.tolerance());
    }

    /** "10.5 .. 12 .. 14.4 V", or one value where all are equal. */
    public static String write(Spread spread, Dimension dimension) {
        return Double.compare(spread.min(), spread.max()) == 0
                ? write(spread.nominal(), dimension)
                : Scale.of(dimension).text(List.of(Decimal.exact(spread.min()), Decimal.exact(spread.nominal()),
                        Decimal.exact(spread.max())));
    }

    /**
     * For people: engineering notation rounded half up to the given number of significant digits (1 to 15), trailing
     * zeros left out. The prefix is chosen after rounding, so 999.96 mA with four digits is "1 A".
     *
     * @throws IllegalArgumentException unless the value is finite and the digits are 1 to 15
     */
    public static String show(double value, Dimension dimension, int digits) {
        return Scale.of(dimension).text(Decimal.rounded(value, digits));
    }

    /** For people, with four significant digits. */
    public static String show(double value, Dimension dimension) {
        return show(value, dimension, 4);
    }

    /** For people: both ends rounded, or one value where they are equal. */
    public static String show(Range range, Dimension dimension, int digits) {
        return range.min() == range.max()
                ? show(range.min(), dimension, digits)
                : Scale.of(dimension)
                        .text(List.of(Decimal.rounded(range.min(), digits), Decimal.rounded(range.max(), digits)));
    }

    /**
     * The letter code of a resistance after IEC 60062:2016, exact: 0.004 Ω is "R004", 0.1 Ω "R10", 1 Ω "1R0", 470 Ω
     * "470R", 33.2 kΩ "33K2".
     *
     * @param ohm 1 µΩ to below 1 TΩ
     * @throws IllegalArgumentException when outside of that, or NaN
     */
    public static String letterCode(double ohm) {
        return LetterCode.write(ohm);
    }
}
