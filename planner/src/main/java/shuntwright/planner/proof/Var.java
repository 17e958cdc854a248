package shuntwright.planner.proof;

import com.google.ortools.sat.IntVar;

/**
 * A variable of the solver, from 0.
 *
 * @param it   the variable
 * @param most largest value
 * @param hint value in the selection known beforehand
 */
record Var(IntVar it, long most, long hint) {}
