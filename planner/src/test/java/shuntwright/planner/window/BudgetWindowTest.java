package shuntwright.planner.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
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
import javafx.scene.control.RadioButton;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;

import org.controlsfx.control.StatusBar;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import org.testfx.util.WaitForAsyncUtils;

import shuntwright.board.Board;
import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Sampling;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler.Depth;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadeChoices;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.session.Questions.Kind;
import shuntwright.planner.window.dialog.Choosers;
import shuntwright.planner.work.PlanSampling;

/** The error budget and the sampling behind it, worked by clicking. */
@ExtendWith(ApplicationExtension.class)
@SuppressWarnings("NullAway.Init") // set before each test
class BudgetWindowTest {
    @TempDir
    static Path folder;

    private final AtomicBoolean slow = new AtomicBoolean();
    private OpenWindow window;

    @Start
    void start(Stage shown) {
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
                new OpenWindow.Engines(HandMadePlans::plan, this::sample, HandMadeChoices.EXPLORER), choosers,
                new SimpleObjectProperty<>(ColorScheme.LIGHT), List.of());
        window.show();
        shown.setWidth(1500);
        shown.setHeight(900);
        Path file = folder.resolve("boat.board.json");
        BoardFiles.save(calibrated(), file);
        window.documents().open(file);
    }

    /** The last picture takes for ever while this is slow. */
    private Plan sample(Plan plan, Sampling sampling, Depth depth, Progress progress) {
        while (slow.get() && depth == Depth.FULL) {
            progress.reached("trials", 3, 4);
            if (progress.cancelled()) {
                throw new BoardPlanner.Cancelled();
            }
            Thread.onSpinWait();
        }
        return HandMadeStudies.sample(plan, sampling, depth, progress);
    }

    private static Board calibrated() {
        Board boat = HandMadeBoards.boat();
        List<Channel> channels = boat.channels().stream().map(each -> each.name().equals("windlass")
                ? each.withReading(new Channel.ReadingDemand(OptionalDouble.empty(), OptionalDouble.of(0.05),
                        Optional.of(new Calibration(Calibration.Points.ONE, OptionalDouble.empty(),
                                OptionalDouble.empty(), 0.001, Calibration.DEFAULT_TEMPERATURE))))
                : each).toList();
        return boat.withChannels(channels);
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

    private PlanSampling.State state() {
        return window.session().sampling().stateProperty().get();
    }

    private void settle() {
        waitFor(() -> window.session().currentBinding().get() && state() == PlanSampling.State.DONE);
    }

    private void select(FxRobot robot, int row, String tab) {
        robot.interact(() -> window.session().selectionProperty().set(List.of(row)));
        robot.clickOn(tab);
        WaitForAsyncUtils.waitForFxEvents();
    }

    private static List<String> facts(FxRobot robot) {
        return onScreen(() -> robot.from(robot.lookup("#budget-facts").<Node>query()).lookup(".tile-value")
                .queryAllAs(Label.class).stream().map(Label::getText).toList());
    }

    private static <T> void sortBy(TableView<T> table, String column) {
        table.getSortOrder().setAll(table.getColumns().stream().filter(each -> column.equals(each.getId())).toList());
    }

    /** Looks while nothing changes. */
    private static <T> T onScreen(Callable<T> look) {
        return WaitForAsyncUtils.waitForAsyncFx(10_000, look);
    }

    private static String input(FxRobot robot, int row) {
        return onScreen(() -> {
            TableView<?> table = robot.lookup("#budget").queryAs(TableView.class);
            return robot.from(table).lookup((Node node) -> node instanceof TableCell<?, ?> cell
                    && cell.getTableColumn() != null && "budget-input".equals(cell.getTableColumn().getId())
                    && cell.getIndex() == row && cell.getTableRow().isVisible()).queryAs(TableCell.class).getText();
        });
    }

    @Test
    void theThreeReadersStandSideBySideAndSort(FxRobot robot) {
        settle();
        select(robot, 0, "Error budget");
        assertThat(facts(robot)).contains("below 3.7e-6 (95 %)", "1,000,000");
        assertThat(input(robot, 0)).isEqualTo("sense supply");
        // clicks on headers do not reach them on a headless screen
        robot.interact(() -> sortBy(robot.lookup("#budget").queryTableView(), "budget-total-effect"));
        assertThat(input(robot, 0)).as("smallest total effect first").isEqualTo("thermal EMF of the shunt");
        robot.interact(() -> window.session().sampleAgain());
        settle();
        assertThat(input(robot, 0)).as("the order stays when new trials come").isEqualTo("thermal EMF of the shunt");
        assertThat(robot.lookup("#histogram").query().getAccessibleText())
                .contains("Distribution of bilge pump, trip current").contains("symmetric");
    }

    @Test
    void aCalibratedReadingCanBeSeenBeforeCalibration(FxRobot robot) {
        settle();
        select(robot, 1, "Error budget");
        RadioButton before = robot.lookup("#before-calibration").queryAs(RadioButton.class);
        assertThat(before.isVisible() && before.getParent().isVisible()).isFalse();
        robot.clickOn("#budget-outcome");
        robot.clickOn("reading at load current");
        WaitForAsyncUtils.waitForFxEvents();
        List<String> after = facts(robot);
        robot.clickOn(before);
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(after).contains("11.64 .. 12.36 A");
        assertThat(facts(robot)).contains("11.28 .. 12.72 A");
    }

    @Test
    void samplingIsStoppedAndGoneOnWithFromTheStatusBar(FxRobot robot) {
        settle();
        slow.set(true);
        robot.interact(() -> window.session().sampleAgain());
        StatusBar bar = robot.lookup("#status").queryAs(StatusBar.class);
        waitFor(() -> bar.getText().contains("sampling 1,000,000 trials of 4 channels, 75 %"));
        assertThat(bar.getProgress()).isEqualTo(0.75);
        robot.clickOn("#stop-sampling");
        waitFor(() -> state() == PlanSampling.State.STOPPED);
        assertThat(bar.getText()).contains("accepted").contains("sampling stopped at");
        assertThat(robot.lookup("#stop-sampling").queryAs(Button.class).isVisible()).isFalse();
        slow.set(false);
        robot.clickOn("#sample-again");
        settle();
        assertThat(bar.getText()).doesNotContain("sampling");
    }

    @Test
    void theYieldOpensWithItsCostsAndTheTrialsCanBeTyped(FxRobot robot) {
        settle();
        robot.clickOn((Node) onScreen(() -> robot.lookup(".shared-tile").queryAllAs(Button.class).stream()
                .filter(each -> each.getAccessibleText().startsWith("Board yield")).findFirst().orElseThrow()));
        WaitForAsyncUtils.waitForFxEvents();
        List<String> lines = onScreen(() -> robot.from(robot.lookup(".board-editor").<Node>query()).lookup(".label")
                .queryAllAs(Label.class).stream().map(Label::getText).toList());
        assertThat(lines).anyMatch(line -> line.startsWith("ambient at its nominal value"))
                .anyMatch(line -> line.contains("would have claimed"));
        TextField trials = robot.lookup("#board-trials").queryAs(TextField.class);
        robot.interact(() -> {
            trials.requestFocus();
            trials.setText("20000");
        });
        robot.push(KeyCode.ENTER);
        waitFor(() -> window.session().plannedProperty().get().flatMap(each -> each.plan().study())
                .filter(study -> study.sampling().trials().equals(new Sampling.Trials.Fixed(20_000))).isPresent());
        robot.interact(window::closePopUps);
    }

    @Test
    void anEditWhileTrialsAreDrawnIsAnsweredAtOnce(FxRobot robot) {
        settle();
        slow.set(true);
        robot.interact(() -> window.session().undo());
        robot.interact(() -> window.session().addChannel("horn"));
        waitFor(() -> window.session().currentBinding().get());
        robot.interact(() -> window.session().addChannel("whistle"));
        waitFor(() -> window.session().currentBinding().get());
        assertThat(window.session().plannedProperty().get().orElseThrow().plan().channels()).hasSize(7);
        assertThat(state()).isEqualTo(PlanSampling.State.RUNNING);
    }

    @Test
    void thePictureIsSavedAndShowsTheTrials(FxRobot robot) throws IOException {
        settle();
        select(robot, 0, "Error budget");
        Path file = folder.resolve("saved.png");
        robot.clickOn("#save-picture");
        waitFor(() -> Files.exists(file) && Files.size(file) > 0);
        BufferedImage picture = ImageIO.read(file.toFile());
        assertThat(picture.getWidth()).isGreaterThan(600);
        java.util.Set<Integer> colours = new java.util.HashSet<>();
        for (int x = 0; x < picture.getWidth(); x += 2) {
            for (int y = 0; y < picture.getHeight(); y += 2) {
                colours.add(picture.getRGB(x, y));
            }
        }
        assertThat(colours).as("bars, window, lines and text").hasSizeGreaterThan(10);
    }
}
