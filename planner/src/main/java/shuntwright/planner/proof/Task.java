package shuntwright.planner.proof;

import shuntwright.selection.Prover;
import shuntwright.selection.Selection;

/**
 * What the child is given.
 *
 * @param selection without the names in it, which no sum needs
 * @param question  what is asked of it
 * @param limits    of the solver
 */
record Task(Selection selection, Prover.Question question, SolverLimits limits) {}
