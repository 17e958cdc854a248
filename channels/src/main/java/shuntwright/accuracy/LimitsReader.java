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
 * <p>Ambient, supply, rail and the shunts' temperature coefficients multiply other inputs, so both their ends are
 * enumerated. With those fixed the equation is monotone in each remaining input, and its extreme is at the corner that
 * the signs of the partial derivatives pick. The derivatives are looked at again in that corner (in the middle of the box
 * one may be 0): inputs that point the other way there change ends, and if that does not settle, they are enumerated too.
 *
 * <p>Where drifts and the copper of the joints nearly cancel, the extreme may lie between the ends of the ambient range,
 * beyond them by some millionths; the derivative by the temperature then points inward and is followed to its zero.
 */
final class LimitsReader {

    private static final Set<Slot> ALWAYS = EnumSet.of(Slot.AMBIENT, Slot.SUPPLY, Slot.RAIL, Slot.SHUNT_DRIFT);
    private static final int MOST_TURNS = 4;
    /** Halvings of the ambient range that leave less than a nanokelvin of it. */
    private static final int HALVINGS = 40;
    private static final int MOST_ENUMERATED = 12;

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
        // A bias current flows through R_H and the divider in opposite senses, so with R_H its tolerance may favour either.
        boolean twoWays = description.inputs().stream().anyMatch(each -> each.slot() == Slot.SENSE_RESISTOR_TOLERANCE);
        for (Input input : description.inputs()) {
            if (input.slot() == Slot.SHUNT_DRIFT) {
                drifts.add(input);
            } else if (ALWAYS.contains(input.slot()) || (twoWays && input.slot() == Slot.COMPARATOR_BIAS)) {
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
            Set<Input> turning = new LinkedHashSet<>();
            Corner low = extreme(false, turning);
            Corner high = extreme(true, turning);
            if (turning.isEmpty() || enumerated.size() >= MOST_ENUMERATED) {
                return List.of(low, high);
            }
            for (Input input : turning) {
                monotone.remove(input);
                enumerated.add(List.of(input));
            }
        }
    }

    private Corner extreme(boolean highest, Set<Input> turning) {
        double[] gradient = new double[nominal.length];
        double[] x = nominal.clone();
        double[] best = nominal;
        double bestValue = highest ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
        for (int scenario = 0; scenario < 1 << enumerated.size(); scenario++) {
            start(scenario, x);
            equation.gradient(x, gradient);
            settle(x, gradient, highest);
            double value = equation.gradient(x, gradient);
            int turns = 0;
            while (turns < MOST_TURNS && settle(x, gradient, highest)) {
                value = equation.gradient(x, gradient);
                turns++;
            }
            if (turns == MOST_TURNS) {
                turning.addAll(unsettled(x, gradient, highest));
            }
            if (ambient.isPresent() && inward(ambient.get(), x, gradient, highest)) {
                value = within(ambient.get(), x, gradient, highest, value);
            }
            if ((highest ? value > bestValue : value < bestValue) || scenario == 0) {
                bestValue = value;
                best = x.clone();
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

    /** Moves the ambient temperature to where the derivative by it changes sign, if that makes the value more extreme. */
    private double within(Range ambient, double[] x, double[] gradient, boolean highest, double atEnd) {
        int at = Slot.AMBIENT.place();
        double near = x[at];
        double far = near == ambient.min() ? ambient.max() : ambient.min();
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
        settle(inner, gradient, highest);
        double found = equation.value(inner);
        if (!(highest ? found > atEnd : found < atEnd)) {
            return atEnd;
        }
        System.arraycopy(inner, 0, x, 0, x.length);
        return found;
    }

    private void start(int scenario, double[] x) {
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
    }

    /** Moves each monotone input to the end that its derivative asks for; true when one has moved. */
    private boolean settle(double[] x, double[] gradient, boolean highest) {
        boolean moved = false;
        for (Input input : monotone) {
            int at = Layout.index(input);
            if (gradient[at] != 0 || x[at] == nominal[at]) {
                double end = wanted(input, gradient[at], highest);
                moved |= x[at] != end;
                x[at] = end;
            }
        }
        return moved;
    }

    private static double wanted(Input input, double derivative, boolean highest) {
        return derivative > 0 == highest ? input.limits().max() : input.limits().min();
    }

    private List<Input> unsettled(double[] x, double[] gradient, boolean highest) {
        return monotone.stream().filter(input -> {
            double derivative = gradient[Layout.index(input)];
            return derivative != 0 && x[Layout.index(input)] != wanted(input, derivative, highest);
        }).toList();
    }
}
