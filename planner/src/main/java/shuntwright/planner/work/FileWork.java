package shuntwright.planner.work;

import java.util.concurrent.Executor;
import java.util.function.Consumer;
import java.util.function.Supplier;

/** Reads and writes files in the background, one after the other; outcomes arrive on the publisher's thread. */
public final class FileWork {
    private final Executor background;
    private final Executor publisher;

    public FileWork(Executor background, Executor publisher) {
        this.background = background;
        this.publisher = publisher;
    }

    /** @param done hears the result */
    public <T> void run(Supplier<T> work, Consumer<T> done) {
        background.execute(() -> {
            T result = work.get();
            publisher.execute(() -> done.accept(result));
        });
    }
}
