package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import picocli.CommandLine.Option;
import shuntwright.planner.entry.BoardField;

/** How a plan is sampled, for this run only. */
final class SamplingOptions {

    @Option(names = "--trials", paramLabel = "N|adaptive", converter = Trials.class, description = "Trials of each channel, 10,000 to 100,000,000, or adaptive: until the results are stable. For this run, instead of the board's.")
    private Optional<Entered> trials = Optional.empty();

    @Option(names = "--seed", paramLabel = "N", converter = Seed.class, description = "Seed of all draws, a whole number. The same seed gives the same results to the last digit on any number of threads. For this run, instead of the board's.")
    private Optional<Entered> seed = Optional.empty();

    @Option(names = "--coverage", paramLabel = "P", converter = Coverage.class, description = "Coverage probability of the coverage intervals, from 50 %% to below 100 %%: 99.9%% or 0.999. For this run, instead of the board's.")
    private Optional<Entered> coverage = Optional.empty();

    @Option(names = "--no-sampling", description = "Do not sample: faster, but without probabilities and yield, and coverage intervals rest on a first look.")
    private boolean skipped;

    /** @throws BadInput when there is nothing to which an option could apply */
    SamplingChoice chosen() {
        List<String> idle = new ArrayList<>();
        trials.ifPresent(_ -> idle.add("--trials"));
        seed.ifPresent(_ -> idle.add("--seed"));
        if (skipped && !idle.isEmpty()) {
            throw new BadInput("With --no-sampling nothing is drawn, so " + String.join(" and ", idle)
                    + " can have no effect; leave out one or the other.");
        }
        List<Entered> entries = new ArrayList<>();
        List.of(trials, seed, coverage).forEach(each -> each.ifPresent(entries::add));
        return new SamplingChoice(entries, skipped);
    }

    /** Reads a number of trials. */
    static final class Trials extends Entered.Typed {
        Trials() {
            super(BoardField.TRIALS);
        }
    }

    /** Reads a seed. */
    static final class Seed extends Entered.Typed {
        Seed() {
            super(BoardField.SEED);
        }
    }

    /** Reads a coverage probability. */
    static final class Coverage extends Entered.Typed {
        Coverage() {
            super(BoardField.COVERAGE);
        }
    }
}
