package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.plan.TrialBoards.CATALOGUE;
import static shuntwright.plan.TrialBoards.board;
import static shuntwright.plan.TrialBoards.channel;
import static shuntwright.plan.TrialBoards.only;
import static shuntwright.plan.TrialBoards.pins;
import static shuntwright.plan.TrialBoards.plan;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.SplittableRandom;
import java.util.random.RandomGenerator;

import org.junit.jupiter.api.Test;

import shuntwright.board.Acceptance;
import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Channel;
import shuntwright.board.DesignRules;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Source;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.board.Zone;
import shuntwright.parts.Catalogue;

class BoardPlannerTest {

    static Channel random(String name, RandomGenerator random) {
        double load = Math.exp(random.nextDouble(Math.log(0.5), Math.log(20)));
        double noTrip = load * random.nextDouble(1.2, 1.6);
        Channel channel = channel(name, load, noTrip, noTrip * random.nextDouble(1.03, 1.5));
        if (random.nextInt(4) == 0) {
            channel = channel.withRelease(new ReleaseDemand.Latch());
        }
        channel = switch (random.nextInt(4)) {
            case 0 -> channel;
            case 1 -> channel.withZone(Optional.of("cold"));
            default -> channel.withZone(Optional.of("warm"));
        };
        return switch (random.nextInt(5)) {
            case 0 -> channel.withThreshold(new ThresholdDemand.OwnDivider(new Source.Supply()));
            case 1 -> channel.withThreshold(new ThresholdDemand.SharedTap("tap"));
            case 2 -> channel.withPins(pins(Optional.of("COARSE"), Optional.empty(), Optional.empty()));
            default -> channel;
        };
    }

    private static Board random(RandomGenerator random, int channels) {
        List<Channel> all = new ArrayList<>();
        for (int i = 0; i < channels; i++) {
            all.add(random("channel " + i, random));
        }
        Board board = TrialBoards.withTaps(board(all.toArray(Channel[]::new)),
                new Tap("tap", new Source.OfReference("quiet"),
                        new Tap.Kind.Divider(OptionalDouble.empty(), OptionalDouble.empty()), OptionalDouble.empty()));
        return TrialBoards.withLines(board, AlertLine.named("alert"))
                .withZones(List.of(new Zone("warm", OptionalDouble.empty(), OptionalDouble.of(15)),
                        new Zone("cold", OptionalDouble.empty(), OptionalDouble.empty())));
    }

    @Test
    void isAPureFunction() {
        for (int seed = 0; seed < 4; seed++) {
            Board board = random(new SplittableRandom(seed), 5);
            BoardPlanner planner = new BoardPlanner();
            Plan first = planner.plan(board, CATALOGUE, Progress.SILENT);
            assertThat(planner.plan(board, CATALOGUE, Progress.SILENT)).isEqualTo(first);
            assertThat(plan(board)).isEqualTo(first);
        }
    }

    @Test
    void planningAgainAfterEditsEqualsPlanningAnew() {
        SplittableRandom random = new SplittableRandom(5);
        BoardPlanner planner = new BoardPlanner();
        Board board = random(random, 5);
        Plan first = planner.plan(board, CATALOGUE, Progress.SILENT);
        Board edited = board;
        for (int edit = 0; edit < 10; edit++) {
            edited = edit(edited, random);
            assertThat(planner.plan(edited, CATALOGUE, Progress.SILENT)).as("edit " + edit).isEqualTo(plan(edited));
        }
        assertThat(planner.plan(board, CATALOGUE, Progress.SILENT)).isEqualTo(first);
    }

    private static Board edit(Board board, RandomGenerator random) {
        List<Channel> channels = new ArrayList<>(board.channels());
        int at = random.nextInt(channels.size());
        switch (random.nextInt(7)) {
            case 6 -> {
                return board.withZones(List.of(new Zone("warm", OptionalDouble.empty(),
                        random.nextBoolean() ? OptionalDouble.of(random.nextDouble(1, 60)) : OptionalDouble.empty())));
            }
            case 0 -> channels.remove(channels.size() > 2 ? at : 0);
            case 1 -> channels.add(random("channel new " + random.nextInt(1000), random));
            case 2 -> {
                return TrialBoards.withSupply(board, 3.3, random.nextDouble(0.005, 0.05), 0.1);
            }
            case 3 -> {
                return TrialBoards.withAcceptance(board, new Acceptance(
                        random.nextBoolean() ? Acceptance.Basis.LIMITS : Acceptance.Basis.COVERAGE, 0.9973));
            }
            default -> channels.set(at, random(channels.get(at).name(), random));
        }
        return board.withChannels(channels);
    }

    @Test
    void theOrderOfIndependentChannelsDoesNotMatter() {
        for (int seed = 0; seed < 6; seed++) {
            SplittableRandom random = new SplittableRandom(100 + seed);
            List<Channel> channels = new ArrayList<>();
            for (int i = 0; i < 6; i++) {
                channels.add(random("channel " + i, random).withThreshold(new ThresholdDemand.Free()));
            }
            Plan before = plan(board(channels.toArray(Channel[]::new)));
            Collections.shuffle(channels, new Random(seed));
            Plan after = plan(board(channels.toArray(Channel[]::new)));
            for (ChannelPlan each : before.channels()) {
                ChannelPlan other = after.channel(each.channel().name()).orElseThrow();
                assertThat(other.verdict()).isEqualTo(each.verdict());
            }
            // Heats within the step for each channel count as equal, and then the cost of the whole build decides.
            assertThat(BoardQuestions.heat(after)).isCloseTo(BoardQuestions.heat(before),
                    within(6 * DesignRules.DEFAULT.heatStep()));
            assertThat(after.buildCost()).isCloseTo(before.buildCost(), within(0.02 * before.buildCost()));
        }
    }

    @Test
    void aPlanKeptAsPinsIsJudgedTheSame() {
        int judged = 0;
        for (int seed = 0; seed < 12; seed++) {
            Plan plan = plan(random(new SplittableRandom(200 + seed), 5));
            Plan checked = new BoardPlanner().check(BoardPlanner.pinned(plan), CATALOGUE, Progress.SILENT);
            for (ChannelPlan each : plan.channels()) {
                ChannelPlan again = checked.channel(each.channel().name()).orElseThrow();
                if (each.solved().isEmpty()) {
                    assertThat(again.verdict()).isIn(Verdict.INCOMPLETE, Verdict.NO_FIT);
                    continue;
                }
                judged++;
                assertThat(again.verdict()).isEqualTo(each.verdict());
                assertThat(again.accepted()).isEqualTo(each.accepted());
                SolvedChannel now = again.solved().orElseThrow();
                assertThat(now.circuit()).isEqualTo(each.solved().get().circuit());
                assertThat(now.assessments()).isEqualTo(each.solved().get().assessments());
                assertThat(now.limits()).isEqualTo(each.solved().get().limits());
            }
            assertThat(checked.shared()).isEqualTo(plan.shared());
            assertThat(checked.parts()).isEqualTo(plan.parts());
        }
        assertThat(judged).isGreaterThan(30);
    }

    @Test
    void checkingSaysWhatIsNotPinned() {
        Plan checked = new BoardPlanner().check(board(channel("bare", 5)), CATALOGUE, Progress.SILENT);
        ChannelPlan plan = only(checked);
        assertThat(plan.verdict()).isEqualTo(Verdict.INCOMPLETE);
        assertThat(plan.findings()).singleElement().satisfies(finding -> {
            assertThat(finding.key()).isEqualTo(Finding.Key.NOT_PINNED);
            assertThat(finding.text()).contains("shunt", "number of shunts", "amplifier", "comparator", "threshold");
        });
    }

    @Test
    void anEmptyChannelSaysWhatIsMissing() {
        ChannelPlan plan = only(plan(board(Channel.named("bare"), channel("full", 5))));
        assertThat(plan.verdict()).isEqualTo(Verdict.INCOMPLETE);
        assertThat(plan.accepted()).isFalse();
        assertThat(plan.solved()).isEmpty();
        assertThat(plan.cures()).isEmpty();
        assertThat(plan.findings()).singleElement().satisfies(finding -> {
            assertThat(finding.key()).isEqualTo(Finding.Key.DATA_MISSING);
            assertThat(finding.channel()).contains("bare");
            assertThat(finding.text()).contains("rail voltage", "load current", "no-trip current",
                    "must-trip current");
        });
    }

    @Test
    void aHalfFilledChannelNamesOnlyWhatIsMissing() {
        Channel half = channel("half", 5).withCurrents(new Channel.Currents(OptionalDouble.of(5), OptionalDouble.of(8),
                OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty()));
        Plan plan = plan(board(half, channel("full", 5)));
        assertThat(only(plan).findings()).singleElement()
                .satisfies(finding -> assertThat(finding.text()).contains("must-trip current is missing")
                        .doesNotContain("rail", "load current"));
        assertThat(plan.channel("full").orElseThrow().verdict()).isEqualTo(Verdict.INSIDE);
        assertThat(plan.accepted()).isFalse();
    }

    @Test
    void unknownPartsAreFindings() {
        ChannelPlan shunt = only(plan(board(
                channel("c", 5).withPins(pins(Optional.of("NONE-SUCH"), Optional.empty(), Optional.empty())))));
        assertThat(shunt.verdict()).isEqualTo(Verdict.NO_FIT);
        assertThat(shunt.findings()).extracting(Finding::key).containsExactly(Finding.Key.UNKNOWN_PART);
        assertThat(shunt.findings().getFirst().text()).contains("NONE-SUCH", "shunt");
        // A number of another kind of part is unknown too.
        ChannelPlan amplifier = only(plan(board(
                channel("c", 5).withPins(pins(Optional.empty(), Optional.of("CI"), Optional.empty())))));
        assertThat(amplifier.findings()).extracting(Finding::key).containsExactly(Finding.Key.UNKNOWN_PART);
        Plan reference = plan(TrialBoards.withReferences(board(channel("c", 5)),
                new BoardReference("quiet", "NONE-SUCH")));
        assertThat(reference.findings()).anySatisfy(finding -> {
            assertThat(finding.key()).isEqualTo(Finding.Key.UNKNOWN_PART);
            assertThat(finding.text()).contains("quiet", "NONE-SUCH", "REF25");
        });
        assertThat(reference.accepted()).isFalse();
        DesignRules d = DesignRules.DEFAULT;
        Plan rules = plan(TrialBoards.withRules(board(channel("c", 5)),
                new DesignRules(d.parallelShunts(), d.powerMargin(), d.dividerCurrent(), d.biasShare(),
                        Optional.of("NONE-SUCH"), 0, 1, 0, 0),
                1));
        assertThat(rules.findings()).extracting(Finding::key).contains(Finding.Key.UNKNOWN_PART);
    }

    @Test
    void anEmptyCatalogueIsNoFit() {
        Plan plan = new BoardPlanner().plan(board(channel("c", 5)), Catalogue.EMPTY, Progress.SILENT);
        assertThat(only(plan).verdict()).isEqualTo(Verdict.NO_FIT);
        assertThat(only(plan).findings()).extracting(Finding::key).containsOnly(Finding.Key.NO_FIT);
    }

    @Test
    void aTapOrSourceThatIsNotThereIsNoFit() {
        ChannelPlan tap = only(plan(board(channel("c", 5).withThreshold(new ThresholdDemand.SharedTap("gone")))));
        assertThat(tap.verdict()).isEqualTo(Verdict.NO_FIT);
        ChannelPlan source = only(plan(board(channel("c", 5)
                .withThreshold(new ThresholdDemand.OwnDivider(new Source.OfReference("gone"))))));
        assertThat(source.verdict()).isEqualTo(Verdict.NO_FIT);
        assertThat(source.findings()).isNotEmpty();
    }

    private static final class Counting implements Progress {
        private final List<Integer> done = new ArrayList<>();
        private final List<Integer> totals = new ArrayList<>();
        private final int stopAfter;

        Counting(int stopAfter) {
            this.stopAfter = stopAfter;
        }

        @Override
        public void reached(String stage, int steps, int total) {
            assertThat(stage).isNotBlank();
            done.add(steps);
            totals.add(total);
        }

        @Override
        public boolean cancelled() {
            return done.size() >= stopAfter;
        }
    }

    @Test
    void countsItsSteps() {
        Counting progress = new Counting(Integer.MAX_VALUE);
        new BoardPlanner().plan(board(channel("a", 1), channel("b", 2), channel("c", 3)), CATALOGUE, progress);
        // Parts of three channels, the whole board once, its channels judged; then again with parts that are cheap beside the others.
        assertThat(progress.done).startsWith(0, 1, 2, 0).endsWith(0, 1, 2);
        assertThat(progress.totals).containsOnly(3, 1);
    }

    @Test
    void stopsWhenToldAndWorksAfterwards() {
        Board board = board(channel("a", 1), channel("b", 2), channel("c", 3));
        BoardPlanner planner = new BoardPlanner();
        for (int after = 0; after < 3; after++) {
            Counting progress = new Counting(after);
            assertThatExceptionOfType(BoardPlanner.Cancelled.class)
                    .isThrownBy(() -> planner.plan(board, CATALOGUE, progress));
            assertThatExceptionOfType(BoardPlanner.Cancelled.class)
                    .isThrownBy(() -> planner.check(board, CATALOGUE, new Counting(0)));
            assertThat(progress.done).hasSize(after);
        }
        assertThat(planner.plan(board, CATALOGUE, Progress.SILENT)).isEqualTo(plan(board));
    }

    @Test
    void theTripTargetIsAimedAt() {
        for (double target : new double[]{0, 9, 11.3, 13}) {
            Channel c = channel("aimed", 5, 8, 16);
            Channel.Currents i = c.currents();
            OptionalDouble wanted = target == 0 ? OptionalDouble.empty() : OptionalDouble.of(target);
            Plan plan = plan(board(c.withCurrents(new Channel.Currents(i.load(), i.noTrip(), i.mustTrip(), wanted,
                    i.least(), i.fullScale()))));
            ChannelPlan solved = plan.channels().getFirst();
            assertThat(solved.verdict()).isEqualTo(Verdict.INSIDE);
            // Without a target the geometric mean of no-trip and must-trip is aimed at.
            double aim = target == 0 ? Math.sqrt(8 * 16) : target;
            assertThat(solved.solved().orElseThrow().trip().nominal()).as("target " + target)
                    .isCloseTo(aim, within(0.03 * aim));
        }
    }
}
