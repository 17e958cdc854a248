package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;

import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFFormulaEvaluator;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Outcome;
import shuntwright.io.fixture.PlanFixtures;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;

class SettingsSheetTest {

    private static final Plan PLAN = PlanFixtures.full();

    @Test
    void cellsHoldThePlansNumbers() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(SettingsSheet.NAME);
            for (ChannelPlan each : PLAN.channels()) {
                String name = each.channel().name();
                assertThat(Cells.at(sheet, name, "Verdict").getStringCellValue()).isEqualTo(each.verdict().word());
                if (each.solved().isEmpty()) {
                    assertThat(Cells.at(sheet, name, "Trip current", "Trip nominal").getCellType())
                            .isEqualTo(CellType.BLANK);
                    continue;
                }
                SolvedChannel solved = each.solved().get();
                close(Cells.at(sheet, name, "Threshold", "Threshold nominal"), solved.settings().threshold());
                close(Cells.at(sheet, name, "Trip current", "Trip nominal"), solved.trip().nominal());
                close(Cells.at(sheet, name, "Trip current", "Trip lowest"), solved.trip().limits().min());
                close(Cells.at(sheet, name, "Trip current", "Trip highest"), solved.trip().limits().max());
                close(Cells.at(sheet, name, "Chosen parts", "R_s"), 1000 * solved.circuit().resistance());
                close(Cells.at(sheet, name, "Shunt heat", "Heat at load"), solved.heat());
                if (solved.assessment(Outcome.RELEASE).isPresent()) {
                    close(Cells.at(sheet, name, "Release current", "Release nominal"),
                            solved.assessment(Outcome.RELEASE).get().nominal());
                } else {
                    assertThat(Cells.at(sheet, name, "Release current", "Release nominal").getCellType())
                            .isEqualTo(CellType.BLANK);
                }
            }
        }
    }

    @Test
    void readingErrorsAreInPerCentOfTheCurrent() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(SettingsSheet.NAME);
            close(Cells.at(sheet, "Pump", "Reading error", "Error at load"), 4);
            close(Cells.at(sheet, "Pump", "Reading error", "Allowed at load"), 10);
        }
    }

    @Test
    void nominalFiguresFollowChangedValues() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(SettingsSheet.NAME);
            XSSFCell trip = Cells.at(sheet, "Pump", "Trip current", "Trip nominal");
            double before = trip.getNumericCellValue();
            XSSFCell resistance = Cells.at(sheet, "Pump", "Chosen parts", "R_s");
            resistance.setCellValue(2 * resistance.getNumericCellValue());
            XSSFFormulaEvaluator evaluator = book.getCreationHelper().createFormulaEvaluator();
            evaluator.clearAllCachedResultValues();
            close(evaluator.evaluateInCell(trip), before / 2);
        }
    }

    private static void close(XSSFCell cell, double expected) {
        assertThat(cell.getNumericCellValue()).as(cell.getAddress().toString()).isCloseTo(expected,
                within(1e-12 * Math.abs(expected)));
    }
}
