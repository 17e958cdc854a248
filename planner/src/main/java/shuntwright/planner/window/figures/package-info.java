/** Probabilities and sampled currents in words, no more certain than trials make them. */
@NullMarked
package shuntwright.planner.window.figures;

import org.jspecify.annotations.NullMarked;
