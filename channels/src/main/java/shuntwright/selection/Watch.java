package shuntwright.selection;

/** Looks on while a selection is searched, and may end it. Called from the searching thread. */
public interface Watch {

    /** Never ends it. */
    Watch NONE = new Watch() {
        @Override
        public boolean ended() {
            return false;
        }
    };

    /** True when the search should end with the best it has. */
    boolean ended();

    /** The best so far has become better. */
    default void better(Answer best) {
    }
}
