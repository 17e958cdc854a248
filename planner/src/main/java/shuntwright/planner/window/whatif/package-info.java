/** What the board becomes as one of its limits changes. */
@NullMarked
package shuntwright.planner.window.whatif;

import org.jspecify.annotations.NullMarked;
