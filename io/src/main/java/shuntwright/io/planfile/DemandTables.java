package shuntwright.io.planfile;

import java.util.List;

import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Pins;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.ThresholdDemand;
import shuntwright.board.Withstand;

/** What was asked of a channel: as typed, and with defaults filled in. */
final class DemandTables {

    private static final Form<Channel.Currents> CURRENTS = ObjectTable.<Channel.Currents>named("currents asked",
            "Currents of the demand as typed; absent ones were not typed.")
            .maybeNumber("load", Unit.AMPERE, "continuous in normal service", Channel.Currents::load)
            .maybeNumber("noTrip", Unit.AMPERE, "largest that must never trip", Channel.Currents::noTrip)
            .maybeNumber("mustTrip", Unit.AMPERE, "by this current it must have tripped", Channel.Currents::mustTrip)
            .maybeNumber("tripTarget", Unit.AMPERE, "wanted trip current", Channel.Currents::tripTarget)
            .maybeNumber("least", Unit.AMPERE, "smallest to be read", Channel.Currents::least)
            .maybeNumber("fullScale", Unit.AMPERE, "largest the ADC must still read", Channel.Currents::fullScale)
            .form();

    private static final ObjectTable<ReleaseDemand.Between> BETWEEN = ObjectTable.variant("release between", "between",
            "Re-arms above the load current and below the no-trip current.");
    private static final ObjectTable<ReleaseDemand.Window> WINDOW = ObjectTable.<ReleaseDemand.Window>variant(
            "release window", "window", "Re-arms within a given window.")
            .range("window", Unit.AMPERE, "currents in which it must re-arm", ReleaseDemand.Window::window);
    private static final ObjectTable<ReleaseDemand.Latch> LATCH = ObjectTable.variant("release latch", "latch",
            "Stays tripped until it is reset.");
    private static final Form<ReleaseDemand> RELEASE = new Form.Either<>(List.of(BETWEEN, WINDOW, LATCH),
            release -> switch (release) {
                case ReleaseDemand.Between between -> new Form.Chosen<>(BETWEEN, between);
                case ReleaseDemand.Window window -> new Form.Chosen<>(WINDOW, window);
                case ReleaseDemand.Latch latch -> new Form.Chosen<>(LATCH, latch);
            });

    private static final Form<Channel.ReadingDemand> READING = ObjectTable.<Channel.ReadingDemand>named("reading asked",
            "Largest reading errors allowed, of the current; absent where nothing is asked.")
            .maybeNumber("atLeast", Unit.FRACTION, "at the least current", Channel.ReadingDemand::atLeast)
            .maybeNumber("atLoad", Unit.FRACTION, "at the load current", Channel.ReadingDemand::atLoad)
            .maybeObject("calibration", UncertaintyTables.CALIBRATION, "at production; absent where none is",
                    Channel.ReadingDemand::calibration)
            .form();

    private static final ObjectTable<ThresholdDemand.Free> FREE = ObjectTable.variant("threshold free", "free",
            "An own divider from the supply or any reference, whichever serves best.");
    private static final ObjectTable<ThresholdDemand.OwnDivider> OWN = ObjectTable.<ThresholdDemand.OwnDivider>variant(
            "threshold own divider", "own divider", "An own divider.")
            .text("source", "\"supply\" or the name of a reference", each -> each.source().word());
    private static final ObjectTable<ThresholdDemand.SharedTap> SHARED = ObjectTable.<ThresholdDemand.SharedTap>variant(
            "threshold shared tap", "shared tap", "A tap shared with others.")
            .text("tap", "its name", ThresholdDemand.SharedTap::tap);
    private static final Form<ThresholdDemand> THRESHOLD = new Form.Either<>(List.of(FREE, OWN, SHARED),
            threshold -> switch (threshold) {
                case ThresholdDemand.Free free -> new Form.Chosen<>(FREE, free);
                case ThresholdDemand.OwnDivider own -> new Form.Chosen<>(OWN, own);
                case ThresholdDemand.SharedTap shared -> new Form.Chosen<>(SHARED, shared);
            });

    private static final ObjectTable<Withstand.Energy> ENERGY = ObjectTable.<Withstand.Energy>variant(
            "withstand energy", "energy", "An I²t value.")
            .number("value", Unit.AMPERE_SQUARED_SECOND, "I²t survived", Withstand.Energy::value);
    private static final ObjectTable<Withstand.Curve> CURVE = ObjectTable.<Withstand.Curve>variant("withstand curve",
            "curve", "A drawn curve, straight on log-log axes.")
            .list("points", CommonTables.POINT, "longest time for each current", Withstand.Curve::points);
    private static final ObjectTable<Withstand.Conductor> CONDUCTOR = ObjectTable.<Withstand.Conductor>variant(
            "withstand conductor", "conductor", "A conductor, t = (k·S/I)².")
            .number("area", Unit.SQUARE_MILLIMETRE, "S", Withstand.Conductor::area)
            .number("constant", Unit.CONDUCTOR_CONSTANT, "k", Withstand.Conductor::constant);
    private static final Form<Withstand> WITHSTAND = new Form.Either<>(List.of(ENERGY, CURVE, CONDUCTOR),
            withstand -> switch (withstand) {
                case Withstand.Energy energy -> new Form.Chosen<>(ENERGY, energy);
                case Withstand.Curve curve -> new Form.Chosen<>(CURVE, curve);
                case Withstand.Conductor conductor -> new Form.Chosen<>(CONDUCTOR, conductor);
            });

    private static final Form<Channel.Stress> STRESS = ObjectTable.<Channel.Stress>named("stress",
            "What the output must endure; absent values were not typed.")
            .maybeNumber("fault", Unit.AMPERE, "prospective short-circuit current at the output", Channel.Stress::fault)
            .maybeNumber("clearingTime", Unit.SECOND, "longest time a fault flows", Channel.Stress::clearingTime)
            .list("inrush", CommonTables.POINT, "profile at switch-on that must not trip", Channel.Stress::inrush)
            .maybeObject("withstand", WITHSTAND, "what the wire, trace or switch survives", Channel.Stress::withstand)
            .form();

    private static final Form<Pins> PINS = ObjectTable.<Pins>named("pins",
            "Parts and values the user has fixed; absent ones were free.")
            .maybeText("shunt", "part number", Pins::shunt)
            .maybeCount("shuntCount", "shunts in parallel", Pins::shuntCount)
            .maybeText("amplifier", "part number", Pins::amplifier)
            .maybeText("comparator", "part number", Pins::comparator)
            .maybeText("resistors", "part number of the series of divider and hysteresis resistors", Pins::resistors)
            .maybeNumber("dividerTop", Unit.OHM, "R_t", Pins::dividerTop)
            .maybeNumber("dividerBottom", Unit.OHM, "R_b", Pins::dividerBottom)
            .maybeNumber("hysteresisResistor", Unit.OHM, "R_H or R_F", Pins::hysteresisResistor).form();

    static final Form<Channel> ASKED = ObjectTable.<Channel>named("channel asked", "A channel's demand as typed.")
            .text("note", "free text", Channel::note)
            .maybeObject("rail", CommonTables.VOLTAGES, "voltage the rail sits at", Channel::rail)
            .text("side", "\"high\": the shunt stands in the rail; \"low\": in the return",
                    each -> switch (each.side()) {
                        case HIGH -> "high";
                        case LOW -> "low";
                    })
            .object("currents", CURRENTS, "what must pass and what must trip", Channel::currents)
            .object("release", RELEASE, "what happens after a trip", Channel::release)
            .object("reading", READING, "accuracy asked of the reading", Channel::reading)
            .object("threshold", THRESHOLD, "where the threshold may come from", Channel::threshold)
            .maybeText("alertLine", "name of the line it pulls; without it the board's first", Channel::alertLine)
            .maybeText("zone", "name of the zone its shunt heats", Channel::zone)
            .number("diversity", Unit.FRACTION, "share of its heat counted in totals", Channel::diversity)
            .object("stress", STRESS, "inrush, fault and withstand", Channel::stress)
            .object("pins", PINS, "what was fixed", Channel::pins).form();

    static final Form<Demand> DEMAND = ObjectTable.<Demand>named("demand", "A demand with every default filled in.")
            .object("commonMode", CommonTables.VOLTAGES, "what the amplifier's inputs sit at", Demand::commonMode)
            .number("load", Unit.AMPERE, "I_L", Demand::load)
            .range("tripWindow", Unit.AMPERE, "no-trip current to must-trip current", Demand::tripWindow)
            .number("tripTarget", Unit.AMPERE, "I_T, by default √(I_NT·I_MT)", Demand::tripTarget)
            .maybeRange("rearm", Unit.AMPERE, "window in which it must re-arm; absent where it latches", Demand::rearm)
            .number("fullScale", Unit.AMPERE, "I_FS, by default the must-trip current", Demand::fullScale).form();

    private DemandTables() {
    }
}
