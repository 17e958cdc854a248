package shuntwright.planner.proof;

/** First words of the lines in which the child answers. Other lines are the solver's own and mean nothing. */
enum Word {
    /** The solver's library is there and the model is built. */
    READY,
    /** No selection has less than the number that follows. */
    BOUND,
    /** A selection: option of each slot. */
    BETTER,
    /** Limits and caps cannot be kept. */
    IMPOSSIBLE,
    /** It could not be done, and why. */
    FAILED,
    /** All has been said. */
    DONE;

    private static final String MARK = "answer ";

    String line(String rest) {
        return MARK + name() + " " + rest;
    }

    /** What follows the word in a line that begins with it; null in any other line. */
    @org.jspecify.annotations.Nullable
    String rest(String line) {
        String start = MARK + name() + " ";
        return line.startsWith(start) ? line.substring(start.length()) : null;
    }
}
