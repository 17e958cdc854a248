/**
 * The command line. Comes in: arguments. Goes out: a table or JSON on the standard output, files, an exit code. It is
 * thin: files are opened and saved by {@code io}, boards planned by the same planner as the window's.
 */
@NullMarked
package shuntwright.planner.command;

import org.jspecify.annotations.NullMarked;
