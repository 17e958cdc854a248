package shuntwright.planner.work;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.List;
import java.util.Queue;

import org.junit.jupiter.api.Test;

import shuntwright.board.Sampling;
import shuntwright.board.Uncertainty;
import shuntwright.parts.Catalogue;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler.Depth;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.work.PlanSampling.State;

class PlanSamplingTest {
    private final Queue<Runnable> background = new ArrayDeque<>();
    private final Queue<Runnable> publisher = new ArrayDeque<>();
    private final List<String> heard = new ArrayList<>();
    private final List<String> asked = new ArrayList<>();

    private PlanSampling sampling() {
        return new PlanSampling((plan, how, depth, progress) -> {
            asked.add(TrialWords.of(how) + " seed " + how.seed() + " " + depth);
            return HandMadeStudies.sample(plan, how, depth, progress);
        }, background::add, publisher::add);
    }

    private static Plan plan(Sampling sampling) {
        return HandMadePlans.plan(HandMadeBoards.boat().withUncertainty(new Uncertainty(List.of(), sampling)),
                Catalogue.EMPTY, Progress.SILENT);
    }

    private void ask(PlanSampling sampling, Plan plan) {
        sampling.ask(plan, sampled -> heard.add(TrialWords.of(sampled.study().orElseThrow().sampling())), heard::add);
    }

    private static void run(Queue<Runnable> queue) {
        while (!queue.isEmpty()) {
            queue.remove().run();
        }
    }

    @Test
    void picturesRefineUntilTheBoardsOwnTrials() {
        PlanSampling sampling = sampling();
        ask(sampling, plan(new Sampling(new Sampling.Trials.Fixed(1_000_000), 5)));
        assertThat(sampling.stateProperty().get()).isEqualTo(State.RUNNING);
        assertThat(sampling.stageProperty().get()).isEqualTo("sampling 10,000 trials of 4 channels");
        run(background);
        assertThat(heard).as("before the publisher runs").isEmpty();
        run(publisher);
        assertThat(heard).containsExactly("10,000 trials", "100,000 trials", "1,000,000 trials");
        assertThat(asked).containsExactly("10,000 trials seed 5 " + Depth.SKETCH,
                "100,000 trials seed 5 " + Depth.SKETCH, "1,000,000 trials seed 5 " + Depth.FULL);
        assertThat(sampling.stateProperty().get()).isEqualTo(State.DONE);
        assertThat(sampling.stageProperty().get()).isEmpty();
    }

    @Test
    void noSketchHasMoreTrialsThanTheBoardAsksFor() {
        PlanSampling sampling = sampling();
        ask(sampling, plan(new Sampling(new Sampling.Trials.Fixed(50_000), 1)));
        run(background);
        run(publisher);
        ask(sampling, plan(new Sampling(new Sampling.Trials.Adaptive(2, 200_000), 1)));
        run(background);
        run(publisher);
        assertThat(heard).containsExactly("10,000 trials", "50,000 trials", "10,000 trials", "100,000 trials",
                "up to 200,000 trials");
    }

    @Test
    void theLatestPlanWins() {
        PlanSampling sampling = sampling();
        ask(sampling, plan(Sampling.DEFAULT));
        background.remove().run();
        ask(sampling, plan(new Sampling(new Sampling.Trials.Fixed(10_000), 1)));
        run(background);
        run(publisher);
        assertThat(heard).containsExactly("10,000 trials");
        assertThat(asked).as("nothing further is drawn for the first").hasSize(4);
    }

    @Test
    void theWorkUnderWayIsToldToStop() {
        PlanSampling[] held = new PlanSampling[1];
        PlanSampling sampling = new PlanSampling((plan, how, depth, progress) -> {
            if (depth == Depth.FULL) {
                held[0].stop();
                if (progress.cancelled()) {
                    throw new BoardPlanner.Cancelled();
                }
            }
            return HandMadeStudies.sample(plan, how, depth, progress);
        }, background::add, Runnable::run);
        held[0] = sampling;
        ask(sampling, plan(Sampling.DEFAULT));
        run(background);
        assertThat(heard).as("the best so far, then once more with what was done meanwhile")
                .containsExactly("10,000 trials", "100,000 trials", "100,000 trials");
        assertThat(sampling.stateProperty().get()).isEqualTo(State.STOPPED);
    }

    /** Nobody waits for what was done before a stop, once something newer is asked for. */
    @Test
    void whatAStopLeavesIsNotShownAfterANewerPlan() {
        PlanSampling[] held = new PlanSampling[1];
        PlanSampling sampling = new PlanSampling((plan, how, depth, progress) -> {
            if (depth == Depth.FULL) {
                held[0].stop();
                throw new BoardPlanner.Cancelled();
            }
            return HandMadeStudies.sample(plan, how, depth, progress);
        }, background::add, publisher::add);
        held[0] = sampling;
        ask(sampling, plan(Sampling.DEFAULT));
        run(background);
        sampling.cancel();
        run(publisher);
        assertThat(heard).isEmpty();
        assertThat(sampling.stateProperty().get()).isEqualTo(State.IDLE);
    }

    @Test
    void sampledOnItStartsWithMoreTrials() {
        PlanSampling sampling = sampling();
        Plan sketched = HandMadeStudies.sample(plan(Sampling.DEFAULT),
                new Sampling(new Sampling.Trials.Fixed(100_000), 1), Depth.SKETCH, Progress.SILENT);
        ask(sampling, sketched);
        run(background);
        run(publisher);
        assertThat(heard).containsExactly("1,000,000 trials");
    }

    @Test
    void aMistakeIsToldAndNothingElseStops() {
        PlanSampling sampling = new PlanSampling((_, _, _, _) -> {
            throw new IllegalStateException("no numbers left");
        }, background::add, publisher::add);
        ask(sampling, plan(Sampling.DEFAULT));
        run(background);
        run(publisher);
        assertThat(heard).singleElement().asString().contains("no numbers left");
        assertThat(sampling.stateProperty().get()).isEqualTo(State.FAILED);
    }

    @Test
    void progressIsPublishedAtMostOnceAtATime() {
        PlanSampling sampling = new PlanSampling((plan, how, depth, progress) -> {
            for (int step = 0; step < 1000; step++) {
                progress.reached("trials", step, 1010);
            }
            return HandMadeStudies.sample(plan, how, depth, Progress.SILENT);
        }, background::add, publisher::add);
        ask(sampling, plan(new Sampling(new Sampling.Trials.Fixed(10_000), 1)));
        run(background);
        assertThat(publisher).as("messages under way").hasSize(2);
        publisher.remove().run();
        assertThat(sampling.stageProperty().get()).isEqualTo("sampling 10,000 trials of 4 channels, 99 %");
        assertThat(sampling.progressProperty().get()).isEqualTo(999 / 1010.0);
        run(publisher);
        assertThat(sampling.progressProperty().get()).isZero();
    }
}
