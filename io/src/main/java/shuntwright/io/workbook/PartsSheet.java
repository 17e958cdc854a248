package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;

import org.apache.poi.ss.usermodel.Name;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;

/**
 * The consolidated parts list: one line for each part number, computed from the build quantity by live formulas. Orders are the
 * cheapest that cover what is needed.
 */
final class PartsSheet {

    static final String NAME = "Parts list";
    static final String BUILD_QUANTITY = "BuildQuantity";
    static final String ATTRITION = "Attrition";

    /**
     * A line of the list.
     *
     * @param part what is listed
     * @param line from 0
     */
    private record Line(PartUse part, int line) {}

    private final Plan plan;
    private final Column<Line> needed = Column.live("Needed, pieces", 9, Style.COUNT,
            (row, cells) -> new Column.Content.Formula(
                    "ROUNDUP(ROUND(" + cells.at(quantity()) + "*BuildQuantity*(1+Attrition),6),0)"));
    private final Column<Line> quantity = Column.number("Pieces per board", 8, Style.COUNT,
            row -> row.part().quantity());
    private final Column<Line> minimum = Column.live("Minimum order, pieces", 10, Style.COUNT,
            (row, _) -> new Column.Content.Formula(PricesSheet.minimum(row.line())));
    private final Column<Line> pack = Column.live("Pack, pieces", 8, Style.COUNT,
            (row, _) -> new Column.Content.Formula(PricesSheet.pack(row.line())));
    private final Column<Line> least = Column.live("Least order, pieces", 9, Style.COUNT, this::leastOrder);
    private final Column<Line> order = Column.live("Order, pieces", 9, Style.COUNT, this::cheapestOrder);
    private final Column<Line> unitPrice;
    private final Column<Line> extended;
    private final Column<Line> onBoard;

    private PartsSheet(Plan plan) {
        this.plan = plan;
        String currency = plan.currency();
        unitPrice = Column.live("Unit price reached, " + currency, 11, Style.UNIT_PRICE,
                (row, cells) -> new Column.Content.Formula(price(row, cells.at(order))));
        extended = Column.live("Extended price, " + currency, 13, Style.MONEY, (row, cells) -> {
            String price = cells.at(unitPrice);
            return new Column.Content.Formula("IF(" + price + "=\"\",\"\"," + cells.at(order) + "*" + price + ")");
        });
        onBoard = Column.live("On one board, at needed pieces' price, " + currency, 13, Style.UNIT_PRICE,
                (row, cells) -> {
                    String there = "COUNT(" + PricesSheet.quantities(plan, row.line()) + ")=0";
                    return new Column.Content.Formula("IF(" + there + ",\"\"," + cells.at(quantity) + "*"
                            + lookup(row, "MAX(1," + cells.at(needed) + ")") + ")");
                });
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        new PartsSheet(plan).write(book, look);
    }

    private Column<Line> quantity() {
        return quantity;
    }

    private void write(XSSFWorkbook book, Look look) {
        List<Column<Line>> columns = List.of(
                Column.text("", "Part number", 19, row -> row.part().partNumber()),
                Column.wrapped("Description", 30, row -> row.part().description()),
                Column.wrapped("Body", 13, row -> row.part().purchase().body()), quantity,
                Column.wrapped("Designators", 20, row -> Designators.fold(row.part().designators())), needed, minimum,
                pack, least, order, unitPrice, extended, onBoard,
                Column.wrapped("Supplier", 14, row -> row.part().purchase().supplier()),
                Column.wrapped("Lifecycle", 13, row -> row.part().purchase().lifecycle()));
        TableSheet<Line> table = new TableSheet<>(book.createSheet(NAME), look, "Parts list: " + plan.board().name(),
                columns, 9);
        int rows = plan.parts().size();
        String currency = plan.currency();
        name(book, BUILD_QUANTITY, table.above(0, "Build quantity, boards",
                new Column.Content.Figure(plan.board().buildQuantity()), Style.INPUT_COUNT));
        name(book, ATTRITION, table.above(1, "Attrition, % of pieces", new Column.Content.Figure(0),
                Style.INPUT_SHARE));
        XSSFCell total = table.above(2, "Order total, " + currency,
                new Column.Content.Formula("SUM(" + table.span(extended, rows) + ")"), Style.TOTAL_MONEY);
        table.above(3, "Order per board, " + currency,
                new Column.Content.Formula(total.getAddress().formatAsString() + "/" + BUILD_QUANTITY),
                Style.TOTAL_MONEY);
        table.above(4, "Parts on a board, " + currency,
                new Column.Content.Formula("SUM(" + table.span(onBoard, rows) + ")"), Style.TOTAL_MONEY);
        XSSFCell number = table.above(5, "Each part number costs, " + currency,
                new Column.Content.Figure(plan.board().preference().partNumberCost()), Style.INPUT_MONEY);
        table.above(6, "Whole build, " + currency, new Column.Content.Formula(total.getAddress().formatAsString() + "+"
                + rows + "*" + number.getAddress().formatAsString()), Style.TOTAL_MONEY);
        table.above(7, "Lines without price", new Column.Content.Formula(
                rows + "-COUNT(" + table.span(unitPrice, rows) + ")"), Style.TOTAL_COUNT);
        List<Line> lines = new ArrayList<>();
        for (PartUse each : plan.parts()) {
            lines.add(new Line(each, lines.size()));
        }
        table.add(lines);
    }

    /** Whole packs, at least the minimum order. */
    private Column.Content leastOrder(Line row, Column.Cells<Line> cells) {
        String pieces = cells.at(needed);
        String packs = cells.at(pack);
        return new Column.Content.Formula("IF(" + pieces + "<=0,0,ROUNDUP(MAX(" + pieces + "," + cells.at(minimum)
                + ")/" + packs + ",0)*" + packs + ")");
    }

    /** That, or more where a price break makes more cheaper. */
    private Column.Content cheapestOrder(Line row, Column.Cells<Line> cells) {
        String pieces = cells.at(least);
        String quantities = PricesSheet.quantities(plan, row.line());
        String reached = "MATCH(" + pieces + "," + quantities + ")";
        return new Column.Content.Formula("IF(" + pieces + "<=0,0,IF(COUNT(" + quantities + ")=0," + pieces + ",IF("
                + reached + ">=COUNT(" + quantities + ")," + pieces + ",IF(INDEX("
                + PricesSheet.reachingCosts(plan, row.line()) + "," + reached + ")<" + pieces + "*"
                + lookup(row, pieces) + ",INDEX(" + PricesSheet.reachingPieces(plan, row.line()) + "," + reached + "),"
                + pieces + "))))");
    }

    private String price(Line row, String ordered) {
        String quantities = PricesSheet.quantities(plan, row.line());
        return "IF(OR(COUNT(" + quantities + ")=0," + ordered + "<=0),\"\"," + lookup(row, ordered) + ")";
    }

    private String lookup(Line row, String pieces) {
        return "LOOKUP(" + pieces + "," + PricesSheet.quantities(plan, row.line()) + ","
                + PricesSheet.prices(plan, row.line()) + ")";
    }

    private static void name(XSSFWorkbook book, String name, XSSFCell cell) {
        Name made = book.createName();
        made.setNameName(name);
        made.setRefersToFormula("'" + NAME + "'!$B$" + (cell.getRowIndex() + 1));
    }
}
