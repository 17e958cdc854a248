/**
 * The sense circuit: what stands between a rail and its alert line, its nominal transfer, the values of its divider and
 * hysteresis, and the limits a choice of parts must respect, each stated once. In come parts and a demand; out go
 * circuits and limit checks.
 */
@NullMarked
package shuntwright.circuit;

import org.jspecify.annotations.NullMarked;
