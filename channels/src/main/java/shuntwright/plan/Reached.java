package shuntwright.plan;

import java.util.OptionalDouble;

import shuntwright.board.Objective;

/**
 * What a choice reaches of one objective.
 *
 * @param objective which
 * @param value     W for heat; share of the limit used for even heat (1 = all of it); currency for cost of the whole build; count for
 *                  parts; share of the allowed half-width for margin
 * @param bound     no choice of any kind is better than this under the objectives before it; empty when nothing is known
 * @param proof     whether value is proven best
 */
public record Reached(Objective objective, double value, OptionalDouble bound, Proof proof) {

    /** How sure it is that nothing is better. */
    public enum Proof {
        /** No choice is better: proven; heat within the design rules' heat step for each channel, which later objectives may use. */
        PROVEN,
        /** Nothing is better than the bound; between it and the value there may be something. */
        BOUNDED,
        /** Nothing is known of what could be better. */
        OPEN
    }

    /** Distance from the bound as a share of the value: nothing is better by more; 0 when proven, empty when nothing is known. */
    public OptionalDouble gap() {
        return switch (proof) {
            case PROVEN -> OptionalDouble.of(0);
            case BOUNDED -> {
                double apart = Math.abs(value - bound.orElseThrow());
                yield OptionalDouble.of(apart == 0 ? 0 : apart / Math.abs(value));
            }
            case OPEN -> OptionalDouble.empty();
        };
    }
}
