package shuntwright.planner.window;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;

import javafx.application.ColorScheme;
import javafx.application.Platform;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Rectangle2D;
import javafx.scene.Scene;
import javafx.stage.Screen;
import javafx.stage.Stage;

import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Documents;
import shuntwright.planner.session.FileBoardStore;
import shuntwright.planner.window.dialog.Choosers;
import shuntwright.planner.window.dialog.Dialogs;
import shuntwright.planner.work.Explorer;
import shuntwright.planner.work.Exploring;
import shuntwright.planner.work.FileWork;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.Planning;
import shuntwright.planner.work.Threads;

/** Puts a window together: session, files, threads, content. */
final class OpenWindow {
    /** Milliseconds that a new plan may wait for its first picture. */
    private static final long PATIENCE = 200;

    private final Threads threads = new Threads();
    private final BoardSession session;
    private final Exploring exploring;
    private final ThemeChoice themes;
    private final Documents documents;
    private final MainWindow content;
    private final Dialogs dialogs;
    private final Stage stage;

    /**
     * What works in the background.
     *
     * @param planner used by one thread at a time
     * @param sampler used by one thread at a time
     * @param explorer used by one thread at a time, while the planner may be at work
     */
    record Engines(Planning.Planner planner, PlanSampling.Sampler sampler, Explorer explorer) {}

    /** @param nearby folders near which demo boards may be */
    OpenWindow(Stage stage, Engines engines, Choosers choosers, ObservableValue<ColorScheme> system,
            List<Path> nearby) {
        this.stage = stage;
        session = new BoardSession(new Planning(engines.planner(), threads.planning(), Platform::runLater),
                new PlanSampling(engines.sampler(), threads.sampling(), Platform::runLater),
                CompletableFuture.delayedExecutor(PATIENCE, TimeUnit.MILLISECONDS, Platform::runLater));
        exploring = new Exploring(engines.explorer(), threads.exploring(), Platform::runLater);
        Theme.loadFonts();
        themes = new ThemeChoice(system);
        StatusModel status = new StatusModel(session);
        dialogs = new Dialogs(choosers, () -> stage, pane -> themes.themeProperty().get().apply(pane),
                status::done);
        documents = new Documents(session, new FileBoardStore(), dialogs,
                new FileWork(threads.files(), Platform::runLater));
        List<Path> demos = Documents.demoBoards(nearby);
        MainWindow.Start start = new MainWindow.Start(demos, Documents.partsBeside(demos));
        content = new MainWindow(session, exploring, documents, dialogs, status, themes, start, this::close);
        Rectangle2D screen = Screen.getPrimary().getVisualBounds();
        Scene scene = content.scene(Math.min(1500, screen.getWidth() * 0.96),
                Math.min(920, screen.getHeight() * 0.9));
        stage.setScene(scene);
        // on a small screen the table needs all of it; the frame needs room too
        stage.setMaximized(screen.getWidth() < 1500 || screen.getHeight() < 940);
        stage.titleProperty().bind(new TitleModel(session, documents).titleBinding());
        stage.setOnCloseRequest(event -> {
            event.consume();
            close();
        });
    }

    void show() {
        stage.show();
    }

    Documents documents() {
        return documents;
    }

    BoardSession session() {
        return session;
    }

    ThemeChoice themes() {
        return themes;
    }

    /** Closes the window unless there are unsaved edits that the person wants to keep. */
    void close() {
        documents.unlessUnsaved(() -> {
            content.closePopUps();
            stage.close();
            release();
        });
    }

    /** Tells of a mistake within the program. */
    void tellProblem(Throwable problem) {
        dialogs.tell("A mistake within the program", "Something went wrong within the program; the board on show is "
                + "unharmed. Save it under another name to be safe.", List.of(problem.toString()));
    }

    /** Closes what floats over the window. */
    void closePopUps() {
        content.closePopUps();
    }

    /** Ends the background work. */
    void release() {
        session.planning().cancel();
        session.sampling().cancel();
        exploring.cancel();
        threads.close();
    }
}
