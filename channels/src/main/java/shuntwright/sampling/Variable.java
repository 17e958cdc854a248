package shuntwright.sampling;

import java.util.Optional;

import shuntwright.accuracy.Reel;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/**
 * A random input. Two variables with the same key are the same draw wherever they occur; the draws depend on nothing but seed, key
 * and number of the trial.
 *
 * @param key          whose draw of what, for example "supply / sense supply"
 * @param limits       in the input's unit; a width of 0 makes it a constant
 * @param distribution around the middle of the limits
 * @param reel         of which several pieces deviate alike; empty for an independent variable
 */
public record Variable(String key, Range limits, Distribution distribution, Optional<Reel> reel) {

    /** An independent variable. */
    public static Variable of(String key, Range limits, Distribution distribution) {
        return new Variable(key, limits, distribution, Optional.empty());
    }

    /** A normal variable of that mean and standard deviation. */
    public static Variable normal(String key, double mean, double standard) {
        return of(key, Range.of(mean - standard, mean + standard), new Distribution.Normal(1));
    }
}
