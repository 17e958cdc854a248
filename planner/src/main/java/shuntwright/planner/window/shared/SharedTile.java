package shuntwright.planner.window.shared;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.planner.entry.BoardField;

/**
 * One shared thing.
 *
 * @param title   what it is
 * @param value   used and limit, in words
 * @param note    a little more; empty where there is none
 * @param share   used of the limit, 0 and more; empty without a limit
 * @param holds   whether the limit is kept
 * @param fields  what its editor offers
 * @param details more about it, a line each
 * @param wrong   why something typed into its editor could not be taken over
 */
record SharedTile(String title, String value, String note, OptionalDouble share, boolean holds, List<BoardField> fields,
        List<String> details, Optional<String> wrong) {
    SharedTile {
        fields = List.copyOf(fields);
        details = List.copyOf(details);
    }

    SharedTile(String title, String value, OptionalDouble share, boolean holds, List<BoardField> fields) {
        this(title, value, "", share, holds, fields, List.of(), Optional.empty());
    }

    SharedTile withDetails(List<String> lines) {
        return new SharedTile(title, value, note, share, holds, fields, lines, wrong);
    }

    SharedTile withNote(String words) {
        return new SharedTile(title, value, words, share, holds, fields, details, wrong);
    }

    SharedTile withWrong(Optional<String> reason) {
        return new SharedTile(title, value, note, share, holds, fields, details, reason);
    }

    /** False where its limit is broken or an entry is wrong. */
    boolean well() {
        return holds && wrong.isEmpty();
    }

    /** Everything in words. */
    String words() {
        StringBuilder words = new StringBuilder(title).append(": ").append(value)
                .append(note.isEmpty() ? "" : ", " + note)
                .append(holds ? "" : share.isPresent() ? ", over its limit" : ", does not hold");
        details.forEach(each -> words.append('\n').append(each));
        wrong.ifPresent(reason -> words.append("\nWrong entry: ").append(reason));
        return words.toString();
    }
}
