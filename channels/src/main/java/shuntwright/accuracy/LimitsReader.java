package shuntwright.accuracy;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;

/**
 * Exact extremes of an equation over the box of its inputs.
 *
 * <p>Temperatures, the rejections of rail and supply and the shunts' temperature coefficients decide which way other inputs
 * act, so both their ends are enumerated. With those fixed the equation is monotone in each remaining input, and its extreme
 * is at the corner that the signs of the partial derivatives pick. Should derivatives at that corner point the other way
 * than in the middle of the box, where they may also be 0, those inputs are turned over, at first all at once, then one after
 * the other as long as that leads further out. This happens where a bias current may flow either way, to readings so small
 * that errors outweigh them, and to whatever calibration removes but for products of small errors.
 *
 * <p>Where drifts and the copper of the joints nearly cancel, the extreme may lie between the ends of a temperature's range,
 * beyond them by some millionths; so it may for a reference that calibration all but removes. The derivative then points
 * inward from both ends and is followed to its zero.
 */
final class LimitsReader {

    private static final List<Slot> TEMPERATURES = List.of(Slot.AMBIENT, Slot.ZONE_RISE, Slot.CALIBRATION_TEMPERATURE);
    private static final Set<Slot> ALWAYS = EnumSet.of(Slot.AMBIENT, Slot.ZONE_RISE, Slot.CALIBRATION_TEMPERATURE,
            Slot.COMMON_MODE, Slot.SUPPLY_REJECTION, Slot.SHUNT_DRIFT);
    /** Passes in which all inputs turn over at once, before they do so one after the other. */
    private static final int TOGETHER = 4;
    private static final int MOST_PASSES = 20;
    /** How close to the best corner, relative, another must be to be followed to inner extremes. */
    private static final double CLOSE = 1e-3;
    /** Halvings of an input's limits that leave less than a nanokelvin of a temperature. */
    private static final int HALVINGS = 40;
    /** What an input changes by less than this, relative, is rounding. */
    private static final double NOTHING = 1e-14;
    /** An input whose derivative would change the outcome by less than this, relative, may have an extreme between its ends. */
    private static final double WEAK = 1e-6;
    /** Multiples of the golden section, less their whole part, are shares that no two inputs have in common. */
    private static final double GOLDEN = 0.6180339887498949;

    private final Equation equation;
    private final double[] nominal;
    private final List<Input> temperatures = new ArrayList<>();
    private final List<Input> monotone = new ArrayList<>();
    private final List<List<Input>> enumerated = new ArrayList<>();

    LimitsReader(Equation equation, InputDescription description) {
        this.equation = equation;
        this.nominal = description.nominal();
        List<Input> drifts = new ArrayList<>();
        for (Input input : acting(equation, description)) {
            if (TEMPERATURES.contains(input.slot())) {
                temperatures.add(input);
            }
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

    /** The inputs that the equation reads, by its derivatives somewhere in the box where none of them cancel. */
    private static List<Input> acting(Equation equation, InputDescription description) {
        double[] inside = description.nominal();
        double share = GOLDEN / 2;
        for (Input input : description.inputs()) {
            inside[Layout.index(input)] = input.limits().min() + share * input.limits().width();
            share = (share + GOLDEN) % 1;
        }
        double[] gradient = new double[inside.length];
        double value = equation.gradient(inside, gradient);
        return description.inputs().stream()
                .filter(input -> !Double.isFinite(value) || gradient[Layout.index(input)] != 0).toList();
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
        return List.of(extreme(false), extreme(true));
    }

    private Corner extreme(boolean highest) {
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
            double value = improve(x, gradient, highest);
            boolean close = scenario == 0 || (highest
                    ? value > bestValue - CLOSE * Math.abs(bestValue)
                    : value < bestValue + CLOSE * Math.abs(bestValue));
            if (close) {
                value = between(value, x, gradient, highest);
            }
            if ((highest ? value > bestValue : value < bestValue) || scenario == 0) {
                bestValue = value;
                best = x.clone();
            }
        }
        double value = polished(best, bestValue, gradient, highest);
        return new Corner(best, value);
    }

    /**
     * Looks also from the other end of each input that hardly matters at the best corner: only there may the derivatives point
     * outward from both ends.
     */
    private double polished(double[] best, double bestValue, double[] gradient, boolean highest) {
        double reached = bestValue;
        double[] slopes = new double[best.length];
        equation.gradient(best, slopes);
        for (Input input : monotone) {
            int at = Layout.index(input);
            if (Math.abs(slopes[at]) * input.limits().width() > WEAK * Math.abs(reached)) {
                continue;
            }
            double[] x = best.clone();
            x[at] = x[at] == input.limits().max() ? input.limits().min() : input.limits().max();
            double value = equation.gradient(x, gradient);
            if (turned(input, x, gradient, value, highest)) {
                follow(input, x, gradient, highest);
            }
            value = improve(x, gradient, highest);
            if (highest ? value > reached : value < reached) {
                System.arraycopy(x, 0, best, 0, x.length);
                reached = value;
            }
        }
        return reached;
    }

    /** Follows each temperature whose derivative points inward. */
    private double between(double value, double[] x, double[] gradient, boolean highest) {
        double reached = value;
        for (Input temperature : temperatures) {
            if (turned(temperature, x, gradient, reached, highest)) {
                double[] inner = x.clone();
                follow(temperature, inner, gradient, highest);
                double found = improve(inner, gradient, highest);
                if (highest ? found > reached : found < reached) {
                    System.arraycopy(inner, 0, x, 0, x.length);
                    reached = found;
                }
                equation.gradient(x, gradient);
            }
        }
        return reached;
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

    /** Moves an input to where the derivative by it changes sign, or to its other end where it does not. */
    private void follow(Input input, double[] x, double[] gradient, boolean highest) {
        int at = Layout.index(input);
        double near = x[at];
        double far = wanted(input, gradient[at], highest);
        boolean rising = gradient[at] > 0;
        x[at] = far;
        equation.gradient(x, gradient);
        if (gradient[at] == 0 || gradient[at] > 0 == rising) {
            return;
        }
        for (int step = 0; step < HALVINGS; step++) {
            x[at] = (near + far) / 2;
            equation.gradient(x, gradient);
            if (gradient[at] > 0 == rising) {
                near = x[at];
            } else {
                far = x[at];
            }
        }
    }

    /** Turns inputs over whose derivative points the other way, until none is left. */
    private double improve(double[] x, double[] gradient, boolean highest) {
        double value = equation.gradient(x, gradient);
        for (int pass = 0; pass < MOST_PASSES; pass++) {
            double before = value;
            boolean changed = pass < TOGETHER ? together(x, gradient, value, highest) : oneByOne(x, gradient, highest);
            if (!changed) {
                return value;
            }
            value = equation.gradient(x, gradient);
            if (pass >= TOGETHER && Math.abs(value - before) <= NOTHING * Math.abs(value)) {
                return value;
            }
        }
        return value;
    }

    private boolean together(double[] x, double[] gradient, double value, boolean highest) {
        boolean changed = false;
        for (Input input : monotone) {
            if (turned(input, x, gradient, value, highest)) {
                int at = Layout.index(input);
                x[at] = wanted(input, gradient[at], highest);
                changed = true;
            }
        }
        return changed;
    }

    private boolean oneByOne(double[] x, double[] gradient, boolean highest) {
        boolean changed = false;
        for (Input input : monotone) {
            double value = equation.gradient(x, gradient);
            if (turned(input, x, gradient, value, highest)) {
                follow(input, x, gradient, highest);
                changed = true;
            }
        }
        return changed;
    }

    /** True when the input's derivative points to its other end. */
    private static boolean turned(Input input, double[] x, double[] gradient, double value, boolean highest) {
        int at = Layout.index(input);
        return Math.abs(gradient[at]) * input.limits().width() > NOTHING * Math.abs(value)
                && x[at] != wanted(input, gradient[at], highest);
    }
}
