package shuntwright.planner.window.budget;

/**
 * One figure about an outcome as a whole.
 *
 * @param title what it is
 * @param value in words
 * @param note  what it means and how sure it is
 */
record Fact(String title, String value, String note) {}
