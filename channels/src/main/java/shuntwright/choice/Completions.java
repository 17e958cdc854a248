package shuntwright.choice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.PriorityQueue;

import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;

/**
 * The ways to complete candidates with a comparator, a resistor series and a source for the threshold; cheapest first
 * without listing them all.
 */
final class Completions {

    private final ChannelProblem problem;
    private final CandidateSearch search;
    private final Candidates found;
    private final CompletionFilter filter;
    private final CircuitBuilder builder;
    private final double[] shuntPrice;
    private final double[] amplifierPrice;
    /** Comparators with resistor series, by ascending cost. */
    private final List<Tail> tails = new ArrayList<>();

    private record Tail(shuntwright.parts.Comparator comparator, ResistorSeries resistors, double cost) {}

    /**
     * One way to complete a candidate.
     *
     * @param source of an own divider; empty where a tap is used
     * @param cost   of all its parts, in the catalogue's currency
     * @param room   of its threshold, as a share; negative where it certainly does not fit
     */
    record Option(int candidate, shuntwright.parts.Comparator comparator, Optional<SourceVoltage> source,
            ResistorSeries resistors, double cost, double room) {}

    Completions(ChannelProblem problem, CandidateSearch search, Candidates found,
            List<shuntwright.parts.Comparator> comparators, DividerTables tables, Prices prices) {
        this.problem = problem;
        this.search = search;
        this.found = found;
        this.filter = new CompletionFilter(problem, search, found, comparators, tables);
        this.builder = new CircuitBuilder(problem, tables);
        for (shuntwright.parts.Comparator comparator : comparators) {
            double own = prices.of(comparator) / comparator.sections();
            for (ResistorSeries resistors : problem.resistors()) {
                tails.add(new Tail(comparator, resistors, own + resistorCount(comparator) * prices.of(resistors)));
            }
        }
        tails.sort(Comparator.comparingDouble(Tail::cost));
        shuntPrice = new double[search.shunts()];
        for (int i = 0; i < shuntPrice.length; i++) {
            ShuntTerms term = search.shunt(i);
            shuntPrice[i] = prices.of(term.shunt, term.count);
        }
        amplifierPrice = new double[search.amplifiers().size()];
        for (int i = 0; i < amplifierPrice.length; i++) {
            SenseAmplifier amplifier = search.amplifiers().amplifiers[i];
            amplifierPrice[i] = prices.of(amplifier) / amplifier.sections();
        }
    }

    private int resistorCount(shuntwright.parts.Comparator comparator) {
        int divider = problem.tap().isPresent() ? 0 : 2;
        return switch (comparator.hysteresis()) {
            case Hysteresis.InjectedCurrent _,Hysteresis.PositiveFeedback _ -> divider + 1;
            case Hysteresis.BuiltIn _,Hysteresis.Latched _ -> divider;
        };
    }

    /** The circuits with the best values for an option; empty when no values fit. */
    List<SenseCircuit> build(Option option) {
        return builder.build(search.shunt(found.shunt(option.candidate())), search.amplifiers(),
                found.amplifier(option.candidate()),
                search.window(found, option.candidate(), option.comparator()), option.source(), option.resistors());
    }

    /** Every option, whether it may serve or not. */
    List<Option> all() {
        List<Option> options = new ArrayList<>();
        for (int candidate = 0; candidate < found.size(); candidate++) {
            for (Tail tail : tails) {
                Window window = search.window(found, candidate, tail.comparator());
                options.addAll(options(candidate, tail, window, false));
            }
        }
        return options;
    }

    /** The options of the candidates that may serve; valid until the candidates change. */
    CheapestFirst cheapestFirst() {
        return new CheapestFirst();
    }

    private List<Option> options(int candidate, Tail tail, Window window, boolean strict) {
        double cost = base(candidate) + tail.cost();
        List<Option> options = new ArrayList<>();
        if (problem.tap().isPresent()) {
            double room = filter.tapRoom(window, tail.resistors());
            if (!strict || filter.tapMayServe(window, tail.resistors(), room)) {
                options.add(new Option(candidate, tail.comparator(), Optional.empty(), tail.resistors(), cost, room));
            }
            return options;
        }
        double[] ratios = new double[2];
        for (SourceVoltage source : problem.sources()) {
            window.ratios(source, tail.resistors(), ratios);
            double room = ratios[1] / ratios[0] - 1;
            if (!strict || filter.mayServe(candidate, window, source, tail.resistors(), ratios)) {
                options.add(new Option(candidate, tail.comparator(), Optional.of(source), tail.resistors(), cost,
                        room));
            }
        }
        options.sort(Comparator.comparingDouble(Option::room).reversed());
        return options;
    }

    private double base(int candidate) {
        return shuntPrice[found.shunt(candidate)] + amplifierPrice[found.amplifier(candidate)];
    }

    /** Options by ascending cost; those of one cost by candidate, then by descending room. */
    final class CheapestFirst {

        /** A candidate with the next tail to try. */
        private record Node(double cost, int candidate, int tail) {}

        private final PriorityQueue<Node> queue = new PriorityQueue<>(Comparator.comparingDouble(Node::cost)
                .thenComparingInt(Node::candidate).thenComparingInt(Node::tail));
        private final List<Option> ready = new ArrayList<>();

        private CheapestFirst() {
            if (tails.isEmpty()) {
                return;
            }
            for (int candidate = 0; candidate < found.size(); candidate++) {
                if (filter.roomForAny(candidate)) {
                    queue.add(new Node(base(candidate) + tails.getFirst().cost(), candidate, 0));
                }
            }
        }

        boolean hasNext() {
            while (ready.isEmpty() && !queue.isEmpty()) {
                Node node = queue.remove();
                Tail tail = tails.get(node.tail());
                if (node.tail() + 1 < tails.size()) {
                    queue.add(new Node(base(node.candidate()) + tails.get(node.tail() + 1).cost(), node.candidate(),
                            node.tail() + 1));
                }
                ready.addAll(options(node.candidate(), tail,
                        search.window(found, node.candidate(), tail.comparator()), true));
            }
            return !ready.isEmpty();
        }

        Option next() {
            if (!hasNext()) {
                throw new NoSuchElementException("no option is left");
            }
            return ready.removeFirst();
        }
    }
}
