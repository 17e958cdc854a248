package shuntwright.quantity;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads one to three values with range separators between them; the unit of the last holds for those without one. */
final class AmountList {

    private static final Pattern SEPARATOR = Pattern.compile(" ?(?:\\.{2,3}|(?<![A-Za-z])to(?![A-Za-z])) ?");
    private static final Pattern UNCLEAR = Pattern.compile("\\.{3,}[0-9]");

    private AmountList() {
    }

    static boolean hasSeparator(String text) {
        return SEPARATOR.matcher(text).find();
    }

    /** The values in SI units, at least one and at most {@code most}. */
    static Reading<List<Double>> read(String text, Dimension dimension, int most) {
        Matcher unclear = UNCLEAR.matcher(text);
        if (unclear.find()) {
            return Reading.misread(TypedText.quote(text) + " does not say where a point belongs. Write a range with "
                    + "spaces around two points, 0 .. 5 or 0 .. 0.5.");
        }
        List<String> pieces = List.of(SEPARATOR.split(text, -1));
        if (pieces.size() > most) {
            return Reading.misread(TypedText.quote(text) + " has " + pieces.size() + " values, but at most " + most
                    + (most == 1 ? " value is" : " values are") + " asked for here.");
        }
        List<Amount> amounts = new ArrayList<>();
        for (String piece : pieces) {
            if (pieces.size() > 1 && piece.isBlank()) {
                return Reading.misread(TypedText.quote(text) + " lacks an end of the range. Write both, for example "
                        + "3 .. 5.");
            }
            switch (Amount.read(piece.strip(), dimension)) {
                case Reading.Value<Amount>(Amount amount) -> amounts.add(amount);
                case Reading.Misread<Amount>(String problem) -> {
                    return Reading.misread(problem);
                }
            }
        }
        return lendLastUnit(amounts, text).then(AmountList::convert);
    }

    private static Reading<List<Amount>> lendLastUnit(List<Amount> amounts, String text) {
        Amount last = amounts.getLast();
        List<Amount> complete = new ArrayList<>();
        for (Amount amount : amounts) {
            if (amount.isBare() && last.code() && last.shift() != 0 && amount.number().signum() != 0) {
                return Reading.misread(TypedText.quote(text) + " does not say whether the letter of the last value "
                        + "holds for the others. Write a unit or letter at each.");
            }
            if (last.isBare() && amount.shift() != 0) {
                return Reading.misread(TypedText.quote(text) + " has no unit at its last value. Write the unit there; "
                        + "it then holds for every value without one.");
            }
            complete.add(amount.isBare() ? last.unit().map(amount::in).orElse(amount) : amount);
        }
        return Reading.value(complete);
    }

    private static Reading<List<Double>> convert(List<Amount> amounts) {
        List<Double> values = new ArrayList<>();
        for (Amount amount : amounts) {
            switch (amount.si()) {
                case Reading.Value<Double>(Double value) -> values.add(value);
                case Reading.Misread<Double>(String problem) -> {
                    return Reading.misread(problem);
                }
            }
        }
        return Reading.value(values);
    }
}
