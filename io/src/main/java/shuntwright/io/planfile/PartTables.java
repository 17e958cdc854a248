package shuntwright.io.planfile;

import java.util.List;

import shuntwright.parts.AmplifierRanges;
import shuntwright.parts.Comparator;
import shuntwright.parts.ComparatorInputs;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.InputErrors;
import shuntwright.parts.OpenDrainOutput;
import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.parts.Reference;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;

/** Chosen parts with the limits their data sheets state. */
final class PartTables {

    private static final String PART_NUMBER = "unique within the catalogue";
    private static final String MAGNITUDE = "limit of its magnitude";

    private static final Form<PriceBreak> PRICE = ObjectTable.<PriceBreak>named("price break",
            "The price of one piece from an order quantity upwards.")
            .count("quantity", "smallest order quantity at this price", PriceBreak::quantity)
            .number("unitPrice", Unit.CURRENCY, "price of one piece", PriceBreak::unitPrice).form();

    static final Form<Purchase> PURCHASE = ObjectTable.<Purchase>named("purchase", "How a part is sold.")
            .text("body", "package or case", Purchase::body)
            .list("prices", PRICE, "by ascending quantity; empty when no price is known", Purchase::prices)
            .count("packSize", "orders are whole packs of so many pieces", Purchase::packSize)
            .count("minimumOrder", "smallest order in pieces", Purchase::minimumOrder)
            .text("supplier", "free text", Purchase::supplier).text("lifecycle", "free text", Purchase::lifecycle)
            .form();

    private static final Form<ShuntRating> RATING = ObjectTable.<ShuntRating>named("shunt rating",
            "What a shunt endures; rated power falls linearly from the rated to the maximum temperature.")
            .number("power", Unit.WATT, "rated dissipation of one piece", ShuntRating::power)
            .number("ratedTemperature", Unit.CELSIUS, "to which the rating is constant", ShuntRating::ratedTemperature)
            .number("maximumTemperature", Unit.CELSIUS, "at which the rating is zero", ShuntRating::maximumTemperature)
            .number("thermalResistance", Unit.KELVIN_PER_WATT, "element to ambient, mounted",
                    ShuntRating::thermalResistance)
            .maybeNumber("pulseEnergy", Unit.JOULE, "of a single short pulse", ShuntRating::pulseEnergy).form();

    static final Form<Shunt> SHUNT = ObjectTable.<Shunt>named("shunt", "A current sense resistor.")
            .text("partNumber", PART_NUMBER, Shunt::partNumber).text("description", "free text", Shunt::description)
            .number("resistance", Unit.OHM, "nominal at 25 °C", Shunt::resistance)
            .number("toleranceBelow", Unit.FRACTION, "as delivered, at 25 °C", each -> each.tolerance().below())
            .number("toleranceAbove", Unit.FRACTION, "as delivered, at 25 °C", each -> each.tolerance().above())
            .number("temperatureCoefficient", Unit.PER_KELVIN, MAGNITUDE + ", referred to 25 °C",
                    Shunt::temperatureCoefficient)
            .number("ageing", Unit.FRACTION, "largest relative change over life", Shunt::ageing)
            .number("correlation", Unit.FRACTION, "between pieces of one reel", Shunt::correlation)
            .count("terminals", "two or four", each -> switch (each.terminals()) {
                case TWO -> 2;
                case FOUR -> 4;
            })
            .range("mountingResistance", Unit.OHM, "series resistance of the joints at 20 °C that is measured along",
                    Shunt::mountingResistance)
            .number("thermalEmf", Unit.VOLT_PER_KELVIN, MAGNITUDE + " against copper", Shunt::thermalEmf)
            .object("rating", RATING, "power, temperatures, pulse", Shunt::rating).form();

    private static final Form<InputErrors> INPUT_ERRORS = ObjectTable.<InputErrors>named("amplifier input errors",
            "Errors that act like a voltage at the input; each limits a magnitude.")
            .number("offset", Unit.VOLT, "at 25 °C and the voltages stated below", InputErrors::offset)
            .number("offsetDrift", Unit.VOLT_PER_KELVIN, "referred to 25 °C", InputErrors::offsetDrift)
            .number("rejection", Unit.DECIBEL, "common-mode rejection", InputErrors::rejection)
            .number("commonModeSpec", Unit.VOLT, "common-mode voltage of the stated offset",
                    InputErrors::commonModeSpec)
            .number("supplyRejection", Unit.DECIBEL, "supply rejection", InputErrors::supplyRejection)
            .number("supplySpec", Unit.VOLT, "supply voltage of the stated offset", InputErrors::supplySpec)
            .number("biasCurrent", Unit.AMPERE, "input bias current", InputErrors::biasCurrent).form();

    private static final Form<AmplifierRanges> RANGES = ObjectTable.<AmplifierRanges>named("amplifier ranges",
            "Where a sense amplifier works.")
            .range("commonMode", Unit.VOLT, "voltage its inputs may sit at", AmplifierRanges::commonMode)
            .number("differential", Unit.VOLT, "largest input difference it amplifies", AmplifierRanges::differential)
            .number("survival", Unit.VOLT, "largest input difference it survives", AmplifierRanges::survival)
            .range("supply", Unit.VOLT, "supply voltage", AmplifierRanges::supply)
            .number("outputHeadroom", Unit.VOLT, "how far below the supply the output stays linear",
                    AmplifierRanges::outputHeadroom)
            .number("outputLow", Unit.VOLT, "lowest linear output voltage", AmplifierRanges::outputLow).form();

    static final Form<SenseAmplifier> AMPLIFIER = ObjectTable.<SenseAmplifier>named("sense amplifier",
            "A current sense amplifier of fixed gain.")
            .text("partNumber", PART_NUMBER, SenseAmplifier::partNumber)
            .text("description", "free text", SenseAmplifier::description)
            .number("gain", Unit.VOLT_PER_VOLT, "G", SenseAmplifier::gain)
            .number("gainError", Unit.FRACTION, MAGNITUDE + " at 25 °C", SenseAmplifier::gainError)
            .number("gainDrift", Unit.PER_KELVIN, MAGNITUDE + ", referred to 25 °C", SenseAmplifier::gainDrift)
            .number("gainAgeing", Unit.FRACTION, "largest relative change of the gain over life",
                    SenseAmplifier::gainAgeing)
            .object("input", INPUT_ERRORS, "errors at the input", SenseAmplifier::input)
            .object("ranges", RANGES, "where it works", SenseAmplifier::ranges)
            .number("bandwidth", Unit.HERTZ, "-3 dB at this gain", SenseAmplifier::bandwidth)
            .number("slewRate", Unit.VOLT_PER_SECOND, "of the output", SenseAmplifier::slewRate)
            .number("supplyCurrent", Unit.AMPERE, "largest of the whole package", SenseAmplifier::supplyCurrent)
            .count("sections", "amplifiers in one package", SenseAmplifier::sections).form();

    private static final Form<ComparatorInputs> COMPARATOR_INPUTS = ObjectTable.<ComparatorInputs>named(
            "comparator inputs", "What a comparator's inputs need and err by.")
            .number("offset", Unit.VOLT, MAGNITUDE + " at 25 °C", ComparatorInputs::offset)
            .number("offsetDrift", Unit.VOLT_PER_KELVIN, MAGNITUDE, ComparatorInputs::offsetDrift)
            .range("biasCurrent", Unit.AMPERE, "into an input; negative where it flows out",
                    ComparatorInputs::biasCurrent)
            .number("lowest", Unit.VOLT, "lowest input voltage at which it compares", ComparatorInputs::lowest)
            .number("headroom", Unit.VOLT, "how far below the supply the threshold must stay",
                    ComparatorInputs::headroom)
            .form();

    private static final ObjectTable<Hysteresis.InjectedCurrent> INJECTED = ObjectTable.<Hysteresis.InjectedCurrent>variant(
            "injected current", "injected current",
            "While tripped it drives a current out of its sense input.")
            .object("current", CommonTables.TOLERANCED_CURRENT, "I_H", Hysteresis.InjectedCurrent::current)
            .range("builtIn", Unit.VOLT, "V_H0", Hysteresis.InjectedCurrent::builtIn);
    private static final ObjectTable<Hysteresis.PositiveFeedback> FEEDBACK = ObjectTable.<Hysteresis.PositiveFeedback>variant(
            "positive feedback", "positive feedback",
            "A resistor from the output back to the threshold node.")
            .range("builtIn", Unit.VOLT, "V_H0", Hysteresis.PositiveFeedback::builtIn);
    private static final ObjectTable<Hysteresis.BuiltIn> BUILT_IN = ObjectTable.<Hysteresis.BuiltIn>variant(
            "built-in hysteresis", "built in", "Only what is built in.")
            .range("builtIn", Unit.VOLT, "V_H0", Hysteresis.BuiltIn::builtIn);
    private static final ObjectTable<Hysteresis.Latched> LATCHED = ObjectTable.variant("latched", "latched",
            "Stays tripped until a reset line re-arms it.");
    private static final Form<Hysteresis> HYSTERESIS = new Form.Either<>(
            List.of(INJECTED, FEEDBACK, BUILT_IN, LATCHED), hysteresis -> switch (hysteresis) {
                case Hysteresis.InjectedCurrent injected -> new Form.Chosen<>(INJECTED, injected);
                case Hysteresis.PositiveFeedback feedback -> new Form.Chosen<>(FEEDBACK, feedback);
                case Hysteresis.BuiltIn builtIn -> new Form.Chosen<>(BUILT_IN, builtIn);
                case Hysteresis.Latched latched -> new Form.Chosen<>(LATCHED, latched);
            });

    private static final Form<OpenDrainOutput> OUTPUT = ObjectTable.<OpenDrainOutput>named("open-drain output",
            "An output that can only pull down.")
            .range("lowLevel", Unit.VOLT, "voltage while it pulls down", OpenDrainOutput::lowLevel)
            .number("sinkCurrent", Unit.AMPERE, "largest at which the low level holds", OpenDrainOutput::sinkCurrent)
            .number("leakage", Unit.AMPERE, "largest into the output while it is off", OpenDrainOutput::leakage)
            .number("maximumVoltage", Unit.VOLT, "largest it may be pulled up to", OpenDrainOutput::maximumVoltage)
            .form();

    static final Form<Comparator> COMPARATOR = ObjectTable.<Comparator>named("comparator",
            "A comparator with an open-drain output.")
            .text("partNumber", PART_NUMBER, Comparator::partNumber)
            .text("description", "free text", Comparator::description)
            .object("inputs", COMPARATOR_INPUTS, "input errors and range", Comparator::inputs)
            .object("hysteresis", HYSTERESIS, "how release is separated from trip", Comparator::hysteresis)
            .object("output", OUTPUT, "open-drain output", Comparator::output)
            .range("supply", Unit.VOLT, "supply voltage", Comparator::supply)
            .number("supplyCurrent", Unit.AMPERE, "largest of the whole package", Comparator::supplyCurrent)
            .range("delay", Unit.SECOND, "input to output", Comparator::delay)
            .count("sections", "comparators in one package", Comparator::sections).form();

    static final Form<Reference> REFERENCE = ObjectTable.<Reference>named("reference", "A precision voltage reference.")
            .text("partNumber", PART_NUMBER, Reference::partNumber)
            .text("description", "free text", Reference::description)
            .object("voltage", CommonTables.TOLERANCED_VOLTAGE, "at 25 °C without load", Reference::voltage)
            .number("drift", Unit.PER_KELVIN, MAGNITUDE, Reference::drift)
            .number("ageing", Unit.FRACTION, "largest relative change over life", Reference::ageing)
            .number("loadRegulation", Unit.OHM, "largest fall per load current (V/A)", Reference::loadRegulation)
            .number("availableCurrent", Unit.AMPERE, "largest load", Reference::availableCurrent)
            .range("supply", Unit.VOLT, "supply voltage", Reference::supply)
            .number("supplyCurrent", Unit.AMPERE, "own consumption without load", Reference::supplyCurrent).form();

    static final Form<ResistorSeries> RESISTORS = ObjectTable.<ResistorSeries>named("resistor series",
            "A family of resistors in the values of an E-series.")
            .text("partNumber", "stem of the part numbers", ResistorSeries::partNumber)
            .text("description", "free text", ResistorSeries::description)
            .text("series", "preferred values (IEC 60063)", each -> each.series().name())
            .range("values", Unit.OHM, "smallest and largest value made", ResistorSeries::values)
            .number("tolerance", Unit.FRACTION, "limit of the deviation as delivered", ResistorSeries::tolerance)
            .number("temperatureCoefficient", Unit.PER_KELVIN, MAGNITUDE, ResistorSeries::temperatureCoefficient)
            .number("ageing", Unit.FRACTION, "largest relative change over life", ResistorSeries::ageing)
            .number("correlation", Unit.FRACTION, "between pieces of one reel", ResistorSeries::correlation)
            .number("power", Unit.WATT, "rated dissipation", ResistorSeries::power).form();

    private PartTables() {
    }
}
