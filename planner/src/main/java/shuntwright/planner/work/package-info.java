/** Work off the window's thread: one named thread for planning, one for sampling, one for files; results are handed to a publisher. */
@NullMarked
package shuntwright.planner.work;

import org.jspecify.annotations.NullMarked;
