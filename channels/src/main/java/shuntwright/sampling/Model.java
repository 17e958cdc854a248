package shuntwright.sampling;

import java.util.List;

/** Quantities as functions of inputs, evaluated for many trials at once; safe for several threads. */
public interface Model {

    /** How many inputs, that is columns of x. */
    int inputs();

    /** How many quantities, that is columns of y. */
    int outputs();

    /**
     * Evaluates the first {@code count} trials.
     *
     * @param x     one column for each input, by trial; not written to
     * @param count trials, at most {@link Draws#BLOCK}
     * @param y     one column for each output, overwritten; infinite where a trial has no value
     * @param scratch for this thread's use between calls
     */
    void evaluate(double[][] x, int count, double[][] y, Scratch scratch);

    /** Inputs that multiply others with wide effect, as a temperature multiplies drifts: rare events have a way out at each end. */
    default List<Integer> multiplying() {
        return List.of();
    }
}
