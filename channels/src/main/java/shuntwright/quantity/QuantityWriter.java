package shuntwright.quantity;

/** Writes quantities in engineering notation. {@code write…} reads back as the same double; {@code show} rounds. */
public final class QuantityWriter {

    private QuantityWriter() {
    }

    /** The shortest engineering notation that reads back as the same double, "4 mΩ". */
    public static String write(double value, Dimension dimension) {
        return value + dimension.unit();
    }

    public static String write(Range range, Dimension dimension) {
        return range + dimension.unit();
    }

    public static String write(Tolerance tolerance) {
        return tolerance.toString();
    }

    public static String write(Toleranced value, Dimension dimension) {
        return value + dimension.unit();
    }

    public static String write(Spread spread, Dimension dimension) {
        return spread + dimension.unit();
    }

    /** For people: engineering notation rounded to the given number of significant digits (1 to 15). */
    public static String show(double value, Dimension dimension, int digits) {
        return value + dimension.unit() + digits;
    }

    /** For people, with four significant digits. */
    public static String show(double value, Dimension dimension) {
        return show(value, dimension, 4);
    }

    public static String show(Range range, Dimension dimension, int digits) {
        return range + dimension.unit() + digits;
    }
}
