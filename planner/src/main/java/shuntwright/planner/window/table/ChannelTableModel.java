package shuntwright.planner.window.table;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import javafx.collections.transformation.FilteredList;

import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.BoardState;
import shuntwright.planner.session.Place;
import shuntwright.planner.session.Planned;

/** The rows of the channel table, kept in step with the session. */
public final class ChannelTableModel {
    /**
     * A cell of the table.
     *
     * @param row   identity of its row
     * @param field its column
     */
    record Spot(int row, ChannelField field) {}

    private final BoardSession session;
    private final RowModel empty = new RowModel(RowModel.EMPTY_ROW);
    private final ObservableList<RowModel> rows = FXCollections.observableArrayList(empty);
    private final FilteredList<RowModel> shown = new FilteredList<>(rows);
    private final StringProperty filter = new SimpleStringProperty("");

    public ChannelTableModel(BoardSession session) {
        this.session = session;
        session.stateProperty().subscribe(this::refresh);
        session.plannedProperty().subscribe(this::refresh);
        refresh();
        filter.subscribe(this::refilter);
    }

    private void refilter() {
        String wanted = filter.get().strip().toLowerCase(Locale.ROOT);
        shown.setPredicate(row -> row.isEmptyRow() || wanted.isEmpty()
                || row.name().toLowerCase(Locale.ROOT).contains(wanted));
    }

    private void refresh() {
        BoardState state = session.state();
        Optional<Planned> planned = session.plannedProperty().get();
        Map<Integer, RowModel> known = new HashMap<>();
        rows.forEach(row -> known.put(row.id(), row));
        List<RowModel> wanted = new ArrayList<>();
        for (int id : state.rows()) {
            RowModel row = known.getOrDefault(id, new RowModel(id));
            row.show(state, planned);
            wanted.add(row);
        }
        wanted.add(empty);
        if (!wanted.equals(rows)) {
            rows.removeIf(row -> !wanted.contains(row));
            for (int at = 0; at < wanted.size(); at++) {
                if (at >= rows.size() || rows.get(at) != wanted.get(at)) {
                    rows.remove(wanted.get(at));
                    rows.add(at, wanted.get(at));
                }
            }
        }
    }

    /** Rows that pass the filter, the empty one last. */
    ObservableList<RowModel> shown() {
        return shown;
    }

    /** Shows only rows whose name contains this. */
    public StringProperty filterProperty() {
        return filter;
    }

    BoardSession session() {
        return session;
    }

    /** Types a text into a cell; into the empty row it adds a channel. */
    void enter(Spot spot, String text) {
        if (spot.row() != RowModel.EMPTY_ROW) {
            session.enter(new Place.Cell(spot.row(), spot.field()), text);
        } else if (!text.isBlank()) {
            filter.set("");
            session.appendChannel(spot.field(), text);
        }
    }

    /** Types one text into several cells, as one edit. */
    void enterAll(List<Spot> spots, String text) {
        List<Spot> channels = spots.stream().filter(spot -> spot.row() != RowModel.EMPTY_ROW).toList();
        if (channels.isEmpty()) {
            return;
        }
        String words = channels.getFirst().field().words();
        session.edit((text.isBlank() ? "clear " : "") + (channels.stream().map(Spot::field).distinct().count() == 1
                ? words
                : "cells") + " of " + channels.stream().map(Spot::row).distinct().count() + " channels", state -> {
                    BoardState next = state;
                    for (Spot spot : channels) {
                        next = next.enter(new Place.Cell(spot.row(), spot.field()), text);
                    }
                    return next;
                });
    }

    /** Clears cells; names stay. */
    void clear(List<Spot> spots) {
        enterAll(spots.stream().filter(spot -> spot.field() != ChannelField.NAME).toList(), "");
    }

    /** Gives up the wrong text of a cell. */
    void revert(Spot spot) {
        session.revert(new Place.Cell(spot.row(), spot.field()));
    }

    /** Cells as a spreadsheet takes them: tabs between columns, a line for each row. */
    String copy(List<Integer> rowIds, List<ChannelField> fields) {
        BoardState state = session.state();
        StringBuilder text = new StringBuilder();
        for (int row : rowIds) {
            text.append(
                    String.join("\t", fields.stream().map(field -> state.text(new Place.Cell(row, field))).toList()))
                    .append('\n');
        }
        return text.toString();
    }

    /**
     * Puts a block copied from a spreadsheet into the table, as one edit. Rows beyond the last become new channels.
     *
     * @param target rows shown from the place of pasting on
     * @param fields columns shown from the place of pasting on
     */
    void paste(String text, List<Integer> target, List<ChannelField> fields) {
        List<String> lines = text.lines().toList();
        if (lines.isEmpty()) {
            return;
        }
        session.edit("paste " + lines.size() + (lines.size() == 1 ? " row" : " rows"), state -> {
            BoardState next = state;
            for (int line = 0; line < lines.size(); line++) {
                List<String> cells = List.of(lines.get(line).split("\t", -1));
                int row = line < target.size() ? target.get(line) : RowModel.EMPTY_ROW;
                if (row == RowModel.EMPTY_ROW) {
                    row = next.nextRow();
                    next = next.add(shuntwright.board.Channel.named(next.freeName("channel")), -1);
                }
                for (int at = 0; at < Math.min(cells.size(), fields.size()); at++) {
                    next = next.enter(new Place.Cell(row, fields.get(at)), cells.get(at).strip());
                }
            }
            return next;
        });
    }
}
