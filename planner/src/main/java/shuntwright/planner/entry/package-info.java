/** What can be typed into the cells of the channel table and the board's editor: texts in, channels and boards out, or the reason why not. */
@NullMarked
package shuntwright.planner.entry;

import org.jspecify.annotations.NullMarked;
