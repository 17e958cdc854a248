package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFFormulaEvaluator;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;

import shuntwright.io.fixture.PlanFixtures;
import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;

class PartsSheetTest {

    @Test
    void costPerBoardIsThePlans() throws IOException {
        Plan plan = PlanFixtures.full();
        try (XSSFWorkbook book = Cells.open(plan)) {
            XSSFSheet sheet = book.getSheet(PartsSheet.NAME);
            double cost = Cells.row(sheet, "Parts on a board, EUR").getCell(1).getNumericCellValue();
            assertThat(cost).isCloseTo(plan.costPerBoard(), within(1e-9));
            assertThat(Cells.row(sheet, "Lines without price").getCell(1).getNumericCellValue()).isEqualTo(1);
            assertThat(Cells.at(sheet, "1E3", "Designators").getStringCellValue()).isEqualTo("R1–R3");
        }
    }

    @Test
    void orderAndPriceFollowTheBuildQuantity() throws IOException {
        RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(20260101);
        Plan plan = PlanFixtures.withParts(parts(random));
        try (XSSFWorkbook book = Cells.open(plan)) {
            XSSFSheet sheet = book.getSheet(PartsSheet.NAME);
            XSSFCell build = Cells.row(sheet, "Build quantity, boards").getCell(1);
            XSSFFormulaEvaluator evaluator = book.getCreationHelper().createFormulaEvaluator();
            boolean beyond = false;
            for (int boards : List.of(1, 2, 9, 10, 49, 50, 99, 100, 101, 997, 12_345)) {
                build.setCellValue(boards);
                evaluator.clearAllCachedResultValues();
                double total = 0;
                for (PartUse part : plan.parts()) {
                    Purchase purchase = part.purchase();
                    int needed = part.quantity() * boards;
                    int ordered = purchase.cheapestOrder(needed).quantity();
                    beyond |= ordered > purchase.orderQuantity(needed);
                    assertThat(value(evaluator, sheet, part, "Least order")).isEqualTo(purchase.orderQuantity(needed));
                    assertThat(value(evaluator, sheet, part, "Needed")).isEqualTo(needed);
                    assertThat(value(evaluator, sheet, part, "Order, pieces")).isEqualTo(ordered);
                    assertThat(value(evaluator, sheet, part, "Unit price")).isEqualTo(purchase.unitPriceAt(ordered));
                    assertThat(value(evaluator, sheet, part, "On one board"))
                            .isCloseTo(part.quantity() * purchase.unitPriceAt(needed), within(1e-9));
                    total += ordered * purchase.unitPriceAt(ordered);
                }
                XSSFCell sum = Cells.row(sheet, "Order total, EUR").getCell(1);
                assertThat(evaluator.evaluate(sum).getNumberValue()).isCloseTo(total, within(1e-9 * total));
                XSSFCell perBoard = Cells.row(sheet, "Order per board, EUR").getCell(1);
                assertThat(evaluator.evaluate(perBoard).getNumberValue()).isCloseTo(total / boards,
                        within(1e-9 * total));
            }
            assertThat(beyond).as("some order is larger than needed because of a price break").isTrue();
        }
    }

    @Test
    void theWholeBuildCostsWhatThePlanSays() throws IOException {
        for (Plan plan : List.of(PlanFixtures.full(),
                PlanFixtures.withParts(parts(RandomGeneratorFactory.of("L64X128MixRandom").create(20260102))))) {
            assertThat(plan.board().preference().partNumberCost()).isPositive();
            try (XSSFWorkbook book = Cells.open(plan)) {
                XSSFCell whole = Cells.row(book.getSheet(PartsSheet.NAME), "Whole build, EUR").getCell(1);
                assertThat(whole.getNumericCellValue()).isCloseTo(plan.buildCost(), within(1e-9 * plan.buildCost()));
            }
        }
    }

    /** Worked by hand: 100 for 0.50 and 250 for 0.30 (as a reel of 250), so from 151 pieces the reel of 75.00 is cheaper. */
    @Test
    void moreIsOrderedThanNeededWhereABreakMakesThatCheaper() throws IOException {
        Purchase purchase = new Purchase("0805",
                List.of(new PriceBreak(1, 0.8), new PriceBreak(100, 0.5), new PriceBreak(250, 0.3)), 1, 1, "", "");
        Plan plan = PlanFixtures
                .withParts(List.of(new PartUse("P-1", "part", 1, List.of("R1"), List.of("R1"), purchase)));
        try (XSSFWorkbook book = Cells.open(plan)) {
            XSSFSheet sheet = book.getSheet(PartsSheet.NAME);
            assertOrder(book, sheet, 62, 62, 49.6);
            assertOrder(book, sheet, 63, 100, 50);
            assertOrder(book, sheet, 100, 100, 50);
            assertOrder(book, sheet, 150, 150, 75);
            assertOrder(book, sheet, 151, 250, 75);
            assertOrder(book, sheet, 251, 251, 75.3);
        }
    }

    private static void assertOrder(XSSFWorkbook book, XSSFSheet sheet, int boards, int pieces, double cost) {
        Cells.row(sheet, "Build quantity, boards").getCell(1).setCellValue(boards);
        XSSFFormulaEvaluator evaluator = book.getCreationHelper().createFormulaEvaluator();
        evaluator.clearAllCachedResultValues();
        assertThat(evaluator.evaluate(Cells.at(sheet, "P-1", "Order, pieces")).getNumberValue()).isEqualTo(pieces);
        assertThat(evaluator.evaluate(Cells.at(sheet, "P-1", "Extended")).getNumberValue()).isCloseTo(cost,
                within(1e-9));
    }

    @Test
    void attritionRoundsUpToWholePieces() throws IOException {
        try (XSSFWorkbook book = Cells.open(PlanFixtures.full())) {
            XSSFSheet sheet = book.getSheet(PartsSheet.NAME);
            Cells.row(sheet, "Attrition, % of pieces").getCell(1).setCellValue(0.05);
            Cells.row(sheet, "Build quantity, boards").getCell(1).setCellValue(100);
            XSSFFormulaEvaluator evaluator = book.getCreationHelper().createFormulaEvaluator();
            evaluator.clearAllCachedResultValues();
            assertThat(evaluator.evaluate(Cells.at(sheet, "4E7", "Needed")).getNumberValue()).isEqualTo(105);
            assertThat(evaluator.evaluate(Cells.at(sheet, "1E3", "Needed")).getNumberValue()).isEqualTo(315);
        }
    }

    private static double value(XSSFFormulaEvaluator evaluator, XSSFSheet sheet, PartUse part, String header) {
        return evaluator.evaluate(Cells.at(sheet, part.partNumber(), header)).getNumberValue();
    }

    private static List<PartUse> parts(RandomGenerator random) {
        List<PartUse> parts = new ArrayList<>();
        for (int index = 0; index < 20; index++) {
            List<PriceBreak> prices = new ArrayList<>();
            int from = 1;
            for (int each = random.nextInt(1, 9); each > 0; each--) {
                prices.add(new PriceBreak(from, random.nextDouble(0.01, 5)));
                from += random.nextInt(1, 300);
            }
            int quantity = random.nextInt(1, 8);
            List<String> designators = new ArrayList<>();
            for (int piece = 1; piece <= quantity; piece++) {
                designators.add("R" + (100 * index + piece));
            }
            parts.add(new PartUse("P-" + index, "part", quantity, designators, designators,
                    new Purchase("0805", prices, random.nextInt(1, 60), random.nextInt(1, 500), "", "active")));
        }
        return parts;
    }
}
