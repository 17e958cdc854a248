package shuntwright.planner.command;

import java.util.function.Supplier;

import shuntwright.plan.BoardPlanner;
import shuntwright.planner.work.Explorer;
import shuntwright.planner.work.Planning;

/**
 * What plans boards and answers questions about them.
 *
 * @param plans    boards
 * @param explorer of what might be
 */
record Solver(Planning.Planner plans, Explorer explorer) {

    /** The program's own, new each time. */
    static final Supplier<Solver> OWN = () -> {
        BoardPlanner planner = planner();
        return new Solver(planner::plan, Explorer.of(planner));
    };

    /** The planner that every command uses. */
    static BoardPlanner planner() {
        return new BoardPlanner();
    }
}
