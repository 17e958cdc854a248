package shuntwright.choice;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.DesignRules;
import shuntwright.board.Pins;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Range;

/**
 * Chooses the pair of a divider: of all pairs of the series whose total keeps to the source's current and whose parallel
 * resistance keeps to the comparator's bias current, the one that leaves the threshold most room within its window, counted
 * from the trip target: the smaller share of the room above and below it that the threshold's spread leaves.
 */
final class ValueChoice {

    /** Rooms closer than this, as shares of the window, count as equal. */
    private static final double SAME = 1e-9;
    private static final int MOST_TIES = 3;

    private final DividerTables tables;

    ValueChoice(DividerTables tables) {
        this.tables = tables;
    }

    /** The best pairs (equal ones by ascending distance of their total from the middle of what is allowed). */
    List<Threshold.Divider> dividers(Window window, SourceVoltage source, ResistorSeries resistors,
            DesignRules rules, Pins pins) {
        if (pins.dividerTop().isPresent() && pins.dividerBottom().isPresent()) {
            return List.of(new Threshold.Divider(source, pins.dividerTop().getAsDouble(),
                    pins.dividerBottom().getAsDouble(), "", 1));
        }
        DividerTable table = tables.of(resistors);
        int start = table.from(window.target() / source.voltage().nominal());
        Search search = new Search(window, source, resistors, rules, pins, table);
        for (int at = start; at < table.size() && search.mayImproveUp(at); at++) {
            search.look(at);
        }
        for (int at = start - 1; at >= 0 && search.mayImproveDown(at); at--) {
            search.look(at);
        }
        return search.best();
    }

    /** The single pair on a table nearest to a wanted voltage, for taps; empty when the table is empty. */
    Optional<Threshold.Divider> nearest(SourceVoltage source, double voltage, ResistorSeries resistors,
            DesignRules rules, String tap, int users, OptionalDouble top, OptionalDouble bottom) {
        if (top.isPresent() && bottom.isPresent()) {
            return Optional.of(
                    new Threshold.Divider(source, top.getAsDouble(), bottom.getAsDouble(), tap, users));
        }
        DividerTable table = tables.of(resistors);
        double ratio = voltage / source.voltage().nominal();
        double least = source.voltage().max() / rules.dividerCurrent();
        int start = table.from(ratio);
        int best = -1;
        for (int direction = -1; direction <= 1; direction += 2) {
            for (int at = direction < 0 ? start - 1 : start; at >= 0 && at < table.size(); at += direction) {
                boolean fits = table.top(at) + table.bottom(at) >= least
                        && (top.isEmpty() || top.getAsDouble() == table.top(at))
                        && (bottom.isEmpty() || bottom.getAsDouble() == table.bottom(at));
                if (fits) {
                    best = best < 0 || Math.abs(table.ratio(at) - ratio) < Math.abs(table.ratio(best) - ratio)
                            ? at
                            : best;
                    break;
                }
            }
        }
        return best < 0
                ? Optional.empty()
                : Optional.of(new Threshold.Divider(source, table.top(best), table.bottom(best), tap, users));
    }

    /** One search outwards from the wanted ratio. */
    private static final class Search {
        private final Window window;
        private final SourceVoltage source;
        private final ResistorSeries resistors;
        private final DividerTable table;
        private final Pins pins;
        private final double leastTotal;
        private final double biasShare;
        private final Range bias;
        private double bestRoom = Double.NEGATIVE_INFINITY;
        private final List<Integer> best = new ArrayList<>();

        Search(Window window, SourceVoltage source, ResistorSeries resistors, DesignRules rules, Pins pins,
                DividerTable table) {
            this.window = window;
            this.source = source;
            this.resistors = resistors;
            this.table = table;
            this.pins = pins;
            this.leastTotal = source.voltage().max() / rules.dividerCurrent();
            this.biasShare = rules.biasShare();
            this.bias = window.comparator.inputs().biasCurrent();
        }

        boolean mayImproveUp(int at) {
            double room = Double.POSITIVE_INFINITY;
            for (int end = 0; end < 2; end++) {
                double highest = window.highest(source, resistors, table.ratio(at), end);
                room = Math.min(room, window.roomAbove(highest - biasHelp(at), end));
            }
            return room >= bestRoom - SAME;
        }

        boolean mayImproveDown(int at) {
            double room = Double.POSITIVE_INFINITY;
            for (int end = 0; end < 2; end++) {
                double lowest = window.lowest(source, resistors, table.ratio(at), end);
                room = Math.min(room, window.roomBelow(lowest + biasHelp(at), end));
            }
            return room >= bestRoom - SAME;
        }

        /** The most by which a bias current within its allowed share can shift the threshold, V. */
        private double biasHelp(int at) {
            return biasShare * table.ratio(at) * source.voltage().nominal();
        }

        void look(int at) {
            double top = table.top(at);
            double bottom = table.bottom(at);
            if (top + bottom < leastTotal || (pins.dividerTop().isPresent() && pins.dividerTop().getAsDouble() != top)
                    || (pins.dividerBottom().isPresent() && pins.dividerBottom().getAsDouble() != bottom)) {
                return;
            }
            double parallel = top * bottom / (top + bottom);
            double shift = parallel * Math.max(Math.abs(bias.min()), Math.abs(bias.max()));
            double k = table.ratio(at);
            if (shift > biasShare * k * source.voltage().nominal()) {
                return;
            }
            double room = Double.POSITIVE_INFINITY;
            for (int end = 0; end < 2; end++) {
                double least = window.lowest(source, resistors, k, end) - bias.max() * parallel;
                double most = window.highest(source, resistors, k, end) - bias.min() * parallel;
                room = Math.min(room, Math.min(window.roomAbove(most, end), window.roomBelow(least, end)));
            }
            if (room > bestRoom + SAME) {
                bestRoom = room;
                best.clear();
                best.add(at);
            } else if (room >= bestRoom - SAME) {
                best.add(at);
            }
        }

        List<Threshold.Divider> best() {
            double middle = Math.log(leastTotal * DividerTable.TOTAL.max()) / 2;
            best.sort(java.util.Comparator
                    .comparingDouble((Integer at) -> Math.abs(Math.log(table.top(at) + table.bottom(at)) - middle))
                    .thenComparingDouble(table::top));
            return best.stream().limit(MOST_TIES)
                    .map(at -> new Threshold.Divider(source, table.top(at), table.bottom(at), "", 1)).toList();
        }
    }
}
