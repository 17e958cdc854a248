/**
 * The choice of parts and values for one channel: candidates that respect every limit, the values of divider and
 * hysteresis resistors, the best of them, or why there is none. In come a demand, the surroundings and a catalogue; out
 * goes a {@link shuntwright.choice.ChannelChoice}.
 */
@NullMarked
package shuntwright.choice;

import org.jspecify.annotations.NullMarked;
