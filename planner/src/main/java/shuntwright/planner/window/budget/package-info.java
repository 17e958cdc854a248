/** The error budget of the selected channel. */
@NullMarked
package shuntwright.planner.window.budget;

import org.jspecify.annotations.NullMarked;
