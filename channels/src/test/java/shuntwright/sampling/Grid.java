package shuntwright.sampling;

import java.util.function.DoubleUnaryOperator;

import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;

/** Expectations by Gauss-Legendre quadrature, for what trials are compared with. */
final class Grid {

    private static final int POINTS = 24;
    /** Remembers the points, which take long to find. */
    private static final GaussIntegratorFactory FACTORY = new GaussIntegratorFactory();

    private Grid() {
    }

    /** Mean of a smooth function over an interval. */
    static double mean(double from, double to, DoubleUnaryOperator function) {
        GaussIntegrator integrator = FACTORY.legendre(POINTS, from, to);
        return integrator.integrate(function::applyAsDouble) / (to - from);
    }

    /** The same of a function that is smooth in pieces, over that many. */
    static double mean(double from, double to, int pieces, DoubleUnaryOperator function) {
        double sum = 0;
        double width = (to - from) / pieces;
        for (int i = 0; i < pieces; i++) {
            sum += mean(from + i * width, from + (i + 1) * width, function);
        }
        return sum / pieces;
    }
}
