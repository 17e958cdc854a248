package shuntwright.sampling;

/** Fills columns with draws. */
public final class Draws {

    /** Trials of one block. */
    public static final int BLOCK = 1024;

    private Draws() {
    }
}
