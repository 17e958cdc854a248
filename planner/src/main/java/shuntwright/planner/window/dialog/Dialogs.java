package shuntwright.planner.window.dialog;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;

import javafx.scene.control.Alert;
import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.scene.control.DialogPane;
import javafx.scene.control.TextArea;
import javafx.scene.layout.Region;
import javafx.stage.Window;

import shuntwright.planner.session.Questions;

/** Asks and tells by dialogs over the window. */
public final class Dialogs implements Questions {
    private static final ButtonType SAVE = new ButtonType("Save", ButtonData.YES);
    private static final ButtonType DISCARD = new ButtonType("Don't save", ButtonData.NO);

    private final Choosers choosers;
    private final java.util.function.Supplier<Window> owner;
    private final Consumer<DialogPane> style;
    private final Consumer<String> status;

    /**
     * @param owner  window the dialogs stand over
     * @param style  gives them the window's look
     * @param status hears what was done
     */
    public Dialogs(Choosers choosers, java.util.function.Supplier<Window> owner, Consumer<DialogPane> style,
            Consumer<String> status) {
        this.choosers = choosers;
        this.owner = owner;
        this.style = style;
        this.status = status;
    }

    @Override
    public Optional<Path> fileToOpen(Kind kind) {
        return choosers.open(kind);
    }

    @Override
    public Optional<Path> fileToSave(Kind kind, Path suggestion) {
        return choosers.save(kind, suggestion);
    }

    @Override
    public Unsaved unsaved(String board) {
        Alert alert = alert(Alert.AlertType.CONFIRMATION, "Not saved",
                "\"" + board + "\" has edits that are in no file. Save them?");
        alert.getButtonTypes().setAll(SAVE, DISCARD, ButtonType.CANCEL);
        ButtonType answer = alert.showAndWait().orElse(ButtonType.CANCEL);
        return answer == SAVE ? Unsaved.SAVE : answer == DISCARD ? Unsaved.DISCARD : Unsaved.STAY;
    }

    @Override
    public void tell(String title, String summary, List<String> lines) {
        Alert alert = alert(Alert.AlertType.INFORMATION, title, summary);
        TextArea text = new TextArea(String.join("\n", lines));
        text.setEditable(false);
        text.setWrapText(true);
        text.setPrefRowCount(Math.clamp(lines.size() * 2L, 3, 22));
        text.setPrefColumnCount(56);
        text.setMinHeight(Region.USE_PREF_SIZE);
        alert.getDialogPane().setContent(text);
        // some window managers give less than asked for
        alert.getDialogPane().setMinHeight(Region.USE_PREF_SIZE);
        alert.setResizable(true);
        alert.showAndWait();
    }

    @Override
    public void done(String what) {
        status.accept(what);
    }

    private Alert alert(Alert.AlertType type, String title, String summary) {
        Alert alert = new Alert(type);
        alert.initOwner(owner.get());
        alert.setTitle(title);
        alert.setHeaderText(summary);
        alert.setGraphic(null);
        style.accept(alert.getDialogPane());
        return alert;
    }
}
