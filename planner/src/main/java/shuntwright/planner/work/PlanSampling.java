package shuntwright.planner.work;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;

import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

import org.jspecify.annotations.Nullable;

import shuntwright.board.Sampling;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.sampling.BoardStudy;

/**
 * Samples planned boards in the background: a first picture of few trials, a better one, then as the board asks for. The
 * latest plan wins and ends the one before. Properties change and answers arrive on the publisher's thread only.
 */
public final class PlanSampling {
    /** Something that samples, such as {@link BoardSampler#sample}. */
    @FunctionalInterface
    public interface Sampler {
        Plan sample(Plan plan, Sampling sampling, BoardSampler.Depth depth, Progress progress);
    }

    /** How far it came. */
    public enum State {
        /** Nothing was asked for, or a newer edit ended it. */
        IDLE,
        /** Trials are being drawn. */
        RUNNING,
        /** The person ended it; what was published stays. */
        STOPPED,
        /** A mistake within the program ended it; what was published stays. */
        FAILED,
        /** As the board asks for. */
        DONE
    }

    /** Trials of the pictures before the last. */
    private static final List<Integer> SKETCHES = List.of(Sampling.LEAST, 10 * Sampling.LEAST);

    /** One picture. */
    private record Step(Sampling sampling, BoardSampler.Depth depth) {}

    private record Reached(String stage, double share) {}

    private static final String REST = ", effects and what shared things cost";

    private final class Job implements Progress {
        private final AtomicBoolean stop = new AtomicBoolean();
        private final AtomicReference<@Nullable Reached> reached = new AtomicReference<>();
        private final long circuits;
        private volatile Step step;
        private volatile boolean byPerson;

        Job(Step first, long circuits) {
            this.step = first;
            this.circuits = circuits;
        }

        @Override
        public void reached(String what, int done, int total) {
            double share = total > 0 ? Math.min(1, (double) done / total) : -1;
            Reached now = new Reached(words(step, circuits) + (share < 0
                    ? ""
                    : share < 1
                            ? ", " + Math.round(share * 100) + " %"
                            : step.depth() == BoardSampler.Depth.FULL ? REST : ""),
                    share < 1 ? share : -1);
            // one message under way at most, however often the sampler reports
            if (reached.getAndSet(now) == null) {
                publisher.execute(() -> {
                    Reached last = reached.getAndSet(null);
                    if (last != null && current == this) {
                        stage.set(last.stage());
                        progress.set(last.share());
                    }
                });
            }
        }

        @Override
        public double seconds() {
            return System.nanoTime() / 1e9;
        }

        @Override
        public boolean cancelled() {
            return stop.get();
        }
    }

    private final Sampler sampler;
    private final Executor background;
    private final Executor publisher;
    private final ReadOnlyObjectWrapper<State> state = new ReadOnlyObjectWrapper<>(State.IDLE);
    private final ReadOnlyStringWrapper stage = new ReadOnlyStringWrapper("");
    private final ReadOnlyDoubleWrapper progress = new ReadOnlyDoubleWrapper();
    private @Nullable Job current;
    /** Ended by the person, and nothing was asked for since. */
    private @Nullable Job stopped;

    /**
     * @param background one thread at a time, since the sampler keeps what it sampled
     * @param publisher  the window's thread
     */
    public PlanSampling(Sampler sampler, Executor background, Executor publisher) {
        this.sampler = sampler;
        this.background = background;
        this.publisher = publisher;
    }

    /**
     * Starts sampling as the plan's board says; where the plan is sampled already, with the first picture of more trials.
     *
     * @param reached hears every picture
     * @param failed  hears why there is no further one, in words
     */
    public void ask(Plan plan, Consumer<Plan> reached, Consumer<String> failed) {
        cancel();
        List<Step> steps = steps(plan);
        long circuits = plan.channels().stream().filter(each -> each.solved().isPresent()).count();
        Job job = new Job(steps.getFirst(), circuits);
        current = job;
        state.set(State.RUNNING);
        progress.set(-1);
        stage.set(words(steps.getFirst(), circuits));
        background.execute(() -> work(job, plan, steps, reached, failed));
    }

    private static String words(Step step, long circuits) {
        return "sampling " + TrialWords.of(step.sampling()) + " of " + circuits
                + (circuits == 1 ? " channel" : " channels");
    }

    private static List<Step> steps(Plan plan) {
        Sampling asked = plan.board().uncertainty().sampling();
        int drawn = plan.study().map(study -> study.sampling().trials().atMost()).orElse(0);
        List<Step> steps = new ArrayList<>();
        for (int count : SKETCHES) {
            if (count > drawn && count < asked.trials().atMost()) {
                steps.add(new Step(new Sampling(new Sampling.Trials.Fixed(count), asked.seed()),
                        BoardSampler.Depth.SKETCH));
            }
        }
        steps.add(new Step(asked, BoardSampler.Depth.FULL));
        return steps;
    }

    private void work(Job job, Plan plan, List<Step> steps, Consumer<Plan> reached, Consumer<String> failed) {
        Optional<Sampling> shown = plan.study().map(BoardStudy::sampling);
        try {
            for (Step step : steps) {
                if (job.cancelled()) {
                    throw new BoardPlanner.Cancelled();
                }
                job.step = step;
                Plan sampled = sampler.sample(plan, step.sampling(), step.depth(), job);
                boolean last = step.equals(steps.getLast());
                publisher.execute(() -> publish(job, last, () -> reached.accept(sampled)));
                shown = Optional.of(step.sampling());
            }
        } catch (BoardPlanner.Cancelled _) {
            // whoever cancelled has said so already
            if (job.byPerson) {
                shown.ifPresent(each -> finished(job, plan, each, reached));
            }
        } catch (RuntimeException problem) {
            // a sampler's mistake must not take the window with it: say it, keep the plan
            System.getLogger(PlanSampling.class.getName()).log(System.Logger.Level.ERROR, "sampling failed", problem);
            publisher.execute(() -> fail(job, () -> failed.accept("Sampling stopped on an error within the program ("
                    + problem
                    + "). What was sampled before stays on show, limits and combined uncertainty hold; undo the "
                    + "last edit or sample again to go on.")));
        }
    }

    /** The last picture once more, with the channels that were done before the person ended it. */
    private void finished(Job job, Plan plan, Sampling shown, Consumer<Plan> reached) {
        Plan sampled = sampler.sample(plan, shown, BoardSampler.Depth.SKETCH, Progress.SILENT);
        publisher.execute(() -> {
            if (stopped == job) {
                reached.accept(sampled);
            }
        });
    }

    private void publish(Job job, boolean last, Runnable picture) {
        if (current == job) {
            if (last) {
                end(State.DONE);
            }
            picture.run();
        }
    }

    private void fail(Job job, Runnable then) {
        if (current == job) {
            end(State.FAILED);
            then.run();
        }
    }

    private void end(State as) {
        current = null;
        stage.set("");
        progress.set(0);
        state.set(as);
    }

    /** Ends it because something newer is coming; nothing further is published. */
    public void cancel() {
        halt(State.IDLE);
    }

    /** Ends it because the person says so; the best picture so far stays, and gains the channels that are done. */
    public void stop() {
        Job job = current;
        if (job != null) {
            job.byPerson = true;
            halt(State.STOPPED);
            stopped = job;
        }
    }

    private void halt(State as) {
        Job job = current;
        if (job != null) {
            job.stop.set(true);
        }
        stopped = null;
        end(as);
    }

    public ReadOnlyObjectProperty<State> stateProperty() {
        return state.getReadOnlyProperty();
    }

    /** What is being drawn, in words; empty when nothing is. */
    public ReadOnlyStringProperty stageProperty() {
        return stage.getReadOnlyProperty();
    }

    /** Share of the present picture, 0 to 1, or below 0 when it is not known. */
    public ReadOnlyDoubleProperty progressProperty() {
        return progress.getReadOnlyProperty();
    }
}
