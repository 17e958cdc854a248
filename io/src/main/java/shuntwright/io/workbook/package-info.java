/**
 * The workbook for purchasing and for the bench. In comes a {@link shuntwright.plan.Plan}, out go the bytes of an .xlsx
 * file, the same for the same plan: real numbers with the unit in the header, and live formulas where a reader may want
 * to change a number.
 */
@NullMarked
package shuntwright.io.workbook;

import org.jspecify.annotations.NullMarked;
