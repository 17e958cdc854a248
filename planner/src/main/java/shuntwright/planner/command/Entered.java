package shuntwright.planner.command;

import java.util.List;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;
import shuntwright.board.Board;
import shuntwright.planner.entry.BoardField;
import shuntwright.quantity.Reading;

/**
 * An option that stands for a field of the board, for this run only.
 *
 * @param field of the board, typed as in the window
 * @param text  typed, and readable
 */
record Entered(BoardField field, String text) {

    /** The board for this run. */
    static Board applied(List<Entered> all, Board board) {
        Board result = board;
        for (Entered each : all) {
            result = switch (each.field().read(each.text(), result)) {
                case Reading.Value<Board>(Board changed) -> changed;
                case Reading.Misread<Board>(String problem) -> throw new IllegalArgumentException(problem);
            };
        }
        return result;
    }

    /** The board of this run with what it had of its own, for a file that outlives the run. */
    static Board restored(Board board, Board original) {
        return board.withUncertainty(original.uncertainty()).withAcceptance(original.acceptance())
                .withPreference(original.preference());
    }

    /** Reads what can be typed into a field of the board in the window. */
    abstract static class Typed implements ITypeConverter<Entered> {
        private static final Board ANY = Board.named("any");

        private final BoardField field;

        Typed(BoardField field) {
            this.field = field;
        }

        @Override
        public Entered convert(String text) {
            return switch (field.read(text, ANY)) {
                case Reading.Value<Board> _ -> new Entered(field, text);
                case Reading.Misread<Board>(String problem) -> throw new TypeConversionException(problem);
            };
        }
    }
}
