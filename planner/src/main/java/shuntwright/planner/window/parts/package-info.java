/** The consolidated parts list of the board. */
@NullMarked
package shuntwright.planner.window.parts;

import org.jspecify.annotations.NullMarked;
