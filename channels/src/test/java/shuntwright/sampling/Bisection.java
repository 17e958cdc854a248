package shuntwright.sampling;

import java.util.function.DoubleUnaryOperator;

/** The zero of a rising function. */
final class Bisection {

    private Bisection() {
    }

    static double root(DoubleUnaryOperator rising, double low, double high) {
        double from = low;
        double to = high;
        for (int i = 0; i < 100; i++) {
            double middle = from + (to - from) / 2;
            if (rising.applyAsDouble(middle) < 0) {
                from = middle;
            } else {
                to = middle;
            }
        }
        return from + (to - from) / 2;
    }
}
