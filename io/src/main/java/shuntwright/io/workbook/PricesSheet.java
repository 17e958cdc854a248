package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

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

    private static final Column<PartUse> MINIMUM = Column.number("Minimum order, pieces", 10, Style.COUNT,
            part -> part.purchase().minimumOrder());
    private static final Column<PartUse> PACK = Column.number("Pack, pieces", 8, Style.COUNT,
            part -> part.purchase().packSize());
    /** Columns before the breaks: part number, minimum order, pack. */
    private static final int BEFORE = 3;

    /**
     * Formulas for the cheapest order that reaches a break or a later one.
     *
     * @param quantities columns of all breaks
     * @param prices     columns of their prices
     * @param index      of the break
     * @param nextPieces the same for the break after it; empty for the last
     * @param nextCost   its cost
     */
    private record Reach(List<Column<PartUse>> quantities, List<Column<PartUse>> prices, int index,
            Optional<Column<PartUse>> nextPieces, Optional<Column<PartUse>> nextCost) {

        Reach {
            quantities = List.copyOf(quantities);
            prices = List.copyOf(prices);
        }

        /** Of equally cheap orders the smallest. */
        String pieces(Column.Cells<PartUse> cells) {
            String best = nextPieces.isPresent()
                    ? "IF(OR(" + cells.at(nextPieces.get()) + "=\"\"," + costHere(cells) + "<="
                            + cells.at(nextCost.orElseThrow()) + ")," + order(cells) + "," + cells.at(nextPieces.get())
                            + ")"
                    : order(cells);
            return ifThere(cells, best);
        }

        String cost(Column.Cells<PartUse> cells) {
            return ifThere(cells, nextCost.isPresent()
                    ? "MIN(" + costHere(cells) + "," + cells.at(nextCost.get()) + ")"
                    : costHere(cells));
        }

        private String ifThere(Column.Cells<PartUse> cells, String formula) {
            return "IF(" + cells.at(quantities.get(index)) + "=\"\",\"\"," + formula + ")";
        }

        private String order(Column.Cells<PartUse> cells) {
            return "ROUNDUP(MAX(" + cells.at(quantities.get(index)) + "," + cells.at(MINIMUM) + ")/" + cells.at(PACK)
                    + ",0)*" + cells.at(PACK);
        }

        private String costHere(Column.Cells<PartUse> cells) {
            return order(cells) + "*LOOKUP(" + order(cells) + "," + all(cells, quantities) + "," + all(cells, prices)
                    + ")";
        }

        private static String all(Column.Cells<PartUse> cells, List<Column<PartUse>> columns) {
            return cells.at(columns.getFirst()) + ":" + cells.at(columns.getLast());
        }
    }

    private PricesSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        int breaks = breaks(plan);
        List<Column<PartUse>> quantities = new ArrayList<>();
        List<Column<PartUse>> prices = new ArrayList<>();
        for (int index = 0; index < breaks; index++) {
            int at = index;
            quantities.add(new Column<>("From order quantity, pieces", "Break " + (at + 1), 10, Style.COUNT,
                    (part, _) -> part.purchase().prices().size() > at
                            ? new Column.Content.Figure(price(part, at).quantity())
                            : new Column.Content.Empty()));
            prices.add(new Column<>("Unit price, " + plan.currency(), "Break " + (at + 1), 10, Style.UNIT_PRICE,
                    (part, _) -> part.purchase().prices().size() > at
                            ? new Column.Content.Figure(price(part, at).unitPrice())
                            : new Column.Content.Empty()));
        }
        List<Column<PartUse>> columns = new ArrayList<>();
        columns.add(Column.text("", "Part number", 22, PartUse::partNumber));
        columns.add(MINIMUM);
        columns.add(PACK);
        columns.addAll(quantities);
        columns.addAll(prices);
        List<Column<PartUse>> pieces = new ArrayList<>();
        List<Column<PartUse>> costs = new ArrayList<>();
        for (int index = breaks - 1; index > 0; index--) {
            Reach reach = new Reach(quantities, prices, index, pieces.stream().findFirst(), costs.stream().findFirst());
            String header = "Break " + (index + 1);
            pieces.addFirst(new Column<>("Cheapest order from this break on, pieces", header, 10, Style.COUNT,
                    (_, cells) -> new Column.Content.Formula(reach.pieces(cells))));
            costs.addFirst(new Column<>("Its cost, " + plan.currency(), header, 12, Style.MONEY,
                    (_, cells) -> new Column.Content.Formula(reach.cost(cells))));
        }
        columns.addAll(pieces);
        columns.addAll(costs);
        TableSheet<PartUse> table = new TableSheet<>(book.createSheet(NAME), look, "Price breaks", columns, 1);
        table.keep(1, 2);
        table.add(plan.parts());
    }

    /** Smallest order of a line of the parts list, as an address. */
    static String minimum(int line) {
        return span(1, 1, line);
    }

    /** Pieces in a pack. */
    static String pack(int line) {
        return span(2, 1, line);
    }

    /** Order quantities of the breaks of a line of the parts list, as an address. */
    static String quantities(Plan plan, int line) {
        return span(BEFORE, breaks(plan), line);
    }

    /** Unit prices of the same breaks. */
    static String prices(Plan plan, int line) {
        return span(BEFORE + breaks(plan), breaks(plan), line);
    }

    /** Cheapest order from each break but the first on, pieces. */
    static String reachingPieces(Plan plan, int line) {
        return span(BEFORE + 2 * breaks(plan), breaks(plan) - 1, line);
    }

    /** Its cost. */
    static String reachingCosts(Plan plan, int line) {
        return span(BEFORE + 3 * breaks(plan) - 1, breaks(plan) - 1, line);
    }

    private static String span(int column, int width, int line) {
        String row = "$" + (FIRST_ROW + line);
        String first = NAME + "!$" + CellReference.convertNumToColString(column) + row;
        return width == 1 ? first : first + ":$" + CellReference.convertNumToColString(column + width - 1) + row;
    }

    private static PriceBreak price(PartUse part, int index) {
        return part.purchase().prices().get(index);
    }

    private static int breaks(Plan plan) {
        return Math.max(LEAST_BREAKS,
                plan.parts().stream().mapToInt(each -> each.purchase().prices().size()).max().orElse(0));
    }
}
