package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

import shuntwright.planner.window.NoWindow;
import shuntwright.planner.window.WindowApp;

/** Opens the window where there is a display. */
final class WindowStarter {
    private WindowStarter() {
    }

    /** Opens the window and waits until it is closed. @return why there is no window; empty when there was one */
    static Optional<String> open(Optional<Path> board, List<Path> parts) {
        if (!display(System.getenv(), System.getProperty("os.name", ""))) {
            return Optional.of("There is no display for the window (neither DISPLAY nor WAYLAND_DISPLAY is set).");
        }
        try {
            WindowApp.launch(board, parts);
            return Optional.empty();
        } catch (NoWindow problem) {
            return Optional.of(String.valueOf(problem.getMessage()));
        }
    }

    /** Whether a window can be expected to open: always, except on a Unix-like desktop's system without a display. */
    static boolean display(Map<String, String> environment, String system) {
        String name = system.toLowerCase(Locale.ROOT);
        return name.startsWith("windows") || name.startsWith("mac")
                || !environment.getOrDefault("DISPLAY", "").isEmpty()
                || !environment.getOrDefault("WAYLAND_DISPLAY", "").isEmpty();
    }
}
