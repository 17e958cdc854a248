package shuntwright.planner.command;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

import picocli.CommandLine.Option;
import shuntwright.planner.entry.BoardField;

/** What is wanted of the board-wide choice and how long it is looked for, for this run only. */
final class ChoiceOptions {

    private ChoiceOptions() {
    }

    /** What a distinct part number costs. */
    static final class Price {
        @Option(names = "--part-number-cost", paramLabel = "X", converter = PartNumberCost.class, description = "Cost of one more distinct part number in the whole build, in the catalogue's currency, from 0. For this run, instead of the board's.")
        private Optional<Entered> cost = Optional.empty();

        List<Entered> chosen() {
            return cost.stream().toList();
        }
    }

    /** The objectives. */
    static final class Wanted {
        @Option(names = "--prefer", paramLabel = "LIST", converter = Order.class, description = "What is wanted, separated by commas: least heat, most even heat, least cost, fewest parts, widest margin. The first decides, each next one among choices equally good. For this run, instead of the board's.")
        private Optional<Entered> order = Optional.empty();

        List<Entered> chosen() {
            return order.stream().toList();
        }
    }

    /** How long. */
    static final class Search {
        @Option(names = "--rounds", paramLabel = "N", converter = Rounds.class, description = "Rounds of the search, 0 to 1000000: more take longer and may find better choices. For this run, instead of the board's.")
        private Optional<Entered> rounds = Optional.empty();

        @Option(names = "--time-limit", paramLabel = "T", converter = TimeLimit.class, description = "End each search after this time with the best found, such as 10s. What is found then depends on the machine. For this run, instead of the board's.")
        private Optional<Entered> timeLimit = Optional.empty();

        @Option(names = "--choice-seed", paramLabel = "N", converter = ChoiceSeed.class, description = "Seed of the search, a whole number. The same seed and rounds give the same plan unless a time limit ends the search. For this run, instead of the board's.")
        private Optional<Entered> seed = Optional.empty();

        List<Entered> chosen() {
            return Stream.of(rounds, timeLimit, seed).flatMap(Optional::stream).toList();
        }
    }

    /** Reads a cost. */
    static final class PartNumberCost extends Entered.Typed {
        PartNumberCost() {
            super(BoardField.PART_NUMBER_COST);
        }
    }

    /** Reads objectives. */
    static final class Order extends Entered.Typed {
        Order() {
            super(BoardField.WANTED);
        }
    }

    /** Reads a number of rounds. */
    static final class Rounds extends Entered.Typed {
        Rounds() {
            super(BoardField.ROUNDS);
        }
    }

    /** Reads a time. */
    static final class TimeLimit extends Entered.Typed {
        TimeLimit() {
            super(BoardField.TIME_LIMIT);
        }
    }

    /** Reads a seed. */
    static final class ChoiceSeed extends Entered.Typed {
        ChoiceSeed() {
            super(BoardField.CHOICE_SEED);
        }
    }
}
