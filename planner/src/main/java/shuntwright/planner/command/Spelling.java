package shuntwright.planner.command;

import java.nio.charset.Charset;
import java.nio.charset.CharsetEncoder;
import java.util.Map;

/** Spells out the signs of engineers for terminals whose encoding lacks them. */
final class Spelling {
    private static final Map<String, String> WORDS = Map.ofEntries(Map.entry("Ω", "Ohm"), Map.entry("\u2126", "Ohm"),
            Map.entry("µ", "u"), Map.entry("\u03bc", "u"), Map.entry("°", " deg "), Map.entry("±", "+/-"),
            Map.entry("×", "x"), Map.entry("·", "*"), Map.entry("²", "^2"), Map.entry("≤", "<="), Map.entry("≥", ">="),
            Map.entry("→", "->"), Map.entry("–", "-"), Map.entry("\u2212", "-"), Map.entry("…", "..."),
            Map.entry("√", "sqrt"), Map.entry("θ", "theta"));

    private Spelling() {
    }

    /**
     * The text without what would steer a terminal or turn its line around: control characters and marks of writing
     * direction. For words from files, which may be by others.
     */
    static String harmless(String text) {
        StringBuilder tame = new StringBuilder(text.length());
        text.codePoints().forEach(each -> tame.appendCodePoint(steers(each) ? '\uFFFD' : each));
        return tame.toString();
    }

    private static boolean steers(int sign) {
        int type = Character.getType(sign);
        return type == Character.CONTROL || type == Character.FORMAT || type == Character.LINE_SEPARATOR
                || type == Character.PARAGRAPH_SEPARATOR;
    }

    /** The text, with every character that the charset cannot encode written in ones it can. */
    static String in(Charset charset, String text) {
        if (!charset.canEncode()) {
            return text;
        }
        CharsetEncoder encoder = charset.newEncoder();
        if (encoder.canEncode(text)) {
            return text;
        }
        StringBuilder spelt = new StringBuilder();
        text.codePoints().mapToObj(Character::toString)
                .forEach(each -> spelt.append(encoder.canEncode(each) ? each : WORDS.getOrDefault(each, "?")));
        return spelt.toString();
    }
}
