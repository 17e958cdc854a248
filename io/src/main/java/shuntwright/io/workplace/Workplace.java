package shuntwright.io.workplace;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import shuntwright.board.Board;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.JsonFiles;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problem;
import shuntwright.io.json.Problems;
import shuntwright.io.partsfile.PartsMerge;
import shuntwright.parts.Catalogue;

/**
 * A board and all parts it may use.
 *
 * @param board     what the user asks for
 * @param catalogue the parts of the files that the board names, and of the extra ones
 */
public record Workplace(Board board, Catalogue catalogue) {
    /**
     * Opens a board file and the parts files that it names; problems of all files come together. Part numbers that no
     * parts file has are no problem here: they are findings of the plan.
     *
     * @param boardFile  its parts files are looked for relative to it
     * @param extraParts more parts files; one that the board names too is read once
     */
    public static FileReading<Workplace> open(Path boardFile, List<Path> extraParts) {
        Problems found = new Problems(String.valueOf(boardFile.getFileName()));
        Optional<LocatedJson> root = JsonFiles.read(boardFile, found);
        Optional<Board> board = root.flatMap(tree -> BoardFiles.bind(tree, found));
        Set<Path> files = new LinkedHashSet<>();
        root.ifPresent(tree -> files.addAll(named(boardFile, tree, found)));
        extraParts.forEach(each -> files.add(same(each)));
        PartsMerge merge = new PartsMerge();
        files.forEach(merge::add);

        List<Problem> problems = new ArrayList<>(found.list());
        problems.addAll(merge.problems());
        Optional<Catalogue> catalogue = merge.finish().ifOpened();
        return problems.isEmpty() && board.isPresent() && catalogue.isPresent()
                ? new FileReading.Opened<>(new Workplace(board.get(), catalogue.get()))
                : new FileReading.Refused<>(problems);
    }

    /** The parts files that the board names; one that is not there is a problem of the board file, at its place. */
    private static List<Path> named(Path boardFile, LocatedJson root, Problems found) {
        List<Path> files = new ArrayList<>();
        List<LocatedJson> names = root instanceof LocatedJson.Obj board ? board.elements("parts") : List.of();
        for (LocatedJson each : names) {
            // A name with control characters is a problem that the board's form has told of already.
            if (each instanceof LocatedJson.Text(var _, String name) && !name.isBlank()
                    && name.chars().noneMatch(Character::isISOControl)) {
                try {
                    Path file = boardFile.resolveSibling(name);
                    if (Files.exists(file)) {
                        files.add(same(file));
                    } else {
                        found.add(each, "there is no parts file " + file + "; the path is relative to the board file");
                    }
                } catch (InvalidPathException e) {
                    found.add(each, "\"" + name + "\" cannot be a file name: " + e.getReason());
                }
            }
        }
        return files;
    }

    /** One path for one file, however it is written. */
    private static Path same(Path file) {
        try {
            return file.toRealPath();
        } catch (IOException _) {
            // Not there: reading it will say so.
            return file.toAbsolutePath().normalize();
        }
    }
}
