package shuntwright.board;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

import shuntwright.quantity.Finite;

/**
 * Parts and values the user has fixed; empty ones are free.
 *
 * @param shunt              part number
 * @param shuntCount         shunts in parallel
 * @param amplifier          part number
 * @param comparator         part number
 * @param dividerTop         R_t of the channel's own divider, Ω
 * @param dividerBottom      R_b of the channel's own divider, Ω
 * @param resistors          part number of the series of divider and hysteresis resistors
 * @param hysteresisResistor R_H (injected current) or R_F (positive feedback), Ω
 */
public record Pins(Optional<String> shunt, OptionalInt shuntCount, Optional<String> amplifier,
        Optional<String> comparator, Optional<String> resistors, OptionalDouble dividerTop,
        OptionalDouble dividerBottom,
        OptionalDouble hysteresisResistor) {

    public static final Pins NONE = new Pins(Optional.empty(), OptionalInt.empty(), Optional.empty(), Optional.empty(),
            Optional.empty(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());

    /** @throws IllegalArgumentException unless counts are ≥ 1 and resistances &gt; 0 */
    public Pins {
        if (shuntCount.orElse(1) < 1 || !Finite.positive(dividerTop.orElse(1))
                || !Finite.positive(dividerBottom.orElse(1))
                || !Finite.positive(hysteresisResistor.orElse(1))) {
            throw new IllegalArgumentException("pinned counts must be at least 1 and resistances > 0");
        }
    }
}
