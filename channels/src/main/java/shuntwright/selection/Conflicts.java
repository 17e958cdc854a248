package shuntwright.selection;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;

/**
 * Finds a smallest set of limits and slots that cannot be brought together: single resources first, whose least use is known exactly; else
 * one limit and one slot after the other is left out as long as what remains is proven impossible.
 */
public final class Conflicts {

    private static final int ROUNDS = 120;
    private static final int ITERATIONS = 400;

    private final Selection selection;
    private final Prover prover;
    private final long seed;
    private final Watch watch;

    /**
     * What cannot be brought together.
     *
     * @param limits  resources, by index
     * @param slots   by index
     * @param minimal true when for each of them a selection is known that keeps all the others
     */
    public record Core(List<Integer> limits, List<Integer> slots, boolean minimal) {
        public Core {
            limits = List.copyOf(limits);
            slots = List.copyOf(slots);
        }
    }

    private enum Answered {
        POSSIBLE, IMPOSSIBLE, UNKNOWN
    }

    private Conflicts(Selection selection, Prover prover, long seed, Watch watch) {
        this.selection = selection;
        this.prover = prover;
        this.seed = seed;
        this.watch = watch;
    }

    /** A core; empty when the limits can be kept, or when nothing could be proven. */
    public static Optional<Core> find(Selection selection, Prover prover, long seed, Watch watch) {
        return new Conflicts(selection, prover, seed, watch).find();
    }

    /** Least use of a resource when all other limits are kept; empty when that was not found. */
    public static OptionalDouble needed(Selection selection, int resource, long seed, Watch watch) {
        List<Integer> others = limited(selection).stream().filter(r -> r != resource).toList();
        Selection relaxed = selection.with(all(selection), others);
        Answer answer = Selector.select(relaxed,
                new Selector.Order(List.of(new Aim.Use(resource)), List.of(0.0), List.of()),
                new Selector.Effort(ROUNDS, 0, seed), List.of(), Prover.NONE, watch);
        return answer.keepsLimits() ? OptionalDouble.of(answer.reached().getFirst().value()) : OptionalDouble.empty();
    }

    /** True when a selection is found that keeps all limits. */
    public static boolean possible(Selection selection, long seed, Watch watch) {
        return Selector.select(selection, new Selector.Order(List.of(), List.of(), List.of()),
                new Selector.Effort(ROUNDS, 0, seed), List.of(), Prover.NONE, watch).keepsLimits();
    }

    /** Use of a resource that cannot be avoided, whatever becomes of all other limits. */
    public static double leastUse(Selection selection, int resource) {
        return Bounds.leastUse(selection, resource);
    }

    private static List<Integer> all(Selection selection) {
        return IntStream.range(0, selection.slots().size()).boxed().toList();
    }

    private static List<Integer> limited(Selection selection) {
        return IntStream.range(0, selection.resources().size())
                .filter(r -> selection.resources().get(r).limit().isPresent()).boxed().toList();
    }

    private Optional<Core> find() {
        List<Integer> limits = limited(selection);
        List<Integer> slots = all(selection);
        Optional<Integer> single = limits.stream().filter(r -> over(selection, r))
                .max(Comparator
                        .comparingDouble(r -> Bounds.leastUse(selection, r) / selection.resources().get(r).most()));
        if (single.isPresent()) {
            limits = List.of(single.get());
        } else if (answered(selection) != Answered.IMPOSSIBLE) {
            return Optional.empty();
        }
        limits = reduced(limits, kept -> answered(selection.with(all(selection), kept)) == Answered.IMPOSSIBLE);
        List<Integer> least = limits;
        slots = reducedSlots(bySize(slots, limits), least);
        return Optional.of(new Core(least, slots.stream().sorted().toList(), minimal(least, slots)));
    }

    /** Those first that take least of what is short, so that few large ones remain. */
    private List<Integer> bySize(List<Integer> slots, List<Integer> limits) {
        return slots.stream().sorted(Comparator.comparingDouble(slot -> limits.stream()
                .mapToDouble(r -> selection.options(slot).stream()
                        .mapToDouble(option -> Bounds.amount(selection, option, r)).min().orElse(0)
                        / Math.max(selection.resources().get(r).most(), Goal.SMALLEST))
                .sum())).toList();
    }

    private static boolean over(Selection selection, int resource) {
        Selection.Resource each = selection.resources().get(resource);
        return each.limit().isPresent() && Bounds.leastUse(selection, resource) > each.most() * (1 + Goal.SAME);
    }

    private interface Test {
        boolean impossible(List<Integer> kept);
    }

    private static List<Integer> reduced(List<Integer> members, Test test) {
        List<Integer> kept = members;
        for (Integer each : members) {
            List<Integer> fewer = kept.stream().filter(other -> !other.equals(each)).toList();
            if (!fewer.isEmpty() && test.impossible(fewer)) {
                kept = fewer;
            }
        }
        return kept;
    }

    /** Halves as large as can be left out at once, then single ones. */
    private List<Integer> reducedSlots(List<Integer> slots, List<Integer> limits) {
        List<Integer> kept = new ArrayList<>(slots);
        for (int size = Math.max(1, slots.size() / 2); size >= 1; size /= 2) {
            for (int from = 0; from < kept.size();) {
                List<Integer> fewer = new ArrayList<>(kept);
                fewer.subList(from, Math.min(kept.size(), from + size)).clear();
                if (answered(selection.with(fewer, limits)) == Answered.IMPOSSIBLE) {
                    kept = fewer;
                } else {
                    from += size;
                }
            }
        }
        return kept;
    }

    private boolean minimal(List<Integer> limits, List<Integer> slots) {
        for (Integer each : limits) {
            List<Integer> fewer = limits.stream().filter(r -> !r.equals(each)).toList();
            if (answered(selection.with(slots, fewer)) != Answered.POSSIBLE) {
                return false;
            }
        }
        for (Integer each : slots) {
            List<Integer> fewer = slots.stream().filter(s -> !s.equals(each)).toList();
            if (answered(selection.with(fewer, limits)) != Answered.POSSIBLE) {
                return false;
            }
        }
        return true;
    }

    private Answered answered(Selection part) {
        for (int r = 0; r < part.resources().size(); r++) {
            if (over(part, r)) {
                return Answered.IMPOSSIBLE;
            }
        }
        if (part.slots().isEmpty() || possible(part, seed, watch)) {
            return Answered.POSSIBLE;
        }
        Lagrangian relaxed = new Lagrangian(part, Optional.empty(), List.of());
        relaxed.bound(0, ITERATIONS, watch);
        if (relaxed.impossible()) {
            return Answered.IMPOSSIBLE;
        }
        return prover.ask(part, new Prover.Question(List.of(), Optional.empty(), List.of()), watch).impossible()
                ? Answered.IMPOSSIBLE
                : Answered.UNKNOWN;
    }
}
