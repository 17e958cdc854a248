package shuntwright.sampling;

import shuntwright.quantity.Range;

/**
 * A probability estimated from trials. It is never known to be exactly 0 or 1: the interval says how far it may be from what was
 * found.
 *
 * @param estimate what the trials say
 * @param interval confidence interval of 95 %; for counted trials the exact binomial one (Clopper and Pearson, 1934)
 * @param standardError of the estimate; 0 where nothing was counted says nothing, the interval does
 * @param method   how it was found
 * @param trials   how many decided
 */
public record Probability(double estimate, Range interval, double standardError, Method method, long trials) {

    /** Confidence of {@link #interval()}. */
    public static final double CONFIDENCE = 0.95;

    /** How a probability was found. */
    public enum Method {
        /** Share of plain trials. */
        COUNTED("counted"),
        /** Trials drawn where failures are, each with its weight (importance sampling). */
        WEIGHTED("weighted");

        private final String word;

        Method(String word) {
            this.word = word;
        }

        public String word() {
            return word;
        }
    }

    /** That of the opposite event. */
    public Probability opposite() {
        return new Probability(1 - estimate, Range.of(1 - interval.max(), 1 - interval.min()), standardError, method,
                trials);
    }
}
