/** The desktop window: one board, its channel table and the panels that explain the selected row. */
@NullMarked
package shuntwright.planner.window;

import org.jspecify.annotations.NullMarked;
