package shuntwright.planner.window.dialog;

import java.nio.file.Path;
import java.util.Optional;

import shuntwright.planner.session.Questions.Kind;

/** Asks for files; the system's choosers cannot be opened without a screen. */
public interface Choosers {
    Optional<Path> open(Kind kind);

    /** @param suggestion name or path of the file */
    Optional<Path> save(Kind kind, Path suggestion);
}
