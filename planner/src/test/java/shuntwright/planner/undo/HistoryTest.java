package shuntwright.planner.undo;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class HistoryTest {
    private final History<String> history = new History<>("a");

    @Test
    void goesBackAndForthByName() {
        history.step("to b", "b");
        history.step("to c", "c");
        assertThat(history.undoName()).contains("to c");
        history.undo();
        assertThat(history.now()).isEqualTo("b");
        assertThat(history.redoName()).contains("to c");
        history.undo();
        assertThat(history.now()).isEqualTo("a");
        assertThat(history.undoName()).isEmpty();
        history.redo();
        history.redo();
        assertThat(history.now()).isEqualTo("c");
        assertThat(history.redoName()).isEmpty();
    }

    @Test
    void aNewStepForgetsWhatWasUndone() {
        history.step("to b", "b");
        history.undo();
        history.step("to d", "d");
        assertThat(history.redoName()).isEmpty();
        history.undo();
        assertThat(history.now()).isEqualTo("a");
    }

    @Test
    void aStepThatChangesNothingIsNotRecorded() {
        history.step("nothing", "a");
        assertThat(history.undoName()).isEmpty();
    }

    @Test
    void undoingAtTheStartDoesNothing() {
        history.undo();
        history.redo();
        assertThat(history.now()).isEqualTo("a");
    }

    @Test
    void remembersAThousandSteps() {
        for (int step = 1; step <= 1500; step++) {
            history.step("step " + step, "s" + step);
        }
        int undone = 0;
        while (history.undoName().isPresent()) {
            history.undo();
            undone++;
        }
        assertThat(undone).isEqualTo(1000);
        assertThat(history.now()).isEqualTo("s500");
    }
}
