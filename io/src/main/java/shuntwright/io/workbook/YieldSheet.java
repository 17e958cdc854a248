package shuntwright.io.workbook;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.plan.Plan;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;
import shuntwright.sampling.BoardYield.SharedCost;
import shuntwright.sampling.Probability;
import shuntwright.sampling.ProbabilityWords;

/** The share of boards on which every channel is inside, and what each shared thing costs of it; only of sampled plans with a circuit. */
final class YieldSheet {

    static final String NAME = "Board yield";

    private static final Column<SharedCost> OF_TRIALS = new Column<>("", "Yield of these trials, %", 14,
            Style.FINE_PERCENT, (row, _) -> share(asDrawn(row)));
    private static final Column<SharedCost> WITHOUT = new Column<>("", "Yield with it at its nominal value, %", 16,
            Style.FINE_PERCENT, (row, _) -> share(row.without()));
    private static final Column<SharedCost> COST = Column.live("It costs, %", 16, Style.FINE_PERCENT,
            YieldSheet::cost);
    private static final List<Column<SharedCost>> COLUMNS = List.of(
            Column.text("", "Shared thing", 30, SharedCost::owner), OF_TRIALS, WITHOUT, COST,
            Column.maybeNumber("", "± its standard error, %", 14, Style.FINE_PERCENT,
                    row -> row.standardError() > 0
                            ? OptionalDouble.of(100 * row.standardError())
                            : OptionalDouble.empty()));

    private YieldSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        plan.study().filter(study -> !study.channels().isEmpty()).ifPresent(study -> write(book, look, study));
    }

    private static double asDrawn(SharedCost row) {
        return row.without() - row.cost();
    }

    private static boolean open(double share) {
        return share > 0 && share < 1;
    }

    /** A number, or words where it would be taken for a certainty. */
    private static Column.Content share(double inside) {
        return open(inside)
                ? Column.finite(100 * inside)
                : new Column.Content.Marked(inside > 0 ? "no trial outside" : "no trial inside", Style.TEXT);
    }

    private static Column.Content cost(SharedCost row, Column.Cells<SharedCost> cells) {
        if (row.cost() == 0 && row.standardError() == 0) {
            return new Column.Content.Marked("no trial differs", Style.TEXT);
        }
        return open(row.without()) && open(asDrawn(row))
                ? new Column.Content.Formula(cells.at(WITHOUT) + "-" + cells.at(OF_TRIALS))
                : Column.finite(100 * row.cost());
    }

    private static void write(XSSFWorkbook book, Look look, BoardStudy study) {
        BoardYield yield = study.yield();
        Probability inside = yield.inside();
        TableSheet<SharedCost> table = new TableSheet<>(book.createSheet(NAME), look,
                "Board yield: every channel inside in every outcome", COLUMNS, 6);
        table.above(0, "Board yield, %", open(inside.estimate())
                ? new Column.Content.Figure(100 * inside.estimate())
                : new Column.Content.Marked(ProbabilityWords.of(inside), Style.LABEL), Style.TOTAL_PERCENT);
        label(table, 1, "As a fraction, with its interval", ProbabilityWords.of(inside));
        label(table, 2, "Found by", String.format(Locale.ROOT, "%,d boards, %s; shared things drawn once for each",
                inside.trials(), inside.method().word()));
        label(table, 3, "Product of the channels' own", ProbabilityWords.product(study));
        label(table, 4, "Channels were sampled by", SamplingWords.of(study.sampling()));
        table.add(yield.shared());
    }

    private static void label(TableSheet<SharedCost> table, int line, String label, String words) {
        table.above(line, label, new Column.Content.Marked(words, Style.LABEL), Style.LABEL);
    }
}
