package shuntwright.selection;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Every selection there is, summed up from nothing each time; shares no line with the search. */
final class Exhaustive {

    private final Selection selection;
    private final List<Aim> aims;
    private final List<Double> slack;
    private final List<Sums> all = new ArrayList<>();

    /** What a whole selection comes to. */
    record Sums(List<Integer> choice, boolean keeps, List<Double> values) {}

    Exhaustive(Selection selection, List<Aim> aims, List<Double> slack) {
        this.selection = selection;
        this.aims = aims;
        this.slack = slack;
        walk(new ArrayList<>(), new HashMap<>());
    }

    private void walk(List<Integer> chosen, Map<Integer, Integer> values) {
        int slot = chosen.size();
        if (slot == selection.slots().size()) {
            all.add(sums(List.copyOf(chosen)));
            return;
        }
        List<Option> options = selection.options(slot);
        int group = selection.menus().get(selection.slots().get(slot).menu()).group();
        for (int o = 0; o < options.size(); o++) {
            int value = options.get(o).value();
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

    Sums sums(List<Integer> choice) {
        int[] pieces = new int[selection.lines().size()];
        double[] use = new double[selection.resources().size()];
        int[] sections = new int[selection.pools().size()];
        double margin = Double.POSITIVE_INFINITY;
        for (int i = 0; i < pieces.length; i++) {
            pieces[i] = selection.lines().get(i).fixed();
        }
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
            int packages = Math.ceilDiv(sections[pool], each.sections());
            pieces[each.line()] += packages;
            use[each.resource()] += packages * each.amount();
        }
        double cost = 0;
        int lines = 0;
        for (int line = 0; line < pieces.length; line++) {
            if (pieces[line] > 0) {
                lines++;
                cost += selection.lineCost()
                        + TierTable.leastCost(selection.lines().get(line).purchase(),
                                pieces[line] * selection.boards());
            }
        }
        boolean keeps = true;
        double share = 0;
        for (int r = 0; r < use.length; r++) {
            use[r] += selection.resources().get(r).fixed();
            double limit = selection.resources().get(r).limit().orElse(Double.POSITIVE_INFINITY);
            keeps &= use[r] <= limit * (1 + 1e-9);
            if (selection.even().contains(r)) {
                share = Math.max(share, use[r] / limit);
            }
        }
        List<Double> values = new ArrayList<>();
        for (Aim aim : aims) {
            values.add(switch (aim) {
                case Aim.Use(int resource) -> use[resource];
                case Aim.LargestShare _ -> share;
                case Aim.Cost _ -> cost;
                case Aim.Lines _ -> (double) lines;
                case Aim.LeastMargin _ -> -margin;
            });
        }
        return new Sums(choice, keeps, values);
    }

    /** The values of the lexicographically best selection that keeps all limits; empty when none does. */
    Optional<List<Double>> best() {
        List<Sums> left = all.stream().filter(Sums::keeps).toList();
        if (left.isEmpty()) {
            return Optional.empty();
        }
        List<Double> best = new ArrayList<>();
        for (int i = 0; i < aims.size(); i++) {
            int aim = i;
            double least = Collections.min(left.stream().map(each -> each.values().get(aim)).toList());
            best.add(least);
            double most = least + slack.get(i) + 1e-9 * Math.abs(least);
            left = left.stream().filter(each -> each.values().get(aim) <= most).toList();
        }
        return Optional.of(best);
    }

    /** Every selection that keeps all limits. */
    List<Sums> keeping() {
        return all.stream().filter(Sums::keeps).toList();
    }
}
