package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.plan.BoardChoice;
import shuntwright.plan.ChoiceWords;
import shuntwright.plan.Conflict;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;

/** How all channels were chosen together, how good that is, and what cannot be met together; only of plans that were chosen. */
final class ChoiceSheet {

    static final String NAME = "Choice";
    static final String CONFLICT = "Conflict";

    /** @param rank 1 for the objective that decides first */
    private record Line(int rank, Reached reached, String currency) {

        /** In the unit that stands beside it. */
        Column.Content shown(double value) {
            return switch (reached.objective()) {
                case LEAST_HEAT, LEAST_COST, FEWEST_PARTS -> Column.finite(value);
                case MOST_EVEN_HEAT, WIDEST_MARGIN -> Column.finite(100 * value);
            };
        }

        String unit() {
            return switch (reached.objective()) {
                case LEAST_HEAT -> "W";
                case MOST_EVEN_HEAT -> "% of a heat limit";
                case LEAST_COST -> currency + " for the build";
                case FEWEST_PARTS -> "part numbers";
                case WIDEST_MARGIN -> "% of half window";
            };
        }
    }

    private static final Column<Line> VALUE = new Column<>("", "Reached", 14, Style.GENERAL,
            (row, _) -> row.shown(row.reached().value()));
    private static final Column<Line> BOUND = new Column<>("", "Nothing is better than", 14, Style.GENERAL,
            (row, _) -> row.reached().bound().isPresent()
                    ? row.shown(row.reached().bound().getAsDouble())
                    : new Column.Content.Empty());
    private static final List<Column<Line>> COLUMNS = List.of(
            Column.text("", "Wanted", 30, row -> row.reached().objective().word()),
            Column.number("Decides", 9, Style.COUNT, Line::rank), VALUE, BOUND,
            Column.text("", "Unit", 20, Line::unit),
            Column.live("Distance from the bound, %", 13, Style.FINE_PERCENT, ChoiceSheet::distance),
            new Column<>("", "Proof", 44, Style.TEXT, (row, _) -> proof(row.reached())));

    private static final List<Column<Conflict.Member>> MEMBERS = List.of(
            Column.text("", "Demand of", 28, ChoiceWords::owner), Column.text("", "What", 30, Conflict.Member::what),
            Column.maybeNumber("", "Now", 12, Style.GENERAL, Conflict.Member::now),
            Column.maybeNumber("", "Relaxed alone to", 12, Style.GENERAL, Conflict.Member::relaxed),
            Column.text("", "Unit", 9, row -> row.dimension().unit()),
            Column.text("", "Relaxed alone", 36, row -> row.relaxed().isPresent()
                    ? "all others can be met"
                    : "no value was found that would do alone"));

    private ChoiceSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        plan.choice().ifPresent(choice -> {
            write(book, look, choice, plan.currency());
            choice.conflict().ifPresent(conflict -> write(book, look, conflict));
        });
    }

    private static void write(XSSFWorkbook book, Look look, BoardChoice choice, String currency) {
        List<Line> lines = new ArrayList<>();
        for (Reached each : choice.reached()) {
            lines.add(new Line(lines.size() + 1, each, currency));
        }
        TableSheet<Line> table = new TableSheet<>(book.createSheet(NAME), look, "Board-wide choice", COLUMNS, 6);
        label(table, 0, "All channels chosen together for",
                ChoiceWords.order(choice.reached().stream().map(Reached::objective).toList()));
        label(table, 1, "Search", ChoiceWords.search(choice));
        label(table, 2, "Among", ChoiceWords.among(choice));
        table.above(3, "Shared limits broken", choice.broken().isEmpty()
                ? new Column.Content.Marked("none", Style.LABEL)
                : new Column.Content.Marked(String.join(", ", choice.broken()), Style.BAD), Style.LABEL);
        label(table, 4, "Demands in conflict", choice.conflict()
                .map(it -> it.members().size() + ", see the sheet " + CONFLICT).orElse("none"));
        table.add(lines);
    }

    private static void write(XSSFWorkbook book, Look look, Conflict conflict) {
        TableSheet<Conflict.Member> table = new TableSheet<>(book.createSheet(CONFLICT), look,
                "Demands that cannot be met together", MEMBERS, 3);
        label(table, 0, "Conflict", conflict.words());
        label(table, 1, "All of them needed", ChoiceWords.minimal(conflict));
        table.add(conflict.members());
    }

    private static <T> void label(TableSheet<T> table, int line, String label, String words) {
        table.above(line, label, new Column.Content.Marked(words, Style.LABEL), Style.LABEL);
    }

    private static Column.Content proof(Reached reached) {
        return switch (reached.proof()) {
            case PROVEN -> new Column.Content.Marked(
                    ChoiceWords.withinStep(reached) ? "proven best within the heat step" : "proven best", Style.GOOD);
            case BOUNDED -> new Column.Content.Marked("not proven best; nothing is better than the bound", Style.FAIR);
            case OPEN -> new Column.Content.Marked("not proven best; nothing is known of better ones", Style.FAIR);
        };
    }

    private static Column.Content distance(Line row, Column.Cells<Line> cells) {
        Reached reached = row.reached();
        if (reached.bound().isEmpty()) {
            return reached.gap().isPresent()
                    ? new Column.Content.Figure(100 * reached.gap().getAsDouble())
                    : new Column.Content.Empty();
        }
        String value = cells.at(VALUE);
        String apart = "ABS(" + value + "-" + cells.at(BOUND) + ")";
        return new Column.Content.Formula(
                "IF(" + apart + "=0,0,IF(" + value + "=0,\"\",100*" + apart + "/ABS(" + value + ")))");
    }
}
