package shuntwright.planner.window.shared;

import java.util.List;

import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;

import shuntwright.planner.entry.BoardField;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Place;
import shuntwright.planner.session.WrongEntry;

/** Text fields for some of the board's own values; each is taken over when the field is left or Enter is pressed. */
final class BoardFieldEditor {
    private static final PseudoClass WRONG = PseudoClass.getPseudoClass("wrong");

    private final BoardSession session;
    private final GridPane grid = new GridPane();

    /**
     * @param fields  to type into
     * @param details lines that explain what they came to
     */
    BoardFieldEditor(BoardSession session, List<BoardField> fields, List<String> details) {
        this.session = session;
        grid.getStyleClass().add("board-editor");
        for (int at = 0; at < fields.size(); at++) {
            add(fields.get(at), at * 2);
        }
        for (int at = 0; at < details.size(); at++) {
            Label line = new Label(details.get(at));
            line.setWrapText(true);
            line.setMaxWidth(560);
            grid.add(line, 0, fields.size() * 2 + at, 2, 1);
        }
    }

    Region node() {
        return grid;
    }

    private void add(BoardField field, int line) {
        Place place = new Place.OfBoard(field);
        Label title = new Label(field.title());
        TextField text = new TextField(session.state().text(place));
        text.setId("board-" + field.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-'));
        text.setPrefColumnCount(34);
        title.setLabelFor(text);
        Label hint = new Label();
        hint.setWrapText(true);
        hint.setMaxWidth(400);
        hint.getStyleClass().add("hint");
        Runnable mark = () -> {
            var wrong = session.state().wrong(place);
            hint.setText(wrong.map(WrongEntry::reason).orElse(field.hint()));
            text.pseudoClassStateChanged(WRONG, wrong.isPresent());
            hint.pseudoClassStateChanged(WRONG, wrong.isPresent());
        };
        mark.run();
        Runnable take = () -> {
            session.enter(place, text.getText());
            mark.run();
        };
        text.setOnAction(_ -> take.run());
        text.focusedProperty().subscribe((_, focused) -> {
            if (!focused) {
                take.run();
            }
        });
        text.addEventFilter(KeyEvent.KEY_PRESSED, event -> {
            if (event.getCode() == KeyCode.ESCAPE && !text.getText().equals(field.text(session.state().board()))) {
                session.revert(place);
                text.setText(field.text(session.state().board()));
                mark.run();
                event.consume();
            }
        });
        grid.add(title, 0, line);
        grid.add(text, 1, line);
        grid.add(hint, 1, line + 1);
    }
}
