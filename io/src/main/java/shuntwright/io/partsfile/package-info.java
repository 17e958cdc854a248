/**
 * The parts file: parts with their data and prices, as JSON. In come one or several files, out goes a
 * {@link shuntwright.parts.Catalogue} or every problem of the files with its place; and back. docs/parts-file.md shows the
 * tables that the forms here declare.
 */
@NullMarked
package shuntwright.io.partsfile;

import org.jspecify.annotations.NullMarked;
