package shuntwright.planner.session;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

import shuntwright.board.Board;
import shuntwright.io.json.FileReading;
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
    FileReading<Opened> open(Path file, List<Path> moreParts) throws IOException;

    FileReading<Catalogue> catalogue(List<Path> files) throws IOException;

    void save(Board board, Path file) throws IOException;

    void exportWorkbook(Plan plan, Catalogue catalogue, Path file) throws IOException;

    void exportPlan(Plan plan, Path file) throws IOException;
}
