package shuntwright.io.workbook;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.accuracy.Input;
import shuntwright.accuracy.Owner;
import shuntwright.io.workbook.BudgetRows.InputRow;
import shuntwright.io.workbook.BudgetRows.Line;
import shuntwright.io.workbook.BudgetRows.Sum;
import shuntwright.sampling.EffectIndex;

/** One line for each input of each outcome, as three readers see it, below a line that sums them up. */
final class BudgetInputsSheet {

    static final String NAME = "Error budget by input";
    static final String ALL = "all inputs";

    /** Formulas stand only where they give the plan's number to within this share of it. */
    private static final double AGREES = 1e-9;
    private static final String INPUT = "Limits of the input";
    private static final String LIMITS = "Contribution to the limits";
    private static final String COMBINED = "Part of the combined uncertainty";
    private static final String EFFECTS = "Effect on the propagated variance";
    private static final int A = 9;

    private static final Column<InputRow> TARGET = new Column<>("", "Trip target, A", A, Style.AMPERE,
            (row, _) -> row instanceof Sum(var outcome)
                    ? Column.finite(outcome.tripTarget())
                    : new Column.Content.Empty());
    private static final Column<InputRow> LOW = summed(LIMITS, "Lowest moves by, A", Style.FINE_AMPERE,
            each -> Column.finite(each.line().towardsLow()));
    private static final Column<InputRow> LOW_SHARE = ofTarget("Lowest, % of trip target", LOW);
    private static final Column<InputRow> HIGH = summed(LIMITS, "Highest moves by, A", Style.FINE_AMPERE,
            each -> Column.finite(each.line().towardsHigh()));
    private static final Column<InputRow> HIGH_SHARE = ofTarget("Highest, % of trip target", HIGH);

    /** u of a line, u_c in the line that sums up. */
    static final Column<InputRow> CONTRIBUTION = new Column<>(COMBINED, "Its u, A", A, Style.FINE_AMPERE,
            (row, cells) -> switch (row) {
                case Sum sum -> combined(sum, cells);
                case Line line -> Column.finite(line.line().standard());
            });
    private static final Column<InputRow> SHARE = new Column<>(COMBINED, "Share of variance, %", A, Style.PERCENT,
            (row, cells) -> switch (row) {
                case Sum sum -> total(sum, cells);
                case Line line -> share(line, cells);
            });

    private static final List<Column<InputRow>> COLUMNS = List.of(
            Column.text("", "Channel", 14, row -> row.outcome().channel()),
            Column.wrapped("Outcome", 26, row -> row.outcome().words()),
            Column.wrapped("Input", 30, row -> switch (row) {
                case Sum _ -> ALL;
                case Line line -> line.input().slot().words();
            }), words("Owner", 26, BudgetInputsSheet::owner), words("Distribution", 17, SamplingWords::of),
            figure("From", Style.GENERAL, each -> each.limits().min()),
            figure("To", Style.GENERAL, each -> each.limits().max()),
            figure("Standard uncertainty", Style.EXPONENT, Input::standardUncertainty),
            new Column<>(INPUT, "Unit", 7, Style.TEXT,
                    (row, _) -> row instanceof Line line
                            ? new Column.Content.Text(line.input().slot().unit())
                            : new Column.Content.Empty()),
            TARGET, LOW, LOW_SHARE, HIGH, HIGH_SHARE,
            new Column<>(COMBINED, "Sensitivity, A per unit", 12, Style.EXPONENT,
                    (row, _) -> row instanceof Line line
                            ? Column.finite(line.line().sensitivity())
                            : new Column.Content.Empty()),
            CONTRIBUTION, SHARE, index("First-order index, %", EffectIndex::first),
            error("± of first-order, %", EffectIndex::firstError),
            index("Total index, %", EffectIndex::total),
            error("± of total, %", EffectIndex::totalError));

    private BudgetInputsSheet() {
    }

    static TableSheet<InputRow> add(XSSFWorkbook book, Look look, BudgetRows rows) {
        TableSheet<InputRow> table = new TableSheet<>(book.createSheet(NAME), look, NAME, COLUMNS, 1);
        table.keep(3, 1);
        table.sumUp(row -> row instanceof Sum);
        table.add(rows.inputs());
        int at = 0;
        for (InputRow each : rows.inputs()) {
            if (each instanceof Sum sum && sum.lines() > 0) {
                table.sheet().groupRow(table.rowIndex(at + 1), table.rowIndex(at + sum.lines()));
            }
            at++;
        }
        return table;
    }

    private static String owner(Input input) {
        return switch (input.owner()) {
            case Owner.Own(String name) -> name;
            case Owner.Shared(String name) -> name + ", shared";
        };
    }

    private static Column.Content combined(Sum sum, Column.Cells<InputRow> cells) {
        double planned = sum.outcome().assessment().combined().standard();
        double squares = sum.outcome().assessment().budget().stream()
                .mapToDouble(each -> each.standard() * each.standard()).sum();
        return sum.lines() > 0 && agrees(Math.sqrt(squares), planned)
                ? new Column.Content.Formula("SQRT(SUMSQ(" + cells.below(1, sum.lines()) + "))")
                : Column.finite(planned);
    }

    private static Column.Content share(Line line, Column.Cells<InputRow> cells) {
        double combined = line.outcome().assessment().combined().standard();
        double share = line.line().standard() / combined;
        return agrees(share * share, line.line().varianceShare())
                ? new Column.Content.Formula("100*(" + cells.at(CONTRIBUTION) + "/"
                        + cells.at(CONTRIBUTION, -line.number()) + ")^2")
                : Column.finite(100 * line.line().varianceShare());
    }

    private static boolean agrees(double one, double other) {
        return Math.abs(one - other) <= AGREES * Math.abs(other);
    }

    private static Column.Content total(Sum sum, Column.Cells<InputRow> cells) {
        return sum.lines() > 0
                ? new Column.Content.Formula("SUM(" + cells.below(1, sum.lines()) + ")")
                : new Column.Content.Empty();
    }

    /** A column whose sum is the sum of its lines. */
    private static Column<InputRow> summed(String group, String header, Style style,
            Function<Line, Column.Content> get) {
        return new Column<>(group, header, A, style, (row, cells) -> switch (row) {
            case Sum sum -> total(sum, cells);
            case Line line -> get.apply(line);
        });
    }

    private static Column<InputRow> ofTarget(String header, Column<InputRow> contribution) {
        return new Column<>(LIMITS, header, A, Style.PERCENT, (row, cells) -> {
            int up = row instanceof Line line ? -line.number() : 0;
            boolean empty = row instanceof Sum sum && sum.lines() == 0;
            return empty
                    ? new Column.Content.Empty()
                    : new Column.Content.Formula("100*" + cells.at(contribution) + "/" + cells.at(TARGET, up));
        });
    }

    private static Column<InputRow> index(String header, ToDoubleFunction<EffectIndex> get) {
        return new Column<>(EFFECTS, header, A, Style.PERCENT, (row, cells) -> switch (row) {
            case Sum sum -> sum.effects() ? total(sum, cells) : new Column.Content.Empty();
            case Line line -> effect(line, get);
        });
    }

    private static Column.Content effect(Line line, ToDoubleFunction<EffectIndex> get) {
        if (line.outcome().propagated().isEmpty()) {
            return BudgetRows.NOT_SAMPLED;
        }
        if (line.effects().isEmpty()) {
            return new Column.Content.Marked("not worked out", Style.TEXT);
        }
        // Inputs without any effect are not listed among the effects.
        return line
                .together().<Column.Content>map(
                        each -> new Column.Content.Marked("with " + each.owner().name(), Style.TEXT))
                .orElseGet(() -> Column.finite(100 * line.effect().map(get::applyAsDouble).orElse(0.0)));
    }

    private static Column<InputRow> error(String header, ToDoubleFunction<EffectIndex> get) {
        return Column.maybeNumber(EFFECTS, header, A, Style.PERCENT,
                row -> row instanceof Line line && line.together().isEmpty()
                        ? line.effect().map(each -> OptionalDouble.of(100 * get.applyAsDouble(each)))
                                .orElseGet(OptionalDouble::empty)
                        : OptionalDouble.empty());
    }

    private static Column<InputRow> words(String header, int width, Function<Input, String> get) {
        return new Column<>("", header, width, Style.WRAPPED, (row, _) -> row instanceof Line line
                ? new Column.Content.Text(get.apply(line.input()))
                : new Column.Content.Empty());
    }

    private static Column<InputRow> figure(String header, Style style, ToDoubleFunction<Input> get) {
        return new Column<>(INPUT, header, 12, style, (row, _) -> row instanceof Line line
                ? Column.finite(get.applyAsDouble(line.input()))
                : new Column.Content.Empty());
    }
}
