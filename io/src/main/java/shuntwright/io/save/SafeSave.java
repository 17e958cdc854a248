package shuntwright.io.save;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.channels.Channels;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileSystemException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.ReadOnlyFileSystemException;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFilePermissions;

/**
 * Replaces a file as a whole or not at all: the content goes into a temporary file beside it, is forced to the disk, and
 * takes the place of the old file in one step. A symbolic link stays and the file it names is replaced; the permissions
 * of the old file stay.
 */
public final class SafeSave {
    private static final boolean POSIX = FileSystems.getDefault().supportedFileAttributeViews().contains("posix");

    private SafeSave() {
    }

    /** Saves the content under that name. */
    public static SaveResult save(Path file, Content content) {
        try {
            Path target = Files.exists(file) ? file.toRealPath() : linkTarget(file.toAbsolutePath());
            if (Files.isDirectory(target)) {
                return failed(file, "a folder has this name; choose another name");
            }
            if (Files.exists(target) && !Files.isRegularFile(target)) {
                return failed(file, "this is a device or pipe, which a file would replace; choose another name");
            }
            Path folder = target.getParent();
            if (folder == null || !Files.isDirectory(folder)) {
                return failed(file, "there is no folder " + folder + "; create it or choose another one");
            }
            replace(target, folder, content);
            return new SaveResult.Saved(file);
        } catch (AccessDeniedException | ReadOnlyFileSystemException _) {
            return failed(file, "you may not write in this folder; choose another one or change its permissions");
        } catch (FileSystemException e) {
            return failed(file, e.getReason() == null ? "the disk refused it" : e.getReason());
        } catch (IOException e) {
            String reason = String.valueOf(e.getMessage());
            return failed(file, reason.contains("No space left")
                    ? "the disk is full; free some space or save elsewhere"
                    : reason);
        }
    }

    private static SaveResult failed(Path file, String reason) {
        return new SaveResult.Failed(file + " was not saved: " + reason);
    }

    /** Where a link without an existing target points to; the path itself when it is no link. */
    private static Path linkTarget(Path file) throws IOException {
        return Files.isSymbolicLink(file) ? file.resolveSibling(Files.readSymbolicLink(file)).normalize() : file;
    }

    private static void replace(Path target, Path folder, Content content) throws IOException {
        Path temporary = Files.createTempFile(folder, "." + target.getFileName() + ".", ".part");
        try {
            try (FileChannel channel = FileChannel.open(temporary, StandardOpenOption.WRITE)) {
                // Not closed here: closing it would close the channel before it can be forced to the disk.
                OutputStream out = new BufferedOutputStream(Channels.newOutputStream(channel));
                content.writeTo(out);
                out.flush();
                channel.force(true);
            }
            keepPermissions(target, temporary);
            move(temporary, target);
        } finally {
            Files.deleteIfExists(temporary);
        }
        forceFolder(folder);
    }

    private static void keepPermissions(Path target, Path temporary) throws IOException {
        if (POSIX) {
            // A temporary file may be read by its owner only; a new file should be as any other.
            Files.setPosixFilePermissions(temporary, Files.exists(target)
                    ? Files.getPosixFilePermissions(target)
                    : PosixFilePermissions.fromString("rw-r--r--"));
        }
    }

    private static void move(Path temporary, Path target) throws IOException {
        try {
            Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException _) {
            Files.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    /** Makes the new name survive a power failure, on systems that can open a folder. */
    private static void forceFolder(Path folder) {
        try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
            channel.force(true);
        } catch (IOException _) {
            // The content is complete under its name; only this system has no way to force the folder's entry.
            return;
        }
    }
}
