package shuntwright.quantity;

/** Reads quantities as engineers type them. */
public final class QuantityReader {

    private QuantityReader() {
    }

    /** One number with or without its unit: "35", "35 A", "4m", "4 mΩ", "R004", "33K2", "25 ppm/K". */
    public static Reading<Double> number(String text, Dimension dimension) {
        return Reading.misread("?" + text + dimension);
    }

    /** Two ends: "-20 °C .. 60 °C", "0.2 .. 12 V", "-20..60", or one value for both. */
    public static Reading<Range> range(String text, Dimension dimension) {
        return Reading.misread("?" + text + dimension);
    }

    /** A relative tolerance: "±0.5 %", "+/-0.5%", "0.5 %", "+1/-3 %", "200 ppm". */
    public static Reading<Tolerance> tolerance(String text) {
        return Reading.misread("?" + text);
    }

    /** A nominal value with tolerance: "3.3 V ±2 %", "3.3V +1/-3%", "3.3 V" (then exact). */
    public static Reading<Toleranced> toleranced(String text, Dimension dimension) {
        return Reading.misread("?" + text + dimension);
    }

    /** One, two (min..max, nominal in the middle) or three (min..nominal..max) values, or a toleranced value. */
    public static Reading<Spread> spread(String text, Dimension dimension) {
        return Reading.misread("?" + text + dimension);
    }
}
