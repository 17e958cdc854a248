/** Where the program starts. */
@NullMarked
package shuntwright.planner;

import org.jspecify.annotations.NullMarked;
