package shuntwright.planner.session;

import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.List;

import shuntwright.board.Board;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.Problem;
import shuntwright.io.save.SaveResult;
import shuntwright.parts.Catalogue;
import shuntwright.plan.Plan;

/** Where boards come from and go to. */
public interface BoardStore {
    /**
     * A board with the parts it may use.
     *
     * @param board     as the file has it
     * @param catalogue of all its parts files
     */
    record Opened(Board board, Catalogue catalogue) {}

    /** @param moreParts parts files besides those the board names */
    FileReading<Opened> open(Path file, List<Path> moreParts);

    FileReading<Catalogue> catalogue(List<Path> files);

    /** Why the board's file could not be opened again; empty when it could. */
    List<Problem> objections(Board board);

    SaveResult save(Board board, Path file);

    SaveResult exportWorkbook(Plan plan, Path file);

    SaveResult exportPlan(Plan plan, Path file);

    SaveResult savePicture(BufferedImage picture, Path file);
}
