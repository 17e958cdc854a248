package shuntwright.planner.command;

import java.util.List;

import shuntwright.board.Board;

/**
 * What the command line says of sampling; what it does not say is as the board has it.
 *
 * @param entries of fields of the board, all of them readable
 * @param skipped true for not sampling at all
 */
record SamplingChoice(List<Entered> entries, boolean skipped) {

    /** As the board has it. */
    static final SamplingChoice OF_THE_BOARD = new SamplingChoice(List.of(), false);

    SamplingChoice {
        entries = List.copyOf(entries);
    }

    /** The board for this run. */
    Board applied(Board board) {
        return Entered.applied(entries, board);
    }
}
