package shuntwright.choice;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Acceptance;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.LimitRules;
import shuntwright.circuit.SenseCircuit;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;
import shuntwright.quantity.Range;
import shuntwright.sampling.CoverageLook;

/** Judges complete circuits exactly. */
final class Judge {

    private final ChannelProblem problem;
    private final List<ChannelAccuracy.Asked> asked;
    /** The same, what is soonest known to fail first. */
    private final List<ChannelAccuracy.Asked> soonest;
    private final Map<Read, Range> readings = new HashMap<>();

    /** Rise of the zone at which a reading was found outside, K; warmer it is outside as well, as its inputs only spread further. */
    private final Map<Read, Double> outside;

    /** What the limits of a reading depend on; comparator and threshold have no part in them. */
    record Read(Outcome outcome, Shunt shunt, int count, SenseAmplifier amplifier) {}

    Judge(ChannelProblem problem) {
        this(problem, new HashMap<>());
    }

    /** @param outside readings found outside, shared by the same problem at several rises of its zone */
    Judge(ChannelProblem problem, Map<Read, Double> outside) {
        this.problem = problem;
        this.outside = outside;
        this.asked = ChannelAccuracy.asked(problem.demand(), problem.around().adc().isPresent());
        // The search has sorted out readings that cannot hold, but for calibrated ones; their limits are remembered.
        boolean calibrated = problem.demand().channel().reading().calibration().isPresent();
        this.soonest = calibrated ? asked.reversed() : asked;
    }

    /** The limits of its threshold with their numbers. */
    List<LimitCheck> thresholdLimits(SenseCircuit circuit) {
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, problem.around(), problem.demand());
        return LimitRules.ofThreshold(accuracy.changeover(), circuit.amplifier(), circuit.comparator(),
                problem.around());
    }

    /** True when the circuit respects every limit and its outcomes are accepted. */
    boolean accepts(SenseCircuit circuit) {
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, problem.around(), problem.demand());
        boolean coverage = problem.acceptance().basis() == Acceptance.Basis.COVERAGE;
        boolean open = false;
        for (ChannelAccuracy.Asked each : soonest) {
            if (isOutside(each, circuit, accuracy)) {
                open = true;
                if (!coverage || hopeless(each, accuracy.combined(each, problem.acceptance().coverage()))) {
                    return false;
                }
            }
        }
        return CandidateSearch.holds(LimitRules.ofThreshold(accuracy.changeover(), circuit.amplifier(),
                circuit.comparator(), problem.around())) && (!open || likely(circuit, accuracy));
    }

    private boolean isOutside(ChannelAccuracy.Asked each, SenseCircuit circuit, ChannelAccuracy accuracy) {
        return switch (each.outcome()) {
            case TRIP, RELEASE -> !each.allowed().contains(accuracy.limits(each));
            case READING_AT_LEAST, READING_AT_LOAD -> {
                Read read = new Read(each.outcome(), circuit.shunt(), circuit.shuntCount(), circuit.amplifier());
                double rise = problem.around().rise();
                if (outside.getOrDefault(read, Double.POSITIVE_INFINITY) <= rise) {
                    yield true;
                }
                boolean found = !each.allowed().contains(limits(each, circuit, accuracy));
                if (found) {
                    outside.put(read, rise);
                }
                yield found;
            }
        };
    }

    private Range limits(ChannelAccuracy.Asked each, SenseCircuit circuit, ChannelAccuracy accuracy) {
        return switch (each.outcome()) {
            case TRIP, RELEASE -> accuracy.limits(each);
            case READING_AT_LEAST, READING_AT_LOAD -> readings.computeIfAbsent(
                    new Read(each.outcome(), circuit.shunt(), circuit.shuntCount(), circuit.amplifier()),
                    _ -> accuracy.limits(each));
        };
    }

    private static boolean hopeless(ChannelAccuracy.Asked asked, CombinedUncertainty combined) {
        double half = Assessment.LEAST_FACTOR * combined.standard();
        return !asked.allowed().contains(Range.of(combined.estimate() - half, combined.estimate() + half));
    }

    /** True when every outcome is inside by limits or by a first look at its coverage interval. */
    private boolean likely(SenseCircuit circuit, ChannelAccuracy accuracy) {
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < asked.size(); i++) {
            if (!asked.get(i).allowed().contains(limits(asked.get(i), circuit, accuracy))) {
                open.add(i);
            }
        }
        return CoverageLook.within(circuit, problem.around(), problem.demand(), problem.acceptance().coverage(), open);
    }

    /**
     * Smallest slack of all outcomes as a share of the allowed half-width, negative outside; empty for a circuit that breaks
     * a limit.
     */
    OptionalDouble margin(SenseCircuit circuit) {
        ChannelAccuracy accuracy = ChannelAccuracy.of(circuit, problem.around(), problem.demand());
        if (!CandidateSearch.holds(LimitRules.all(circuit, accuracy.changeover(),
                problem.pullUp().voltage().max(), problem.demand(), problem.around()))) {
            return OptionalDouble.empty();
        }
        double margin = Double.POSITIVE_INFINITY;
        for (ChannelAccuracy.Asked each : asked) {
            Range reached = limits(each, circuit, accuracy);
            double slack = Math.min(reached.min() - each.allowed().min(), each.allowed().max() - reached.max());
            margin = Math.min(margin, slack / (each.allowed().width() / 2));
        }
        return OptionalDouble.of(margin);
    }
}
