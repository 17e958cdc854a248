package shuntwright.choice;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.board.Acceptance;
import shuntwright.board.Pins;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.LimitRules;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.parts.Comparator;
import shuntwright.parts.Part;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageLook;

/** Every combination of a small catalogue, completed and judged exactly, with no rejection on the way. */
final class BruteForce {

    /** A complete circuit and what came of judging it. */
    record Tried(SenseCircuit circuit, double heat, double cost, boolean respects, boolean accepted) {}

    private final ChannelProblem problem;
    private final CircuitBuilder builder;

    private BruteForce(ChannelProblem problem, DividerTables tables) {
        this.problem = problem;
        this.builder = new CircuitBuilder(problem, tables);
    }

    static List<Tried> all(ChannelProblem problem, DividerTables tables) {
        return new BruteForce(problem, tables).all();
    }

    /** The window of every combination of parts, whether it leaves room or not. */
    static List<Window> windows(ChannelProblem problem) {
        BruteForce force = new BruteForce(problem, new DividerTables());
        AmplifierTerms amplifiers = new AmplifierTerms(problem.catalogue().amplifiers(), problem);
        List<Window> windows = new ArrayList<>();
        for (Shunt shunt : problem.catalogue().shunts()) {
            for (int j = 0; j < amplifiers.size(); j++) {
                for (Comparator comparator : problem.catalogue().comparators()) {
                    windows.add(force.window(new ShuntTerms(shunt, 1, problem), amplifiers, j, comparator));
                }
            }
        }
        return windows;
    }

    private List<Tried> all() {
        List<Tried> all = new ArrayList<>();
        Pins pins = problem.demand().channel().pins();
        AmplifierTerms amplifiers = new AmplifierTerms(
                problem.catalogue().amplifiers().stream().filter(each -> free(pins.amplifier(), each)).toList(),
                problem);
        List<Optional<SourceVoltage>> sources = problem.tap().isPresent()
                ? List.of(Optional.empty())
                : problem.sources().stream().map(Optional::of).toList();
        for (Shunt shunt : problem.catalogue().shunts()) {
            for (int count = 1; count <= problem.around().rules().parallelShunts(); count++) {
                if (!free(pins.shunt(), shunt) || pins.shuntCount().orElse(count) != count) {
                    continue;
                }
                ShuntTerms terms = new ShuntTerms(shunt, count, problem);
                for (int j = 0; j < amplifiers.size(); j++) {
                    for (Comparator comparator : problem.catalogue().comparators()) {
                        if (free(pins.comparator(), comparator)
                                && ChannelPicker.suits(comparator, problem, pins.comparator().isPresent())) {
                            Window window = window(terms, amplifiers, j, comparator);
                            for (Optional<SourceVoltage> source : sources) {
                                for (ResistorSeries series : problem.resistors()) {
                                    builder.build(terms, amplifiers, j, window, source, series)
                                            .forEach(circuit -> all.add(tried(circuit)));
                                }
                            }
                        }
                    }
                }
            }
        }
        return all;
    }

    private static boolean free(Optional<String> pinned, Part part) {
        return pinned.isEmpty() || pinned.get().equals(part.partNumber());
    }

    /** Edges of the threshold by limits; by combined uncertainty where they leave no room and that is accepted. */
    private Window window(ShuntTerms s, AmplifierTerms a, int j, Comparator comparator) {
        double[] low = new double[2];
        double[] high = new double[2];
        for (int end = 0; end < 2; end++) {
            low[end] = a.gainHigh[end][j] * (s.noTripHigh[end] + a.error[end][j] + s.emf);
            high[end] = a.gainLow[end][j] * (s.mustTripLow[end] - a.error[end][j] - s.emf);
        }
        boolean room = Math.max(low[0], low[1]) <= Math.min(high[0], high[1]);
        if (!room && problem.acceptance().basis() == Acceptance.Basis.COVERAGE) {
            Range trip = problem.demand().tripWindow();
            double k = CandidateSearch.leastFactor(problem);
            double volt = trip.max() * s.resistance;
            double relative = 0.98 * k
                    * Math.sqrt(s.variance + a.gainVariance[j] + a.errorVariance[j] / (volt * volt));
            for (int end = 0; end < 2; end++) {
                low[end] = a.gain[j] * trip.min() / (1 - relative) * s.resistance;
                high[end] = a.gain[j] * trip.max() / (1 + relative) * s.resistance;
            }
        }
        Candidates one = new Candidates();
        one.add(0, j, low[0], high[0], low[1], high[1]);
        return new Window(one, 0, s, a, comparator, new ThresholdTerms(problem), problem);
    }

    private Tried tried(SenseCircuit circuit) {
        return tried(problem, circuit);
    }

    /** Judges one circuit, whoever chose it. */
    static Tried tried(ChannelProblem problem, SenseCircuit circuit) {
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, problem.around(), problem.demand());
        boolean respects = CandidateSearch.holds(LimitRules.all(circuit, accuracy.changeover(),
                problem.pullUp().voltage().max(), problem.demand(), problem.around()));
        return new Tried(circuit, heat(problem, circuit), cost(problem, circuit), respects,
                respects && accepted(problem, circuit, accuracy));
    }

    private static boolean accepted(ChannelProblem problem, SenseCircuit circuit, ChannelAccuracy accuracy) {
        List<ChannelAccuracy.Asked> asked = ChannelAccuracy.asked(problem.demand(),
                problem.around().adc().isPresent());
        List<Boolean> inside = asked.stream().map(each -> each.allowed().contains(accuracy.limits(each))).toList();
        if (!inside.contains(false) || problem.acceptance().basis() == Acceptance.Basis.LIMITS) {
            return !inside.contains(false);
        }
        if (asked.stream().anyMatch(each -> !each.allowed().contains(accuracy.nominal(each)))) {
            // A coverage interval far from the nominal value would be another mistake; spares sampling it.
            return false;
        }
        List<Range> intervals = CoverageLook.intervals(circuit, problem.around(), problem.demand(),
                problem.acceptance().coverage());
        return IntStream.range(0, asked.size())
                .allMatch(i -> inside.get(i) || asked.get(i).allowed().contains(intervals.get(i)));
    }

    static double heat(ChannelProblem problem, SenseCircuit circuit) {
        double load = problem.demand().load();
        return load * load * circuit.resistance();
    }

    static double cost(ChannelProblem problem, SenseCircuit circuit) {
        int boards = problem.buildQuantity();
        SenseAmplifier amplifier = circuit.amplifier();
        int resistors = (circuit.threshold().tapName().isEmpty() ? 2 : 0)
                + (circuit.network() instanceof HysteresisNetwork.None ? 0 : 1);
        return circuit.shuntCount() * circuit.shunt().purchase().unitPriceAt(circuit.shuntCount() * boards)
                + amplifier.purchase().unitPriceAt(boards) / amplifier.sections()
                + circuit.comparator().purchase().unitPriceAt(boards) / circuit.comparator().sections()
                + resistors * circuit.resistors().purchase().unitPriceAt(boards);
    }
}
