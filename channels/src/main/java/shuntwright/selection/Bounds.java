package shuntwright.selection;

import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;

/** Bounds of aims that need no search: what each slot needs at least, whatever the others do. */
final class Bounds {

    private Bounds() {
    }

    /** Least use of a resource by limits of nothing else; packages are counted by the share of them that is taken. */
    static double leastUse(Selection selection, int resource) {
        return selection.resources().get(resource).fixed()
                + least(selection, option -> amount(selection, option, resource));
    }

    /** What an option takes of a resource at least, with its share of packages. */
    static double amount(Selection selection, Option option, int resource) {
        double amount = option.amount(resource);
        for (int pool : option.pools) {
            Selection.Pool each = selection.pools().get(pool);
            if (each.resource() == resource) {
                amount += each.amount() / each.sections();
            }
        }
        return amount;
    }

    /** Least sum over all slots of what an option weighs; the slots of a group at the value that is best for all of them. */
    static double least(Selection selection, ToDoubleFunction<Option> weight) {
        double sum = 0;
        double[][] groups = new double[selection.groups().size()][];
        for (int group = 0; group < groups.length; group++) {
            groups[group] = new double[selection.groups().get(group)];
        }
        for (Selection.Slot slot : selection.slots()) {
            Selection.Menu menu = selection.menus().get(slot.menu());
            if (menu.group() < 0) {
                sum += menu.options().stream().mapToDouble(weight).min().orElseThrow();
            } else {
                double[] least = new double[groups[menu.group()].length];
                java.util.Arrays.fill(least, Double.POSITIVE_INFINITY);
                for (Option option : menu.options()) {
                    least[option.value] = Math.min(least[option.value], weight.applyAsDouble(option));
                }
                for (int value = 0; value < least.length; value++) {
                    groups[menu.group()][value] += least[value];
                }
            }
        }
        for (double[] group : groups) {
            sum += java.util.Arrays.stream(group).min().orElse(0);
        }
        return sum;
    }

    /** A bound of an aim from single slots; empty where lines are what costs. */
    static OptionalDouble separable(Selection selection, Aim aim) {
        return switch (aim) {
            case Aim.Use(int resource) -> OptionalDouble.of(leastUse(selection, resource));
            case Aim.LargestShare _ -> OptionalDouble.of(selection.even().stream()
                    .mapToDouble(r -> leastUse(selection, r) / selection.resources().get(r).most()).max().orElse(0));
            case Aim.LeastMargin _ -> OptionalDouble.of(selection.slots().stream()
                    .mapToDouble(slot -> -selection.menus().get(slot.menu()).options().stream()
                            .mapToDouble(Option::margin).max().orElseThrow())
                    .max().orElse(Double.NEGATIVE_INFINITY));
            case Aim.Cost _,Aim.Lines _ -> OptionalDouble.empty();
        };
    }
}
