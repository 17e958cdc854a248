/**
 * What the user asks for: the board with its shared things and one demand per channel. In comes what was typed; nothing
 * is computed here beyond defaults. Anything a user may not have typed yet is optional, so a half-filled board exists.
 */
@NullMarked
package shuntwright.board;

import org.jspecify.annotations.NullMarked;
