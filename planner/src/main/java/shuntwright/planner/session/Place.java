package shuntwright.planner.session;

import shuntwright.planner.entry.BoardField;
import shuntwright.planner.entry.ChannelField;

/** Where something can be typed. */
public sealed interface Place {
    /** @param row identity of the channel's row */
    record Cell(int row, ChannelField field) implements Place {}

    /** @param field of the board as a whole */
    record OfBoard(BoardField field) implements Place {}
}
