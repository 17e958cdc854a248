package shuntwright.planner.session;

import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.List;

import shuntwright.board.Board;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.Problem;
import shuntwright.io.partsfile.PartsFiles;
import shuntwright.io.picture.PngFile;
import shuntwright.io.planfile.PlanFile;
import shuntwright.io.save.SafeSave;
import shuntwright.io.save.SaveResult;
import shuntwright.io.workbook.Workbook;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Catalogue;
import shuntwright.plan.Plan;

/** Boards in files. */
public final class FileBoardStore implements BoardStore {
    @Override
    public FileReading<Opened> open(Path file, List<Path> moreParts) {
        return Workplace.open(file, moreParts).map(place -> new Opened(place.board(), place.catalogue()));
    }

    @Override
    public FileReading<Catalogue> catalogue(List<Path> files) {
        return PartsFiles.open(files);
    }

    @Override
    public List<Problem> objections(Board board) {
        return BoardFiles.objections(board);
    }

    @Override
    public SaveResult save(Board board, Path file) {
        return BoardFiles.save(board, file);
    }

    @Override
    public SaveResult exportWorkbook(Plan plan, Path file) {
        return SafeSave.save(file, out -> Workbook.write(plan, out));
    }

    @Override
    public SaveResult exportPlan(Plan plan, Path file) {
        return SafeSave.save(file, out -> PlanFile.write(plan, out));
    }

    @Override
    public SaveResult savePicture(BufferedImage picture, Path file) {
        return SafeSave.save(file, out -> PngFile.write(picture, out));
    }
}
