package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static shuntwright.plan.TrialBoards.board;
import static shuntwright.plan.TrialBoards.channel;
import static shuntwright.plan.TrialBoards.only;
import static shuntwright.plan.TrialBoards.pins;
import static shuntwright.plan.TrialBoards.plan;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.random.RandomGenerator;

import org.junit.jupiter.api.Test;

import shuntwright.board.Adc;
import shuntwright.board.Board;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Source;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;

/** Changes that claim to cure, made and planned anew. */
class CuresTest {

    private static Channel failing(RandomGenerator random) {
        double load = Math.exp(random.nextDouble(Math.log(1), Math.log(20)));
        double noTrip = load * random.nextDouble(1.1, 1.5);
        double mustTrip = noTrip * random.nextDouble(1.005, 1.08);
        Channel channel = channel("failing", load, noTrip, mustTrip)
                .withCurrents(new Channel.Currents(OptionalDouble.of(load), OptionalDouble.of(noTrip),
                        OptionalDouble.of(mustTrip), OptionalDouble.empty(), OptionalDouble.empty(),
                        OptionalDouble.of(mustTrip)));
        if (random.nextInt(3) == 0) {
            channel = channel.withRelease(
                    new ReleaseDemand.Window(Range.of(load * 0.98, load * random.nextDouble(0.99, 1.05))));
        }
        return switch (random.nextInt(5)) {
            case 0 -> channel.withPins(pins(Optional.of("COARSE"), Optional.empty(), Optional.empty()));
            case 1 -> channel.withPins(pins(Optional.empty(), Optional.of("ROUGH"), Optional.empty()));
            case 2 -> channel.withThreshold(new ThresholdDemand.OwnDivider(new Source.Supply()));
            case 3 -> channel.withThreshold(new ThresholdDemand.SharedTap("tap"));
            default -> channel;
        };
    }

    private static Board with(Board board, Channel edited) {
        List<Channel> channels = new ArrayList<>(board.channels());
        channels.set(0, edited);
        return board.withChannels(channels);
    }

    private static Board boardOf(Channel channel) {
        return boardOf(channel, OptionalDouble.of(1.1));
    }

    private static Board boardOf(Channel channel, OptionalDouble tapVoltage) {
        return TrialBoards.withTaps(board(channel, channel("other", 3).withThreshold(
                new ThresholdDemand.SharedTap("tap"))),
                new Tap("tap", new Source.OfReference("quiet"),
                        new Tap.Kind.Divider(OptionalDouble.empty(), OptionalDouble.empty()), tapVoltage));
    }

    @Test
    void whatClaimsToCureCures() {
        Set<Cure.Lever> cured = EnumSet.noneOf(Cure.Lever.class);
        int verified = 0;
        for (int seed = 0; seed < 40; seed++) {
            Board board = boardOf(failing(new SplittableRandom(seed)),
                    seed % 2 == 0 ? OptionalDouble.of(1.1) : OptionalDouble.empty());
            ChannelPlan plan = only(plan(board));
            if (plan.accepted()) {
                assertThat(plan.cures()).isEmpty();
                continue;
            }
            assertThat(plan.cures()).isNotEmpty();
            boolean tried = false;
            for (Cure cure : plan.cures()) {
                assertThat(cure.cures() && tried).as("cures come first: " + cure.change()).isFalse();
                tried |= !cure.cures();
                if (cure.cures() && cure.edit().isPresent()) {
                    ChannelPlan edited = only(plan(with(board, cure.edit().get())));
                    assertThat(edited.verdict()).as("seed %s: %s", seed, cure.change()).isEqualTo(Verdict.INSIDE);
                    // The cure tells the margin of the channel's best circuit by itself; the board may take another one.
                    assertThat(cure.margin().orElseThrow()).isNotNegative();
                    assertThat(edited.solved().map(SolvedChannel::margin).orElseThrow()).isNotNegative();
                    verified++;
                    cured.add(cure.lever());
                }
            }
        }
        assertThat(verified).isGreaterThan(30);
        assertThat(cured).contains(Cure.Lever.WINDOW, Cure.Lever.OTHER_SHUNT, Cure.Lever.OTHER_AMPLIFIER,
                Cure.Lever.SOURCE);
    }

    @Test
    void windowsAreWidenedAsLittleAsNeedBe() {
        int compared = 0;
        for (int seed = 0; seed < 16; seed++) {
            Board board = boardOf(failing(new SplittableRandom(seed)));
            Channel channel = board.channels().getFirst();
            for (Cure cure : only(plan(board)).cures()) {
                if (cure.lever() != Cure.Lever.WINDOW) {
                    continue;
                }
                Channel.Currents c = cure.edit().orElseThrow().currents();
                double noTrip = Math.min(c.noTrip().getAsDouble() * 1.03,
                        channel.currents().noTrip().getAsDouble());
                double mustTrip = Math.max(c.mustTrip().getAsDouble() * 0.97,
                        channel.currents().mustTrip().getAsDouble());
                Channel smaller = channel.withCurrents(new Channel.Currents(c.load(), OptionalDouble.of(noTrip),
                        OptionalDouble.of(mustTrip), OptionalDouble.empty(), c.least(), c.fullScale()));
                assertThat(only(plan(with(board, smaller))).accepted()).as("seed %s: %s", seed, cure.change())
                        .isFalse();
                compared++;
            }
        }
        assertThat(compared).isGreaterThan(10);
    }

    private static List<Cure> cures(Board board, Cure.Lever lever) {
        ChannelPlan plan = only(plan(board));
        assertThat(plan.accepted()).isFalse();
        return plan.cures().stream().filter(each -> each.lever() == lever).toList();
    }

    @Test
    void aWrongShuntIsExchanged() {
        Channel pinned = channel("c", 10, 15, 16.5)
                .withPins(pins(Optional.of("COARSE"), Optional.empty(), Optional.empty()));
        assertThat(cures(board(pinned), Cure.Lever.OTHER_SHUNT)).singleElement().satisfies(cure -> {
            assertThat(cure.cures()).isTrue();
            assertThat(cure.change()).contains("COARSE");
            assertThat(cure.edit().orElseThrow().pins().shunt()).isEmpty();
        });
    }

    @Test
    void aWrongAmplifierIsExchanged() {
        Channel pinned = channel("c", 10, 15, 16.5)
                .withPins(pins(Optional.empty(), Optional.of("ROUGH"), Optional.empty()));
        assertThat(cures(board(pinned), Cure.Lever.OTHER_AMPLIFIER)).singleElement().satisfies(cure -> {
            assertThat(cure.cures()).isTrue();
            assertThat(cure.edit().orElseThrow().pins().amplifier()).isEmpty();
        });
        assertThat(cures(board(pinned), Cure.Lever.OTHER_SHUNT)).isEmpty();
    }

    @Test
    void theSupplyGivesWayToAReferenceOfTheBoard() {
        Channel bySupply = channel("c", 10, 15, 15.8)
                .withThreshold(new ThresholdDemand.OwnDivider(new Source.Supply()));
        assertThat(cures(board(bySupply), Cure.Lever.SOURCE)).singleElement().satisfies(cure -> {
            assertThat(cure.cures()).isTrue();
            assertThat(cure.change()).contains("quiet");
            assertThat(cure.edit().orElseThrow().threshold())
                    .isEqualTo(new ThresholdDemand.OwnDivider(new Source.OfReference("quiet")));
        });
    }

    @Test
    void withoutAReferenceTheBestOfTheCatalogueIsTried() {
        Board bare = TrialBoards.withReferences(board(channel("c", 10, 15, 15.8)));
        assertThat(cures(bare, Cure.Lever.SOURCE)).singleElement().satisfies(cure -> {
            assertThat(cure.cures()).isTrue();
            assertThat(cure.change()).contains("REF25").doesNotContain("REF25X");
            assertThat(cure.edit()).isEmpty();
        });
        Board with = TrialBoards.withReferences(bare, new shuntwright.board.BoardReference("new", "REF25"));
        assertThat(only(plan(with)).verdict()).isEqualTo(Verdict.INSIDE);
    }

    @Test
    void aWideSupplyIsTightened() {
        Board bare = TrialBoards.withSupply(TrialBoards.withReferences(board(channel("c", 10, 15, 16))), 3.3, 0.05,
                0.1);
        List<Cure> tighter = cures(bare, Cure.Lever.TOLERANCE_CLASS);
        assertThat(tighter).anySatisfy(cure -> {
            assertThat(cure.change()).startsWith("supply tolerance").contains("±5 %");
            assertThat(cure.cures()).isTrue();
            double to = Double.parseDouble(cure.change().replaceAll(".*→ ±([0-9.]+) %", "$1")) / 100;
            assertThat(only(plan(TrialBoards.withSupply(bare, 3.3, to, 0.1))).verdict()).isEqualTo(Verdict.INSIDE);
        });
    }

    @Test
    void aNarrowReleaseWindowIsWidened() {
        Channel narrow = channel("c", 10, 15, 20).withRelease(new ReleaseDemand.Window(Range.of(12, 12.05)));
        List<Cure> release = cures(board(narrow), Cure.Lever.RELEASE);
        assertThat(release).hasSize(2).allSatisfy(cure -> assertThat(cure.cures()).isTrue());
        assertThat(release).extracting(each -> each.edit().orElseThrow().release())
                .anySatisfy(each -> assertThat(each).isInstanceOf(ReleaseDemand.Latch.class))
                .anySatisfy(each -> assertThat(each).isInstanceOfSatisfying(ReleaseDemand.Window.class,
                        window -> assertThat(window.window().contains(Range.of(12, 12.05))).isTrue()));
    }

    @Test
    void aTightReadingIsRelaxed() {
        Channel tight = channel("c", 10, 15, 20)
                .withReading(
                        new Channel.ReadingDemand(OptionalDouble.empty(), OptionalDouble.of(0.001), Optional.empty()));
        Board board = TrialBoards.withAdc(board(tight), new Adc(new Source.OfReference("quiet"), 12, 0.001, 1e-3, 1));
        assertThat(cures(board, Cure.Lever.READING)).singleElement().satisfies(cure -> {
            assertThat(cure.cures()).isTrue();
            assertThat(cure.edit().orElseThrow().reading().atLoad().getAsDouble()).isBetween(0.001, 0.05);
        });
    }

    @Test
    void moreShuntsInParallelAreTried() {
        // 0.5 mΩ carries at most √(0.7·5 W/0.5 mΩ) = 83.7 A, three in parallel 251 A.
        Channel heavy = channel("c", 200, 260, 380);
        List<Cure> more = cures(board(heavy), Cure.Lever.MORE_SHUNTS);
        assertThat(only(plan(board(heavy))).verdict()).isEqualTo(Verdict.NO_FIT);
        assertThat(more).hasSize(2).allSatisfy(cure -> assertThat(cure.cures()).isTrue());
        assertThat(more.getFirst().change()).contains("up to 4");
    }

    /** No amplifier takes this rail; in the return lead the shunt sits at 0 V, and nothing else can help. */
    @Test
    void aRailAboveEveryAmplifierIsCuredByTheLowSideAlone() {
        Channel high = channel("high", 5, 8, 12).withRail(Optional.of(Spread.exactly(400)));
        ChannelPlan failing = plan(board(high)).channels().getFirst();
        assertThat(failing.verdict()).isEqualTo(Verdict.NO_FIT);
        assertThat(failing.cures()).hasSize(1);
        Cure cure = failing.cures().getFirst();
        assertThat(cure.lever()).isEqualTo(Cure.Lever.SIDE);
        assertThat(cure.cures()).isTrue();
        assertThat(plan(board(cure.edit().orElseThrow())).channels().getFirst().verdict()).isEqualTo(Verdict.INSIDE);
    }

    /** What is left after calibration is all that the reading needs to be allowed; the calibration itself stays. */
    @Test
    void aRelaxedReadingStaysCalibrated() {
        Calibration calibration = new Calibration(Calibration.Points.TWO, OptionalDouble.empty(),
                OptionalDouble.empty(), 0.002, Calibration.DEFAULT_TEMPERATURE);
        Channel reads = channel("c", 10).withReading(new Channel.ReadingDemand(OptionalDouble.empty(),
                OptionalDouble.of(0.001), Optional.of(calibration)));
        Board board = TrialBoards.withAdc(board(reads),
                new Adc(new Source.OfReference("quiet"), 12, 0.01, 1e-3, 1));
        assertThat(cures(board, Cure.Lever.READING)).singleElement().satisfies(cure -> {
            assertThat(cure.cures()).isTrue();
            Channel.ReadingDemand edited = cure.edit().orElseThrow().reading();
            assertThat(edited.calibration()).contains(calibration);
            // Without calibration the ADC's gain error of 1 % alone would need more.
            assertThat(edited.atLoad().orElseThrow()).isBetween(0.002, 0.01);
        });
    }
}
