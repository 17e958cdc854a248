package shuntwright.io.workbook;

import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleFunction;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.plan.Plan;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;
import shuntwright.sampling.BoardYield.SharedCost;
import shuntwright.sampling.Probability;
import shuntwright.sampling.ProbabilityWords;

/** The share of boards on which every channel is inside, and what each shared thing costs of it; only of sampled plans. */
final class YieldSheet {

    static final String NAME = "Board yield";

    private static final String YIELD = "$B$2";

    private YieldSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        plan.study().ifPresent(study -> write(book, look, study));
    }

    private static void write(XSSFWorkbook book, Look look, BoardStudy study) {
        BoardYield yield = study.yield();
        Probability inside = yield.inside();
        boolean open = inside.estimate() > 0 && inside.estimate() < 1;
        Column<SharedCost> without = percent("Yield with it at its nominal value, %", SharedCost::without);
        Column<SharedCost> cost = Column.live("It costs, %", 12, Style.FINE_PERCENT, (row, cells) -> {
            boolean follows = open && Math.abs(row.without() - inside.estimate() - row.cost()) < 1e-12;
            return follows
                    ? new Column.Content.Formula(cells.at(without) + "-" + YIELD)
                    : Column.finite(100 * row.cost());
        });
        List<Column<SharedCost>> columns = List.of(Column.text("", "Shared thing", 30, SharedCost::owner), without,
                cost, percent("± its standard error, %", SharedCost::standardError));
        TableSheet<SharedCost> table = new TableSheet<>(book.createSheet(NAME), look,
                "Board yield: every channel inside in every outcome", columns, 6);
        table.above(0, "Board yield, %", open
                ? new Column.Content.Figure(100 * inside.estimate())
                : new Column.Content.Marked(ProbabilityWords.of(inside), Style.LABEL), Style.TOTAL_PERCENT);
        label(table, 1, "with its interval", ProbabilityWords.of(inside));
        label(table, 2, "found by", String.format(Locale.ROOT, "%,d boards, %s; shared things drawn once for each",
                inside.trials(), inside.method().word()));
        label(table, 4, "Trials of channels", SamplingWords.of(study.sampling()));
        label(table, 3, "Product of the channels' own", ProbabilityWords.estimate(yield.product()));
        table.add(yield.shared());
    }

    private static void label(TableSheet<SharedCost> table, int line, String label, String words) {
        table.above(line, label, new Column.Content.Marked(words, Style.LABEL), Style.LABEL);
    }

    private static Column<SharedCost> percent(String header, ToDoubleFunction<SharedCost> get) {
        return Column.number(header, 14, Style.FINE_PERCENT, row -> 100 * get.applyAsDouble(row));
    }
}
