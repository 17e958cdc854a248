package shuntwright.selection;

import java.util.List;
import java.util.OptionalDouble;

/**
 * What a search has come to.
 *
 * @param choice   option of each slot
 * @param reached  of each aim, in order
 * @param broken   resources whose limits are exceeded
 * @param rounds   run
 * @param cutShort true when it was ended before its rounds
 */
public record Answer(List<Integer> choice, List<Reached> reached, List<Integer> broken, int rounds, boolean cutShort) {
    public Answer {
        choice = List.copyOf(choice);
        reached = List.copyOf(reached);
        broken = List.copyOf(broken);
    }

    /**
     * Of one aim.
     *
     * @param aim    what
     * @param value  reached
     * @param bound  no selection under the caps and the values of the aims before it has less; empty when nothing is known
     * @param proven true when no selection has less than the value
     */
    public record Reached(Aim aim, double value, OptionalDouble bound, boolean proven) {}

    public boolean keepsLimits() {
        return broken.isEmpty();
    }
}
