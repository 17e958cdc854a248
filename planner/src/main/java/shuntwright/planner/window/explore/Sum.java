package shuntwright.planner.window.explore;

/**
 * A sum of a board beside that of the board as it is planned.
 *
 * @param title      what it is
 * @param value      of the plan that might be
 * @param difference against the board as it is planned; empty without such a plan
 */
public record Sum(String title, String value, String difference) {}
