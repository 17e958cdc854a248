package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import org.apache.poi.xssf.usermodel.XSSFWorkbook;

import shuntwright.board.Board;
import shuntwright.board.DesignRules;
import shuntwright.board.StatedDistribution;
import shuntwright.io.planfile.Cautions;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.quantity.Range;

/** Cautions, the model in a few sentences, and every number of the board that the plan used. */
final class AssumptionsSheet {

    static final String NAME = "Assumptions and cautions";

    private static final String BOARD = "Board";

    private static final List<String> MODEL = List.of(
            "A shunt turns the current into a voltage, a sense amplifier multiplies it by its gain, a comparator "
                    + "compares the product with a threshold. Nominal trip current: threshold ÷ gain ÷ R_s, where R_s is "
                    + "all shunts of the channel in parallel with their mounting resistance, whose copper takes more as it "
                    + "warms.",
            "Lowest and highest are exact extremes: every input at the worse of its limits, all at once, both ends of "
                    + "ambient temperature, supply and rail voltage included. Inside means that these extremes keep to "
                    + "the demand.",
            "Likely means that only the probabilistically symmetric coverage interval of the propagated distribution "
                    + "(JCGM 101, by trials) keeps to the demand. The combined uncertainty (JCGM 100: combined standard "
                    + "uncertainty times the coverage factor) stands beside it, with whether clause 8 of JCGM 101 finds it "
                    + "valid.",
            "A probability found by trials holds within its interval of 95 %. Where no trial was outside it is below the "
                    + "upper end of that interval; it is not zero.",
            "Shares of variance that do not add up to 100 % leave the rest to pieces of one reel, which deviate alike. "
                    + "The first-order index of an input is what it explains by itself, the total index what it takes part "
                    + "in (a drift acts through temperature).",
            "Margin is the distance of the extremes from the nearer end of the allowed window, as a share of half the "
                    + "window; negative is outside.",
            "Shunt power holds to the rated temperature and falls linearly to zero at the maximum temperature (the "
                    + "convention of IEC 60115-1).",
            "Cells with a formula follow the cells they name. Extremes, verdicts and margins are results of the plan "
                    + "and do not follow when a value is changed here.");

    /** One line of the sheet. */
    private record Line(String section, String item, Column.Content value, OptionalDouble to, String unit) {
        static Line words(String section, String text) {
            return new Line(section, text, new Column.Content.Empty(), OptionalDouble.empty(), "");
        }

        static Line text(String item, String text) {
            return new Line(BOARD, item, new Column.Content.Text(text), OptionalDouble.empty(), "");
        }

        static Line inputs(String item, String text) {
            return new Line("Inputs", item, new Column.Content.Text(text), OptionalDouble.empty(), "");
        }

        static Line number(String item, double value, String unit) {
            return new Line(BOARD, item, new Column.Content.Figure(value), OptionalDouble.empty(), unit);
        }

        static Line maybe(String item, OptionalDouble value, String unit) {
            return value.isPresent() ? number(item, value.getAsDouble(), unit) : text(item, "no limit set");
        }

        static Line range(String item, Range range, String unit) {
            return new Line(BOARD, item, new Column.Content.Figure(range.min()), OptionalDouble.of(range.max()), unit);
        }
    }

    private static final List<Column<Line>> COLUMNS = List.of(Column.text("", "Section", 12, Line::section),
            Column.wrapped("Statement or item", 88, Line::item),
            new Column<>("", "Value, or from", 16, Style.GENERAL, (row, _) -> row.value()),
            Column.maybeNumber("", "To", 12, Style.GENERAL, Line::to), Column.text("", "Unit", 9, Line::unit));

    private AssumptionsSheet() {
    }

    static void add(XSSFWorkbook book, Look look, Plan plan) {
        List<Line> lines = new ArrayList<>();
        Cautions.of(plan).forEach(each -> lines.add(Line.words("Caution", each)));
        MODEL.forEach(each -> lines.add(Line.words("Model", each)));
        board(plan.board(), lines);
        known(plan, lines);
        new TableSheet<>(book.createSheet(NAME), look, NAME, COLUMNS, 1).add(lines);
    }

    private static void board(Board board, List<Line> lines) {
        lines.add(Line.text("Name", board.name()));
        if (!board.description().isEmpty()) {
            lines.add(Line.words(BOARD, board.description()));
        }
        board.partsFiles().forEach(each -> lines.add(Line.text("Parts file", each)));
        lines.add(Line.number("Channels", board.channels().size(), ""));
        lines.add(Line.number("Build quantity", board.buildQuantity(), "boards"));
        lines.add(Line.range("Ambient temperature", board.ambient(), "°C"));
        lines.add(Line.number("Sense supply, nominal", board.supply().voltage().nominal(), "V"));
        lines.add(Line.range("Sense supply, limits", board.supply().voltage().range(), "V"));
        lines.add(Line.number("Sense supply, current available", 1000 * board.supply().availableCurrent(), "mA"));
        board.references().forEach(each -> lines.add(Line.text("Reference " + each.name(), each.part())));
        board.adc().ifPresent(adc -> {
            lines.add(Line.text("ADC, full scale from", adc.source().word()));
            lines.add(Line.number("ADC, resolution", adc.bits(), "bits"));
            lines.add(Line.number("ADC, gain error", 100 * adc.gainError(), "±%"));
            lines.add(Line.number("ADC, offset", 1000 * adc.offset(), "±mV"));
            lines.add(Line.number("ADC, integral non-linearity", adc.nonlinearity(), "±LSB"));
        });
        lines.add(Line.maybe("Heat of all shunts, at most", board.heatLimit(), "W"));
        board.zones().forEach(each -> {
            lines.add(Line.maybe("Heat of zone " + each.name(), each.heatLimit(), "W"));
            each.thermalResistance().ifPresent(it -> lines
                    .add(Line.number("Zone " + each.name() + " warms its parts above ambient by", it, "K/W")));
        });
        lines.add(Line.words(BOARD, switch (board.acceptance().basis()) {
            case LIMITS -> "Accepted are channels that are inside by limits.";
            case COVERAGE -> "Accepted are channels that are inside by limits, or whose coverage interval is inside.";
        }));
        lines.add(Line.number("Coverage probability", 100 * board.acceptance().coverage(), "%"));
        rules(board.rules(), lines);
    }

    private static void known(Plan plan, List<Line> lines) {
        lines.add(Line.inputs("Propagated distribution", plan.study().map(it -> SamplingWords.of(it.sampling()))
                .orElse("not sampled; asked for: " + SamplingWords.of(plan.board().uncertainty().sampling()))));
        for (StatedDistribution each : plan.board().uncertainty().stated()) {
            String part = each.part().map(it -> " of " + it).orElse("");
            lines.add(Line.inputs("Stated: " + each.input() + part, SamplingWords.of(each.distribution())));
        }
        lines.add(Line.inputs("All other inputs", "uniform between their limits"));
        for (ChannelPlan each : plan.channels()) {
            each.channel().reading().calibration()
                    .ifPresent(it -> lines.add(Line.inputs("Reading of " + each.channel().name() + " calibrated at "
                            + "production", SamplingWords.of(it, each.channel().currents().load()))));
        }
    }

    private static void rules(DesignRules rules, List<Line> lines) {
        lines.add(Line.number("Shunts in parallel, at most", rules.parallelShunts(), ""));
        lines.add(Line.number("Share of rated shunt power used, at most", 100 * rules.powerMargin(), "%"));
        lines.add(Line.number("Current of one divider, at most", 1000 * rules.dividerCurrent(), "mA"));
        lines.add(Line.number("Shift of a threshold by bias current, at most", 100 * rules.biasShare(), "%"));
        rules.resistors().ifPresent(each -> lines.add(Line.text("Resistor series", each)));
        lines.add(Line.number("Heats within this much of the least count as equal", rules.heatStep(), "W"));
        lines.add(Line.number("Temperature difference along a shunt", rules.shuntGradient(), "K"));
        lines.add(Line.number("Resistor in each amplifier input", rules.inputResistance(), "Ω"));
        lines.add(Line.number("Mismatch of the input resistors", 100 * rules.inputMismatch(), "±%"));
    }
}
