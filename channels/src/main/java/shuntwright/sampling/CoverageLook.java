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
        return ChannelSampler.of(circuit, around, demand).quickly(coverage, SAMPLING).stream().map(each -> {
            Range range = each.range();
            return Range.of(range.min() - 2 * each.standardErrors().low(),
                    range.max() + 2 * each.standardErrors().high());
        }).toList();
    }
}
