package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatNoException;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class TargetsTest {
    @TempDir
    private Path folder = Path.of("");
    private Path board = Path.of("");

    @BeforeEach
    void makeBoard() throws IOException {
        board = Files.writeString(folder.resolve("boat.board.json"), "{}");
    }

    private void refused(List<Path> targets, String... words) {
        assertThatExceptionOfType(BadInput.class).isThrownBy(() -> Targets.check(List.of(board), targets))
                .satisfies(bad -> assertThat(bad.problems()).hasSize(1).first().asString().contains(words));
    }

    @Test
    void other_files_may_be_written_and_replaced() throws IOException {
        Path old = Files.writeString(folder.resolve("old.xlsx"), "");

        assertThatNoException()
                .isThrownBy(() -> Targets.check(List.of(board), List.of(old, folder.resolve("new.json"))));
    }

    @Test
    void the_board_is_not_replaced_however_it_is_named() throws IOException {
        refused(List.of(board), "boat.board.json", "another name");
        refused(List.of(folder.resolve("x").resolve("..").resolve("boat.board.json").normalize()), "another name");
        refused(List.of(Files.createSymbolicLink(folder.resolve("link.json"), board)), "link.json", "another name");
    }

    @Test
    void two_outputs_do_not_share_a_file() {
        Path same = folder.resolve("out.json");
        refused(List.of(same, same), "two outputs");
    }

    @Test
    void a_missing_folder_is_said_before_the_work() {
        refused(List.of(folder.resolve("none").resolve("out.xlsx")), "there is no folder", "none");
    }
}
