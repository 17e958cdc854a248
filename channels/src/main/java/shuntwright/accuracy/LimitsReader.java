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

    /** The lowest and the highest corner. */
    List<Corner> extremes() {
        while (true) {
            Corner[] found = bothEnds();
            List<Input> turning = new ArrayList<>();
            turning(found[0], turning);
            turning(found[1], turning);
            if (turning.isEmpty() || enumerated.size() >= MOST_ENUMERATED) {
                return List.of(found);
            }
            for (Input input : turning) {
                if (monotone.remove(input)) {
                    enumerated.add(List.of(input));
                }
            }
        }
    }

    private Corner[] bothEnds() {
        double[] gradient = new double[nominal.length];
        double[] x = nominal.clone();
        double[] lowest = nominal;
        double[] highest = nominal;
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int scenario = 0; scenario < 1 << enumerated.size(); scenario++) {
            for (Input input : monotone) {
                int at = Layout.index(input);
                x[at] = nominal[at];
            }
            for (int group = 0; group < enumerated.size(); group++) {
                boolean upper = (scenario >> group & 1) == 1;
                for (Input input : enumerated.get(group)) {
                    x[Layout.index(input)] = upper ? input.limits().max() : input.limits().min();
                }
            }
            equation.gradient(x, gradient);
            corner(x, gradient, false);
            double down = equation.value(x);
            if (down < low || scenario == 0) {
                low = down;
                lowest = x.clone();
            }
            corner(x, gradient, true);
            double up = equation.value(x);
            if (up > high || scenario == 0) {
                high = up;
                highest = x.clone();
            }
        }
        return new Corner[]{new Corner(lowest, low), new Corner(highest, high)};
    }

    /** Moves the monotone inputs to the corner that the signs pick. */
    private void corner(double[] x, double[] gradient, boolean highest) {
        for (Input input : monotone) {
            int at = Layout.index(input);
            x[at] = gradient[at] > 0 == highest ? input.limits().max() : input.limits().min();
        }
    }

    /** Adds the inputs whose derivative has another sign at the corner than the one that led there. */
    private void turning(Corner corner, List<Input> turning) {
        double[] gradient = new double[nominal.length];
        equation.gradient(corner.x, gradient);
        double[] middle = corner.x.clone();
        for (Input input : monotone) {
            int at = Layout.index(input);
            middle[at] = nominal[at];
        }
        double[] led = new double[nominal.length];
        equation.gradient(middle, led);
        for (Input input : monotone) {
            int at = Layout.index(input);
            if (gradient[at] * led[at] < 0 && !turning.contains(input)) {
                turning.add(input);
            }
        }
    }
}
