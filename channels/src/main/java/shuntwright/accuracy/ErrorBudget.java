package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * What each input contributes. To the limits: what the corner loses when this input alone returns to nominal; for
 * temperatures, supply and rail, which multiply other inputs, what the outcome gains when this input alone leaves nominal.
 * Nothing where the corner has no current: a shunt that runs away does so by all of them together.
 */
final class ErrorBudget {

    private ErrorBudget() {
    }

    static List<BudgetLine> lines(Equation equation, InputDescription description, LimitsReader.Corner low,
            LimitsReader.Corner high, Propagation propagation) {
        double[] nominal = description.nominal();
        double middle = equation.value(nominal);
        double variance = finite(propagation.standard() * propagation.standard());
        List<BudgetLine> lines = new ArrayList<>();
        for (Input input : description.inputs()) {
            int at = Layout.index(input);
            double part = finite(propagation.variancePart(at));
            double towardsLow = contribution(equation, input, low, nominal, middle);
            double towardsHigh = contribution(equation, input, high, nominal, middle);
            if (towardsLow == 0 && towardsHigh == 0 && part == 0) {
                continue;
            }
            lines.add(new BudgetLine(input, finite(propagation.sensitivity(at)), towardsLow, towardsHigh,
                    Math.sqrt(Math.max(0, part)), variance > 0 ? part / variance : 0));
        }
        lines.sort(Comparator.comparingDouble(BudgetLine::widest).reversed());
        return lines;
    }

    private static double contribution(Equation equation, Input input, LimitsReader.Corner corner, double[] nominal,
            double middle) {
        int at = Layout.index(input);
        if (input.slot().multiplies()) {
            double[] x = nominal.clone();
            x[at] = corner.x()[at];
            return finite(equation.value(x) - middle);
        }
        double[] x = corner.x();
        x[at] = nominal[at];
        return finite(corner.value() - equation.value(x));
    }

    private static double finite(double value) {
        return Double.isFinite(value) ? value : 0;
    }
}
