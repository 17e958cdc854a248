/**
 * Saving files so that none is ever left half written. In comes content and a target, out goes a result that says in
 * plain words why it failed, if it did.
 */
@NullMarked
package shuntwright.io.save;

import org.jspecify.annotations.NullMarked;
