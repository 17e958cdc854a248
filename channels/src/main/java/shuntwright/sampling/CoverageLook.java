package shuntwright.sampling;

import java.util.List;

import shuntwright.board.Demand;
import shuntwright.board.Sampling;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.quantity.Range;

/**
 * A first look at the coverage intervals of a circuit, for the choice among thousands: 32,768 trials, each end moved outward by twice
 * its standard error, so that what is taken for within seldom turns out not to be when it is sampled in full.
 */
public final class CoverageLook {

    private static final Sampling SAMPLING = new Sampling(new Sampling.Trials.Fixed(1 << 15), 1);

    private CoverageLook() {
    }

    /** Probabilistically symmetric coverage intervals of the outcomes asked for, in their order, A. */
    public static List<Range> intervals(SenseCircuit circuit, Surroundings around, Demand demand, double coverage) {
        return ChannelSampler.of(circuit, around, demand).quickly(coverage, SAMPLING, List.of()).orElseThrow().stream()
                .map(CoverageLook::outward).toList();
    }

    /**
     * True when the intervals of the outcomes in question are within what the demand allows: the same answer as by
     * {@link #intervals}, mostly sooner where it is no.
     *
     * @param inQuestion places of outcomes in the order of those asked for
     */
    public static boolean within(SenseCircuit circuit, Surroundings around, Demand demand, double coverage,
            List<Integer> inQuestion) {
        ChannelSampler sampler = ChannelSampler.of(circuit, around, demand);
        return sampler.quickly(coverage, SAMPLING, inQuestion)
                .filter(intervals -> inQuestion.stream()
                        .allMatch(i -> sampler.allowed().get(i).contains(outward(intervals.get(i)))))
                .isPresent();
    }

    private static Range outward(CoverageInterval interval) {
        return Range.of(interval.range().min() - 2 * interval.standardErrors().low(),
                interval.range().max() + 2 * interval.standardErrors().high());
    }
}
