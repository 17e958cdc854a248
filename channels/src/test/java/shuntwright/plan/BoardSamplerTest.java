package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.plan.TrialBoards.board;
import static shuntwright.plan.TrialBoards.channel;
import static shuntwright.plan.TrialBoards.pins;
import static shuntwright.plan.TrialBoards.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.atomic.AtomicInteger;

import org.junit.jupiter.api.Test;

import shuntwright.board.Acceptance;
import shuntwright.board.Adc;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Sampling;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.Propagated;

/** The propagated distributions of whole boards: the same whatever computes them, and only what changed changes. */
class BoardSamplerTest {

    private static final Sampling SAMPLING = sampling(20_000, 1);

    private static Sampling sampling(int trials, long seed) {
        return new Sampling(new Sampling.Trials.Fixed(trials), seed);
    }

    private static Board trial() {
        return board(channel("wide", 5), tight("tight", 3), coarse("coarse", 4), bySupply("by supply", 2),
                bySupply("by supply too", 2));
    }

    private static Channel tight(String name, double load) {
        return channel(name, load, 1.47 * load, 1.53 * load);
    }

    /** Its shunt's tolerance of 5 % fills most of its window. */
    private static Channel coarse(String name, double load) {
        return channel(name, load, 1.46 * load, 1.54 * load)
                .withPins(pins(Optional.of("COARSE"), Optional.empty(), Optional.empty()));
    }

    private static Channel bySupply(String name, double load) {
        return channel(name, load, 1.47 * load, 1.53 * load)
                .withThreshold(new ThresholdDemand.OwnDivider(new Source.Supply()));
    }

    private static Plan sample(Plan plan, Sampling sampling, int threads) {
        return new BoardSampler(threads).sample(plan, sampling, BoardSampler.Depth.FULL, Progress.SILENT);
    }

    private static BoardStudy study(Plan plan) {
        return plan.study().orElseThrow();
    }

    @Test
    void theNumberOfThreadsDoesNotMatter() {
        Plan plan = plan(trial());
        assertThat(plan.study()).isEmpty();
        Plan one = sample(plan, SAMPLING, 1);
        assertThat(study(one).sampling()).isEqualTo(SAMPLING);
        assertThat(study(one).channels()).extracting(ChannelStudy::channel).containsExactlyElementsOf(
                plan.channels().stream().filter(each -> each.solved().isPresent()).map(each -> each.channel().name())
                        .toList());
        assertThat(study(one).channels()).hasSizeGreaterThanOrEqualTo(4);
        for (int threads : new int[]{2, 3, 7}) {
            assertThat(sample(plan, SAMPLING, threads)).isEqualTo(one);
        }
        assertThatIllegalArgumentException().isThrownBy(() -> new BoardSampler(0));
    }

    @Test
    void anotherSeedGivesOtherTrialsOfTheSameDistributions() {
        Plan plan = plan(trial());
        BoardStudy one = study(sample(plan, SAMPLING, 2));
        BoardStudy other = study(sample(plan, sampling(20_000, 2), 2));
        for (ChannelStudy each : one.channels()) {
            ChannelStudy again = other.channel(each.channel()).orElseThrow();
            assertThat(again).isNotEqualTo(each);
            for (int i = 0; i < each.outcomes().size(); i++) {
                Propagated a = each.outcomes().get(i);
                Propagated b = again.outcomes().get(i);
                double slip = 5 * a.sampled().standard() * Math.sqrt(2.0 / 20_000);
                assertThat(b.sampled().mean()).isNotEqualTo(a.sampled().mean()).isCloseTo(a.sampled().mean(),
                        within(slip));
                assertThat(b.sampled().standard()).isCloseTo(a.sampled().standard(), within(slip));
            }
        }
    }

    /** Each channel's draws depend on the seed and on names, not on what else is on the board, nor on its order. */
    @Test
    void channelsDoNotDependOnTheOthers() {
        Plan plan = plan(board(tight("a", 3), bySupply("b", 2), coarse("c", 4)));
        BoardStudy before = study(sample(plan, SAMPLING, 2));
        Plan otherOrder = plan(board(coarse("c", 4), tight("a", 3), bySupply("b", 2)));
        BoardStudy reordered = study(sample(otherOrder, SAMPLING, 2));
        BoardStudy edited = study(sample(plan(board(tight("a", 3), bySupply("b", 2), tight("c", 7))), SAMPLING, 2));
        int same = 0;
        for (ChannelStudy each : before.channels()) {
            // Where the same parts were chosen, which other channels on the board may change.
            if (circuit(plan, each.channel()).equals(circuit(otherOrder, each.channel()))) {
                same++;
                assertThat(reordered.channel(each.channel())).contains(each);
            }
        }
        assertThat(same).isEqualTo(3);
        assertThat(edited.channel("a")).isEqualTo(before.channel("a"));
        assertThat(edited.channel("b")).isEqualTo(before.channel("b"));
        assertThat(edited.channel("c")).isNotEqualTo(before.channel("c"));
        assertThat(reordered.yield().inside()).isEqualTo(before.yield().inside());
    }

    private static Object circuit(Plan plan, String channel) {
        return plan.channel(channel).orElseThrow().solved().orElseThrow().circuit();
    }

    /** A sampler that is used again gives what a new one gives, after edits, other sampling and a sketch before. */
    @Test
    void samplingAgainEqualsSamplingAnew() {
        BoardSampler sampler = new BoardSampler(2);
        Plan first = plan(board(tight("a", 3), bySupply("b", 2), coarse("c", 4)));
        Plan second = plan(board(tight("a", 3), bySupply("b", 2.5), coarse("c", 4)));
        Plan sketch = sampler.sample(first, SAMPLING, BoardSampler.Depth.SKETCH, Progress.SILENT);
        assertThat(study(sketch).yield().shared()).isEmpty();
        assertThat(study(sketch).channels()).allSatisfy(each -> assertThat(each.outcomes())
                .allSatisfy(outcome -> assertThat(outcome.effects()).isEmpty()));
        for (Plan plan : List.of(first, second, first)) {
            for (Sampling sampling : List.of(SAMPLING, sampling(10_000, 1), sampling(20_000, 9))) {
                assertThat(sampler.sample(plan, sampling, BoardSampler.Depth.FULL, Progress.SILENT))
                        .isEqualTo(sample(plan, sampling, 1));
            }
        }
        // A sketch after the full answer may know more, never other numbers.
        BoardStudy again = study(sampler.sample(first, SAMPLING, BoardSampler.Depth.SKETCH, Progress.SILENT));
        for (ChannelStudy each : study(sketch).channels()) {
            ChannelStudy other = again.channel(each.channel()).orElseThrow();
            assertThat(other.outside()).isEqualTo(each.outside());
            assertThat(other.outcomes()).extracting(Propagated::sampled)
                    .isEqualTo(each.outcomes().stream().map(Propagated::sampled).toList());
        }
        assertThat(again.yield().inside()).isEqualTo(study(sketch).yield().inside());
    }

    /** Two channels divide their thresholds from the same supply: together they are inside more often than their product says. */
    @Test
    void theSupplyIsOneDrawForAllChannels() {
        Board board = TrialBoards.withSupply(board(bySupply("a", 2), bySupply("b", 2)), 3.3, 0.03, 0.1);
        BoardYield yield = study(sample(plan(board), sampling(100_000, 1), 2)).yield();
        double inside = yield.inside().estimate();
        assertThat(inside).isBetween(0.05, 0.95);
        assertThat(inside).isGreaterThan(yield.product() + 0.05);
        assertThat(yield.shared().getFirst().owner()).isEqualTo("supply");
        assertThat(yield.shared().getFirst().cost()).isGreaterThan(0.05);
        assertThat(yield.shared()).isSortedAccordingTo((a, b) -> Double.compare(b.cost(), a.cost()));
        assertThat(yield.shared()).allSatisfy(cost -> assertThat(cost.without() - cost.cost()).isCloseTo(inside,
                within(0.01)));
    }

    /** Verdict and accepted channels rest on the propagated interval, which the assessment keeps. */
    @Test
    void verdictsRestOnThePropagatedDistribution() {
        Board board = TrialBoards.withAcceptance(trial(), new Acceptance(Acceptance.Basis.COVERAGE, 0.95));
        Plan sampled = sample(plan(board), sampling(100_000, 1), 2);
        int judged = 0;
        for (ChannelStudy each : study(sampled).channels()) {
            ChannelPlan channel = sampled.channel(each.channel()).orElseThrow();
            SolvedChannel solved = channel.solved().orElseThrow();
            for (Propagated outcome : each.outcomes()) {
                assertThat(solved.assessment(outcome.outcome()).orElseThrow().propagated())
                        .contains(outcome.sampled().symmetric().range());
            }
            boolean byLimits = solved.assessments().stream().allMatch(one -> one.insideByLimits());
            boolean byCoverage = solved.assessments().stream()
                    .allMatch(one -> one.insideByLimits() || one.allowed().contains(one.coverage()));
            Verdict expected = byLimits ? Verdict.INSIDE : byCoverage ? Verdict.LIKELY : Verdict.OUTSIDE;
            assertThat(channel.verdict()).as(each.channel()).isEqualTo(expected);
            assertThat(channel.accepted()).as(each.channel()).isEqualTo(expected != Verdict.OUTSIDE);
            judged += expected == Verdict.INSIDE ? 0 : 1;
        }
        assertThat(judged).isPositive();
    }

    @Test
    void readingsAreSampledToo() {
        Channel reads = channel("reads", 5).withReading(
                new Channel.ReadingDemand(OptionalDouble.empty(), OptionalDouble.of(0.03), Optional.empty()));
        Board board = TrialBoards.withAdc(board(reads), new Adc(new Source.OfReference("quiet"), 12, 1e-3, 1e-3, 1));
        Plan plan = plan(board);
        SolvedChannel solved = plan.channel("reads").orElseThrow().solved().orElseThrow();
        ChannelStudy study = study(sample(plan, SAMPLING, 1)).channel("reads").orElseThrow();
        assertThat(study.outcomes()).extracting(Propagated::outcome)
                .containsExactlyElementsOf(solved.assessments().stream().map(each -> each.outcome()).toList());
        assertThat(study.outcomes()).hasSize(3);
    }

    /** After an edit a first picture has few trials of what the edit touched, and all that were drawn of the rest. */
    @Test
    void aSketchKeepsWhatWasSampledBetterBefore() {
        BoardSampler sampler = new BoardSampler(2);
        Plan before = plan(board(tight("a", 3), bySupply("b", 2), coarse("c", 4)));
        Plan edited = plan(board(tight("a", 3), bySupply("b", 2.5), coarse("c", 4)));
        BoardStudy full = study(sampler.sample(before, SAMPLING, BoardSampler.Depth.FULL, Progress.SILENT));
        BoardStudy sketch = study(
                sampler.sample(edited, sampling(10_000, 1), BoardSampler.Depth.SKETCH, Progress.SILENT));
        assertThat(sketch.channel("a")).isEqualTo(full.channel("a"));
        assertThat(sketch.channel("b").orElseThrow().trials()).isEqualTo(10_000);
        assertThat(sketch.channel("c")).isEqualTo(full.channel("c"));
        assertThat(sketch.yield().inside().trials()).as("what is known of all").isEqualTo(10_000);
        BoardStudy otherSeed = study(
                sampler.sample(edited, sampling(10_000, 2), BoardSampler.Depth.SKETCH, Progress.SILENT));
        assertThat(otherSeed.channels()).allSatisfy(each -> assertThat(each.trials()).isEqualTo(10_000));
    }

    /** Channels that were done when it was cancelled need not be sampled again. */
    @Test
    void whatWasDoneBeforeCancellingIsKept() {
        Plan plan = plan(board(tight("a", 3), bySupply("b", 2), coarse("c", 4)));
        BoardSampler sampler = new BoardSampler(1);
        AtomicInteger most = new AtomicInteger();
        Progress stops = new Progress() {
            @Override
            public void reached(String stage, int done, int total) {
                most.set(done);
            }

            @Override
            public boolean cancelled() {
                // the first channel of 200 thousand trials is done, the second is not
                return most.get() > 200;
            }
        };
        assertThatExceptionOfType(BoardPlanner.Cancelled.class).isThrownBy(
                () -> sampler.sample(plan, sampling(200_000, 1), BoardSampler.Depth.FULL, stops));
        BoardStudy sketch = study(
                sampler.sample(plan, sampling(10_000, 1), BoardSampler.Depth.SKETCH, Progress.SILENT));
        assertThat(sketch.channel("a").orElseThrow().trials()).isEqualTo(200_000);
        assertThat(sketch.channel("a")).isEqualTo(study(sample(plan, sampling(200_000, 1), 1)).channel("a"));
        assertThat(sketch.channel("c").orElseThrow().trials()).isEqualTo(10_000);
    }

    @Test
    void progressCancels() {
        AtomicInteger reports = new AtomicInteger();
        Progress stops = new Progress() {
            @Override
            public void reached(String stage, int done, int total) {
                assertThat(done).isLessThanOrEqualTo(total);
                reports.incrementAndGet();
            }

            @Override
            public boolean cancelled() {
                return reports.get() > 1;
            }
        };
        Plan plan = plan(trial());
        BoardSampler sampler = new BoardSampler(2);
        assertThatExceptionOfType(BoardPlanner.Cancelled.class)
                .isThrownBy(() -> sampler.sample(plan, sampling(5_000_000, 1), BoardSampler.Depth.FULL, stops));
        // What was cancelled leaves nothing half done behind.
        assertThat(sampler.sample(plan, SAMPLING, BoardSampler.Depth.FULL, Progress.SILENT))
                .isEqualTo(sample(plan, SAMPLING, 1));
    }
}
