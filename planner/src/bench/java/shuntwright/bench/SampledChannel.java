package shuntwright.bench;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

import org.jspecify.annotations.Nullable;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.BudgetLine;
import shuntwright.accuracy.Input;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.Sampling;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.Threshold;
import shuntwright.io.workplace.Workplace;
import shuntwright.parts.Catalogue;
import shuntwright.parts.ResistorSeries;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.plan.SolvedChannel;
import shuntwright.quantity.Distribution;
import shuntwright.sampling.ChannelSampler;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.Watch;

/**
 * The largest demo board, planned; one of its channels with everything it is asked for, and the same channel asked for nothing but
 * the trip current.
 */
@State(Scope.Benchmark)
public class SampledChannel {
    private static final double COVERAGE = 0.9973;

    private @Nullable Plan plan;
    private @Nullable SolvedChannel full;
    private @Nullable SolvedChannel lean;

    @Setup
    public void planOnce() {
        Workplace lantern = Workplace.open(Path.of("demo-boards", "camp-lantern.board.json"), List.of()).ifOpened()
                .orElseThrow();
        Catalogue catalogue = withoutReels(lantern.catalogue());
        plan = new BoardPlanner().plan(lantern.board(), catalogue, Progress.SILENT);
        SolvedChannel chosen = plan().channels().stream().flatMap(each -> each.solved().stream())
                .filter(SampledChannel::plain).findFirst().orElseThrow();
        full = chosen;
        Board alone = lantern.board().withChannels(List.of(tripOnly(chosen.demand().channel())));
        lean = new BoardPlanner().plan(alone, catalogue, Progress.SILENT).channels().getFirst().solved()
                .filter(SampledChannel::plain).orElseThrow();
    }

    /** Pieces of a reel take three draws each, which plain loops do not have. */
    private static Catalogue withoutReels(Catalogue catalogue) {
        return Catalogue.of(catalogue.currency(), catalogue.parts().stream()
                .map(part -> part instanceof ResistorSeries r
                        ? new ResistorSeries(r.partNumber(), r.description(), r.series(), r.values(), r.tolerance(),
                                r.temperatureCoefficient(), r.ageing(), 0, r.power(), r.purchase())
                        : part)
                .toList());
    }

    /** One shunt, a divider of its own at the supply, all inputs uniform: what {@link PlainTrials} can do. */
    private static boolean plain(SolvedChannel solved) {
        return solved.circuit().shuntCount() == 1
                && solved.circuit().threshold() instanceof Threshold.Divider divider
                && divider.source().isSupply() && divider.tap().isEmpty()
                && !(solved.circuit().network() instanceof HysteresisNetwork.Feedback)
                && solved.inputs().stream().allMatch(each -> each.distribution() instanceof Distribution.Uniform
                        && each.reel().isEmpty());
    }

    private static Channel tripOnly(Channel channel) {
        return new Channel(channel.name(), channel.note(), channel.rail(), channel.side(), channel.currents(),
                new ReleaseDemand.Latch(), Channel.ReadingDemand.NONE,
                new ThresholdDemand.OwnDivider(new Source.Supply()),
                Optional.empty(), Optional.empty(), channel.diversity(), channel.stress(), channel.pins());
    }

    Plan plan() {
        return Objects.requireNonNull(plan);
    }

    SolvedChannel lean() {
        return Objects.requireNonNull(lean);
    }

    SolvedChannel full() {
        return Objects.requireNonNull(full);
    }

    /** Inputs that move the trip current. */
    List<Input> moving() {
        Assessment trip = lean().trip();
        return trip.budget().stream().map(BudgetLine::input).toList();
    }

    /** One channel, one thread. */
    static ChannelStudy sample(SolvedChannel channel, int trials) {
        return ChannelSampler.of(channel.circuit(), channel.around(), channel.demand())
                .sample(channel.assessments(), COVERAGE, new Sampling(new Sampling.Trials.Fixed(trials), 1), Watch.NONE)
                .study();
    }
}
