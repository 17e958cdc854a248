/** Findings of the selected channel and of the board, with cures that can be applied. */
@NullMarked
package shuntwright.planner.window.findings;

import org.jspecify.annotations.NullMarked;
