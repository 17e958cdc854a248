package shuntwright.io.workbook;

import java.util.regex.Pattern;

/** Text as a cell, a header or a footer can hold it without taking it for something else. */
final class SafeText {

    /** What one cell holds at most, by the format. */
    private static final int CELL = 32767;
    /** Enough for a title and well below the format's 255 characters for header and footer. */
    private static final int MARGIN = 80;
    private static final Pattern ESCAPE = Pattern.compile("_(?=x[0-9A-Fa-f]{4}_)");

    private SafeText() {
    }

    /** For a cell: no characters that XML cannot hold, escapes of the format escaped, not longer than a cell holds. */
    static String cell(String text) {
        return cut(ESCAPE.matcher(printable(text)).replaceAll("_x005F_"), CELL);
    }

    /** For a page's header or footer, where an ampersand starts a code. */
    static String margin(String text) {
        return cut(printable(text), MARGIN).replace("&", "&&");
    }

    /** True when a spreadsheet would take the text for a formula if it were typed. */
    static boolean looksLikeFormula(String text) {
        return !text.isEmpty() && "=+-@".indexOf(text.charAt(0)) >= 0;
    }

    private static String printable(String text) {
        StringBuilder kept = new StringBuilder(text.length());
        text.codePoints().filter(SafeText::inXml).forEach(kept::appendCodePoint);
        return kept.toString();
    }

    private static boolean inXml(int point) {
        return point == '\t' || point == '\n' || (point >= 0x20 && point <= 0xD7FF)
                || (point >= 0xE000 && point <= 0xFFFD) || point >= 0x10000;
    }

    private static String cut(String text, int most) {
        return text.length() <= most ? text : text.substring(0, most - 1) + "…";
    }
}
