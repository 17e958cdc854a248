package shuntwright.io.planfile;

import java.util.List;

import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;

/** Chosen circuits and the limits they keep to. */
final class CircuitTables {

    private static final Form<SourceVoltage> SOURCE = ObjectTable.<SourceVoltage>named("source voltage",
            "The voltage a threshold starts from, with everything that moves it.")
            .text("source", "\"supply\" or the name of a reference", each -> each.source().word())
            .object("voltage", CommonTables.TOLERANCED_VOLTAGE,
                    "as delivered (reference) or in total (supply)", SourceVoltage::voltage)
            .number("drift", Unit.PER_KELVIN, "limit of its magnitude, referred to 25 °C", SourceVoltage::drift)
            .number("ageing", Unit.FRACTION, "largest relative change over life", SourceVoltage::ageing)
            .number("loadDrop", Unit.VOLT, "largest fall at full load", SourceVoltage::loadDrop).form();

    private static final ObjectTable<Threshold.Divider> DIVIDER = ObjectTable.<Threshold.Divider>variant("divider",
            "divider", "R_t from the source to the node, R_b to ground.")
            .object("source", SOURCE, "where R_t starts", Threshold.Divider::source)
            .number("top", Unit.OHM, "R_t", Threshold.Divider::top)
            .number("bottom", Unit.OHM, "R_b", Threshold.Divider::bottom)
            .text("tap", "name of the tap that shares it; empty for the channel's own", Threshold.Divider::tap)
            .count("users", "comparators whose bias current loads the node", Threshold.Divider::users)
            .number("openVoltage", Unit.VOLT, "nominal, without load", Threshold.Divider::openVoltage)
            .number("parallel", Unit.OHM, "R_t ∥ R_b", Threshold.Divider::parallel);
    private static final ObjectTable<Threshold.DacOutput> DAC = ObjectTable.<Threshold.DacOutput>variant("dac output",
            "dac", "A DAC output shared as a tap.")
            .object("source", SOURCE, "full scale", Threshold.DacOutput::source)
            .object("dac", BoardTables.TAP_DAC.form(), "its errors", Threshold.DacOutput::dac)
            .count("code", "input code", Threshold.DacOutput::code)
            .text("tap", "name of the tap", Threshold.DacOutput::tap)
            .number("openVoltage", Unit.VOLT, "nominal", Threshold.DacOutput::openVoltage);
    static final Form<Threshold> THRESHOLD = new Form.Either<>(List.of(DIVIDER, DAC), threshold -> switch (threshold) {
        case Threshold.Divider divider -> new Form.Chosen<>(DIVIDER, divider);
        case Threshold.DacOutput dac -> new Form.Chosen<>(DAC, dac);
    });

    private static final ObjectTable<HysteresisNetwork.None> NO_NETWORK = ObjectTable.variant("no hysteresis network",
            "none", "Nothing but what is built in, or a latch.");
    private static final ObjectTable<HysteresisNetwork.SenseResistor> SENSE_RESISTOR = ObjectTable.<HysteresisNetwork.SenseResistor>variant(
            "sense resistor", "sense resistor",
            "A resistor between amplifier output and sense input.")
            .number("resistance", Unit.OHM, "R_H", HysteresisNetwork.SenseResistor::resistance);
    private static final ObjectTable<HysteresisNetwork.Feedback> FEEDBACK = ObjectTable.<HysteresisNetwork.Feedback>variant(
            "feedback network", "feedback",
            "A resistor from the output back to the threshold node.")
            .number("resistance", Unit.OHM, "R_F", HysteresisNetwork.Feedback::resistance)
            .number("pullUp", Unit.OHM, "R_PU", HysteresisNetwork.Feedback::pullUp)
            .object("pullVoltage", CommonTables.TOLERANCED_VOLTAGE, "V_IO", HysteresisNetwork.Feedback::pullVoltage)
            .flag("supplied", "true where V_IO is the sense supply", HysteresisNetwork.Feedback::supplied);
    private static final Form<HysteresisNetwork> NETWORK = new Form.Either<>(
            List.of(NO_NETWORK, SENSE_RESISTOR, FEEDBACK), network -> switch (network) {
                case HysteresisNetwork.None none -> new Form.Chosen<>(NO_NETWORK, none);
                case HysteresisNetwork.SenseResistor resistor -> new Form.Chosen<>(SENSE_RESISTOR, resistor);
                case HysteresisNetwork.Feedback feedback -> new Form.Chosen<>(FEEDBACK, feedback);
            });

    static final Form<SenseCircuit> CIRCUIT = ObjectTable.<SenseCircuit>named("sense circuit",
            "Chosen parts and values of a channel.")
            .object("shunt", PartTables.SHUNT, "part", SenseCircuit::shunt)
            .count("shuntCount", "in parallel", SenseCircuit::shuntCount)
            .number("resistance", Unit.OHM, "R_s, all in parallel with the middle of their mounting resistance",
                    SenseCircuit::resistance)
            .object("amplifier", PartTables.AMPLIFIER, "part", SenseCircuit::amplifier)
            .object("comparator", PartTables.COMPARATOR, "part", SenseCircuit::comparator)
            .object("threshold", THRESHOLD, "how the threshold is made", SenseCircuit::threshold)
            .object("network", NETWORK, "parts that make the hysteresis", SenseCircuit::network)
            .object("resistors", PartTables.RESISTORS, "series of divider and hysteresis resistors",
                    SenseCircuit::resistors)
            .form();

    static final Form<LimitCheck> CHECK = ObjectTable.<LimitCheck>named("limit check", "A limit applied to a circuit.")
            .text("limit", "name of the limit", each -> each.limit().name())
            .text("words", "what must hold", each -> each.limit().words())
            .text("family", "kind of part it excludes", each -> each.limit().family().word())
            .numberIn(CircuitTables::unit, "reached", "the circuit's value", LimitCheck::reached)
            .numberIn(CircuitTables::unit, "bound", "what it must keep to", LimitCheck::bound)
            .flag("atMost", "true when it must not exceed the bound, false when it must not fall below",
                    LimitCheck::atMost)
            .flag("holds", "whether it is kept", LimitCheck::holds).form();

    private CircuitTables() {
    }

    private static Unit unit(LimitCheck check) {
        return Unit.of(check.limit().dimension());
    }
}
