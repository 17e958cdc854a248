package shuntwright.planner.work;

import java.io.IOException;
import java.util.concurrent.Executor;
import java.util.function.Consumer;

/** Reads and writes files in the background, one after the other; outcomes arrive on the publisher's thread. */
public final class FileWork {
    /** Reading or writing that may fail for reasons of the file system. */
    @FunctionalInterface
    public interface Work<T> {
        T run() throws IOException;
    }

    private final Executor background;
    private final Executor publisher;

    public FileWork(Executor background, Executor publisher) {
        this.background = background;
        this.publisher = publisher;
    }

    /**
     * @param done   hears the result
     * @param failed hears what the file system said
     */
    public <T> void run(Work<T> work, Consumer<T> done, Consumer<IOException> failed) {
        background.execute(() -> {
            try {
                T result = work.run();
                publisher.execute(() -> done.accept(result));
            } catch (IOException problem) {
                publisher.execute(() -> failed.accept(problem));
            }
        });
    }
}
