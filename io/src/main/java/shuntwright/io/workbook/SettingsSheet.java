package shuntwright.io.workbook;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.Outcome;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.Threshold;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;

/** One line for each channel: parts, values, thresholds, currents, reading errors, heat, verdict. */
final class SettingsSheet {

    static final String NAME = "Settings";
    /** Formulas stand only where they give the plan's number to within this share of it. */
    private static final double AGREES = 1e-12;
    private static final int A = 10;

    private static final Column<ChannelPlan> RESISTANCE = number("Chosen parts", "R_s, mΩ", Style.MILLIOHM,
            it -> 1000 * it.circuit().resistance());
    private static final Column<ChannelPlan> GAIN = number("Chosen parts", "Gain, V/V", Style.GAIN,
            it -> it.circuit().amplifier().gain());
    private static final Column<ChannelPlan> SOURCE = number("Threshold", "Source, V", Style.VOLT,
            it -> it.circuit().threshold().source().voltage().nominal());
    private static final Column<ChannelPlan> TOP = maybe("Threshold", "R_t, Ω", Style.OHM,
            it -> divider(it, Threshold.Divider::top));
    private static final Column<ChannelPlan> BOTTOM = maybe("Threshold", "R_b, Ω", Style.OHM,
            it -> divider(it, Threshold.Divider::bottom));
    private static final Column<ChannelPlan> THRESHOLD = new Column<>("Threshold", "Threshold nominal, V", A,
            Style.VOLT,
            (row, cells) -> row.solved().map(it -> threshold(it, cells)).orElseGet(Column.Content.Empty::new));
    private static final Column<ChannelPlan> TRIP = new Column<>("Trip current", "Trip nominal, A", A, Style.AMPERE,
            (row, cells) -> row.solved().map(it -> trip(it, cells)).orElseGet(Column.Content.Empty::new));

    private static final List<Column<ChannelPlan>> COLUMNS = List.of(
            Column.text("", "Channel", 12, row -> row.channel().name()),
            new Column<>("", "Verdict", 11, Style.TEXT, (row, _) -> verdict(row)),
            Column.maybeNumber("", "Margin, % of half window", 10, Style.PERCENT, row -> row.solved()
                    .map(it -> OptionalDouble.of(100 * it.margin())).orElseGet(OptionalDouble::empty)),
            text("Chosen parts", "Shunt", 11, it -> it.circuit().shunt().partNumber()),
            number("Chosen parts", "In parallel", Style.COUNT, it -> it.circuit().shuntCount()), RESISTANCE,
            text("Chosen parts", "Amplifier", 11, it -> it.circuit().amplifier().partNumber()), GAIN,
            text("Chosen parts", "Comparator", 12, it -> it.circuit().comparator().partNumber()),
            text("Threshold", "Threshold source", 12, it -> it.circuit().threshold().source().source().word()),
            text("Threshold", "Tap", 9, it -> it.circuit().threshold().tapName()), SOURCE, TOP, BOTTOM,
            maybe("Threshold", "DAC code", Style.COUNT, SettingsSheet::code), THRESHOLD,
            number("Threshold", "Threshold lowest, V", Style.VOLT, it -> it.settings().thresholdLimits().min()),
            number("Threshold", "Threshold highest, V", Style.VOLT, it -> it.settings().thresholdLimits().max()),
            text("Hysteresis", "Hysteresis resistor", 12, SettingsSheet::network),
            maybe("Hysteresis", "Its value, Ω", Style.OHM, SettingsSheet::networkValue),
            maybe("Hysteresis", "Output at release, V", Style.VOLT, it -> it.settings().releaseVoltage()),
            outcome("Trip current", "No-trip current, A", Outcome.TRIP, it -> it.allowed().min()),
            outcome("Trip current", "Trip lowest, A", Outcome.TRIP, it -> it.limits().min()), TRIP,
            outcome("Trip current", "Trip highest, A", Outcome.TRIP, it -> it.limits().max()),
            outcome("Trip current", "Must-trip current, A", Outcome.TRIP, it -> it.allowed().max()),
            outcome("Release current", "Release from, A", Outcome.RELEASE, it -> it.allowed().min()),
            outcome("Release current", "Release lowest, A", Outcome.RELEASE, it -> it.limits().min()),
            outcome("Release current", "Release nominal, A", Outcome.RELEASE, Assessment::nominal),
            outcome("Release current", "Release highest, A", Outcome.RELEASE, it -> it.limits().max()),
            outcome("Release current", "Release to, A", Outcome.RELEASE, it -> it.allowed().max()),
            error("Error at least current, %", Outcome.READING_AT_LEAST, SettingsSheet::reached),
            error("Allowed there, %", Outcome.READING_AT_LEAST, SettingsSheet::allowed),
            error("Error at load current, %", Outcome.READING_AT_LOAD, SettingsSheet::reached),
            error("Allowed at load, %", Outcome.READING_AT_LOAD, SettingsSheet::allowed),
            number("Shunt heat", "Heat at load, W", Style.WATT, SolvedChannel::heat),
            maybe("Shunt heat", "One shunt at no-trip, W", Style.WATT, it -> power(it, LimitCheck::reached)),
            maybe("Shunt heat", "Allowed for one, W", Style.WATT, it -> power(it, LimitCheck::bound)));

    private SettingsSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        XSSFSheet sheet = book.createSheet(NAME);
        TableSheet<ChannelPlan> table = new TableSheet<>(sheet, look, NAME, COLUMNS, 1);
        table.add(plan.channels());
        table.keep(1, 3);
        sheet.setAutobreaks(true);
    }

    private static Column.Content threshold(SolvedChannel it, Column.Cells<ChannelPlan> cells) {
        double planned = it.settings().threshold();
        return switch (it.circuit().threshold()) {
            case Threshold.Divider divider when agrees(divider.openVoltage(), planned) ->
                new Column.Content.Formula(cells.at(SOURCE) + "*" + cells.at(BOTTOM) + "/(" + cells.at(TOP) + "+"
                        + cells.at(BOTTOM) + ")");
            case Threshold.DacOutput dac when agrees(dac.openVoltage(), planned) ->
                new Column.Content.Formula(cells.at(SOURCE) + "*" + dac.code() + "/" + (1 << dac.dac().bits()));
            case Threshold.Divider _,Threshold.DacOutput _ -> Column.finite(planned);
        };
    }

    private static Column.Content trip(SolvedChannel it, Column.Cells<ChannelPlan> cells) {
        double planned = it.trip().nominal();
        double plain = it.settings().threshold() / it.circuit().amplifier().gain() / it.circuit().resistance();
        return agrees(plain, planned)
                ? new Column.Content.Formula(cells.at(THRESHOLD) + "/" + cells.at(GAIN) + "/(" + cells.at(RESISTANCE)
                        + "/1000)")
                : Column.finite(planned);
    }

    private static boolean agrees(double one, double other) {
        return Math.abs(one - other) <= AGREES * Math.abs(other);
    }

    private static Column.Content verdict(ChannelPlan row) {
        Style style = switch (row.verdict()) {
            case INSIDE -> Style.GOOD;
            case LIKELY -> row.accepted() ? Style.GOOD : Style.FAIR;
            case OUTSIDE, NO_FIT -> Style.BAD;
            case INCOMPLETE -> Style.FAIR;
        };
        return new Column.Content.Marked(row.verdict().word(), style);
    }

    private static OptionalDouble divider(SolvedChannel it, ToDoubleFunction<Threshold.Divider> get) {
        return switch (it.circuit().threshold()) {
            case Threshold.Divider divider -> OptionalDouble.of(get.applyAsDouble(divider));
            case Threshold.DacOutput _ -> OptionalDouble.empty();
        };
    }

    private static OptionalDouble code(SolvedChannel it) {
        return switch (it.circuit().threshold()) {
            case Threshold.Divider _ -> OptionalDouble.empty();
            case Threshold.DacOutput dac -> OptionalDouble.of(dac.code());
        };
    }

    private static String network(SolvedChannel it) {
        return switch (it.circuit().network()) {
            case HysteresisNetwork.None _ -> "none";
            case HysteresisNetwork.SenseResistor _ -> "R_H";
            case HysteresisNetwork.Feedback _ -> "R_F";
        };
    }

    private static OptionalDouble networkValue(SolvedChannel it) {
        return switch (it.circuit().network()) {
            case HysteresisNetwork.None _ -> OptionalDouble.empty();
            case HysteresisNetwork.SenseResistor(double resistance) -> OptionalDouble.of(resistance);
            case HysteresisNetwork.Feedback feedback -> OptionalDouble.of(feedback.resistance());
        };
    }

    private static OptionalDouble power(SolvedChannel it, ToDoubleFunction<LimitCheck> get) {
        return it.limits().stream().filter(each -> each.limit() == Limit.SHUNT_POWER).mapToDouble(get).findFirst();
    }

    /** Largest error of a reading, % of the current read. */
    private static double reached(Assessment reading) {
        double current = reading.allowed().mid();
        return 100 * Math.max(reading.limits().max() - current, current - reading.limits().min()) / current;
    }

    private static double allowed(Assessment reading) {
        return 100 * reading.allowed().width() / 2 / reading.allowed().mid();
    }

    private static Column<ChannelPlan> text(String group, String header, int width,
            Function<SolvedChannel, String> get) {
        return Column.maybeText(group, header, width, row -> row.solved().map(get));
    }

    private static Column<ChannelPlan> number(String group, String header, Style style,
            ToDoubleFunction<SolvedChannel> get) {
        return maybe(group, header, style, it -> OptionalDouble.of(get.applyAsDouble(it)));
    }

    private static Column<ChannelPlan> maybe(String group, String header, Style style,
            Function<SolvedChannel, OptionalDouble> get) {
        return Column.maybeNumber(group, header, A, style,
                row -> row.solved().map(get).orElseGet(OptionalDouble::empty));
    }

    private static Column<ChannelPlan> outcome(String group, String header, Outcome outcome,
            ToDoubleFunction<Assessment> get) {
        return of(group, header, Style.AMPERE, outcome, get);
    }

    private static Column<ChannelPlan> error(String header, Outcome outcome, ToDoubleFunction<Assessment> get) {
        return of("Reading error", header, Style.PERCENT, outcome, get);
    }

    private static Column<ChannelPlan> of(String group, String header, Style style, Outcome outcome,
            ToDoubleFunction<Assessment> get) {
        return maybe(group, header, style, it -> {
            Optional<Assessment> there = it.assessment(outcome);
            return there.isPresent() ? OptionalDouble.of(get.applyAsDouble(there.get())) : OptionalDouble.empty();
        });
    }
}
