package shuntwright.io.json;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class JsonFilesTest {
    @TempDir
    Path folder;

    private String problem(Path file) {
        Problems problems = new Problems("f.json");
        assertThat(JsonFiles.read(file, problems)).isEmpty();
        assertThat(problems.count()).isEqualTo(1);
        return problems.list().getFirst().toString();
    }

    private Path file(byte[] bytes) throws IOException {
        return Files.write(folder.resolve("f.json"), bytes);
    }

    private Path file(String text, Charset charset) throws IOException {
        return file(text.getBytes(charset));
    }

    @Test
    void aByteOrderMarkIsToleratedAndDoesNotShiftColumns() throws IOException {
        Problems problems = new Problems("f.json");

        LocatedJson root = JsonFiles.read(file("\uFEFF{\"a\": 1}", StandardCharsets.UTF_8), problems).orElseThrow();

        assertThat(root.place()).isEqualTo(new Place(1, 1, ""));
        assertThat(((LocatedJson.Obj) root).find("a").orElseThrow().place()).isEqualTo(new Place(1, 7, "a"));
    }

    @Test
    void otherEncodingsAreNamed() throws IOException {
        assertThat(problem(file("{\n\"a\": \"4 mΩ ±\"}", StandardCharsets.ISO_8859_1)))
                .startsWith("f.json:2:12: the byte 0xB1 is not UTF-8");
        assertThat(problem(file("\uFEFF{}", StandardCharsets.UTF_16LE))).contains("UTF-16; save it as UTF-8");
        assertThat(problem(file("\uFEFF{}", StandardCharsets.UTF_16BE))).contains("UTF-16; save it as UTF-8");
    }

    @Test
    void aTextCutWithinACharacterIsNotUtf8() throws IOException {
        assertThat(problem(file(new byte[]{'"', (byte) 0xCE}))).contains("f.json:1:2: the byte 0xCE");
    }

    @Test
    void whatIsNotAReadableFileIsSaid() throws IOException {
        assertThat(problem(folder)).contains("is a folder");
        assertThat(problem(folder.resolve("none.json"))).contains("there is no file");
        assertThat(problem(file(new byte[0]))).isEqualTo("f.json: the file is empty");
        assertThat(problem(file("\uFEFF \n", StandardCharsets.UTF_8))).isEqualTo("f.json: the file is empty");
        assertThat(problem(Path.of("/dev/null"))).contains("not an ordinary file");
    }

    @Test
    void aHugeFileIsRefused() throws IOException {
        Path file = folder.resolve("f.json");
        try (RandomAccessFile huge = new RandomAccessFile(file.toFile(), "rw")) {
            huge.setLength(JsonFiles.LARGEST + 1L);
        }

        assertThat(problem(file)).contains("larger than 64 MB");
    }

    @Test
    void deepNestingUpToTheLimitIsRead() {
        String text = "[".repeat(JsonTree.DEEPEST) + "]".repeat(JsonTree.DEEPEST);

        assertThat(JsonTree.parse(text, new Problems("f.json"))).isPresent();
    }
}
