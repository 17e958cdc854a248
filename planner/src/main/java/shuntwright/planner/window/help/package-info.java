/** Texts of the help menu and of the first start. */
@NullMarked
package shuntwright.planner.window.help;

import org.jspecify.annotations.NullMarked;
