package shuntwright.plan;

import java.util.List;
import java.util.Optional;

/**
 * How the parts of all channels were chosen together, and how good that choice is.
 *
 * @param reached    of each objective, in the order wanted
 * @param rounds     of the search that were run
 * @param seed       of the search
 * @param cutShort   true when a time limit or a cancel ended it before its rounds
 * @param candidates ways to serve the channels, all channels together, that limits leave open
 * @param kept       of them looked at one against the other
 * @param broken     shared limits that this choice breaks, by name; empty when it keeps to all
 * @param conflict   demands that cannot be met together; empty when everything is met
 */
public record BoardChoice(List<Reached> reached, int rounds, long seed, boolean cutShort, long candidates, int kept,
        List<String> broken, Optional<Conflict> conflict) {
    public BoardChoice {
        reached = List.copyOf(reached);
        broken = List.copyOf(broken);
    }
}
