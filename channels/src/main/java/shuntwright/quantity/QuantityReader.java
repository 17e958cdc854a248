package shuntwright.quantity;

import java.math.BigDecimal;
import java.util.List;

/**
 * Reads quantities as engineers type them, the same under every locale. A bare number is in SI units. Prefixes reach from
 * f to T: m is milli, M is mega. The decimal sign is a point, digits are not grouped, and a unit of another dimension is
 * refused by name. Each value is the double nearest to the decimal typed.
 */
public final class QuantityReader {

    private static final Range PLAUSIBLE_SHUNT = Range.of(1e-6, 10);

    private QuantityReader() {
    }

    /** One number with or without its unit: "35", "35 A", "4m", "4 mΩ", "R004", "33K2", "25 ppm/K". */
    public static Reading<Double> number(String text, Dimension dimension) {
        return AmountList.read(TypedText.tidy(text), dimension, 1).then(values -> Reading.value(values.getFirst()));
    }

    /**
     * A resistance plausible for a shunt, 1 µΩ to 10 Ω. "4M" is 4 MΩ and is refused, with the likely meaning named:
     * marking M for milli is seen on parts, but contradicts IEC 60062.
     */
    public static Reading<Double> shuntResistance(String text) {
        return number(text, Dimension.RESISTANCE).then(ohm -> PLAUSIBLE_SHUNT.contains(ohm)
                ? Reading.value(ohm)
                : Reading.misread(implausible(TypedText.tidy(text), ohm)));
    }

    private static String implausible(String text, double ohm) {
        String what = QuantityWriter.write(ohm, Dimension.RESISTANCE)
                + " is not plausible for a shunt (allowed 1 µΩ to 10 Ω)";
        int shift = Amount.read(text, Dimension.RESISTANCE).ifValue().map(Amount::shift).orElse(0);
        boolean mega = shift == 6;
        double meant = new BigDecimal(Double.toString(ohm)).scaleByPowerOfTen(mega ? -9 : -3).doubleValue();
        String cause = mega ? what + "; M is mega." : what + ".";
        if (!(mega || shift == 0) || !PLAUSIBLE_SHUNT.contains(meant)) {
            return cause + " Write it in mΩ, for example 4 mΩ or R004.";
        }
        String milli = Decimal.exact(meant).plain(-3);
        return cause + " Maybe " + milli + " mΩ was meant: write " + milli + "m, " + milli + " mΩ or "
                + QuantityWriter.letterCode(meant) + ".";
    }

    /**
     * Two ends: "-20 °C .. 60 °C", "0.2 .. 12 V", "-20..60", or one value for both, or a value with tolerance. A unit at
     * the last end only holds for both, with its prefix.
     */
    public static Reading<Range> range(String text, Dimension dimension) {
        String tidy = TypedText.tidy(text);
        if (hasTolerance(tidy)) {
            return toleranced(text, dimension).then(value -> Reading.value(value.range()));
        }
        return AmountList.read(tidy, dimension, 2).then(values -> ordered(values, tidy))
                .then(values -> Reading.value(Range.of(values.getFirst(), values.getLast())));
    }

    /** A relative tolerance: "±0.5 %", "+/-0.5%", "0.5 %", "+1/-3 %", "200 ppm". */
    public static Reading<Tolerance> tolerance(String text) {
        return ToleranceText.read(TypedText.tidy(text));
    }

    /** A nominal value with tolerance: "3.3 V ±2 %", "3.3V +1/-3%", "3.3 V" (then exact). */
    public static Reading<Toleranced> toleranced(String text, Dimension dimension) {
        String tidy = TypedText.tidy(text);
        int begin = ToleranceText.begin(tidy);
        Reading<Double> nominal = AmountList.read(tidy.substring(0, begin).strip(), dimension, 1)
                .then(values -> Reading.value(values.getFirst()));
        Reading<Tolerance> tolerance = begin == tidy.length()
                ? Reading.value(Tolerance.NONE)
                : ToleranceText.read(tidy.substring(begin));
        return nominal.then(value -> tolerance.then(relative -> withinDoubles(new Toleranced(value, relative))));
    }

    /** One, two (min..max, nominal in the middle) or three (min..nominal..max) values, or a toleranced value. */
    public static Reading<Spread> spread(String text, Dimension dimension) {
        String tidy = TypedText.tidy(text);
        if (hasTolerance(tidy)) {
            return toleranced(text, dimension)
                    .then(value -> Reading.value(new Spread(value.min(), value.nominal(), value.max())));
        }
        return AmountList.read(tidy, dimension, 3).then(values -> ordered(values, tidy)).then(values -> Reading
                .value(new Spread(values.getFirst(), middle(values), values.getLast())));
    }

    private static double middle(List<Double> values) {
        return values.size() == 3 ? values.get(1) : Range.of(values.getFirst(), values.getLast()).mid();
    }

    private static boolean hasTolerance(String tidy) {
        return !AmountList.hasSeparator(tidy) && ToleranceText.begin(tidy) < tidy.length();
    }

    private static Reading<Toleranced> withinDoubles(Toleranced value) {
        return Double.isFinite(value.min()) && Double.isFinite(value.max())
                ? Reading.value(value)
                : Reading.misread("With its tolerance the number is too large. Allowed are magnitudes up to 1.7e308.");
    }

    private static Reading<List<Double>> ordered(List<Double> values, String text) {
        for (int i = 1; i < values.size(); i++) {
            if (!(values.get(i - 1) <= values.get(i))) {
                return Reading.misread(TypedText.quote(text) + " does not ascend. Write the least value first and the "
                        + "largest last.");
            }
        }
        return Reading.value(values);
    }
}
