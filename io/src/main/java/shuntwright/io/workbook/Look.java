package shuntwright.io.workbook;

import java.util.EnumMap;
import java.util.Map;

import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.FillPatternType;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFColor;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The cell styles of one workbook: dark petrol on white, one tinted header, tints where a verdict or an input stands. */
final class Look {

    private static final int PETROL = 0x1F4E5A;
    private static final int HEADER_TINT = 0xE4EEF0;
    private static final int INPUT_TINT = 0xFFF7D6;
    private static final int GOOD_TINT = 0xE2F2E4;
    private static final int FAIR_TINT = 0xFCEFD2;
    private static final int BAD_TINT = 0xF9DEDC;
    private static final int LINE = 0xC9D3D6;

    private final XSSFWorkbook book;
    private final Map<Style, XSSFCellStyle> styles = new EnumMap<>(Style.class);
    private final XSSFCellStyle quoted;

    Look(XSSFWorkbook book) {
        this.book = book;
        for (Style each : Style.values()) {
            styles.put(each, make(each));
        }
        quoted = make(Style.TEXT);
        quoted.setQuotePrefixed(true);
    }

    XSSFCellStyle of(Style style) {
        XSSFCellStyle made = styles.get(style);
        if (made == null) {
            throw new IllegalStateException("no style for " + style);
        }
        return made;
    }

    /** For text that a spreadsheet would take for a formula once someone edits its cell. */
    XSSFCellStyle quoted() {
        return quoted;
    }

    private XSSFCellStyle make(Style style) {
        XSSFCellStyle made = book.createCellStyle();
        made.setDataFormat(book.createDataFormat().getFormat(style.format()));
        made.setVerticalAlignment(VerticalAlignment.TOP);
        switch (style) {
            case TITLE -> {
                made.setFont(font(true, 16));
            }
            case LABEL -> {
                made.setFont(font(false, 10));
                indent(made);
            }
            case GROUP -> {
                made.setFont(font(true, 10));
                indent(made);
                made.setVerticalAlignment(VerticalAlignment.BOTTOM);
            }
            case HEADER -> {
                header(made);
                indent(made);
            }
            case NUMBER_HEADER -> {
                header(made);
                made.setAlignment(HorizontalAlignment.RIGHT);
            }
            case WRAPPED -> {
                made.setWrapText(true);
                indent(made);
                line(made);
            }
            case TEXT -> {
                indent(made);
                line(made);
            }
            case INPUT_COUNT, INPUT_SHARE -> {
                tint(made, INPUT_TINT);
                box(made);
                indent(made);
            }
            case TOTAL_MONEY, TOTAL_COUNT -> {
                made.setFont(font(true, 11));
                indent(made);
            }
            case GOOD -> verdict(made, GOOD_TINT);
            case FAIR -> verdict(made, FAIR_TINT);
            case BAD -> verdict(made, BAD_TINT);
            case COUNT, VOLT, AMPERE, MILLIOHM, OHM, GAIN, PERCENT, WATT, MONEY, UNIT_PRICE, GENERAL ->
                line(made);
        }
        return made;
    }

    private void header(XSSFCellStyle style) {
        style.setFont(font(true, 10));
        style.setWrapText(true);
        style.setVerticalAlignment(VerticalAlignment.BOTTOM);
        tint(style, HEADER_TINT);
        style.setBorderBottom(BorderStyle.MEDIUM);
        style.setBottomBorderColor(colour(PETROL));
    }

    private XSSFFont font(boolean bold, int points) {
        XSSFFont font = book.createFont();
        font.setFontName(XSSFFont.DEFAULT_FONT_NAME);
        font.setBold(bold);
        font.setFontHeightInPoints((short) points);
        font.setColor(colour(PETROL));
        return font;
    }

    private static void verdict(XSSFCellStyle style, int tint) {
        tint(style, tint);
        indent(style);
        line(style);
    }

    private static void indent(XSSFCellStyle style) {
        style.setAlignment(HorizontalAlignment.LEFT);
        style.setIndention((short) 1);
    }

    private static void tint(XSSFCellStyle style, int tint) {
        style.setFillForegroundColor(colour(tint));
        style.setFillPattern(FillPatternType.SOLID_FOREGROUND);
    }

    private static void line(XSSFCellStyle style) {
        style.setBorderBottom(BorderStyle.HAIR);
        style.setBottomBorderColor(colour(LINE));
    }

    private static void box(XSSFCellStyle style) {
        style.setBorderBottom(BorderStyle.THIN);
        style.setBottomBorderColor(colour(LINE));
        style.setBorderTop(BorderStyle.THIN);
        style.setTopBorderColor(colour(LINE));
        style.setBorderLeft(BorderStyle.THIN);
        style.setLeftBorderColor(colour(LINE));
        style.setBorderRight(BorderStyle.THIN);
        style.setRightBorderColor(colour(LINE));
    }

    private static XSSFColor colour(int rgb) {
        return new XSSFColor(new byte[]{(byte) (rgb >> 16), (byte) (rgb >> 8), (byte) rgb});
    }
}
