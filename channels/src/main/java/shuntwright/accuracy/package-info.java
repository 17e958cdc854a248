/**
 * How far a channel's trip, release and readings may be from nominal. One description of the uncertain inputs, and its
 * readers: exact limits, combined uncertainty (JCGM 100), error budget.
 */
@NullMarked
package shuntwright.accuracy;

import org.jspecify.annotations.NullMarked;
