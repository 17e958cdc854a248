package shuntwright.planner;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

import org.hipparchus.distribution.continuous.NormalDistribution;

import shuntwright.accuracy.Assessment;
import shuntwright.board.Acceptance;
import shuntwright.board.Sampling;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.BoardSampler;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.plan.SolvedChannel;
import shuntwright.plan.Verdict;
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

/**
 * A sampler whose trials are made by hand: every outcome is normal with the combined uncertainty's mean and standard deviation, and
 * the coverage interval its; no draw is made.
 */
public final class HandMadeStudies {
    private static final int CELLS = 60;
    private static final double REACH = 4;

    private HandMadeStudies() {
    }

    public static Plan sample(Plan plan, Sampling sampling, BoardSampler.Depth depth, Progress progress) {
        progress.reached("channels", 0, plan.channels().size());
        if (progress.cancelled()) {
            throw new BoardPlanner.Cancelled();
        }
        long trials = switch (sampling.trials()) {
            case Sampling.Trials.Fixed(int count) -> count;
            case Sampling.Trials.Adaptive(int _, int most) -> most;
        };
        List<ChannelPlan> channels = plan.channels().stream().map(each -> judged(each, plan)).toList();
        boolean full = depth == BoardSampler.Depth.FULL;
        List<ChannelStudy> studies = channels.stream()
                .flatMap(each -> each.solved().stream().map(solved -> study(each, solved, trials, full))).toList();
        double product = studies.stream().mapToDouble(each -> 1 - each.outside().estimate()).reduce(1, (a, b) -> a * b);
        double outside = (1 - product) / 2;
        BoardYield yield = new BoardYield(probability(outside, trials).opposite(), product, full && outside > 0
                ? List.of(new BoardYield.SharedCost("ambient", 1 - outside / 2, outside / 2, outside / 20))
                : List.of());
        return new Plan(plan.board(), plan.currency(), channels, plan.shared(), plan.alerts(), plan.taps(),
                plan.references(), plan.parts(), plan.findings(),
                plan.choice(), Optional.of(new BoardStudy(sampling, studies, yield)));
    }

    private static ChannelPlan judged(ChannelPlan plan, Plan board) {
        if (plan.solved().isEmpty()) {
            return plan;
        }
        SolvedChannel solved = plan.solved().get();
        List<Assessment> assessments = solved.assessments().stream()
                .map(each -> each.withPropagated(each.combined().interval())).toList();
        Verdict verdict = assessments.stream().allMatch(Assessment::insideByLimits)
                ? Verdict.INSIDE
                : assessments.stream().allMatch(Assessment::insideByCoverage) ? Verdict.LIKELY : Verdict.OUTSIDE;
        boolean accepted = verdict == Verdict.INSIDE
                || (verdict == Verdict.LIKELY && board.board().acceptance().basis() == Acceptance.Basis.COVERAGE);
        return new ChannelPlan(plan.channel(), verdict, accepted, Optional.of(new SolvedChannel(solved.demand(),
                solved.circuit(), solved.around(), solved.settings(), solved.inputs(), assessments,
                solved.uncalibrated(), solved.limits(), solved.heat(), solved.cost())), plan.findings(), plan.cures(),
                plan.refusals());
    }

    private static ChannelStudy study(ChannelPlan plan, SolvedChannel solved, long trials, boolean full) {
        List<Propagated> outcomes = solved.assessments().stream().map(each -> propagated(each, trials, full)).toList();
        double outside = outcomes.stream().mapToDouble(each -> each.sampled().outside().estimate()).max().orElse(0);
        return new ChannelStudy(plan.channel().name(), solved.trip().combined().coverageProbability(), true, outcomes,
                probability(outside, trials));
    }

    private static Propagated propagated(Assessment assessment, long trials, boolean full) {
        double mean = assessment.combined().estimate();
        double standard = assessment.combined().standard();
        NormalDistribution normal = new NormalDistribution(mean, standard);
        Range allowed = assessment.allowed();
        double outside = normal.cumulativeProbability(allowed.min())
                + normal.cumulativeProbability(2 * mean - allowed.max());
        Range cells = Range.of(mean - REACH * standard, mean + REACH * standard);
        double width = cells.width() / CELLS;
        List<Long> counts = IntStream.range(0, CELLS).mapToObj(cell -> Math.round(trials * normal
                .probability(cells.min() + cell * width, cells.min() + (cell + 1) * width))).toList();
        double error = standard / Math.sqrt((double) trials) * 5;
        CoverageInterval interval = new CoverageInterval(assessment.combined().interval(),
                new CoverageInterval.Ends(error, error));
        List<EffectIndex> effects = new ArrayList<>();
        if (full) {
            assessment.budget().forEach(line -> effects.add(new EffectIndex(line.input(), line.varianceShare() * 0.98,
                    0.004, line.varianceShare() * 1.02, 0.003)));
        }
        return new Propagated(assessment.outcome(), allowed, new Sampled(trials, 0, mean, standard, interval, interval,
                probability(outside, trials), new Histogram(cells, counts, trials)),
                new Validation(true, 2, standard / 20, standard / 100, standard / 50), effects);
    }

    /** As if so many trials had been counted; the interval is wide enough for any reader of it. */
    private static Probability probability(double share, long trials) {
        double counted = Math.rint(share * trials) / trials;
        double error = Math.sqrt(counted * (1 - counted) / trials);
        double upper = counted == 0 ? 3.69 / trials : Math.min(1, counted + 2 * error);
        double lower = counted == 1 ? 1 - 3.69 / trials : Math.max(0, counted - 2 * error);
        return new Probability(counted, Range.of(lower, upper), error, Probability.Method.COUNTED, trials);
    }
}
