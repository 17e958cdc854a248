package shuntwright.planner.session;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** What has to be asked of or told to a person while working with files. */
public interface Questions {
    /** What to do with a board that is not saved. */
    enum Unsaved {
        SAVE, DISCARD, STAY
    }

    /** Kinds of files a person is asked for. */
    enum Kind {
        BOARD("board", ".board.json"), PARTS("parts", ".parts.json"), WORKBOOK("workbook", ".xlsx"),
        PLAN("plan", ".plan.json"), PICTURE("picture", ".png");

        private final String word;
        private final String ending;

        Kind(String word, String ending) {
            this.word = word;
            this.ending = ending;
        }

        public String word() {
            return word;
        }

        /** How names of such files end. */
        public String ending() {
            return ending;
        }
    }

    Optional<Path> fileToOpen(Kind kind);

    /** @param suggestion name or path of the file */
    Optional<Path> fileToSave(Kind kind, Path suggestion);

    Unsaved unsaved(String board);

    /** @param lines one for each thing to be told */
    void tell(String title, String summary, List<String> lines);

    /** Tells of something done, without asking for an answer. */
    void done(String what);
}
