package shuntwright.quantity;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * One number with the unit written at it, not yet converted: a later value of a range may still lend it its unit.
 *
 * @param number   the digits typed
 * @param negative whether a minus stood before them
 * @param unit     the unit or prefix written, empty where the number stood bare
 * @param code     whether the letter stood for the decimal point, so that the unit belongs to this number alone
 */
record Amount(BigDecimal number, boolean negative, Optional<Unit> unit, boolean code) {

    /** Reads one number with or without unit from tidy text. */
    static Reading<Amount> read(String text, Dimension dimension) {
        if (text.isEmpty()) {
            return Reading.misread("Nothing is written here. Write " + TypedText.oneOf(dimension) + ", for example "
                    + Units.example(dimension) + ".");
        }
        if (TypedText.tooLong(text)) {
            return Reading.misread(TypedText.quote(text) + " is too long. Write " + TypedText.oneOf(dimension)
                    + ", for example " + Units.example(dimension) + ".");
        }
        Optional<Reading<Amount>> letterCode = LetterCode.read(text, dimension);
        if (letterCode.isPresent()) {
            return letterCode.get();
        }
        return NumberText.leading(text, dimension).then(found -> withUnit(found, dimension, text));
    }

    private static Reading<Amount> withUnit(NumberText found, Dimension dimension, String text) {
        String symbol = TypedText.withoutSpaces(found.rest());
        if (symbol.isEmpty()) {
            return Reading.value(new Amount(found.number(), found.negative(), Optional.empty(), false));
        }
        if (symbol.chars().anyMatch(c -> "±+-~".indexOf(c) >= 0)) {
            return Reading.misread(TypedText.quote(text) + " is more than one value. Where a range can stand it is "
                    + "written 3 .. 5, where a tolerance can stand ±2 %.");
        }
        return Units.find(symbol, dimension, text).then(
                unit -> Reading.value(new Amount(found.number(), found.negative(), Optional.of(unit), false)));
    }

    boolean isBare() {
        return unit.isEmpty();
    }

    /** The power of ten of the unit, 0 where the number stood bare. */
    int shift() {
        return unit.map(Unit::shift).orElse(0);
    }

    Amount in(Unit lent) {
        return new Amount(number, negative, Optional.of(lent), code);
    }

    /** The value in SI units: the decimal point is shifted first, then the decimal rounded once to a double. */
    Reading<Double> si() {
        double value = number.scaleByPowerOfTen(shift()).doubleValue();
        if (!Double.isFinite(value)) {
            return Reading.misread("The number is too large. Allowed are magnitudes up to 1.7e308.");
        }
        if (value == 0 && number.signum() != 0) {
            return Reading.misread("The number is too small. Allowed are 0 and magnitudes from 4.9e-324.");
        }
        return Reading.value(value == 0 && negative ? -0.0 : value);
    }
}
