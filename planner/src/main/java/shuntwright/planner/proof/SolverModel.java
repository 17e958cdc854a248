package shuntwright.planner.proof;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.ToLongFunction;

import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.LinearExpr;
import shuntwright.selection.Aim;
import shuntwright.selection.Option;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Selector;

/**
 * Selection and question as a model of whole numbers that is never stricter than they are: amounts, prices and fixed uses are rounded
 * down, limits and caps up, so that the solver's bound is one of the selection; a selection it finds has to be checked. Slots with the
 * same menu are not told apart: it counts how many of them take each option.
 */
final class SolverModel {

    private static final double TOLERANCE = 2e-9;
    /**
     * Digits of amounts. With 12 the solver (9.15) prepared one of our small models wrongly and called a selection best that is not; the
     * product of two numbers of 9 digits is far from what its own whole numbers hold.
     */
    private static final int DIGITS = 9;
    /** Digits of costs; prices have few decimals, so that they are mostly exact. */
    private static final int COST_DIGITS = 10;
    /** Prices of a piece that differ by less than this share of what a slot costs are told apart only by the sum of pieces. */
    private static final double SPREAD = Double.parseDouble(System.getProperty("spread", "0.01"));

    private final Selection selection;
    private final Prover.Question question;
    private final SolverVars vars = new SolverVars();
    private final int[] count;
    private final int[][] hint;
    private final List<Kept> kept;
    private final Var[][] taken;
    private final List<OrderModel> orders = new ArrayList<>();
    private final boolean impossible;
    private List<Double> levels = List.of();
    private int decimals;
    private BigDecimal constant = BigDecimal.ZERO;

    SolverModel(Selection selection, Prover.Question question) {
        this.selection = selection;
        this.question = question;
        count = new int[selection.menus().size()];
        selection.slots().forEach(slot -> count[slot.menu()]++);
        kept = Kept.of(selection, aims(Aim.LeastMargin.class) && question.aim().isPresent(), question.caps());
        hint = hint();
        taken = new Var[count.length][];
        impossible = someMenuIsEmpty();
        if (!impossible) {
            build();
        }
    }

    /** True when the caps leave a slot without any option. */
    boolean impossible() {
        return impossible;
    }

    CpModel model() {
        return vars.model;
    }

    /** The aim's value that a value of the solver's stands for; never more than is true. */
    double value(double solvers) {
        if (!levels.isEmpty()) {
            return levels.get((int) Math.max(0, Math.min(levels.size() - 1, Math.ceil(solvers - 1e-6))));
        }
        double value = new BigDecimal(solvers).scaleByPowerOfTen(-decimals).add(constant).doubleValue();
        return value - 1e-12 * Math.abs(value);
    }

    /** Option of each slot, from the solver's values. */
    List<Integer> choice(ToLongFunction<Var> values) {
        List<List<Integer>> byMenu = new ArrayList<>();
        for (int menu = 0; menu < count.length; menu++) {
            List<Integer> all = new ArrayList<>();
            for (int i = 0; count[menu] > 0 && i < taken[menu].length; i++) {
                all.addAll(
                        Collections.nCopies((int) values.applyAsLong(taken[menu][i]), kept.get(menu).options().get(i)));
            }
            byMenu.add(all);
        }
        int[] next = new int[count.length];
        return selection.slots().stream().map(slot -> byMenu.get(slot.menu()).get(next[slot.menu()]++)).toList();
    }

    private boolean aims(Class<? extends Aim> kind) {
        return question.aim().filter(kind::isInstance).isPresent();
    }

    private boolean caps(Class<? extends Aim> kind) {
        return question.caps().stream().map(Aim.Cap::aim).anyMatch(kind::isInstance);
    }

    /** How many slots take each option of each menu in the selection known beforehand; those that stand in for others count. */
    private int[][] hint() {
        int[][] counts = new int[count.length][];
        for (int menu = 0; menu < counts.length; menu++) {
            counts[menu] = new int[selection.menus().get(menu).options().size()];
        }
        if (question.hint().size() == selection.slots().size()) {
            for (int slot = 0; slot < question.hint().size(); slot++) {
                int menu = selection.slots().get(slot).menu();
                int standIn = kept.get(menu).standIn(question.hint().get(slot));
                if (standIn >= 0) {
                    counts[menu][standIn]++;
                }
            }
        }
        return counts;
    }

    private boolean someMenuIsEmpty() {
        for (int menu = 0; menu < count.length; menu++) {
            if (count[menu] > 0 && kept.get(menu).options().isEmpty()) {
                return true;
            }
        }
        return false;
    }

    private void build() {
        boolean money = aims(Aim.Cost.class) || aims(Aim.Lines.class) || caps(Aim.Cost.class) || caps(Aim.Lines.class);
        double leastSpread = SPREAD * size(new Aim.Cost()) / selection.slots().size();
        int[] most = most();
        for (int line = 0; line < most.length; line++) {
            orders.add(new OrderModel(selection, line, most[line], vars));
        }
        for (int menu = 0; menu < count.length; menu++) {
            if (count[menu] > 0) {
                slots(menu);
            }
        }
        groups();
        for (OrderModel order : orders) {
            order.build(money, leastSpread);
        }
        limits();
        question.caps().forEach(cap -> cap(cap.aim(), cap.most()));
        question.aim().ifPresent(this::aim);
        if (question.hint().size() == selection.slots().size()) {
            vars.hint();
        }
    }

    /** Most pieces of each line on one board. */
    private int[] most() {
        int[] most = selection.lines().stream().mapToInt(Selection.Line::fixed).toArray();
        for (int menu = 0; menu < count.length; menu++) {
            int[] largest = new int[most.length];
            for (int o : kept.get(menu).options()) {
                Option option = selection.menus().get(menu).options().get(o);
                Map<Integer, Integer> pieces = new TreeMap<>(option.lines());
                for (int pool : option.pools()) {
                    pieces.merge(selection.pools().get(pool).line(), 1, Integer::sum);
                }
                pieces.forEach((line, n) -> largest[line] = Math.max(largest[line], n));
            }
            for (int line = 0; line < most.length; line++) {
                most[line] = Math.addExact(most[line], Math.multiplyExact(largest[line], count[menu]));
            }
        }
        return most;
    }

    private void slots(int menu) {
        List<Integer> options = kept.get(menu).options();
        taken[menu] = new Var[options.size()];
        Sum all = new Sum();
        for (int i = 0; i < taken[menu].length; i++) {
            Var var = vars.whole(count[menu], hint[menu][options.get(i)]);
            taken[menu][i] = var;
            all.add(1, var);
            Option option = option(menu, i);
            option.lines().forEach((line, pieces) -> {
                if (pieces > 0) {
                    orders.get(line).takes(menu, count[menu], pieces, var);
                }
            });
            for (int pool : option.pools()) {
                orders.get(selection.pools().get(pool).line()).takesSection(pool, menu, count[menu], var);
            }
        }
        vars.equal(all, count[menu]);
    }

    private Option option(int menu, int index) {
        return selection.menus().get(menu).options().get(kept.get(menu).options().get(index));
    }

    /** All slots of a group at the same value. */
    private void groups() {
        for (int group = 0; group < selection.groups().size(); group++) {
            List<Map<Integer, Sum>> byValue = new ArrayList<>();
            List<Integer> counts = new ArrayList<>();
            for (int menu = 0; menu < count.length; menu++) {
                if (count[menu] > 0 && selection.menus().get(menu).group() == group) {
                    Map<Integer, Sum> sums = new TreeMap<>();
                    for (int i = 0; i < taken[menu].length; i++) {
                        sums.computeIfAbsent(option(menu, i).value(), _ -> new Sum()).add(1, taken[menu][i]);
                    }
                    byValue.add(sums);
                    counts.add(count[menu]);
                }
            }
            if (byValue.isEmpty()) {
                continue;
            }
            Sum one = new Sum();
            for (int value = 0; value < selection.groups().get(group); value++) {
                int now = value;
                boolean hinted = byValue.getFirst().getOrDefault(value, new Sum()).hint() > 0;
                Var at = vars.whole(1, hinted ? 1 : 0);
                one.add(1, at);
                for (int i = 0; i < counts.size(); i++) {
                    vars.equal(new Sum().add(counts.get(i), at)
                            .add(-1, byValue.get(i).getOrDefault(now, new Sum())), 0);
                }
            }
            vars.equal(one, 1);
        }
    }

    private void limits() {
        for (int r = 0; r < selection.resources().size(); r++) {
            OptionalDouble limit = selection.resources().get(r).limit();
            if (limit.isPresent()) {
                most(use(r), limit.getAsDouble() * (1 + TOLERANCE), DIGITS);
            }
        }
    }

    private void cap(Aim aim, double most) {
        double with = most + TOLERANCE * Math.max(Math.abs(most), 1e-12);
        switch (aim) {
            case Aim.Use(int resource) -> most(use(resource), with, DIGITS);
            case Aim.LargestShare _ -> selection.even().forEach(r -> most(use(r), with * limit(r), DIGITS));
            case Aim.Cost _ -> most(cost(), with, COST_DIGITS);
            case Aim.Lines _ -> vars.atMost(lines(), (long) Math.floor(with + 1e-6));
            case Aim.LeastMargin _ -> {
                // Options of less margin are not kept.
            }
        }
    }

    private double limit(int resource) {
        return selection.resources().get(resource).limit().orElse(Double.POSITIVE_INFINITY);
    }

    /** The sum, its constant with it, is no more than this; rounded so that nothing is lost. */
    private void most(Sum sum, double most, int digits) {
        if (Double.isInfinite(most) && most > 0) {
            return;
        }
        BigDecimal room = new BigDecimal(most).subtract(sum.constant());
        int at = sum.decimals(Math.max(Math.abs(room.doubleValue()), Math.abs(most)), digits);
        // The terms are whole, so the largest whole number under the room is no stricter than the room.
        BigDecimal far = sum.most().add(BigDecimal.ONE);
        vars.model.addLessOrEqual(sum.floor(at), Sum.floor(room.max(far.negate()).min(far), at));
    }

    private Sum use(int resource) {
        Sum sum = new Sum().plus(BigDecimal.valueOf(selection.resources().get(resource).fixed()));
        for (int menu = 0; menu < count.length; menu++) {
            for (int i = 0; count[menu] > 0 && i < taken[menu].length; i++) {
                double amount = option(menu, i).amount(resource);
                if (amount != 0) {
                    sum.add(amount, taken[menu][i]);
                }
            }
        }
        for (int pool = 0; pool < selection.pools().size(); pool++) {
            Selection.Pool each = selection.pools().get(pool);
            Sum packages = orders.get(each.line()).packages.get(pool);
            if (each.resource() == resource && packages != null) {
                sum.add(BigDecimal.valueOf(each.amount()), packages);
            }
        }
        return sum;
    }

    private Sum cost() {
        Sum sum = new Sum();
        for (OrderModel order : orders) {
            sum.add(1, order.cost);
        }
        return sum;
    }

    private Sum lines() {
        Sum sum = new Sum();
        for (OrderModel order : orders) {
            sum.add(1, order.there);
        }
        return sum;
    }

    private void aim(Aim aim) {
        double size = size(aim);
        switch (aim) {
            case Aim.Use(int resource) -> least(use(resource), size, DIGITS);
            case Aim.Cost _ -> least(cost(), size, COST_DIGITS);
            case Aim.Lines _ -> vars.model.minimize(lines().exact());
            case Aim.LargestShare _ -> leastShare();
            case Aim.LeastMargin _ -> leastMargin();
        }
    }

    /** About how large values of an aim are. */
    private double size(Aim aim) {
        List<Integer> known = question.hint().size() == selection.slots().size()
                ? question.hint()
                : Collections.nCopies(selection.slots().size(), 0);
        return Math.abs(Selector.look(selection, List.of(aim), known).reached().getFirst().value());
    }

    private void least(Sum sum, double size, int digits) {
        decimals = sum.decimals(size, digits);
        constant = sum.constant();
        vars.model.minimize(sum.floor(decimals));
    }

    private void leastShare() {
        decimals = DIGITS - 1;
        List<Sum> shares = new ArrayList<>();
        long hinted = 0;
        BigDecimal most = BigDecimal.ONE;
        for (int resource : selection.even()) {
            BigDecimal perShare = BigDecimal.ONE.divide(new BigDecimal(limit(resource)),
                    MathContext.DECIMAL128);
            Sum use = use(resource);
            Sum share = new Sum().add(perShare, use);
            shares.add(share);
            most = most.max(share.most().add(share.constant()));
        }
        for (Sum share : shares) {
            hinted = Math.max(hinted, share.hintFloor(decimals) + Sum.floor(share.constant(), decimals));
        }
        Var largest = vars.whole(Sum.floor(most, decimals) + 1, Math.max(0, hinted));
        for (Sum share : shares) {
            vars.model.addLessOrEqual(LinearExpr.newBuilder().add(share.floor(decimals))
                    .addTerm(largest.it(), -1).build(), -Sum.floor(share.constant(), decimals));
        }
        vars.model.minimize(largest.it());
    }

    /** The margins there are, the widest first; the solver looks for the first at which all slots find an option. */
    private void leastMargin() {
        TreeSet<Double> all = new TreeSet<>();
        for (int menu = 0; menu < count.length; menu++) {
            for (int i = 0; count[menu] > 0 && i < taken[menu].length; i++) {
                all.add(-option(menu, i).margin());
            }
        }
        levels = List.copyOf(all);
        double[] sorted = levels.stream().mapToDouble(Double::doubleValue).toArray();
        List<Sum> worst = new ArrayList<>();
        long hinted = 0;
        for (int menu = 0; menu < count.length; menu++) {
            Sum sum = new Sum();
            for (int i = 0; count[menu] > 0 && i < taken[menu].length; i++) {
                long level = Math.max(0, Arrays.binarySearch(sorted, -option(menu, i).margin()));
                Var var = taken[menu][i];
                hinted = var.hint() > 0 ? Math.max(hinted, level) : hinted;
                if (count[menu] == 1) {
                    sum.add(level, var);
                } else {
                    Var any = vars.whole(1, var.hint() > 0 ? 1 : 0);
                    vars.notNegative(new Sum().add(count[menu], any).add(-1, var));
                    worst.add(new Sum().add(level, any));
                }
            }
            worst.add(sum);
        }
        Var largest = vars.whole(Math.max(0, sorted.length - 1), hinted);
        worst.stream().filter(sum -> !sum.empty())
                .forEach(sum -> vars.notNegative(Sum.of(largest).add(-1, sum)));
        vars.model.minimize(largest.it());
    }
}
