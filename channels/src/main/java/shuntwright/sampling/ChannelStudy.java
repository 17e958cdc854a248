package shuntwright.sampling;

import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.Outcome;

/**
 * The propagated distributions of one channel.
 *
 * @param channel  its name
 * @param coverage coverage probability of all intervals
 * @param settled  false when adaptive trials ended at their most before the results were stable
 * @param outcomes trip first, then release and readings where asked
 * @param outside  probability that any of them is outside what is allowed
 */
public record ChannelStudy(String channel, double coverage, boolean settled, List<Propagated> outcomes,
        Probability outside) {

    public ChannelStudy {
        outcomes = List.copyOf(outcomes);
    }

    /** How many were drawn of each outcome. */
    public long trials() {
        return outcomes.isEmpty() ? 0 : outcomes.getFirst().sampled().trials();
    }

    public Optional<Propagated> outcome(Outcome wanted) {
        return outcomes.stream().filter(each -> each.outcome() == wanted).findFirst();
    }
}
