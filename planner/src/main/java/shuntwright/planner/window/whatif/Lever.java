package shuntwright.planner.window.whatif;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import shuntwright.board.Board;
import shuntwright.board.Zone;
import shuntwright.plan.Plan;
import shuntwright.plan.SharedUse;
import shuntwright.plan.WhatIf;
import shuntwright.planner.window.chart.Unit;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/**
 * Something that can be varied.
 *
 * @param varied which
 * @param zone   name; empty unless a zone's heat limit
 */
record Lever(WhatIf.Varied varied, String zone) {
    /** Most boards built at once. */
    static final int MOST_BOARDS = 10_000_000;

    /** Everything that can be varied on a board. */
    static List<Lever> of(Board board) {
        List<Lever> levers = new ArrayList<>();
        levers.add(new Lever(WhatIf.Varied.BOARD_HEAT_LIMIT, ""));
        board.zones().forEach(each -> levers.add(new Lever(WhatIf.Varied.ZONE_HEAT_LIMIT, each.name())));
        levers.add(new Lever(WhatIf.Varied.SUPPLY_CURRENT, ""));
        levers.add(new Lever(WhatIf.Varied.BUILD_QUANTITY, ""));
        return levers;
    }

    String words() {
        return switch (varied) {
            case BOARD_HEAT_LIMIT -> "Heat limit of the board";
            case ZONE_HEAT_LIMIT -> "Heat limit of zone " + zone;
            case SUPPLY_CURRENT -> "Current available from the supply";
            case BUILD_QUANTITY -> "Boards built at once";
        };
    }

    boolean counts() {
        return varied == WhatIf.Varied.BUILD_QUANTITY;
    }

    private Dimension dimension() {
        return varied == WhatIf.Varied.SUPPLY_CURRENT ? Dimension.CURRENT : Dimension.POWER;
    }

    Unit unit(double largest) {
        return counts() ? Unit.count(words()) : Unit.of(words(), dimension().unit(), largest);
    }

    /** The board's own value; empty where it sets no limit. */
    OptionalDouble now(Board board) {
        return switch (varied) {
            case BOARD_HEAT_LIMIT -> board.heatLimit();
            case ZONE_HEAT_LIMIT -> board.zone(zone).map(Zone::heatLimit).orElse(OptionalDouble.empty());
            case SUPPLY_CURRENT -> OptionalDouble.of(board.supply().availableCurrent());
            case BUILD_QUANTITY -> OptionalDouble.of(board.buildQuantity());
        };
    }

    /** What the plan uses of it; empty for the build quantity. */
    OptionalDouble used(Plan plan) {
        SharedUse.Kind kind = switch (varied) {
            case BOARD_HEAT_LIMIT -> SharedUse.Kind.BOARD_HEAT;
            case ZONE_HEAT_LIMIT -> SharedUse.Kind.ZONE_HEAT;
            case SUPPLY_CURRENT -> SharedUse.Kind.SUPPLY;
            case BUILD_QUANTITY -> SharedUse.Kind.ZONE_RISE;
        };
        return counts()
                ? OptionalDouble.empty()
                : plan.shared().stream().filter(each -> each.kind() == kind)
                        .filter(each -> zone.isEmpty() || each.name().equals("zone " + zone))
                        .mapToDouble(SharedUse::used).findFirst();
    }

    Reading<Double> read(String text) {
        if (counts()) {
            try {
                int count = Integer.parseInt(text.strip());
                if (count >= 1 && count <= MOST_BOARDS) {
                    return Reading.value((double) count);
                }
            } catch (NumberFormatException _) {
                // told below with the allowed range
            }
            return Reading.misread("Type a whole number from 1 to " + MOST_BOARDS + ", got \"" + text.strip() + "\".");
        }
        return QuantityReader.number(text, dimension()).then(value -> value > 0 && Double.isFinite(value)
                ? Reading.value(value)
                : Reading.misread("Type a " + dimension().word() + " above 0 " + dimension().unit() + ", got "
                        + QuantityWriter.show(value, dimension()) + "."));
    }

    String show(double value) {
        return counts() ? Long.toString(Math.round(value)) : QuantityWriter.show(value, dimension(), 3);
    }

    /** Values from one to another, evenly spaced; numbers of boards in equal ratios. */
    List<Double> values(double from, double to, int count) {
        List<Double> values = new ArrayList<>();
        for (int at = 0; at < count; at++) {
            double share = count == 1 ? 0 : (double) at / (count - 1);
            double value = at == count - 1
                    ? to
                    : counts() ? Math.rint(from * Math.pow(to / from, share)) : from + (to - from) * share;
            if (values.isEmpty() || value > values.getLast()) {
                values.add(value);
            }
        }
        return values;
    }
}
