package shuntwright.board;

import java.util.EnumSet;
import java.util.List;
import java.util.OptionalDouble;

import shuntwright.quantity.Finite;

/**
 * What is wanted of all choices that serve the whole board, and how long it is looked for. The same board, rounds and seed give the
 * same plan unless the time limit cuts the search short.
 *
 * @param order          the first decides, each next one among those equally good; at least one, none twice
 * @param partNumberCost cost of one more distinct part number in the whole build (purchasing, stock, set-up of a feeder), in the
 *                       catalogue's currency
 * @param rounds         of the search, 0 to a million; 0 only improves each channel by itself
 * @param timeLimit      after which the search ends with the best found, s; empty for none
 * @param seed           of the search
 */
public record Preference(List<Objective> order, double partNumberCost, int rounds, OptionalDouble timeLimit,
        long seed) {

    /** Most rounds. */
    public static final int MOST_ROUNDS = 1_000_000;

    /** Least heat, then least cost; a part number costs nothing more; 300 rounds, no time limit, seed 1. */
    public static final Preference DEFAULT = new Preference(List.of(Objective.LEAST_HEAT, Objective.LEAST_COST), 0, 300,
            OptionalDouble.empty(), 1);

    /** @throws IllegalArgumentException unless each is within the range stated above */
    public Preference {
        order = List.copyOf(order);
        if (order.isEmpty() || EnumSet.copyOf(order).size() != order.size()) {
            throw new IllegalArgumentException(
                    "at least one objective is needed and none may stand twice, got " + order);
        }
        if (!Finite.notNegative(partNumberCost) || rounds < 0 || rounds > MOST_ROUNDS
                || !Finite.positive(timeLimit.orElse(1))) {
            throw new IllegalArgumentException(
                    "cost of a part number must be at least 0, rounds from 0 to " + MOST_ROUNDS
                            + ", time limit > 0 s, got " + partNumberCost + ", " + rounds + ", " + timeLimit);
        }
    }

    public Preference withOrder(List<Objective> newOrder) {
        return new Preference(newOrder, partNumberCost, rounds, timeLimit, seed);
    }

    public Preference withRounds(int newRounds) {
        return new Preference(order, partNumberCost, newRounds, timeLimit, seed);
    }

    public Preference withTimeLimit(OptionalDouble newTimeLimit) {
        return new Preference(order, partNumberCost, rounds, newTimeLimit, seed);
    }

    public Preference withSeed(long newSeed) {
        return new Preference(order, partNumberCost, rounds, timeLimit, newSeed);
    }

    public Preference withPartNumberCost(double newPartNumberCost) {
        return new Preference(order, newPartNumberCost, rounds, timeLimit, seed);
    }
}
