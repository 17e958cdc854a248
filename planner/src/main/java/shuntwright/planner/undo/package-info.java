/** Undo and redo by immutable snapshots with names. */
@NullMarked
package shuntwright.planner.undo;

import org.jspecify.annotations.NullMarked;
