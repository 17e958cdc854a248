package shuntwright.planner.command;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;

import shuntwright.board.Board;

/** Where a board's parts files are; a board file names them relative to itself. */
final class PartsPaths {

    private PartsPaths() {
    }

    /** The parts files named by the board that stands in that file. */
    static List<Path> of(Board board, Path file) {
        return board.partsFiles().stream().map(folder(file)::resolve).map(Path::normalize).toList();
    }

    /**
     * The board for another place, with all parts files it was planned with.
     *
     * @param from  the board's file
     * @param extra parts files besides those it names
     * @param to    the file it goes to
     */
    static Board moved(Board board, Path from, List<Path> extra, Path to) {
        Stream<Path> all = Stream.concat(of(board, from).stream(),
                extra.stream().map(each -> each.toAbsolutePath().normalize()));
        List<String> names = all.distinct().map(each -> relative(each, folder(to))).toList();
        return board.withPartsFiles(names);
    }

    private static Path folder(Path file) {
        return Objects.requireNonNull(file.toAbsolutePath().normalize().getParent(), "a file stands in a folder");
    }

    /** Relative with forward slashes, which every system reads; the full path where there is no relative one. */
    private static String relative(Path file, Path folder) {
        boolean related = Objects.equals(file.getRoot(), folder.getRoot());
        return (related ? folder.relativize(file) : file).toString().replace('\\', '/');
    }
}
