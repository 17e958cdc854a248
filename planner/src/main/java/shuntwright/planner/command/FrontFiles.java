package shuntwright.planner.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import shuntwright.board.Board;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.io.planfile.PlanFile;
import shuntwright.io.save.SafeSave;
import shuntwright.io.save.SaveResult;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Front;
import shuntwright.plan.Plan;

/**
 * Files of a front, two for each plan.
 *
 * @param folder to write into
 */
record FrontFiles(Path folder) {

    /**
     * A folder in which none of the files stands yet.
     *
     * @throws BadInput when there is no place for the folder, or a file that would be replaced
     */
    static FrontFiles in(Path folder, int points) {
        Path parent = folder.toAbsolutePath().normalize().getParent();
        if (Files.exists(folder) && !Files.isDirectory(folder)) {
            throw new BadInput("--out: " + folder + " is a file; name a folder");
        }
        if (!Files.exists(folder) && (parent == null || !Files.isDirectory(parent))) {
            throw new BadInput("--out: " + folder + " cannot be made: there is no folder " + parent
                    + "; create it or choose another one");
        }
        FrontFiles files = new FrontFiles(folder);
        List<String> there = new ArrayList<>();
        for (int number = 1; number <= points; number++) {
            for (Path each : List.of(files.plan(number), files.board(number))) {
                if (Files.exists(each)) {
                    there.add("--out: " + each + " is there already and would be replaced; choose an empty folder");
                }
            }
        }
        if (!there.isEmpty()) {
            throw new BadInput(there);
        }
        return files;
    }

    private Path plan(int number) {
        return folder.resolve(String.format(Locale.ROOT, "front-%02d.plan.json", number));
    }

    private Path board(int number) {
        return folder.resolve(String.format(Locale.ROOT, "front-%02d.board.json", number));
    }

    /**
     * Writes every plan of the front, and its board with every choice pinned.
     *
     * @param parts files besides the board's own
     * @return what was written
     * @throws BadInput when something cannot be saved
     */
    List<Path> write(Front front, Question question, List<Path> parts) {
        try {
            if (!Files.isDirectory(folder)) {
                Files.createDirectory(folder);
            }
        } catch (IOException failure) {
            throw new BadInput("--out: " + folder + " cannot be made (" + failure.getMessage()
                    + "); choose another one");
        }
        List<Path> written = new ArrayList<>();
        List<String> failed = new ArrayList<>();
        int number = 0;
        for (Front.Point point : front.points()) {
            number++;
            Plan plan = point.plan();
            Path board = board(number);
            Board pinned = Entered.restored(BoardPlanner.pinned(plan), question.original());
            note(SafeSave.save(plan(number), out -> PlanFile.write(plan, out)), plan(number), written, failed);
            note(BoardFiles.save(PartsPaths.moved(pinned, question.file(), parts, board), board), board, written,
                    failed);
        }
        if (!failed.isEmpty()) {
            throw new BadInput(failed);
        }
        return List.copyOf(written);
    }

    private static void note(SaveResult result, Path file, List<Path> written, List<String> failed) {
        switch (result) {
            case SaveResult.Saved _ -> written.add(file);
            case SaveResult.Failed(String message) -> failed.add(message);
        }
    }
}
