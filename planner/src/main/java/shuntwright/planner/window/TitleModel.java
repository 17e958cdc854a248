package shuntwright.planner.window;

import javafx.beans.binding.Bindings;
import javafx.beans.binding.StringBinding;

import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Documents;

/** The window's title: board, file, and whether it is saved. */
final class TitleModel {
    private final StringBinding title;

    TitleModel(BoardSession session, Documents documents) {
        title = Bindings.createStringBinding(() -> {
            if (!session.openProperty().get()) {
                return "Shuntwright";
            }
            String file = documents.fileProperty().get().map(path -> " (" + path.getFileName() + ")").orElse("");
            return session.state().board().name() + file + " · "
                    + (session.unsavedProperty().get()
                            ? "unsaved •"
                            : documents.fileProperty().get().isPresent() ? "saved" : "no file yet")
                    + " – Shuntwright";
        }, session.openProperty(), session.stateProperty(), session.unsavedProperty(), documents.fileProperty());
    }

    StringBinding titleBinding() {
        return title;
    }
}
