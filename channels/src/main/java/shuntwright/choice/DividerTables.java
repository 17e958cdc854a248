package shuntwright.choice;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

/**
 * The divider tables of the resistor values met so far; each is built once, whatever the tolerance of the series that is
 * sold in those values. Safe for use by several threads.
 */
public final class DividerTables {

    private final Map<Values, DividerTable> tables = new ConcurrentHashMap<>();

    private record Values(ESeries series, Range values) {}

    DividerTable of(ResistorSeries series) {
        return tables.computeIfAbsent(new Values(series.series(), series.values()),
                key -> DividerTable.of(key.series(), key.values()));
    }
}
