package shuntwright.planner.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;

import javafx.application.ColorScheme;
import javafx.beans.property.SimpleObjectProperty;
import javafx.event.Event;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.stage.Stage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.framework.junit5.Stop;
import org.testfx.util.WaitForAsyncUtils;

import shuntwright.board.Channel;
import shuntwright.planner.HandMadeChoices;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.session.Questions.Kind;
import shuntwright.planner.window.dialog.Choosers;

/** A board typed from nothing, by keys alone. */
@ExtendWith(ApplicationExtension.class)
@SuppressWarnings("NullAway.Init") // set before each test
class NewBoardWindowTest {
    private OpenWindow window;
    private Stage stage;

    @Start
    void start(Stage shown) {
        stage = shown;
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
                new OpenWindow.Engines(HandMadePlans::plan, HandMadeStudies::sample, HandMadeChoices.EXPLORER), none,
                new SimpleObjectProperty<>(ColorScheme.LIGHT),
                List.of());
        window.show();
    }

    @Stop
    void stop() {
        window.release();
    }

    private static void typed(FxRobot robot, String... texts) {
        for (String text : texts) {
            robot.write(text);
            robot.push(KeyCode.TAB);
        }
    }

    private void key(KeyEvent event) {
        Event.fireEvent(stage.getScene().getFocusOwner(), event);
    }

    /** Types faster than the window draws: all within one frame. */
    private void rushed(String... texts) {
        for (String text : texts) {
            text.chars().forEach(letter -> key(new KeyEvent(KeyEvent.KEY_TYPED, Character.toString(letter), "",
                    KeyCode.UNDEFINED, false, false, false, false)));
            key(new KeyEvent(KeyEvent.KEY_PRESSED, "", "", KeyCode.TAB, false, false, false, false));
        }
    }

    @Test
    void whoTypesFastLosesNothing(FxRobot robot) throws Exception {
        robot.push(KeyCode.CONTROL, KeyCode.N);
        settle();
        robot.interact(() -> rushed("pump", "", "", "24", "6", "8A", "10"));
        settle();
        assertThat(window.session().state().board().channels()).singleElement().satisfies(pump -> {
            assertThat(pump.name()).isEqualTo("pump");
            assertThat(pump.rail().orElseThrow().nominal()).isEqualTo(24);
            assertThat(pump.currents().mustTrip()).hasValue(10);
        });
    }

    private void settle() throws Exception {
        WaitForAsyncUtils.waitFor(10, TimeUnit.SECONDS,
                () -> WaitForAsyncUtils.asyncFx(() -> window.session().openProperty().get()
                        && window.session().currentBinding().get()).get());
        WaitForAsyncUtils.waitForFxEvents();
    }

    @Test
    void theCellsOfAnAddedChannelFollowItsName(FxRobot robot) throws Exception {
        robot.push(KeyCode.CONTROL, KeyCode.N);
        settle();
        typed(robot, "pump", "", "", "24", "6", "8A", "10");
        settle();
        assertThat(window.session().state().board().channels()).singleElement().satisfies(pump -> {
            assertThat(pump.name()).isEqualTo("pump");
            assertThat(pump.rail().orElseThrow().nominal()).isEqualTo(24);
            assertThat(pump.currents().load()).hasValue(6);
            assertThat(pump.currents().noTrip()).hasValue(8);
            assertThat(pump.currents().mustTrip()).hasValue(10);
        });
    }

    @Test
    void namesAreTypedOneBelowTheOther(FxRobot robot) throws Exception {
        robot.push(KeyCode.CONTROL, KeyCode.N);
        settle();
        for (String name : List.of("pump", "fan", "lamp")) {
            robot.write(name);
            robot.push(KeyCode.ENTER);
        }
        settle();
        assertThat(window.session().state().board().channels()).extracting(Channel::name)
                .containsExactly("pump", "fan", "lamp");
    }
}
