package shuntwright.accuracy;

/** A measured quantity as a differentiable function of its inputs, y = f(x). */
public interface Equation {

    /** f at x. */
    double value(double[] x);

    /**
     * Writes the partial derivatives of f at x.
     *
     * @param x         point, as long as the equation has inputs
     * @param gradient  as long as {@code x}; overwritten
     * @return f at x
     */
    double gradient(double[] x, double[] gradient);
}
