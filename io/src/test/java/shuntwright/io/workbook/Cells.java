package shuntwright.io.workbook;

import java.io.ByteArrayInputStream;
import java.io.IOException;

import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.plan.Plan;

/** Finds cells of a written workbook as a reader does: by line and header. */
final class Cells {

    private Cells() {
    }

    static XSSFWorkbook open(Plan plan) throws IOException {
        return new XSSFWorkbook(new ByteArrayInputStream(Workbook.bytes(plan)));
    }

    /** The row whose first cell holds that text. */
    static XSSFRow row(XSSFSheet sheet, String first) {
        for (var row : sheet) {
            if (row.getCell(0) instanceof XSSFCell cell && cell.toString().equals(first)) {
                return (XSSFRow) row;
            }
        }
        throw new AssertionError("no row " + first + " in " + sheet.getSheetName());
    }

    /** The cell of that line under a header that starts with a text, in a group that starts so where one is given. */
    static XSSFCell at(XSSFSheet sheet, String line, String header) {
        return row(sheet, line).getCell(column(sheet, "", header));
    }

    static XSSFCell at(XSSFSheet sheet, String line, String group, String header) {
        return row(sheet, line).getCell(column(sheet, group, header));
    }

    /** The row whose first cells hold these texts. */
    static XSSFRow line(XSSFSheet sheet, String... firsts) {
        for (var row : sheet) {
            boolean same = true;
            for (int index = 0; index < firsts.length; index++) {
                same &= row.getCell(index) instanceof XSSFCell cell && cell.toString().equals(firsts[index]);
            }
            if (same) {
                return (XSSFRow) row;
            }
        }
        throw new AssertionError("no row " + String.join(", ", firsts) + " in " + sheet.getSheetName());
    }

    static XSSFCell at(XSSFRow row, String group, String header) {
        return row.getCell(column(row.getSheet(), group, header));
    }

    private static int column(XSSFSheet sheet, String group, String header) {
        int headers = sheet.getRepeatingRows().getLastRow();
        String current = "";
        for (var cell : sheet.getRow(headers)) {
            int index = cell.getColumnIndex();
            XSSFCell above = sheet.getRow(headers - 1) == null ? null : sheet.getRow(headers - 1).getCell(index);
            if (!group.isEmpty() && above != null) {
                current = above.getStringCellValue();
            }
            if (cell.getStringCellValue().startsWith(header) && current.startsWith(group)) {
                return index;
            }
        }
        throw new AssertionError("no column " + group + " " + header + " in " + sheet.getSheetName());
    }
}
