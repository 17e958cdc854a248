package shuntwright.io.planfile;

import java.util.OptionalDouble;

import shuntwright.accuracy.Outcome;
import shuntwright.circuit.Surroundings;
import shuntwright.plan.AlertPlan;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Cure;
import shuntwright.plan.FamilyRefusal;
import shuntwright.plan.Finding;
import shuntwright.plan.Measure;
import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;
import shuntwright.plan.ReferencePlan;
import shuntwright.plan.Settings;
import shuntwright.plan.SharedUse;
import shuntwright.plan.SolvedChannel;
import shuntwright.plan.TapPlan;

/** The solved board. */
final class PlanTables {

    private static final Form<Settings> SETTINGS = ObjectTable.<Settings>named("settings",
            "Nominal voltages and currents for the bench.")
            .number("threshold", Unit.VOLT, "V_T when it trips", Settings::threshold)
            .range("thresholdLimits", Unit.VOLT, "its extremes", Settings::thresholdLimits)
            .maybeNumber("releaseVoltage", Unit.VOLT, "amplifier output at release; absent where it latches",
                    Settings::releaseVoltage)
            .number("tripShunt", Unit.VOLT, "shunt voltage at nominal trip", Settings::tripShunt)
            .number("outputAtLoad", Unit.VOLT, "amplifier output at the load current", Settings::outputAtLoad)
            .number("outputAtFull", Unit.VOLT, "amplifier output at full scale", Settings::outputAtFull).form();

    private static final Form<Surroundings.ZoneRise> ZONE_RISE = ObjectTable.<Surroundings.ZoneRise>named("zone rise",
            "Warming of a channel's parts by the heat of its zone.")
            .text("zone", "its name; all its channels share one draw", Surroundings.ZoneRise::zone)
            .number("most", Unit.KELVIN, "above ambient with every channel of the zone at its load current; the least "
                    + "is 0", Surroundings.ZoneRise::most)
            .form();

    private static final Form<SolvedChannel> SOLVED = ObjectTable.<SolvedChannel>named("solved channel",
            "A channel with chosen parts and everything computed of them.")
            .object("demand", DemandTables.DEMAND, "with defaults filled in", SolvedChannel::demand)
            .object("circuit", CircuitTables.CIRCUIT, "parts and values", SolvedChannel::circuit)
            .maybeObject("zoneRise", ZONE_RISE, "absent where the parts stay at ambient temperature",
                    each -> each.around().zone())
            .range("localTemperature", Unit.CELSIUS, "around its own parts: from the coldest ambient to the hottest "
                    + "with the zone's rise", each -> each.around().local())
            .object("settings", SETTINGS, "nominal figures for the bench", SolvedChannel::settings)
            .number("tripNominal", Unit.AMPERE, "trip current with every input nominal", each -> each.trip().nominal())
            .range("tripLimits", Unit.AMPERE, "its exact extremes", each -> each.trip().limits())
            .range("tripAllowed", Unit.AMPERE, "no-trip current to must-trip current", each -> each.trip().allowed())
            .maybeNumber("releaseNominal", Unit.AMPERE, "release current; absent where it latches",
                    each -> each.assessment(Outcome.RELEASE).map(it -> OptionalDouble.of(it.nominal()))
                            .orElseGet(OptionalDouble::empty))
            .maybeRange("releaseLimits", Unit.AMPERE, "its exact extremes",
                    each -> each.assessment(Outcome.RELEASE).map(it -> it.limits()))
            .maybeRange("releaseAllowed", Unit.AMPERE, "window in which it must re-arm",
                    each -> each.assessment(Outcome.RELEASE).map(it -> it.allowed()))
            .number("heat", Unit.WATT, "I_L²·R_s times diversity", SolvedChannel::heat)
            .number("cost", Unit.CURRENCY, "of its own parts for one board", SolvedChannel::cost)
            .number("margin", Unit.FRACTION, "smallest of all outcomes, of the allowed half-width",
                    SolvedChannel::margin)
            .list("inputs", AccuracyTables.INPUT, "the one description of the uncertain inputs", SolvedChannel::inputs)
            .list("assessments", AccuracyTables.ASSESSMENT, "trip first, then release and readings where asked",
                    SolvedChannel::assessments)
            .list("uncalibrated", AccuracyTables.ASSESSMENT, "readings as they would be without calibration; empty "
                    + "where nothing is calibrated", SolvedChannel::uncalibrated)
            .list("limits", CircuitTables.CHECK, "every limit with its numbers", SolvedChannel::limits).form();

    private static final Form<Measure> MEASURE = ObjectTable.<Measure>named("measure", "A number within a finding.")
            .text("name", "what it is", Measure::name)
            .numberIn(each -> Unit.of(each.dimension()), "value", "the number", Measure::value).form();

    private static final Form<Finding> FINDING = ObjectTable.<Finding>named("finding",
            "Something a user should know about a channel or the board.")
            .text("key", "what kind", each -> each.key().name())
            .text("words", "the kind in words", each -> each.key().words())
            .text("severity", "note, warning or fault", each -> each.key().severity().word())
            .maybeText("channel", "name of the channel; absent for the board", Finding::channel)
            .text("text", "one or two sentences", Finding::text)
            .list("measures", MEASURE, "the numbers", Finding::measures).form();

    private static final Form<Cure> CURE = ObjectTable.<Cure>named("cure",
            "A single change that was tried on a failing channel by solving it again.")
            .text("lever", "what kind of change", each -> each.lever().words())
            .text("change", "in words with numbers", Cure::change)
            .text("reached", "verdict with this change", each -> each.reached().word())
            .maybeNumber("margin", Unit.FRACTION, "smallest margin reached, of the allowed half-width",
                    each -> each.margin().map(OptionalDouble::of).orElseGet(OptionalDouble::empty))
            .number("size", Unit.PURE, "size of the change for ranking", Cure::size)
            .flag("cures", "whether the channel is then inside", Cure::cures)
            .maybeObject("edit", DemandTables.ASKED, "the demand with the change made", Cure::edit).form();

    private static final Form<FamilyRefusal> REFUSAL = ObjectTable.<FamilyRefusal>named("refusal",
            "Why no part of a family serves a channel.")
            .text("family", "kind of part", each -> each.family().word())
            .count("examined", "parts or combinations looked at", FamilyRefusal::examined)
            .count("refused", "how many of them this limit excludes", FamilyRefusal::refused)
            .text("nearest", "the part that misses by least", FamilyRefusal::nearest)
            .object("nearMiss", CircuitTables.CHECK, "its numbers", FamilyRefusal::nearMiss).form();

    private static final Form<ChannelPlan> CHANNEL = ObjectTable
            .<ChannelPlan>named("channel", "The plan of one channel.")
            .text("name", "of the channel", each -> each.channel().name())
            .object("asked", DemandTables.ASKED, "what was typed", ChannelPlan::channel)
            .text("verdict", "inside, likely, outside, no fit or incomplete", each -> each.verdict().word())
            .flag("accepted", "whether the board's acceptance takes that verdict", ChannelPlan::accepted)
            .maybeObject("solved", SOLVED, "parts and numbers; absent for no fit and incomplete", ChannelPlan::solved)
            .list("findings", FINDING, "most serious first", ChannelPlan::findings)
            .list("cures", CURE, "the smallest that cures first", ChannelPlan::cures)
            .list("refusals", REFUSAL, "why no part fits, by family", ChannelPlan::refusals).form();

    private static final Form<SharedUse> SHARED = ObjectTable.<SharedUse>named("shared use",
            "What all channels together take of a shared thing.")
            .text("kind", "supply, reference, board heat, zone heat or zone rise (above ambient, by limits)",
                    each -> switch (each.kind()) {
                        case SUPPLY -> "supply";
                        case REFERENCE -> "reference";
                        case BOARD_HEAT -> "board heat";
                        case ZONE_HEAT -> "zone heat";
                        case ZONE_RISE -> "zone rise";
                    })
            .text("name", "which one", SharedUse::name)
            .numberIn(each -> Unit.of(each.dimension()), "used", "by all channels", SharedUse::used)
            .maybeNumberIn(each -> Unit.of(each.dimension()), "limit", "absent when none is set", SharedUse::limit)
            .flag("holds", "no limit, or kept", SharedUse::holds).form();

    private static final Form<AlertPlan> ALERT = ObjectTable.<AlertPlan>named("alert plan",
            "An alert line with its pull-up.")
            .object("line", BoardTables.ALERT_LINE, "as asked", AlertPlan::line)
            .texts("channels", "that pull it", AlertPlan::channels)
            .number("pullUp", Unit.OHM, "chosen or given", AlertPlan::pullUp)
            .maybeRange("allowed", Unit.OHM, "satisfies levels, sink current and rise time; absent when empty",
                    AlertPlan::allowed)
            .number("least", Unit.OHM, "smallest that sink current and low level allow", AlertPlan::least)
            .number("most", Unit.OHM, "largest that high level and rise time allow", AlertPlan::most)
            .number("current", Unit.AMPERE, "largest through it while pulled low", AlertPlan::current).form();

    private static final Form<ReferencePlan> REFERENCE = ObjectTable.<ReferencePlan>named("reference plan",
            "A reference of the board with its part.")
            .text("name", "what channels, taps and the ADC call it", ReferencePlan::name)
            .object("part", PartTables.REFERENCE, "with its limits", ReferencePlan::part)
            .number("load", Unit.AMPERE, "current of all dividers from it", ReferencePlan::load).form();

    private static final Form<TapPlan> TAP = ObjectTable.<TapPlan>named("tap plan", "A tap with its chosen voltage.")
            .object("tap", BoardTables.TAP, "as asked", TapPlan::tap)
            .texts("channels", "that use it", TapPlan::channels)
            .maybeObject("threshold", CircuitTables.THRESHOLD, "how its voltage is made; absent when none was found",
                    TapPlan::threshold)
            .form();

    private static final Form<PartUse> PART = ObjectTable.<PartUse>named("part use",
            "A line of the consolidated parts list.")
            .text("partNumber", "what to order", PartUse::partNumber)
            .text("description", "with its value", PartUse::description)
            .count("quantity", "pieces on one board", PartUse::quantity)
            .texts("designators", "of those pieces, letters by IEEE 315", PartUse::designators)
            .texts("users", "channels or shared circuits served, one for each designator", PartUse::users)
            .object("purchase", PartTables.PURCHASE, "how it is sold", PartUse::purchase).form();

    static final ObjectTable<Plan> PLAN = ObjectTable.<Plan>named("plan", "The whole file.")
            .text("format", "always \"" + PlanFile.FORMAT + "\"", _ -> PlanFile.FORMAT)
            .texts("cautions", "what a user of these numbers must know", Cautions::of)
            .flag("accepted", "every channel is accepted and no finding about the board is a fault", Plan::accepted)
            .text("currency", "ISO 4217 code of all costs", Plan::currency)
            .number("costPerBoard", Unit.CURRENCY, "parts of one board at the prices of the build quantity",
                    Plan::costPerBoard)
            .number("buildCost", Unit.CURRENCY, "of the whole build: the cheapest order that covers each part's need "
                    + "(whole packs, minimum order, more than needed where a price break makes that cheaper), and the "
                    + "cost of each distinct part number", Plan::buildCost)
            .object("board", BoardTables.BOARD, "what was asked", Plan::board)
            .list("channels", CHANNEL, "in the board's order", Plan::channels)
            .list("shared", SHARED, "supply, references, heat", Plan::shared)
            .list("alerts", ALERT, "alert lines", Plan::alerts).list("taps", TAP, "shared thresholds", Plan::taps)
            .list("references", REFERENCE, "with their parts", Plan::references)
            .list("parts", PART, "the consolidated parts list", Plan::parts)
            .list("findings", FINDING, "about the board as a whole", Plan::findings)
            .maybeObject("choice", ChoiceTables.CHOICE,
                    "how all channels were chosen together; absent for a board that "
                            + "was only checked",
                    Plan::choice)
            .maybeObject("study", StudyTables.STUDY, "propagated distributions; absent until sampled", Plan::study);

    private PlanTables() {
    }
}
