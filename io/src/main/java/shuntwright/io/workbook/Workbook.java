package shuntwright.io.workbook;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.time.Instant;
import java.util.Date;
import java.util.Optional;

import org.apache.poi.ooxml.POIXMLProperties;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.plan.Plan;

/**
 * Writes plans as .xlsx workbooks: parts list, settings, findings, board-wide choice, error budget, what is shared, assumptions and cautions. Formulas
 * carry their results, and spreadsheets compute them anew on opening. The same plan gives the same bytes.
 */
public final class Workbook {

    /** Stands where the format wants a time of making, so that the clock stays out of the file. */
    private static final Optional<Date> NO_TIME = Optional.of(Date.from(Instant.parse("1980-01-01T00:00:00Z")));

    private Workbook() {
    }

    /**
     * Writes the workbook and leaves the stream open.
     *
     * @throws IOException when the stream cannot be written to
     */
    public static void write(Plan plan, OutputStream out) throws IOException {
        out.write(bytes(plan));
    }

    /**
     * The whole file.
     *
     * @throws IOException when the workbook cannot be packed
     */
    public static byte[] bytes(Plan plan) throws IOException {
        ByteArrayOutputStream buffer = new ByteArrayOutputStream();
        try (XSSFWorkbook book = new XSSFWorkbook()) {
            Look look = new Look(book);
            // Formulas may name only sheets that exist, so the prices come first and are then moved.
            PricesSheet.add(book, look, plan);
            PartsSheet.add(book, look, plan);
            SettingsSheet.add(book, look, plan);
            FindingsSheet.add(book, look, plan);
            ChoiceSheet.add(book, look, plan);
            CuresSheet.add(book, look, plan);
            ErrorBudgetSheet.add(book, look, plan);
            YieldSheet.add(book, look, plan);
            SharedSheet.add(book, look, plan);
            book.setSheetOrder(PricesSheet.NAME, book.getNumberOfSheets() - 1);
            AssumptionsSheet.add(book, look, plan);
            book.setActiveSheet(0);
            book.setSelectedTab(0);
            book.getCreationHelper().createFormulaEvaluator().evaluateAll();
            book.setForceFormulaRecalculation(true);
            describe(book.getProperties(), plan);
            book.write(buffer);
        }
        return FixedZip.of(buffer.toByteArray());
    }

    private static void describe(POIXMLProperties properties, Plan plan) {
        properties.getCoreProperties().setTitle(SafeText.cell(plan.board().name()));
        properties.getCoreProperties().setCreator("Shuntwright");
        properties.getCoreProperties().setCreated(NO_TIME);
        properties.getCoreProperties().setModified(NO_TIME);
        properties.getExtendedProperties().setApplication("Shuntwright");
    }
}
