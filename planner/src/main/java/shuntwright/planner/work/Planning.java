package shuntwright.planner.work;

import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

import org.jspecify.annotations.Nullable;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;

/**
 * Plans in the background; the latest question wins and cancels the one before. Properties change and answers arrive on
 * the publisher's thread only.
 */
public final class Planning {
    /** Something that plans, such as {@link BoardPlanner#plan}. */
    @FunctionalInterface
    public interface Planner {
        Plan plan(Board board, Catalogue catalogue, Progress progress);
    }

    private record Reached(String stage, double share) {}

    private final class Job implements Progress {
        private final AtomicBoolean stop = new AtomicBoolean();
        private final AtomicReference<@Nullable Reached> reached = new AtomicReference<>();

        @Override
        public void reached(String what, int done, int total) {
            double share = total > 0 ? (double) done / total : -1;
            // one message under way at most, however often the planner reports
            if (reached.getAndSet(new Reached(what, share)) == null) {
                publisher.execute(() -> {
                    Reached now = reached.getAndSet(null);
                    if (now != null && current == this) {
                        stage.set(now.stage());
                        progress.set(now.share());
                    }
                });
            }
        }

        @Override
        public boolean cancelled() {
            return stop.get();
        }
    }

    private final Planner planner;
    private final Executor background;
    private final Executor publisher;
    private final ReadOnlyBooleanWrapper running = new ReadOnlyBooleanWrapper();
    private final ReadOnlyStringWrapper stage = new ReadOnlyStringWrapper("");
    private final ReadOnlyDoubleWrapper progress = new ReadOnlyDoubleWrapper();
    private @Nullable Job current;

    /**
     * @param background one thread at a time, since the planner keeps what it worked out
     * @param publisher  the window's thread
     */
    public Planning(Planner planner, Executor background, Executor publisher) {
        this.planner = planner;
        this.background = background;
        this.publisher = publisher;
    }

    /**
     * Starts planning; of several questions only the last is answered.
     *
     * @param done   hears the plan
     * @param failed hears why there is none, in words
     */
    public void ask(Board board, Catalogue catalogue, Consumer<Plan> done, Consumer<String> failed) {
        cancel();
        Job job = new Job();
        current = job;
        running.set(true);
        progress.set(-1);
        stage.set("planning " + board.name());
        background.execute(() -> work(job, board, catalogue, done, failed));
    }

    private void work(Job job, Board board, Catalogue catalogue, Consumer<Plan> done, Consumer<String> failed) {
        if (job.cancelled()) {
            return;
        }
        try {
            Plan plan = planner.plan(board, catalogue, job);
            publisher.execute(() -> finish(job, () -> done.accept(plan)));
        } catch (BoardPlanner.Cancelled _) {
            publisher.execute(() -> finish(job, () -> {
            }));
        } catch (RuntimeException problem) {
            // a planner's mistake must not take the window with it: say it, keep the last good plan
            System.getLogger(Planning.class.getName()).log(System.Logger.Level.ERROR, "planning failed", problem);
            publisher.execute(() -> finish(job, () -> failed.accept("Planning stopped on an error within the program ("
                    + problem + "). The last plan stays on show; undo the last edit to go on.")));
        }
    }

    private void finish(Job job, Runnable then) {
        if (current == job) {
            current = null;
            running.set(false);
            stage.set("");
            progress.set(0);
            then.run();
        }
    }

    /** Stops the work under way, if there is any; its answer is not given. */
    public void cancel() {
        Job job = current;
        if (job != null) {
            job.stop.set(true);
            current = null;
            running.set(false);
            stage.set("");
            progress.set(0);
        }
    }

    public ReadOnlyBooleanProperty runningProperty() {
        return running.getReadOnlyProperty();
    }

    /** What is being computed, in words; empty when nothing is. */
    public ReadOnlyStringProperty stageProperty() {
        return stage.getReadOnlyProperty();
    }

    /** Share done, 0 to 1, or below 0 when it is not known. */
    public ReadOnlyDoubleProperty progressProperty() {
        return progress.getReadOnlyProperty();
    }
}
