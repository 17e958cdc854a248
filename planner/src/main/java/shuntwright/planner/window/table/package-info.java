/** The channel table: what is asked, typed into cells; what was chosen and what it reaches. */
@NullMarked
package shuntwright.planner.window.table;

import org.jspecify.annotations.NullMarked;
