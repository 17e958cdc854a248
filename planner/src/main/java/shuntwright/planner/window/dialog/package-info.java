/** Questions and file choosers of the real window. */
@NullMarked
package shuntwright.planner.window.dialog;

import org.jspecify.annotations.NullMarked;
