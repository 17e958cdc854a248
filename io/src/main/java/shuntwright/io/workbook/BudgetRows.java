package shuntwright.io.workbook;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.Input;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.EffectIndex;
import shuntwright.sampling.Propagated;

/** The rows of the two error budget sheets: outcomes, and below each outcome's sum its inputs. */
final class BudgetRows {

    /** Stands where trials would have to say something. */
    static final Column.Content NOT_SAMPLED = new Column.Content.Marked("not sampled", Style.TEXT);

    /** A row of the sheet of outcomes. */
    sealed interface OutcomeRow {
        String channel();
    }

    /**
     * One outcome of one channel.
     *
     * @param assessment what limits and combined uncertainty say of it
     * @param tripTarget of the channel, A
     * @param before     true for a reading as it would be without calibration
     * @param study      of the channel; empty where nothing was sampled, as before calibration
     * @param sumRow     its sum on the sheet of inputs, from 0
     */
    record One(String channel, Assessment assessment, double tripTarget, boolean before, Optional<ChannelStudy> study,
            int sumRow) implements OutcomeRow {
        String words() {
            return assessment.outcome().words() + (before ? ", before calibration" : "");
        }

        Optional<Propagated> propagated() {
            return study.flatMap(each -> each.outcome(assessment.outcome()));
        }
    }

    /** @param study of a channel with several outcomes, whose trials are outside when any of them is */
    record Together(ChannelStudy study) implements OutcomeRow {
        @Override
        public String channel() {
            return study.channel();
        }
    }

    /** A row of the sheet of inputs. */
    sealed interface InputRow {
        One outcome();
    }

    /** @param outcome whose inputs stand below */
    record Sum(One outcome) implements InputRow {
        int lines() {
            return outcome.assessment().budget().size();
        }

        /** True when there are effect indices to sum up. */
        boolean effects() {
            return outcome.propagated().map(each -> !each.effects().isEmpty()).orElse(false);
        }
    }

    /**
     * One input of an outcome.
     *
     * @param number from 1, so many rows below the sum
     */
    record Line(One outcome, BudgetLine line, int number) implements InputRow {
        Input input() {
            return line.input();
        }

        Optional<EffectIndex> effect() {
            return effects().stream().filter(each -> each.input().equals(input())).findFirst();
        }

        /** An input above it that is of the same reel, and so has its index together with it. */
        Optional<Input> together() {
            return input().reel().isEmpty()
                    ? Optional.empty()
                    : outcome.assessment().budget().stream().limit(number - 1L).map(BudgetLine::input)
                            .filter(each -> each.reel().equals(input().reel())
                                    && each.slot().unit().equals(input().slot().unit()))
                            .findFirst();
        }

        List<EffectIndex> effects() {
            return outcome.propagated().map(Propagated::effects).orElse(List.of());
        }
    }

    private final List<OutcomeRow> outcomes = new ArrayList<>();
    private final List<InputRow> inputs = new ArrayList<>();

    private BudgetRows() {
    }

    static BudgetRows of(Plan plan) {
        BudgetRows rows = new BudgetRows();
        for (ChannelPlan each : plan.channels()) {
            String name = each.channel().name();
            each.solved().ifPresent(
                    solved -> rows.add(name, solved, plan.study().flatMap(study -> study.channel(name))));
        }
        return rows;
    }

    List<OutcomeRow> outcomes() {
        return outcomes;
    }

    List<InputRow> inputs() {
        return inputs;
    }

    private void add(String channel, SolvedChannel solved, Optional<ChannelStudy> study) {
        double target = solved.demand().tripTarget();
        for (Assessment each : solved.assessments()) {
            add(new One(channel, each, target, false, study, inputs.size()));
            solved.uncalibrated().stream().filter(before -> before.outcome() == each.outcome())
                    .forEach(before -> add(new One(channel, before, target, true, Optional.empty(), inputs.size())));
        }
        study.filter(each -> each.outcomes().size() > 1).ifPresent(each -> outcomes.add(new Together(each)));
    }

    private void add(One outcome) {
        outcomes.add(outcome);
        inputs.add(new Sum(outcome));
        int number = 0;
        for (BudgetLine line : outcome.assessment().budget()) {
            inputs.add(new Line(outcome, line, ++number));
        }
    }
}
