package shuntwright.plan;

import java.util.List;
import java.util.Optional;

import shuntwright.board.Tap;
import shuntwright.circuit.Threshold;

/**
 * A tap with its chosen voltage.
 *
 * @param tap       as on the board
 * @param channels  that use it
 * @param threshold how its voltage is made; empty when no value could be found
 */
public record TapPlan(Tap tap, List<String> channels, Optional<Threshold> threshold) {
    public TapPlan {
        channels = List.copyOf(channels);
    }
}
