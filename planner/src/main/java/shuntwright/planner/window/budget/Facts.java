package shuntwright.planner.window.budget;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.planner.window.figures.Chance;
import shuntwright.planner.window.figures.Currents;
import shuntwright.planner.work.TrialWords;
import shuntwright.quantity.Range;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.Probability;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;
import shuntwright.sampling.Validation;

/** What the three ways say of one outcome. */
final class Facts {
    private Facts() {
    }

    /**
     * What there is to say.
     *
     * @param study    of the channel; empty until sampled
     * @param unsolved why there is no study, in words
     */
    static List<Fact> of(Assessment assessment, Optional<ChannelStudy> study, String unsolved) {
        List<Fact> facts = new ArrayList<>();
        facts.add(new Fact("allowed", Currents.show(assessment.allowed()), "What the demand allows."));
        facts.add(new Fact("limits", Currents.show(assessment.limits()),
                "Exact extremes over all limits of the inputs at once: no board is beyond them." + (assessment
                        .insideByLimits()
                                ? " They are within what is allowed."
                                : " They are not within what is allowed.")));
        var combined = assessment.combined();
        facts.add(new Fact("combined, k = " + decimals(combined.coverageFactor(), 2),
                Currents.show(combined.estimate()) + " ± " + Currents.small(combined.expanded()),
                "Combined uncertainty (JCGM 100): " + Currents.show(combined.interval()) + " at "
                        + coverage(combined.coverageProbability()) + ", standard uncertainty "
                        + Currents.small(combined.standard()) + "."));
        Optional<Propagated> propagated = study.flatMap(each -> each.outcome(assessment.outcome()));
        if (study.isPresent() && propagated.isPresent()) {
            sampled(study.get(), propagated.get(), facts);
        } else {
            facts.add(new Fact("propagated", unsolved, "The distribution that trials give (JCGM 101)."));
        }
        return facts;
    }

    private static void sampled(ChannelStudy study, Propagated propagated, List<Fact> facts) {
        Sampled sampled = propagated.sampled();
        String coverage = coverage(study.coverage());
        facts.add(new Fact("symmetric " + coverage, Currents.show(sampled.symmetric()),
                "Propagated distribution (JCGM 101): as many trials below as above this interval; standard errors of its "
                        + "ends " + Currents.errors(sampled.symmetric())
                        + ". This one decides the verdict \"likely\"."));
        facts.add(new Fact("shortest " + coverage, Currents.show(sampled.shortest()),
                "Propagated distribution (JCGM 101): the shortest interval that holds so many trials; standard errors "
                        + "of its ends " + Currents.errors(sampled.shortest()) + "."));
        facts.add(new Fact("outside allowed", Chance.of(sampled.outside()), outside(sampled.outside())));
        facts.add(validation(propagated.validation()));
        facts.add(new Fact("trials", TrialWords.count(sampled.trials()) + runaways(sampled)
                + (study.settled() ? "" : ", not settled"),
                (study.settled()
                        ? "Mean "
                        : "They ended at their most before the results were stable (JCGM 101, 7.9). Mean ")
                        + Currents.show(sampled.mean()) + ", standard deviation " + Currents.small(sampled.standard())
                        + "."));
    }

    private static String runaways(Sampled sampled) {
        return sampled.runaways() == 0
                ? ""
                : ", " + TrialWords.count(sampled.runaways())
                        + (sampled.runaways() == 1 ? " with thermal runaway" : " with thermal runaways");
    }

    private static String outside(Probability outside) {
        return "Probability that this outcome is outside what is allowed, with its 95 % interval; "
                + switch (outside.method()) {
                    case COUNTED -> "counted in the trials.";
                    case WEIGHTED -> "by trials drawn where failures are, each with its weight.";
                };
    }

    private static Fact validation(Validation validation) {
        double off = Math.max(validation.lowDifference(), validation.highDifference());
        return new Fact("combined uncertainty is", (validation.valid() ? "valid, " : "not valid, ")
                + Currents.small(off) + " off of " + Currents.small(validation.tolerance()) + " allowed",
                "JCGM 101, clause 8: the combined uncertainty may stand for the distribution where both ends of its "
                        + "interval agree with the symmetric one to within the tolerance of " + validation.digits()
                        + (validation.digits() == 1 ? " significant digit" : " significant digits")
                        + " of the standard uncertainty. The lower ends differ by "
                        + Currents.small(validation.lowDifference()) + ", the upper ones by "
                        + Currents.small(validation.highDifference()) + ".");
    }

    /** "99.73 %". */
    static String coverage(double probability) {
        return new java.math.BigDecimal(Double.toString(probability)).movePointRight(2).stripTrailingZeros()
                .toPlainString() + " %";
    }

    private static String decimals(double value, int places) {
        return String.format(Locale.ROOT, "%." + places + "f", value);
    }

    /** How an outcome would be without calibration, in one fact. */
    static Fact before(Assessment bare) {
        Range limits = bare.limits();
        return new Fact("before calibration", "limits " + Currents.show(limits) + ", ±"
                + Currents.small(bare.combined().expanded()),
                "Limits and combined uncertainty of the same reading without calibration.");
    }
}
