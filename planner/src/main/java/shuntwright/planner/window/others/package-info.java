/** Other choices for the selected channel, with what each means for the whole board. */
@NullMarked
package shuntwright.planner.window.others;

import org.jspecify.annotations.NullMarked;
