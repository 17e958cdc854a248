package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Cure;
import shuntwright.plan.Finding;
import shuntwright.plan.Plan;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** What a user should know, the board's own findings first, then each channel's. */
final class FindingsSheet {

    static final String NAME = "Findings";

    /**
     * A finding with what helps to act on it.
     *
     * @param finding     what was found
     * @param contributor what contributes most to the channel's tightest outcome; empty for the board
     * @param cure        the smallest change that cures; empty when none is known or needed
     */
    private record Line(Finding finding, String contributor, String cure) {}

    private static final List<Column<Line>> COLUMNS = List.of(
            Column.text("", "Channel", 18, row -> row.finding().channel().orElse("(board)")),
            new Column<>("", "Severity", 10, Style.TEXT, (row, _) -> severity(row.finding())),
            Column.wrapped("Kind", 20, row -> row.finding().key().words()),
            Column.wrapped("Finding", 70, row -> row.finding().text()),
            Column.wrapped("Largest contributor", 34, Line::contributor),
            Column.wrapped("Smallest change that cures", 34, Line::cure));

    private FindingsSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        List<Line> lines = new ArrayList<>();
        for (Finding each : plan.findings()) {
            lines.add(new Line(each, "", ""));
        }
        for (ChannelPlan channel : plan.channels()) {
            for (Finding each : channel.findings()) {
                boolean serious = each.key().severity() != Finding.Severity.NOTE;
                lines.add(new Line(each, contributor(channel).orElse(""), serious ? cure(channel).orElse("") : ""));
            }
        }
        new TableSheet<>(book.createSheet(NAME), look, "Findings: " + plan.board().name(), COLUMNS, 1).add(lines);
    }

    private static Column.Content severity(Finding finding) {
        Finding.Severity severity = finding.key().severity();
        return switch (severity) {
            case NOTE -> new Column.Content.Text(severity.word());
            case WARNING -> new Column.Content.Marked(severity.word(), Style.FAIR);
            case FAULT -> new Column.Content.Marked(severity.word(), Style.BAD);
        };
    }

    private static Optional<String> contributor(ChannelPlan channel) {
        return channel.solved().flatMap(solved -> {
            Assessment tightest = solved.tightest();
            return tightest.budget().stream().findFirst().map(line -> words(tightest, line));
        });
    }

    private static String words(Assessment assessment, BudgetLine line) {
        return String.format(Locale.ROOT, "%s: %s, %s (%.2f %%)", assessment.outcome().words(),
                line.input().label(), QuantityWriter.show(line.widest(), Dimension.CURRENT, 3),
                100 * line.widest() / Math.abs(assessment.nominal()));
    }

    private static Optional<String> cure(ChannelPlan channel) {
        return channel.cures().stream().filter(Cure::cures).findFirst()
                .map(each -> each.lever().words() + ": " + each.change());
    }
}
