/** The board-wide choice: what is wanted of it, how good it is, and what conflicts. */
@NullMarked
package shuntwright.planner.window.choice;

import org.jspecify.annotations.NullMarked;
