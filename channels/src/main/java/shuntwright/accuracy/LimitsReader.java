package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

import shuntwright.quantity.Range;

/**
 * Exact extremes of an equation over the box of its inputs.
 *
 * <p>Temperatures, supply, rail and the shunts' temperature coefficients multiply other inputs, so both their ends are
 * enumerated. With those fixed the equation is monotone in each remaining input, and its extreme is at the corner that
 * the signs of the partial derivatives pick. Should a derivative at that corner point the other way than the one in the
 * middle of the box, where it may also be 0, the input concerned is turned over, and enumerated too if that does not
 * settle. This happens where a bias current may flow either way, and to readings so small that errors outweigh them.
 *
 * <p>Where drifts and the copper of the joints nearly cancel, the extreme may lie between the ends of the ambient range,
 * beyond them by some millionths; the derivative by the temperature then points inward and is followed to its zero.
 */
final class LimitsReader {

    private static final Set<Slot> ALWAYS = EnumSet.of(Slot.AMBIENT, Slot.ZONE_RISE, Slot.SUPPLY, Slot.RAIL,
            Slot.SHUNT_DRIFT,
            Slot.CALIBRATION_TEMPERATURE, Slot.CALIBRATION_SUPPLY, Slot.CALIBRATION_RAIL);
    private static final int MOST_ENUMERATED = 12;
    private static final int MOST_PASSES = 8;
    /** How close to the best corner, relative, another must be for its ambient temperature to be looked at. */
    private static final double CLOSE = 1e-3;
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
        return extremes().get(0);
    }

    Corner highest() {
        return extremes().get(1);
    }

    /** The lowest and the highest corner. */
    List<Corner> extremes() {
        while (true) {
            Set<Input> unsettled = new LinkedHashSet<>();
            Corner low = extreme(false, unsettled);
            Corner high = extreme(true, unsettled);
            if (unsettled.isEmpty() || enumerated.size() + unsettled.size() > MOST_ENUMERATED) {
                return List.of(low, high);
            }
            for (Input input : unsettled) {
                monotone.remove(input);
                enumerated.add(List.of(input));
            }
        }
    }

    private Corner extreme(boolean highest, Set<Input> unsettled) {
        double[] gradient = new double[nominal.length];
        double[] x = nominal.clone();
        double bestValue = highest ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
        double[] best = nominal;
        for (int scenario = 0; scenario < 1 << enumerated.size(); scenario++) {
            start(scenario, x);
            equation.gradient(x, gradient);
            for (Input input : monotone) {
                x[Layout.index(input)] = wanted(input, gradient[Layout.index(input)], highest);
            }
            double value = improve(x, gradient, highest, unsettled);
            boolean close = scenario == 0 || (highest
                    ? value > bestValue - CLOSE * Math.abs(bestValue)
                    : value < bestValue + CLOSE * Math.abs(bestValue));
            if (close && ambient.isPresent() && inward(ambient.get(), x, gradient, highest)) {
                value = within(ambient.get(), x, gradient, highest);
            }
            if ((highest ? value > bestValue : value < bestValue) || scenario == 0) {
                bestValue = value;
                best = x.clone();
            }
        }
        return new Corner(best, bestValue);
    }

    private void start(int scenario, double[] x) {
        System.arraycopy(nominal, 0, x, 0, x.length);
        for (int group = 0; group < enumerated.size(); group++) {
            boolean upper = (scenario >> group & 1) == 1;
            for (Input input : enumerated.get(group)) {
                x[Layout.index(input)] = upper ? input.limits().max() : input.limits().min();
            }
        }
    }

    private static double wanted(Input input, double derivative, boolean highest) {
        return derivative > 0 == highest ? input.limits().max() : input.limits().min();
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
        double found = improve(inner, gradient, highest, new LinkedHashSet<>());
        if (!(highest ? found > value : found < value)) {
            return value;
        }
        System.arraycopy(inner, 0, x, 0, x.length);
        return found;
    }

    /** Turns inputs over whose derivative at the corner points the other way; those that do not settle are noted. */
    private double improve(double[] x, double[] gradient, boolean highest, Set<Input> unsettled) {
        double value = equation.gradient(x, gradient);
        for (int pass = 0; pass < MOST_PASSES; pass++) {
            boolean changed = false;
            for (Input input : monotone) {
                int at = Layout.index(input);
                double end = wanted(input, gradient[at], highest);
                if (gradient[at] != 0 && x[at] != end) {
                    x[at] = end;
                    changed = true;
                }
            }
            if (!changed) {
                return value;
            }
            value = equation.gradient(x, gradient);
        }
        for (Input input : monotone) {
            int at = Layout.index(input);
            if (gradient[at] != 0 && x[at] != wanted(input, gradient[at], highest)) {
                unsettled.add(input);
            }
        }
        return value;
    }
}
