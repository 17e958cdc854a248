package shuntwright.planner.window.shared;

import java.util.List;
import java.util.OptionalDouble;

import shuntwright.planner.entry.BoardField;

/**
 * One shared thing.
 *
 * @param title  what it is
 * @param value  used and limit, in words
 * @param share  used of the limit, 0 and more; empty without a limit
 * @param holds  whether the limit is kept
 * @param fields what its editor offers
 */
record SharedTile(String title, String value, OptionalDouble share, boolean holds, List<BoardField> fields) {
    SharedTile {
        fields = List.copyOf(fields);
    }

    /** Everything in words. */
    String words() {
        return title + ": " + value + (holds ? "" : ", over its limit");
    }
}
