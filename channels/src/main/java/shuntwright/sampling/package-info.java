/**
 * The propagated distribution (JCGM 101:2008) of every outcome by repeatable sampling, and what follows from it: coverage
 * intervals, the probability of being outside, effect indices, the validation of the combined uncertainty, and the yield of the
 * whole board, whose channels share draws.
 */
@NullMarked
package shuntwright.sampling;

import org.jspecify.annotations.NullMarked;
