package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.io.IOException;
import java.util.List;

import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFFormulaEvaluator;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.io.fixture.PlanFixtures;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.quantity.Range;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.EffectIndex;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;

class ErrorBudgetSheetTest {

    private static final Plan PLAN = PlanFixtures.full();

    private static final String LIMITS = "Limits";
    private static final String COMBINED = "Combined";
    private static final String PROPAGATED = "Propagated";
    private static final String SYMMETRIC = "Symmetric";
    private static final String SHORTEST = "Shortest";
    private static final String OUTSIDE = "Probability";

    @Test
    void outcomesHoldThePlansNumbers() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(ErrorBudgetSheet.NAME);
            for (ChannelPlan channel : PLAN.channels()) {
                for (Assessment each : channel.solved().map(SolvedChannel::assessments).orElse(List.of())) {
                    XSSFRow row = Cells.line(sheet, channel.channel().name(), each.outcome().words());
                    checkLimitsAndCombined(row, each);
                    ChannelStudy study = PLAN.study().orElseThrow().channel(channel.channel().name()).orElseThrow();
                    checkPropagated(row, study, study.outcome(each.outcome()).orElseThrow());
                }
            }
        }
    }

    static void checkLimitsAndCombined(XSSFRow row, Assessment each) {
        close(Cells.at(row, "Allowed", "From"), each.allowed().min());
        close(Cells.at(row, "Allowed", "To"), each.allowed().max());
        close(Cells.at(row, "", "Nominal"), each.nominal());
        close(Cells.at(row, LIMITS, "Lowest"), each.limits().min());
        close(Cells.at(row, LIMITS, "Highest"), each.limits().max());
        says(Cells.at(row, LIMITS, "Inside"), each.insideByLimits());
        close(Cells.at(row, COMBINED, "y, A"), each.combined().estimate());
        close(Cells.at(row, COMBINED, "u, A"), each.combined().standard());
        close(Cells.at(row, COMBINED, "k"), each.combined().coverageFactor());
        close(Cells.at(row, COMBINED, "U = k·u"), each.combined().expanded());
        close(Cells.at(row, COMBINED, "y − U"), each.combined().interval().min());
        close(Cells.at(row, COMBINED, "y + U"), each.combined().interval().max());
        says(Cells.at(row, COMBINED, "Inside"), each.allowed().contains(each.combined().interval()));
        if (Double.isInfinite(each.combined().degreesOfFreedom())) {
            assertThat(Cells.at(row, COMBINED, "Degrees").getStringCellValue()).isEqualTo("∞");
        } else {
            close(Cells.at(row, COMBINED, "Degrees"), each.combined().degreesOfFreedom());
        }
    }

    static void checkPropagated(XSSFRow row, ChannelStudy study, Propagated each) {
        Sampled sampled = each.sampled();
        close(Cells.at(row, PROPAGATED, "Mean"), sampled.mean());
        close(Cells.at(row, PROPAGATED, "Standard deviation"), sampled.standard());
        close(Cells.at(row, PROPAGATED, "Trials"), (double) sampled.trials());
        close(Cells.at(row, PROPAGATED, "of them without"), (double) sampled.runaways());
        says(Cells.at(row, PROPAGATED, "Settled"), study.settled());
        Range symmetric = sampled.symmetric().range();
        close(Cells.at(row, SYMMETRIC, "From"), symmetric.min());
        close(Cells.at(row, SYMMETRIC, "To"), symmetric.max());
        close(Cells.at(row, SYMMETRIC, "± of lower"), sampled.symmetric().standardErrors().low());
        close(Cells.at(row, SYMMETRIC, "± of upper"), sampled.symmetric().standardErrors().high());
        says(Cells.at(row, SYMMETRIC, "Inside"), each.inside());
        close(Cells.at(row, SHORTEST, "From"), sampled.shortest().range().min());
        close(Cells.at(row, SHORTEST, "To"), sampled.shortest().range().max());
        close(Cells.at(row, SHORTEST, "± of lower"), sampled.shortest().standardErrors().low());
        close(Cells.at(row, SHORTEST, "± of upper"), sampled.shortest().standardErrors().high());
        close(Cells.at(row, OUTSIDE, "95 % from"), sampled.outside().interval().min());
        close(Cells.at(row, OUTSIDE, "95 % to"), sampled.outside().interval().max());
        close(Cells.at(row, OUTSIDE, "Trials"), (double) sampled.outside().trials());
        assertThat(Cells.at(row, OUTSIDE, "Method").getStringCellValue()).isEqualTo(sampled.outside().method().word());
        close(Cells.at(row, "JCGM", "δ"), each.validation().tolerance());
        says(Cells.at(row, "JCGM", "Combined is valid"), each.validation().valid());
    }

    @Test
    void noProbabilityIsZeroOrOne() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(ErrorBudgetSheet.NAME);
            int numbers = 0;
            for (Row each : sheet) {
                if (each.getRowNum() <= sheet.getRepeatingRows().getLastRow()) {
                    continue;
                }
                XSSFCell cell = Cells.at((XSSFRow) each, OUTSIDE, "Estimate");
                if (cell.getCellType() == CellType.NUMERIC) {
                    assertThat(cell.getNumericCellValue()).isGreaterThan(0).isLessThan(1);
                    numbers++;
                }
            }
            assertThat(numbers).isPositive();
            assertThat(outside(sheet, "Pump", "trip current").getStringCellValue()).isEqualTo("below 3.7e-6 (95 %)");
            assertThat(outside(sheet, "Pump", "any of these").getStringCellValue()).isEqualTo("below 3.7e-6 (95 %)");
            assertThat(outside(sheet, "Latch", "trip current").getStringCellValue()).startsWith("above 1 - 3.");
            close(outside(sheet, "=DAC", "any of these"), 2.5e-8);
        }
    }

    private static XSSFCell outside(XSSFSheet sheet, String channel, String outcome) {
        return Cells.at(Cells.line(sheet, channel, outcome), OUTSIDE, "Estimate");
    }

    @Test
    void readingsStandBesideWhatTheyWereBeforeCalibration() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(ErrorBudgetSheet.NAME);
            for (Assessment each : PLAN.channels().getFirst().solved().orElseThrow().uncalibrated()) {
                XSSFRow before = Cells.line(sheet, "Pump", each.outcome().words() + ", before calibration");
                checkLimitsAndCombined(before, each);
                assertThat(before.getRowNum())
                        .isEqualTo(Cells.line(sheet, "Pump", each.outcome().words()).getRowNum() + 1);
                assertThat(Cells.at(before, PROPAGATED, "Mean").getStringCellValue()).isEqualTo("not sampled");
            }
        }
    }

    @Test
    void withoutAStudyItSaysNotSampled() throws IOException {
        try (XSSFWorkbook book = Cells.open(PlanFixtures.unsampled())) {
            XSSFRow row = Cells.line(book.getSheet(ErrorBudgetSheet.NAME), "Pump", "trip current");
            for (String each : List.of(PROPAGATED + "/Mean", SYMMETRIC + "/From", SHORTEST + "/From",
                    OUTSIDE + "/Estimate", "JCGM/δ")) {
                String[] place = each.split("/", -1);
                assertThat(Cells.at(row, place[0], place[1]).getStringCellValue()).as(each).isEqualTo("not sampled");
            }
            assertThat(Cells.at(row, SYMMETRIC, "Inside").getCellType()).isEqualTo(CellType.BLANK);
            close(Cells.at(row, COMBINED, "U = k·u"),
                    PLAN.channels().getFirst().solved().orElseThrow().trip().combined().expanded());
            XSSFRow input = Cells.line(book.getSheet(BudgetInputsSheet.NAME), "Pump", "trip current",
                    "shunt tolerance");
            assertThat(Cells.at(input, "Effect", "First-order").getStringCellValue()).isEqualTo("not sampled");
            assertThat(book.getSheet(YieldSheet.NAME)).isNull();
        }
    }

    @Test
    void trialsWithoutAnyValueLeaveNoErrorsInCells() throws IOException {
        try (XSSFWorkbook book = Cells.open(PlanFixtures.allRanAway())) {
            XSSFRow row = Cells.line(book.getSheet(ErrorBudgetSheet.NAME), "Pump", "trip current");
            assertThat(Cells.at(row, PROPAGATED, "Mean").getStringCellValue()).isEqualTo("NaN");
            says(Cells.at(row, SYMMETRIC, "Inside"), false);
            says(Cells.at(row, "JCGM", "Combined is valid"), false);
            assertThat(Cells.row(book.getSheet(YieldSheet.NAME), "Board yield, %").getCell(1).getStringCellValue())
                    .isEqualTo("below 3.7e-6 (95 %)");
        }
    }

    @Test
    void inputsHoldThePlansNumbersInItsOrder() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet sheet = book.getSheet(BudgetInputsSheet.NAME);
            for (ChannelPlan channel : PLAN.channels()) {
                for (Assessment each : channel.solved().map(SolvedChannel::assessments).orElse(List.of())) {
                    SolvedChannel solved = channel.solved().orElseThrow();
                    XSSFRow sum = Cells.line(sheet, channel.channel().name(), each.outcome().words(),
                            BudgetInputsSheet.ALL);
                    Propagated propagated = PLAN.study().orElseThrow().channel(channel.channel().name())
                            .flatMap(it -> it.outcome(each.outcome())).orElseThrow();
                    checkInputs(sum, each, solved.demand().tripTarget(), propagated.effects());
                }
            }
        }
    }

    /** Hand-made effects are in the order of the budget. */
    private static void checkInputs(XSSFRow sum, Assessment assessment, double target, List<EffectIndex> effects) {
        XSSFSheet sheet = sum.getSheet();
        double low = 0;
        for (int index = 0; index < assessment.budget().size(); index++) {
            BudgetLine line = assessment.budget().get(index);
            XSSFRow row = sheet.getRow(sum.getRowNum() + 1 + index);
            assertThat(row.getCell(2).getStringCellValue()).isEqualTo(line.input().slot().words());
            assertThat(Cells.at(row, "", "Owner").getStringCellValue()).startsWith(line.input().owner().name());
            assertThat(Cells.at(row, "", "Distribution").getStringCellValue())
                    .startsWith(line.input().distribution().word());
            close(Cells.at(row, "Contribution", "Lowest moves"), line.towardsLow());
            close(Cells.at(row, "Contribution", "Lowest, %"), 100 * line.towardsLow() / target);
            close(Cells.at(row, "Contribution", "Highest, %"), 100 * line.towardsHigh() / target);
            close(Cells.at(row, "Part", "Sensitivity"), line.sensitivity());
            close(Cells.at(row, "Part", "Its u"), line.standard());
            close(Cells.at(row, "Part", "Share"), 100 * line.varianceShare());
            low += line.towardsLow();
            if (effects.isEmpty()) {
                assertThat(Cells.at(row, "Effect", "Total").getStringCellValue()).isEqualTo("not worked out");
            } else {
                close(Cells.at(row, "Effect", "First-order"), 100 * effects.get(index).first());
                close(Cells.at(row, "Effect", "± of first"), 100 * effects.get(index).firstError());
                close(Cells.at(row, "Effect", "Total"), 100 * effects.get(index).total());
                close(Cells.at(row, "Effect", "± of total"), 100 * effects.get(index).totalError());
            }
        }
        close(Cells.at(sum, "Contribution", "Lowest moves"), low);
        close(Cells.at(sum, "Contribution", "Lowest, %"), 100 * low / target);
        close(Cells.at(sum, "Part", "Its u"), assessment.combined().standard());
        close(Cells.at(sum, "Part", "Share"), 100);
        if (!effects.isEmpty()) {
            close(Cells.at(sum, "Effect", "First-order"), 90);
            close(Cells.at(sum, "Effect", "Total"), 105);
        }
    }

    @Test
    void correlatedInputsKeepThePlansUncertaintyAndOneIndex() throws IOException {
        Plan plan = PlanFixtures.computed();
        Assessment trip = plan.channels().getFirst().solved().orElseThrow().trip();
        double squares = trip.budget().stream().mapToDouble(each -> each.standard() * each.standard()).sum();
        // Each part holds half of its covariances, so that together they are the whole.
        assertThat(Math.sqrt(squares)).isCloseTo(trip.combined().standard(), withinPercentage(1e-6));
        try (XSSFWorkbook book = Cells.open(plan)) {
            checkLimitsAndCombined(Cells.line(book.getSheet(ErrorBudgetSheet.NAME), "Pump", "trip current"), trip);
            XSSFSheet sheet = book.getSheet(BudgetInputsSheet.NAME);
            XSSFRow sum = Cells.line(sheet, "Pump", "trip current", BudgetInputsSheet.ALL);
            assertThat(Cells.at(sum, "Part", "Its u").getCellType()).isEqualTo(CellType.FORMULA);
            assertThat(Cells.at(sum, "Part", "Share").getNumericCellValue()).isCloseTo(100, withinPercentage(1e-6));
            XSSFRow first = Cells.line(sheet, "Pump", "trip current", "shunt tolerance");
            String owner = Cells.at(first, "", "Owner").getStringCellValue();
            assertThat(Cells.at(first, "Effect", "Total").getNumericCellValue()).isPositive();
            XSSFRow second = sheet.getRow(first.getRowNum() + 1);
            assertThat(Cells.at(second, "", "Owner").getStringCellValue()).startsWith("shunt ").isNotEqualTo(owner);
            assertThat(Cells.at(second, "Effect", "Total").getStringCellValue()).isEqualTo("with " + owner);
            assertThat(Cells.at(second, "Effect", "± of total").getCellType()).isEqualTo(CellType.BLANK);
        }
    }

    @Test
    void intervalsAndAnswersFollowChangedContributions() throws IOException {
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            XSSFSheet inputs = book.getSheet(BudgetInputsSheet.NAME);
            Assessment trip = PLAN.channels().getFirst().solved().orElseThrow().trip();
            XSSFRow sum = Cells.line(inputs, "Pump", "trip current", BudgetInputsSheet.ALL);
            for (int index = 1; index <= trip.budget().size(); index++) {
                XSSFCell part = Cells.at(inputs.getRow(sum.getRowNum() + index), "Part", "Its u");
                part.setCellValue(5 * part.getNumericCellValue());
            }
            XSSFFormulaEvaluator evaluator = book.getCreationHelper().createFormulaEvaluator();
            evaluator.clearAllCachedResultValues();
            evaluator.evaluateAll();
            XSSFRow row = Cells.line(book.getSheet(ErrorBudgetSheet.NAME), "Pump", "trip current");
            double expanded = 5 * trip.combined().expanded();
            close(Cells.at(row, COMBINED, "U = k·u"), expanded);
            close(Cells.at(row, COMBINED, "y − U"), trip.combined().estimate() - expanded);
            says(Cells.at(row, COMBINED, "Inside"), false);
            says(Cells.at(row, LIMITS, "Inside"), true);
        }
    }

    private static void says(XSSFCell cell, boolean yes) {
        assertThat(cell.getStringCellValue()).as(cell.getAddress().toString()).isEqualTo(yes ? "yes" : "no");
    }

    private static void close(XSSFCell cell, double expected) {
        assertThat(cell.getNumericCellValue()).as(cell.getAddress().toString()).isCloseTo(expected,
                within(1e-9 * Math.abs(expected)));
    }
}
