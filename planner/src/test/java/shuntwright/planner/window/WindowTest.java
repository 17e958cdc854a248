package shuntwright.planner.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;

import javafx.application.ColorScheme;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableView;
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
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.plan.Verdict;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadeChoices;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.session.Questions.Kind;
import shuntwright.planner.window.dialog.Choosers;

/** The real window, worked by clicking and typing. */
@ExtendWith(ApplicationExtension.class)
@SuppressWarnings("NullAway.Init") // set before each test
class WindowTest {
    @TempDir
    static Path folder;

    private OpenWindow window;
    private Stage stage;
    private Path saved;

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
                saved = folder.resolve("saved" + kind.ending());
                return Optional.of(saved);
            }
        };
        window = new OpenWindow(shown,
                new OpenWindow.Engines(HandMadePlans::plan, HandMadeStudies::sample, HandMadeChoices.EXPLORER),
                choosers,
                new SimpleObjectProperty<>(ColorScheme.LIGHT),
                List.of());
        window.show();
        Path file = folder.resolve("boat.board.json");
        BoardFiles.save(HandMadeBoards.boat(), file);
        window.documents().open(file);
    }

    @Stop
    void stop() {
        window.release();
    }

    private void settle() {
        waitFor(() -> window.session().currentBinding().get() && !window.session().planning().runningProperty().get());
        WaitForAsyncUtils.waitForFxEvents();
    }

    private static void waitFor(java.util.concurrent.Callable<Boolean> condition) {
        try {
            WaitForAsyncUtils.waitFor(10, TimeUnit.SECONDS, () -> WaitForAsyncUtils.asyncFx(condition).get());
        } catch (TimeoutException late) {
            throw new AssertionError("it did not come to pass within 10 s", late);
        }
    }

    private static TableCell<?, ?> cell(FxRobot robot, int row, String column) {
        TableView<?> table = robot.lookup("#channel-table").queryAs(TableView.class);
        return robot.from(table)
                .lookup((Node node) -> node instanceof TableCell<?, ?> cell && cell.getTableColumn() != null
                        && column.equals(cell.getTableColumn().getId()) && cell.getIndex() == row && cell.isVisible()
                        && cell.getTableRow().isVisible())
                .queryAs(TableCell.class);
    }

    private static void type(FxRobot robot, int row, String column, String text) {
        robot.clickOn(cell(robot, row, column));
        robot.write(text);
        robot.push(KeyCode.ENTER);
    }

    @Test
    void anEditInACellChangesTheVerdictAndUndoTakesItBack(FxRobot robot) {
        settle();
        assertThat(cell(robot, 0, "column-verdict").getText()).isEqualTo("inside");

        type(robot, 0, "column-must-trip", "25.2");
        settle();

        assertThat(cell(robot, 0, "column-verdict").getText()).isEqualTo("outside");
        assertThat(cell(robot, 0, "column-must-trip").getText()).isEqualTo("25.2 A");
        assertThat(stage.getTitle()).contains("unsaved •");

        robot.push(KeyCode.CONTROL, KeyCode.Z);
        settle();
        assertThat(cell(robot, 0, "column-verdict").getText()).isEqualTo("inside");
        assertThat(stage.getTitle()).contains("saved").doesNotContain("unsaved");
    }

    @Test
    void aWrongEntryStaysAsTypedWithItsReason(FxRobot robot) {
        settle();
        type(robot, 1, "column-load", "twelve");
        settle();

        TableCell<?, ?> load = cell(robot, 1, "column-load");
        assertThat(load.getText()).isEqualTo("twelve");
        assertThat(load.getPseudoClassStates()).anyMatch(state -> state.getPseudoClassName().equals("wrong"));
        assertThat(robot.lookup("#wrong-entries").queryAs(Label.class).getText()).startsWith("1 wrong entry: ");

        type(robot, 0, "column-load", "19");
        settle();
        assertThat(cell(robot, 1, "column-load").getText()).isEqualTo("twelve");

        robot.clickOn(cell(robot, 1, "column-load"));
        robot.push(KeyCode.ESCAPE);
        settle();
        assertThat(cell(robot, 1, "column-load").getText()).isEqualTo("12 A");
    }

    @Test
    void aVerdictIsAsOfThenWhileAnEntryIsWrong(FxRobot robot) {
        settle();
        type(robot, 0, "column-load", "twelve");
        settle();
        assertThat(cell(robot, 0, "column-verdict").getText()).isEqualTo("was inside");
        assertThat(cell(robot, 0, "column-verdict").getAccessibleText()).contains("As of the last good entries");
        assertThat(cell(robot, 1, "column-verdict").getText()).isEqualTo("inside");
    }

    @Test
    void typingIntoTheLastRowAddsAChannel(FxRobot robot) {
        settle();
        type(robot, 5, "column-channel", "horn");
        settle();
        Board board = window.session().state().board();
        assertThat(board.channels()).hasSize(6);
        assertThat(board.channels().getLast().name()).isEqualTo("horn");
        assertThat(cell(robot, 5, "column-verdict").getText()).isEqualTo("incomplete");
    }

    @Test
    void clickingElsewhereTakesTheTypedTextOver(FxRobot robot) {
        settle();
        robot.clickOn(cell(robot, 0, "column-load"));
        robot.write("18");
        robot.clickOn(cell(robot, 2, "column-load"));
        settle();
        assertThat(window.session().state().board().channels().getFirst().currents().load()).hasValue(18);
    }

    @Test
    void savesAndExports(FxRobot robot) {
        settle();
        type(robot, 0, "column-load", "19");
        settle();
        robot.push(KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.S);
        waitFor(() -> !window.session().unsavedProperty().get());
        Board reopened = BoardFiles.open(saved).ifOpened().orElseThrow();
        assertThat(reopened.channels().getFirst().currents().load()).hasValue(19);

        settle();
        robot.push(KeyCode.CONTROL, KeyCode.E);
        waitFor(() -> Files.exists(folder.resolve("saved.xlsx")));
        assertThat(folder.resolve("saved.xlsx")).isNotEmptyFile();
    }

    @Test
    void aCureIsAppliedByItsButton(FxRobot robot) {
        settle();
        robot.clickOn(cell(robot, 3, "column-channel"));
        WaitForAsyncUtils.waitForFxEvents();
        robot.clickOn("Apply");
        settle();
        assertThat(window.session().plannedProperty().get().orElseThrow().plan().channels().get(3).verdict())
                .isEqualTo(Verdict.INSIDE);
        assertThat(window.session().undoNameProperty().get()).contains("anchor light");
    }

    @Test
    void sharedValuesAreEditedBehindTheirTile(FxRobot robot) {
        settle();
        robot.clickOn(robot.lookup(".shared-tile").queryAll().stream().findFirst().orElseThrow());
        WaitForAsyncUtils.waitForFxEvents();
        TextField current = robot.lookup("#board-supply-current").queryAs(TextField.class);
        robot.interact(() -> {
            current.requestFocus();
            current.setText("60m");
        });
        robot.push(KeyCode.ENTER);
        settle();
        assertThat(window.session().state().board().supply().availableCurrent()).isEqualTo(0.06);
        robot.interact(window::closePopUps);
    }
}
