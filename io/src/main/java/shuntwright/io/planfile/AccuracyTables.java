package shuntwright.io.planfile;

import java.util.OptionalDouble;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Owner;
import shuntwright.accuracy.Reel;

/** Described inputs and what they do to the outcomes. */
final class AccuracyTables {

    private static final Form<Reel> REEL = ObjectTable.<Reel>named("reel",
            "Pieces of one reel deviate alike: the same quantity of two of them is correlated.")
            .text("name", "which reel, the same for every channel that takes pieces of it", Reel::name)
            .number("correlation", Unit.FRACTION, "coefficient between two pieces", Reel::correlation).form();

    static final Form<Input> INPUT = ObjectTable.<Input>named("input", "One uncertain input of a channel.")
            .text("slot", "where it enters the equations", each -> each.slot().name())
            .text("words", "what it is", each -> each.slot().words())
            .count("piece", "which of the parallel shunts, from 0; 0 for everything else", Input::piece)
            .text("owner", "\"own\" to one part, or \"shared\": one draw for every channel that uses it",
                    each -> switch (each.owner()) {
                        case Owner.Own _ -> "own";
                        case Owner.Shared _ -> "shared";
                    })
            .text("ownerName", "the part or the shared thing", each -> each.owner().name())
            .numberIn(AccuracyTables::unit, "nominal", "nominal value", Input::nominal)
            .numberIn(AccuracyTables::unit, "low", "lower limit", each -> each.limits().min())
            .numberIn(AccuracyTables::unit, "high", "upper limit", each -> each.limits().max())
            .object("distribution", DistributionTables.DISTRIBUTION, "assigned to the limits", Input::distribution)
            .numberIn(AccuracyTables::unit, "standardUncertainty", "of that distribution", Input::standardUncertainty)
            .maybeObject("reel", REEL, "whose pieces deviate alike; absent for an independent input", Input::reel)
            .form();

    private static final Form<CombinedUncertainty> COMBINED = ObjectTable.<CombinedUncertainty>named(
            "combined uncertainty", "The result of JCGM 100.")
            .number("estimate", Unit.AMPERE, "value at the expectations of the inputs", CombinedUncertainty::estimate)
            .number("standard", Unit.AMPERE, "u_c", CombinedUncertainty::standard)
            .maybeNumber("degreesOfFreedom", Unit.PURE, "effective; absent when infinite",
                    each -> Double.isInfinite(each.degreesOfFreedom())
                            ? OptionalDouble.empty()
                            : OptionalDouble.of(each.degreesOfFreedom()))
            .number("coverageProbability", Unit.FRACTION, "p asked for", CombinedUncertainty::coverageProbability)
            .number("coverageFactor", Unit.PURE, "k for p", CombinedUncertainty::coverageFactor)
            .number("expanded", Unit.AMPERE, "U = k·u_c", CombinedUncertainty::expanded)
            .range("interval", Unit.AMPERE, "estimate ± U", CombinedUncertainty::interval).form();

    private static final Form<BudgetLine> LINE = ObjectTable.<BudgetLine>named("budget line",
            "What one input contributes to one outcome.")
            .text("slot", "of the input", each -> each.input().slot().name())
            .count("piece", "of the input", each -> each.input().piece())
            .text("ownerName", "of the input", each -> each.input().owner().name())
            .numberIn(each -> unit(each.input()), "sensitivity_A_per", "partial derivative of the outcome by the input",
                    BudgetLine::sensitivity)
            .number("towardsLow", Unit.AMPERE, "how it moves the lower limit", BudgetLine::towardsLow)
            .number("towardsHigh", Unit.AMPERE, "how it moves the upper limit", BudgetLine::towardsHigh)
            .number("standard", Unit.AMPERE, "its part of u_c", BudgetLine::standard)
            .number("varianceShare", Unit.FRACTION,
                    "its share of u_c²; together less or more than 1 where inputs are correlated",
                    BudgetLine::varianceShare)
            .form();

    /** One outcome with its error budget. */
    static final Form<Assessment> ASSESSMENT = ObjectTable
            .<Assessment>named("assessment", "One outcome of a solved channel.")
            .text("outcome", "TRIP, RELEASE, READING_AT_LEAST or READING_AT_LOAD", each -> each.outcome().name())
            .text("words", "what it is", each -> each.outcome().words())
            .number("nominal", Unit.AMPERE, "with every input at its nominal value",
                    Assessment::nominal)
            .range("limits", Unit.AMPERE, "exact extremes over all inputs", Assessment::limits)
            .range("allowed", Unit.AMPERE, "what the demand allows", Assessment::allowed)
            .object("combined", COMBINED, "combined uncertainty", Assessment::combined)
            .maybeRange("propagated", Unit.AMPERE, "probabilistically symmetric coverage interval of the propagated "
                    + "distribution; absent until sampled", Assessment::propagated)
            .range("coverage", Unit.AMPERE, "the coverage interval: `propagated_A` where it is there, else that of "
                    + "`combined`", Assessment::coverage)
            .flag("insideByLimits", "limits within what is allowed", Assessment::insideByLimits)
            .flag("insideByCoverage", "limits or `propagated_A` within what is allowed",
                    Assessment::insideByCoverage)
            .number("margin", Unit.FRACTION, "slack of the limits, of the allowed half-width",
                    Assessment::margin)
            .number("coverageMargin", Unit.FRACTION, "slack of `coverage_A`, of the allowed half-width",
                    Assessment::coverageMargin)
            .list("budget", LINE, "contributions, largest first", Assessment::budget).form();

    private AccuracyTables() {
    }

    private static Unit unit(Input input) {
        return Unit.of(input.slot());
    }
}
