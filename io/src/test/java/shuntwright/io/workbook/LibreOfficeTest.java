package shuntwright.io.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.regex.Pattern;

import org.apache.poi.openxml4j.exceptions.InvalidFormatException;
import org.apache.poi.xssf.usermodel.XSSFRow;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import shuntwright.accuracy.Assessment;
import shuntwright.io.fixture.PlanFixtures;
import shuntwright.parts.Purchase;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.sampling.ChannelStudy;

/** Lets another spreadsheet program compute the workbook; runs only where LibreOffice is on the path. */
class LibreOfficeTest {

    private static final Plan PLAN = PlanFixtures.full();
    /** No whole packs, and few enough that for one part more is ordered than needed because of a price break. */
    private static final int BOARDS = 907;
    private static final double FACTOR = 40;
    /** A profile that computes every formula on opening instead of showing stored results. */
    private static final String ALWAYS_COMPUTE = """
            <?xml version="1.0" encoding="UTF-8"?>
            <oor:items xmlns:oor="http://openoffice.org/2001/registry">
            <item oor:path="/org.openoffice.Office.Calc/Formula/Load">
            <prop oor:name="OOXMLRecalcMode" oor:op="fuse"><value>0</value></prop>
            </item>
            </oor:items>
            """;

    @Test
    void computesWhatThePlanSays(@TempDir Path room) throws IOException, InterruptedException {
        assumeTrue(onPath("soffice"), "soffice is not on the path");
        Path changed = room.resolve("changed.xlsx");
        try (XSSFWorkbook book = Cells.open(PLAN)) {
            // The cached results now belong to another build quantity, so only a fresh computation gives the right ones.
            Cells.row(book.getSheet(PartsSheet.NAME), "Build quantity, boards").getCell(1).setCellValue(BOARDS);
            Cells.at(Cells.line(book.getSheet(ErrorBudgetSheet.NAME), "Latch", "trip current"), "Combined", "k")
                    .setCellValue(FACTOR);
            try (var out = Files.newOutputStream(changed)) {
                book.write(out);
            }
        }
        Path user = Files.createDirectories(room.resolve("profile/user"));
        Files.writeString(user.resolve("registrymodifications.xcu"), ALWAYS_COMPUTE);
        Path computed = Files.createDirectory(room.resolve("computed"));
        Process office = new ProcessBuilder("soffice", "-env:UserInstallation=" + room.resolve("profile").toUri(),
                "--headless", "--convert-to", "xlsx", "--outdir", computed.toString(), changed.toString())
                .redirectErrorStream(true).redirectOutput(room.resolve("office.log").toFile()).start();
        if (!office.waitFor(180, TimeUnit.SECONDS)) {
            office.destroyForcibly();
            throw new AssertionError("soffice took more than 180 s");
        }
        try (XSSFWorkbook book = new XSSFWorkbook(computed.resolve("changed.xlsx").toFile())) {
            checkParts(book.getSheet(PartsSheet.NAME));
            XSSFSheet settings = book.getSheet(SettingsSheet.NAME);
            for (ChannelPlan each : PLAN.channels()) {
                if (each.solved().isPresent()) {
                    double trip = each.solved().get().trip().nominal();
                    assertThat(Cells.at(settings, each.channel().name(), "Trip current", "Trip nominal")
                            .getNumericCellValue()).isCloseTo(trip, within(1e-9 * trip));
                }
            }
            checkBudgets(book);
            assertThat(Cells.at(book.getSheet(ChoiceSheet.NAME), "least cost", "Distance").getNumericCellValue())
                    .isCloseTo(2, within(1e-9));
        } catch (InvalidFormatException unreadable) {
            throw new AssertionError("LibreOffice wrote what cannot be read", unreadable);
        }
    }

    private static void checkParts(XSSFSheet sheet) {
        double total = 0;
        boolean beyond = false;
        for (PartUse part : PLAN.parts()) {
            Purchase purchase = part.purchase();
            int ordered = purchase.cheapestOrder(part.quantity() * BOARDS).quantity();
            beyond |= ordered > purchase.orderQuantity(part.quantity() * BOARDS);
            assertThat(Cells.at(sheet, part.partNumber(), "Order, pieces").getNumericCellValue()).isEqualTo(ordered);
            if (!purchase.prices().isEmpty()) {
                assertThat(Cells.at(sheet, part.partNumber(), "Unit price").getNumericCellValue())
                        .isEqualTo(purchase.unitPriceAt(ordered));
            }
            total += ordered * purchase.unitPriceAt(ordered);
        }
        assertThat(beyond).isTrue();
        assertThat(Cells.row(sheet, "Order total, EUR").getCell(1).getNumericCellValue()).isCloseTo(total,
                within(1e-6));
        assertThat(Cells.row(sheet, "Whole build, EUR").getCell(1).getNumericCellValue()).isCloseTo(
                total + PLAN.parts().size() * PLAN.board().preference().partNumberCost(), within(1e-6));
        assertThat(Cells.row(sheet, "Lines without price").getCell(1).getNumericCellValue()).isEqualTo(1);
    }

    private static void checkBudgets(XSSFWorkbook book) {
        XSSFSheet outcomes = book.getSheet(ErrorBudgetSheet.NAME);
        XSSFSheet inputs = book.getSheet(BudgetInputsSheet.NAME);
        for (ChannelPlan channel : PLAN.channels()) {
            String name = channel.channel().name();
            for (Assessment each : channel.solved().map(SolvedChannel::assessments).orElse(List.of())) {
                XSSFRow row = Cells.line(outcomes, name, each.outcome().words());
                ChannelStudy study = PLAN.study().orElseThrow().channel(name).orElseThrow();
                if (name.equals("Latch")) {
                    double expanded = FACTOR * each.combined().standard();
                    assertThat(Cells.at(row, "Combined", "y + U").getNumericCellValue())
                            .isCloseTo(each.combined().estimate() + expanded, within(1e-9));
                    assertThat(Cells.at(row, "Combined", "Inside").getStringCellValue()).isEqualTo("no");
                    continue;
                }
                ErrorBudgetSheetTest.checkLimitsAndCombined(row, each);
                ErrorBudgetSheetTest.checkPropagated(row, study, study.outcome(each.outcome()).orElseThrow());
                XSSFRow sum = Cells.line(inputs, name, each.outcome().words(), BudgetInputsSheet.ALL);
                assertThat(Cells.at(sum, "Part", "Share").getNumericCellValue()).isCloseTo(100, within(1e-9));
                XSSFRow first = inputs.getRow(sum.getRowNum() + 1);
                double target = channel.solved().orElseThrow().demand().tripTarget();
                assertThat(Cells.at(first, "Contribution", "Lowest, %").getNumericCellValue())
                        .isCloseTo(100 * each.budget().getFirst().towardsLow() / target, within(1e-9));
            }
        }
        assertThat(Cells.at(book.getSheet(YieldSheet.NAME), "supply", "It costs").getNumericCellValue())
                .isCloseTo(0.1, within(1e-9));
    }

    private static boolean onPath(String program) {
        List<String> folders = List
                .of(System.getenv().getOrDefault("PATH", "").split(Pattern.quote(File.pathSeparator)));
        return folders.stream().filter(each -> !each.isEmpty())
                .anyMatch(each -> Files.isExecutable(Path.of(each, program)));
    }
}
