package shuntwright.planner.window.table;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;

import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

import org.jspecify.annotations.Nullable;

import shuntwright.board.Channel;
import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.session.BoardState;
import shuntwright.planner.session.Place;
import shuntwright.planner.session.Planned;
import shuntwright.planner.session.WrongEntry;

/** One row of the channel table: a channel, or the empty last row that adds one. */
final class RowModel {
    /** Identity of the empty last row. */
    static final int EMPTY_ROW = -1;

    private final int id;
    private final Map<ChannelField, ReadOnlyObjectWrapper<CellEntry>> entries = new EnumMap<>(ChannelField.class);
    private final ReadOnlyObjectWrapper<RowFigures> figures = new ReadOnlyObjectWrapper<>(RowFigures.NONE);

    private @Nullable Channel shownChannel;
    private Map<Place, WrongEntry> shownWrong = Map.of();

    RowModel(int id) {
        this.id = id;
        for (ChannelField field : ChannelField.values()) {
            entries.put(field, new ReadOnlyObjectWrapper<>(CellEntry.EMPTY));
        }
    }

    int id() {
        return id;
    }

    boolean isEmptyRow() {
        return id == EMPTY_ROW;
    }

    String name() {
        return entryProperty(ChannelField.NAME).get().text();
    }

    ReadOnlyObjectProperty<CellEntry> entryProperty(ChannelField field) {
        return wrapper(field).getReadOnlyProperty();
    }

    private ReadOnlyObjectWrapper<CellEntry> wrapper(ChannelField field) {
        ReadOnlyObjectWrapper<CellEntry> found = entries.get(field);
        if (found == null) {
            throw new IllegalStateException("every field has an entry, but not " + field);
        }
        return found;
    }

    ReadOnlyObjectProperty<RowFigures> figuresProperty() {
        return figures.getReadOnlyProperty();
    }

    /** Takes over what the state and the latest plan say of this row. */
    void show(BoardState state, Optional<Planned> planned) {
        Optional<Channel> channel = state.channel(id);
        if (channel.isEmpty()) {
            return;
        }
        showEntries(state, channel.get());
        boolean wrong = entries.values().stream().anyMatch(entry -> entry.get().reason().isPresent());
        change(figures, planned.flatMap(plan -> plan.channel(id))
                .map(plan -> RowFigures.of(plan, wrong || !plan.channel().equals(channel.get())))
                .orElse(RowFigures.NONE));
    }

    /** Writing all texts of all rows anew at each edit would be felt on a large board. */
    private void showEntries(BoardState state, Channel channel) {
        if (channel.equals(shownChannel) && state.wrong().equals(shownWrong)) {
            return;
        }
        shownChannel = channel;
        shownWrong = state.wrong();
        for (ChannelField field : ChannelField.values()) {
            Place.Cell place = new Place.Cell(id, field);
            change(wrapper(field), new CellEntry(state.text(place), state.wrong(place).map(WrongEntry::reason),
                    field.key(channel)));
        }
    }

    /** Leaves equal values alone, so that only cells that change are drawn again. */
    private static <T> void change(ReadOnlyObjectWrapper<T> property, T value) {
        if (!value.equals(property.get())) {
            property.set(value);
        }
    }
}
