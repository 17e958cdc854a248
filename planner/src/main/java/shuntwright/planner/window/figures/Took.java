package shuntwright.planner.window.figures;

import java.time.Duration;
import java.util.Locale;

/** Times of work on the wall clock in words. */
public final class Took {
    private Took() {
    }

    /** "85 ms", "3.2 s", "2 min 5 s". */
    public static String words(Duration took) {
        long millis = took.toMillis();
        return millis < 1000
                ? Math.max(1, millis) + " ms"
                : millis < 60_000
                        ? String.format(Locale.ROOT, "%.1f s", millis / 1e3)
                        : took.toMinutes() + " min " + took.toSecondsPart() + " s";
    }
}
