package shuntwright.io.workbook;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.io.workbook.BudgetRows.InputRow;
import shuntwright.io.workbook.BudgetRows.One;
import shuntwright.io.workbook.BudgetRows.OutcomeRow;
import shuntwright.io.workbook.BudgetRows.Together;
import shuntwright.plan.Plan;
import shuntwright.quantity.Range;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.CoverageInterval;
import shuntwright.sampling.Probability;
import shuntwright.sampling.ProbabilityWords;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;
import shuntwright.sampling.Validation;

/** One line for each outcome of each channel: what limits, combined uncertainty and trials say of it, side by side. */
final class ErrorBudgetSheet {

    static final String NAME = "Error budget";

    private static final String ALLOWED = "Allowed";
    private static final String LIMITS = "Limits";
    private static final String COMBINED = "Combined uncertainty (JCGM 100)";
    private static final String PROPAGATED = "Propagated distribution (JCGM 101)";
    private static final String SYMMETRIC = "Symmetric coverage interval";
    private static final String SHORTEST = "Shortest coverage interval";
    private static final String OUTSIDE = "Probability of being outside";
    private static final String CLAUSE_8 = "JCGM 101, clause 8";
    private static final String LOW_ERROR = "± of lower end, A";
    private static final String HIGH_ERROR = "± of upper end, A";
    /** Pages side by side. Each takes whole groups because these take about a third of the width each. */
    private static final int PAGES = 3;
    private static final int A = 9;
    /** Of the groups on the second page; also room for "not sampled". */
    private static final int WIDE = 12;

    private final TableSheet<InputRow> inputs;

    private final Column<OutcomeRow> from = number(ALLOWED, "From, A", each -> each.allowed().min());
    private final Column<OutcomeRow> to = number(ALLOWED, "To, A", each -> each.allowed().max());
    private final Column<OutcomeRow> lowest = number(LIMITS, "Lowest, A", each -> each.limits().min());
    private final Column<OutcomeRow> highest = number(LIMITS, "Highest, A", each -> each.limits().max());
    private final Column<OutcomeRow> estimate = number(COMBINED, "y, A", each -> each.combined().estimate());
    private final Column<OutcomeRow> standard = one(COMBINED, "u, A", A, Style.FINE_AMPERE, this::standard);
    private final Column<OutcomeRow> factor = one(COMBINED, "k", 7, Style.FACTOR,
            (row, _) -> Column.finite(row.assessment().combined().coverageFactor()));
    private final Column<OutcomeRow> expanded = one(COMBINED, "U = k·u, A", A, Style.FINE_AMPERE,
            (_, cells) -> formula(cells.at(factor) + "*" + cells.at(standard)));
    private final Column<OutcomeRow> combinedFrom = one(COMBINED, "y − U, A", A, Style.AMPERE,
            (_, cells) -> formula(cells.at(estimate) + "-" + cells.at(expanded)));
    private final Column<OutcomeRow> combinedTo = one(COMBINED, "y + U, A", A, Style.AMPERE,
            (_, cells) -> formula(cells.at(estimate) + "+" + cells.at(expanded)));
    private final Column<OutcomeRow> symmetricFrom = first(SYMMETRIC, "From, A", Style.AMPERE,
            each -> Column.finite(each.sampled().symmetric().range().min()));
    private final Column<OutcomeRow> symmetricTo = sampled(SYMMETRIC, "To, A", Style.AMPERE,
            each -> each.symmetric().range().max());
    private final Column<OutcomeRow> tolerance = first(CLAUSE_8, "δ, A", Style.FINE_AMPERE,
            each -> Column.finite(each.validation().tolerance()));

    private ErrorBudgetSheet(TableSheet<InputRow> inputs) {
        this.inputs = inputs;
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        BudgetRows rows = BudgetRows.of(plan);
        // Formulas may name only sheets that exist, so the inputs come first and are then moved.
        TableSheet<InputRow> inputs = BudgetInputsSheet.add(book, look, rows);
        new ErrorBudgetSheet(inputs).write(book, look, rows);
        book.setSheetOrder(BudgetInputsSheet.NAME, book.getNumberOfSheets() - 1);
    }

    private void write(XSSFWorkbook book, Look look, BudgetRows rows) {
        TableSheet<OutcomeRow> table = new TableSheet<>(book.createSheet(NAME), look, NAME, columns(), 1);
        table.keep(2, PAGES);
        table.add(rows.outcomes());
    }

    private List<Column<OutcomeRow>> columns() {
        return List.of(Column.text("", "Channel", 14, OutcomeRow::channel),
                Column.wrapped("Outcome", 26, ErrorBudgetSheet::words), from, to,
                number("", "Nominal, A", Assessment::nominal), lowest, highest,
                inside(LIMITS, lowest, highest), estimate, standard,
                one(COMBINED, "Degrees of freedom", A, Style.TENTH,
                        (row, _) -> freedom(row.assessment().combined().degreesOfFreedom())),
                factor, expanded, combinedFrom, combinedTo, inside(COMBINED, combinedFrom, combinedTo),
                first(PROPAGATED, "Mean, A", Style.AMPERE, each -> Column.finite(each.sampled().mean())),
                sampled(PROPAGATED, "Standard deviation, A", Style.FINE_AMPERE, Sampled::standard),
                sampled(PROPAGATED, "Trials", Style.COUNT, Sampled::trials),
                sampled(PROPAGATED, "of them without value", Style.COUNT, Sampled::runaways),
                new Column<>(PROPAGATED, "Settled", WIDE, Style.ANSWER,
                        (row, _) -> study(row).map(each -> answer(each.settled()))
                                .orElseGet(Column.Content.Empty::new)),
                symmetricFrom, error(SYMMETRIC, LOW_ERROR, Sampled::symmetric, CoverageInterval.Ends::low), symmetricTo,
                error(SYMMETRIC, HIGH_ERROR, Sampled::symmetric, CoverageInterval.Ends::high),
                inside(SYMMETRIC, symmetricFrom, symmetricTo),
                first(SHORTEST, "From, A", Style.AMPERE,
                        each -> Column.finite(each.sampled().shortest().range().min())),
                error(SHORTEST, LOW_ERROR, Sampled::shortest, CoverageInterval.Ends::low),
                sampled(SHORTEST, "To, A", Style.AMPERE, each -> each.shortest().range().max()),
                error(SHORTEST, HIGH_ERROR, Sampled::shortest, CoverageInterval.Ends::high),
                new Column<>(OUTSIDE, "Estimate", 22, Style.EXPONENT,
                        (row, _) -> probability(row).map(ErrorBudgetSheet::estimate)
                                .orElse(BudgetRows.NOT_SAMPLED)),
                outside("95 % from", Style.EXPONENT, each -> Column.finite(each.interval().min())),
                outside("95 % to", Style.EXPONENT, each -> Column.finite(each.interval().max())),
                outside("Standard error", Style.EXPONENT, ErrorBudgetSheet::error),
                outside("Trials", Style.COUNT, each -> new Column.Content.Figure(each.trials())),
                outside("Method", Style.TEXT, each -> new Column.Content.Text(each.method().word())), tolerance,
                new Column<>(CLAUSE_8, "Combined is valid", A, Style.ANSWER, (row, cells) -> row instanceof One it
                        ? it.propagated().map(each -> valid(it, each, cells)).orElseGet(Column.Content.Empty::new)
                        : new Column.Content.Empty()));
    }

    private static String words(OutcomeRow row) {
        return switch (row) {
            case One one -> one.words();
            case Together _ -> "any of these";
        };
    }

    /** Root of the sum of squares on the sheet of inputs; there the plan's number stands where inputs are correlated. */
    private Column.Content standard(One row, Column.Cells<OutcomeRow> cells) {
        return formula(inputs.cell(BudgetInputsSheet.CONTRIBUTION, row.sumRow()));
    }

    private static Column.Content freedom(double degrees) {
        return Double.isInfinite(degrees)
                ? new Column.Content.Marked("∞", Style.TENTH)
                : new Column.Content.Figure(degrees);
    }

    private Column<OutcomeRow> inside(String group, Column<OutcomeRow> low, Column<OutcomeRow> high) {
        return new Column<>(group, "Inside", group.equals(SYMMETRIC) ? WIDE : 8, Style.ANSWER,
                (row, cells) -> row instanceof One one && (!group.equals(SYMMETRIC) || one.propagated().isPresent())
                        ? formula("IF(AND(" + cells.at(low) + ">=" + cells.at(from) + "," + cells.at(high) + "<="
                                + cells.at(to) + "),\"yes\",\"no\")")
                        : new Column.Content.Empty());
    }

    private Column.Content valid(One row, Propagated propagated, Column.Cells<OutcomeRow> cells) {
        Validation validation = propagated.validation();
        if (validation.valid() != agrees(row.assessment().combined(), propagated)) {
            return answer(validation.valid());
        }
        return formula("IF(AND(ABS(" + cells.at(combinedFrom) + "-" + cells.at(symmetricFrom) + ")<="
                + cells.at(tolerance) + ",ABS(" + cells.at(combinedTo) + "-" + cells.at(symmetricTo) + ")<="
                + cells.at(tolerance) + "),\"yes\",\"no\")");
    }

    /** What the formula says. */
    private static boolean agrees(CombinedUncertainty combined, Propagated propagated) {
        Range there = propagated.sampled().symmetric().range();
        double tolerance = propagated.validation().tolerance();
        return Math.abs(combined.interval().min() - there.min()) <= tolerance
                && Math.abs(combined.interval().max() - there.max()) <= tolerance;
    }

    /** A number, or words where it would be taken for a certainty. */
    private static Column.Content estimate(Probability probability) {
        boolean open = probability.estimate() > 0 && probability.estimate() < 1;
        return open
                ? new Column.Content.Figure(probability.estimate())
                : new Column.Content.Marked(ProbabilityWords.of(probability), Style.TEXT);
    }

    private static Column.Content error(Probability probability) {
        boolean open = probability.estimate() > 0 && probability.estimate() < 1;
        return open ? Column.finite(probability.standardError()) : new Column.Content.Empty();
    }

    private static Optional<Probability> probability(OutcomeRow row) {
        return switch (row) {
            case One one -> one.propagated().map(each -> each.sampled().outside());
            case Together(ChannelStudy study) -> Optional.of(study.outside());
        };
    }

    private static Optional<ChannelStudy> study(OutcomeRow row) {
        return row instanceof One one ? one.study() : Optional.empty();
    }

    private static Column.Content answer(boolean yes) {
        return new Column.Content.Marked(yes ? "yes" : "no", Style.ANSWER);
    }

    private static Column.Content formula(String text) {
        return new Column.Content.Formula(text);
    }

    private static Column<OutcomeRow> number(String group, String header, ToDoubleFunction<Assessment> get) {
        return one(group, header, A, Style.AMPERE, (row, _) -> Column.finite(get.applyAsDouble(row.assessment())));
    }

    private static Column<OutcomeRow> one(String group, String header, int width, Style style, OfOne fill) {
        return new Column<>(group, header, width, style,
                (row, cells) -> row instanceof One one ? fill.of(one, cells) : new Column.Content.Empty());
    }

    /** A column that says so where nothing was sampled. */
    private static Column<OutcomeRow> first(String group, String header, Style style,
            Function<Propagated, Column.Content> get) {
        return new Column<>(group, header, group.equals(CLAUSE_8) ? A : WIDE, style, (row, _) -> row instanceof One one
                ? one.propagated().map(get).orElse(BudgetRows.NOT_SAMPLED)
                : new Column.Content.Empty());
    }

    private static Column<OutcomeRow> sampled(String group, String header, Style style,
            ToDoubleFunction<Sampled> get) {
        return new Column<>(group, header, group.equals(SHORTEST) ? A : WIDE, style, (row, _) -> row instanceof One one
                ? one.propagated().map(each -> Column.finite(get.applyAsDouble(each.sampled())))
                        .orElseGet(Column.Content.Empty::new)
                : new Column.Content.Empty());
    }

    private static Column<OutcomeRow> error(String group, String header,
            Function<Sampled, CoverageInterval> interval, ToDoubleFunction<CoverageInterval.Ends> end) {
        return sampled(group, header, Style.FINE_AMPERE,
                each -> end.applyAsDouble(interval.apply(each).standardErrors()));
    }

    private static Column<OutcomeRow> outside(String header, Style style,
            Function<Probability, Column.Content> get) {
        return new Column<>(OUTSIDE, header, 10, style,
                (row, _) -> probability(row).map(get).orElseGet(Column.Content.Empty::new));
    }

    /** Fills a cell of an outcome. */
    @FunctionalInterface
    private interface OfOne {
        Column.Content of(One row, Column.Cells<OutcomeRow> cells);
    }
}
