package shuntwright.board;

import java.util.Optional;

import shuntwright.quantity.Distribution;

/**
 * What the user knows of an input beyond its limits. Inputs without a statement are uniform between their limits.
 *
 * @param input        which, in the words of the error budget, for example "shunt tolerance"
 * @param part         only of this part number, or of all that begin so where it ends with an asterisk; empty for every part
 * @param distribution between or around the limits
 */
public record StatedDistribution(String input, Optional<String> part, Distribution distribution) {

    private static final String FAMILY = "*";

    /** True when the statement is for parts of some number only, and this is one of them. */
    public boolean names(String partNumber) {
        return part.filter(each -> each.equals(partNumber) || (each.endsWith(FAMILY)
                && partNumber.startsWith(each.substring(0, each.length() - FAMILY.length())))).isPresent();
    }
}
