package shuntwright.board;

import java.util.OptionalDouble;

import shuntwright.quantity.Finite;

/**
 * An area of the board.
 *
 * @param name              what channels call it
 * @param heatLimit         largest heat of its shunts together, W; empty for none
 * @param thermalResistance from the zone's board to the ambient air, K/W: the zone's own heat warms every part of its channels by
 *                          this much per watt; empty where parts stay at ambient temperature
 */
public record Zone(String name, OptionalDouble heatLimit, OptionalDouble thermalResistance) {

    /** @throws IllegalArgumentException unless limit and thermal resistance are &gt; 0 */
    public Zone {
        if (!Finite.positive(heatLimit.orElse(1)) || !Finite.positive(thermalResistance.orElse(1))) {
            throw new IllegalArgumentException("zone " + name + " needs a heat limit and a thermal resistance > 0, got "
                    + heatLimit + ", " + thermalResistance);
        }
    }
}
