package shuntwright.circuit;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Toleranced;

/** The parts around the comparator that make its hysteresis. */
public sealed interface HysteresisNetwork {

    /** Nothing but what is built in, or a latch. */
    record None() implements HysteresisNetwork {}

    /** @param resistance R_H between amplifier output and sense input, Ω */
    record SenseResistor(double resistance) implements HysteresisNetwork {
        /** @throws IllegalArgumentException unless resistance &gt; 0 */
        public SenseResistor {
            if (!Finite.positive(resistance)) {
                throw new IllegalArgumentException("R_H must be > 0, got " + resistance);
            }
        }
    }

    /**
     * Positive feedback to the threshold node.
     *
     * @param resistance  R_F from output to node, Ω
     * @param pullUp      R_PU of the output, Ω
     * @param pullVoltage V_IO, V
     * @param supplied    true where V_IO is the sense supply itself
     */
    record Feedback(double resistance, double pullUp, Toleranced pullVoltage, boolean supplied)
            implements
                HysteresisNetwork {
        /** @throws IllegalArgumentException unless resistances are &gt; 0 */
        public Feedback {
            if (!Finite.positive(resistance) || !Finite.positive(pullUp)) {
                throw new IllegalArgumentException("R_F and R_PU must be > 0, got " + resistance + ", " + pullUp);
            }
        }
    }
}
