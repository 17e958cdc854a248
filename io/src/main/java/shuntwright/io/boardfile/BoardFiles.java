package shuntwright.io.boardfile;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

import shuntwright.board.Board;
import shuntwright.io.form.Form;
import shuntwright.io.form.FormatLine;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.JsonFiles;
import shuntwright.io.json.JsonText;
import shuntwright.io.json.JsonTree;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problem;
import shuntwright.io.json.Problems;
import shuntwright.io.save.SafeSave;
import shuntwright.io.save.SaveResult;

/** Opens and saves board files. */
public final class BoardFiles {
    static final FormatLine FORMAT = new FormatLine("board", 1);

    private static final BoardForm FORM = new BoardForm();

    private BoardFiles() {
    }

    /** Opens a board file; a half-filled board opens too. */
    public static FileReading<Board> open(Path file) {
        Problems problems = new Problems(fileName(file));
        return reading(JsonFiles.read(file, problems).flatMap(root -> bind(root, problems)), problems);
    }

    /**
     * Reads the text of a board file.
     *
     * @param name what problems call the file
     */
    public static FileReading<Board> parse(String name, String text) {
        Problems problems = new Problems(name);
        return reading(JsonTree.parse(text, problems).flatMap(root -> bind(root, problems)), problems);
    }

    /** The board in a tree that has been read before; what is wrong with it is added to {@code problems}. */
    public static Optional<Board> bind(LocatedJson root, Problems problems) {
        return FORMAT.check(root, problems).flatMap(object -> {
            BoardNames.check(object, problems);
            return FORM.read(object, problems);
        });
    }

    private static FileReading<Board> reading(Optional<Board> board, Problems problems) {
        return board.isPresent() && problems.isEmpty()
                ? new FileReading.Opened<>(board.get())
                : new FileReading.Refused<>(problems.list());
    }

    private static String fileName(Path file) {
        return String.valueOf(file.getFileName());
    }

    /** The text of the board's file: the same board always gives the same text. */
    public static String write(Board board) {
        return JsonText.print(FORM.write(board));
    }

    /** Saves the board; the file is either replaced as a whole or left as it was. */
    public static SaveResult save(Board board, Path file) {
        byte[] text = write(board).getBytes(StandardCharsets.UTF_8);
        return SafeSave.save(file, out -> out.write(text));
    }

    /** Why the board's file could not be opened again, such as two channels with one name; empty when it could. */
    public static List<Problem> objections(Board board) {
        return parse("board", write(board)).problems();
    }

    /** The inputs whose distribution a board file may state, as a table in Markdown for the guide. */
    public static String inputTable() {
        return InputWords.markdown();
    }

    /** Every type of object in a board file, the file itself first. */
    public static List<Form<?>> forms() {
        return FORM.all();
    }
}
