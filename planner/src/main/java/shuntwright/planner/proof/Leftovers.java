package shuntwright.planner.proof;

import java.io.IOException;
import java.nio.file.FileVisitResult;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.SimpleFileVisitor;
import java.nio.file.attribute.BasicFileAttributes;

/** Files the child leaves. */
final class Leftovers {

    private Leftovers() {
    }

    /** Deletes what is in a folder, and the folder too if wanted; what cannot be deleted stays. */
    static void delete(Path folder, boolean itself) {
        try {
            Files.walkFileTree(folder, new SimpleFileVisitor<>() {
                @Override
                public FileVisitResult visitFile(Path file, BasicFileAttributes attributes) {
                    remove(file);
                    return FileVisitResult.CONTINUE;
                }

                @Override
                public FileVisitResult visitFileFailed(Path file, IOException e) {
                    return FileVisitResult.CONTINUE;
                }

                @Override
                public FileVisitResult postVisitDirectory(Path each, @org.jspecify.annotations.Nullable IOException e) {
                    if (itself || !each.equals(folder)) {
                        remove(each);
                    }
                    return FileVisitResult.CONTINUE;
                }
            });
        } catch (IOException e) {
            // Nothing there to delete.
        }
    }

    private static void remove(Path path) {
        try {
            Files.deleteIfExists(path);
        } catch (IOException e) {
            // In use; whoever comes later deletes it.
        }
    }
}
