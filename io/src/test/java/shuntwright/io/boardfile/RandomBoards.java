package shuntwright.io.boardfile;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.Supplier;
import java.util.random.RandomGenerator;

import shuntwright.accuracy.Slot;
import shuntwright.board.Acceptance;
import shuntwright.board.Adc;
import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.DesignRules;
import shuntwright.board.Objective;
import shuntwright.board.Pins;
import shuntwright.board.Preference;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Sampling;
import shuntwright.board.SenseSupply;
import shuntwright.board.Source;
import shuntwright.board.StatedDistribution;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.board.TimePoint;
import shuntwright.board.Uncertainty;
import shuntwright.board.Withstand;
import shuntwright.board.Zone;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** Boards of every shape that a file may hold; numbers have all their digits. */
final class RandomBoards {
    private final RandomGenerator random;

    RandomBoards(RandomGenerator random) {
        this.random = random;
    }

    Board board() {
        List<Channel> channels = new ArrayList<>();
        int count = random.nextInt(6);
        for (int i = 0; i < count; i++) {
            channels.add(channel("Channel " + i));
        }
        return new Board(text(), text(), list(this::name), 1 + random.nextInt(1000),
                Range.of(random.nextDouble(-55, 20), random.nextDouble(20, 125)),
                new SenseSupply(toleranced(), positive()),
                List.of(new BoardReference("R 1", name()), new BoardReference("R2", name())),
                maybe(() -> new Adc(source(), random.nextInt(6, 25), random.nextDouble(), positive(), positive())),
                List.of(AlertLine.named("A"), new AlertLine("B", maybe(this::toleranced), maybeNumber(),
                        OptionalDouble.of(random.nextDouble(2, 3)), OptionalDouble.of(random.nextDouble(0, 2)),
                        positive(), positive(), maybeNumber())),
                List.of(new Tap("T1", source(), new Tap.Kind.Divider(maybeNumber(), maybeNumber()), maybeNumber()),
                        new Tap("tap 2", source(), new Tap.Kind.Dac(random.nextInt(4, 21), random.nextDouble(),
                                positive(), positive()), maybeNumber())),
                List.of(new Zone("Z", maybeNumber(), maybeNumber())), maybeNumber(),
                new Acceptance(pick(Acceptance.Basis.values()), random.nextDouble(0.5, 1)),
                new DesignRules(random.nextInt(1, 9), random.nextDouble(0.01, 1), positive(),
                        random.nextDouble(0.01, 1), maybe(this::name), positive(), positive(), positive(),
                        random.nextDouble()),
                uncertainty(), preference(), channels);
    }

    private Preference preference() {
        List<Objective> order = new ArrayList<>(List.of(Objective.values()));
        Collections.shuffle(order, random);
        return new Preference(order.subList(0, 1 + random.nextInt(order.size())), random.nextDouble(),
                random.nextInt(1000),
                maybeNumber(), random.nextInt());
    }

    private Uncertainty uncertainty() {
        if (random.nextInt(4) == 0) {
            return Uncertainty.DEFAULT;
        }
        Sampling.Trials trials = random.nextBoolean()
                ? new Sampling.Trials.Fixed(trials())
                : new Sampling.Trials.Adaptive(random.nextInt(1, 3), trials());
        long seed = random.nextBoolean() ? random.nextLong() : random.nextLong(-3, 4);
        return new Uncertainty(list(this::stated), new Sampling(trials, seed));
    }

    private int trials() {
        return random.nextInt(Sampling.LEAST, Sampling.MOST + 1);
    }

    private StatedDistribution stated() {
        Slot slot = pick(Slot.values());
        Optional<String> part = slot.part().flatMap(_ -> maybe(this::name));
        return new StatedDistribution(slot.words(), part, switch (random.nextInt(6)) {
            case 0 -> new Distribution.Uniform();
            case 1 -> new Distribution.Normal(positive());
            case 2 -> new Distribution.Triangular();
            case 3 -> new Distribution.ArcSine();
            case 4 -> new Distribution.Trapezoid(random.nextDouble());
            default -> new Distribution.StudentT(2 + positive(), positive());
        });
    }

    private Calibration calibration() {
        boolean two = random.nextBoolean();
        double lower = positive();
        return new Calibration(two ? Calibration.Points.TWO : Calibration.Points.ONE,
                two && random.nextBoolean() ? OptionalDouble.of(lower) : OptionalDouble.empty(),
                random.nextBoolean() ? OptionalDouble.of(lower * random.nextDouble(1.01, 20)) : OptionalDouble.empty(),
                random.nextDouble(), random.nextBoolean()
                        ? Calibration.DEFAULT_TEMPERATURE
                        : Range.of(random.nextDouble(0, 20), random.nextDouble(20, 40)));
    }

    private Channel channel(String name) {
        double noTrip = positive();
        double mustTrip = noTrip * random.nextDouble(1.01, 3);
        Channel.Currents currents = random.nextBoolean()
                ? Channel.Currents.NONE
                : new Channel.Currents(maybeNumber(), OptionalDouble.of(noTrip), OptionalDouble.of(mustTrip),
                        random.nextBoolean()
                                ? OptionalDouble.empty()
                                : OptionalDouble.of(noTrip + (mustTrip - noTrip) / 2),
                        OptionalDouble.of(noTrip / 10), OptionalDouble.of(mustTrip));
        return new Channel(name, text(), maybe(this::spread), pick(Channel.Side.values()), currents, release(),
                new Channel.ReadingDemand(maybeShare(), maybeShare(), maybe(this::calibration)), threshold(),
                maybe(() -> "B"),
                maybe(() -> "Z"),
                random.nextBoolean() ? 1 : random.nextDouble(),
                new Channel.Stress(maybeNumber(), maybeNumber(), inrush(), maybe(this::withstand)), pins());
    }

    private Pins pins() {
        return random.nextBoolean()
                ? Pins.NONE
                : new Pins(maybe(this::name), OptionalInt.of(random.nextInt(1, 5)), maybe(this::name),
                        maybe(this::name), maybe(this::name), maybeNumber(), maybeNumber(), maybeNumber());
    }

    private List<TimePoint> inrush() {
        List<TimePoint> points = new ArrayList<>();
        double time = 0;
        int count = random.nextInt(4);
        for (int i = 0; i < count; i++) {
            points.add(new TimePoint(time, positive()));
            time += positive();
        }
        // A sum of a large and a tiny time may round to the same time again.
        return points.stream().map(TimePoint::time).distinct().count() == points.size() ? points : List.of();
    }

    private Withstand withstand() {
        double time = positive();
        double current = positive();
        return switch (random.nextInt(3)) {
            case 0 -> new Withstand.Energy(positive());
            case 1 -> new Withstand.Conductor(positive(), positive());
            default -> new Withstand.Curve(
                    List.of(new TimePoint(time, current), new TimePoint(time / 3, current * 3)));
        };
    }

    private ReleaseDemand release() {
        double low = positive();
        return switch (random.nextInt(3)) {
            case 0 -> new ReleaseDemand.Between();
            case 1 -> new ReleaseDemand.Latch();
            default -> new ReleaseDemand.Window(Range.of(low, low * 1.7));
        };
    }

    private ThresholdDemand threshold() {
        return switch (random.nextInt(3)) {
            case 0 -> new ThresholdDemand.Free();
            case 1 -> new ThresholdDemand.OwnDivider(source());
            default -> new ThresholdDemand.SharedTap(random.nextBoolean() ? "T1" : "tap 2");
        };
    }

    private Source source() {
        return random.nextBoolean() ? new Source.Supply() : new Source.OfReference("R 1");
    }

    private Toleranced toleranced() {
        return new Toleranced(positive(), new Tolerance(random.nextDouble(0, 0.5), random.nextDouble(0, 0.5)));
    }

    private Spread spread() {
        double low = random.nextDouble(-10, 50);
        double middle = low + random.nextDouble(0, 5);
        return new Spread(low, middle, middle + random.nextDouble(0, 5));
    }

    private String name() {
        return "EX-" + Long.toString(random.nextLong(1, Long.MAX_VALUE), 36);
    }

    private String text() {
        return pick("", "plain", "with \"quotes\" and \\ and\nlines\t", "Ω µ ² ± 漢字 🔌", " blanks ", "\u0001\u2028");
    }

    /** Above 0, over many decades. */
    private double positive() {
        return random.nextDouble(1, 10) * Math.pow(10, random.nextInt(-9, 7));
    }

    private OptionalDouble maybeNumber() {
        return random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(positive());
    }

    private OptionalDouble maybeShare() {
        return random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(random.nextDouble(0.001, 0.999));
    }

    private <T> Optional<T> maybe(Supplier<T> value) {
        return random.nextBoolean() ? Optional.empty() : Optional.of(value.get());
    }

    private <T> List<T> list(Supplier<T> element) {
        return random.nextBoolean() ? List.of() : List.of(element.get(), element.get());
    }

    @SafeVarargs
    private <T> T pick(T... values) {
        return values[random.nextInt(values.length)];
    }
}
