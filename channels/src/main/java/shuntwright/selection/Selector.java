package shuntwright.selection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import java.util.stream.IntStream;

/**
 * Selects: aim after aim by local search, each bounded before the next, which then must not lose what was reached. Repeats exactly for a
 * seed and a number of rounds, unless its watch or its prover cut in.
 */
public final class Selector {

    /** Rounds between two looks at the best so far. */
    private static final int LOOK = 25;

    private final Selection selection;
    private final Order order;
    private final Effort effort;
    private final Prover prover;
    private final Watch watch;
    private final State state;
    private final RandomGenerator random;
    private final List<Aim.Cap> caps;
    private final List<Answer.Reached> reached = new ArrayList<>();
    private int rounds;
    private boolean cutShort;
    private boolean fewest;

    /**
     * What is wanted.
     *
     * @param aims  the first decides
     * @param slack by which a later aim may worsen each aim, in its unit; one for each
     * @param caps  that hold besides the limits
     */
    public record Order(List<Aim> aims, List<Double> slack, List<Aim.Cap> caps) {
        public Order {
            aims = List.copyOf(aims);
            slack = List.copyOf(slack);
            caps = List.copyOf(caps);
        }
    }

    /**
     * How hard it is looked for.
     *
     * @param rounds     of the search for each aim
     * @param iterations of the bound for each aim
     * @param seed       of the search
     */
    public record Effort(int rounds, int iterations, long seed) {}

    private Selector(Selection selection, Order order, Effort effort, Prover prover, Watch watch) {
        this.selection = selection;
        this.order = order;
        this.effort = effort;
        this.prover = prover;
        this.watch = watch;
        this.state = new State(selection);
        this.random = RandomGeneratorFactory.of("L64X128MixRandom").create(effort.seed());
        this.caps = new ArrayList<>(order.caps());
    }

    /**
     * The best selection that is found.
     *
     * @param start option of each slot to start from, -1 where there is none; empty to start from the best of each slot by itself
     */
    public static Answer select(Selection selection, Order order, Effort effort, List<Integer> start, Prover prover,
            Watch watch) {
        return new Selector(selection, order, effort, prover, watch).run(start);
    }

    /** The selection as it is, judged by the aims. */
    public static Answer look(Selection selection, List<Aim> aims, List<Integer> choice) {
        State state = new State(selection);
        state.restore(choice.stream().mapToInt(Integer::intValue).toArray());
        return new Answer(choice, aims.stream()
                .map(aim -> new Answer.Reached(aim, state.value(aim), OptionalDouble.empty(), false)).toList(),
                broken(state), 0, false);
    }

    private Answer run(List<Integer> start) {
        First.of(selection, order.aims().isEmpty() ? new Aim.Cost() : order.aims().getFirst(), state);
        if (start.size() == state.choice.length && !start.isEmpty()) {
            startFromBetter(start);
        }
        if (order.aims().isEmpty()) {
            search(List.of());
        }
        for (int stage = 0; stage < order.aims().size(); stage++) {
            stage(stage);
        }
        return answer();
    }

    /** Takes the start, its gaps filled, when it leads to something at least as good as the first selection does. */
    private void startFromBetter(List<Integer> start) {
        Optional<int[]> filled = filled(start);
        if (filled.isEmpty()) {
            return;
        }
        int[] given = filled.get();
        Goal goal = new Goal(caps, order.aims(), false);
        double[] fresh = descended(goal);
        int[] freshChoice = state.choice.clone();
        state.restore(given);
        double[] old = descended(goal);
        if (Goal.compare(fresh, old) < 0) {
            state.restore(freshChoice);
        }
    }

    /** The start with its gaps filled, each group at one value; empty when that cannot be. */
    private Optional<int[]> filled(List<Integer> start) {
        int[] values = new int[selection.groups().size()];
        Arrays.fill(values, -1);
        for (int slot = 0; slot < state.choice.length; slot++) {
            int group = selection.menu(slot).group();
            if (group >= 0 && start.get(slot) >= 0) {
                int value = state.options(slot)[start.get(slot)].value;
                if (values[group] >= 0 && values[group] != value) {
                    return Optional.empty();
                }
                values[group] = value;
            }
        }
        int[] filled = state.choice.clone();
        for (int slot = 0; slot < filled.length; slot++) {
            int group = selection.menu(slot).group();
            if (start.get(slot) >= 0) {
                filled[slot] = start.get(slot);
            } else if (group >= 0 && values[group] >= 0 && state.options(slot)[filled[slot]].value != values[group]) {
                Option[] options = state.options(slot);
                filled[slot] = IntStream.range(0, options.length).filter(o -> options[o].value == values[group])
                        .findFirst()
                        .orElse(-1);
                if (filled[slot] < 0) {
                    return Optional.empty();
                }
            }
        }
        return Optional.of(filled);
    }

    private double[] descended(Goal goal) {
        LocalSearch search = new LocalSearch(selection, state, goal, random);
        search.descend();
        search.finish();
        double[] score = new double[goal.size()];
        goal.score(state, score);
        return score;
    }

    private void stage(int stage) {
        Aim aim = order.aims().get(stage);
        double value = search(order.aims().subList(stage, order.aims().size()));
        if (!fewest) {
            bounded(aim, value);
        } else {
            reached.add(new Answer.Reached(aim, state.value(aim), OptionalDouble.empty(), false));
        }
        double got = reached.getLast().value();
        caps.add(new Aim.Cap(aim, got + order.slack().get(stage)));
        watch.better(answer());
    }

    /** Searches for the first of the aims; its value at the best. */
    private double search(List<Aim> aims) {
        // With the first aim alone more choices are equal, so the search gets about more; then the others decide between equal ones.
        if (aims.size() > 1 && !search(aims.subList(0, 1), effort.rounds() / 2)) {
            return search(aims);
        }
        if (!search(aims, aims.size() > 1 ? effort.rounds() - effort.rounds() / 2 : effort.rounds())) {
            return search(aims);
        }
        return aims.isEmpty() ? 0 : state.value(aims.getFirst());
    }

    /** Rounds of search; false when limits are found not to be kept and it is to be searched again for fewest broken. */
    private boolean search(List<Aim> aims, int most) {
        LocalSearch search = new LocalSearch(selection, state, new Goal(caps, aims, fewest), random);
        search.descend();
        OptionalDouble bound = aims.isEmpty() ? OptionalDouble.empty() : Bounds.separable(selection, aims.getFirst());
        boolean done = search.holds()
                && (aims.isEmpty() || (bound.isPresent() && reaches(search.value(), bound.getAsDouble())));
        for (int from = 0; from < most && !done; from += LOOK) {
            int to = Math.min(most, from + LOOK);
            double before = aims.isEmpty() ? 0 : search.value();
            int run = search.rounds(from, to, most, watch);
            rounds += run;
            cutShort |= run < to - from;
            done = cutShort || (search.holds() && aims.isEmpty());
            if (!aims.isEmpty() && search.holds() && search.value() < before) {
                watch.better(look(selection, order.aims(), Arrays.stream(search.best()).boxed().toList()));
            }
        }
        search.finish();
        if (!search.holds() && !fewest) {
            // Broken as few as possible first, and only then how much.
            fewest = true;
            return false;
        }
        return true;
    }

    private static boolean reaches(double value, double bound) {
        return value - bound <= Goal.SAME * Math.max(Math.abs(value), Goal.SMALLEST);
    }

    private void bounded(Aim aim, double found) {
        double value = found;
        double bound = Bounds.separable(selection, aim).orElse(Double.NEGATIVE_INFINITY);
        boolean relaxes = switch (aim) {
            case Aim.Use _,Aim.Cost _,Aim.Lines _ -> true;
            case Aim.LargestShare _,Aim.LeastMargin _ -> false;
        };
        if (relaxes && !reaches(value, bound) && !selection.slots().isEmpty() && effort.iterations() > 0) {
            double relaxed = new Lagrangian(selection, Optional.of(aim), caps).bound(value, effort.iterations(), watch);
            bound = Math.max(bound, whole(aim, relaxed));
        }
        if (!reaches(value, bound) && !watch.ended()) {
            Prover.Finding finding = prover.ask(selection, new Prover.Question(caps, Optional.of(aim), choice()),
                    watch);
            value = taken(finding, aim, value);
            bound = Math.max(bound, whole(aim, finding.bound().orElse(Double.NEGATIVE_INFINITY)));
        }
        reached.add(new Answer.Reached(aim, value,
                bound == Double.NEGATIVE_INFINITY ? OptionalDouble.empty() : OptionalDouble.of(Math.min(bound, value)),
                reaches(value, bound)));
    }

    /** Takes over what a prover found if it keeps to everything and is better. */
    private double taken(Prover.Finding finding, Aim aim, double value) {
        if (finding.better().isEmpty() || finding.better().get().size() != state.choice.length) {
            return value;
        }
        int[] before = state.choice.clone();
        state.restore(finding.better().get().stream().mapToInt(Integer::intValue).toArray());
        state.refresh();
        if (new Goal(caps, List.of(aim), false).violation(state) == 0 && state.value(aim) < value) {
            return state.value(aim);
        }
        state.restore(before);
        state.refresh();
        return value;
    }

    /** Lines are whole, so their bound is. */
    private static double whole(Aim aim, double bound) {
        return aim instanceof Aim.Lines && bound > Double.NEGATIVE_INFINITY ? Math.ceil(bound - 1e-6) : bound;
    }

    private List<Integer> choice() {
        return IntStream.of(state.choice).boxed().toList();
    }

    private Answer answer() {
        List<Answer.Reached> now = new ArrayList<>();
        for (Answer.Reached each : reached) {
            // A later aim may have used its slack.
            now.add(new Answer.Reached(each.aim(), state.value(each.aim()), each.bound(),
                    each.proven() && reaches(state.value(each.aim()), each.bound().orElseThrow())));
        }
        for (int i = now.size(); i < order.aims().size(); i++) {
            now.add(new Answer.Reached(order.aims().get(i), state.value(order.aims().get(i)), OptionalDouble.empty(),
                    false));
        }
        return new Answer(choice(), now, broken(state), rounds, cutShort);
    }

    private static List<Integer> broken(State state) {
        return IntStream.range(0, state.use.length).filter(state::exceeded).boxed().toList();
    }
}
