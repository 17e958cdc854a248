package shuntwright.planner;

import java.util.List;
import java.util.OptionalDouble;

import shuntwright.parts.AmplifierRanges;
import shuntwright.parts.Comparator;
import shuntwright.parts.ComparatorInputs;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.InputErrors;
import shuntwright.parts.OpenDrainOutput;
import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;
import shuntwright.parts.Terminals;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** One part of each kind, invented. */
public final class HandMadeParts {
    public static final Purchase PURCHASE = new Purchase("2512",
            List.of(new PriceBreak(1, 0.6), new PriceBreak(100, 0.4)),
            10, 10, "maker", "active");
    public static final Shunt SHUNT = new Shunt("SH-4M", "4 mΩ ±1 %", 0.004, Tolerance.symmetric(0.01), 50e-6, 0.002,
            0, Terminals.FOUR, Range.exactly(0), 1e-6, new ShuntRating(3, 70, 170, 20, OptionalDouble.empty()),
            PURCHASE);
    public static final SenseAmplifier AMPLIFIER = new SenseAmplifier("AMP-50", "gain 50", 50, 0.005, 10e-6,
            0, new InputErrors(50e-6, 0.2e-6, 110, 12, 100, 3.3, 1e-6),
            new AmplifierRanges(Range.of(0, 60), 0.2, 60, Range.of(2.7, 5.5), 0.1, 0.02), 200e3, 1e6, 200e-6, 1,
            PURCHASE);
    public static final Comparator COMPARATOR = new Comparator("CMP-1", "comparator",
            new ComparatorInputs(2e-3, 5e-6, Range.of(-1e-9, 1e-9), 0, 0.2),
            new Hysteresis.InjectedCurrent(new Toleranced(4e-6, Tolerance.symmetric(0.1)), Range.of(0, 2e-3)),
            new OpenDrainOutput(Range.of(0, 0.3), 4e-3, 1e-6, 5.5), Range.of(2.2, 5.5), 10e-6,
            Range.of(0.2e-6, 1e-6), 1, PURCHASE);
    public static final ResistorSeries RESISTORS = new ResistorSeries("RES", "0.1 % E96", ESeries.E96,
            Range.of(10, 1e6), 0.001, 25e-6, 0.001, 0, 0.1, PURCHASE);

    private HandMadeParts() {
    }
}
