package shuntwright.planner.command;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;

import shuntwright.board.Acceptance;
import shuntwright.board.Board;
import shuntwright.board.Sampling;

/**
 * What the command line says of sampling; what is empty is as the board has it.
 *
 * @param trials   of each channel; {@link #ADAPTIVE} stands for what the board says of adaptive trials, if it does
 * @param seed     of all draws
 * @param coverage coverage probability
 * @param skipped  true for not at all
 */
record SamplingChoice(Optional<Sampling.Trials> trials, OptionalLong seed, OptionalDouble coverage, boolean skipped) {

    /** As the board has it. */
    static final SamplingChoice OF_THE_BOARD = new SamplingChoice(Optional.empty(), OptionalLong.empty(),
            OptionalDouble.empty(), false);

    /** Adaptive as a board file's defaults are. */
    static final Sampling.Trials ADAPTIVE = new Sampling.Trials.Adaptive(2, 10_000_000);

    /** The board for this run. */
    Board applied(Board board) {
        Sampling own = board.uncertainty().sampling();
        Sampling sampling = new Sampling(trials.map(each -> settled(each, own.trials())).orElse(own.trials()),
                seed.orElse(own.seed()));
        Acceptance acceptance = new Acceptance(board.acceptance().basis(),
                coverage.orElse(board.acceptance().coverage()));
        return board.withUncertainty(board.uncertainty().withSampling(sampling)).withAcceptance(acceptance);
    }

    private static Sampling.Trials settled(Sampling.Trials wanted, Sampling.Trials own) {
        return switch (wanted) {
            case Sampling.Trials.Fixed fixed -> fixed;
            case Sampling.Trials.Adaptive adaptive -> own instanceof Sampling.Trials.Adaptive ? own : adaptive;
        };
    }

    /** The board of this run with what it had of its own, for a file that outlives the run. */
    static Board restored(Board board, Board original) {
        return board.withUncertainty(original.uncertainty()).withAcceptance(original.acceptance());
    }
}
