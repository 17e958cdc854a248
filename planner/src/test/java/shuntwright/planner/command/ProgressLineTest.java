package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Map;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;

class ProgressLineTest {
    /** What a shell sees of a process that was told to end: 128 + 15. */
    private static final int TOLD_TO_END = 143;
    private static final long LONGER_THAN_SILENCE = 150;

    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private String shown(boolean watched) throws InterruptedException {
        PrintStream stream = new PrintStream(err, true, StandardCharsets.UTF_8);
        Terminal terminal = new Terminal(stream, stream, StandardCharsets.UTF_8, false, watched);
        try (ProgressLine line = ProgressLine.on(terminal, true)) {
            line.reached("choosing parts", 0, 8);
            Thread.sleep(LONGER_THAN_SILENCE);
            line.reached("sampling, thousands of trials", 100, 8000);
            Thread.sleep(LONGER_THAN_SILENCE);
            line.reached("choosing", 1, 8);
        }
        return err.toString(StandardCharsets.UTF_8);
    }

    @Test
    void a_line_overwrites_itself_and_is_wiped() throws InterruptedException {
        String wide = "sampling, thousands of trials 100 of 8000";
        String narrow = "choosing 1 of 8";

        assertThat(shown(true))
                .isEqualTo("\r" + wide + "\r" + narrow + " ".repeat(wide.length() - narrow.length()) + "\r"
                        + " ".repeat(narrow.length()) + "\r");
    }

    @Test
    void the_best_so_far_stands_with_its_own_stage_only() throws InterruptedException {
        PrintStream stream = new PrintStream(err, true, StandardCharsets.UTF_8);
        try (ProgressLine line = ProgressLine.on(new Terminal(stream, stream, StandardCharsets.UTF_8, false, true),
                true)) {
            line.reached("choosing", 0, 300);
            line.better(ChoiceFixture.plan().choice().orElseThrow());
            Thread.sleep(LONGER_THAN_SILENCE);
            line.reached("choosing", 12, 300);
            Thread.sleep(LONGER_THAN_SILENCE);
            line.reached("sampling", 1, 8);
        }

        assertThat(err.toString(StandardCharsets.UTF_8))
                .startsWith("\rchoosing 12 of 300; best so far 1.8 W (proven), 1,250.00 (2 %)\rsampling 1 of 8 ");
    }

    @Test
    void nothing_is_shown_where_nobody_watches() throws InterruptedException {
        assertThat(shown(false)).isEmpty();
    }

    /** The process of the next test: sampling, until it is told to end; then it tries to go on. */
    static final class Working {
        private Working() {
        }

        public static void main(String[] args) throws InterruptedException {
            CountDownLatch ending = new CountDownLatch(1);
            Runtime.getRuntime().addShutdownHook(new Thread(() -> {
                ending.countDown();
                // Time for the working thread to do wrong.
                try {
                    Thread.sleep(500);
                } catch (InterruptedException _) {
                    Thread.currentThread().interrupt();
                }
            }));
            Terminal terminal = Terminal.system(Map.of());
            try (ProgressLine line = ProgressLine.on(terminal, true)) {
                terminal.print("sampling");
                ending.await();
                line.reached("sampling", 1, 2);
            }
            terminal.print("writing");
        }
    }

    @Test
    @EnabledOnOs({OS.LINUX, OS.MAC})
    void a_process_that_is_told_to_end_says_so_and_writes_nothing() throws IOException, InterruptedException {
        Process process = new ProcessBuilder(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-cp",
                System.getProperty("java.class.path"), Working.class.getName()).start();
        try (BufferedReader out = process.inputReader(); BufferedReader said = process.errorReader()) {
            assertThat(out.readLine()).isEqualTo("sampling");

            // Process.destroy would close what is still to be read.
            process.toHandle().destroy();

            assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
            assertThat(process.exitValue()).isEqualTo(TOLD_TO_END);
            assertThat(said.lines()).containsExactly("Stopped; nothing was written.");
            assertThat(out.lines()).isEmpty();
        } finally {
            process.destroyForcibly();
        }
    }
}
