package shuntwright.planner.work;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Executor;

/** Where questions to an {@link Explorer} are asked: in the background, one after the other. */
public final class Exploring {
    private final Explorer explorer;
    private final Executor background;
    private final Executor publisher;
    private final List<Inquiry<?>> inquiries = new ArrayList<>();

    /**
     * @param background one thread at a time, since the explorer keeps what it worked out
     * @param publisher  the window's thread
     */
    public Exploring(Explorer explorer, Executor background, Executor publisher) {
        this.explorer = explorer;
        this.background = background;
        this.publisher = publisher;
    }

    public Explorer explorer() {
        return explorer;
    }

    /** A place for one kind of question. */
    public <T> Inquiry<T> inquiry() {
        Inquiry<T> inquiry = new Inquiry<>(background, publisher);
        inquiries.add(inquiry);
        return inquiry;
    }

    /** Stops whatever is asked. */
    public void cancel() {
        inquiries.forEach(Inquiry::cancel);
    }
}
