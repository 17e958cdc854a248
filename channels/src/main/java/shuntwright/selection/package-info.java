/**
 * One option for every slot, so that all shared limits hold and an order of aims is met best: search, bounds, conflicts. Knows nothing
 * of circuits; {@code plan} says what a slot, a line or a resource is.
 */
@NullMarked
package shuntwright.selection;

import org.jspecify.annotations.NullMarked;
