package shuntwright.planner.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicBoolean;

import javax.imageio.ImageIO;

import javafx.application.ColorScheme;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import org.testfx.util.WaitForAsyncUtils;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Objective;
import shuntwright.board.Preference;
import shuntwright.board.Zone;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.parts.Catalogue;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadeChoices;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.session.Questions.Kind;
import shuntwright.planner.window.dialog.Choosers;

/** The board-wide choice, worked by clicking and typing. */
@ExtendWith(ApplicationExtension.class)
@SuppressWarnings("NullAway.Init") // set before each test
class ChoiceWindowTest {
    @TempDir
    static Path folder;

    private final AtomicBoolean slow = new AtomicBoolean();
    private OpenWindow window;
    private Stage stage;

    @Start
    void start(Stage shown) {
        stage = shown;
        Choosers choosers = new Choosers() {
            @Override
            public Optional<Path> open(Kind kind) {
                return Optional.empty();
            }

            @Override
            public Optional<Path> save(Kind kind, Path suggestion) {
                return Optional.of(folder.resolve("saved" + kind.ending()));
            }
        };
        window = new OpenWindow(shown,
                new OpenWindow.Engines(this::plan, HandMadeStudies::sample, HandMadeChoices.EXPLORER), choosers,
                new SimpleObjectProperty<>(ColorScheme.LIGHT), List.of());
        window.show();
        shown.setWidth(1500);
        shown.setHeight(900);
        Path file = folder.resolve("boat.board.json");
        BoardFiles.save(HandMadeBoards.boat().withBuildQuantity(40)
                .withZones(List.of(new Zone("port", OptionalDouble.of(0.4), OptionalDouble.of(12)))), file);
        window.documents().open(file);
    }

    /** Looks on for ever while this is slow, unless it is told to be content. */
    private Plan plan(Board board, Catalogue catalogue, Progress progress) {
        Plan bare = HandMadePlans.plan(board, catalogue, progress);
        boolean content = false;
        while (slow.get() && !content) {
            progress.better(HandMadeChoices.choice(bare, 20, false));
            progress.reached("looking for a better choice, round 20", 1, 4);
            content = progress.enough() || progress.cancelled();
            Thread.onSpinWait();
        }
        return HandMadeChoices.plan(board, catalogue, Progress.SILENT);
    }

    @Stop
    void stop() {
        slow.set(false);
        window.release();
    }

    private static void waitFor(Callable<Boolean> condition) {
        try {
            WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, () -> WaitForAsyncUtils.asyncFx(condition).get());
        } catch (TimeoutException late) {
            throw new AssertionError("it did not come to pass within 20 s", late);
        }
        WaitForAsyncUtils.waitForFxEvents();
    }

    private void open(FxRobot robot, String tab) {
        waitFor(() -> window.session().currentBinding().get());
        robot.clickOn((Node) onScreen(() -> robot.lookup("#tabs .tab-label").queryAllAs(Label.class).stream()
                .filter(each -> each.getText().equals(tab)).findFirst().orElseThrow()));
        WaitForAsyncUtils.waitForFxEvents();
    }

    /** Looks while nothing changes. */
    private static <T> T onScreen(Callable<T> look) {
        return WaitForAsyncUtils.waitForAsyncFx(10_000, look);
    }

    private static List<String> labels(FxRobot robot, String within) {
        return onScreen(() -> robot.from(robot.lookup(within).<Node>query()).lookup(".label").queryAllAs(Label.class)
                .stream().map(Label::getText).toList());
    }

    private Board board() {
        return onScreen(() -> window.session().state().board());
    }

    private void picture(FxRobot robot, String name) {
        String where = System.getProperty("shuntwright.pictures", "");
        if (!where.isEmpty()) {
            for (ThemeChoice.Wish wish : List.of(ThemeChoice.Wish.DARK, ThemeChoice.Wish.LIGHT)) {
                robot.interact(() -> window.themes().wishProperty().set(wish));
                robot.interact(() -> WindowPictures.write(stage.getScene(),
                        Path.of(where, name + "-" + wish.name().toLowerCase(Locale.ROOT) + ".png")));
            }
        }
    }

    @Test
    void theOrderIsChangedAndAConflictingLimitIsRelaxedByClicks(FxRobot robot) {
        open(robot, "Choice");
        assertThat(labels(robot, "#choice")).contains("zone port, heat limit: 400 mW → 564.1 mW would do",
                "Breaks the limit of zone port.", "proven best");
        picture(robot, "hand-conflict");
        robot.clickOn(
                (Node) onScreen(() -> robot.lookup(".conflict-button").queryAllAs(Button.class).stream().findFirst()
                        .orElseThrow()));
        waitFor(() -> window.session().currentBinding().get());
        assertThat(board().zones().getFirst().heatLimit()).hasValue(0.5641);
        assertThat(labels(robot, "#choice")).contains("The best choice found").noneMatch(each -> each.contains("port"));
        robot.clickOn("#later-least-heat");
        waitFor(() -> window.session().currentBinding().get());
        assertThat(board().preference().order()).containsExactly(Objective.LEAST_COST, Objective.LEAST_HEAT);
        robot.clickOn("#want-also");
        robot.clickOn("Widest margin");
        waitFor(() -> window.session().currentBinding().get());
        assertThat(labels(robot, "#choice-aims")).contains("1.", "Least cost", "Widest margin", "12.0 %");
        picture(robot, "hand-choice");
        robot.interact(() -> {
            window.session().undo();
            window.session().undo();
        });
        assertThat(board().preference()).isEqualTo(Preference.DEFAULT);
    }

    @Test
    void theBestSoFarIsShownAndKept(FxRobot robot) {
        open(robot, "Choice");
        slow.set(true);
        robot.interact(() -> window.session().plan());
        waitFor(() -> labelsNow(robot).contains("Best so far, still looking for a better choice"));
        picture(robot, "hand-working");
        robot.clickOn("#choice-keep-best");
        waitFor(() -> !window.session().planning().runningProperty().get());
        assertThat(labels(robot, "#choice")).anyMatch(each -> each.startsWith("Not everything can be met"));
    }

    private static List<String> labelsNow(FxRobot robot) {
        return robot.from(robot.lookup("#choice").<Node>query()).lookup(".label").queryAllAs(Label.class).stream()
                .map(Label::getText).toList();
    }

    @Test
    void aPlanOfTheFrontIsTaken(FxRobot robot) throws IOException {
        open(robot, "Front");
        picture(robot, "hand-front-empty");
        robot.clickOn("#compute-front");
        waitFor(() -> !robot.lookup("#front .plot-spot").queryAll().isEmpty());
        robot.clickOn(onScreen(() -> robot.lookup("#front .plot-spot").queryAll().stream().findFirst()
                .orElseThrow()));
        robot.push(KeyCode.RIGHT);
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(labels(robot, "#front-sums")).contains("2.500 W", "+1.372 W");
        picture(robot, "hand-front");
        Path file = folder.resolve("saved.png");
        robot.clickOn("#save-front");
        waitFor(() -> Files.exists(file) && Files.size(file) > 0);
        assertThat(ImageIO.read(file.toFile()).getWidth()).isGreaterThan(800);
        robot.clickOn("#take-plan");
        waitFor(() -> window.session().currentBinding().get());
        assertThat(board().channels().getFirst().pins().shuntCount()).hasValue(10);
    }

    @Test
    void anotherChoiceIsPinned(FxRobot robot) {
        open(robot, "Other choices");
        robot.interact(() -> window.session().selectionProperty().set(List.of(1)));
        robot.clickOn("#find-others");
        waitFor(() -> robot.lookup(".pin-button").queryAllAs(Button.class).stream().filter(Node::isVisible)
                .count() >= 3);
        picture(robot, "hand-others");
        robot.clickOn((Node) onScreen(() -> robot.lookup(".pin-button").queryAllAs(Button.class).stream()
                .filter(each -> each.getAccessibleText().startsWith("Pin choice 2")).findFirst().orElseThrow()));
        waitFor(() -> window.session().currentBinding().get());
        Channel windlass = board().channels().get(1);
        assertThat(windlass.pins().shuntCount()).hasValue(4);
        assertThat(onScreen(() -> window.session().undoNameProperty().get())).startsWith("pin 4 × 4 mΩ");
    }

    @Test
    void aLimitIsVariedOverATypedRange(FxRobot robot) {
        open(robot, "What if");
        TextField from = robot.lookup("#what-if-from").queryAs(TextField.class);
        robot.clickOn(from);
        robot.interact(from::selectAll);
        robot.write("12 W", 0);
        assertThat(robot.lookup("#what-if-problem").queryAs(Label.class).getText()).contains("must go up");
        assertThat(robot.lookup("#compute-what-if").queryAs(Button.class).isDisabled()).isTrue();
        robot.interact(from::selectAll);
        robot.write("2.5W", 0);
        robot.push(KeyCode.ENTER);
        waitFor(() -> !robot.lookup("#what-if-parts .plot-gap").queryAll().isEmpty());
        assertThat(robot.lookup("#compute-what-if-said").queryAs(Label.class).getText())
                .startsWith("9 values, 6 can be met");
        picture(robot, "hand-what-if");
        robot.interact(() -> {
            robot.lookup("#what-if-lever").queryComboBox().getSelectionModel().selectLast();
        });
        robot.clickOn("#compute-what-if");
        waitFor(() -> robot.lookup("#what-if-cost .plot-title").queryAllAs(Label.class).stream()
                .anyMatch(each -> each.getText().equals("Cost of a board, EUR")));
        picture(robot, "hand-what-if-boards");
    }
}
