package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.CombinedUncertainty;
import shuntwright.accuracy.Input;
import shuntwright.io.planfile.Cautions;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.planner.work.TrialWords;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.sampling.CoverageInterval;
import shuntwright.sampling.EffectIndex;
import shuntwright.sampling.ProbabilityWords;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;
import shuntwright.sampling.Validation;

/**
 * One channel's error budget as text: for each outcome what its three readers say, then what each input contributes to the limits,
 * to the combined uncertainty and to the propagated distribution.
 */
final class BudgetText {
    private static final int DIGITS = 3;
    private static final int NOT_PAINTED = -1;
    private static final String NONE = "-";
    /** Shares and errors that the last digit shown would make 0. */
    private static final double LEAST = 0.0005;
    private static final String LITTLE = "< 0.1 %";

    private final List<String> lines = new ArrayList<>();

    private BudgetText() {
    }

    /** The lines to print. */
    static List<String> of(Plan plan, ChannelPlan channel, boolean colour) {
        BudgetText text = new BudgetText();
        text.lines.add(Spelling.harmless(channel.channel().name()) + ": "
                + Paint.of(channel, colour).apply(PlanText.verdict(channel)));
        channel.solved().ifPresentOrElse(solved -> text.outcomes(plan, channel, solved),
                () -> text.lines.add("There is no circuit, so there is no error budget."));
        text.lines.add("");
        text.lines.add(Cautions.LINE);
        return List.copyOf(text.lines);
    }

    private void outcomes(Plan plan, ChannelPlan channel, SolvedChannel solved) {
        String name = channel.channel().name();
        for (Assessment each : solved.assessments()) {
            Optional<Propagated> propagated = plan.study().flatMap(study -> study.channel(name))
                    .flatMap(study -> study.outcome(each.outcome()));
            outcome(capital(each.outcome().words()), each, propagated);
        }
        for (Assessment each : solved.uncalibrated()) {
            outcome(capital(each.outcome().words()) + " without calibration", each, Optional.empty());
        }
        if (plan.study().isPresent()) {
            lines.add("");
            lines.add(
                    "Pieces of one reel move together and have one index. The sum of the first orders falls short of");
            lines.add("100 % by what inputs do only together.");
        }
    }

    private void outcome(String title, Assessment assessment, Optional<Propagated> propagated) {
        lines.add("");
        lines.add(title + ": nominal " + ampere(assessment.nominal()) + ", allowed "
                + StudyText.range(assessment.allowed()));
        Columns readers = new Columns(NOT_PAINTED);
        readers.add(List.of("  limits", StudyText.range(assessment.limits()),
                assessment.insideByLimits() ? "inside" : "not inside"));
        CombinedUncertainty combined = assessment.combined();
        readers.add(List.of("  combined uncertainty", StudyText.range(combined.interval()),
                "k = " + String.format(Locale.ROOT, "%.2f", combined.coverageFactor()) + ", standard uncertainty "
                        + brief(combined.standard())));
        propagated.ifPresent(each -> sampled(each, readers));
        lines.addAll(readers.lines());
        lines.add("");
        contributions(assessment.budget(), propagated.map(Propagated::effects));
    }

    private static void sampled(Propagated propagated, Columns readers) {
        Sampled sampled = propagated.sampled();
        readers.add(interval("  sampled, symmetric", sampled.symmetric()));
        readers.add(interval("  sampled, shortest", sampled.shortest()));
        readers.add(List.of("  mean", ampere(sampled.mean()), "standard deviation " + brief(sampled.standard()) + ", "
                + TrialWords.count(sampled.trials()) + " trials"));
        readers.add(List.of("  outside", ProbabilityWords.of(sampled.outside()), sampled.outside().method().word()));
        if (sampled.runaways() > 0) {
            readers.add(List.of("  thermal runaway", "in " + TrialWords.count(sampled.runaways()),
                    "trials, counted as outside"));
        }
        Validation validation = propagated.validation();
        readers.add(List.of("  JCGM 101, clause 8", validation.valid() ? "valid" : "not valid",
                "ends differ by " + brief(validation.lowDifference()) + " and "
                        + brief(validation.highDifference()) + ", tolerance " + brief(validation.tolerance())));
    }

    private static List<String> interval(String name, CoverageInterval interval) {
        return List.of(name, StudyText.range(interval.range()), "standard errors of the ends "
                + brief(interval.standardErrors().low()) + " and " + brief(interval.standardErrors().high()));
    }

    /** @param effects empty where they were not asked for */
    private void contributions(List<BudgetLine> budget, Optional<List<EffectIndex>> effects) {
        Columns table = new Columns(NOT_PAINTED);
        List<String> heading = new ArrayList<>(List.of("  input", "low limit", "high limit", "of u_c²"));
        effects.ifPresent(_ -> heading.addAll(List.of("first order", "total")));
        table.add(heading);
        for (BudgetLine each : budget) {
            List<String> row = new ArrayList<>(List.of("  " + each.input().label(), signed(each.towardsLow()),
                    signed(each.towardsHigh()), percent(each.varianceShare())));
            effects.ifPresent(all -> row.addAll(indices(each.input(), all)));
            table.add(row);
        }
        lines.addAll(table.lines());
    }

    private static List<String> indices(Input input, List<EffectIndex> effects) {
        return effects.stream().filter(each -> each.input().equals(input)).findFirst()
                .map(each -> List.of(withError(each.first(), each.firstError()),
                        withError(each.total(), each.totalError())))
                .orElse(List.of(NONE, NONE));
    }

    private static String withError(double share, double error) {
        String value = percent(share);
        return error < LEAST || value.equals(LITTLE)
                ? value
                : String.format(Locale.ROOT, "%.1f ±%.1f %%", 100 * share, 100 * error);
    }

    private static String percent(double share) {
        return Math.abs(share) < LEAST ? LITTLE : String.format(Locale.ROOT, "%.1f %%", 100 * share);
    }

    private static String signed(double value) {
        return value > 0 ? "+" + brief(value) : brief(value);
    }

    private static String ampere(double value) {
        return QuantityWriter.show(value, Dimension.CURRENT);
    }

    private static String brief(double value) {
        return QuantityWriter.show(value, Dimension.CURRENT, DIGITS);
    }

    private static String capital(String words) {
        return words.substring(0, 1).toUpperCase(Locale.ROOT) + words.substring(1);
    }
}
