package shuntwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

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

    /**
     * The same with values as the finished plan has them: it holds what the search leaves aside, such as the value of a pull-up that is
     * settled last. What is thus added counts for the bound too.
     */
    BoardChoice measured(Plan plan) {
        List<Reached> measured = new ArrayList<>();
        for (Reached each : reached) {
            double value = BoardQuestions.value(plan, each.objective());
            measured.add(switch (each.objective()) {
                case LEAST_HEAT, LEAST_COST, FEWEST_PARTS -> {
                    double added = value - each.value();
                    yield new Reached(each.objective(), value, each.bound().isPresent()
                            ? OptionalDouble.of(each.bound().getAsDouble() + added)
                            : OptionalDouble.empty(), each.proof());
                }
                case MOST_EVEN_HEAT, WIDEST_MARGIN -> each;
            });
        }
        return new BoardChoice(measured, rounds, seed, cutShort, candidates, kept, broken, conflict);
    }

    BoardChoice withConflict(Optional<Conflict> found) {
        return new BoardChoice(reached, rounds, seed, cutShort, candidates, kept, broken, found);
    }
}
