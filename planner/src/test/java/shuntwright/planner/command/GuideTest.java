package shuntwright.planner.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A board typed from the guide alone is planned with the demo parts. */
class GuideTest {

    private static final Path ROOT = Path.of(System.getProperty("shuntwright.root", "."));
    private static final Pattern FIRST_EXAMPLE = Pattern.compile("```json\n(.*?)```", Pattern.DOTALL);

    @TempDir
    Path folder;

    @Test
    void theFirstExampleOfTheBoardGuideIsPlannedAndAccepted() throws IOException {
        Matcher example = FIRST_EXAMPLE.matcher(Files.readString(ROOT.resolve("docs/board-file.md")));
        assertThat(example.find()).isTrue();
        Path board = Files.writeString(folder.resolve("first.board.json"), example.group(1));
        Path parts = ROOT.resolve("demo-boards");

        Run run = Run.of("plan", board.toString(), "--parts", parts.resolve("shunts.parts.json").toString(),
                parts.resolve("semiconductors.parts.json").toString(), parts.resolve("passives.parts.json").toString());

        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isZero();
        assertThat(run.out()).contains("1 of 1 channels accepted").contains("Fan");
    }
}
