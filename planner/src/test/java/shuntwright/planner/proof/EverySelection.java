package shuntwright.planner.proof;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;

import shuntwright.parts.Purchase;
import shuntwright.selection.Aim;
import shuntwright.selection.Option;
import shuntwright.selection.Selection;

/** Every selection there is of a small one, with its sums worked out one by one. */
final class EverySelection {

    private final Selection selection;
    private final List<Sums> keeping = new ArrayList<>();

    /** A selection that keeps all limits. */
    record Sums(List<Integer> choice, List<Double> use, double share, double cost, int lines, double margin) {

        double value(Aim aim) {
            return switch (aim) {
                case Aim.Use(int resource) -> use.get(resource);
                case Aim.LargestShare _ -> share;
                case Aim.Cost _ -> cost;
                case Aim.Lines _ -> lines;
                case Aim.LeastMargin _ -> -margin;
            };
        }
    }

    EverySelection(Selection selection) {
        this.selection = selection;
        walk(new ArrayList<>(), new HashMap<>());
    }

    List<Sums> keeping() {
        return keeping;
    }

    /** The least value among those that also keep the caps. */
    Optional<Double> least(Aim aim, List<Aim.Cap> caps) {
        Predicate<Sums> keeps = sums -> caps.stream()
                .allMatch(cap -> sums.value(cap.aim()) <= cap.most() + 1e-9 * Math.abs(cap.most()));
        return keeping.stream().filter(keeps).map(sums -> sums.value(aim)).min(Double::compare);
    }

    private void walk(List<Integer> chosen, Map<Integer, Integer> values) {
        int slot = chosen.size();
        if (slot == selection.slots().size()) {
            sum(List.copyOf(chosen));
            return;
        }
        int group = selection.menus().get(selection.slots().get(slot).menu()).group();
        for (int o = 0; o < selection.options(slot).size(); o++) {
            int value = selection.options(slot).get(o).value();
            boolean first = group >= 0 && !values.containsKey(group);
            if (group >= 0 && values.getOrDefault(group, value) != value) {
                continue;
            }
            if (first) {
                values.put(group, value);
            }
            chosen.add(o);
            walk(chosen, values);
            chosen.removeLast();
            if (first) {
                values.remove(group);
            }
        }
    }

    private void sum(List<Integer> choice) {
        int[] pieces = selection.lines().stream().mapToInt(Selection.Line::fixed).toArray();
        double[] use = selection.resources().stream().mapToDouble(Selection.Resource::fixed).toArray();
        int[] sections = new int[selection.pools().size()];
        double margin = Double.POSITIVE_INFINITY;
        for (int slot = 0; slot < choice.size(); slot++) {
            Option option = selection.options(slot).get(choice.get(slot));
            option.lines().forEach((line, n) -> pieces[line] += n);
            option.resources().forEach((resource, amount) -> use[resource] += amount);
            for (int pool : option.pools()) {
                sections[pool]++;
            }
            margin = Math.min(margin, option.margin());
        }
        for (int pool = 0; pool < sections.length; pool++) {
            Selection.Pool each = selection.pools().get(pool);
            int packages = (sections[pool] + each.sections() - 1) / each.sections();
            pieces[each.line()] += packages;
            if (each.resource() >= 0) {
                use[each.resource()] += packages * each.amount();
            }
        }
        double cost = 0;
        int lines = 0;
        for (int line = 0; line < pieces.length; line++) {
            if (pieces[line] > 0) {
                lines++;
                cost += selection.lineCost()
                        + leastCost(selection.lines().get(line).purchase(), pieces[line] * selection.boards());
            }
        }
        double share = 0;
        List<Double> uses = new ArrayList<>();
        for (int r = 0; r < use.length; r++) {
            double limit = selection.resources().get(r).limit().orElse(Double.POSITIVE_INFINITY);
            if (use[r] > limit * (1 + 1e-9)) {
                return;
            }
            share = selection.even().contains(r) ? Math.max(share, use[r] / limit) : share;
            uses.add(use[r]);
        }
        keeping.add(new Sums(choice, uses, share, cost, lines, margin));
    }

    /** The cheapest order, by trying every number of packs to past the last price break. */
    static double leastCost(Purchase purchase, int needed) {
        double least = Double.POSITIVE_INFINITY;
        int past = Math.max(needed, purchase.prices().getLast().quantity()) + purchase.minimumOrder()
                + 2 * purchase.packSize();
        for (int pieces = purchase.packSize(); pieces <= past; pieces += purchase.packSize()) {
            if (pieces >= needed && pieces >= purchase.minimumOrder()) {
                least = Math.min(least, pieces * purchase.unitPriceAt(pieces));
            }
        }
        return least;
    }
}
