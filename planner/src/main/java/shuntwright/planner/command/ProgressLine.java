package shuntwright.planner.command;

import java.util.concurrent.locks.LockSupport;

import shuntwright.plan.BoardChoice;
import shuntwright.plan.Progress;

/**
 * Progress as one line that overwrites itself, only where a person watches. Nothing is written to files while there is progress:
 * when the process is told to end (Ctrl-C) it says so and leaves the terminal with a line of its own.
 */
final class ProgressLine implements Progress, AutoCloseable {
    private static final long NANOS_BETWEEN = 100_000_000;

    private final Terminal terminal;
    private final boolean shown;
    private final Thread goodbye = new Thread(this::stopped, "stopped");
    private long last = System.nanoTime();
    private int width;
    private boolean ended;
    private String stage = "";
    private String best = "";

    private ProgressLine(Terminal terminal, boolean shown) {
        this.terminal = terminal;
        this.shown = shown;
    }

    /**
     * A line on that terminal; silent for the first tenth of a second, and where nobody watches.
     *
     * @param wanted false to stay silent even where somebody does
     */
    static ProgressLine on(Terminal terminal, boolean wanted) {
        ProgressLine line = new ProgressLine(terminal, wanted && terminal.progress());
        try {
            Runtime.getRuntime().addShutdownHook(line.goodbye);
        } catch (IllegalStateException _) {
            waitForTheEnd();
        }
        return line;
    }

    /** The process is ending: this thread must not go on to write anything. */
    private static void waitForTheEnd() {
        while (true) {
            LockSupport.park();
        }
    }

    @Override
    public synchronized void reached(String what, int done, int total) {
        if (!what.equals(stage)) {
            stage = what;
            best = "";
        }
        long now = System.nanoTime();
        if (shown && !ended && now - last >= NANOS_BETWEEN) {
            last = now;
            show(what + " " + done + " of " + total + best);
        }
    }

    @Override
    public synchronized void better(BoardChoice found) {
        best = "; best so far " + ChoiceText.brief(found);
    }

    @Override
    public double seconds() {
        return System.nanoTime() / 1e9;
    }

    @Override
    public boolean cancelled() {
        return Thread.currentThread().isInterrupted();
    }

    private void show(String line) {
        String spelt = Spelling.in(terminal.charset(), line);
        terminal.err().print("\r" + spelt + " ".repeat(Math.max(0, width - spelt.length())));
        terminal.err().flush();
        width = spelt.length();
    }

    private synchronized void stopped() {
        ended = true;
        wipe();
        terminal.complain("Stopped; nothing was written.");
    }

    /** Wipes the line. */
    @Override
    public void close() {
        try {
            Runtime.getRuntime().removeShutdownHook(goodbye);
        } catch (IllegalStateException _) {
            waitForTheEnd();
        }
        wipe();
    }

    private synchronized void wipe() {
        if (width > 0) {
            show("");
            terminal.err().print("\r");
            terminal.err().flush();
        }
    }
}
