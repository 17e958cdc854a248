/** The strip of everything the channels share, and its editor. */
@NullMarked
package shuntwright.planner.window.shared;

import org.jspecify.annotations.NullMarked;
