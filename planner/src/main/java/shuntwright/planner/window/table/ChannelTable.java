package shuntwright.planner.window.table;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import javafx.application.Platform;
import javafx.beans.InvalidationListener;
import javafx.beans.binding.Bindings;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.collections.transformation.SortedList;
import javafx.css.PseudoClass;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollBar;
import javafx.scene.control.SelectionMode;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TablePosition;
import javafx.scene.control.TableRow;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.control.skin.VirtualFlow;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;

import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.window.table.ChannelTableModel.Spot;

/** The channel table. */
public final class ChannelTable {
    private static final PseudoClass ACTIVE = PseudoClass.getPseudoClass("active");

    private final ChannelTableModel model;
    private final TableView<RowModel> table = new TableView<>();
    private final List<TableColumn<RowModel, ?>> columns;
    private String typed = "";
    private final DoubleProperty scrolled = new SimpleDoubleProperty();
    private boolean following;

    public ChannelTable(ChannelTableModel model) {
        this.model = model;
        table.setId("channel-table");
        table.setAccessibleText("Channels");
        table.setEditable(true);
        table.getSelectionModel().setCellSelectionEnabled(true);
        table.getSelectionModel().setSelectionMode(SelectionMode.MULTIPLE);
        table.setTableMenuButtonVisible(true);
        table.setPlaceholder(new Label("No channel"));
        table.setRowFactory(_ -> row());
        SortedList<RowModel> sorted = new SortedList<>(model.shown());
        sorted.comparatorProperty().bind(Bindings.createObjectBinding(() -> {
            Comparator<RowModel> chosen = table.getComparator();
            Comparator<RowModel> emptyLast = Comparator.comparing(RowModel::isEmptyRow);
            return chosen == null ? null : emptyLast.thenComparing(chosen);
        }, table.comparatorProperty()));
        // the sorted list above sorts; the table's own policy asks for a comparator without the empty row
        table.setSortPolicy(_ -> true);
        columns = ChannelColumns.all(field -> new EntryCell(field, this));
        table.getColumns().setAll(columns);
        table.setItems(sorted);
        table.skinProperty().subscribe(skin -> {
            if (skin != null) {
                Platform.runLater(this::dressHeaders);
            }
        });
        table.getVisibleLeafColumns().addListener((InvalidationListener) _ -> Platform.runLater(this::dressHeaders));
        table.addEventFilter(KeyEvent.KEY_PRESSED, this::pressed);
        table.addEventHandler(KeyEvent.KEY_TYPED, this::startTyping);
        table.getSelectionModel().getSelectedCells().addListener((InvalidationListener) _ -> tellSelection());
        model.session().selectionProperty().subscribe(_ -> followSelection());
    }

    private TableRow<RowModel> row() {
        TableRow<RowModel> row = new TableRow<>();
        Runnable mark = () -> row.pseudoClassStateChanged(ACTIVE,
                row.getItem() != null && model.session().selectionProperty().get().contains(row.getItem().id()));
        row.itemProperty().subscribe(mark);
        model.session().selectionProperty().subscribe(mark);
        return row;
    }

    /** The control for the window. */
    public TableView<?> node() {
        return table;
    }

    /** How far the columns are scrolled; the name column moves along to stay in sight. */
    ReadOnlyDoubleProperty scrolledProperty() {
        return scrolled;
    }

    /** Gives each header its explanation, and pins that of the names; headers exist only once they are laid out. */
    private void dressHeaders() {
        table.lookupAll(".scroll-bar").stream()
                .filter(node -> node instanceof ScrollBar bar && bar.getOrientation() == Orientation.HORIZONTAL)
                .map(ScrollBar.class::cast).findFirst()
                .ifPresent(bar -> scrolled.bind(Bindings.when(bar.visibleProperty()).then(bar.valueProperty())
                        .otherwise(0.0)));
        for (Node header : table.lookupAll(".column-header")) {
            columns.stream().filter(column -> column.getId().equals(header.getId())).findFirst()
                    .ifPresent(column -> Tooltip.install(header,
                            new Tooltip(ChannelColumns.words(column))));
            if (columns.getFirst().getId().equals(header.getId())) {
                header.setViewOrder(-1);
                header.translateXProperty().bind(scrolled);
            }
        }
    }

    ChannelTableModel model() {
        return model;
    }

    /** The characters that started the editing; given away once. */
    String takeTyped() {
        String text = typed;
        typed = "";
        return text;
    }

    private void startTyping(KeyEvent event) {
        String text = event.getCharacter();
        boolean command = event.isShortcutDown() || event.isAltDown() || event.isMetaDown();
        TablePosition<?, ?> focus = table.getFocusModel().getFocusedCell();
        if (command || text.isEmpty() || Character.isISOControl(text.charAt(0)) || table.getEditingCell() != null
                || focus.getRow() < 0 || fieldOf(focus.getTableColumn()) == null || !table.equals(event.getTarget())) {
            return;
        }
        event.consume();
        typed = text;
        edit(focus.getRow(), focus.getTableColumn());
        typed = "";
    }

    @SuppressWarnings("unchecked") // the focused column is one of this table's
    private void edit(int row, TableColumn<?, ?> column) {
        // rows may have come or gone since the last frame; without this the cell would still be that of another row
        table.layout();
        table.edit(row, (TableColumn<RowModel, ?>) column);
    }

    private static @org.jspecify.annotations.Nullable ChannelField fieldOf(
            @org.jspecify.annotations.Nullable TableColumn<?, ?> column) {
        return column != null && column.getUserData() instanceof ChannelField field ? field : null;
    }

    private void pressed(KeyEvent event) {
        if (table.getEditingCell() != null) {
            return;
        }
        if (event.isShortcutDown()) {
            if (event.getCode() == KeyCode.C) {
                copy();
                event.consume();
            } else if (event.getCode() == KeyCode.V) {
                paste(Clipboard.getSystemClipboard().getString());
                event.consume();
            }
            return;
        }
        switch (event.getCode()) {
            case TAB -> {
                if (moveToEntry(event.isShiftDown() ? -1 : 1)) {
                    event.consume();
                }
            }
            case DELETE, BACK_SPACE -> {
                model.clear(selectedSpots());
                event.consume();
            }
            case F2, ENTER -> {
                TablePosition<?, ?> focus = table.getFocusModel().getFocusedCell();
                if (focus.getRow() >= 0 && fieldOf(focus.getTableColumn()) != null) {
                    edit(focus.getRow(), focus.getTableColumn());
                    event.consume();
                }
            }
            case ESCAPE -> selectedSpots().forEach(model::revert);
            default -> {
                // the table's own keys
            }
        }
    }

    /** Moves the focus to the next cell that can be typed into, row by row; false where there is none. */
    boolean moveToEntry(int step) {
        TablePosition<?, ?> focus = table.getFocusModel().getFocusedCell();
        List<TableColumn<RowModel, ?>> visible = table.getVisibleLeafColumns();
        int at = Math.max(0, focus.getRow()) * visible.size() + Math.max(0, focus.getColumn()) + step;
        for (; at >= 0 && at < table.getItems().size() * visible.size(); at += step) {
            if (fieldOf(visible.get(at % visible.size())) != null) {
                select(at / visible.size(), visible.get(at % visible.size()));
                return true;
            }
        }
        return false;
    }

    /** Puts the focus where typing can begin: on the selected channel, or on the empty row. */
    public void focus() {
        int row = table.getSelectionModel().getSelectedIndex();
        select(row >= 0 ? row : Math.max(0, table.getItems().size() - 1), table.getVisibleLeafColumn(0));
    }

    /** Moves the focus by rows or columns, at the end of a row to the next; false where there is nothing further. */
    boolean move(int rows, int steps) {
        TablePosition<?, ?> focus = table.getFocusModel().getFocusedCell();
        List<TableColumn<RowModel, ?>> visible = table.getVisibleLeafColumns();
        int row = focus.getRow() + rows;
        int column = Math.max(0, focus.getColumn()) + steps;
        if (column >= visible.size()) {
            column = 0;
            row++;
        } else if (column < 0) {
            column = visible.size() - 1;
            row--;
        }
        if (row < 0 || row >= table.getItems().size()) {
            return false;
        }
        select(row, visible.get(column));
        return true;
    }

    private void select(int row, TableColumn<RowModel, ?> column) {
        table.getSelectionModel().clearAndSelect(row, column);
        table.getFocusModel().focus(row, column);
        scrollIntoSight(row);
        table.scrollToColumn(column);
        table.requestFocus();
    }

    /** Leaves the rows where they are when the row is in sight already. */
    private void scrollIntoSight(int row) {
        if (!(table.lookup(".virtual-flow") instanceof VirtualFlow<?> flow) || flow.getFirstVisibleCell() == null
                || flow.getLastVisibleCell() == null) {
            table.scrollTo(Math.max(0, row - 2));
        } else if (row <= flow.getFirstVisibleCell().getIndex()) {
            flow.scrollTo(row);
        } else if (row >= flow.getLastVisibleCell().getIndex()) {
            int shown = flow.getLastVisibleCell().getIndex() - flow.getFirstVisibleCell().getIndex();
            flow.scrollTo(Math.max(0, row - Math.max(0, shown - 2)));
        }
    }

    private List<Spot> selectedSpots() {
        List<Spot> spots = new ArrayList<>();
        for (TablePosition<?, ?> each : table.getSelectionModel().getSelectedCells()) {
            ChannelField field = fieldOf(each.getTableColumn());
            if (field != null && each.getRow() >= 0 && each.getRow() < table.getItems().size()) {
                spots.add(new Spot(table.getItems().get(each.getRow()).id(), field));
            }
        }
        return spots;
    }

    /** Types a text into all selected cells of a column. */
    void enterSelected(Spot typedAt, String text) {
        List<Spot> all = new ArrayList<>(selectedSpots());
        all.removeIf(spot -> spot.field() != typedAt.field());
        if (!all.contains(typedAt)) {
            all.add(typedAt);
        }
        model.enterAll(all, text);
        table.requestFocus();
    }

    private List<ChannelField> visibleFields() {
        List<ChannelField> fields = new ArrayList<>();
        for (TableColumn<RowModel, ?> column : table.getVisibleLeafColumns()) {
            ChannelField field = fieldOf(column);
            if (field != null) {
                fields.add(field);
            }
        }
        return fields;
    }

    private void copy() {
        List<Spot> spots = selectedSpots();
        List<Integer> rows = spots.stream().map(Spot::row).filter(row -> row != RowModel.EMPTY_ROW).distinct().toList();
        List<ChannelField> fields = visibleFields().stream()
                .filter(field -> spots.stream().anyMatch(spot -> spot.field() == field)).toList();
        ClipboardContent content = new ClipboardContent();
        content.putString(model.copy(rows, fields));
        Clipboard.getSystemClipboard().setContent(content);
    }

    private void paste(@org.jspecify.annotations.Nullable String text) {
        TablePosition<?, ?> focus = table.getFocusModel().getFocusedCell();
        ChannelField first = fieldOf(focus.getTableColumn());
        if (text == null || first == null || focus.getRow() < 0) {
            return;
        }
        List<ChannelField> fields = visibleFields();
        model.paste(text, table.getItems().subList(focus.getRow(), table.getItems().size()).stream().map(RowModel::id)
                .toList(), fields.subList(fields.indexOf(first), fields.size()));
    }

    private void tellSelection() {
        if (!following) {
            List<Integer> rows = table.getSelectionModel().getSelectedCells().stream().map(each -> each.getRow())
                    .filter(row -> row >= 0 && row < table.getItems().size()).map(row -> table.getItems().get(row).id())
                    .filter(id -> id != RowModel.EMPTY_ROW).distinct().toList();
            if (!rows.isEmpty()) {
                following = true;
                model.session().selectionProperty().set(rows);
                following = false;
            }
        }
    }

    private void followSelection() {
        if (following) {
            return;
        }
        List<Integer> wanted = model.session().selectionProperty().get();
        TableColumn<RowModel, ?> column = table.getVisibleLeafColumns().stream()
                .filter(each -> each.equals(table.getFocusModel().getFocusedCell().getTableColumn())).findFirst()
                .orElse(table.getVisibleLeafColumn(0));
        following = true;
        table.getSelectionModel().clearSelection();
        for (int row = 0; row < table.getItems().size(); row++) {
            if (wanted.contains(table.getItems().get(row).id())) {
                table.getSelectionModel().select(row, column);
            }
        }
        following = false;
    }
}
