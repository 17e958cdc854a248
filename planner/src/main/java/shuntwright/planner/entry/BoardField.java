package shuntwright.planner.entry;

import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Function;

import shuntwright.board.Acceptance;
import shuntwright.board.Board;
import shuntwright.board.Preference;
import shuntwright.board.SenseSupply;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/** Something all channels share that takes what is typed. */
@SuppressWarnings("ImmutableEnumChecker") // the functions keep no state
public enum BoardField {
    NAME("Board name", "the name shown in titles and exports", Board::name,
            (text, board) -> text.isBlank()
                    ? Reading.misread("A board needs a name.")
                    : Reading.value(board.withName(text.strip()))),
    SUPPLY_VOLTAGE("Sense supply", "a voltage with its tolerance, such as 3.3 V ±2 %",
            board -> QuantityWriter.write(board.supply().voltage(), Dimension.VOLTAGE),
            (text, board) -> QuantityReader.toleranced(text, Dimension.VOLTAGE).then(voltage -> voltage.min() > 0
                    ? Reading.value(board.withSupply(new SenseSupply(voltage, board.supply().availableCurrent())))
                    : Reading.misread("The sense supply must be above 0 V. Type it such as 3.3 V ±2 %."))),
    SUPPLY_CURRENT("Current available", "the current for all sense circuits together, such as 100 mA",
            board -> QuantityWriter.write(board.supply().availableCurrent(), Dimension.CURRENT),
            (text, board) -> needed(text, "the available current", Dimension.CURRENT)
                    .then(value -> Reading.value(board.withSupply(new SenseSupply(board.supply().voltage(), value))))),
    AMBIENT("Ambient", "the coldest and the warmest air at the board, such as -20 °C .. 60 °C",
            board -> QuantityWriter.write(board.ambient(), Dimension.TEMPERATURE),
            (text, board) -> QuantityReader.range(text, Dimension.TEMPERATURE)
                    .then(range -> range.min() > -273.15 && range.max() < 500
                            ? Reading.value(board.withAmbient(range))
                            : Reading.misread("The ambient must lie between -273 °C and 500 °C."))),
    HEAT_LIMIT("Heat limit", "the limit of all shunts together, such as 6 W; empty for none",
            board -> Words.text(board.heatLimit(), Dimension.POWER),
            (text, board) -> Words.positive(text, "the heat limit", Dimension.POWER)
                    .then(limit -> Reading.value(board.withHeatLimit(limit)))),
    ZONES("Zones", "each with its heat limit and its rise per watt, if any: port 2 W 12 K/W, starboard 1.5 W",
            BoardLists::zones, BoardLists::withZones),
    REFERENCES("References", "name = part number: quiet = REF-2V5", BoardLists::references,
            BoardLists::withReferences),
    ALERT_LINES("Alert lines", "names: alert, alert 2", BoardLists::alertLines, BoardLists::withAlertLines),
    BASIS("Accepted are", "limits (only inside) or coverage (also likely)",
            board -> switch (board.acceptance().basis()) {
                case LIMITS -> "limits";
                case COVERAGE -> "coverage";
            }, (text, board) -> switch (Words.plain(text)) {
                case "limits", "inside" -> Reading.value(board.withAcceptance(
                        new Acceptance(Acceptance.Basis.LIMITS, board.acceptance().coverage())));
                case "coverage", "likely" -> Reading.value(board.withAcceptance(
                        new Acceptance(Acceptance.Basis.COVERAGE, board.acceptance().coverage())));
                default ->
                    Reading.misread("Type limits (only inside is accepted) or coverage (likely is accepted too).");
            }),
    COVERAGE("Coverage probability", "50 % to below 100 %, such as 99.73 %",
            board -> QuantityWriter.write(board.acceptance().coverage(), Dimension.RATIO),
            (text, board) -> QuantityReader.number(text, Dimension.RATIO).then(value -> value >= 0.5 && value < 1
                    ? Reading.value(board.withAcceptance(new Acceptance(board.acceptance().basis(), value)))
                    : Reading.misread("The coverage probability must be from 50 % to below 100 %, got "
                            + QuantityWriter.show(value, Dimension.RATIO) + "."
                            + (value >= 50 && value < 100 ? " Maybe " + text.strip() + " % was meant." : "")))),
    BUILD_QUANTITY("Boards built at once", "decides the price breaks, such as 100",
            board -> Integer.toString(board.buildQuantity()),
            (text, board) -> whole(text, 1, 10_000_000).then(count -> Reading.value(board.withBuildQuantity(count)))),
    PARALLEL_SHUNTS("Most shunts in parallel", "1 to 8", board -> Integer.toString(board.rules().parallelShunts()),
            (text, board) -> whole(text, 1, 8)
                    .then(count -> Reading.value(board.withRules(board.rules().withParallelShunts(count))))),
    POWER_MARGIN("Share of rated power used", "above 0 to 100 %, such as 70 %",
            board -> QuantityWriter.write(board.rules().powerMargin(), Dimension.RATIO),
            (text, board) -> needed(text, "the share of rated power", Dimension.RATIO).then(value -> value <= 1
                    ? Reading.value(board.withRules(board.rules().withPowerMargin(value)))
                    : Reading.misread("The share of rated power must not be above 100 %. Write 70 % for 0.7."))),
    HEAT_STEP("Heats count as equal within", "a cheaper choice may be this much warmer, such as 50 mW; 0 W for never",
            board -> QuantityWriter.write(board.rules().heatStep(), Dimension.POWER),
            (text, board) -> QuantityReader.number(text, Dimension.POWER).then(value -> value >= 0
                    ? Reading.value(board.withRules(board.rules().withHeatStep(value)))
                    : Reading.misread("The heat step must not be below 0 W."))),
    TRIALS("Trials of each channel", "a number such as 1,000,000, or adaptive, 2 digits, most 10,000,000 (until the "
            + "standard uncertainty's digits are stable)", TrialsText::trials, TrialsText::withTrials),
    SEED("Seed of all draws", "a whole number; another seed gives other draws, the same seed the same figures",
            board -> Long.toString(board.uncertainty().sampling().seed()), TrialsText::withSeed),
    WANTED("Wanted, in this order",
            "the first decides, each next one among choices equally good: least heat, most even "
                    + "heat, least cost, fewest parts, widest margin",
            board -> PreferenceText.order(board.preference().order()),
            PreferenceText::withOrder),
    PART_NUMBER_COST("Cost of a part number", "of one more distinct part number in the whole build, in the catalogue's "
            + "currency, such as 12.50", PreferenceText::partNumberCost, PreferenceText::withPartNumberCost),
    ROUNDS("Rounds of the search", "0 to 1000000; more take longer and may find better choices",
            board -> Integer.toString(board.preference().rounds()),
            (text, board) -> whole(text, 0, Preference.MOST_ROUNDS)
                    .then(rounds -> Reading.value(board.withPreference(board.preference().withRounds(rounds))))),
    TIME_LIMIT("Time limit of the search",
            "such as 20 s; empty for none. What is found within it depends on the machine",
            PreferenceText::timeLimit, PreferenceText::withTimeLimit),
    CHOICE_SEED("Seed of the search", "a whole number; the same board, rounds and seed give the same plan",
            board -> Long.toString(board.preference().seed()), PreferenceText::withSeed);

    private final String title;
    private final String hint;
    private final Function<Board, String> writer;
    private final BiFunction<String, Board, Reading<Board>> reader;

    BoardField(String title, String hint, Function<Board, String> writer,
            BiFunction<String, Board, Reading<Board>> reader) {
        this.title = title;
        this.hint = hint;
        this.writer = writer;
        this.reader = reader;
    }

    public String title() {
        return title;
    }

    /** What can be typed. */
    public String hint() {
        return hint;
    }

    /** What the editor shows for a board; read back it gives the same board. */
    public String text(Board board) {
        return writer.apply(board);
    }

    /** The board with this text typed, or why not. */
    public Reading<Board> read(String text, Board board) {
        return reader.apply(text, board);
    }

    private static Reading<Double> needed(String text, String what, Dimension dimension) {
        return Words.positive(text, what, dimension).then(value -> {
            OptionalDouble given = value;
            return given.isPresent()
                    ? Reading.value(given.getAsDouble())
                    : Reading.misread(Words.capital(what) + " is needed.");
        });
    }

    private static Reading<Integer> whole(String text, int least, int most) {
        try {
            int count = Integer.parseInt(text.strip());
            if (count >= least && count <= most) {
                return Reading.value(count);
            }
        } catch (NumberFormatException _) {
            // told below with the allowed range
        }
        return Reading.misread("Type a whole number from " + least + " to " + most + ", got \"" + text.strip() + "\".");
    }
}
