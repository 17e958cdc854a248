package shuntwright.planner.session;

import java.nio.file.Path;
import java.util.List;

/** Paths of parts files, which a board file names relative to itself. */
final class PartsPaths {
    private PartsPaths() {
    }

    static Path folder(Path boardFile) {
        Path parent = boardFile.toAbsolutePath().normalize().getParent();
        return parent == null ? boardFile.toAbsolutePath() : parent;
    }

    /** The files themselves. */
    static List<Path> resolved(List<String> names, Path folder) {
        return names.stream().map(name -> folder.resolve(name).normalize()).toList();
    }

    /** The same files named relative to another folder; with its full path where there is no relative one. */
    static List<String> moved(List<String> names, Path from, Path to) {
        return names.stream().map(name -> relative(from.resolve(name).normalize(), to)).toList();
    }

    static String relative(Path file, Path folder) {
        Path name = file.getRoot() != null && file.getRoot().equals(folder.getRoot())
                ? folder.relativize(file)
                : file;
        return name.toString().replace('\\', '/');
    }
}
