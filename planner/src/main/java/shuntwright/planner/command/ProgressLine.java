package shuntwright.planner.command;

import shuntwright.plan.Progress;

/** Progress as one line that overwrites itself, only where a person watches. */
final class ProgressLine implements Progress, AutoCloseable {
    private static final long NANOS_BETWEEN = 100_000_000;

    private final Terminal terminal;
    private final boolean shown;
    private long last = System.nanoTime();
    private int width;

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
        return new ProgressLine(terminal, wanted && terminal.progress());
    }

    @Override
    public void reached(String stage, int done, int total) {
        long now = System.nanoTime();
        if (shown && now - last >= NANOS_BETWEEN) {
            last = now;
            show(stage + " " + done + " of " + total);
        }
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

    /** Wipes the line. */
    @Override
    public void close() {
        if (width > 0) {
            show("");
            terminal.err().print("\r");
            terminal.err().flush();
        }
    }
}
