package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Files that cannot be opened or written. */
class BadFilesTest {
    @TempDir
    private Path folder = Path.of("");

    @ParameterizedTest
    @ValueSource(strings = {"plan", "check"})
    void a_missing_board_is_named(String command) {
        Run run = Run.of(command, folder.resolve("none.board.json"));

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.errors()).singleElement().asString().contains("none.board.json", "there is no file");
    }

    @Test
    void every_problem_of_a_board_is_listed_with_its_place() throws IOException {
        Path board = Files.writeString(folder.resolve("boat.board.json"), """
                {
                  "format": "shuntwright board 1",
                  "name": "Boat",
                  "buildQuantity": "many",
                  "channels": [
                    {"name": "Pump", "laod": "8 A", "noTrip": "11 W"}
                  ]
                }
                """);

        Run run = Run.of("plan", board);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.errors()).allSatisfy(line -> assertThat(line).startsWith("boat.board.json:"))
                .anySatisfy(line -> assertThat(line).contains(":4:", "buildQuantity", "many"))
                .anySatisfy(line -> assertThat(line).contains(":6:", "laod", "load"))
                .anySatisfy(line -> assertThat(line).contains(":6:", "noTrip", "11 W"));
    }

    @Test
    void a_missing_parts_file_is_named() {
        Run run = Run.of("plan", Run.WREN, "--parts", folder.resolve("none.parts.json"));

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("none.parts.json", "there is no file");
    }

    @ParameterizedTest
    @ValueSource(strings = {"--workbook", "--plan", "--pinned"})
    void the_board_is_never_replaced(String option) throws IOException {
        byte[] before = Files.readAllBytes(Run.WREN);

        Run run = Run.of("plan", Run.WREN, option, Run.WREN);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("sledge-wren.board.json", "would be replaced", "another name");
        assertThat(run.out()).isEmpty();
        assertThat(Files.readAllBytes(Run.WREN)).isEqualTo(before);
    }

    @Test
    void nor_are_its_parts_files() {
        Run run = Run.of("plan", Run.WREN, "--plan", Run.WREN.resolveSibling("shunts.parts.json"));

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("shunts.parts.json", "would be replaced");
    }

    @Test
    void a_missing_folder_for_an_output_is_said() {
        Run run = Run.of("plan", Run.WREN, "--workbook", folder.resolve("none").resolve("a.xlsx"));

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("there is no folder", "none");
    }

    @Test
    void a_folder_in_place_of_an_output_is_said() {
        Run run = Run.of("plan", Run.WREN, "--plan", folder);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("a folder has this name");
    }

    @Test
    void a_text_that_cannot_be_a_file_name_is_refused_in_words() {
        Run run = Run.of("plan", "boat\0.board.json");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("cannot be a file name").doesNotContain("Exception");
    }
}
