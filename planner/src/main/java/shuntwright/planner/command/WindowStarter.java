package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.logging.Logger;

/** Opens the window where there is a display. */
final class WindowStarter {
    /** Held here so that it is not collected: JavaFX warns when it runs from the class path, which is meant so. */
    private static final Logger JAVAFX = Logger.getLogger("javafx");

    private WindowStarter() {
    }

    /** Opens the window and waits until it is closed. @return why there is no window; empty when there was one */
    static Optional<String> open(Optional<Path> board, List<Path> parts) {
        if (!display(System.getenv(), System.getProperty("os.name", ""))) {
            return Optional.of("There is no display for the window (neither DISPLAY nor WAYLAND_DISPLAY is set).");
        }
        JAVAFX.setFilter(each -> !String.valueOf(each.getMessage()).startsWith("Unsupported JavaFX configuration"));
        return Optional.of("This build has no window: " + board + parts);
    }

    /** Whether a window can be expected to open: always, except on a Unix-like desktop's system without a display. */
    static boolean display(Map<String, String> environment, String system) {
        String name = system.toLowerCase(Locale.ROOT);
        return name.startsWith("windows") || name.startsWith("mac")
                || !environment.getOrDefault("DISPLAY", "").isEmpty()
                || !environment.getOrDefault("WAYLAND_DISPLAY", "").isEmpty();
    }
}
