/**
 * Benchmarks of planning, each with a plain loop over the same candidates measured in the same run: the ratio of the two
 * says how much a plan costs, whatever the machine. Run from the root with {@code mvn -q -Pbench}; for some of them
 * {@code mvn -q -Pbench -Dbench.args="OneEdit -f 1"}.
 */
@NullMarked
package shuntwright.bench;

import org.jspecify.annotations.NullMarked;
