package shuntwright.choice;

import java.util.List;
import java.util.OptionalDouble;

import shuntwright.board.Source;
import shuntwright.circuit.SourceVoltage;
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
import shuntwright.parts.Terminals;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** Made-up parts with round numbers for tests. */
public final class TrialParts {

    private TrialParts() {
    }

    /** One price whatever the quantity. */
    public static Purchase price(double each) {
        return new Purchase("", List.of(new PriceBreak(1, each)), 1, 1, "", "");
    }

    /** A four-terminal shunt of 5 W, 50 ppm/K, 10 K/W. */
    public static Shunt shunt(String number, double ohm, double tolerance) {
        return new Shunt(number, "shunt " + number, ohm, Tolerance.symmetric(tolerance), 50e-6, 0, 0, Terminals.FOUR,
                Range.exactly(0), 0, new ShuntRating(5, 70, 170, 10, OptionalDouble.empty()), price(1));
    }

    /** An amplifier for rails of 0 to 30 V and supplies of 2.7 to 5.5 V. */
    public static SenseAmplifier amplifier(String number, double gain, double gainError, double offset) {
        return new SenseAmplifier(number, "amplifier " + number, gain, gainError, 10e-6,
                0, new InputErrors(offset, 0.5e-6, 120, 12, 100, 5, 0),
                new AmplifierRanges(Range.of(0, 30), 0.3, 10, Range.of(2.7, 5.5), 0.2, 0.02), 100e3, 1e6, 1e-3, 1,
                price(2));
    }

    /** A comparator with 1 mV offset that takes supplies of 2.7 to 5.5 V. */
    public static Comparator comparator(String number, Hysteresis hysteresis) {
        return comparator(number, hysteresis, Range.exactly(0), 1);
    }

    /** The same with a bias current and several sections. */
    public static Comparator comparator(String number, Hysteresis hysteresis, Range bias, int sections) {
        return new Comparator(number, "comparator " + number, new ComparatorInputs(1e-3, 0, bias, 0, 0), hysteresis,
                new OpenDrainOutput(Range.of(0.1, 0.3), 5e-3, 1e-6, 6), Range.of(2.7, 5.5), 0.5e-3,
                Range.of(0, 1e-6), sections, price(0.5));
    }

    /** Drives 100 µA ±10 % out of its sense input. */
    public static Hysteresis injected() {
        return new Hysteresis.InjectedCurrent(new Toleranced(100e-6, Tolerance.symmetric(0.1)), Range.exactly(0));
    }

    public static Reference reference(String number, double volt, double tolerance) {
        return new Reference(number, "reference " + number, new Toleranced(volt, Tolerance.symmetric(tolerance)), 10e-6,
                0, 0, 5e-3, Range.of(2.7, 5.5), 0.1e-3, price(1.5));
    }

    public static ResistorSeries series(String number, ESeries values, double tolerance) {
        return new ResistorSeries(number, "series " + number, values, Range.of(1e3, 100e3), tolerance, 25e-6, 0, 0,
                0.1, price(0.01));
    }

    public static SourceVoltage supply(double volt, double tolerance) {
        return new SourceVoltage(new Source.Supply(), new Toleranced(volt, Tolerance.symmetric(tolerance)), 0, 0, 0);
    }
}
