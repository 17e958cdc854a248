/** Pictures as files. */
@NullMarked
package shuntwright.io.picture;

import org.jspecify.annotations.NullMarked;
