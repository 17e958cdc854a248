package shuntwright.planner.window.table;

import java.util.Optional;

/**
 * What a cell for typing shows.
 *
 * @param text   value or wrong text
 * @param reason why the text could not be taken over; empty when it was
 * @param key    for sorting, before the text
 */
record CellEntry(String text, Optional<String> reason, double key) implements Comparable<CellEntry> {
    static final CellEntry EMPTY = new CellEntry("", Optional.empty(), Double.NaN);

    @Override
    public int compareTo(CellEntry other) {
        int byKey = Double.compare(key, other.key);
        return byKey != 0 ? byKey : text.compareToIgnoreCase(other.text);
    }
}
