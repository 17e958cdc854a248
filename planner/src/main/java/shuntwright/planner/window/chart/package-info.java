/** Charts of the window: scales, points, lines, and how they are drawn and saved. */
@NullMarked
package shuntwright.planner.window.chart;

import org.jspecify.annotations.NullMarked;
