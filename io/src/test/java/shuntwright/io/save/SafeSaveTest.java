package shuntwright.io.save;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.stream.Stream;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SafeSaveTest {
    private static final Content NEW = out -> out.write("new".getBytes(StandardCharsets.UTF_8));

    @TempDir
    Path folder;

    private static String message(SaveResult result) {
        return switch (result) {
            case SaveResult.Saved _ -> "saved";
            case SaveResult.Failed(String message) -> message;
        };
    }

    private long files() throws IOException {
        try (Stream<Path> all = Files.list(folder)) {
            return all.count();
        }
    }

    @Test
    void aNewFileIsWrittenAndNothingElseIsLeft() throws IOException {
        Path file = folder.resolve("a.json");

        assertThat(SafeSave.save(file, NEW)).isEqualTo(new SaveResult.Saved(file));

        assertThat(file).hasContent("new");
        assertThat(files()).isEqualTo(1);
    }

    @Test
    void anOldFileIsReplacedAndKeepsItsPermissions() throws IOException {
        Path file = Files.writeString(folder.resolve("a.json"), "a longer old text");
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-rw----"));

        assertThat(message(SafeSave.save(file, NEW))).isEqualTo("saved");

        assertThat(file).hasContent("new");
        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(file))).isEqualTo("rw-rw----");
    }

    @Test
    void aSymbolicLinkStaysAndItsTargetIsReplaced() throws IOException {
        Path target = Files.writeString(Files.createDirectory(folder.resolve("real")).resolve("a.json"), "old");
        Path link = Files.createSymbolicLink(folder.resolve("link.json"), target);
        Path dangling = Files.createSymbolicLink(folder.resolve("new.json"), Path.of("real", "b.json"));

        assertThat(message(SafeSave.save(link, NEW))).isEqualTo("saved");
        assertThat(message(SafeSave.save(dangling, NEW))).isEqualTo("saved");

        assertThat(link).isSymbolicLink();
        assertThat(dangling).isSymbolicLink();
        assertThat(target).hasContent("new");
        assertThat(folder.resolve("real/b.json")).hasContent("new");
    }

    @Test
    void aFailureWhileWritingLeavesTheOldFileAndNoTemporaryOne() throws IOException {
        Path file = Files.writeString(folder.resolve("a.json"), "old");

        SaveResult result = SafeSave.save(file, out -> {
            out.write(new byte[100_000]);
            throw new IOException("No space left on device");
        });

        assertThat(message(result)).contains("a.json was not saved: the disk is full");
        assertThat(file).hasContent("old");
        assertThat(files()).isEqualTo(1);
    }

    @Test
    void anUncheckedFailureLeavesNoTemporaryFileEither() throws IOException {
        Path file = Files.writeString(folder.resolve("a.json"), "old");

        try {
            SafeSave.save(file, _ -> {
                throw new IllegalStateException("broken content");
            });
        } catch (IllegalStateException e) {
            assertThat(e).hasMessage("broken content");
        }

        assertThat(file).hasContent("old");
        assertThat(files()).isEqualTo(1);
    }

    @Test
    void aFolderInTheWayOrAMissingOneIsSaid() throws IOException {
        Path inTheWay = Files.createDirectory(folder.resolve("a.json"));

        assertThat(message(SafeSave.save(inTheWay, NEW))).contains("a folder has this name");
        assertThat(message(SafeSave.save(folder.resolve("none/a.json"), NEW))).contains("there is no folder");
        assertThat(files()).isEqualTo(1);
    }

    @Test
    void aDeviceIsNotReplacedByAFile() {
        Path device = Path.of("/dev/null");
        assumeThat(device).exists();

        assertThat(message(SafeSave.save(device, _ -> {
            throw new IllegalStateException("nothing may be written beside it");
        }))).contains("a device or pipe");
        assertThat(Files.isRegularFile(device)).isFalse();
    }

    @Test
    void refusalsOfTheSystemAreSaidInPlainWords() {
        Path file = folder.resolve("a.json");

        assertThat(message(SafeSave.save(file, _ -> {
            throw new AccessDeniedException("a.json");
        }))).contains("you may not write in this folder");
        assertThat(message(SafeSave.save(file, _ -> {
            throw new FileSystemException("a.json", null, "Read-only file system");
        }))).endsWith("a.json was not saved: Read-only file system");
        assertThat(file).doesNotExist();
    }
}
