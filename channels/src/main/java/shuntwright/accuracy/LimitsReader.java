package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import shuntwright.quantity.Range;

/**
 * Exact extremes of an equation over the box of its inputs.
 *
 * <p>Ambient, supply, rail and the shunts' temperature coefficients multiply other inputs, so both their ends are
 * enumerated. With those fixed the equation is monotone in each remaining input, and its extreme is at the corner that
 * the signs of the partial derivatives pick. Should a derivative at that corner point the other way than the one in the
 * middle of the box, where it may also be 0, the input concerned is turned over, and enumerated too. This happens where
 * a bias current may flow either way, and to readings so small that errors outweigh them.
 *
 * <p>Where drifts and the copper of the joints nearly cancel, the extreme may lie between the ends of the ambient range,
 * beyond them by some millionths; the derivative by the temperature then points inward and is followed to its zero.
 */
final class LimitsReader {

    private static final Set<Slot> ALWAYS = EnumSet.of(Slot.AMBIENT, Slot.SUPPLY, Slot.RAIL, Slot.SHUNT_DRIFT);
    private static final int MOST_ENUMERATED = 12;
    private static final int MOST_PASSES = 8;
    /** Halvings of the ambient range that leave less than a nanokelvin of it. */
    private static final int HALVINGS = 40;

    private final Equation equation;
    private final double[] nominal;
    private final Optional<Range> ambient;
    private final List<Input> monotone = new ArrayList<>();
    private final List<List<Input>> enumerated = new ArrayList<>();

    LimitsReader(Equation equation, InputDescription description) {
        this.equation = equation;
        this.nominal = description.nominal();
        this.ambient = description.inputs().stream().filter(input -> input.slot() == Slot.AMBIENT).map(Input::limits)
                .findFirst();
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
            if (turning.isEmpty() || enumerated.size() + turning.size() > MOST_ENUMERATED) {
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
            List<Input> turned = new ArrayList<>();
            double value = improve(x, gradient, highest, turned);
            if (ambient.isPresent() && inward(ambient.get(), x, gradient, highest)) {
                value = within(ambient.get(), x, gradient, highest);
            }
            boolean better = highest ? value > bestValue : value < bestValue;
            if (better || !found) {
                found = true;
                bestValue = value;
                best = x;
                turning.clear();
                turning.addAll(turned);
            }
        }
        return new Corner(best, bestValue);
    }

    /** True when moving the ambient temperature away from its end makes the value more extreme. */
    private static boolean inward(Range ambient, double[] x, double[] gradient, boolean highest) {
        double slope = gradient[Slot.AMBIENT.place()];
        boolean rising = slope > 0 == highest;
        return slope != 0 && (x[Slot.AMBIENT.place()] == ambient.min() ? rising : !rising);
    }

    /** Moves the ambient temperature to where the derivative by it changes sign, if there is such a place. */
    private double within(Range ambient, double[] x, double[] gradient, boolean highest) {
        int at = Slot.AMBIENT.place();
        double end = x[at];
        double value = equation.value(x);
        double near = end;
        double far = end == ambient.min() ? ambient.max() : ambient.min();
        boolean rising = gradient[at] > 0;
        double[] inner = x.clone();
        for (int step = 0; step < HALVINGS; step++) {
            inner[at] = (near + far) / 2;
            equation.gradient(inner, gradient);
            if (gradient[at] > 0 == rising) {
                near = inner[at];
            } else {
                far = inner[at];
            }
        }
        double found = improve(inner, gradient, highest, new ArrayList<>());
        if (!(highest ? found > value : found < value)) {
            return value;
        }
        System.arraycopy(inner, 0, x, 0, x.length);
        return found;
    }

    /** Turns inputs over whose derivative at the corner points the other way, while that helps. */
    private double improve(double[] x, double[] gradient, boolean highest, List<Input> turned) {
        double value = equation.gradient(x, gradient);
        for (int pass = 0; pass < MOST_PASSES; pass++) {
            double[] next = x.clone();
            boolean changed = false;
            for (Input input : monotone) {
                int at = Layout.index(input);
                double end = gradient[at] > 0 == highest ? input.limits().max() : input.limits().min();
                if (gradient[at] != 0 && x[at] != end) {
                    next[at] = end;
                    changed = true;
                    if (!turned.contains(input)) {
                        turned.add(input);
                    }
                }
            }
            if (!changed) {
                break;
            }
            double improved = equation.gradient(next, gradient);
            if (!(highest ? improved > value : improved < value)) {
                equation.gradient(x, gradient);
                break;
            }
            value = improved;
            System.arraycopy(next, 0, x, 0, x.length);
        }
        return value;
    }
}
