package shuntwright.circuit;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import java.util.random.RandomGeneratorFactory;

import shuntwright.accuracy.Estimate;
import shuntwright.board.Acceptance;
import shuntwright.board.Adc;
import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.DesignRules;
import shuntwright.board.Pins;
import shuntwright.board.SenseSupply;
import shuntwright.board.Source;
import shuntwright.board.Tap;
import shuntwright.board.TimePoint;
import shuntwright.board.Withstand;
import shuntwright.board.Zone;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.RandomCircuits;
import shuntwright.parts.CapacitorSeries;
import shuntwright.parts.InputErrors;
import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;
import shuntwright.parts.Reference;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;

/** One valid record of every kind whose numbers somebody types. */
final class Specimens {

    private static final RandomCircuits.Drawn DRAWN = RandomCircuits
            .full(RandomGeneratorFactory.of("L64X128MixRandom").create(1)).next();
    private static final Shunt SHUNT = DRAWN.circuit().shunt();

    static final List<Record> NUMBERS = List.of(SHUNT, new ShuntRating(1, 70, 155, 50, OptionalDouble.of(1)),
            DRAWN.circuit().amplifier(), DRAWN.circuit().amplifier().input(), DRAWN.circuit().amplifier().ranges(),
            DRAWN.circuit().comparator(), DRAWN.circuit().comparator().inputs(),
            DRAWN.circuit().comparator().output(), DRAWN.circuit().resistors(),
            new Reference("r", "", IdealParts.exactly(2.5), 1e-5, 1e-4, 0.1, 1e-2, Range.of(3, 6), 1e-4,
                    IdealParts.PURCHASE),
            new CapacitorSeries("c", "", ESeries.E6, Range.of(1e-12, 1e-6), Tolerance.symmetric(0.1), 50, "",
                    IdealParts.PURCHASE),
            new PriceBreak(1, 0.5), new Purchase("", List.of(), 1, 1, "", ""),
            new Acceptance(Acceptance.Basis.LIMITS, 0.95),
            new Adc(new Source.Supply(), 12, 1e-3, 1e-3, 1),
            new AlertLine("a", Optional.empty(), OptionalDouble.of(1e4), OptionalDouble.of(2), OptionalDouble.of(0.8),
                    1e-6, 50e-12, OptionalDouble.of(1e-6)),
            Board.named("b"), Channel.named("c"), DesignRules.DEFAULT, new SenseSupply(IdealParts.exactly(5), 0.1),
            new Pins(Optional.empty(), OptionalInt.of(1), Optional.empty(), Optional.empty(), Optional.empty(),
                    OptionalDouble.of(1e3), OptionalDouble.of(1e3), OptionalDouble.of(1e5)),
            new Tap("t", new Source.Supply(), new Tap.Kind.Divider(OptionalDouble.of(1), OptionalDouble.of(1)),
                    OptionalDouble.of(1)),
            new Tap.Kind.Divider(OptionalDouble.of(1), OptionalDouble.of(1)), new Tap.Kind.Dac(12, 1e-3, 1e-3, 1),
            new TimePoint(1e-3, 10), new Withstand.Energy(100), new Withstand.Conductor(1.5, 115),
            new Zone("z", OptionalDouble.of(1), OptionalDouble.empty()), DRAWN.circuit(),
            new SourceVoltage(new Source.Supply(),
                    IdealParts.exactly(5), 1e-5, 1e-4, 1e-3),
            new Threshold.Divider(IdealParts.supply(5), 1e4, 1e4, "", 1),
            new Threshold.DacOutput(IdealParts.supply(5), new Tap.Kind.Dac(12, 0, 0, 0), 2048, "t"),
            new HysteresisNetwork.SenseResistor(1e3),
            new HysteresisNetwork.Feedback(1e5, 1e4, IdealParts.exactly(5), true), Estimate.of(1, 0.1),
            new Distribution.Normal(2), new Distribution.Trapezoid(0.5), new InputErrors(0, 0, 90, 0, 90, 0, 0));

    /** Rejections of a perfect amplifier, certainty of limits. */
    static final Set<String> MAY_BE_INFINITE = Set.of("InputErrors.rejection", "InputErrors.supplyRejection",
            "Estimate.degreesOfFreedom");

    /** Temperatures, voltages with a sign, expectations. */
    static final Set<String> MAY_BE_NEGATIVE = Set.of("ShuntRating.ratedTemperature",
            "ShuntRating.maximumTemperature", "InputErrors.commonModeSpec", "InputErrors.supplySpec",
            "ComparatorInputs.lowest", "ComparatorInputs.headroom", "Estimate.value");

    private Specimens() {
    }
}
