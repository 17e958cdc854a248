package shuntwright.sampling;

/** Looks on while trials run; called by several threads. */
public interface Watch {

    /** Nobody looks on. */
    Watch NONE = new Watch() {
        @Override
        public boolean cancelled() {
            return false;
        }

        @Override
        public void done(long trials) {
        }
    };

    /** True to end it. */
    boolean cancelled();

    /** So many further trials of one channel are done. */
    void done(long trials);
}
