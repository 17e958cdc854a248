package shuntwright.quantity;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Letter codes after IEC 60062:2016, where a letter stands for the decimal point: "4K7", "R004"; for capacitances "4n7".
 * For resistances R is ohm, K, M, G are 10³, 10⁶, 10⁹ and L is milliohm.
 */
final class LetterCode {

    /** The small letters r and k cannot be mistaken for others; a small m or g could be and is not taken. */
    private static final Pattern RESISTANCE = Pattern.compile("([0-9]*)([RKMGLrk])([0-9]*)");
    private static final Pattern LIKE_RESISTANCE = Pattern.compile("[0-9]*[RKMGLrk][0-9RKMGLrk]*");
    private static final Pattern SMALL_M = Pattern.compile("([0-9]*)m([0-9]+)");
    private static final Pattern CAPACITANCE = Pattern.compile("([0-9]*)([pnuµm])([0-9]+)");
    private static final BigDecimal THOUSAND = new BigDecimal(1000);

    private LetterCode() {
    }

    /** Reads a letter code; empty where the text does not have the form of one. */
    static Optional<Reading<Amount>> read(String text, Dimension dimension) {
        return switch (dimension) {
            case RESISTANCE -> resistance(text);
            case CAPACITANCE -> {
                Matcher matcher = CAPACITANCE.matcher(text);
                yield matcher.matches() ? Optional.of(amount(matcher, farad(matcher.group(2)))) : Optional.empty();
            }
            case CURRENT, VOLTAGE, POWER, ENERGY, TIME, FREQUENCY, CHARGE_HEAT, TEMPERATURE, TEMPERATURE_DIFFERENCE,
                    THERMAL_RESISTANCE, RATIO, GAIN, TEMPERATURE_COEFFICIENT, VOLTAGE_PER_KELVIN, DECIBEL, SLEW_RATE,
                    MONEY ->
                Optional.empty();
        };
    }

    private static Optional<Reading<Amount>> resistance(String text) {
        Matcher matcher = RESISTANCE.matcher(text);
        if (matcher.matches() && text.length() > 1) {
            return Optional.of(amount(matcher, ohm(matcher.group(2))));
        }
        if (LIKE_RESISTANCE.matcher(text).matches()) {
            return Optional.of(Reading.misread(TypedText.quote(text) + " is not a resistance code: digits and exactly "
                    + "one of R, K, M, G or L in place of the decimal point are needed, as in 4R7, 33K2 or R004."));
        }
        Matcher small = SMALL_M.matcher(text);
        if (small.matches()) {
            String digits = (small.group(1).isEmpty() ? "0" : small.group(1)) + "." + small.group(2);
            return Optional.of(Reading.misread(TypedText.quote(text) + " could mean milli or mega: a small m is no "
                    + "letter of the code. Write " + digits + " mΩ for milliohm or " + digits + " MΩ for megohm."));
        }
        return Optional.empty();
    }

    private static Reading<Amount> amount(Matcher matcher, Unit unit) {
        String whole = matcher.group(1).isEmpty() ? "0" : matcher.group(1);
        String fraction = matcher.group(3);
        BigDecimal number = new BigDecimal(fraction.isEmpty() ? whole : whole + "." + fraction);
        return Reading.value(new Amount(number, false, Optional.of(unit), !fraction.isEmpty()));
    }

    private static Unit ohm(String letter) {
        return switch (letter) {
            case "K", "k" -> new Unit("kΩ", 3);
            case "M" -> new Unit("MΩ", 6);
            case "G" -> new Unit("GΩ", 9);
            case "L" -> new Unit("mΩ", -3);
            default -> new Unit("Ω", 0);
        };
    }

    private static Unit farad(String letter) {
        return switch (letter) {
            case "p" -> new Unit("pF", -12);
            case "n" -> new Unit("nF", -9);
            case "m" -> new Unit("mF", -3);
            default -> new Unit("µF", -6);
        };
    }

    /** Writes a resistance from 1 µΩ to below 1 TΩ; see {@link QuantityWriter#letterCode}. */
    static String write(double ohm) {
        if (!(ohm >= 1e-6 && ohm < 1e12)) {
            throw new IllegalArgumentException(
                    "a letter code holds resistances from 1 µΩ to below 1 TΩ, got " + ohm + " Ω");
        }
        BigDecimal scaled = new BigDecimal(Double.toString(ohm));
        int step = 0;
        while (scaled.compareTo(THOUSAND) >= 0) {
            scaled = scaled.scaleByPowerOfTen(-3);
            step++;
        }
        String plain = scaled.stripTrailingZeros().toPlainString();
        int point = plain.indexOf('.');
        String whole = point < 0 ? plain : plain.substring(0, point);
        String fraction = point < 0 ? "" : plain.substring(point + 1);
        char letter = "RKMG".charAt(step);
        if (whole.equals("0")) {
            return letter + fraction + "0".repeat(Math.max(0, 2 - fraction.length()));
        }
        return whole + letter + (whole.length() == 1 && fraction.isEmpty() ? "0" : fraction);
    }
}
