package shuntwright.circuit;

import shuntwright.board.Tap;
import shuntwright.quantity.Finite;

/** How a channel's threshold voltage is made. */
public sealed interface Threshold {

    SourceVoltage source();

    /**
     * A divider: R_t from the source to the node, R_b from the node to ground.
     *
     * @param source where R_t starts
     * @param top    R_t, Ω
     * @param bottom R_b, Ω
     * @param tap    name of the tap that shares it; empty for the channel's own
     * @param users  comparators whose bias current loads the node, ≥ 1
     */
    record Divider(SourceVoltage source, double top, double bottom, String tap, int users) implements Threshold {
        /** @throws IllegalArgumentException unless resistances are &gt; 0 and users ≥ 1 */
        public Divider {
            if (!Finite.positive(top) || !Finite.positive(bottom) || users < 1) {
                throw new IllegalArgumentException("a divider needs resistances > 0 and at least one user, got " + top
                        + ", " + bottom + ", " + users);
            }
        }

        /** Nominal voltage without load, V. */
        public double openVoltage() {
            return source.voltage().nominal() * bottom / (top + bottom);
        }

        /** Parallel resistance seen from the node, Ω. */
        public double parallel() {
            return top * bottom / (top + bottom);
        }
    }

    /**
     * A DAC output shared as a tap.
     *
     * @param source full scale
     * @param dac    its errors
     * @param code   input code, 0 to 2^bits - 1
     * @param tap    name of the tap
     */
    record DacOutput(SourceVoltage source, Tap.Kind.Dac dac, int code, String tap) implements Threshold {
        /** @throws IllegalArgumentException unless 0 ≤ code &lt; 2^bits */
        public DacOutput {
            if (code < 0 || code >= 1 << dac.bits()) {
                throw new IllegalArgumentException("a DAC of " + dac.bits() + " bits needs a code from 0 to "
                        + ((1 << dac.bits()) - 1) + ", got " + code);
            }
        }

        /** Nominal voltage, V. */
        public double openVoltage() {
            return source.voltage().nominal() * code / (double) (1 << dac.bits());
        }
    }

    /** Name of the tap, or empty for an own divider. */
    default String tapName() {
        return switch (this) {
            case Divider divider -> divider.tap();
            case DacOutput dac -> dac.tap();
        };
    }

    /** Nominal voltage without bias current and feedback, V. */
    default double nominalVoltage() {
        return switch (this) {
            case Divider divider -> divider.openVoltage();
            case DacOutput dac -> dac.openVoltage();
        };
    }
}
