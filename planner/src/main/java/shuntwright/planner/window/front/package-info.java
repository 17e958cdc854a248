/** The front of two objectives: plans of which none is better in one without being worse in the other. */
@NullMarked
package shuntwright.planner.window.front;

import org.jspecify.annotations.NullMarked;
