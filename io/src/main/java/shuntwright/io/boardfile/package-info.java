/**
 * The board file: what the user entered, as JSON. In comes a file, out goes a {@link shuntwright.board.Board} or every
 * problem of the file with its place; and back. docs/board-file.md shows the tables that the forms here declare.
 */
@NullMarked
package shuntwright.io.boardfile;

import org.jspecify.annotations.NullMarked;
