package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;

import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;

import shuntwright.io.fixture.PlanFixtures;
import shuntwright.io.planfile.Cautions;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;

class ChoiceSheetTest {

    private static final Plan PLAN = PlanFixtures.full();

    @Test
    void everyObjectiveStandsInItsOrderWithItsProof() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(ChoiceSheet.NAME);
            int rank = 0;
            for (Reached each : PLAN.choice().orElseThrow().reached()) {
                assertThat(Cells.at(sheet, each.objective().word(), "Decides").getNumericCellValue())
                        .isEqualTo(++rank);
            }
            assertThat(Cells.at(sheet, "least heat", "Proof").getStringCellValue()).isEqualTo("proven best");
            assertThat(Cells.at(sheet, "least cost", "Proof").getStringCellValue()).startsWith("not proven best");
            assertThat(Cells.at(sheet, "fewest parts", "Proof").getStringCellValue()).startsWith("not proven best")
                    .contains("nothing is known");
            assertThat(Cells.at(sheet, "most even heat", "Reached").getNumericCellValue()).isCloseTo(80,
                    within(1e-12));
            assertThat(Cells.at(sheet, "most even heat", "Unit").getStringCellValue()).startsWith("% of");
        }
    }

    @Test
    void theDistanceIsComputedOfValueAndBound() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(ChoiceSheet.NAME);
            for (Reached each : PLAN.choice().orElseThrow().reached()) {
                var cell = Cells.at(sheet, each.objective().word(), "Distance");
                double gap = each.gap().orElse(Double.NaN);
                if (Double.isFinite(gap)) {
                    assertThat(cell.getNumericCellValue()).isCloseTo(100 * gap, within(1e-9));
                }
            }
            assertThat(Cells.at(sheet, "fewest parts", "Distance").getCellType()).isEqualTo(CellType.BLANK);
            assertThat(Cells.at(sheet, "widest margin", "Distance").getStringCellValue())
                    .as("there is no share of nothing").isEmpty();
            assertThat(Cells.at(sheet, "least cost", "Distance").getCellType()).isEqualTo(CellType.FORMULA);
            assertThat(Cells.at(sheet, "fewest parts", "Nothing is").getCellType()).isEqualTo(CellType.BLANK);
        }
    }

    @Test
    void whatIsBestOnlyWithinTheHeatStepSaysSoAndHowFar() throws IOException {
        try (XSSFWorkbook book = Cells.open(PlanFixtures.withinStep())) {
            XSSFSheet sheet = book.getSheet(ChoiceSheet.NAME);
            assertThat(Cells.at(sheet, "least heat", "Proof").getStringCellValue())
                    .isEqualTo("proven best within the heat step");
            assertThat(Cells.at(sheet, "least heat", "Distance").getNumericCellValue()).isCloseTo(75, within(1e-9));
        }
    }

    @Test
    void searchAndBrokenLimitsAreSaid() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(ChoiceSheet.NAME);
            assertThat(label(sheet, "All channels chosen together for"))
                    .startsWith("least heat, then least cost, then");
            assertThat(label(sheet, "Search")).startsWith("420 rounds, seed 9; ended before its rounds");
            assertThat(label(sheet, "Among")).startsWith("12,345 ways").contains("678 of them");
            assertThat(label(sheet, "Shared limits broken")).isEqualTo("zone port");
            assertThat(label(sheet, "Demands in conflict")).startsWith("3,").contains(ChoiceSheet.CONFLICT);
            assertThat(sheet.getFooter().getLeft()).contains(Cautions.LINE);
        }
    }

    @Test
    void theConflictSaysWhatEachDemandWouldHaveToBe() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(ChoiceSheet.CONFLICT);
            assertThat(label(sheet, "Conflict")).contains("need 2.9 W");
            assertThat(label(sheet, "All of them needed")).startsWith("not proven");
            assertThat(Cells.at(sheet, "zone port", "Now").getNumericCellValue()).isEqualTo(2.5);
            assertThat(Cells.at(sheet, "zone port", "Relaxed alone to").getNumericCellValue()).isEqualTo(2.9);
            assertThat(Cells.at(sheet, "zone port", "Unit").getStringCellValue()).isEqualTo("W");
            assertThat(Cells.at(sheet, "channel Pump", "What").getStringCellValue()).isEqualTo("must-trip current");
            assertThat(Cells.at(sheet, "channel Pump", "Relaxed alone to").getCellType()).isEqualTo(CellType.BLANK);
            assertThat(Cells.at(sheet, "tap low", "Now").getCellType()).isEqualTo(CellType.BLANK);
        }
    }

    @Test
    void aCheckedBoardHasNoSuchSheets() throws IOException {
        try (XSSFWorkbook book = Cells.open(PlanFixtures.checked())) {
            assertThat(book.getSheet(ChoiceSheet.NAME)).isNull();
            assertThat(book.getSheet(ChoiceSheet.CONFLICT)).isNull();
        }
    }

    private static String label(XSSFSheet sheet, String label) {
        return Cells.row(sheet, label).getCell(1).getStringCellValue();
    }
}
