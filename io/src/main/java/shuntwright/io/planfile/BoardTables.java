package shuntwright.io.planfile;

import java.util.List;

import shuntwright.board.Acceptance;
import shuntwright.board.Adc;
import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.DesignRules;
import shuntwright.board.SenseSupply;
import shuntwright.board.Tap;
import shuntwright.board.Zone;

/** What was asked of the board as a whole, with defaults filled in. */
final class BoardTables {

    private static final Form<SenseSupply> SUPPLY = ObjectTable.<SenseSupply>named("sense supply",
            "The supply that all sense circuits share.")
            .object("voltage", CommonTables.TOLERANCED_VOLTAGE, "over temperature, load and life", SenseSupply::voltage)
            .number("availableCurrent", Unit.AMPERE, "for all sense circuits together", SenseSupply::availableCurrent)
            .form();

    private static final Form<BoardReference> REFERENCE = ObjectTable.<BoardReference>named("board reference",
            "A precision reference of the board.")
            .text("name", "what channels, taps and the ADC call it", BoardReference::name)
            .text("part", "its part number", BoardReference::part).form();

    private static final Form<Adc> ADC = ObjectTable.<Adc>named("adc", "The converter that reads amplifier outputs.")
            .text("source", "\"supply\" or the name of the reference that is its full scale",
                    each -> each.source().word())
            .count("bits", "resolution", Adc::bits)
            .number("gainError", Unit.FRACTION, "limit of its magnitude, without the source's error", Adc::gainError)
            .number("offset", Unit.VOLT, "limit of its magnitude", Adc::offset)
            .number("nonlinearity", Unit.STEP, "integral non-linearity, limit of its magnitude", Adc::nonlinearity)
            .form();

    static final Form<AlertLine> ALERT_LINE = ObjectTable.<AlertLine>named("alert line",
            "A wired line that comparators pull low, as asked.")
            .text("name", "what channels call it", AlertLine::name)
            .maybeObject("voltage", CommonTables.TOLERANCED_VOLTAGE,
                    "supply of the pull-up; without it the sense supply", AlertLine::voltage)
            .maybeNumber("pullUp", Unit.OHM, "pinned pull-up; without it the program chooses", AlertLine::pullUp)
            .maybeNumber("inputHigh", Unit.VOLT, "least voltage taken as high; without it 0.7 of the pull-up's supply",
                    AlertLine::inputHigh)
            .maybeNumber("inputLow", Unit.VOLT, "largest voltage taken as low; without it 0.3 of the pull-up's supply",
                    AlertLine::inputLow)
            .number("inputLeakage", Unit.AMPERE, "largest input current of the receiver", AlertLine::inputLeakage)
            .number("capacitance", Unit.FARAD, "of line and receiver", AlertLine::capacitance)
            .maybeNumber("riseTime", Unit.SECOND, "longest allowed 30 % to 70 % rise time", AlertLine::riseTime).form();

    private static final ObjectTable<Tap.Kind.Divider> TAP_DIVIDER = ObjectTable.<Tap.Kind.Divider>variant(
            "tap divider", "divider", "A tap made by a resistor divider, as asked.")
            .maybeNumber("top", Unit.OHM, "pinned resistance from source to tap", Tap.Kind.Divider::top)
            .maybeNumber("bottom", Unit.OHM, "pinned resistance from tap to ground", Tap.Kind.Divider::bottom);

    static final ObjectTable<Tap.Kind.Dac> TAP_DAC = ObjectTable.<Tap.Kind.Dac>variant("dac", "dac",
            "A tap made by a DAC whose full scale is the source's voltage.")
            .count("bits", "resolution", Tap.Kind.Dac::bits)
            .number("gainError", Unit.FRACTION, "limit of its magnitude", Tap.Kind.Dac::gainError)
            .number("offset", Unit.VOLT, "limit of its magnitude", Tap.Kind.Dac::offset)
            .number("nonlinearity", Unit.STEP, "limit of its magnitude", Tap.Kind.Dac::nonlinearity);

    private static final Form<Tap.Kind> TAP_KIND = new Form.Either<>(List.of(TAP_DIVIDER, TAP_DAC),
            kind -> switch (kind) {
                case Tap.Kind.Divider divider -> new Form.Chosen<>(TAP_DIVIDER, divider);
                case Tap.Kind.Dac dac -> new Form.Chosen<>(TAP_DAC, dac);
            });

    static final Form<Tap> TAP = ObjectTable.<Tap>named("tap", "A threshold that several channels share, as asked.")
            .text("name", "what channels call it", Tap::name)
            .text("source", "\"supply\" or the name of a reference", each -> each.source().word())
            .object("made", TAP_KIND, "how its voltage is made", Tap::kind)
            .maybeNumber("voltage", Unit.VOLT, "wanted; without it the program chooses", Tap::voltage).form();

    private static final Form<Zone> ZONE = ObjectTable.<Zone>named("zone", "An area of the board.")
            .text("name", "what channels call it", Zone::name)
            .maybeNumber("heatLimit", Unit.WATT, "largest heat of its shunts together", Zone::heatLimit)
            .maybeNumber("thermalResistance", Unit.KELVIN_PER_WATT, "from the zone's board to the air: its own heat "
                    + "warms every part of its channels by this; absent where they stay at ambient temperature",
                    Zone::thermalResistance)
            .form();

    private static final Form<Acceptance> ACCEPTANCE = ObjectTable.<Acceptance>named("acceptance",
            "When a channel counts as accepted.")
            .text("basis", "\"limits\": only channels inside by limits; \"coverage\": also those whose coverage "
                    + "interval is within the demand", each -> switch (each.basis()) {
                        case LIMITS -> "limits";
                        case COVERAGE -> "coverage";
                    })
            .number("coverage", Unit.FRACTION, "coverage probability of coverage intervals", Acceptance::coverage)
            .form();

    private static final Form<DesignRules> RULES = ObjectTable.<DesignRules>named("design rules",
            "Rules that hold for every channel.")
            .count("parallelShunts", "most shunts in parallel in one channel", DesignRules::parallelShunts)
            .number("powerMargin", Unit.FRACTION, "share of a shunt's rated power that may be used",
                    DesignRules::powerMargin)
            .number("dividerCurrent", Unit.AMPERE, "largest current one divider may draw", DesignRules::dividerCurrent)
            .number("biasShare", Unit.FRACTION, "largest share of the threshold by which bias current may shift it",
                    DesignRules::biasShare)
            .maybeText("resistors", "resistor series to use; without it the program chooses", DesignRules::resistors)
            .number("heatStep", Unit.WATT, "heats within this much of the least count as equal when parts are chosen",
                    DesignRules::heatStep)
            .number("shuntGradient", Unit.KELVIN, "temperature difference along a shunt that its thermal EMF sees",
                    DesignRules::shuntGradient)
            .number("inputResistance", Unit.OHM, "resistor in each amplifier input lead", DesignRules::inputResistance)
            .number("inputMismatch", Unit.FRACTION, "relative mismatch of those two resistors",
                    DesignRules::inputMismatch)
            .form();

    static final Form<Board> BOARD = ObjectTable.<Board>named("board",
            "What was asked of the board as a whole; what was asked of each channel stands with the channel.")
            .text("name", "title", Board::name).text("description", "free text", Board::description)
            .texts("partsFiles", "parts files used", Board::partsFiles)
            .count("buildQuantity", "boards built at once; decides the price breaks", Board::buildQuantity)
            .range("ambient", Unit.CELSIUS, "temperature of the air around the parts", Board::ambient)
            .object("supply", SUPPLY, "the sense supply", Board::supply)
            .list("references", REFERENCE, "precision references", Board::references)
            .maybeObject("adc", ADC, "converter; absent when nothing is read", Board::adc)
            .list("alertLines", ALERT_LINE, "wired lines", Board::alertLines)
            .list("taps", TAP, "shared thresholds", Board::taps).list("zones", ZONE, "areas of the board", Board::zones)
            .maybeNumber("heatLimit", Unit.WATT, "largest heat of all shunts together", Board::heatLimit)
            .object("acceptance", ACCEPTANCE, "when a channel is accepted", Board::acceptance)
            .object("rules", RULES, "design rules", Board::rules)
            .object("uncertainty", UncertaintyTables.UNCERTAINTY, "distributions and trials", Board::uncertainty)
            .object("preference", ChoiceTables.PREFERENCE, "what was wanted of the board-wide choice",
                    Board::preference)
            .form();

    private BoardTables() {
    }
}
