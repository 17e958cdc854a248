package shuntwright.board;

import shuntwright.quantity.Range;

/** What a channel does after a trip, once the current has fallen. */
public sealed interface ReleaseDemand {

    /** Re-arms at a current above the load and below the no-trip current. */
    record Between() implements ReleaseDemand {}

    /** @param window currents in which it must re-arm, A */
    record Window(Range window) implements ReleaseDemand {
        /** @throws IllegalArgumentException unless the window is above 0 */
        public Window {
            if (!(window.min() >= 0) || !(window.max() > 0)) {
                throw new IllegalArgumentException("a release window needs currents ≥ 0, got " + window);
            }
        }
    }

    /** Stays tripped until it is reset. */
    record Latch() implements ReleaseDemand {}
}
