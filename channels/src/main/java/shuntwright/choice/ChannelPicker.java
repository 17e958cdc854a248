package shuntwright.choice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

import shuntwright.board.Acceptance;
import shuntwright.circuit.LimitRules;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Range;

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

    /** Runs only the search for candidates. */
    public Count count(ChannelProblem problem) {
        CandidateSearch search = new CandidateSearch(problem);
        return new Count(search.combinations(), search.promising().size());
    }

    /** The choice; a pure function of the problem. */
    public ChannelChoice pick(ChannelProblem problem) {
        CandidateSearch search = new CandidateSearch(problem);
        List<shuntwright.parts.Comparator> comparators = comparators(problem);
        Judge judge = new Judge(problem);
        Optional<ChannelChoice> accepted = accepted(problem, search, search.promising(), comparators, judge);
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
        return accepted(problem, search, search.promising(), comparators(problem), new Judge(problem)).isPresent();
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

    /** One way to complete a candidate. */
    private record Option(int candidate, shuntwright.parts.Comparator comparator, Optional<SourceVoltage> source,
            ResistorSeries resistors, double cost, double room) {}

    private Optional<ChannelChoice> accepted(ChannelProblem problem, CandidateSearch search, Candidates found,
            List<shuntwright.parts.Comparator> comparators, Judge judge) {
        CircuitBuilder builder = new CircuitBuilder(problem, tables);
        double step = problem.around().rules().heatStep();
        int from = 0;
        while (from < found.size()) {
            double heat = search.shunt(found.shunt(from)).heat;
            int to = from;
            List<Option> options = new ArrayList<>();
            while (to < found.size() && search.shunt(found.shunt(to)).heat <= heat * (1 + SAME) + step) {
                options(problem, search, found, to, comparators, true, options);
                to++;
            }
            options.sort(Comparator.comparingDouble(Option::cost).thenComparing(Comparator.comparingDouble(
                    Option::room).reversed()));
            List<SenseCircuit> circuits = firstAccepted(search, found, options, builder, judge);
            if (!circuits.isEmpty()) {
                return Optional.of(new ChannelChoice.Accepted(circuits));
            }
            from = to;
        }
        return Optional.empty();
    }

    private static List<SenseCircuit> firstAccepted(CandidateSearch search, Candidates found,
            List<Option> options, CircuitBuilder builder, Judge judge) {
        List<SenseCircuit> circuits = new ArrayList<>();
        double cost = Double.POSITIVE_INFINITY;
        for (Option option : options) {
            if (option.cost() > cost * (1 + SAME) || circuits.size() >= MOST_TIES) {
                break;
            }
            for (SenseCircuit circuit : build(search, found, option, builder)) {
                if (judge.accepts(circuit)) {
                    circuits.add(circuit);
                    cost = option.cost();
                }
            }
        }
        return circuits;
    }

    private static List<SenseCircuit> build(CandidateSearch search, Candidates found,
            Option option, CircuitBuilder builder) {
        ShuntTerms shunt = search.shunt(found.shunt(option.candidate()));
        Window window = search.window(found, option.candidate(), option.comparator());
        return builder.build(shunt, search.amplifiers(), found.amplifier(option.candidate()), window,
                option.source(), option.resistors());
    }

    private void options(ChannelProblem problem, CandidateSearch search, Candidates found, int candidate,
            List<shuntwright.parts.Comparator> comparators, boolean strict, List<Option> options) {
        ShuntTerms shunt = search.shunt(found.shunt(candidate));
        if (strict && problem.acceptance().basis() == Acceptance.Basis.LIMITS
                && !roomForAny(problem, search, found, candidate)
                && comparators.stream().noneMatch(ChannelPicker::feedsBack)) {
            return;
        }
        double base = shunt.cost + search.amplifiers().cost[found.amplifier(candidate)];
        double[] ratios = new double[2];
        for (shuntwright.parts.Comparator comparator : comparators) {
            Window window = search.window(found, candidate, comparator);
            double cost = base
                    + comparator.purchase().unitPriceAt(problem.buildQuantity()) / comparator.sections();
            for (ResistorSeries resistors : problem.resistors()) {
                double own = cost + resistorCount(comparator, problem)
                        * resistors.purchase().unitPriceAt(problem.buildQuantity());
                if (problem.tap().isPresent()) {
                    double room = tapRoom(window, problem.tap().get(), resistors);
                    if (!strict || tapMayServe(problem, window, resistors, room)) {
                        options.add(new Option(candidate, comparator, Optional.empty(), resistors, own, room));
                    }
                }
                for (SourceVoltage source : problem.sources()) {
                    window.ratios(source, resistors, ratios);
                    if (!strict || mayServe(problem, window, source, resistors, ratios)) {
                        double room = ratios[1] / ratios[0] - 1;
                        options.add(new Option(candidate, comparator, Optional.of(source), resistors, own, room));
                    }
                }
            }
        }
    }

    /** False only when the spread of every source alone exceeds the candidate's window. */
    private static boolean roomForAny(ChannelProblem problem, CandidateSearch search, Candidates found,
            int candidate) {
        double[] tightest = search.thresholds().tightest;
        return problem.tap().isPresent()
                || (found.high(candidate, 0) >= found.low(candidate, 0) * tightest[0]
                        && found.high(candidate, 1) >= found.low(candidate, 1) * tightest[1]);
    }

    /** False only when no pair of this series can serve from this source. */
    private boolean mayServe(ChannelProblem problem, Window window, SourceVoltage source, ResistorSeries resistors,
            double[] ratios) {
        if (feedsBack(window.comparator) || problem.acceptance().basis() == Acceptance.Basis.COVERAGE) {
            // The pull-up shares in a threshold with feedback, and uncertainties do not add up as limits do.
            return true;
        }
        double nominal = source.voltage().nominal();
        double shift = ownShift(problem, window, resistors, ratios[1] * nominal) / nominal;
        ratios[0] -= shift;
        ratios[1] += shift;
        boolean there = problem.demand().channel().pins().dividerTop().isPresent()
                || tables.of(resistors).has(ratios[0], ratios[1]);
        return ratios[0] <= ratios[1] && there
                && window.releaseMayFit(narrowest(window, source, resistors, ratios));
    }

    private static boolean feedsBack(shuntwright.parts.Comparator comparator) {
        return comparator.hysteresis() instanceof Hysteresis.PositiveFeedback;
    }

    /** The smallest spread of a threshold between two ratios, V; a concave function of the ratio, so at one of them. */
    private static double narrowest(Window window, SourceVoltage source, ResistorSeries resistors, double[] ratios) {
        double least = Double.POSITIVE_INFINITY;
        for (double ratio : ratios) {
            double k = Math.max(0, Math.min(1, ratio));
            for (int end = 0; end < 2; end++) {
                least = Math.min(least,
                        window.highest(source, resistors, k, end) - window.lowest(source, resistors, k, end));
            }
        }
        return least;
    }

    /** Largest shift of a threshold of about that voltage by a bias current that never vanishes, V. */
    private static double ownShift(ChannelProblem problem, Window window, ResistorSeries resistors, double voltage) {
        double bias = leastBias(window);
        if (bias == 0) {
            return 0;
        }
        var pins = problem.demand().channel().pins();
        double divider = pins.dividerTop().isPresent() && pins.dividerBottom().isPresent()
                ? bias / (1 / pins.dividerTop().getAsDouble() + 1 / pins.dividerBottom().getAsDouble())
                : problem.around().rules().biasShare() * voltage;
        return 1.1 * (divider + bias * senseResistor(problem, window, resistors));
    }

    private static double leastBias(Window window) {
        Range bias = window.comparator.inputs().biasCurrent();
        return bias.contains(0) ? 0 : Math.min(Math.abs(bias.min()), Math.abs(bias.max()));
    }

    /** Largest R_H that may come to stand before the sense input, Ω. */
    private static double senseResistor(ChannelProblem problem, Window window, ResistorSeries resistors) {
        return window.comparator.hysteresis() instanceof Hysteresis.InjectedCurrent
                ? problem.demand().channel().pins().hysteresisResistor().orElse(resistors.values().max())
                : 0;
    }

    /** False only when the tap's threshold cannot serve, whatever the bias current does. */
    private static boolean tapMayServe(ChannelProblem problem, Window window, ResistorSeries resistors, double room) {
        if (problem.acceptance().basis() == Acceptance.Basis.COVERAGE) {
            return true;
        }
        Range bias = window.comparator.inputs().biasCurrent();
        double most = Math.max(Math.abs(bias.min()), Math.abs(bias.max()));
        double load = problem.tap().orElseThrow() instanceof Threshold.Divider divider
                ? divider.parallel() * divider.users()
                : 0;
        return room >= -(most * load + leastBias(window) * (load + senseResistor(problem, window, resistors)));
    }

    private static double tapRoom(Window window, Threshold tap, ResistorSeries resistors) {
        double room = Double.POSITIVE_INFINITY;
        for (int end = 0; end < 2; end++) {
            Range spread = HysteresisChoice.spread(window, tap, resistors, end);
            room = Math.min(room, window.slack(spread.min(), spread.max(), end));
        }
        return room;
    }

    private static int resistorCount(shuntwright.parts.Comparator comparator, ChannelProblem problem) {
        int divider = problem.tap().isPresent() ? 0 : 2;
        return switch (comparator.hysteresis()) {
            case Hysteresis.InjectedCurrent _,Hysteresis.PositiveFeedback _ -> divider + 1;
            case Hysteresis.BuiltIn _,Hysteresis.Latched _ -> divider;
        };
    }

    private Optional<SenseCircuit> nearest(ChannelProblem problem, CandidateSearch search,
            List<shuntwright.parts.Comparator> comparators, Judge judge) {
        Candidates found = search.nearest(NEAREST_PAIRS);
        CircuitBuilder builder = new CircuitBuilder(problem, tables);
        List<Option> options = new ArrayList<>();
        for (int candidate = 0; candidate < found.size(); candidate++) {
            options(problem, search, found, candidate, comparators, false, options);
        }
        options.sort(Comparator.comparingDouble(Option::room).reversed());
        SenseCircuit best = null;
        double margin = Double.NEGATIVE_INFINITY;
        int looked = 0;
        for (Option option : options) {
            for (SenseCircuit circuit : build(search, found, option, builder)) {
                if (!CandidateSearch.holds(judge.limits(circuit))) {
                    continue;
                }
                looked++;
                double reached = judge.margin(circuit);
                if (reached > margin) {
                    margin = reached;
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
