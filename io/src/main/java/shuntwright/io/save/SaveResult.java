package shuntwright.io.save;

import java.nio.file.Path;

/** What came of saving a file. */
public sealed interface SaveResult {
    /** @param file as given by the caller */
    record Saved(Path file) implements SaveResult {}

    /** @param message why, and what to do; the old file is as it was */
    record Failed(String message) implements SaveResult {}
}
