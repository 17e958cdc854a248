package shuntwright.planner.proof;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.IntStream;

import shuntwright.selection.Aim;
import shuntwright.selection.Option;
import shuntwright.selection.Selection;

/**
 * Options of a menu that are worth while: an option is left out when its margin is under the cap, or when another one orders the same, has
 * the same tap value and takes no more of any resource, and its margin, where margins count, is no less. Nothing is lost thereby: the
 * other one can stand in for it in any selection.
 */
final class Kept {

    private static final double TOLERANCE = 2e-9;

    private final List<Integer> options = new ArrayList<>();
    private final int[] standIn;

    private record Order(Map<Integer, Integer> lines, List<Integer> pools, int value) {}

    private Kept(Selection.Menu menu, boolean marginCounts, double mostNegativeMargin) {
        List<Option> all = menu.options();
        standIn = new int[all.size()];
        Arrays.fill(standIn, -1);
        Map<Order, List<Integer>> alike = new HashMap<>();
        for (int o = 0; o < all.size(); o++) {
            Option option = all.get(o);
            if (-option.margin() > mostNegativeMargin) {
                continue;
            }
            Order order = new Order(option.lines(), IntStream.of(option.pools()).boxed().toList(), option.value());
            alike.computeIfAbsent(order, _ -> new ArrayList<>()).add(o);
        }
        for (List<Integer> same : alike.values()) {
            for (int o : same) {
                int best = o;
                for (int other : same) {
                    if (covers(all.get(other), all.get(best), marginCounts)
                            && (other < best || !covers(all.get(best), all.get(other), marginCounts))) {
                        best = other;
                    }
                }
                standIn[o] = best;
            }
        }
        new TreeSet<>(IntStream.of(standIn).filter(o -> o >= 0).boxed().toList()).forEach(options::add);
    }

    /** Of each menu. */
    static List<Kept> of(Selection selection, boolean marginIsAim, List<Aim.Cap> caps) {
        double most = caps.stream().filter(cap -> cap.aim() instanceof Aim.LeastMargin).mapToDouble(Aim.Cap::most)
                .map(each -> each + TOLERANCE * Math.max(Math.abs(each), 1e-12)).min()
                .orElse(Double.POSITIVE_INFINITY);
        return selection.menus().stream().map(menu -> new Kept(menu, marginIsAim, most)).toList();
    }

    private static boolean covers(Option one, Option other, boolean marginCounts) {
        if (marginCounts && one.margin() < other.margin()) {
            return false;
        }
        TreeMap<Integer, Double> most = new TreeMap<>(other.resources());
        one.resources().keySet().forEach(resource -> most.putIfAbsent(resource, 0.0));
        return most.entrySet().stream().allMatch(each -> one.amount(each.getKey()) <= each.getValue());
    }

    /** Indices in the menu, ascending. */
    List<Integer> options() {
        return options;
    }

    /** The kept option that stands in for an option, itself for a kept one; -1 when its margin is under the cap. */
    int standIn(int option) {
        return standIn[option];
    }
}
