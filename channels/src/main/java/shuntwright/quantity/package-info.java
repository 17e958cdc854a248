/**
 * Quantities as engineers type them and as the program computes with them: in comes text ("4 mΩ", "±0.5 %"), out go SI
 * numbers, ranges, tolerances and preferred numbers; and back. The one place where engineering notation meets SI.
 */
@NullMarked
package shuntwright.quantity;

import org.jspecify.annotations.NullMarked;
