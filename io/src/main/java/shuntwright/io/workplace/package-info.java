/**
 * A board together with the parts it may use. In comes the path of a board file, out go the board and the catalogue of
 * all parts files it names, or every problem of all these files.
 */
@NullMarked
package shuntwright.io.workplace;

import org.jspecify.annotations.NullMarked;
