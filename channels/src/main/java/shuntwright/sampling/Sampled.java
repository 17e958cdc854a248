package shuntwright.sampling;

/**
 * What trials say of one output; in the output's unit.
 *
 * @param trials    how many
 * @param runaways  trials without a value (thermal runaway): they count as outside and are in no moment
 * @param mean      of the others
 * @param standard  standard deviation of the others
 * @param symmetric probabilistically symmetric coverage interval
 * @param shortest  shortest coverage interval
 * @param outside   probability of being outside what is allowed
 * @param histogram of the trials
 */
public record Sampled(long trials, long runaways, double mean, double standard, CoverageInterval symmetric,
        CoverageInterval shortest, Probability outside, Histogram histogram) {}
