package shuntwright.quantity;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads relative tolerances, symmetric or lopsided, and finds where one begins behind a nominal value. */
final class ToleranceText {

    private static final String FORMS = "Write it as ±0.5 %, +1/-3 % or 200 ppm.";
    private static final Pattern SYMMETRIC = Pattern.compile("(?:±|\\+ ?/ ?-|- ?/ ?\\+|\\+-) ?(.*)");
    private static final String NUMBER = "((?:[0-9]+\\.?[0-9]*|\\.[0-9]+)(?:[eE][+-]?[0-9]+)?)";
    private static final Pattern LOPSIDED = Pattern
            .compile("([+-]) ?" + NUMBER + " ?(%|[a-z]*) ?/? ?([+-]) ?" + NUMBER + " ?(%|[a-z]*)");
    /** A sign that is not the one of an exponent. */
    private static final Pattern BEGIN = Pattern.compile("±|(?<![0-9.][eE])[+-]");

    private ToleranceText() {
    }

    /** Where the tolerance begins in "3.3 V ±2 %", or the text's length where it has none. */
    static int begin(String text) {
        Matcher matcher = BEGIN.matcher(text);
        return matcher.find(Math.min(1, text.length())) ? matcher.start() : text.length();
    }

    static Reading<Tolerance> read(String text) {
        Matcher lopsided = LOPSIDED.matcher(text);
        if (lopsided.matches()) {
            return lopsided(lopsided, text);
        }
        Matcher symmetric = SYMMETRIC.matcher(text);
        boolean signed = symmetric.matches();
        if (!signed && text.startsWith("+")) {
            return Reading.misread(TypedText.quote(text) + " gives one side of the tolerance only. " + FORMS);
        }
        if (!signed && text.startsWith("-")) {
            return Reading.misread(TypedText.quote(text) + " is negative, but a tolerance is 0 or more on each side. "
                    + FORMS + " A range is written 3 .. 5.");
        }
        String size = signed ? symmetric.group(1) : text;
        return fraction(size, text).then(fraction -> tolerance(fraction, fraction, text));
    }

    private static Reading<Tolerance> lopsided(Matcher matcher, String text) {
        if (matcher.group(1).equals(matcher.group(4))) {
            return Reading.misread(TypedText.quote(text) + " gives the same side of the tolerance twice. " + FORMS);
        }
        String unit = matcher.group(6);
        if (unit.isEmpty() && !matcher.group(3).isEmpty()) {
            return Reading.misread(TypedText.quote(text) + " has no unit at its second value. " + FORMS);
        }
        String firstUnit = matcher.group(3).isEmpty() ? unit : matcher.group(3);
        Reading<Double> first = fraction(matcher.group(2) + firstUnit, text);
        Reading<Double> second = fraction(matcher.group(5) + unit, text);
        boolean aboveFirst = matcher.group(1).equals("+");
        return first.then(one -> second
                .then(two -> aboveFirst ? tolerance(two, one, text) : tolerance(one, two, text)));
    }

    private static Reading<Double> fraction(String size, String text) {
        if (size.isBlank()) {
            return Reading.misread(text.isEmpty()
                    ? "Nothing is written here. " + FORMS
                    : TypedText.quote(text) + " has no number. " + FORMS);
        }
        return Amount.read(size, Dimension.RATIO).then(Amount::si);
    }

    private static Reading<Tolerance> tolerance(double below, double above, String text) {
        if (!(below >= 0) || !(above >= 0)) {
            return Reading.misread(TypedText.quote(text) + " is negative, but a tolerance is 0 or more on each side. "
                    + FORMS);
        }
        if (!(below < 1)) {
            return Reading.misread(TypedText.quote(text) + " reaches " + QuantityWriter.show(below, Dimension.RATIO)
                    + " below the nominal value; less than 100 % is allowed. A bare number is a fraction, 0.05 is 5 %. "
                    + FORMS);
        }
        return Reading.value(new Tolerance(below, above));
    }
}
