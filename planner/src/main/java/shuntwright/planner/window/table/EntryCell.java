package shuntwright.planner.window.table;

import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.TableCell;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyEvent;

import org.jspecify.annotations.Nullable;

import shuntwright.planner.entry.ChannelField;

/** A cell for typing. Whatever ends the typing except Escape takes the text over, so nothing typed is lost. */
final class EntryCell extends TableCell<RowModel, CellEntry> {
    private static final PseudoClass WRONG = PseudoClass.getPseudoClass("wrong");
    private static final PseudoClass INVITING = PseudoClass.getPseudoClass("inviting");

    private final ChannelField field;
    private final ChannelTable view;
    private final Tooltip tip = new Tooltip();
    private @Nullable TextField editor;
    private ChannelTableModel.@Nullable Spot edited;

    EntryCell(ChannelField field, ChannelTable view) {
        this.field = field;
        this.view = view;
        getStyleClass().add("entry-cell");
        if (field.isNumber()) {
            getStyleClass().add("figure-cell");
        }
        tip.setWrapText(true);
        tip.setMaxWidth(420);
        setAccessibleRole(AccessibleRole.TABLE_CELL);
        if (field == ChannelField.NAME) {
            getStyleClass().add("pinned");
            setViewOrder(-1);
            translateXProperty().bind(view.scrolledProperty());
        }
    }

    private @Nullable RowModel row() {
        return getTableRow() == null ? null : getTableRow().getItem();
    }

    @Override
    protected void updateItem(@Nullable CellEntry entry, boolean empty) {
        super.updateItem(entry, empty);
        if (empty || entry == null) {
            pseudoClassStateChanged(WRONG, false);
            pseudoClassStateChanged(INVITING, false);
            if (!isEditing()) {
                setGraphic(null);
                setText(null);
                setTooltip(null);
                setAccessibleText(null);
            }
            return;
        }
        RowModel row = row();
        boolean invite = row != null && row.isEmptyRow() && field == ChannelField.NAME;
        pseudoClassStateChanged(WRONG, entry.reason().isPresent());
        pseudoClassStateChanged(INVITING, invite);
        if (!isEditing()) {
            setGraphic(null);
            setContentDisplay(ContentDisplay.TEXT_ONLY);
            setText(invite ? "+ type a name" : entry.text());
            // the text too, since it may be longer than the cell
            tip.setText((entry.text().isBlank() || invite ? "" : entry.text() + "\n")
                    + entry.reason().orElse("Takes " + field.hint() + "."));
            setTooltip(tip);
            setAccessibleText(field.title() + " " + entry.text()
                    + entry.reason().map(reason -> ", wrong entry: " + reason).orElse(""));
        }
    }

    @Override
    public void startEdit() {
        RowModel row = row();
        if (row == null || isEmpty()) {
            return;
        }
        super.startEdit();
        if (!isEditing()) {
            return;
        }
        String before = row.isEmptyRow() ? "" : getItem().text();
        String typed = view.takeTyped();
        TextField text = new TextField(typed.isEmpty() ? before : typed);
        text.getStyleClass().add("cell-editor");
        text.setPromptText(field.hint());
        text.setAlignment(field.isNumber() ? javafx.geometry.Pos.CENTER_RIGHT : javafx.geometry.Pos.CENTER_LEFT);
        text.addEventFilter(KeyEvent.KEY_PRESSED, event -> key(event, text));
        text.focusedProperty().subscribe((_, focused) -> {
            if (!focused && text.equals(editor)) {
                finish(text);
            }
        });
        editor = text;
        edited = new ChannelTableModel.Spot(row.id(), field);
        setText(null);
        setGraphic(text);
        setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
        // its skin must be there before the focus, which selects all, comes
        text.applyCss();
        text.requestFocus();
        if (typed.isEmpty()) {
            text.selectAll();
        } else {
            text.positionCaret(typed.length());
        }
    }

    private void key(KeyEvent event, TextField text) {
        ChannelTableModel.Spot spot = edited;
        if (spot == null) {
            return;
        }
        switch (event.getCode()) {
            case ENTER -> {
                event.consume();
                if (event.isControlDown()) {
                    drop();
                    view.enterSelected(spot, text.getText());
                } else {
                    finish(text);
                    view.move(event.isShiftDown() ? -1 : 1, 0);
                }
            }
            case TAB -> {
                event.consume();
                finish(text);
                view.moveToEntry(event.isShiftDown() ? -1 : 1);
            }
            case ESCAPE -> {
                event.consume();
                drop();
                view.model().revert(spot);
                getTableView().requestFocus();
            }
            default -> {
                // typed into the text
            }
        }
    }

    /** Ends the typing without taking the text over. */
    private void drop() {
        editor = null;
        cancelEdit();
    }

    private void finish(TextField text) {
        if (text.equals(editor)) {
            cancelEdit();
        }
    }

    /** Ends the typing; also called by the table when another cell is clicked. */
    @Override
    public void cancelEdit() {
        TextField text = editor;
        ChannelTableModel.Spot spot = edited;
        boolean hadFocus = text != null && text.isFocused();
        editor = null;
        edited = null;
        super.cancelEdit();
        updateItem(getItem(), isEmpty());
        if (text != null && spot != null) {
            view.model().enter(spot, text.getText());
            if (hadFocus) {
                getTableView().requestFocus();
            }
        }
    }
}
