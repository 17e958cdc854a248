/**
 * The parts that can be bought: what their data sheets state, in SI units and as limits, and how they are sold. In come
 * values read from parts files; out goes a {@link shuntwright.parts.Catalogue}.
 */
@NullMarked
package shuntwright.parts;

import org.jspecify.annotations.NullMarked;
