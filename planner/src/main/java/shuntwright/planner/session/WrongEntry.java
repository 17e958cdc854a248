package shuntwright.planner.session;

/**
 * A text that could not be taken over, kept as typed.
 *
 * @param text   as typed
 * @param reason why not, and what to do
 */
public record WrongEntry(String text, String reason) {}
