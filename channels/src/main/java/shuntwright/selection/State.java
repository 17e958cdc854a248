package shuntwright.selection;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * A selection under way: which option each slot has, and all sums over it, kept up to date by every change.
 */
final class State {

    /** Margins this close to the least count for the slope. */
    private static final double NEAR = 0.02;

    final Selection selection;
    final int[] choice;
    /** Value of each group. */
    final int[] value;
    final double[] use;
    private final Option[][] options;
    private final int[] quantity;
    private final int[] taken;
    private final double[][] costs;
    private final double[] most;
    private final int[] poolLine;
    private final int[] poolSections;
    private final int[] poolResource;
    private final double[] poolAmount;
    private final int[] even;
    private double cost;
    private int distinct;

    /** Slots without an option take nothing. */
    State(Selection selection) {
        this.selection = selection;
        int slots = selection.slots().size();
        choice = new int[slots];
        Arrays.fill(choice, -1);
        value = new int[selection.groups().size()];
        options = new Option[slots][];
        for (int slot = 0; slot < slots; slot++) {
            options[slot] = selection.options(slot).toArray(new Option[0]);
        }
        List<Selection.Resource> resources = selection.resources();
        use = resources.stream().mapToDouble(Selection.Resource::fixed).toArray();
        most = resources.stream().mapToDouble(Selection.Resource::most).toArray();
        List<Selection.Pool> pools = selection.pools();
        poolLine = pools.stream().mapToInt(Selection.Pool::line).toArray();
        poolSections = pools.stream().mapToInt(Selection.Pool::sections).toArray();
        poolResource = pools.stream().mapToInt(Selection.Pool::resource).toArray();
        poolAmount = pools.stream().mapToDouble(Selection.Pool::amount).toArray();
        taken = new int[poolLine.length];
        quantity = selection.lines().stream().mapToInt(Selection.Line::fixed).toArray();
        costs = new double[quantity.length][];
        int[] caps = caps(selection);
        for (int line = 0; line < quantity.length; line++) {
            costs[line] = new double[caps[line] + 1];
            for (int pieces = 0; pieces <= caps[line]; pieces++) {
                costs[line][pieces] = selection.cost(line, pieces);
            }
            cost += costs[line][quantity[line]];
            distinct += quantity[line] > 0 ? 1 : 0;
        }
        even = selection.even().stream().mapToInt(Integer::intValue).toArray();
    }

    /** Most pieces of each line that a board can take. */
    static int[] caps(Selection selection) {
        int[] caps = selection.lines().stream().mapToInt(Selection.Line::fixed).toArray();
        int[] largest = new int[caps.length];
        int[] count = new int[selection.menus().size()];
        selection.slots().forEach(slot -> count[slot.menu()]++);
        for (int menu = 0; menu < count.length; menu++) {
            Arrays.fill(largest, 0);
            for (Option option : selection.menus().get(menu).options()) {
                // An option may take pieces of a line and a package of the same line.
                Map<Integer, Integer> own = new TreeMap<>(option.lines());
                for (int pool : option.pools) {
                    own.merge(selection.pools().get(pool).line(), 1, Integer::sum);
                }
                own.forEach((line, pieces) -> largest[line] = Math.max(largest[line], pieces));
            }
            for (int line = 0; line < caps.length; line++) {
                caps[line] += largest[line] * count[menu];
            }
        }
        return caps;
    }

    Option option(int slot) {
        return options[slot][choice[slot]];
    }

    Option[] options(int slot) {
        return options[slot];
    }

    /** Gives a slot an option (or none, -1). */
    void set(int slot, int option) {
        int before = choice[slot];
        if (before == option) {
            return;
        }
        if (before >= 0) {
            add(options[slot][before], -1);
        }
        choice[slot] = option;
        if (option >= 0) {
            add(options[slot][option], 1);
        }
    }

    private void add(Option option, int sign) {
        for (int i = 0; i < option.lines.length; i++) {
            order(option.lines[i], sign * option.pieces[i]);
        }
        for (int i = 0; i < option.resources.length; i++) {
            use[option.resources[i]] += sign * option.amounts[i];
        }
        for (int pool : option.pools) {
            int sections = poolSections[pool];
            int before = (taken[pool] + sections - 1) / sections;
            taken[pool] += sign;
            int packages = (taken[pool] + sections - 1) / sections - before;
            if (packages != 0) {
                order(poolLine[pool], packages);
                if (poolResource[pool] >= 0) {
                    use[poolResource[pool]] += packages * poolAmount[pool];
                }
            }
        }
    }

    private void order(int line, int pieces) {
        int before = quantity[line];
        int after = before + pieces;
        quantity[line] = after;
        cost += costs[line][after] - costs[line][before];
        if (before == 0) {
            distinct++;
        }
        if (after == 0) {
            distinct--;
        }
    }

    /** Works all sums out anew, so that rounding does not gather. */
    void refresh() {
        int[] now = choice.clone();
        for (int slot = 0; slot < now.length; slot++) {
            set(slot, -1);
        }
        double sum = 0;
        for (int line = 0; line < quantity.length; line++) {
            sum += costs[line][quantity[line]];
        }
        cost = sum;
        for (int r = 0; r < use.length; r++) {
            use[r] = selection.resources().get(r).fixed();
        }
        restore(now);
    }

    void restore(int[] choices) {
        for (int slot = 0; slot < choices.length; slot++) {
            set(slot, choices[slot]);
            if (choices[slot] >= 0 && selection.menu(slot).group() >= 0) {
                value[selection.menu(slot).group()] = options[slot][choices[slot]].value;
            }
        }
    }

    /** Pieces of a line on one board. */
    int quantity(int line) {
        return quantity[line];
    }

    /** Sum of what limits are exceeded by, each as a share of its limit. */
    double excess() {
        double sum = 0;
        for (int r = 0; r < use.length; r++) {
            if (use[r] > most[r] * (1 + Goal.SAME)) {
                sum += (use[r] - most[r]) / Math.max(most[r], Goal.SMALLEST);
            }
        }
        return sum;
    }

    /** How many limits are exceeded. */
    int broken() {
        int count = 0;
        for (int r = 0; r < use.length; r++) {
            count += exceeded(r) ? 1 : 0;
        }
        return count;
    }

    boolean exceeded(int resource) {
        return use[resource] > most[resource] * (1 + Goal.SAME);
    }

    double value(Aim aim) {
        return switch (aim) {
            case Aim.Use(int resource) -> use[resource];
            case Aim.LargestShare _ -> largestShare();
            case Aim.Cost _ -> cost;
            case Aim.Lines _ -> distinct;
            case Aim.LeastMargin _ -> -leastMargin();
        };
    }

    private double largestShare() {
        double largest = 0;
        for (int resource : even) {
            largest = Math.max(largest, use[resource] / most[resource]);
        }
        return largest;
    }

    private double leastMargin() {
        double least = Double.POSITIVE_INFINITY;
        for (int slot = 0; slot < choice.length; slot++) {
            if (choice[slot] >= 0) {
                least = Math.min(least, options[slot][choice[slot]].margin);
            }
        }
        return least;
    }

    /** What helps where the aim itself does not move: the sum that its largest term stands out of. */
    double slope(Aim aim) {
        return switch (aim) {
            case Aim.LargestShare _ -> {
                double sum = 0;
                for (int resource : even) {
                    double share = use[resource] / most[resource];
                    sum += share * share;
                }
                yield sum;
            }
            case Aim.LeastMargin _ -> {
                double near = leastMargin() + NEAR;
                double sum = 0;
                for (int slot = 0; slot < choice.length; slot++) {
                    sum += choice[slot] >= 0 ? Math.max(0, near - options[slot][choice[slot]].margin) : 0;
                }
                yield sum;
            }
            case Aim.Use _,Aim.Cost _,Aim.Lines _ -> 0;
        };
    }
}
