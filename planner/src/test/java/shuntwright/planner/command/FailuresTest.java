package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

import org.junit.jupiter.api.Test;

class FailuresTest {
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();
    private final Terminal terminal = Terminal.piped(new PrintStream(new ByteArrayOutputStream(), true),
            new PrintStream(err, true, StandardCharsets.UTF_8));

    private String said() {
        return err.toString(StandardCharsets.UTF_8);
    }

    @Test
    void every_problem_of_bad_input_is_listed() {
        int code = Failures.of(terminal, new BadInput(List.of("a:1:2 x: wrong", "a:3:4 y: wrong too")), false);

        assertThat(code).isEqualTo(2);
        assertThat(said().lines()).containsExactly("a:1:2 x: wrong", "a:3:4 y: wrong too");
    }

    @Test
    void our_own_fault_asks_for_a_report_and_hides_the_trace() {
        int code = Failures.of(terminal, new IllegalStateException("no such corner"), false);

        assertThat(code).isEqualTo(3);
        assertThat(said()).contains("no such corner", "report", "--trace").doesNotContain("\tat ");
    }

    @Test
    void the_trace_is_shown_where_it_is_asked_for() {
        int code = Failures.of(terminal, new IllegalStateException("no such corner"), true);

        assertThat(code).isEqualTo(3);
        assertThat(said()).contains("\tat " + FailuresTest.class.getName());
    }

    @Test
    void a_failure_without_words_is_named_by_its_kind() {
        Failures.of(terminal, new StackOverflowError(), false);

        assertThat(said()).contains("StackOverflowError").doesNotContain("null");
    }
}
