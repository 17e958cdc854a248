package shuntwright.accuracy;

import java.util.List;
import java.util.Optional;

import shuntwright.quantity.Range;

/**
 * One outcome of a solved channel: all answers from one description of the inputs; currents in A.
 *
 * @param outcome  which
 * @param nominal  with every input at its nominal value
 * @param limits   exact extremes over the box of inputs
 * @param combined JCGM 100
 * @param allowed  what the demand allows
 * @param budget   contributions, largest first
 * @param propagated probabilistically symmetric coverage interval of the propagated distribution (JCGM 101); empty until sampled,
 *                   which is not needed where the limits are inside
 */
public record Assessment(Outcome outcome, double nominal, Range limits, CombinedUncertainty combined, Range allowed,
        List<BudgetLine> budget, Optional<Range> propagated) {

    /** Standard uncertainties; a normal distribution has 50 % within 0.67 of them (common practice). */
    public static final double LEAST_FACTOR = 0.5;

    public Assessment {
        budget = List.copyOf(budget);
    }

    /** True when the limits are within what is allowed. */
    public boolean insideByLimits() {
        return allowed.contains(limits);
    }

    /** True when the coverage interval of the propagated distribution is within what is allowed. */
    public boolean insideByCoverage() {
        return insideByLimits() || propagated.map(allowed::contains).orElse(false);
    }

    /**
     * False where sampling is not worth its time: not even half a standard uncertainty on each side of the estimate fits, and every
     * coverage interval of 50 % or more of the distributions met here is wider.
     */
    public boolean mayBeInsideByCoverage() {
        double half = LEAST_FACTOR * combined.standard();
        return insideByLimits()
                || allowed.contains(Range.of(combined.estimate() - half, combined.estimate() + half));
    }

    /** The coverage interval: of the propagated distribution where sampled, else of the combined uncertainty. */
    public Range coverage() {
        return propagated.orElseGet(combined::interval);
    }

    public Assessment withPropagated(Range interval) {
        return new Assessment(outcome, nominal, limits, combined, allowed, budget, Optional.of(interval));
    }

    /**
     * Slack of the limits as a share of the allowed half-width: 1 at a point in the middle, 0 when a limit touches,
     * negative when it sticks out.
     */
    public double margin() {
        return slack(limits);
    }

    /** The same for the coverage interval. */
    public double coverageMargin() {
        return slack(coverage());
    }

    private double slack(Range reached) {
        double half = allowed.width() / 2;
        return Math.min(reached.min() - allowed.min(), allowed.max() - reached.max()) / half;
    }
}
