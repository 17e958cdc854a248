package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;

import org.apache.poi.ss.util.CellReference;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.parts.PriceBreak;
import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;

/** Price breaks, one line for each line of the parts list. */
final class PricesSheet {

    static final String NAME = "Prices";
    /** Breaks for which there is room even when no part has so many. */
    private static final int LEAST_BREAKS = 6;
    /** Row of the first part, from 1: title, a blank row, groups, headers. */
    private static final int FIRST_ROW = 5;

    private PricesSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        int breaks = breaks(plan);
        List<Column<PartUse>> columns = new ArrayList<>();
        columns.add(Column.text("", "Part number", 22, PartUse::partNumber));
        for (int index = 0; index < breaks; index++) {
            int at = index;
            columns.add(new Column<>("From order quantity, pieces", "Break " + (at + 1), 10, Style.COUNT,
                    (part, _) -> part.purchase().prices().size() > at
                            ? new Column.Content.Figure(price(part, at).quantity())
                            : new Column.Content.Empty()));
        }
        for (int index = 0; index < breaks; index++) {
            int at = index;
            columns.add(new Column<>("Unit price, " + plan.currency(), "Break " + (at + 1), 10, Style.UNIT_PRICE,
                    (part, _) -> part.purchase().prices().size() > at
                            ? new Column.Content.Figure(price(part, at).unitPrice())
                            : new Column.Content.Empty()));
        }
        new TableSheet<>(book.createSheet(NAME), look, "Price breaks", columns, 1).add(plan.parts());
    }

    /** Order quantities of the breaks of a line of the parts list, as an address. */
    static String quantities(Plan plan, int line) {
        return span(1, breaks(plan), line);
    }

    /** Unit prices of the same breaks. */
    static String prices(Plan plan, int line) {
        return span(1 + breaks(plan), breaks(plan), line);
    }

    private static String span(int column, int width, int line) {
        String row = "$" + (FIRST_ROW + line);
        return NAME + "!$" + CellReference.convertNumToColString(column) + row + ":$"
                + CellReference.convertNumToColString(column + width - 1) + row;
    }

    private static PriceBreak price(PartUse part, int index) {
        return part.purchase().prices().get(index);
    }

    private static int breaks(Plan plan) {
        return Math.max(LEAST_BREAKS,
                plan.parts().stream().mapToInt(each -> each.purchase().prices().size()).max().orElse(0));
    }
}
