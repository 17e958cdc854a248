package shuntwright.quantity;

import java.util.regex.Pattern;

/** Text as typed or pasted, made uniform before it is read: one kind of space, minus, micro, ohm and ellipsis. */
final class TypedText {

    private static final int LONGEST = 100;
    private static final int QUOTED = 40;
    private static final Pattern SPACES = Pattern.compile("[\\s\\u00A0\\u2000-\\u200A\\u202F\\u205F\\u3000]+");
    private static final Pattern INVISIBLE = Pattern.compile("[\\u200B\\u200E\\u200F\\u061C\\u2060\\uFEFF]");

    private TypedText() {
    }

    /** The text with the many forms of one sign replaced by one, without spaces at its ends. */
    static String tidy(String text) {
        String one = SPACES.matcher(INVISIBLE.matcher(text).replaceAll("")).replaceAll(" ").strip();
        StringBuilder tidy = new StringBuilder(one.length());
        for (int i = 0; i < one.length(); i++) {
            char c = one.charAt(i);
            switch (c) {
                case '\u2212', '\u2013', '\u2010', '\u2011' -> tidy.append('-');
                case '\u03BC' -> tidy.append('\u00B5');
                case '\u2126' -> tidy.append('\u03A9');
                case '\u00BA' -> tidy.append('\u00B0');
                case '\u2103' -> tidy.append("\u00B0C");
                case '\u2026' -> tidy.append(" .. ");
                case '\u22C5' -> tidy.append('\u00B7');
                default -> tidy.append(c);
            }
        }
        return tidy.toString().strip();
    }

    /** Whether the text is longer than any quantity can sensibly be. */
    static boolean tooLong(String tidy) {
        return tidy.length() > LONGEST;
    }

    /** The text in quotation marks for a sentence, cut short where long. */
    static String quote(String text) {
        return text.length() <= QUOTED ? "'" + text + "'" : "'" + text.substring(0, QUOTED) + "…'";
    }

    static String withoutSpaces(String tidy) {
        return tidy.replace(" ", "");
    }

    /** The word with "a" or "an" before it. */
    static String oneOf(Dimension dimension) {
        String word = dimension.word();
        return ("aeioAEIO".indexOf(word.charAt(0)) >= 0 ? "an " : "a ") + word;
    }
}
