package shuntwright.parts;

import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/** How a comparator separates release from trip; a property of the part. */
public sealed interface Hysteresis {

    /** The hysteresis built into the part, V; 0..0 when there is none. */
    Range builtIn();

    /**
     * While tripped the comparator drives a current out of its sense input; a resistor between amplifier output and that
     * input turns it into a voltage.
     *
     * @param current A
     * @param builtIn V
     */
    record InjectedCurrent(Toleranced current, Range builtIn) implements Hysteresis {
        /** @throws IllegalArgumentException unless the current is &gt; 0 and builtIn ≥ 0 */
        public InjectedCurrent {
            if (!(current.min() > 0)) {
                throw new IllegalArgumentException("an injected current must be > 0, got " + current);
            }
            requireNotNegative(builtIn);
        }
    }

    /**
     * A resistor from the open-drain output back to the threshold node.
     *
     * @param builtIn V
     */
    record PositiveFeedback(Range builtIn) implements Hysteresis {
        /** @throws IllegalArgumentException unless builtIn ≥ 0 */
        public PositiveFeedback {
            requireNotNegative(builtIn);
        }
    }

    /**
     * Only what is built in.
     *
     * @param builtIn V
     */
    record BuiltIn(Range builtIn) implements Hysteresis {
        /** @throws IllegalArgumentException unless builtIn ≥ 0 */
        public BuiltIn {
            requireNotNegative(builtIn);
        }
    }

    /** Stays tripped until a reset line re-arms it. */
    record Latched() implements Hysteresis {
        @Override
        public Range builtIn() {
            return Range.exactly(0);
        }
    }

    private static void requireNotNegative(Range builtIn) {
        if (!(builtIn.min() >= 0)) {
            throw new IllegalArgumentException("built-in hysteresis must be ≥ 0 V, got " + builtIn);
        }
    }
}
