package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.io.planfile.Cautions;

/** Help, version, and what is said to wrong options. */
class OptionsTest {

    @ParameterizedTest
    @ValueSource(strings = {"", "plan", "check", "front", "others", "what-if", "window"})
    void every_command_explains_itself_with_examples(String command) {
        Run run = Run.of(Stream.of(command, "--help").filter(each -> !each.isEmpty()).toArray());

        assertThat(run.code()).isZero();
        assertThat(run.err()).isEmpty();
        assertThat(run.out()).startsWith(("Usage: shuntwright " + command).strip());
        assertThat(run.out().lines().dropWhile(line -> !line.equals("Examples:")).skip(1)).isNotEmpty()
                .allSatisfy(line -> assertThat(line).startsWith("  java -jar planner/target/shuntwright.jar "))
                .anySatisfy(line -> assertThat(line).contains("shuntwright.jar " + command));
        assertThat(run.out()).contains(Cautions.LINE);
    }

    @ParameterizedTest
    @ValueSource(strings = {"plan", "check", "front", "others", "what-if"})
    void the_help_says_what_exit_codes_mean(String command) {
        assertThat(Run.of(command, "--help").out()).containsSubsequence("Exit codes:", "0   ", "1   ", "2   ", "3   ");
    }

    @Test
    void the_version_is_the_builds() {
        Run run = Run.of("--version");

        assertThat(run.code()).isZero();
        assertThat(run.out()).matches("Shuntwright \\d+\\.\\d+\\.\\d+\\S*, Java 25.*\\R");
    }

    @Test
    void an_unknown_option_is_refused_with_the_nearest_one() {
        Run run = Run.of("plan", Run.WREN, "--workbok", "a.xlsx");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains("--workbok", "Maybe --workbook?", "shuntwright plan --help");
    }

    @Test
    void an_unknown_command_is_refused_with_the_nearest_one() {
        Run run = Run.of("chekc", Run.WREN);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("chekc", "Maybe check?");
    }

    @Test
    void a_word_like_no_other_gets_no_suggestion() {
        assertThat(Run.of("plan", Run.WREN, "--quite-something-else").err()).doesNotContain("Maybe");
    }

    @Test
    void a_missing_board_is_said_to_be_missing() {
        Run run = Run.of("plan");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("BOARD");
    }

    @Test
    void a_board_taken_for_a_parts_file_is_explained() {
        Run run = Run.of("plan", "--parts", "some.parts.json", Run.WREN);

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("BOARD", "before --parts");
    }

    @Test
    void an_option_without_its_file_is_refused() {
        Run run = Run.of("plan", Run.WREN, "--workbook");

        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("--workbook");
    }
}
