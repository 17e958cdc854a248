package shuntwright.planner.work;

import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;

/** The window's background threads, each with a name and a purpose. */
public final class Threads implements AutoCloseable {
    private final ExecutorService planning = Executors
            .newSingleThreadExecutor(Thread.ofPlatform().name("planning").daemon().factory());
    private final ExecutorService exploring = Executors
            .newSingleThreadExecutor(Thread.ofPlatform().name("exploring").daemon().factory());
    private final ExecutorService sampling = Executors
            .newSingleThreadExecutor(Thread.ofPlatform().name("sampling").daemon().factory());
    private final ExecutorService files = Executors
            .newSingleThreadExecutor(Thread.ofPlatform().name("files").factory());

    public ExecutorService planning() {
        return planning;
    }

    /** Answers what might be, while the board itself is planned. */
    public ExecutorService exploring() {
        return exploring;
    }

    public ExecutorService sampling() {
        return sampling;
    }

    /** Not a daemon: a save that has begun is finished even when the window closes. */
    public ExecutorService files() {
        return files;
    }

    @Override
    public void close() {
        planning.shutdownNow();
        exploring.shutdownNow();
        sampling.shutdownNow();
        files.shutdown();
    }
}
