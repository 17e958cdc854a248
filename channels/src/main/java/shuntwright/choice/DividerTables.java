package shuntwright.choice;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

import shuntwright.parts.ResistorSeries;

/** The divider tables of the resistor series met so far; each is built once. */
public final class DividerTables {

    private final Map<ResistorSeries, DividerTable> tables = new ConcurrentHashMap<>();

    DividerTable of(ResistorSeries series) {
        return tables.computeIfAbsent(series, DividerTable::of);
    }
}
