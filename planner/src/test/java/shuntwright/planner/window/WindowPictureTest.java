package shuntwright.planner.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.TimeUnit;

import javafx.application.ColorScheme;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.control.TabPane;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;

import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import org.testfx.util.WaitForAsyncUtils;

import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler;
import shuntwright.planner.session.Questions.Kind;
import shuntwright.planner.window.dialog.Choosers;
import shuntwright.planner.work.Explorer;
import shuntwright.planner.work.PlanSampling;

/**
 * The window with a demo board and its real plan. With -Dshuntwright.pictures=FOLDER the pictures of the documentation
 * are written there.
 */
@ExtendWith(ApplicationExtension.class)
@SuppressWarnings("NullAway.Init") // set before each test
class WindowPictureTest {
    private OpenWindow window;
    private Stage stage;

    @Start
    void start(Stage shown) {
        stage = shown;
        Path root = Path.of(System.getProperty("shuntwright.root", "."));
        Choosers none = new Choosers() {
            @Override
            public Optional<Path> open(Kind kind) {
                return Optional.empty();
            }

            @Override
            public Optional<Path> save(Kind kind, Path suggestion) {
                return Optional.empty();
            }
        };
        window = new OpenWindow(shown,
                new OpenWindow.Engines(new BoardPlanner()::plan, new BoardSampler(2)::sample,
                        Explorer.of(new BoardPlanner())),
                none,
                new SimpleObjectProperty<>(ColorScheme.LIGHT),
                List.of(root));
        window.show();
        stage.setWidth(1500);
        stage.setHeight(900);
    }

    @Stop
    void stop() {
        window.release();
    }

    private void settle() throws Exception {
        WaitForAsyncUtils.waitFor(120, TimeUnit.SECONDS,
                () -> WaitForAsyncUtils.asyncFx(() -> window.session().currentBinding().get()
                        && window.session().sampling().stateProperty().get() == PlanSampling.State.DONE).get());
        WaitForAsyncUtils.waitForFxEvents();
    }

    private static Set<Integer> colours(WritableImage image) {
        Set<Integer> colours = new HashSet<>();
        for (int y = 0; y < image.getHeight(); y += 3) {
            for (int x = 0; x < image.getWidth(); x += 3) {
                colours.add(image.getPixelReader().getArgb(x, y));
            }
        }
        return colours;
    }

    @ParameterizedTest
    @EnumSource(value = ThemeChoice.Wish.class, names = {"LIGHT", "DARK"})
    void theDemoBoardIsDrawn(ThemeChoice.Wish wish, FxRobot robot) throws Exception {
        Path root = Path.of(System.getProperty("shuntwright.root", "."));
        robot.interact(() -> {
            window.themes().wishProperty().set(wish);
            window.documents().openCopy(root.resolve("demo-boards/sledge-wren.board.json"));
        });
        settle();
        robot.interact(() -> window.session().selectionProperty().set(List.of(7)));
        WaitForAsyncUtils.waitForFxEvents();
        write(robot, wish, "window");
        show(robot, wish, "Error budget", "budget");
        show(robot, wish, "Choice", "choice");
        show(robot, wish, "Parts list", "parts");
        if (pictures()) {
            ask(robot, "Other choices", "#find-others");
            show(robot, wish, "Other choices", "other-choices");
            ask(robot, "Front", "#compute-front");
            robot.interact(() -> robot.lookup("#front").query().requestFocus());
            robot.push(KeyCode.RIGHT);
            robot.push(KeyCode.RIGHT);
            show(robot, wish, "Front", "front");
            ask(robot, "What if", "#compute-what-if");
            show(robot, wish, "What if", "what-if");
        }
        WritableImage[] image = new WritableImage[1];
        robot.interact(() -> image[0] = stage.getScene().snapshot(null));
        assertThat(colours(image[0])).as("a drawn window has text, lines and verdicts in many colours")
                .hasSizeGreaterThan(50);
        int corner = image[0].getPixelReader().getArgb(4, (int) image[0].getHeight() - 4) & 0xff;
        assertThat(corner).as("brightness of the window's corner").satisfies(
                wish == ThemeChoice.Wish.DARK
                        ? (Integer dark) -> assertThat(dark).isLessThan(80)
                        : (Integer light) -> assertThat(light).isGreaterThan(200));
    }

    private void select(FxRobot robot, String title) {
        robot.interact(() -> {
            TabPane tabs = robot.lookup("#tabs").queryAs(TabPane.class);
            tabs.getSelectionModel().select(tabs.getTabs().stream().filter(each -> each.getText().equals(title))
                    .findFirst().orElseThrow());
        });
        WaitForAsyncUtils.waitForFxEvents();
    }

    private void show(FxRobot robot, ThemeChoice.Wish wish, String title, String name) {
        select(robot, title);
        write(robot, wish, name);
    }

    /** Asks and waits for the answer; that takes a while, so only for pictures that are kept. */
    private void ask(FxRobot robot, String title, String button) throws Exception {
        select(robot, title);
        robot.interact(() -> robot.lookup(button).queryButton().fire());
        WaitForAsyncUtils.waitFor(600, TimeUnit.SECONDS,
                () -> WaitForAsyncUtils.asyncFx(() -> !robot.lookup(button).queryButton().isDisabled()).get());
        WaitForAsyncUtils.waitForFxEvents();
    }

    private static boolean pictures() {
        return !System.getProperty("shuntwright.pictures", "").isEmpty();
    }

    private void write(FxRobot robot, ThemeChoice.Wish wish, String name) {
        String folder = System.getProperty("shuntwright.pictures", "");
        if (!folder.isEmpty()) {
            robot.interact(() -> WindowPictures.write(stage.getScene(),
                    Path.of(folder, name + "-" + wish.name().toLowerCase(Locale.ROOT) + ".png")));
        }
    }
}
