package shuntwright.selection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * What one line orders when slots pay a price for what they take of it: the quantity at which cost less income is least. A slot takes one
 * of several numbers of pieces; of those only the concave hull of income over pieces counts, which bounds the income from above.
 */
final class LineTerms {

    private final int fixed;
    private final double[] costs;
    /** Entries by menu, each by ascending pieces. */
    private final int[][] entries;
    private final double[][] pieces;
    private final int[] slots;
    private final int resource;
    private final double amount;
    private int ordered;
    private double cost;

    /** A step of the hull of one menu: from one number of pieces to a greater one. */
    private record Step(int menu, int from, int to, double pieces, double income) {
        double slope() {
            return income / pieces;
        }
    }

    private LineTerms(Selection selection, int line, int cap, List<List<Integer>> byMenu, List<Lagrangian.Entry> all,
            int[] count) {
        fixed = selection.lines().get(line).fixed();
        costs = new double[cap + 1];
        for (int i = 0; i <= cap; i++) {
            costs[i] = selection.cost(line, i) - (i > 0 ? selection.lineCost() : 0);
        }
        entries = new int[byMenu.size()][];
        pieces = new double[entries.length][];
        slots = new int[entries.length];
        for (int i = 0; i < entries.length; i++) {
            entries[i] = byMenu.get(i).stream().sorted(Comparator.comparingDouble(e -> all.get(e).pieces()))
                    .mapToInt(Integer::intValue).toArray();
            pieces[i] = Arrays.stream(entries[i]).mapToDouble(e -> all.get(e).pieces()).toArray();
            slots[i] = count[all.get(entries[i][0]).menu()];
        }
        Selection.Pool pool = selection.pools().stream().filter(each -> each.line() == line && each.resource() >= 0)
                .min(Comparator.comparingDouble(Selection.Pool::amount)).orElse(null);
        resource = pool == null ? -1 : pool.resource();
        amount = pool == null ? 0 : pool.amount();
        lineCost = selection.lineCost();
    }

    private final double lineCost;

    static LineTerms[] of(Selection selection, List<Lagrangian.Entry> all, int[] count) {
        int lines = selection.lines().size();
        List<List<List<Integer>>> byLine = new ArrayList<>();
        int[] lastMenu = new int[lines];
        Arrays.fill(lastMenu, -1);
        for (int line = 0; line < lines; line++) {
            byLine.add(new ArrayList<>());
        }
        for (int e = 0; e < all.size(); e++) {
            Lagrangian.Entry entry = all.get(e);
            List<List<Integer>> there = byLine.get(entry.line());
            if (lastMenu[entry.line()] != entry.menu()) {
                there.add(new ArrayList<>());
                lastMenu[entry.line()] = entry.menu();
            }
            there.getLast().add(e);
        }
        int[] caps = State.caps(selection);
        LineTerms[] terms = new LineTerms[lines];
        for (int line = 0; line < lines; line++) {
            terms[line] = new LineTerms(selection, line, caps[line], byLine.get(line), all, count);
        }
        return terms;
    }

    /** Least cost less income; adds what is supplied, with a minus sign, to the subgradient. */
    double least(double[] multipliers, double perCost, double perLine, double[] weights, double[] gradient) {
        List<Step> steps = new ArrayList<>();
        for (int menu = 0; menu < entries.length; menu++) {
            hull(menu, multipliers, steps);
        }
        steps.sort(Comparator.comparingDouble(Step::slope).reversed());
        double each = resource >= 0 ? weights[resource] * amount : 0;
        double opening = perCost * lineCost + perLine;
        double least = fixed > 0 ? perCost * costs[fixed] + opening : 0;
        ordered = 0;
        double income = 0;
        double reached = 0;
        int at = 0;
        int most = costs.length - 1 - fixed;
        for (int q = 1; q <= most; q++) {
            while (at < steps.size() && reached + steps.get(at).pieces() <= q) {
                income += steps.get(at).income();
                reached += steps.get(at).pieces();
                at++;
            }
            double part = at < steps.size() ? (q - reached) * steps.get(at).slope() : 0;
            double value = perCost * costs[fixed + q] + opening + each * q - income - part;
            if (value < least) {
                least = value;
                ordered = q;
            }
            if (at >= steps.size() && q >= reached) {
                break;
            }
        }
        supply(steps, gradient);
        cost = costs[fixed + ordered] + (fixed + ordered > 0 ? lineCost : 0);
        return least;
    }

    /** Steps of the concave hull through (0, 0) and (pieces, income) of a menu's entries, as far as it rises. */
    private void hull(int menu, double[] multipliers, List<Step> steps) {
        int n = entries[menu].length;
        int from = -1;
        double x = 0;
        double y = 0;
        while (from < n - 1) {
            int to = -1;
            double steepest = 0;
            for (int i = from + 1; i < n; i++) {
                double slope = (multipliers[entries[menu][i]] - y) / (pieces[menu][i] - x);
                if (pieces[menu][i] > x && slope > steepest) {
                    steepest = slope;
                    to = i;
                }
            }
            if (to < 0) {
                return;
            }
            double income = multipliers[entries[menu][to]];
            steps.add(new Step(menu, from, to, slots[menu] * (pieces[menu][to] - x), slots[menu] * (income - y)));
            x = pieces[menu][to];
            y = income;
            from = to;
        }
    }

    private void supply(List<Step> steps, double[] gradient) {
        double left = ordered;
        for (Step step : steps) {
            if (left <= 0) {
                return;
            }
            double share = Math.min(1, left / step.pieces());
            gradient[entries[step.menu()][step.to()]] -= share * slots[step.menu()];
            if (step.from() >= 0) {
                gradient[entries[step.menu()][step.from()]] += share * slots[step.menu()];
            }
            left -= step.pieces();
        }
    }

    /** Cost of what was last ordered. */
    double cost() {
        return cost;
    }

    /** 1 when anything is ordered, else 0. */
    double there() {
        return fixed + ordered > 0 ? 1 : 0;
    }

    void addUse(double[] use) {
        if (resource >= 0) {
            use[resource] += amount * ordered;
        }
    }
}
