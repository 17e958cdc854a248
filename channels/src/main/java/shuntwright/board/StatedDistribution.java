package shuntwright.board;

import java.util.Optional;

import shuntwright.quantity.Distribution;

/**
 * What the user knows of an input beyond its limits. Inputs without a statement are uniform between their limits.
 *
 * @param input        which, in the words of the error budget, for example "shunt tolerance"
 * @param part         only of this part number; empty for every part
 * @param distribution between or around the limits
 */
public record StatedDistribution(String input, Optional<String> part, Distribution distribution) {}
