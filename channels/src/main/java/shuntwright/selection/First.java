package shuntwright.selection;

import java.util.Arrays;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** A selection to start from: the best option of each slot by itself. */
final class First {

    private First() {
    }

    /** Gives every slot of the state its option. */
    static void of(Selection selection, Aim aim, State state) {
        int[] caps = State.caps(selection);
        ToDoubleFunction<Option> weight = switch (aim) {
            case Aim.Use(int resource) -> option -> Bounds.amount(selection, option, resource);
            case Aim.LargestShare _ -> option -> selection.even().stream()
                    .mapToDouble(r -> Bounds.amount(selection, option, r)).sum();
            case Aim.LeastMargin _ -> option -> -option.margin;
            case Aim.Cost _,Aim.Lines _ -> option -> price(selection, caps, option);
        };
        int[] value = values(selection, weight);
        for (int slot = 0; slot < state.choice.length; slot++) {
            int group = selection.menu(slot).group();
            List<Option> options = selection.options(slot);
            int best = -1;
            double least = Double.POSITIVE_INFINITY;
            for (int option = 0; option < options.size(); option++) {
                double each = weight.applyAsDouble(options.get(option));
                boolean fits = group < 0 || options.get(option).value == value[group];
                if (fits && (best < 0 || each < least)) {
                    least = each;
                    best = option;
                }
            }
            if (best < 0) {
                throw new IllegalArgumentException("a slot of group " + group + " has no option at any value of all");
            }
            state.set(slot, best);
        }
        System.arraycopy(value, 0, state.value, 0, value.length);
    }

    /** Price of an option when everybody bought its parts. */
    private static double price(Selection selection, int[] caps, Option option) {
        double price = 0;
        for (int i = 0; i < option.lines.length; i++) {
            int cap = Math.max(1, caps[option.lines[i]]);
            price += option.pieces[i] * selection.cost(option.lines[i], cap) / cap;
        }
        for (int pool : option.pools) {
            Selection.Pool each = selection.pools().get(pool);
            int cap = Math.max(1, caps[each.line()]);
            price += selection.cost(each.line(), cap) / cap / each.sections();
        }
        return price;
    }

    /** For each group the value at which its slots weigh least together. */
    private static int[] values(Selection selection, ToDoubleFunction<Option> weight) {
        int groups = selection.groups().size();
        double[][] sums = new double[groups][];
        for (int group = 0; group < groups; group++) {
            sums[group] = new double[selection.groups().get(group)];
        }
        for (Selection.Slot slot : selection.slots()) {
            Selection.Menu menu = selection.menus().get(slot.menu());
            if (menu.group() >= 0) {
                double[] least = new double[sums[menu.group()].length];
                Arrays.fill(least, Double.POSITIVE_INFINITY);
                for (Option option : menu.options()) {
                    least[option.value] = Math.min(least[option.value], weight.applyAsDouble(option));
                }
                for (int value = 0; value < least.length; value++) {
                    sums[menu.group()][value] += least[value];
                }
            }
        }
        int[] best = new int[groups];
        for (int group = 0; group < groups; group++) {
            for (int value = 1; value < sums[group].length; value++) {
                best[group] = sums[group][value] < sums[group][best[group]] ? value : best[group];
            }
        }
        return best;
    }
}
