/**
 * The solved board: one record per channel with verdict, findings and cures, the budgets of everything shared, and the
 * parts used. In come a board and a catalogue; out goes a {@link shuntwright.plan.Plan}, a pure function of both.
 */
@NullMarked
package shuntwright.plan;

import org.jspecify.annotations.NullMarked;
