package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Outcome;
import shuntwright.accuracy.Owner;
import shuntwright.accuracy.Slot;
import shuntwright.board.Sampling;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.SolvedChannel;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.CoverageInterval;
import shuntwright.sampling.EffectIndex;
import shuntwright.sampling.Histogram;
import shuntwright.sampling.Probability;
import shuntwright.sampling.Propagated;
import shuntwright.sampling.Sampled;
import shuntwright.sampling.Validation;

/** A study put together by hand for {@link PlanFixture}: its first three channels have a circuit. */
final class StudyFixture {
    static final Input SUPPLY = input(Slot.SUPPLY, new Owner.Shared("supply"));
    static final Input TOLERANCE = input(Slot.SHUNT_TOLERANCE, new Owner.Own("shunt 1"));
    static final Input OFFSET = input(Slot.OFFSET, new Owner.Own("amplifier"));
    static final Input EMF = input(Slot.THERMAL_EMF, new Owner.Own("shunt 1"));

    /** Of 0 in a million trials at most this share, by 95 %: 1 − 0.025^(1/10⁶) (Clopper-Pearson). */
    private static final double NONE_AT_MOST = 1 - Math.pow(0.025, 1e-6);

    private StudyFixture() {
    }

    private static Input input(Slot slot, Owner owner) {
        return new Input(slot, 0, owner, 0, Range.of(-0.01, 0.01), new Distribution.Uniform(), Optional.empty());
    }

    /** The plan with the study, and with a budget for its second channel. */
    static Plan sampled() {
        Plan plan = PlanFixture.plan();
        List<ChannelPlan> channels = new ArrayList<>(plan.channels());
        channels.set(1, withBudget(channels.get(1)));
        return with(plan, channels, study(plan, new Sampling.Trials.Fixed(1_000_000), true));
    }

    static Plan with(Plan plan, List<ChannelPlan> channels, BoardStudy study) {
        return new Plan(plan.board(), plan.currency(), channels, plan.shared(), plan.alerts(), plan.taps(),
                plan.references(), plan.parts(), plan.findings(), plan.choice(), Optional.of(study));
    }

    static BoardStudy study(Plan plan, Sampling.Trials trials, boolean settled) {
        List<String> names = plan.channels().stream().map(each -> each.channel().name()).toList();
        List<ChannelStudy> channels = List.of(
                channel(names.get(0), true, 1_000_000, never(), true, settled),
                channel(names.get(1), false, 1_200_000,
                        new Probability(2e-5, Range.of(1.2e-5, 3.05e-5), 4e-6, Probability.Method.WEIGHTED, 16_384),
                        true,
                        settled),
                channel(names.get(2), true, 1_000_000,
                        new Probability(0.0123, Range.of(0.01214, 0.01256), 1e-4, Probability.Method.COUNTED,
                                1_000_000),
                        false, true));
        return new BoardStudy(new Sampling(trials, 7), channels, new BoardYield(
                new Probability(0.9876, Range.of(0.9874, 0.9879), 1e-4, Probability.Method.COUNTED, 1_000_000), 0.9512,
                List.of(new BoardYield.SharedCost("ambient", 0.9917, 0.0041, 2e-4),
                        new BoardYield.SharedCost("supply", 0.9878, 0.0002, 2e-4),
                        new BoardYield.SharedCost("reference vref", 0.9875, -0.0001, 1e-4))));
    }

    private static Probability never() {
        return new Probability(0, Range.of(0, NONE_AT_MOST), 0, Probability.Method.COUNTED, 1_000_000);
    }

    private static ChannelStudy channel(String name, boolean valid, long trials, Probability outside, boolean more,
            boolean settled) {
        Sampled trip = new Sampled(trials, more ? 0 : 12, 11.5, 0.1,
                new CoverageInterval(Range.of(11.21, 11.79), new CoverageInterval.Ends(1e-3, 2e-3)),
                new CoverageInterval(Range.of(11.2, 11.78), new CoverageInterval.Ends(3e-3, 4e-3)), outside,
                new Histogram(Range.of(11, 12), List.of(trials), trials));
        return new ChannelStudy(name, 0.9973, settled, List.of(new Propagated(Outcome.TRIP, Range.of(11, 12), trip,
                new Validation(valid, 2, 5e-4, 1.5e-3, 2e-4),
                List.of(new EffectIndex(SUPPLY, 0.7, 0.003, 0.71, 0.002),
                        new EffectIndex(TOLERANCE, 0.28, 0.002, 0.281, 0.001),
                        new EffectIndex(OFFSET, -4e-4, 9e-4, 6e-4, 3e-4)))),
                outside);
    }

    private static ChannelPlan withBudget(ChannelPlan plan) {
        SolvedChannel old = plan.solved().orElseThrow();
        Assessment trip = old.trip();
        Assessment budgeted = new Assessment(trip.outcome(), trip.nominal(), trip.limits(), trip.combined(),
                trip.allowed(), List.of(new BudgetLine(SUPPLY, 1, -0.2, 0.21, 0.08, 0.7),
                        new BudgetLine(TOLERANCE, 1, -0.1, 0.11, 0.05, 0.28),
                        new BudgetLine(OFFSET, 1, -0.02, 0.02, 1e-3, 4e-4),
                        new BudgetLine(EMF, 1, -0.01, 0.01, 0.002, 0.02)),
                trip.propagated());
        SolvedChannel solved = new SolvedChannel(old.demand(), old.circuit(), old.around(), old.settings(),
                old.inputs(), List.of(budgeted), List.of(), old.limits(), old.heat(), old.cost());
        return new ChannelPlan(plan.channel(), plan.verdict(), plan.accepted(), Optional.of(solved), plan.findings(),
                plan.cures(), plan.refusals());
    }
}
