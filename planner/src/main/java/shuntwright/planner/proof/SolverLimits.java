package shuntwright.planner.proof;

/**
 * How long and how hard the solver works.
 *
 * @param seconds      of wall clock, at most
 * @param steadyEffort of the solver's own count of work, at most, with which it repeats exactly; 0 for none, which is faster
 * @param workers      threads
 * @param memory       MiB of the whole child, at most
 */
record SolverLimits(double seconds, double steadyEffort, int workers, int memory) {}
