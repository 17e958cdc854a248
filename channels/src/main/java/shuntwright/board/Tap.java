package shuntwright.board;

import java.util.OptionalDouble;

import shuntwright.quantity.Finite;

/**
 * A threshold that several channels share, so that all of them trip at one voltage.
 *
 * @param name    what channels call it
 * @param source  supply or reference
 * @param kind    divider or DAC output
 * @param voltage wanted, V; empty lets the program choose the one that suits the channels best
 */
public record Tap(String name, Source source, Kind kind, OptionalDouble voltage) {

    /** How the voltage is made. */
    public sealed interface Kind {

        /**
         * A resistor divider.
         *
         * @param top    pinned resistance from source to tap, Ω; empty lets the program choose
         * @param bottom pinned resistance from tap to ground, Ω
         */
        record Divider(OptionalDouble top, OptionalDouble bottom) implements Kind {
            /** @throws IllegalArgumentException unless both are &gt; 0 */
            public Divider {
                if (!Finite.positive(top.orElse(1)) || !Finite.positive(bottom.orElse(1))) {
                    throw new IllegalArgumentException("divider resistances must be > 0");
                }
            }
        }

        /**
         * An output of a digital-to-analogue converter whose full scale is the source's voltage.
         *
         * @param bits         resolution, 4 to 20
         * @param gainError    limit of its magnitude, a fraction
         * @param offset       limit of its magnitude, V
         * @param nonlinearity limit of its magnitude in steps (LSB)
         */
        record Dac(int bits, double gainError, double offset, double nonlinearity) implements Kind {
            /** @throws IllegalArgumentException unless 4 ≤ bits ≤ 20 and the limits are ≥ 0 */
            public Dac {
                if (bits < 4 || bits > 20 || !(gainError >= 0 && gainError < 1) || !Finite.notNegative(offset)
                        || !Finite.notNegative(nonlinearity)) {
                    throw new IllegalArgumentException("a DAC needs 4 to 20 bits and error limits ≥ 0");
                }
            }
        }
    }

    /** @throws IllegalArgumentException unless the wanted voltage is &gt; 0 */
    public Tap {
        if (!Finite.positive(voltage.orElse(1))) {
            throw new IllegalArgumentException("tap " + name + " needs a voltage > 0, got " + voltage);
        }
    }
}
