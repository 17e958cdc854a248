package shuntwright.choice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.PriorityQueue;

import shuntwright.accuracy.Propagation;
import shuntwright.board.Acceptance;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.StatedDistribution;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.LimitRules;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/**
 * Finds the candidates of one channel: every shunt, every number in parallel, every amplifier, rejected early by the
 * limits and by the room that their errors leave for a threshold. Never rejects what exact limits would accept.
 */
final class CandidateSearch {

    private final ChannelProblem problem;
    private final ShuntTerms[] shunts;
    private final AmplifierTerms amplifiers;
    private final Readings readings;
    private final ThresholdTerms thresholds;
    private final double coverageFactor;

    CandidateSearch(ChannelProblem problem) {
        this.problem = problem;
        this.shunts = shunts(problem);
        this.amplifiers = new AmplifierTerms(amplifiers(problem), problem);
        this.readings = new Readings(problem, amplifiers);
        this.thresholds = new ThresholdTerms(problem);
        this.coverageFactor = leastFactor(problem);
    }

    /**
     * Standard uncertainties, counted as if every input were uniform, that a coverage interval reaches at least on each side: those of
     * the normal or of the U-shaped distribution, whichever are fewer, and fewer still where the user states that limits are further
     * out than those of a uniform distribution.
     */
    static double leastFactor(ChannelProblem problem) {
        double coverage = problem.acceptance().coverage();
        double factor = Math.min(Propagation.coverageFactor(Double.POSITIVE_INFINITY, coverage),
                Math.sqrt(2) * Math.sin(Math.PI / 2 * coverage));
        Range unit = Range.of(-1, 1);
        double uniform = new Distribution.Uniform().standardUncertainty(unit);
        for (StatedDistribution each : problem.around().stated()) {
            factor *= Math.min(1, each.distribution().standardUncertainty(unit) / uniform);
        }
        return factor;
    }

    /** Shunts within their limits by ascending resistance, and so by ascending heat. */
    private static ShuntTerms[] shunts(ChannelProblem problem) {
        Demand demand = problem.demand();
        Optional<String> pinned = demand.channel().pins().shunt();
        List<Shunt> sorted = problem.catalogue().shuntsByResistance();
        int[] counts = counts(problem);
        int[] next = new int[counts.length];
        List<ShuntTerms> terms = new ArrayList<>();
        while (true) {
            int least = -1;
            for (int i = 0; i < counts.length; i++) {
                if (next[i] < sorted.size() && (least < 0 || sorted.get(next[i]).inParallel(counts[i]) < sorted
                        .get(next[least]).inParallel(counts[least]))) {
                    least = i;
                }
            }
            if (least < 0) {
                return terms.toArray(new ShuntTerms[0]);
            }
            Shunt shunt = sorted.get(next[least]++);
            if ((pinned.isEmpty() || pinned.get().equals(shunt.partNumber()))
                    && holds(LimitRules.ofShunt(shunt, counts[least], demand, problem.around()))) {
                terms.add(new ShuntTerms(shunt, counts[least], problem));
            }
        }
    }

    /** The numbers of shunts in parallel that may be tried. */
    static int[] counts(ChannelProblem problem) {
        OptionalInt pinned = problem.demand().channel().pins().shuntCount();
        if (pinned.isPresent()) {
            return new int[]{pinned.getAsInt()};
        }
        int[] counts = new int[problem.around().rules().parallelShunts()];
        for (int i = 0; i < counts.length; i++) {
            counts[i] = i + 1;
        }
        return counts;
    }

    private static List<SenseAmplifier> amplifiers(ChannelProblem problem) {
        Optional<String> pinned = problem.demand().channel().pins().amplifier();
        return problem.catalogue().amplifiers().stream()
                .filter(each -> pinned.isEmpty() || pinned.get().equals(each.partNumber()))
                .filter(each -> holds(LimitRules.ofAmplifier(each, problem.demand(), problem.around()))).toList();
    }

    static boolean holds(List<LimitCheck> checks) {
        for (LimitCheck check : checks) {
            if (!check.holds()) {
                return false;
            }
        }
        return true;
    }

    ShuntTerms shunt(int term) {
        return shunts[term];
    }

    AmplifierTerms amplifiers() {
        return amplifiers;
    }

    ThresholdTerms thresholds() {
        return thresholds;
    }

    /** The window of a candidate with a comparator. */
    Window window(Candidates found, int candidate, shuntwright.parts.Comparator comparator) {
        return new Window(found, candidate, shunt(found.shunt(candidate)), amplifiers, comparator, thresholds,
                problem);
    }

    int combinations() {
        return shunts.length * amplifiers.size();
    }

    /** How many shunts and numbers in parallel there are. */
    int shunts() {
        return shunts.length;
    }

    /** All candidates that may be inside (or likely, where the board accepts that), by ascending heat. */
    Candidates promising() {
        Candidates found = new Candidates();
        promising(0, shunts.length, found);
        return found;
    }

    /** Adds those of the shunts from {@code from} to before {@code to}. */
    void promising(int from, int to, Candidates found) {
        Demand demand = problem.demand();
        Channel.Stress stress = demand.channel().stress();
        double fullScale = demand.fullScale();
        double least = demand.channel().currents().least().orElse(0);
        double fault = stress.fault().orElse(0);
        boolean coverage = problem.acceptance().basis() == Acceptance.Basis.COVERAGE;
        AmplifierTerms a = amplifiers;
        for (int i = from; i < to; i++) {
            ShuntTerms s = shunts[i];
            double full = fullScale * s.resistance;
            double small = least * s.resistance;
            double surge = fault * s.resistance;
            double emf = s.emf;
            for (int j = 0; j < a.gain.length; j++) {
                if (full > a.mostAtFull[j] || small < a.leastAtLeast[j] || surge > a.mostAtFault[j]) {
                    continue;
                }
                if (coverage && !readings.mayBeLikely(s, j, coverageFactor)) {
                    continue;
                }
                double low0 = a.gainHigh[0][j] * (s.noTripHigh[0] + a.error[0][j] + emf);
                double high0 = a.gainLow[0][j] * (s.mustTripLow[0] - a.error[0][j] - emf);
                double low1 = a.gainHigh[1][j] * (s.noTripHigh[1] + a.error[1][j] + emf);
                double high1 = a.gainLow[1][j] * (s.mustTripLow[1] - a.error[1][j] - emf);
                if (low0 <= high0 && low1 <= high1 && Math.max(low0, low1) <= Math.min(high0, high1)
                        && (coverage || readings.mayHold(s, j))) {
                    found.add(i, j, low0, high0, low1, high1);
                } else if (coverage) {
                    addLikely(i, j, found);
                }
            }
        }
    }

    /** Adds the pair with the window that uncertainties leave, when there is one. */
    private void addLikely(int i, int j, Candidates found) {
        ShuntTerms s = shunts[i];
        Range window = problem.demand().tripWindow();
        double relative = 0.98 * coverageFactor * Math.sqrt(variance(i, j));
        double low = amplifiers.gain[j] * window.min() / (1 - relative) * s.resistance;
        double high = amplifiers.gain[j] * window.max() / (1 + relative) * s.resistance;
        if (relative < 1 && low <= high) {
            found.add(i, j, low, high, low, high);
        }
    }

    /** Relative variance of the trip current without the threshold's part, about. */
    private double variance(int shunt, int amplifier) {
        double shuntVoltage = problem.demand().tripWindow().max() * shunts[shunt].resistance;
        return shunts[shunt].variance + amplifiers.gainVariance[amplifier]
                + amplifiers.errorVariance[amplifier] / (shuntVoltage * shuntVoltage);
    }

    /**
     * True when a coverage interval of the trip current may fit its window.
     *
     * @param thresholdVariance relative variance of the threshold
     */
    boolean mayBeLikely(Candidates found, int candidate, double thresholdVariance) {
        Range window = problem.demand().tripWindow();
        double u = Math.sqrt(variance(found.shunt(candidate), found.amplifier(candidate)) + thresholdVariance);
        return 2 * 0.95 * coverageFactor * u * window.min() <= window.width();
    }

    /** Candidates that respect the limits, whatever their errors, best room first, at most {@code most}. */
    Candidates nearest(int most) {
        PriorityQueue<double[]> best = new PriorityQueue<>(Comparator.comparingDouble((double[] row) -> row[6]));
        Demand demand = problem.demand();
        double least = demand.channel().currents().least().orElse(0);
        double fault = demand.channel().stress().fault().orElse(0);
        AmplifierTerms a = amplifiers;
        for (int i = 0; i < shunts.length; i++) {
            ShuntTerms s = shunts[i];
            for (int j = 0; j < a.size(); j++) {
                if (demand.fullScale() * s.resistance > a.mostAtFull[j] || least * s.resistance < a.leastAtLeast[j]
                        || fault * s.resistance > a.mostAtFault[j]) {
                    continue;
                }
                offer(i, j, most, best);
            }
        }
        List<double[]> all = new ArrayList<>(best);
        all.sort(Comparator.comparingDouble((double[] row) -> -row[6]).thenComparingDouble(row -> row[0])
                .thenComparingDouble(row -> row[1]));
        Candidates found = new Candidates();
        for (double[] row : all) {
            found.add((int) row[0], (int) row[1], row[2], row[3], row[4], row[5]);
        }
        return found;
    }

    /** Keeps the pair in the queue when it has more room than the worst there. */
    private void offer(int i, int j, int most, PriorityQueue<double[]> best) {
        ShuntTerms s = shunts[i];
        AmplifierTerms a = amplifiers;
        double[] row = {i, j, 0, 0, 0, 0, 0};
        double room = Double.POSITIVE_INFINITY;
        for (int end = 0; end < 2; end++) {
            double low = a.gainHigh[end][j] * (s.noTripHigh[end] + a.error[end][j] + s.emf);
            double high = a.gainLow[end][j] * (s.mustTripLow[end] - a.error[end][j] - s.emf);
            row[2 + 2 * end] = low;
            row[3 + 2 * end] = high;
            room = Math.min(room, high / low - 1);
            if (problem.demand().rearm().isPresent()) {
                double from = a.gainHigh[end][j] * (s.rearmLowHigh[end] + a.error[end][j] + s.emf);
                double to = a.gainLow[end][j] * (s.rearmHighLow[end] - a.error[end][j] - s.emf);
                room = Math.min(room, to / from - 1);
            }
        }
        double worst = best.size() < most ? Double.NEGATIVE_INFINITY : best.element()[6];
        if (!(room > worst)) {
            return;
        }
        row[6] = Math.min(room, readings.room(s, j));
        if (row[6] > worst || best.size() < most) {
            best.add(row);
            if (best.size() > most) {
                best.remove();
            }
        }
    }
}
