package shuntwright.planner.command;

import java.util.List;

import shuntwright.board.Board;
import shuntwright.planner.entry.BoardField;
import shuntwright.quantity.Reading;

/**
 * What the command line says of sampling; what it does not say is as the board has it.
 *
 * @param entries of fields of the board, all of them readable
 * @param skipped true for not sampling at all
 */
record SamplingChoice(List<Entry> entries, boolean skipped) {

    /** As the board has it. */
    static final SamplingChoice OF_THE_BOARD = new SamplingChoice(List.of(), false);

    /**
     * One option.
     *
     * @param field of the board, typed as in the window
     * @param text  typed
     */
    record Entry(BoardField field, String text) {}

    SamplingChoice {
        entries = List.copyOf(entries);
    }

    /** The board for this run. */
    Board applied(Board board) {
        Board result = board;
        for (Entry each : entries) {
            result = switch (each.field().read(each.text(), result)) {
                case Reading.Value<Board>(Board changed) -> changed;
                case Reading.Misread<Board>(String problem) -> throw new IllegalArgumentException(problem);
            };
        }
        return result;
    }

    /** The board of this run with what it had of its own, for a file that outlives the run. */
    static Board restored(Board board, Board original) {
        return board.withUncertainty(original.uncertainty()).withAcceptance(original.acceptance());
    }
}
