/**
 * The plan file: a plan with everything computed, as JSON for machines and for people who recompute it. In comes a
 * {@link shuntwright.plan.Plan}, out go bytes, the same for the same plan. Each kind of object is described once, as a
 * table of its attributes; the writer and the documentation are two readers of these tables.
 */
@NullMarked
package shuntwright.io.planfile;

import org.jspecify.annotations.NullMarked;
