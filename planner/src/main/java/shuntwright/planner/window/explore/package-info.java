/** What the panels that ask what might be have in common. */
@NullMarked
package shuntwright.planner.window.explore;

import org.jspecify.annotations.NullMarked;
