package shuntwright.io.workbook;

import java.util.List;
import java.util.function.Predicate;

import org.apache.poi.ss.usermodel.PageMargin;
import org.apache.poi.ss.usermodel.PaperSize;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;

import shuntwright.io.planfile.Cautions;

/**
 * A sheet with a title, room for a few lines above, and one table: frozen headers, a filter, and pages that repeat the
 * headers and say their number.
 */
final class TableSheet<T> {

    private static final int POINTS_PER_LINE = 14;
    private static final int ABOVE_HEIGHT = 17;
    /** Excel measures widths in 1/256 of a digit. */
    private static final int WIDTH_UNIT = 256;
    /** Characters of prose for each 100 digits of width: letters are narrower than digits on average. */
    private static final int PROSE = 120;
    /** The same for bold letters. */
    private static final int BOLD = 100;
    /** A column of single lines grows with its text to this many characters. */
    private static final int WIDEST = 44;

    private final XSSFSheet sheet;
    private final Look look;
    private final List<Column<T>> columns;
    private final int headerRow;
    private final int[] widths;
    private final boolean grouped;
    private Predicate<T> sums = _ -> false;
    private int next;

    /**
     * @param sheet   new and empty
     * @param look    of the workbook
     * @param title   shown at the top
     * @param columns of the table
     * @param above   rows to leave between title and table
     */
    TableSheet(XSSFSheet sheet, Look look, String title, List<Column<T>> columns, int above) {
        this.sheet = sheet;
        this.look = look;
        this.columns = List.copyOf(columns);
        widths = new int[columns.size()];
        grouped = columns.stream().anyMatch(each -> !each.group().isEmpty());
        headerRow = 1 + above + (grouped ? 1 : 0);
        next = headerRow + 1;
        text(row(0).createCell(0), title, Style.TITLE);
        row(0).setHeightInPoints(24);
        if (grouped) {
            groups();
        }
        headers();
        print(title);
    }

    XSSFSheet sheet() {
        return sheet;
    }

    /** Index of the row a table row will stand in, from 0. */
    int rowIndex(int tableRow) {
        return headerRow + 1 + tableRow;
    }

    /** The cell of a column in a row of the table, from 0; for formulas of other sheets. */
    String cell(Column<T> column, int tableRow) {
        return "'" + sheet.getSheetName() + "'!" + address(columns.indexOf(column), rowIndex(tableRow));
    }

    /** Says which rows sum up those below them, and so stand out. */
    void sumUp(Predicate<T> rows) {
        sums = rows;
        sheet.setRowSumsBelow(false);
    }

    /** Keeps the first columns on screen, and on every page where the table is wider than one. */
    void keep(int firstColumns, int pagesWide) {
        sheet.createFreezePane(firstColumns, headerRow + 1);
        if (pagesWide > 1) {
            sheet.setRepeatingColumns(new CellRangeAddress(-1, -1, 0, firstColumns - 1));
            sheet.getPrintSetup().setFitWidth((short) pagesWide);
        }
    }

    /** The cells of a column over all rows of the table, "B5:B9". */
    String span(Column<T> column, int rows) {
        int index = columns.indexOf(column);
        return address(index, rowIndex(0)) + ":" + address(index, rowIndex(Math.max(rows, 1) - 1));
    }

    void add(List<T> rows) {
        for (T each : rows) {
            add(each);
        }
        sheet.setAutoFilter(new CellRangeAddress(headerRow, next - 1, 0, columns.size() - 1));
        for (int index = 0; index < columns.size() && !rows.isEmpty(); index++) {
            if (columns.get(index).style() == Style.ANSWER) {
                look.answers(sheet, new CellRangeAddress(headerRow + 1, next - 1, index, index));
            }
        }
    }

    private void add(T object) {
        int rowNumber = next++;
        XSSFRow row = row(rowNumber);
        boolean sum = sums.test(object);
        int lines = 1;
        for (int index = 0; index < columns.size(); index++) {
            Column<T> column = columns.get(index);
            Column.Content content = column.fill().of(object, new Near(index, rowNumber));
            fill(row.createCell(index), content, column.style());
            if (sum) {
                row.getCell(index).setCellStyle(look.ofSum(column.style(), row.getCell(index).getCellStyle()));
            }
            if (content instanceof Column.Content.Text(String text)) {
                if (column.style() == Style.WRAPPED) {
                    lines = Math.max(lines, lines(text, (sum ? BOLD : PROSE) * column.width() / 100));
                } else {
                    widen(index, Math.min(text.length() + 3, WIDEST));
                }
            }
        }
        if (lines > 1) {
            row.setHeightInPoints(lines * POINTS_PER_LINE + 2f);
        }
    }

    /** Addresses of cells near one of this table. */
    private final class Near implements Column.Cells<T> {
        private final int column;
        private final int row;

        Near(int column, int row) {
            this.column = column;
            this.row = row;
        }

        @Override
        public String at(Column<T> other, int down) {
            return address(columns.indexOf(other), row + down);
        }

        @Override
        public String below(int first, int last) {
            return address(column, row + first) + ":" + address(column, row + last);
        }
    }

    private void widen(int column, int characters) {
        if (widths[column] < characters) {
            widths[column] = characters;
            sheet.setColumnWidth(column, characters * WIDTH_UNIT);
        }
    }

    /** A line between title and table: a label and what belongs to it. */
    XSSFCell above(int line, String label, Column.Content content, Style style) {
        XSSFRow row = row(1 + line);
        row.setHeightInPoints(ABOVE_HEIGHT);
        text(row.createCell(0), label, Style.LABEL);
        XSSFCell cell = row.createCell(1);
        fill(cell, content, style);
        return cell;
    }

    private void fill(XSSFCell cell, Column.Content content, Style style) {
        switch (content) {
            case Column.Content.Empty _ -> cell.setCellStyle(look.of(style));
            case Column.Content.Text(String text) -> {
                text(cell, text, style == Style.WRAPPED ? Style.WRAPPED : Style.TEXT);
                if (SafeText.looksLikeFormula(text)) {
                    cell.setCellStyle(look.quoted());
                }
            }
            case Column.Content.Marked(String text, Style marked) -> text(cell, text, marked);
            case Column.Content.Figure(double value) -> {
                cell.setCellStyle(look.of(style));
                cell.setCellValue(value);
            }
            case Column.Content.Formula(String formula) -> {
                cell.setCellStyle(look.of(style));
                cell.setCellFormula(formula);
            }
        }
    }

    private void text(XSSFCell cell, String text, Style style) {
        cell.setCellStyle(look.of(style));
        cell.setCellValue(SafeText.cell(text));
    }

    private void groups() {
        XSSFRow row = row(headerRow - 1);
        String last = "";
        for (int index = 0; index < columns.size(); index++) {
            String group = columns.get(index).group();
            if (!group.isEmpty() && !group.equals(last)) {
                text(row.createCell(index), group, Style.GROUP);
            }
            last = group;
        }
    }

    private void headers() {
        XSSFRow row = row(headerRow);
        int lines = 1;
        for (int index = 0; index < columns.size(); index++) {
            Column<T> column = columns.get(index);
            text(row.createCell(index), column.header(), column.style().header());
            widen(index, column.width());
            lines = Math.max(lines, lines(column.header(), column.width() - 2));
        }
        row.setHeightInPoints(lines * POINTS_PER_LINE + 4f);
        sheet.createFreezePane(1, headerRow + 1);
    }

    private void print(String title) {
        sheet.setRepeatingRows(new CellRangeAddress(grouped ? headerRow - 1 : headerRow, headerRow, -1, -1));
        sheet.setFitToPage(true);
        sheet.setHorizontallyCenter(false);
        sheet.getPrintSetup().setLandscape(true);
        sheet.getPrintSetup().setPaperSize(PaperSize.A4_PAPER);
        sheet.getPrintSetup().setFitWidth((short) 1);
        sheet.getPrintSetup().setFitHeight((short) 0);
        sheet.setMargin(PageMargin.LEFT, 0.4);
        sheet.setMargin(PageMargin.RIGHT, 0.4);
        sheet.setMargin(PageMargin.TOP, 0.5);
        sheet.setMargin(PageMargin.BOTTOM, 0.7);
        sheet.getFooter().setLeft("&8" + Cautions.LINE);
        sheet.getFooter().setRight("&8Page &P of &N");
        sheet.getHeader().setRight("&8" + SafeText.margin(" " + title));
        sheet.setDisplayGridlines(false);
    }

    private XSSFRow row(int index) {
        XSSFRow there = sheet.getRow(index);
        return there == null ? sheet.createRow(index) : there;
    }

    private static String address(int column, int row) {
        return CellReference.convertNumToColString(column) + (row + 1);
    }

    /** Lines a text takes at a width, words kept whole. */
    static int lines(String text, int width) {
        int room = Math.max(width, 1);
        int lines = 0;
        for (String paragraph : text.split("\n", -1)) {
            int used = 0;
            lines++;
            for (String word : paragraph.split(" ")) {
                if (used > 0 && used + 1 + word.length() > room) {
                    lines++;
                    used = 0;
                }
                used += (used > 0 ? 1 : 0) + word.length();
                lines += used / (room + 1);
                used %= room + 1;
            }
        }
        return lines;
    }
}
