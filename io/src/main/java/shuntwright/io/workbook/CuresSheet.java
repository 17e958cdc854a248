package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Cure;
import shuntwright.plan.FamilyRefusal;
import shuntwright.plan.Plan;

/** What was tried on failing channels, and why no part fits where none does. */
final class CuresSheet {

    static final String CURES = "Cures";
    static final String REFUSALS = "Refused parts";

    /** @param channel its name */
    private record Tried(String channel, Cure cure) {}

    /** @param channel its name */
    private record Refused(String channel, FamilyRefusal refusal) {}

    private static final List<Column<Tried>> CURE_COLUMNS = List.of(
            Column.text("", "Channel", 18, Tried::channel),
            Column.text("", "Kind of change", 30, row -> row.cure().lever().words()),
            Column.wrapped("Change", 70, row -> row.cure().change()),
            new Column<>("", "Verdict reached", 12, Style.TEXT,
                    (row, _) -> new Column.Content.Marked(row.cure().reached().word(),
                            row.cure().cures() ? Style.GOOD : Style.FAIR)),
            Column.maybeNumber("", "Margin, % of half window", 12, Style.PERCENT, row -> row.cure().margin()
                    .map(it -> OptionalDouble.of(100 * it)).orElseGet(OptionalDouble::empty)),
            Column.text("", "Cures", 9, row -> row.cure().cures() ? "yes" : "no"));

    private static final List<Column<Refused>> REFUSAL_COLUMNS = List.of(
            Column.text("", "Channel", 18, Refused::channel),
            Column.text("", "Kind of part", 14, row -> row.refusal().family().word()),
            Column.number("Examined", 11, Style.COUNT, row -> row.refusal().examined()),
            Column.number("Refused", 11, Style.COUNT, row -> row.refusal().refused()),
            Column.wrapped("What must hold", 50, row -> row.refusal().nearMiss().limit().words()),
            Column.text("", "Nearest miss", 24, row -> row.refusal().nearest()),
            Column.number("Reached", 11, Style.GENERAL, row -> row.refusal().nearMiss().reached()),
            Column.text("", "must be", 10, row -> row.refusal().nearMiss().atMost() ? "at most" : "at least"),
            Column.number("Bound", 11, Style.GENERAL, row -> row.refusal().nearMiss().bound()),
            Column.text("", "Unit", 8, row -> row.refusal().nearMiss().limit().dimension().unit()));

    private CuresSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        List<Tried> tried = new ArrayList<>();
        List<Refused> refused = new ArrayList<>();
        for (ChannelPlan channel : plan.channels()) {
            String name = channel.channel().name();
            channel.cures().forEach(each -> tried.add(new Tried(name, each)));
            channel.refusals().forEach(each -> refused.add(new Refused(name, each)));
        }
        if (!tried.isEmpty()) {
            new TableSheet<>(book.createSheet(CURES), look, "Changes tried on failing channels", CURE_COLUMNS, 1)
                    .add(tried);
        }
        if (!refused.isEmpty()) {
            new TableSheet<>(book.createSheet(REFUSALS), look, "Why no part fits", REFUSAL_COLUMNS, 1).add(refused);
        }
    }
}
