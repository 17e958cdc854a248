/**
 * JSON text with places. In comes a file, out goes a tree whose every value knows its line, column and path, or the
 * list of everything that is wrong with the file; and back: values printed as text that is the same each time.
 */
@NullMarked
package shuntwright.io.json;

import org.jspecify.annotations.NullMarked;
