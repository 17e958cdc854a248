package shuntwright.plan;

import java.util.Optional;

import shuntwright.board.Channel;

/**
 * A single change that was tried on a failing channel by solving it again.
 *
 * @param lever   what kind of change
 * @param change  in words with numbers, for example "must-trip 40 A → 43.1 A"
 * @param reached the verdict with this change
 * @param margin  smallest margin reached, a share of the allowed half-width (negative outside); empty without a fit
 * @param size    size of the change for ranking, larger is more
 * @param edit    the channel with the change made; empty where the change is not one of the channel's demand
 */
public record Cure(Lever lever, String change, Verdict reached, Optional<Double> margin, double size,
        Optional<Channel> edit) {

    /** Kinds of change. */
    public enum Lever {
        OTHER_SHUNT("another shunt"), OTHER_AMPLIFIER("another amplifier"), OTHER_COMPARATOR("another comparator"),
        FREE_VALUES("values unpinned"), SOURCE("another source for the threshold"),
        TOLERANCE_CLASS("a tighter tolerance class"), WINDOW("a wider window"), RELEASE("another release window"),
        READING("another reading accuracy"), MORE_SHUNTS("more shunts in parallel"),
        SIDE("the shunt on the other side"), LIMIT("a relaxed limit");

        private final String words;

        Lever(String words) {
            this.words = words;
        }

        public String words() {
            return words;
        }
    }

    /** True when the change makes the channel inside. */
    public boolean cures() {
        return reached == Verdict.INSIDE;
    }
}
