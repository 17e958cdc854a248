package shuntwright.choice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.circuit.LimitRules;
import shuntwright.circuit.SenseCircuit;
import shuntwright.parts.Hysteresis;

/**
 * Chooses for one channel: of all circuits that respect every limit and are accepted, those with least heat, then least
 * cost; where none is accepted, the nearest one that respects the limits; where there is none, the reasons.
 */
public final class ChannelPicker {

    /** Heats and costs closer than this, relative, count as equal. */
    private static final double SAME = 1e-9;
    private static final int MOST_TIES = 4;
    private static final int NEAREST_PAIRS = 40;
    private static final int NEAREST_CIRCUITS = 60;

    private final DividerTables tables;

    public ChannelPicker(DividerTables tables) {
        this.tables = tables;
    }

    /** How many combinations of shunts and amplifier there are, and how many are promising. */
    public record Count(int combinations, int promising) {}

    /** Runs only the search for candidates, one shunt after the other as the choice does. */
    public static Count count(ChannelProblem problem) {
        CandidateSearch search = new CandidateSearch(problem);
        Candidates found = new Candidates();
        int promising = 0;
        for (int shunt = 0; shunt < search.shunts(); shunt++) {
            found.clear();
            search.promising(shunt, shunt + 1, found);
            promising += found.size();
        }
        return new Count(search.combinations(), promising);
    }

    /** The choice; a pure function of the problem. */
    public ChannelChoice pick(ChannelProblem problem) {
        CandidateSearch search = new CandidateSearch(problem);
        List<shuntwright.parts.Comparator> comparators = comparators(problem);
        Judge judge = new Judge(problem);
        Optional<ChannelChoice> accepted = accepted(problem, search, comparators, judge);
        if (accepted.isPresent()) {
            return accepted.get();
        }
        return nearest(problem, search, comparators, judge)
                .<ChannelChoice>map(ChannelChoice.Nearest::new)
                .orElseGet(() -> new ChannelChoice.NoFit(Refusals.of(problem, tables)));
    }

    /** True when some circuit is accepted; cheaper than {@link #pick} when none is. */
    public boolean accepts(ChannelProblem problem) {
        CandidateSearch search = new CandidateSearch(problem);
        return accepted(problem, search, comparators(problem), new Judge(problem)).isPresent();
    }

    /** The comparators that respect their own limits and suit the demanded release. */
    static List<shuntwright.parts.Comparator> comparators(ChannelProblem problem) {
        Optional<String> pinned = problem.demand().channel().pins().comparator();
        return problem.catalogue().comparators().stream()
                .filter(each -> pinned.isEmpty() || pinned.get().equals(each.partNumber()))
                .filter(each -> suits(each, problem, pinned.isPresent()))
                .filter(each -> CandidateSearch.holds(
                        LimitRules.ofComparator(each, problem.pullUp().voltage().max(), problem.around())))
                .toList();
    }

    /** Positive feedback on a shared tap or line couples channels, so it is taken only where the user has pinned it. */
    static boolean suits(shuntwright.parts.Comparator comparator, ChannelProblem problem, boolean pinned) {
        boolean rearms = problem.demand().rearm().isPresent();
        return switch (comparator.hysteresis()) {
            case Hysteresis.Latched _ -> !rearms;
            case Hysteresis.PositiveFeedback _ ->
                rearms && (pinned || (problem.tap().isEmpty() && !problem.pullUp().sharedLine()));
            case Hysteresis.InjectedCurrent _,Hysteresis.BuiltIn _ -> rearms;
        };
    }

    private Optional<ChannelChoice> accepted(ChannelProblem problem, CandidateSearch search,
            List<shuntwright.parts.Comparator> comparators, Judge judge) {
        Candidates found = new Candidates();
        Completions completions = new Completions(problem, search, found, comparators, tables,
                Prices.ofOneChannel(problem.buildQuantity()));
        int from = 0;
        while (from < search.shunts()) {
            int to = within(search, from, search.shunt(from).heat);
            List<SenseCircuit> circuits = cheapest(search, from, to, found, completions, judge);
            if (!circuits.isEmpty()) {
                double step = problem.around().rules().heatStep();
                return Optional.of(new ChannelChoice.Accepted(step == 0
                        ? circuits
                        : cheapest(search, from, within(search, from, search.shunt(from).heat + step), found,
                                completions, judge)));
            }
            from = to;
        }
        return Optional.empty();
    }

    /** The first of the shunts from {@code from} on whose heat exceeds {@code heat}. */
    private static int within(CandidateSearch search, int from, double heat) {
        int to = from;
        while (to < search.shunts() && search.shunt(to).heat <= heat * (1 + SAME)) {
            to++;
        }
        return to;
    }

    private static List<SenseCircuit> cheapest(CandidateSearch search, int from, int to, Candidates found,
            Completions completions, Judge judge) {
        found.clear();
        search.promising(from, to, found);
        return found.size() == 0 ? List.of() : firstAccepted(completions.cheapestFirst(), completions, judge);
    }

    private static List<SenseCircuit> firstAccepted(Completions.CheapestFirst options, Completions completions,
            Judge judge) {
        List<SenseCircuit> circuits = new ArrayList<>();
        double cost = Double.POSITIVE_INFINITY;
        while (options.hasNext() && circuits.size() < MOST_TIES) {
            Completions.Option option = options.next();
            if (option.cost() > cost * (1 + SAME)) {
                break;
            }
            for (SenseCircuit circuit : completions.build(option)) {
                if (judge.accepts(circuit)) {
                    circuits.add(circuit);
                    cost = option.cost();
                }
            }
        }
        return circuits;
    }

    private Optional<SenseCircuit> nearest(ChannelProblem problem, CandidateSearch search,
            List<shuntwright.parts.Comparator> comparators, Judge judge) {
        Candidates found = search.nearest(NEAREST_PAIRS);
        Completions completions = new Completions(problem, search, found, comparators, tables,
                Prices.ofOneChannel(problem.buildQuantity()));
        List<Completions.Option> options = completions.all();
        options.sort(Comparator.comparingDouble(Completions.Option::room).reversed());
        SenseCircuit best = null;
        double margin = Double.NEGATIVE_INFINITY;
        int looked = 0;
        for (Completions.Option option : options) {
            for (SenseCircuit circuit : completions.build(option)) {
                OptionalDouble reached = judge.margin(circuit);
                if (reached.isEmpty()) {
                    continue;
                }
                looked++;
                if (reached.getAsDouble() > margin) {
                    margin = reached.getAsDouble();
                    best = circuit;
                }
            }
            if (looked >= NEAREST_CIRCUITS) {
                break;
            }
        }
        return Optional.ofNullable(best);
    }
}
