/** The chosen circuit of a channel in words. */
@NullMarked
package shuntwright.planner.window.circuit;

import org.jspecify.annotations.NullMarked;
