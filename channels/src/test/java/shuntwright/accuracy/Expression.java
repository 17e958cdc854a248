package shuntwright.accuracy;

import java.util.function.Function;

import org.hipparchus.analysis.differentiation.Gradient;

/**
 * An equation written out, differentiated by a library.
 *
 * @param formula of the inputs in order
 */
public record Expression(Function<Gradient[], Gradient> formula) implements Equation {

    @Override
    public double value(double[] x) {
        return of(x).getValue();
    }

    @Override
    public double gradient(double[] x, double[] gradient) {
        Gradient result = of(x);
        System.arraycopy(result.getGradient(), 0, gradient, 0, x.length);
        return result.getValue();
    }

    private Gradient of(double[] x) {
        Gradient[] inputs = new Gradient[x.length];
        for (int i = 0; i < x.length; i++) {
            inputs[i] = Gradient.variable(x.length, i, x[i]);
        }
        return formula.apply(inputs);
    }
}
