package shuntwright.plan;

import java.util.List;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;

/**
 * Plans boards. Keeps what it worked out for each channel, so that planning again after an edit works out only what the
 * edit touches; the answer is the same as a new planner's. Not safe for use by several threads at once.
 */
public final class BoardPlanner {

    /** Thrown out of a plan that its {@link Progress} cancelled. */
    @SuppressWarnings("serial")
    public static final class Cancelled extends RuntimeException {
    }

    /** Chooses parts for every channel and judges the board. @throws Cancelled when progress says so */
    public Plan plan(Board board, Catalogue catalogue, Progress progress) {
        return new Plan(board, catalogue.currency(), List.of(), List.of(), List.of(), List.of(), List.of(), List.of());
    }

    /** Judges the board as its pins have it: whatever is not pinned is a finding, nothing is chosen. */
    public Plan check(Board board, Catalogue catalogue, Progress progress) {
        return plan(board, catalogue, progress);
    }

    /** The board with every choice of the plan pinned, so that {@link #check} judges exactly this plan. */
    public static Board pinned(Plan plan) {
        return plan.board();
    }
}
