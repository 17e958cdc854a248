package shuntwright.sampling;

import java.util.List;

import shuntwright.accuracy.Outcome;
import shuntwright.quantity.Range;

/**
 * The propagated distribution of one outcome (JCGM 101:2008); currents in A.
 *
 * @param outcome    which
 * @param allowed    what the demand allows
 * @param sampled    moments, coverage intervals, probability of being outside, histogram
 * @param validation of the combined uncertainty
 * @param effects    indices by input, largest total first; empty where they were not asked for
 */
public record Propagated(Outcome outcome, Range allowed, Sampled sampled, Validation validation,
        List<EffectIndex> effects) {

    public Propagated {
        effects = List.copyOf(effects);
    }

    /** True when the probabilistically symmetric coverage interval is within what is allowed. */
    public boolean inside() {
        return allowed.contains(sampled.symmetric().range());
    }
}
