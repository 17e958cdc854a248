/**
 * Bounds, proofs and better selections from a solver of a library that runs in a process of its own, so that neither its crash nor its
 * memory can harm this one: the parent writes selection and question as text, the child answers line by line, and everything it leaves is
 * deleted with it.
 */
@NullMarked
package shuntwright.planner.proof;

import org.jspecify.annotations.NullMarked;
