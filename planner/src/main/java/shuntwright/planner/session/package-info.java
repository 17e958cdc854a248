/** The open board as the window sees it: its state with wrong entries kept, undo, file, and the latest plan. */
@NullMarked
package shuntwright.planner.session;

import org.jspecify.annotations.NullMarked;
