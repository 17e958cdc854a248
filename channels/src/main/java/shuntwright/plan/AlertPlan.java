package shuntwright.plan;

import java.util.List;
import java.util.Optional;

import shuntwright.board.AlertLine;
import shuntwright.quantity.Range;

/**
 * An alert line with its pull-up.
 *
 * @param line     as on the board
 * @param channels that pull it
 * @param pullUp   chosen or given, Ω
 * @param allowed  pull-up resistances that satisfy levels, sink current and rise time, Ω; empty when there is none
 * @param least    smallest that the sink current and low level allow, Ω
 * @param most     largest that the high level and rise time allow, Ω
 * @param current  largest current through it while pulled low, A
 */
public record AlertPlan(AlertLine line, List<String> channels, double pullUp, Optional<Range> allowed, double least,
        double most, double current) {
    public AlertPlan {
        channels = List.copyOf(channels);
    }
}
