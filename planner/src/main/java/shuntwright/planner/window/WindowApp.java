package shuntwright.planner.window;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.logging.Filter;
import java.util.logging.Logger;

import javafx.application.Application;
import javafx.application.Platform;
import javafx.stage.Stage;

import org.jspecify.annotations.Nullable;

import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler;
import shuntwright.planner.window.dialog.SystemChoosers;
import shuntwright.planner.work.Explorer;

/** The desktop window as a program. */
public final class WindowApp extends Application {
    private static final String BOARD = "board=";
    private static final String PARTS = "parts=";
    /** Held so that the filter is not collected: running from the class path is meant and needs no warning. */
    private static final Logger JAVAFX = Logger.getLogger("javafx");
    private static final AtomicBoolean STARTED = new AtomicBoolean();

    private @Nullable OpenWindow window;

    /**
     * Opens the window and returns when it is closed.
     *
     * @param board to open; without one the window offers demo boards
     * @param parts parts files besides those that boards name
     * @throws NoWindow when there is no display, or what a window needs is not installed
     */
    public static void launch(Optional<Path> board, List<Path> parts) throws NoWindow {
        Filter before = JAVAFX.getFilter();
        JAVAFX.setFilter(line -> !String.valueOf(line.getMessage()).contains("Unsupported JavaFX configuration")
                && (before == null || before.isLoggable(line)));
        List<String> arguments = new ArrayList<>();
        board.ifPresent(path -> arguments.add(BOARD + path));
        parts.forEach(path -> arguments.add(PARTS + path));
        try {
            Application.launch(WindowApp.class, arguments.toArray(String[]::new));
        } catch (RuntimeException | UnsatisfiedLinkError problem) {
            // once the window stood, a failure is the program's and not the display's
            if (STARTED.get()) {
                throw problem;
            }
            throw noWindow(problem);
        }
    }

    private static NoWindow noWindow(Throwable problem) {
        StringBuilder said = new StringBuilder();
        for (Throwable cause = problem; cause != null; cause = cause.getCause()) {
            said.append(said.isEmpty() ? "" : ": ").append(cause.getMessage());
        }
        boolean display = said.toString().contains("DISPLAY");
        return new NoWindow("No window can be opened (" + said + "). " + (display
                ? "Set DISPLAY to a screen, or use the commands that need none."
                : "On Debian install libgtk-3-0 and libxtst6, or use the commands that need no window."), problem);
    }

    @Override
    public void start(Stage stage) {
        STARTED.set(true);
        BoardSampler sampler = new BoardSampler(Runtime.getRuntime().availableProcessors());
        OpenWindow opened = new OpenWindow(stage,
                new OpenWindow.Engines(new BoardPlanner()::plan, sampler::sample, Explorer.of(new BoardPlanner())),
                new SystemChoosers(() -> stage), Platform.getPreferences().colorSchemeProperty(), nearby());
        window = opened;
        Thread.setDefaultUncaughtExceptionHandler((thread, problem) -> {
            System.getLogger(WindowApp.class.getName()).log(System.Logger.Level.ERROR,
                    "unexpected problem on thread " + thread.getName(), problem);
            Platform.runLater(() -> opened.tellProblem(problem));
        });
        List<String> arguments = getParameters().getRaw();
        opened.documents().useParts(arguments.stream().filter(each -> each.startsWith(PARTS))
                .map(each -> Path.of(each.substring(PARTS.length()))).toList());
        opened.show();
        arguments.stream().filter(each -> each.startsWith(BOARD)).findFirst()
                .ifPresent(each -> opened.documents().open(Path.of(each.substring(BOARD.length()))));
    }

    /** Folders near which demo boards may be. */
    private static List<Path> nearby() {
        List<Path> folders = new ArrayList<>();
        folders.add(Path.of(""));
        var source = WindowApp.class.getProtectionDomain().getCodeSource();
        if (source != null && source.getLocation() != null && "file".equals(source.getLocation().getProtocol())) {
            folders.add(Path.of(java.net.URI.create(source.getLocation().toString())));
        }
        return folders;
    }

    @Override
    public void stop() {
        if (window != null) {
            window.release();
        }
    }
}
