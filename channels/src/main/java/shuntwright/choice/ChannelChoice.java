package shuntwright.choice;

import java.util.List;

import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;
import shuntwright.circuit.SenseCircuit;

/** What came of choosing for one channel. */
public sealed interface ChannelChoice {

    /**
     * Circuits that serve equally well (same heat and cost), the first by default; all inside, or likely where that is
     * accepted.
     *
     * @param circuits at least one
     */
    record Accepted(List<SenseCircuit> circuits) implements ChannelChoice {
        public Accepted {
            circuits = List.copyOf(circuits);
        }
    }

    /** @param circuit respects every limit and comes nearest to the demand */
    record Nearest(SenseCircuit circuit) implements ChannelChoice {}

    /** @param refusals why no circuit respects the limits, by family */
    record NoFit(List<Refusal> refusals) implements ChannelChoice {
        public NoFit {
            refusals = List.copyOf(refusals);
        }
    }

    /**
     * A limit that excludes parts of a family.
     *
     * @param family   kind of part
     * @param examined parts or combinations looked at
     * @param refused  how many of them this limit excludes
     * @param nearest  the one that misses by least, in words
     * @param miss     its numbers
     */
    record Refusal(Limit.Family family, int examined, int refused, String nearest, LimitCheck miss) {}
}
