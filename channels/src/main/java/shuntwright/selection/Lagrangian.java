package shuntwright.selection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Lower bound of cost, number of lines or use of a resource, under limits and caps, by Lagrangian relaxation: what slots take of a line
 * and what is ordered of it are parted, each slot then takes the option that is cheapest at the prices (multipliers), each line orders
 * what earns most at them with its real cost by quantity, and limits and caps cost their multiplier. The sum is a bound for any
 * multipliers ≥ 0; a deflected subgradient method with Polyak's step makes them good ones.
 *
 * <p>Source: M. L. Fisher, The Lagrangian relaxation method for solving integer programming problems, Management Science 27 (1981);
 * from memory. That the bound holds is checked against exhaustive search.
 */
final class Lagrangian {

    private static final double DEFLECTION = 0.6;
    private static final int STALL = 12;
    /** Limits must be exceeded by more than this share to count as proven. */
    private static final double SURELY = 1e-6;
    private static final double SMALLEST_STEP = 1e-4;

    private final Selection selection;
    private final Optional<Aim> aim;
    private final double[] limit;
    private final double[] objective;
    private final double costWeight;
    private final double lineWeight;
    private final double costCap;
    private final double lineCap;
    private final int[] count;
    private final Option[][] options;
    private final int[][][] entriesOf;
    private final int entries;
    private final LineTerms[] lineTerms;
    /** Multipliers: of each entry, then of each resource, then of the caps on cost and on lines. */
    private double[] multipliers;
    private final double[] scale;
    private final double[] gradient;
    private double best = Double.NEGATIVE_INFINITY;
    private double[] bestMultipliers;

    /**
     * @param aim  to be bounded; empty to see whether limits and caps can be kept at all: they cannot when the bound is &gt; 0
     * @param caps that hold besides the limits
     */
    Lagrangian(Selection selection, Optional<Aim> aim, List<Aim.Cap> caps) {
        this.selection = selection;
        this.aim = aim;
        int resources = selection.resources().size();
        limit = selection.resources().stream().mapToDouble(Selection.Resource::most).toArray();
        objective = new double[resources];
        double costs = Double.POSITIVE_INFINITY;
        double lines = Double.POSITIVE_INFINITY;
        double margin = Double.POSITIVE_INFINITY;
        for (Aim.Cap cap : caps) {
            switch (cap.aim()) {
                case Aim.Use(int resource) -> limit[resource] = Math.min(limit[resource], cap.most());
                case Aim.LargestShare _ -> selection.even().forEach(r -> limit[r] = Math.min(limit[r],
                        cap.most() * selection.resources().get(r).most()));
                case Aim.Cost _ -> costs = cap.most();
                case Aim.Lines _ -> lines = cap.most();
                case Aim.LeastMargin _ -> margin = cap.most();
            }
        }
        costCap = costs;
        lineCap = lines;
        double cost = 0;
        double number = 0;
        if (aim.isPresent()) {
            switch (aim.get()) {
                case Aim.Use(int resource) -> objective[resource] = 1;
                case Aim.Cost _ -> cost = 1;
                case Aim.Lines _ -> number = 1;
                case Aim.LargestShare _,Aim.LeastMargin _ -> throw new IllegalArgumentException(
                        "no Lagrangian bound of " + aim.get());
            }
        }
        costWeight = cost;
        lineWeight = number;
        count = new int[selection.menus().size()];
        selection.slots().forEach(slot -> count[slot.menu()]++);
        options = new Option[count.length][];
        entriesOf = new int[count.length][][];
        List<Entry> all = new ArrayList<>();
        double mostMargin = margin;
        for (int menu = 0; menu < count.length; menu++) {
            options[menu] = count[menu] == 0
                    ? new Option[0]
                    : selection.menus().get(menu).options().stream()
                            .filter(each -> -each.margin <= mostMargin + Goal.SAME * Math.abs(mostMargin)
                                    || mostMargin == Double.POSITIVE_INFINITY)
                            .toArray(Option[]::new);
            entriesOf[menu] = entries(menu, all);
        }
        entries = all.size();
        lineTerms = LineTerms.of(selection, all, count);
        multipliers = new double[entries + resources + 2];
        scale = new double[multipliers.length];
        gradient = new double[multipliers.length];
        start(all);
        bestMultipliers = multipliers.clone();
    }

    /** Slots of a menu taking so many pieces of a line directly, or a section of a pool. */
    record Entry(int menu, int line, double pieces) {}

    private int[][] entries(int menu, List<Entry> all) {
        Map<String, Integer> known = new HashMap<>();
        int[][] of = new int[options[menu].length][];
        for (int o = 0; o < of.length; o++) {
            Option option = options[menu][o];
            of[o] = new int[option.lines.length + option.pools.length];
            for (int i = 0; i < option.lines.length; i++) {
                int line = option.lines[i];
                int pieces = option.pieces[i];
                of[o][i] = known.computeIfAbsent(line + "x" + pieces, _ -> {
                    all.add(new Entry(menu, line, pieces));
                    return all.size() - 1;
                });
            }
            for (int i = 0; i < option.pools.length; i++) {
                int pool = option.pools[i];
                of[o][option.lines.length + i] = known.computeIfAbsent("pool " + pool, _ -> {
                    Selection.Pool each = selection.pools().get(pool);
                    all.add(new Entry(menu, each.line(), 1.0 / each.sections()));
                    return all.size() - 1;
                });
            }
        }
        return of;
    }

    private void start(List<Entry> all) {
        int[] caps = State.caps(selection);
        for (int e = 0; e < entries; e++) {
            Entry entry = all.get(e);
            int cap = Math.max(1, caps[entry.line()]);
            double unit = costWeight * selection.cost(entry.line(), cap) / cap + lineWeight / cap;
            double first = costWeight * selection.cost(entry.line(), 1) + lineWeight;
            multipliers[e] = entry.pieces() * unit;
            scale[e] = aim.isPresent()
                    ? entry.pieces() * (Math.min(first, 4 * unit) + Goal.SMALLEST)
                    : entry.pieces() / selection.slots().size();
        }
        double typical = Arrays.stream(scale, 0, entries).average().orElse(1) * selection.slots().size();
        for (int r = 0; r < limit.length; r++) {
            scale[entries + r] = limit[r] < Double.POSITIVE_INFINITY ? Math.max(typical, 0.1 * objectiveSize()) : 0;
        }
        scale[entries + limit.length] = costCap < Double.POSITIVE_INFINITY ? Math.max(1, objectiveSize()) : 0;
        scale[entries + limit.length + 1] = lineCap < Double.POSITIVE_INFINITY ? Math.max(1, objectiveSize()) : 0;
    }

    private double objectiveSize() {
        return aim.isEmpty()
                ? 1
                : aim.get() instanceof Aim.Use(int resource) ? Bounds.leastUse(selection, resource) : 0;
    }

    /**
     * The best bound that so many iterations find.
     *
     * @param reached a value of the aim that is known to be reached; the bound cannot exceed it
     */
    double bound(double reached, int iterations, Watch watch) {
        for (int menu = 0; menu < options.length; menu++) {
            if (options[menu].length == 0 && count[menu] > 0) {
                best = Double.POSITIVE_INFINITY;
                return best;
            }
        }
        double theta = 1;
        int stalled = 0;
        double[] direction = new double[multipliers.length];
        for (int i = 0; i < iterations && theta > SMALLEST_STEP && !watch.ended(); i++) {
            double value = value();
            if (value > best + 1e-7 * Math.abs(best)) {
                stalled = 0;
            } else if (++stalled >= STALL) {
                theta /= 2;
                stalled = 0;
                multipliers = bestMultipliers.clone();
                Arrays.fill(direction, 0);
                value();
            }
            if (value > best) {
                best = value;
                bestMultipliers = multipliers.clone();
            }
            double target = aim.isPresent() ? reached : Math.max(best, 0) + 0.1;
            if (aim.isPresent() ? best >= reached - Goal.SAME * Math.abs(reached) : impossible()) {
                break;
            }
            double norm = 0;
            for (int m = 0; m < direction.length; m++) {
                direction[m] = DEFLECTION * direction[m] + gradient[m] * scale[m];
                boolean stays = multipliers[m] <= 0 && direction[m] < 0;
                norm += stays ? 0 : direction[m] * direction[m];
            }
            if (norm == 0) {
                break;
            }
            double step = theta * Math.max(target - value, 1e-9 * Math.abs(target)) / norm;
            for (int m = 0; m < direction.length; m++) {
                multipliers[m] = Math.max(0, multipliers[m] + step * direction[m] * scale[m]);
            }
        }
        return best;
    }

    /** True when, after {@link #bound}, limits and caps are proven not to be kept by any selection, rounding left aside. */
    boolean impossible() {
        double weight = 1;
        for (double each : bestMultipliers) {
            weight += each;
        }
        return aim.isEmpty() && best > SURELY * weight;
    }

    /** The bound at the multipliers; leaves the subgradient there. */
    private double value() {
        Arrays.fill(gradient, 0);
        int resources = limit.length;
        double perCost = costWeight + multipliers[entries + resources];
        double perLine = lineWeight + multipliers[entries + resources + 1];
        double sum = 0;
        double[] weights = new double[resources];
        double[] use = new double[resources];
        for (int r = 0; r < resources; r++) {
            boolean limited = limit[r] < Double.POSITIVE_INFINITY;
            double fixed = selection.resources().get(r).fixed();
            weights[r] = objective[r] + (limited ? multipliers[entries + r] / unit(r) : 0);
            use[r] = fixed;
            sum += objective[r] * fixed - (limited ? multipliers[entries + r] * (limit[r] - fixed) / unit(r) : 0);
        }
        sum += slots(weights, use);
        double cost = 0;
        double lines = 0;
        for (LineTerms line : lineTerms) {
            sum += line.least(multipliers, perCost, perLine, weights, gradient);
            cost += line.cost();
            lines += line.there();
            line.addUse(use);
        }
        for (int r = 0; r < resources; r++) {
            gradient[entries + r] = limit[r] < Double.POSITIVE_INFINITY ? (use[r] - limit[r]) / unit(r) : 0;
        }
        if (costCap < Double.POSITIVE_INFINITY) {
            sum -= multipliers[entries + resources] * costCap;
            gradient[entries + resources] = (cost - costCap) / Math.max(costCap, Goal.SMALLEST);
        }
        if (lineCap < Double.POSITIVE_INFINITY) {
            sum -= multipliers[entries + resources + 1] * lineCap;
            gradient[entries + resources + 1] = (lines - lineCap) / Math.max(lineCap, Goal.SMALLEST);
        }
        return sum;
    }

    private double unit(int resource) {
        return Math.max(limit[resource], Goal.SMALLEST);
    }

    /** Every slot its cheapest option at the prices. */
    private double slots(double[] weights, double[] use) {
        double sum = 0;
        double[][] groups = new double[selection.groups().size()][];
        int[][][] chosenAt = new int[groups.length][][];
        for (int g = 0; g < groups.length; g++) {
            groups[g] = new double[selection.groups().get(g)];
            chosenAt[g] = new int[groups[g].length][count.length];
        }
        for (int menu = 0; menu < options.length; menu++) {
            if (count[menu] == 0) {
                continue;
            }
            int group = selection.menus().get(menu).group();
            if (group < 0) {
                double least = Double.POSITIVE_INFINITY;
                int chosen = 0;
                for (int o = 0; o < options[menu].length; o++) {
                    double weight = weight(menu, o, weights);
                    if (weight < least) {
                        least = weight;
                        chosen = o;
                    }
                }
                sum += count[menu] * least;
                take(menu, chosen, use);
            } else {
                double[] least = new double[groups[group].length];
                Arrays.fill(least, Double.POSITIVE_INFINITY);
                for (int o = 0; o < options[menu].length; o++) {
                    double weight = weight(menu, o, weights);
                    int value = options[menu][o].value;
                    if (weight < least[value]) {
                        least[value] = weight;
                        chosenAt[group][value][menu] = o;
                    }
                }
                for (int value = 0; value < least.length; value++) {
                    groups[group][value] += count[menu] * least[value];
                }
            }
        }
        for (int g = 0; g < groups.length; g++) {
            int chosen = 0;
            for (int value = 1; value < groups[g].length; value++) {
                chosen = groups[g][value] < groups[g][chosen] ? value : chosen;
            }
            sum += groups[g][chosen];
            for (int menu = 0; menu < options.length; menu++) {
                if (count[menu] > 0 && selection.menus().get(menu).group() == g) {
                    take(menu, chosenAt[g][chosen][menu], use);
                }
            }
        }
        return sum;
    }

    private double weight(int menu, int option, double[] weights) {
        double weight = 0;
        for (int e : entriesOf[menu][option]) {
            weight += multipliers[e];
        }
        Option each = options[menu][option];
        for (int i = 0; i < each.resources.length; i++) {
            weight += weights[each.resources[i]] * each.amounts[i];
        }
        return weight;
    }

    private void take(int menu, int option, double[] use) {
        for (int e : entriesOf[menu][option]) {
            gradient[e] += count[menu];
        }
        Option each = options[menu][option];
        for (int i = 0; i < each.resources.length; i++) {
            use[each.resources[i]] += count[menu] * each.amounts[i];
        }
    }
}
