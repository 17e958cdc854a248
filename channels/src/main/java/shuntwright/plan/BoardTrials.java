package shuntwright.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Source;
import shuntwright.board.ThresholdDemand;
import shuntwright.choice.ChannelProblem;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Reference;

/**
 * Variants of one channel on its board.
 *
 * @param planner solves them and keeps what it worked out
 * @param context of the board
 * @param problem of the channel as it is
 */
record BoardTrials(BoardPlanner planner, BoardContext context, ChannelProblem problem) implements Trials {

    private static final String ADDED = "added";

    @Override
    public ChannelPlan of(Channel edited) {
        return on(context, edited);
    }

    @Override
    public boolean accepts(Channel edited) {
        return Demand.of(edited) instanceof Demand.Reading.Complete(Demand demand)
                && planner.accepts(context.problem(demand, tap(edited)));
    }

    private Optional<Threshold> tap(Channel edited) {
        return edited.threshold().equals(problem.demand().channel().threshold()) ? problem.tap() : Optional.empty();
    }

    private ChannelPlan on(BoardContext where, Channel edited) {
        return switch (Demand.of(edited)) {
            case Demand.Reading.Incomplete(List<String> missing) -> ChannelSolver.incomplete(edited, missing);
            case Demand.Reading.Complete(Demand demand) ->
                planner.solve(where.problem(demand, chosenAnew(where, edited)), Set.of());
        };
    }

    /** The tap's threshold as the edited board would choose it; a tap without a given voltage follows its channels. */
    private Optional<Threshold> chosenAnew(BoardContext where, Channel edited) {
        if (tap(edited).isEmpty()) {
            return Optional.empty();
        }
        Channel now = problem.demand().channel();
        Board board = where.board();
        return planner.tap(where.with(board.withChannels(
                board.channels().stream().map(each -> each.equals(now) ? edited : each).toList())), edited);
    }

    @Override
    public ChannelPlan judged(ChannelProblem where, SenseCircuit circuit) {
        return planner.judged(where, circuit);
    }

    @Override
    public List<Source> sources() {
        List<Source> sources = new ArrayList<>();
        sources.add(new Source.Supply());
        for (BoardReference reference : context.board().references()) {
            sources.add(new Source.OfReference(reference.name()));
        }
        return sources;
    }

    @Override
    public Optional<ChannelPlan> withBestReference(Channel channel) {
        if (!context.board().references().isEmpty() || best().isEmpty()) {
            return Optional.empty();
        }
        Board richer = context.board().withReferences(List.of(new BoardReference(ADDED, best().get().partNumber())));
        return Optional.of(on(new BoardContext(richer, context.catalogue(), Map.of(), context.rises()),
                channel.withThreshold(new ThresholdDemand.OwnDivider(new Source.OfReference(ADDED)))));
    }

    @Override
    public String bestReference() {
        return best().map(Reference::partNumber).orElse("");
    }

    /** The most accurate reference that the supply can feed. */
    private Optional<Reference> best() {
        return context.catalogue().references().stream()
                .filter(each -> each.supply().contains(context.board().supply().voltage().range()))
                .min(Comparator.comparingDouble(each -> each.voltage().tolerance().widest() + each.ageing()
                        + each.drift() * context.board().ambient().width() / 2));
    }

    @Override
    public int parallelShunts() {
        return context.board().rules().parallelShunts();
    }

    @Override
    public ChannelPlan withParallel(Channel channel, int parallel) {
        Board b = context.board();
        Board richer = b.withRules(b.rules().withParallelShunts(parallel));
        return on(new BoardContext(richer, context.catalogue(), Map.of(), context.rises()), channel);
    }
}
