package shuntwright.plan;

/** Told of long work, and asked whether to go on. */
public interface Progress {

    /** Hears nothing, never stops. */
    Progress SILENT = new Progress() {
        @Override
        public void reached(String stage, int done, int total) {
        }

        @Override
        public boolean cancelled() {
            return false;
        }
    };

    /**
     * Called from the working thread.
     *
     * @param stage what is being done, in words
     * @param done  steps done
     * @param total steps in all
     */
    void reached(String stage, int done, int total);

    /**
     * A better choice for the board was found while it is still looked for. Called from the working thread.
     *
     * @param best what it reaches so far
     */
    default void better(BoardChoice best) {
    }

    /**
     * Reading of a clock, s, from any start: what a time limit of the search is measured with. The domain has no clock of its own; without
     * one a time limit never cuts in.
     */
    default double seconds() {
        return 0;
    }

    /** True when the search for a better choice should end with the best it has; the plan is finished with that. */
    default boolean enough() {
        return false;
    }

    /** True when the work should stop at the next step. */
    boolean cancelled();
}
