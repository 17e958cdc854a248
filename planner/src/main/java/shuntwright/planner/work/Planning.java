package shuntwright.planner.work;

import java.time.Duration;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.function.Consumer;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.plan.BoardChoice;
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

    private final Planner planner;
    private final Inquiry<Plan> inquiry;

    /**
     * @param background one thread at a time, since the planner keeps what it worked out
     * @param publisher  the window's thread
     */
    public Planning(Planner planner, Executor background, Executor publisher) {
        this.planner = planner;
        this.inquiry = new Inquiry<>(background, publisher);
    }

    /**
     * Starts planning; of several questions only the last is answered.
     *
     * @param done   hears the plan
     * @param failed hears why there is none, in words
     */
    public void ask(Board board, Catalogue catalogue, Consumer<Plan> done, Consumer<String> failed) {
        // a planner's mistake must not take the window with it: say it, keep the last good plan
        inquiry.ask("planning " + board.name(), progress -> planner.plan(board, catalogue, progress), done,
                problem -> failed.accept("Planning stopped on an error within the program (" + problem
                        + "). The last plan stays on show; undo the last edit to go on."));
    }

    /** Asks the planning under way to come to an end with the best plan it has. */
    public void stop() {
        inquiry.stop();
    }

    /** Stops the work under way, if there is any; its answer is not given. */
    public void cancel() {
        inquiry.cancel();
    }

    public ReadOnlyBooleanProperty runningProperty() {
        return inquiry.runningProperty();
    }

    /** What is being computed, in words; empty when nothing is. */
    public ReadOnlyStringProperty stageProperty() {
        return inquiry.stageProperty();
    }

    /** Share done, 0 to 1, or below 0 when it is not known. */
    public ReadOnlyDoubleProperty progressProperty() {
        return inquiry.progressProperty();
    }

    /** The best choice found so far, while it is looked for; empty otherwise. */
    public ReadOnlyObjectProperty<Optional<BoardChoice>> bestProperty() {
        return inquiry.bestProperty();
    }

    /** How long the last plan took on the wall clock. */
    public Duration took() {
        return inquiry.took();
    }
}
