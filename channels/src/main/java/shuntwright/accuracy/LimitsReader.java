package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;

/**
 * Exact extremes of an equation over the box of its inputs.
 *
 * <p>Ambient, supply, rail and the shunts' temperature coefficients multiply other inputs, so both their ends are
 * enumerated. With those fixed the equation is monotone in each remaining input, and its extreme is at the corner that
 * the signs of the partial derivatives pick. Should a sign differ between the middle of the box and that corner, the
 * input concerned is enumerated too.
 */
final class LimitsReader {

    private static final Set<Slot> ALWAYS = EnumSet.of(Slot.AMBIENT, Slot.SUPPLY, Slot.RAIL, Slot.SHUNT_DRIFT);
    private static final int MOST_ENUMERATED = 12;

    private final Equation equation;
    private final double[] nominal;
    private final List<Input> monotone = new ArrayList<>();
    private final List<List<Input>> enumerated = new ArrayList<>();

    LimitsReader(Equation equation, InputDescription description) {
        this.equation = equation;
        this.nominal = description.nominal();
        List<Input> drifts = new ArrayList<>();
        for (Input input : description.inputs()) {
            if (input.slot() == Slot.SHUNT_DRIFT) {
                drifts.add(input);
            } else if (ALWAYS.contains(input.slot())) {
                enumerated.add(List.of(input));
            } else {
                monotone.add(input);
            }
        }
        if (!drifts.isEmpty()) {
            // Equal parts at one temperature: all coefficients act in the same direction.
            enumerated.add(List.copyOf(drifts));
        }
    }

    /** A corner of the box and the equation's value there. */
    static final class Corner {
        private final double[] x;
        private final double value;

        private Corner(double[] x, double value) {
            this.x = x;
            this.value = value;
        }

        /** The inputs; a copy. */
        double[] x() {
            return x.clone();
        }

        double value() {
            return value;
        }
    }

    Corner lowest() {
        return extreme(false);
    }

    Corner highest() {
        return extreme(true);
    }

    private Corner extreme(boolean highest) {
        while (true) {
            List<Input> turning = new ArrayList<>();
            Corner best = best(highest, turning);
            if (turning.isEmpty() || enumerated.size() >= MOST_ENUMERATED) {
                return best;
            }
            for (Input input : turning) {
                monotone.remove(input);
                enumerated.add(List.of(input));
            }
        }
    }

    private Corner best(boolean highest, List<Input> turning) {
        double[] gradient = new double[nominal.length];
        double[] atCorner = new double[nominal.length];
        double bestValue = highest ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
        double[] best = nominal;
        boolean found = false;
        for (int scenario = 0; scenario < 1 << enumerated.size(); scenario++) {
            double[] x = nominal.clone();
            for (int group = 0; group < enumerated.size(); group++) {
                boolean upper = (scenario >> group & 1) == 1;
                for (Input input : enumerated.get(group)) {
                    x[Layout.index(input)] = upper ? input.limits().max() : input.limits().min();
                }
            }
            equation.gradient(x, gradient);
            for (Input input : monotone) {
                int at = Layout.index(input);
                x[at] = gradient[at] > 0 == highest ? input.limits().max() : input.limits().min();
            }
            double value = equation.gradient(x, atCorner);
            boolean better = highest ? value > bestValue : value < bestValue;
            if (better || !found) {
                found = true;
                bestValue = value;
                best = x;
                turning.clear();
                for (Input input : monotone) {
                    int at = Layout.index(input);
                    if (gradient[at] * atCorner[at] < 0) {
                        turning.add(input);
                    }
                }
            }
        }
        return new Corner(best, bestValue);
    }
}
