package shuntwright.planner.undo;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;

/**
 * A value with the values it had before and after, each step with a name.
 *
 * @param <S> an immutable snapshot
 */
public final class History<S> {
    private record Step<S>(String name, S snapshot) {}

    private static final int MOST_STEPS = 1000;

    private final Deque<Step<S>> before = new ArrayDeque<>();
    private final Deque<Step<S>> after = new ArrayDeque<>();
    private S now;

    public History(S start) {
        now = start;
    }

    public S now() {
        return now;
    }

    /** Goes on to the next snapshot; what was undone is forgotten. A step that changes nothing is not recorded. */
    public void step(String name, S next) {
        if (next.equals(now)) {
            return;
        }
        before.push(new Step<>(name, now));
        if (before.size() > MOST_STEPS) {
            before.removeLast();
        }
        after.clear();
        now = next;
    }

    /** Name of the step that {@link #undo} takes back. */
    public Optional<String> undoName() {
        return Optional.ofNullable(before.peek()).map(Step::name);
    }

    /** Name of the step that {@link #redo} makes again. */
    public Optional<String> redoName() {
        return Optional.ofNullable(after.peek()).map(Step::name);
    }

    public void undo() {
        if (!before.isEmpty()) {
            Step<S> step = before.pop();
            after.push(new Step<>(step.name(), now));
            now = step.snapshot();
        }
    }

    public void redo() {
        if (!after.isEmpty()) {
            Step<S> step = after.pop();
            before.push(new Step<>(step.name(), now));
            now = step.snapshot();
        }
    }
}
