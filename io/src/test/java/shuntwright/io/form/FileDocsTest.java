package shuntwright.io.form;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import shuntwright.io.boardfile.BoardFiles;
import shuntwright.io.partsfile.PartsFiles;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Shunt;

/**
 * The guides to the two files say what the program does. Run with {@code -Dextra.test.jvm=-Dshuntwright.docs=write} to
 * bring their tables up to date.
 */
class FileDocsTest {
    private static final Path DOCS = Path.of(System.getProperty("shuntwright.root", ".."), "docs");
    private static final Pattern EXAMPLE = Pattern.compile("```json\n(.*?)```", Pattern.DOTALL);

    private static final Pattern INPUTS = Pattern.compile("<!-- inputs -->\n.*?<!-- end -->", Pattern.DOTALL);
    private static final boolean WRITE = "write".equals(System.getProperty("shuntwright.docs"));
    private static final String STALE = "the tables in %s are out of date; run this test once with "
            + "-Dextra.test.jvm=-Dshuntwright.docs=write";

    @TempDir
    Path folder;

    @Test
    void theBoardFileGuideHasTheTablesOfTheForms() throws IOException {
        checkTables(DOCS.resolve("board-file.md"), BoardFiles.forms());
    }

    @Test
    void thePartsFileGuideHasTheTablesOfTheForms() throws IOException {
        checkTables(DOCS.resolve("parts-file.md"), PartsFiles.forms());
    }

    private static void checkTables(Path guide, List<Form<?>> forms) throws IOException {
        String text = Files.readString(guide);
        String wanted = text;
        for (Form<?> form : forms) {
            Pattern place = Pattern.compile("(## " + form.title() + "\n\n<!-- table " + form.title()
                    + " -->\n).*?(<!-- end -->)", Pattern.DOTALL);
            Matcher found = place.matcher(wanted);
            assertThat(found.find()).as("%s has a place for the table of %s", guide, form.title()).isTrue();
            wanted = found.replaceFirst(Matcher.quoteReplacement(found.group(1) + FormTable.markdown(form))
                    + "$2");
        }
        if (WRITE) {
            Files.writeString(guide, wanted);
        }
        assertThat(text).as(STALE, guide).isEqualTo(wanted);
        assertThat(Pattern.compile("<!-- table ").matcher(text).results().count()).isEqualTo(forms.size());
    }

    @Test
    void theBoardFileGuideListsTheInputs() throws IOException {
        Path guide = DOCS.resolve("board-file.md");
        String text = Files.readString(guide);
        Matcher place = INPUTS.matcher(text);
        assertThat(place.find()).isTrue();
        String wanted = place.replaceFirst(Matcher.quoteReplacement("<!-- inputs -->\n" + BoardFiles.inputTable()
                + "<!-- end -->"));
        if (WRITE) {
            Files.writeString(guide, wanted);
        }
        assertThat(text).as(STALE, guide).isEqualTo(wanted);
    }

    @Test
    void everyExampleOfABoardFileOpens() throws IOException {
        List<String> examples = examples("board-file.md");

        assertThat(examples).hasSize(2);
        for (String example : examples) {
            assertThat(BoardFiles.parse("example", example).problems()).isEmpty();
        }
    }

    @Test
    void everyExampleOfAPartsFileOpens() throws IOException {
        List<String> examples = examples("parts-file.md");

        assertThat(examples).hasSize(2);
        for (String example : examples) {
            assertThat(PartsFiles.parse("example", example).problems()).isEmpty();
        }
    }

    @Test
    void theFullerExamplesFitTogether() throws IOException {
        Files.writeString(folder.resolve("example.parts.json"), examples("parts-file.md").getLast());
        Path board = Files.writeString(folder.resolve("example.board.json"), examples("board-file.md").getLast());

        Workplace workplace = Workplace.open(board, List.of()).ifOpened().orElseThrow();

        assertThat(workplace.board().channels()).hasSize(4);
        assertThat(workplace.catalogue().find("EX-SH4", Shunt.class)).isPresent();
    }

    private static List<String> examples(String guide) throws IOException {
        return EXAMPLE.matcher(Files.readString(DOCS.resolve(guide))).results().map(found -> found.group(1)).toList();
    }
}
