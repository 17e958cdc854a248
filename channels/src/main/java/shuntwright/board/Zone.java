package shuntwright.board;

import java.util.OptionalDouble;

import shuntwright.quantity.Finite;

/**
 * An area of the board.
 *
 * @param name      what channels call it
 * @param heatLimit largest heat of its shunts together, W; empty for none
 */
public record Zone(String name, OptionalDouble heatLimit) {

    /** @throws IllegalArgumentException unless the limit is &gt; 0 */
    public Zone {
        if (!Finite.positive(heatLimit.orElse(1))) {
            throw new IllegalArgumentException("zone " + name + " needs a heat limit > 0, got " + heatLimit);
        }
    }
}
