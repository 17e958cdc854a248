package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;

import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;

import shuntwright.io.fixture.PlanFixtures;
import shuntwright.plan.Plan;
import shuntwright.sampling.BoardYield;

class YieldSheetTest {

    private static final Plan PLAN = PlanFixtures.full();

    @Test
    void theYieldStandsWithItsIntervalBesideTheProduct() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(YieldSheet.NAME);
            assertThat(Cells.row(sheet, "Board yield, %").getCell(1).getNumericCellValue()).isCloseTo(97.12,
                    within(1e-9));
            assertThat(Cells.row(sheet, "As a fraction, with its interval").getCell(1).getStringCellValue())
                    .isEqualTo("0.9712 (95 %: 0.9708 to 0.9716)");
            assertThat(Cells.row(sheet, "Product of the channels' own").getCell(1).getStringCellValue())
                    .isEqualTo("0.9603");
            assertThat(Cells.row(sheet, "Channels were sampled by").getCell(1).getStringCellValue())
                    .isEqualTo("1,000,000 trials of each channel, seed 7");
        }
    }

    @Test
    void costsAreComputedOfTheYieldsBesideThem() throws IOException {
        BoardYield yield = PLAN.study().orElseThrow().yield();
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(YieldSheet.NAME);
            BoardYield.SharedCost ambient = yield.shared().getFirst();
            assertThat(Cells.at(sheet, "ambient", "It costs").getCellType()).isEqualTo(CellType.FORMULA);
            assertThat(Cells.at(sheet, "ambient", "It costs").getNumericCellValue()).isCloseTo(100 * ambient.cost(),
                    within(1e-9));
            assertThat(Cells.at(sheet, "ambient", "± its").getNumericCellValue())
                    .isCloseTo(100 * ambient.standardError(), within(1e-12));
        }
    }

    @Test
    void nothingIsCertain() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(YieldSheet.NAME);
            assertThat(Cells.at(sheet, "reference quiet", "Yield with it").getStringCellValue())
                    .isEqualTo("no trial outside");
            assertThat(Cells.at(sheet, "reference quiet", "It costs").getNumericCellValue()).isCloseTo(0.05,
                    within(1e-12));
            assertThat(Cells.at(sheet, "ADC", "It costs").getStringCellValue()).isEqualTo("no trial differs");
            assertThat(Cells.at(sheet, "ADC", "± its").getCellType()).isEqualTo(CellType.BLANK);
        }
    }
}
