package shuntwright.quantity;

import java.math.BigDecimal;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The number a text begins with, kept in decimal so that a prefix shifts the point without rounding.
 *
 * @param number   its value
 * @param negative whether a minus stood before it, which −0 needs
 * @param rest     what follows it, without spaces at the ends
 */
record NumberText(BigDecimal number, boolean negative, String rest) {

    private static final Pattern NUMBER = Pattern
            .compile("([+-]?) ?((?:[0-9]+\\.?[0-9]*|\\.[0-9]+))(?:[eE]([+-]?[0-9]+))?");
    private static final Pattern NOT_FINITE = Pattern.compile("[+-]? ?(?:nan|inf|infinity|∞)(?![a-z]).*",
            Pattern.CASE_INSENSITIVE);
    private static final Pattern THOUSANDS = Pattern.compile("[+-]? ?[1-9][0-9]{0,2},[0-9]{3}(?![0-9]).*");
    private static final Pattern COMMA = Pattern.compile(".*(?:[0-9] ?,|, ?[0-9]).*");
    /** A digit goes on after a gap or a separator; not the one of "1/K". */
    private static final Pattern GROUPED = Pattern.compile("['’_´`]?[0-9](?!/).*");
    /** Longer exponents are far outside what a double holds. */
    private static final int EXPONENT_CHARACTERS = 5;

    /** Reads the number at the beginning of a tidy, non-empty text. */
    static Reading<NumberText> leading(String text, Dimension dimension) {
        String quoted = TypedText.quote(text);
        if (COMMA.matcher(text).matches()) {
            return Reading.misread(quoted + " has a comma: write " + withoutComma(text)
                    + "; a comma is not taken because it means the decimal point in one country and thousands in "
                    + "another.");
        }
        if (NOT_FINITE.matcher(text).matches()) {
            return Reading.misread(quoted + " is not a finite number. Write " + article(dimension) + ".");
        }
        Matcher matcher = NUMBER.matcher(text);
        if (!matcher.lookingAt()) {
            return Reading.misread(quoted + " does not begin with a number. Write " + article(dimension) + ".");
        }
        String rest = text.substring(matcher.end()).strip();
        if (GROUPED.matcher(rest).matches()) {
            return Reading.misread(quoted + " has two numbers in a row. Write the digits without thousands separators, "
                    + "and a range with two points, 3 .. 5.");
        }
        if (rest.startsWith(".")) {
            return Reading.misread(quoted + " has more than one decimal point. Write the digits without thousands "
                    + "separators and with one point.");
        }
        String exponent = matcher.group(3) == null ? "0" : matcher.group(3);
        if (exponent.length() > EXPONENT_CHARACTERS) {
            return Reading.misread(quoted + " has an exponent outside ±9999. Write " + article(dimension) + ".");
        }
        boolean negative = matcher.group(1).equals("-");
        BigDecimal digits = new BigDecimal(matcher.group(2)).scaleByPowerOfTen(Integer.parseInt(exponent));
        return Reading.value(new NumberText(negative ? digits.negate() : digits, negative, rest));
    }

    /** What may be meant, as far as the comma can only stand for a point or for thousands. */
    private static String withoutComma(String text) {
        if (text.indexOf('.') >= 0 || text.indexOf(',') != text.lastIndexOf(',')) {
            return "the digits without separators and with one point";
        }
        String point = TypedText.quote(text.replace(',', '.')) + " with a point";
        return THOUSANDS.matcher(text).matches()
                ? point + " or " + TypedText.quote(text.replace(",", "")) + " for thousands"
                : point;
    }

    private static String article(Dimension dimension) {
        return TypedText.oneOf(dimension) + " such as " + Units.example(dimension);
    }
}
