package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.circuit.Threshold;
import shuntwright.plan.AlertPlan;
import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;
import shuntwright.plan.SharedUse;
import shuntwright.plan.TapPlan;

/** What channels share: currents and heat, alert lines, taps; and which piece serves which channel. */
final class SharedSheet {

    static final String SHARED = "Shared";
    static final String ALERTS = "Alert lines";
    static final String TAPS = "Taps";
    static final String DESIGNATORS = "Designators";

    /**
     * A piece on the board.
     *
     * @param part  what it is
     * @param index which of the part's pieces
     */
    private record Piece(PartUse part, int index) {}

    private static final List<Column<SharedUse>> USES = List.of(
            Column.text("", "Shared thing", 26, SharedUse::name), Column.text("", "Kind", 14, SharedSheet::kind),
            Column.number("Used", 12, Style.WATT, SharedUse::used),
            Column.maybeNumber("", "Limit", 12, Style.WATT, SharedUse::limit),
            Column.text("", "Unit", 8, row -> row.dimension().unit()),
            Column.maybeNumber("", "Used, % of limit", 12, Style.PERCENT, SharedSheet::share),
            new Column<>("", "Kept", 9, Style.TEXT, (row, _) -> new Column.Content.Marked(row.holds() ? "yes" : "no",
                    row.holds() ? Style.GOOD : Style.BAD)));

    private static final List<Column<AlertPlan>> LINES = List.of(
            Column.text("", "Alert line", 20, row -> row.line().name()),
            Column.number("Pull-up, Ω", 12, Style.OHM, AlertPlan::pullUp),
            Column.number("Least allowed, Ω", 14, Style.COUNT, AlertPlan::least),
            Column.number("Most allowed, Ω", 14, Style.COUNT, AlertPlan::most),
            new Column<>("", "Interval", 12, Style.TEXT,
                    (row, _) -> row.allowed().isPresent()
                            ? new Column.Content.Marked("there is one", Style.GOOD)
                            : new Column.Content.Marked("empty", Style.BAD)),
            Column.number("Current while low, mA", 14, Style.AMPERE, row -> 1000 * row.current()),
            Column.wrapped("Channels", 70, row -> String.join(", ", row.channels())));

    private static final List<Column<TapPlan>> TAP_COLUMNS = List.of(
            Column.text("", "Tap", 18, row -> row.tap().name()),
            Column.text("", "From", 14, row -> row.tap().source().word()),
            divider("R_t, Ω", Threshold.Divider::top), divider("R_b, Ω", Threshold.Divider::bottom),
            Column.maybeNumber("", "DAC code", 11, Style.COUNT, SharedSheet::code),
            Column.maybeNumber("", "Nominal without load, V", 13, Style.VOLT, row -> row.threshold()
                    .map(it -> OptionalDouble.of(it.nominalVoltage())).orElseGet(OptionalDouble::empty)),
            Column.wrapped("Channels", 70, row -> String.join(", ", row.channels())));

    private static final List<Column<Piece>> PIECES = List.of(
            Column.text("", "Designator", 13, row -> row.part().designators().get(row.index())),
            Column.text("", "Serves", 30, row -> row.part().users().get(row.index())),
            Column.text("", "Part number", 24, row -> row.part().partNumber()),
            Column.wrapped("Description", 60, row -> row.part().description()),
            Column.text("", "Body", 12, row -> row.part().purchase().body()));

    private SharedSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        new TableSheet<>(book.createSheet(SHARED), look, "Shared by all channels", USES, 1).add(plan.shared());
        if (!plan.alerts().isEmpty()) {
            new TableSheet<>(book.createSheet(ALERTS), look, "Alert lines", LINES, 1).add(plan.alerts());
        }
        if (!plan.taps().isEmpty()) {
            new TableSheet<>(book.createSheet(TAPS), look, "Shared thresholds", TAP_COLUMNS, 1).add(plan.taps());
        }
        List<Piece> pieces = new ArrayList<>();
        for (PartUse part : plan.parts()) {
            int listed = Math.min(part.designators().size(), part.users().size());
            for (int index = 0; index < listed; index++) {
                pieces.add(new Piece(part, index));
            }
        }
        new TableSheet<>(book.createSheet(DESIGNATORS), look, "Which piece serves which channel", PIECES, 1)
                .add(pieces);
    }

    private static String kind(SharedUse use) {
        return switch (use.kind()) {
            case SUPPLY, REFERENCE -> "current";
            case BOARD_HEAT, ZONE_HEAT -> "heat";
            case ZONE_RISE -> "warming";
        };
    }

    private static OptionalDouble share(SharedUse use) {
        return use.limit().isPresent()
                ? OptionalDouble.of(100 * use.used() / use.limit().getAsDouble())
                : OptionalDouble.empty();
    }

    private static Column<TapPlan> divider(String header, Function<Threshold.Divider, Double> get) {
        return Column.maybeNumber("", header, 11, Style.OHM, row -> {
            if (row.threshold().orElse(null) instanceof Threshold.Divider divider) {
                return OptionalDouble.of(get.apply(divider));
            }
            return OptionalDouble.empty();
        });
    }

    private static OptionalDouble code(TapPlan row) {
        return row.threshold().orElse(null) instanceof Threshold.DacOutput dac
                ? OptionalDouble.of(dac.code())
                : OptionalDouble.empty();
    }
}
