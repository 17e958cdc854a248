package shuntwright.choice;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.random.RandomGenerator;

import shuntwright.board.Acceptance;
import shuntwright.board.Adc;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.DesignRules;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Source;
import shuntwright.board.StatedDistribution;
import shuntwright.board.Tap;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.parts.AmplifierRanges;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Comparator;
import shuntwright.parts.ComparatorInputs;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.InputErrors;
import shuntwright.parts.OpenDrainOutput;
import shuntwright.parts.Part;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;
import shuntwright.parts.Terminals;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** Small random catalogues with a random demand that they may or may not meet. */
final class RandomProblems {

    private final RandomGenerator random;
    private final double load;
    private final double supply;

    private RandomProblems(RandomGenerator random) {
        this.random = random;
        this.load = Math.exp(between(Math.log(0.5), Math.log(50)));
        this.supply = random.nextBoolean() ? 3.3 : 5;
    }

    static ChannelProblem problem(RandomGenerator random, Acceptance.Basis basis) {
        return new RandomProblems(random).problem(basis);
    }

    private double between(double least, double most) {
        return random.nextDouble(least, most);
    }

    @SafeVarargs
    private <T> T one(T... of) {
        return of[random.nextInt(of.length)];
    }

    private ChannelProblem problem(Acceptance.Basis basis) {
        Channel channel = channel();
        Demand demand = ((Demand.Reading.Complete) Demand.of(channel)).demand();
        List<ResistorSeries> series = new ArrayList<>();
        series.add(series("E", one(ESeries.E24, ESeries.E12), one(0.01, 0.002)));
        if (random.nextInt(3) == 0) {
            series.add(series("F", ESeries.E48, 0.001));
        }
        SourceVoltage bySupply = TrialParts.supply(supply, one(0.005, 0.02, 0.05));
        SourceVoltage reference = new SourceVoltage(new Source.OfReference("quiet"),
                new Toleranced(2.5, Tolerance.symmetric(one(0.0005, 0.002, 0.01))), 20e-6, one(0.0, 1e-4),
                one(0.0, 1e-3));
        double low = between(-40, 30);
        double gradient = one(0.0, 1.0, 3.0);
        DesignRules rules = new DesignRules(1 + random.nextInt(2), 0.7, 0.5e-3, one(1e-3, 1e-2), Optional.empty(),
                random.nextInt(3) == 0 ? 0.2 * load * load * 0.05 / demand.tripTarget() : 0, gradient,
                one(0.0, 10.0), 0.02);
        Optional<Surroundings.Converter> adc = random.nextInt(3) == 0
                ? Optional.of(new Surroundings.Converter(
                        new Adc(bySupply.source(), 12, 0.001, 1e-3, 1), random.nextBoolean() ? bySupply : reference))
                : Optional.empty();
        Optional<Surroundings.ZoneRise> zone = random.nextBoolean()
                ? Optional.of(new Surroundings.ZoneRise("port", between(1, 60)))
                : Optional.empty();
        Surroundings around = new Surroundings(Range.of(low, low + between(10, 80)), bySupply.voltage(), rules, adc,
                stated(), zone);
        Optional<Threshold> tap = random.nextInt(4) == 0 ? Optional.of(tap(reference)) : Optional.empty();
        List<SourceVoltage> sources = tap.isPresent()
                ? List.of()
                : one(List.of(bySupply), List.of(reference), List.of(reference, bySupply));
        return new ChannelProblem(demand, around, catalogue(demand.tripTarget(), series), sources, tap, series,
                random.nextBoolean()
                        ? new PullUp(10e3, bySupply.voltage(), true, random.nextInt(4) == 0)
                        : new PullUp(2.2e3, new Toleranced(3, Tolerance.symmetric(0.001)), false, false),
                new Acceptance(basis, one(0.95, 0.9973)), one(1, 10, 100));
    }

    /** Mostly nothing beyond the limits; else what makes coverage intervals narrower or wider than uniform draws do. */
    private List<StatedDistribution> stated() {
        return switch (random.nextInt(5)) {
            case 0 -> List.of(new StatedDistribution("shunt tolerance", Optional.empty(), new Distribution.Normal(3)));
            case 1 -> List.of(new StatedDistribution("gain error", Optional.of("A*"), new Distribution.ArcSine()),
                    new StatedDistribution("ambient temperature", Optional.empty(), new Distribution.Triangular()));
            default -> List.of();
        };
    }

    private Optional<Calibration> calibration() {
        return switch (random.nextInt(3)) {
            case 0 -> Optional.of(new Calibration(Calibration.Points.ONE, OptionalDouble.empty(),
                    OptionalDouble.empty(), 1e-3, Calibration.DEFAULT_TEMPERATURE));
            case 1 -> Optional.of(new Calibration(Calibration.Points.TWO, OptionalDouble.of(load * between(0.05, 0.3)),
                    OptionalDouble.empty(), 5e-4, Range.exactly(23)));
            default -> Optional.empty();
        };
    }

    private Channel channel() {
        double noTrip = load * between(1.15, 1.7);
        double mustTrip = noTrip * between(1.04, 1.5);
        boolean reads = random.nextInt(3) == 0;
        Channel.Currents currents = new Channel.Currents(OptionalDouble.of(load), OptionalDouble.of(noTrip),
                OptionalDouble.of(mustTrip),
                random.nextInt(3) == 0
                        ? OptionalDouble.of(noTrip + (mustTrip - noTrip) * between(0.02, 0.98))
                        : OptionalDouble.empty(),
                reads ? OptionalDouble.of(load * between(0.1, 1)) : OptionalDouble.empty(), OptionalDouble.empty());
        ReleaseDemand release = switch (random.nextInt(3)) {
            case 0 -> new ReleaseDemand.Between();
            case 1 -> new ReleaseDemand.Window(Range.of(load * between(0.2, 0.9), noTrip * between(0.95, 1.02)));
            default -> new ReleaseDemand.Latch();
        };
        return Channel.named("channel").withRail(Optional.of(new Spread(11, 12, 13))).withCurrents(currents)
                .withRelease(release)
                .withReading(new Channel.ReadingDemand(
                        reads ? OptionalDouble.of(between(0.01, 0.1)) : OptionalDouble.empty(),
                        reads ? OptionalDouble.of(between(0.01, 0.05)) : OptionalDouble.empty(),
                        reads ? calibration() : Optional.empty()));
    }

    private Threshold tap(SourceVoltage source) {
        if (random.nextBoolean()) {
            return new Threshold.DacOutput(source, new Tap.Kind.Dac(10, 0.001, 1e-3, 1), random.nextInt(200, 1000),
                    "tap");
        }
        return new Threshold.Divider(source, 10e3, ESeries.E24.nearest(between(3e3, 60e3)), "tap", 3);
    }

    private ResistorSeries series(String number, ESeries values, double tolerance) {
        return new ResistorSeries(number, "", values, Range.of(2e3, 40e3), tolerance, 25e-6, one(0.0, 0.001),
                one(0.0, 0.5, 1.0), 0.1,
                TrialParts.price(one(0.01, 0.02)));
    }

    private Catalogue catalogue(double target, List<ResistorSeries> series) {
        List<Part> parts = new ArrayList<>();
        int amplifiers = 1 + random.nextInt(2);
        for (int i = 0; i < amplifiers; i++) {
            parts.add(amplifier("A" + i));
        }
        for (int i = 0; i < 3; i++) {
            double gain = ((SenseAmplifier) parts.get(random.nextInt(amplifiers))).gain();
            double ohm = between(0.3, 0.85) * supply / gain / target * one(1, 1, 2);
            parts.add(shunt("R" + i, ohm));
        }
        int comparators = 1 + random.nextInt(3);
        for (int i = 0; i < comparators; i++) {
            parts.add(comparator("C" + i, hysteresis()));
        }
        parts.addAll(series);
        return Catalogue.of("EUR", parts);
    }

    private Shunt shunt(String number, double ohm) {
        boolean four = random.nextBoolean();
        return new Shunt(number, "", ohm, new Tolerance(one(0.001, 0.005, 0.01), one(0.001, 0.005, 0.01)),
                one(15e-6, 100e-6), one(0.0, 0.002), one(0.0, 0.5, 1.0), four ? Terminals.FOUR : Terminals.TWO,
                four ? Range.exactly(0) : Range.of(0, ohm * 0.01), one(0.0, 3e-6),
                new ShuntRating(load * load * ohm * between(1.5, 8), 70, 170, between(5, 40), OptionalDouble.empty()),
                TrialParts.price(one(0.5, 1.0, 1.5)));
    }

    private SenseAmplifier amplifier(String number) {
        return new SenseAmplifier(number, "", one(20.0, 50.0, 100.0), one(0.001, 0.005, 0.01), 10e-6,
                one(0.0, 0.002), new InputErrors(one(10e-6, 100e-6, 300e-6), one(0.1e-6, 1e-6), 100, 12, 90, 3.3, 1e-6),
                new AmplifierRanges(Range.of(-0.2, 30), one(0.15, 0.3), 10, Range.of(2.7, 5.5), one(0.1, 0.3),
                        one(0.01, 0.05)),
                100e3, 1e6, 1e-3, one(1, 2), TrialParts.price(one(1.0, 2.0)));
    }

    private Comparator comparator(String number, Hysteresis hysteresis) {
        Range bias = one(Range.exactly(0), Range.of(-50e-9, 50e-9), Range.of(5e-9, 100e-9), Range.of(-200e-9, -20e-9));
        return new Comparator(number, "", new ComparatorInputs(one(0.5e-3, 3e-3), 2e-6, bias, 0, one(0.0, 1.0)),
                hysteresis, new OpenDrainOutput(Range.of(0.05, 0.3), 5e-3, 1e-6, 6), Range.of(2.7, 5.5), 0.5e-3,
                Range.of(0, 1e-6), one(1, 2, 4), TrialParts.price(one(0.3, 0.6)));
    }

    private Hysteresis hysteresis() {
        return switch (random.nextInt(4)) {
            case 0 -> new Hysteresis.InjectedCurrent(
                    new Toleranced(one(10e-6, 100e-6), Tolerance.symmetric(one(0.05, 0.2))),
                    one(Range.exactly(0), Range.of(0.002, 0.006)));
            case 1 -> new Hysteresis.PositiveFeedback(one(Range.exactly(0), Range.of(0.001, 0.003)));
            case 2 -> {
                double step = between(0.02, 0.5);
                yield new Hysteresis.BuiltIn(Range.of(step, step * between(1.05, 1.4)));
            }
            default -> new Hysteresis.Latched();
        };
    }
}
