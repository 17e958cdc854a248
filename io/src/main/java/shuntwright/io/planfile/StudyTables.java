package shuntwright.io.planfile;

import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.CoverageInterval;
import shuntwright.sampling.EffectIndex;
import shuntwright.sampling.Histogram;
import shuntwright.sampling.Probability;
import shuntwright.sampling.ProbabilityWords;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;
import shuntwright.sampling.Validation;

/** Propagated distributions. */
final class StudyTables {

    private static final Form<Probability> PROBABILITY = ObjectTable.<Probability>named("probability",
            "A probability found by trials: the estimate means nothing without its interval, least of all where it is "
                    + "0 or 1.")
            .text("words", "estimate and interval as they may be quoted", ProbabilityWords::of)
            .number("estimate", Unit.FRACTION, "what the trials say", Probability::estimate)
            .range("interval95", Unit.FRACTION, "confidence interval of 95 %; for counted trials the exact binomial "
                    + "one (Clopper and Pearson, 1934)", Probability::interval)
            .maybeNumber("standardError", Unit.FRACTION, "of the estimate; absent where the estimate is 0 or 1, of "
                    + "which only the interval says how sure it is", each -> error(each))
            .text("method", "\"counted\": share of plain trials; \"weighted\": trials drawn where failures are, each "
                    + "with its weight", each -> each.method().word())
            .count("trials", "how many decided", Probability::trials).form();

    private static final Form<CoverageInterval> INTERVAL = ObjectTable.<CoverageInterval>named("coverage interval",
            "Read from trials.").range("range", Unit.AMPERE, "its ends", CoverageInterval::range)
            .maybeNumber("lowStandardError", Unit.AMPERE, "of the lower end; absent where trials do not give it",
                    each -> finite(each.standardErrors().low()))
            .maybeNumber("highStandardError", Unit.AMPERE, "of the upper end; absent where trials do not give it",
                    each -> finite(each.standardErrors().high()))
            .form();

    private static final Form<Histogram> HISTOGRAM = ObjectTable.<Histogram>named("histogram",
            "Trials counted in cells of equal width.")
            .range("range", Unit.AMPERE, "from the first cell to the last", Histogram::range)
            .counts("counts", "of each cell; what lies beyond the range is in neither", Histogram::counts)
            .count("trials", "all of them", Histogram::trials).form();

    private static final Form<Sampled> SAMPLED = ObjectTable.<Sampled>named("sampled", "What the trials say.")
            .count("trials", "how many", Sampled::trials)
            .count("runaways", "trials without a value (thermal runaway): they count as outside and are in no moment "
                    + "and no interval", Sampled::runaways)
            .maybeNumber("mean", Unit.AMPERE, "of the others; absent without any", each -> finite(each.mean()))
            .maybeNumber("standard", Unit.AMPERE, "standard deviation of the others; absent without any",
                    each -> finite(each.standard()))
            .object("symmetric", INTERVAL, "probabilistically symmetric coverage interval", Sampled::symmetric)
            .object("shortest", INTERVAL, "shortest coverage interval", Sampled::shortest)
            .object("outside", PROBABILITY, "that the outcome is outside what is allowed", Sampled::outside)
            .object("histogram", HISTOGRAM, "of the trials", Sampled::histogram).form();

    private static final Form<Validation> VALIDATION = ObjectTable.<Validation>named("validation",
            "Whether the combined uncertainty may stand for the propagated distribution (JCGM 101:2008, clause 8).")
            .flag("valid", "both differences are within the tolerance", Validation::valid)
            .count("digits", "significant digits of the standard uncertainty", Validation::digits)
            .maybeNumber("tolerance", Unit.AMPERE, "δ; absent without any value", each -> finite(each.tolerance()))
            .maybeNumber("lowDifference", Unit.AMPERE, "|y − U − y_low|; absent without any value",
                    each -> finite(each.lowDifference()))
            .maybeNumber("highDifference", Unit.AMPERE, "|y + U − y_high|; absent without any value",
                    each -> finite(each.highDifference()))
            .form();

    private static final Form<EffectIndex> EFFECT = ObjectTable.<EffectIndex>named("effect index",
            "How much of an outcome's variance an input explains (Sobol indices). Pieces of one reel move "
                    + "together: each has the index of all of them.")
            .text("slot", "of the input", each -> each.input().slot().name())
            .count("piece", "of the input", each -> each.input().piece())
            .text("ownerName", "of the input", each -> each.input().owner().name())
            .number("first", Unit.FRACTION, "by itself", EffectIndex::first)
            .maybeNumber("firstStandardError", Unit.FRACTION, "of that", each -> finite(each.firstError()))
            .number("total", Unit.FRACTION, "with everything it multiplies", EffectIndex::total)
            .maybeNumber("totalStandardError", Unit.FRACTION, "of that", each -> finite(each.totalError())).form();

    private static final Form<Propagated> PROPAGATED = ObjectTable.<Propagated>named("propagated",
            "The propagated distribution of one outcome (JCGM 101:2008).")
            .text("outcome", "as in `assessments`", each -> each.outcome().name())
            .range("allowed", Unit.AMPERE, "what the demand allows", Propagated::allowed)
            .flag("inside", "whether the symmetric coverage interval is within that", Propagated::inside)
            .object("sampled", SAMPLED, "what the trials say", Propagated::sampled)
            .object("validation", VALIDATION, "of the combined uncertainty", Propagated::validation)
            .list("effects", EFFECT,
                    "by input, largest total first, inputs without any effect left out; empty where they were not "
                            + "worked out",
                    Propagated::effects)
            .form();

    private static final Form<ChannelStudy> CHANNEL = ObjectTable.<ChannelStudy>named("channel study",
            "The propagated distributions of one channel.").text("channel", "its name", ChannelStudy::channel)
            .number("coverage", Unit.FRACTION, "coverage probability of all intervals", ChannelStudy::coverage)
            .flag("settled", "false when adaptive trials ended at their most before the results were stable",
                    ChannelStudy::settled)
            .list("outcomes", PROPAGATED, "trip first, then release and readings where asked", ChannelStudy::outcomes)
            .object("outside", PROBABILITY, "that any of them is outside what is allowed", ChannelStudy::outside)
            .form();

    private static final Form<BoardYield.SharedCost> COST = ObjectTable.<BoardYield.SharedCost>named("shared cost",
            "What a shared thing costs of the yield.")
            .text("owner", "the shared thing, by the `ownerName` of its inputs", BoardYield.SharedCost::owner)
            .number("without", Unit.FRACTION,
                    "share of trials with every channel inside when all its inputs stand at their nominal "
                            + "values",
                    BoardYield.SharedCost::without)
            .number("cost", Unit.FRACTION,
                    "`without_fraction` minus that share of the same trials as drawn, which may be fewer than "
                            + "those of the yield; may be slightly negative by chance",
                    BoardYield.SharedCost::cost)
            .number("standardError", Unit.FRACTION, "of the cost", BoardYield.SharedCost::standardError).form();

    private static final Form<BoardYield> YIELD = ObjectTable.<BoardYield>named("board yield",
            "The share of boards on which every channel with a circuit is inside in every outcome.")
            .object("inside", PROBABILITY, "with shared draws: one supply, one ambient, one reference for the whole "
                    + "board in each trial", BoardYield::inside)
            .number("product", Unit.FRACTION, "what the product of the channels' own estimates would have claimed",
                    BoardYield::product)
            .list("shared", COST, "what each shared thing costs, most first; empty where it was not worked out",
                    BoardYield::shared)
            .form();

    static final Form<BoardStudy> STUDY = ObjectTable.<BoardStudy>named("study",
            "The propagated distributions of the board.")
            .object("sampling", UncertaintyTables.SAMPLING, "how it was sampled", BoardStudy::sampling)
            .list("channels", CHANNEL, "every channel with a circuit", BoardStudy::channels)
            .maybeObject("yield", YIELD, "that all of them are inside together; absent where there is no circuit",
                    study -> study.channels().isEmpty() ? Optional.empty() : Optional.of(study.yield()))
            .form();

    private StudyTables() {
    }

    private static OptionalDouble error(Probability probability) {
        boolean known = probability.estimate() > 0 && probability.estimate() < 1;
        return known ? finite(probability.standardError()) : OptionalDouble.empty();
    }

    private static OptionalDouble finite(double value) {
        return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
    }
}
