package shuntwright.planner.session;

import java.time.Duration;
import java.util.Optional;

import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;

/**
 * The latest good plan and what it was made of.
 *
 * @param plan what came of planning
 * @param of   the state it was made of
 * @param took how long planning it took on the wall clock
 */
public record Planned(Plan plan, BoardState of, Duration took) {
    /** The plan of a row's channel as it was then. */
    public Optional<ChannelPlan> channel(int row) {
        int at = of.rows().indexOf(row);
        return at < 0 || at >= plan.channels().size() ? Optional.empty() : Optional.of(plan.channels().get(at));
    }

    /** True when it is the plan of exactly this board. */
    public boolean isOf(BoardState state) {
        return of.board().equals(state.board());
    }
}
