package shuntwright.planner.work;

import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Consumer;
import java.util.function.LongSupplier;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

import org.jspecify.annotations.Nullable;

import shuntwright.plan.BoardChoice;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Progress;

/**
 * A question that is answered in the background; the latest wins and cancels the one before. Properties change and answers arrive
 * on the publisher's thread only.
 *
 * @param <T> the answer
 */
public final class Inquiry<T> {
    /** What is asked; throws {@link BoardPlanner.Cancelled} when progress says so. */
    @FunctionalInterface
    public interface Question<T> {
        T answer(Progress progress);
    }

    private record Reached(String stage, double share) {}

    private final class Job implements Progress {
        private final AtomicBoolean stop = new AtomicBoolean();
        private final AtomicBoolean content = new AtomicBoolean();
        private final AtomicReference<@Nullable Reached> reached = new AtomicReference<>();
        private final AtomicReference<@Nullable BoardChoice> better = new AtomicReference<>();

        @Override
        public void reached(String what, int done, int total) {
            double share = total > 0 ? (double) done / total : -1;
            // one message under way at most, however often it is told
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
        public void better(BoardChoice choice) {
            if (better.getAndSet(choice) == null) {
                publisher.execute(() -> {
                    BoardChoice now = better.getAndSet(null);
                    if (now != null && current == this) {
                        best.set(Optional.of(now));
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

        @Override
        public boolean enough() {
            return content.get();
        }
    }

    private final Executor background;
    private final Executor publisher;
    private final LongSupplier clock;
    private final ReadOnlyBooleanWrapper running = new ReadOnlyBooleanWrapper();
    private final ReadOnlyStringWrapper stage = new ReadOnlyStringWrapper("");
    private final ReadOnlyDoubleWrapper progress = new ReadOnlyDoubleWrapper();
    private final ReadOnlyObjectWrapper<Optional<BoardChoice>> best = new ReadOnlyObjectWrapper<>(Optional.empty());
    private Duration took = Duration.ZERO;
    private @Nullable Job current;

    /**
     * @param background one thread at a time
     * @param publisher  the window's thread
     */
    public Inquiry(Executor background, Executor publisher) {
        this(background, publisher, System::nanoTime);
    }

    /** @param clock nanoseconds since any moment */
    Inquiry(Executor background, Executor publisher, LongSupplier clock) {
        this.background = background;
        this.publisher = publisher;
        this.clock = clock;
    }

    /**
     * Starts to answer; of several questions only the last is answered.
     *
     * @param what   is being done, in words
     * @param done   hears the answer
     * @param failed hears of a mistake within the program
     */
    public void ask(String what, Question<T> question, Consumer<T> done, Consumer<RuntimeException> failed) {
        cancel();
        Job job = new Job();
        current = job;
        running.set(true);
        progress.set(-1);
        stage.set(what);
        background.execute(() -> work(job, question, done, failed));
    }

    private void work(Job job, Question<T> question, Consumer<T> done, Consumer<RuntimeException> failed) {
        if (job.cancelled()) {
            return;
        }
        long start = clock.getAsLong();
        try {
            T answer = question.answer(job);
            Duration time = Duration.ofNanos(clock.getAsLong() - start);
            publisher.execute(() -> finish(job, () -> {
                took = time;
                done.accept(answer);
            }));
        } catch (BoardPlanner.Cancelled _) {
            publisher.execute(() -> finish(job, () -> {
            }));
        } catch (RuntimeException problem) {
            System.getLogger(Inquiry.class.getName()).log(System.Logger.Level.ERROR, "background work failed", problem);
            publisher.execute(() -> finish(job, () -> failed.accept(problem)));
        }
    }

    private void finish(Job job, Runnable then) {
        if (current == job) {
            end();
            then.run();
        }
    }

    private void end() {
        current = null;
        running.set(false);
        stage.set("");
        progress.set(0);
        best.set(Optional.empty());
    }

    /** Asks the work under way to come to an end with the best it has; that answer, if there is one, is given. */
    public void stop() {
        Job job = current;
        if (job != null) {
            job.content.set(true);
            stage.set("ending with the best so far");
            progress.set(-1);
        }
    }

    /** Stops the work under way, if there is any; its answer is not given. */
    public void cancel() {
        Job job = current;
        if (job != null) {
            job.stop.set(true);
            end();
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

    /** The best choice found so far, while it is looked for; empty otherwise. */
    public ReadOnlyObjectProperty<Optional<BoardChoice>> bestProperty() {
        return best.getReadOnlyProperty();
    }

    /** How long the last answer took on the wall clock. */
    public Duration took() {
        return took;
    }
}
