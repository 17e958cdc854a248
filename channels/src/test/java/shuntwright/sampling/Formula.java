package shuntwright.sampling;

import java.util.List;
import java.util.function.ToDoubleFunction;

import shuntwright.quantity.Range;

/**
 * A model written as formulas of one trial's inputs.
 *
 * @param inputs      how many
 * @param formulas    one for each output
 * @param multiplying inputs that multiply others
 */
record Formula(int inputs, List<ToDoubleFunction<double[]>> formulas, List<Integer> multiplying) implements Model {

    /** Anything: a range that no trial leaves. */
    static final Range ANYTHING = Range.of(-1e300, 1e300);

    static Formula of(int inputs, ToDoubleFunction<double[]> formula) {
        return new Formula(inputs, List.of(formula), List.of());
    }

    /** All inputs added. */
    static Formula sum(int inputs) {
        return of(inputs, x -> {
            double sum = 0;
            for (double each : x) {
                sum += each;
            }
            return sum;
        });
    }

    @Override
    public int outputs() {
        return formulas.size();
    }

    @Override
    public void evaluate(double[][] x, int count, double[][] y, Scratch scratch) {
        double[] point = new double[inputs];
        for (int j = 0; j < count; j++) {
            for (int i = 0; i < inputs; i++) {
                point[i] = x[i][j];
            }
            for (int o = 0; o < y.length; o++) {
                y[o][j] = formulas.get(o).applyAsDouble(point);
            }
        }
    }
}
