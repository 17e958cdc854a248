package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;

import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;

import shuntwright.io.fixture.PlanFixtures;
import shuntwright.plan.Plan;

class WorkbookTest {

    private static final Plan PLAN = PlanFixtures.full();

    @Test
    void hasItsSheetsInOrder() throws IOException {
        assertThat(sheets(PLAN)).containsExactly("Parts list", "Settings", "Findings", "Choice", "Conflict",
                "Cures", "Refused parts", "Error budget", "Error budget by input", "Board yield", "Shared",
                "Alert lines", "Taps", "Designators",
                "Prices", "Assumptions and cautions");
        assertThat(sheets(PlanFixtures.empty())).containsExactly("Parts list", "Settings", "Findings",
                "Error budget", "Error budget by input", "Shared", "Designators", "Prices", "Assumptions and cautions");
    }

    @Test
    void everySheetIsReadyForScreenAndPrinter() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            for (Sheet each : book) {
                XSSFSheet sheet = (XSSFSheet) each;
                assertThat(sheet.getPaneInformation().isFreezePane()).as(sheet.getSheetName()).isTrue();
                assertThat(sheet.getPaneInformation().getVerticalSplitPosition()).isEqualTo(frozen(each));
                int headers = sheet.getPaneInformation().getHorizontalSplitPosition() - 1;
                assertThat(sheet.getCTWorksheet().getAutoFilter().getRef()).startsWith("A" + (headers + 1) + ":");
                assertThat(sheet.getPrintSetup().getLandscape()).isTrue();
                assertThat(sheet.getFitToPage()).isTrue();
                assertThat(sheet.getRepeatingRows().getLastRow()).isEqualTo(headers);
                assertThat(sheet.getFooter().getRight()).contains("&P").contains("&N");
                assertThat(sheet.getFooter().getLeft()).contains("Not a substitute");
                assertThat(sheet.getFooter().getLeft().length() + sheet.getFooter().getRight().length())
                        .isLessThan(250);
            }
        }
    }

    /** Columns that say whose line it is. */
    private static short frozen(Sheet sheet) {
        return switch (sheet.getSheetName()) {
            case ErrorBudgetSheet.NAME -> 2;
            case BudgetInputsSheet.NAME -> 3;
            default -> 1;
        };
    }

    @Test
    void textStaysText() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet parts = book.getSheet(PartsSheet.NAME);
            for (String each : List.of("1E3", "4E7", "=1+1")) {
                XSSFCell cell = Cells.row(parts, each).getCell(0);
                assertThat(cell.getCellType()).isEqualTo(CellType.STRING);
                assertThat(cell.getCellStyle().getDataFormatString()).isEqualTo("@");
                assertThat(cell.getCellStyle().getQuotePrefixed()).isEqualTo(each.startsWith("="));
            }
            XSSFCell formula = Cells.at(parts, "=1+1", "Description");
            assertThat(formula.getCellType()).isEqualTo(CellType.STRING);
            assertThat(formula.getStringCellValue()).isEqualTo("@SUM(A1) looks like a formula");
            assertThat(Cells.row(book.getSheet(SettingsSheet.NAME), "=DAC").getCell(0).getCellType())
                    .isEqualTo(CellType.STRING);
        }
    }

    @Test
    void noFormulaFails() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            int formulas = 0;
            for (Sheet sheet : book) {
                for (var row : sheet) {
                    for (var cell : row) {
                        if (cell.getCellType() == CellType.FORMULA) {
                            formulas++;
                            assertThat(cell.getCachedFormulaResultType()).as(cell.getAddress().toString())
                                    .isIn(CellType.NUMERIC, CellType.STRING);
                        }
                    }
                }
            }
            assertThat(formulas).isGreaterThan(20);
        }
    }

    @Test
    void sameBytesForTheSamePlanAtAnyTimeAndPlace() throws IOException, InterruptedException {
        byte[] first = Workbook.bytes(PLAN);
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG"));
            TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Kiritimati"));
            // Zip entries and properties count in steps of up to two seconds.
            Thread.sleep(2100);
            ByteArrayOutputStream again = new ByteArrayOutputStream();
            Workbook.write(PlanFixtures.full(), again);
            assertThat(Arrays.equals(again.toByteArray(), first)).isTrue();
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    @Test
    void assumptionsSayCautionsAndWhatWasUsed() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(AssumptionsSheet.NAME);
            List<String> texts = new ArrayList<>();
            for (var row : sheet) {
                for (var cell : row) {
                    texts.add(cell.toString());
                }
            }
            assertThat(texts).anyMatch(it -> it.contains("fuse or circuit breaker that codes require"))
                    .anyMatch(it -> it.contains("both ends of the ambient")).anyMatch(it -> it.contains("licensed"))
                    .anyMatch(it -> it.contains("cannot be bought"))
                    .contains("Ambient temperature", "Sense supply, limits", "Reference quiet")
                    .contains("Propagated distribution", "1,000,000 trials of each channel, seed 7",
                            "Coverage probability", "Stated: shunt tolerance of 1E3", "normal, k = 3",
                            "Stated: gain error", "t, ν = 9, k = 2", "Zone port warms its parts above ambient by",
                            "at 1 A and 8 A, current known to 0.2 %, at 20 .. 30 °C");
        }
        try (XSSFWorkbook book = Cells.open(PlanFixtures.unsampled())) {
            List<String> texts = new ArrayList<>();
            book.getSheet(AssumptionsSheet.NAME).forEach(row -> row.forEach(cell -> texts.add(cell.toString())));
            assertThat(texts).contains("not sampled; asked for: trials of each channel until 2 digits of the standard "
                    + "deviation settled, at most 10,000,000, seed 7");
        }
    }

    @Test
    void findingsCarryContributorAndCure() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFRow row = Cells.row(book.getSheet(FindingsSheet.NAME), "Tapped");
            assertThat(row.getCell(1).getStringCellValue()).isEqualTo("fault");
            assertThat(row.getCell(4).getStringCellValue()).contains("shunt tolerance (shunt 1)");
            assertThat(row.getCell(5).getStringCellValue()).isEqualTo("a wider window: must-trip 4 A → 4.4 A");
        }
    }

    private static List<String> sheets(Plan plan) throws IOException {
        try (XSSFWorkbook book = new XSSFWorkbook(new ByteArrayInputStream(Workbook.bytes(plan)))) {
            List<String> names = new ArrayList<>();
            book.forEach(each -> names.add(each.getSheetName()));
            return names;
        }
    }
}
