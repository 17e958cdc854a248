package shuntwright.io.workbook;

import java.util.EnumMap;
import java.util.Map;

import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.ComparisonOperator;
import org.apache.poi.ss.usermodel.FillPatternType;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.PatternFormatting;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFColor;
import org.apache.poi.xssf.usermodel.XSSFConditionalFormattingRule;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFPatternFormatting;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFSheetConditionalFormatting;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The cell styles of one workbook: dark petrol on white, one tinted header, tints where a verdict or an input stands. */
final class Look {

    private static final int PETROL = 0x1F4E5A;
    private static final int HEADER_TINT = 0xE4EEF0;
    private static final int SUM_TINT = 0xF3F7F8;
    private static final int INPUT_TINT = 0xFFF7D6;
    private static final int GOOD_TINT = 0xE2F2E4;
    private static final int FAIR_TINT = 0xFCEFD2;
    private static final int BAD_TINT = 0xF9DEDC;
    private static final int LINE = 0xC9D3D6;

    private final XSSFWorkbook book;
    private final Map<Style, XSSFCellStyle> styles = new EnumMap<>(Style.class);
    private final Map<Style, XSSFCellStyle> sums = new EnumMap<>(Style.class);
    private final XSSFCellStyle quoted;
    private final XSSFCellStyle quotedSum;

    Look(XSSFWorkbook book) {
        this.book = book;
        for (Style each : Style.values()) {
            styles.put(each, make(each));
            sums.put(each, sum(each));
        }
        quoted = make(Style.TEXT);
        quoted.setQuotePrefixed(true);
        quotedSum = sum(Style.TEXT);
        quotedSum.setQuotePrefixed(true);
    }

    XSSFCellStyle of(Style style) {
        return found(styles, style);
    }

    private static XSSFCellStyle found(Map<Style, XSSFCellStyle> among, Style style) {
        XSSFCellStyle made = among.get(style);
        if (made == null) {
            throw new IllegalStateException("no style for " + style);
        }
        return made;
    }

    /** For text that a spreadsheet would take for a formula once someone edits its cell. */
    XSSFCellStyle quoted() {
        return quoted;
    }

    /** How that cell looks in a row that sums up those below it. */
    XSSFCellStyle ofSum(Style style, XSSFCellStyle alone) {
        return alone.getQuotePrefixed() ? quotedSum : found(sums, style);
    }

    /** Tints cells that say yes or no by what they say now. */
    void answers(XSSFSheet sheet, CellRangeAddress cells) {
        XSSFSheetConditionalFormatting formatting = sheet.getSheetConditionalFormatting();
        formatting.addConditionalFormatting(new CellRangeAddress[]{cells},
                new XSSFConditionalFormattingRule[]{answer(formatting, "yes", GOOD_TINT),
                        answer(formatting, "no", FAIR_TINT)});
    }

    private static XSSFConditionalFormattingRule answer(XSSFSheetConditionalFormatting formatting, String word,
            int tint) {
        XSSFConditionalFormattingRule rule = formatting.createConditionalFormattingRule(ComparisonOperator.EQUAL,
                "\"" + word + "\"");
        XSSFPatternFormatting pattern = rule.createPatternFormatting();
        pattern.setFillBackgroundColor(colour(tint));
        pattern.setFillPattern(PatternFormatting.SOLID_FOREGROUND);
        return rule;
    }

    private XSSFCellStyle sum(Style style) {
        XSSFCellStyle made = make(style);
        made.setFont(font(true, 10));
        tint(made, SUM_TINT);
        return made;
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
            case ANSWER_HEADER -> {
                header(made);
                made.setAlignment(HorizontalAlignment.CENTER);
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
            case INPUT_COUNT, INPUT_SHARE, INPUT_MONEY -> {
                tint(made, INPUT_TINT);
                box(made);
                indent(made);
            }
            case TOTAL_MONEY, TOTAL_COUNT, TOTAL_PERCENT -> {
                made.setFont(font(true, 11));
                indent(made);
            }
            case FACTOR, TENTH -> {
                made.setAlignment(HorizontalAlignment.RIGHT);
                line(made);
            }
            case ANSWER -> {
                made.setAlignment(HorizontalAlignment.CENTER);
                line(made);
            }
            case GOOD -> verdict(made, GOOD_TINT);
            case FAIR -> verdict(made, FAIR_TINT);
            case BAD -> verdict(made, BAD_TINT);
            case COUNT, VOLT, AMPERE, MILLIOHM, OHM, GAIN, PERCENT, WATT, MONEY, UNIT_PRICE, GENERAL, FINE_AMPERE,
                    EXPONENT,
                    FINE_PERCENT ->
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
