package shuntwright.plan;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Objective;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.choice.ChannelChoice;
import shuntwright.choice.ChannelPicker;
import shuntwright.choice.ChannelProblem;
import shuntwright.choice.DividerTables;
import shuntwright.choice.TapPicker;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Catalogue;
import shuntwright.parts.OpenDrainOutput;
import shuntwright.selection.Prover;

/**
 * Plans boards. Keeps what it worked out for each channel, so that planning again after an edit works out only what the
 * edit touches; the answer is the same as a new planner's. Not safe for use by several threads at once.
 */
public final class BoardPlanner {

    /** Kept choices and judgements; beyond this many everything is worked out anew. */
    private static final int MOST_KEPT = 20_000;

    /** Rises of zones are counted in steps of this, upward, K. */
    private static final double RISE_STEP = 0.5;
    /** Plans after which the rises of zones are taken as they are; a finding says so if they do not hold. */
    private static final int MOST_PASSES = 12;

    /** A table depends on nothing but preferred numbers, so all planners share them. */
    private static final DividerTables TABLES = new DividerTables();

    private final ChannelPicker picker = new ChannelPicker(TABLES);
    private final BoardChooser chooser;
    private final Map<ChannelProblem, ChannelChoice> choices = new HashMap<>();
    private final Map<Judged, ChannelPlan> judgements = new HashMap<>();
    private final Map<ChannelProblem, Boolean> acceptances = new HashMap<>();
    private final Map<TapProblem, Optional<Threshold>> voltages = new HashMap<>();
    /** Circuits of a plan to start from, by channel. */
    private Map<String, SenseCircuit> last = Map.of();

    /** With bounds of its own only. */
    public BoardPlanner() {
        this(Prover.NONE);
    }

    /** @param prover asked where the own bounds do not prove a choice best */
    public BoardPlanner(Prover prover) {
        chooser = new BoardChooser(TABLES, prover, this::nearest);
    }

    /**
     * Lets the next plans start from the circuits of this one where that leads to something at least as good: after an edit most channels
     * then keep what they had. Without it a plan depends on nothing but its board and catalogue.
     */
    public void startFrom(Plan plan) {
        Map<String, SenseCircuit> circuits = new HashMap<>();
        plan.channels().forEach(each -> each.solved()
                .ifPresent(solved -> circuits.put(each.channel().name(), solved.circuit())));
        last = Map.copyOf(circuits);
    }

    private record Judged(ChannelProblem problem, SenseCircuit circuit) {}

    private record TapProblem(Tap tap, SourceVoltage source, List<ChannelProblem> problems, int users) {}

    /** Thrown out of a plan that its {@link Progress} cancelled. */
    public static final class Cancelled extends RuntimeException {
        private static final long serialVersionUID = 1;

        public Cancelled() {
        }

        Cancelled(Exception cause) {
            super(cause);
        }
    }

    /**
     * Chooses parts for every channel and judges the board. A zone that its own heat warms is planned with a rise that is raised
     * until its choices do not exceed it, and judged at the rise they have.
     *
     * @throws Cancelled when progress says so
     */
    public Plan plan(Board board, Catalogue catalogue, Progress progress) {
        Chosen chosen = chosen(board, catalogue, BoardChooser.Wish.of(board.preference()), progress);
        Plan plan = finished(chosen, progress);
        Optional<Conflict> conflict = chosen.choice()
                .flatMap(together -> chooser.conflict(chosen.context(), together, progress));
        return conflict.isEmpty() ? plan : plan.withChoice(plan.choice().orElseThrow().withConflict(conflict));
    }

    Plan plan(Board board, Catalogue catalogue, BoardChooser.Wish wish, Progress progress) {
        return finished(chosen(board, catalogue, wish, progress), progress);
    }

    private Chosen chosen(Board board, Catalogue catalogue, BoardChooser.Wish wish, Progress progress) {
        forget();
        chooser.forget();
        // Rises by a choice without search first; the search seldom changes them.
        boolean warms = board.zones().stream().anyMatch(each -> each.thermalResistance().isPresent());
        Map<String, Double> rises = Map.of();
        int pass = 1;
        for (boolean quick = warms && wish.rounds() > 0; quick && pass < MOST_PASSES / 2; pass++) {
            Map<String, Double> needed = higher(rises,
                    chosen(new BoardContext(board, catalogue, Map.of(), rises), wish.withRounds(0), progress).rises());
            quick = !needed.equals(rises);
            rises = needed;
        }
        for (;; pass++) {
            Chosen chosen = settled(board, catalogue, rises, wish, progress);
            Map<String, Double> needed = higher(rises, chosen.rises());
            if (needed.equals(rises) || pass >= MOST_PASSES) {
                return atItsRise(chosen);
            }
            rises = needed;
        }
    }

    /** The rises to count with next: never lower than before, in steps, so that this comes to an end. */
    private static Map<String, Double> higher(Map<String, Double> before, Map<String, Double> actual) {
        Map<String, Double> next = new HashMap<>(before);
        actual.forEach((zone, rise) -> {
            if (rise > before.getOrDefault(zone, 0.0) && Double.isFinite(rise)) {
                next.put(zone, Math.ceil(rise / RISE_STEP) * RISE_STEP);
            }
        });
        return next;
    }

    /**
     * Channels with their circuits, before cures are tried.
     *
     * @param context with which they were chosen
     * @param choice  how they were chosen together; empty when they were only checked
     */
    private record Chosen(BoardContext context, List<ChannelPlan> channels, List<TapPlan> taps,
            Optional<BoardChooser.Chosen> choice) {

        /** The rise that each zone has with these circuits, K; infinite in thermal runaway. */
        Map<String, Double> rises() {
            Board board = context.board();
            return ZoneHeat.rises(board.zones(), channels, board.ambient().max());
        }
    }

    /** With pull-ups that suit the outputs chosen. */
    private Chosen settled(Board board, Catalogue catalogue, Map<String, Double> rises, BoardChooser.Wish wish,
            Progress progress) {
        Chosen first = chosen(new BoardContext(board, catalogue, Map.of(), rises), wish, progress);
        Map<String, Double> pullUps = new HashMap<>();
        boolean again = false;
        for (AlertPlan alert : alerts(first.context(), first.channels())) {
            pullUps.put(alert.line().name(), alert.pullUp());
            again |= alert.pullUp() != BoardContext.DEFAULT_PULL_UP && alert.line().pullUp().isEmpty()
                    && first.channels().stream().anyMatch(each -> alert.channels().contains(each.channel().name())
                            && feeds(each));
        }
        return again ? chosen(new BoardContext(board, catalogue, pullUps, rises), wish, progress) : first;
    }

    /** The same circuits judged at the rise they have, which may be less than that they were chosen with. */
    private Chosen atItsRise(Chosen chosen) {
        Map<String, Double> actual = finite(chosen.rises());
        Map<String, Double> counted = chosen.context().rises();
        if (actual.entrySet().stream().noneMatch(each -> each.getValue() < counted.getOrDefault(each.getKey(), 0.0))) {
            return chosen;
        }
        Map<String, Double> rises = new HashMap<>(counted);
        actual.forEach((zone, rise) -> rises.merge(zone, rise, Math::min));
        BoardContext context = chosen.context().withRises(rises);
        List<ChannelPlan> channels = new ArrayList<>();
        for (ChannelPlan each : chosen.channels()) {
            ChannelPlan now = each.solved().map(solved -> judged(
                    context.problem(solved.demand(), threshold(each.channel(), chosen.taps())), solved.circuit()))
                    .orElse(each);
            boolean reasonsChange = each.verdict() == Verdict.NO_FIT && each.solved().isEmpty();
            if ((each.accepted() && !now.accepted()) || reasonsChange) {
                return chosen;
            }
            channels.add(now);
        }
        return new Chosen(context, channels, chosen.taps(), chosen.choice());
    }

    private static Map<String, Double> finite(Map<String, Double> rises) {
        Map<String, Double> finite = new HashMap<>(rises);
        finite.values().removeIf(rise -> !(rise > 0 && Double.isFinite(rise)));
        return finite;
    }

    /** The plan, with cures for the channels that need them. */
    private Plan finished(Chosen chosen, Progress progress) {
        List<ChannelPlan> channels = new ArrayList<>();
        int done = 0;
        int total = (int) chosen.channels().stream().filter(Cures::wanted).count();
        for (ChannelPlan plan : chosen.channels()) {
            if (Cures.wanted(plan) && Demand.of(plan.channel()) instanceof Demand.Reading.Complete(Demand demand)
                    && ChannelSolver.unknownPins(plan.channel(), chosen.context().catalogue()).isEmpty()) {
                step(progress, "trying cures", done++, total);
                ChannelProblem problem = chosen.context().problem(demand, threshold(plan.channel(), chosen.taps()));
                channels.add(withCures(plan, new BoardTrials(this, chosen.context(), problem)));
            } else {
                channels.add(plan);
            }
        }
        Optional<BoardChoice> choice = chosen.choice()
                .map(together -> together.report(chosen.context().board().preference()));
        return assembled(chosen.context(), channels, chosen.taps(), choice);
    }

    private static boolean feeds(ChannelPlan plan) {
        return plan.solved().map(each -> each.circuit().network() instanceof HysteresisNetwork.Feedback)
                .orElse(false);
    }

    /**
     * Judges the board as its pins have it: whatever is not pinned is a finding, nothing is chosen.
     *
     * @throws Cancelled when progress says so
     */
    public Plan check(Board board, Catalogue catalogue, Progress progress) {
        forget();
        Chosen atAmbient = asPinned(new BoardContext(board, catalogue, Map.of(), Map.of()), progress);
        Map<String, Double> rises = finite(atAmbient.rises());
        return finished(rises.isEmpty() ? atAmbient : asPinned(atAmbient.context().withRises(rises), progress),
                progress);
    }

    private Chosen asPinned(BoardContext context, Progress progress) {
        Board board = context.board();
        List<TapPlan> taps = taps(context);
        List<ChannelPlan> channels = new ArrayList<>();
        for (Channel channel : board.channels()) {
            step(progress, "checking channels", channels.size(), board.channels().size());
            channels.add(switch (Demand.of(channel)) {
                case Demand.Reading.Incomplete(List<String> missing) -> ChannelSolver.incomplete(channel, missing);
                case Demand.Reading.Complete(Demand demand) -> {
                    List<String> unknown = ChannelSolver.unknownPins(channel, context.catalogue());
                    yield unknown.isEmpty()
                            ? asPinned(context.problem(demand, threshold(channel, taps)))
                            : ChannelSolver.unknown(channel, unknown);
                }
            });
        }
        return new Chosen(context, channels, taps, Optional.empty());
    }

    private ChannelPlan asPinned(ChannelProblem problem) {
        return switch (ChannelSolver.pinned(problem)) {
            case ChannelSolver.Pinned.Complete(SenseCircuit circuit) -> judged(problem, circuit);
            case ChannelSolver.Pinned.Incomplete(List<String> missing) -> {
                Channel channel = problem.demand().channel();
                yield new ChannelPlan(channel, Verdict.INCOMPLETE, false, Optional.empty(),
                        List.of(Findings.channel(Finding.Key.NOT_PINNED, channel,
                                "Not checked: not pinned are " + String.join(", ", missing)
                                        + ". Pin them, or plan the board and keep its choices as pins.")),
                        List.of(), List.of());
            }
        };
    }

    private void forget() {
        if (choices.size() > MOST_KEPT || judgements.size() > MOST_KEPT) {
            choices.clear();
            judgements.clear();
            voltages.clear();
            acceptances.clear();
        }
    }

    private Chosen chosen(BoardContext context, BoardChooser.Wish wish, Progress progress) {
        List<Channel> all = context.board().channels();
        BoardChooser.Chosen together = chooser.choose(context, wish, last, progress);
        Map<String, SenseCircuit> circuits = together.circuits();
        List<TapPlan> taps = new ArrayList<>();
        for (TapPlan each : taps(context)) {
            taps.add(together.threshold(each.tap().name())
                    .map(threshold -> new TapPlan(each.tap(), each.channels(), Optional.of(threshold))).orElse(each));
        }
        List<ChannelPlan> channels = new ArrayList<>();
        Set<String> used = new HashSet<>();
        for (Channel channel : all) {
            step(progress, "judging channels", channels.size(), all.size());
            SenseCircuit circuit = circuits.get(channel.name());
            ChannelPlan plan = circuit != null && Demand.of(channel) instanceof Demand.Reading.Complete(Demand demand)
                    ? judged(context.problem(demand, threshold(channel, taps)), circuit)
                    : solve(context, channel, taps, used);
            plan.solved().ifPresent(solved -> used.addAll(numbers(solved.circuit())));
            channels.add(plan);
        }
        return new Chosen(context, channels, taps, Optional.of(together));
    }

    private static void step(Progress progress, String stage, int done, int total) {
        if (progress.cancelled()) {
            throw new Cancelled();
        }
        progress.reached(stage, done, total);
    }

    private ChannelPlan solve(BoardContext context, Channel channel, List<TapPlan> taps, Set<String> used) {
        List<String> unknown = ChannelSolver.unknownPins(channel, context.catalogue());
        if (!unknown.isEmpty()) {
            return ChannelSolver.unknown(channel, unknown);
        }
        return switch (Demand.of(channel)) {
            case Demand.Reading.Incomplete(List<String> missing) -> ChannelSolver.incomplete(channel, missing);
            case Demand.Reading.Complete(Demand demand) ->
                solve(context.problem(demand, threshold(channel, taps)), used);
        };
    }

    /**
     * Only the search: how many combinations of shunts and amplifier the channels have, and how many of them leave room for
     * a threshold within every limit.
     */
    public static ChannelPicker.Count candidates(Board board, Catalogue catalogue) {
        BoardContext context = new BoardContext(board, catalogue, Map.of(), Map.of());
        int combinations = 0;
        int promising = 0;
        for (Channel channel : board.channels()) {
            if (Demand.of(channel) instanceof Demand.Reading.Complete(Demand demand)) {
                ChannelPicker.Count count = ChannelPicker.count(context.problem(demand, Optional.empty()));
                combinations += count.combinations();
                promising += count.promising();
            }
        }
        return new ChannelPicker.Count(combinations, promising);
    }

    /** True when some circuit is accepted for this channel by itself. */
    boolean accepts(ChannelProblem problem) {
        ChannelProblem key = problem.anonymous();
        ChannelChoice choice = choices.get(key);
        return choice != null
                ? choice instanceof ChannelChoice.Accepted
                : acceptances.computeIfAbsent(key, picker::accepts);
    }

    /** One channel by itself, without cures. */
    ChannelPlan solve(ChannelProblem problem, Set<String> used) {
        ChannelChoice choice = choices.computeIfAbsent(problem.anonymous(), picker::pick);
        return switch (choice) {
            case ChannelChoice.Accepted(List<SenseCircuit> circuits) -> judged(problem, preferred(circuits, used));
            case ChannelChoice.Nearest(SenseCircuit circuit) -> judged(problem, circuit);
            case ChannelChoice.NoFit none -> ChannelSolver.noFit(problem, none);
        };
    }

    private Optional<SenseCircuit> nearest(ChannelProblem problem) {
        return switch (choices.computeIfAbsent(problem.anonymous(), picker::pick)) {
            case ChannelChoice.Accepted(List<SenseCircuit> circuits) -> Optional.of(circuits.getFirst());
            case ChannelChoice.Nearest(SenseCircuit circuit) -> Optional.of(circuit);
            case ChannelChoice.NoFit _ -> Optional.empty();
        };
    }

    /** A circuit judged, kept. */
    ChannelPlan judged(ChannelProblem problem, SenseCircuit circuit) {
        return judgements.computeIfAbsent(new Judged(problem, circuit),
                key -> ChannelSolver.judged(key.problem(), key.circuit()));
    }

    private ChannelPlan withCures(ChannelPlan plan, BoardTrials trials) {
        List<Cure> cures = Cures.of(plan, trials);
        return cures.isEmpty()
                ? plan
                : new ChannelPlan(plan.channel(), plan.verdict(), plan.accepted(), plan.solved(), plan.findings(),
                        cures, plan.refusals());
    }

    /** Of equally good circuits the one with most parts and values the board already uses; the first among equals. */
    private static SenseCircuit preferred(List<SenseCircuit> circuits, Set<String> used) {
        SenseCircuit best = circuits.getFirst();
        long most = -1;
        for (SenseCircuit circuit : circuits) {
            long there = numbers(circuit).stream().filter(used::contains).count();
            if (there > most) {
                most = there;
                best = circuit;
            }
        }
        return best;
    }

    private static List<String> numbers(SenseCircuit circuit) {
        List<String> numbers = new ArrayList<>(List.of(circuit.shunt().partNumber(),
                circuit.amplifier().partNumber(), circuit.comparator().partNumber()));
        if (circuit.threshold() instanceof Threshold.Divider divider) {
            numbers.add(circuit.resistors().partNumber() + " " + divider.top());
            numbers.add(circuit.resistors().partNumber() + " " + divider.bottom());
        }
        return numbers;
    }

    /** The threshold of the tap that a channel uses on this board; empty where it uses none. */
    Optional<Threshold> tap(BoardContext context, Channel channel) {
        return threshold(channel, taps(context));
    }

    static Optional<Threshold> threshold(Channel channel, List<TapPlan> taps) {
        return channel.threshold() instanceof ThresholdDemand.SharedTap(String name)
                ? taps.stream().filter(each -> each.tap().name().equals(name)).findFirst()
                        .flatMap(TapPlan::threshold)
                : Optional.empty();
    }

    private List<TapPlan> taps(BoardContext context) {
        List<TapPlan> taps = new ArrayList<>();
        for (Tap tap : context.board().taps()) {
            List<ChannelProblem> problems = new ArrayList<>();
            List<String> names = new ArrayList<>();
            for (Channel channel : context.board().channels()) {
                if (channel.threshold() instanceof ThresholdDemand.SharedTap(String name)
                        && name.equals(tap.name())) {
                    names.add(channel.name());
                    if (Demand.of(channel) instanceof Demand.Reading.Complete(Demand demand)
                            && ChannelSolver.unknownPins(channel, context.catalogue()).isEmpty()) {
                        problems.add(context.problem(demand, Optional.empty()));
                    }
                }
            }
            Optional<SourceVoltage> source = context.source(tap.source());
            Optional<Threshold> threshold = source.isPresent() && !problems.isEmpty()
                    && !problems.getFirst().resistors().isEmpty()
                            ? voltages.computeIfAbsent(
                                    new TapProblem(tap, source.get(), problems, names.size()),
                                    key -> new TapPicker(TABLES).pick(key.tap(), key.source(), key.problems(),
                                            key.users()))
                            : Optional.empty();
            taps.add(new TapPlan(tap, names, threshold));
        }
        return taps;
    }

    private static List<AlertPlan> alerts(BoardContext context, List<ChannelPlan> channels) {
        List<AlertPlan> alerts = new ArrayList<>();
        for (AlertLine line : context.board().alertLines()) {
            List<String> names = on(context, channels, line).map(each -> each.channel().name()).toList();
            alerts.add(AlertJudge.judge(line, context.lineVoltage(line), context.settledPullUp(line), names,
                    outputs(context, channels, line)));
        }
        return alerts;
    }

    private static List<OpenDrainOutput> outputs(BoardContext context, List<ChannelPlan> channels, AlertLine line) {
        return on(context, channels, line).flatMap(each -> each.solved().stream())
                .map(each -> each.circuit().comparator().output()).toList();
    }

    private static Stream<ChannelPlan> on(BoardContext context, List<ChannelPlan> channels, AlertLine line) {
        return channels.stream().filter(each -> context.line(each.channel()).filter(line::equals).isPresent());
    }

    private static Plan assembled(BoardContext context, List<ChannelPlan> planned, List<TapPlan> taps,
            Optional<BoardChoice> choice) {
        Board board = context.board();
        List<Finding> findings = new ArrayList<>(context.findings());
        if (planned.isEmpty()) {
            findings.add(Findings.board(Finding.Key.NO_CHANNELS,
                    "The board has no channels yet: add one for each output rail.", List.of()));
        }
        List<ChannelPlan> channels = TapFindings.added(planned, taps, findings);
        List<AlertPlan> alerts = alerts(context, channels);
        for (AlertPlan alert : alerts) {
            findings.addAll(AlertJudge.findings(alert, context.lineVoltage(alert.line()),
                    outputs(context, channels, alert.line())));
        }
        SharedBudget budget = new SharedBudget(context, channels, taps, alerts);
        List<SharedUse> uses = budget.uses();
        findings.addAll(SharedBudget.findings(uses));
        findings.addAll(ZoneFindings.of(context, channels));
        List<PartUse> parts = PartsList.of(channels, new LinkedHashMap<>(context.referenceParts()), taps, alerts,
                context.tapResistors(), context.pullUpResistors());
        Plan plan = new Plan(board, context.catalogue().currency(), channels, uses, alerts, taps,
                budget.references(), parts,
                Findings.sorted(findings), choice, Optional.empty());
        return choice.isEmpty() ? plan : plan.withChoice(choice.get().measured(plan));
    }

    /**
     * Plans of which none is better in one of two objectives without being worse in the other.
     *
     * @param points at most so many, ≥ 2; equal ones are left out
     * @throws Cancelled                when progress says so
     * @throws IllegalArgumentException when the objectives are the same or points are fewer than 2
     */
    public Front front(Board board, Catalogue catalogue, Objective first, Objective second, int points,
            Progress progress) {
        return new BoardQuestions(this, board, catalogue, progress).front(first, second, points);
    }

    /**
     * Other circuits for a channel, the whole board chosen again around each; best first.
     *
     * @param most how many
     * @throws Cancelled                when progress says so
     * @throws IllegalArgumentException when the board has no such channel
     */
    public List<OtherChoice> others(Board board, Catalogue catalogue, String channel, int most, Progress progress) {
        return new BoardQuestions(this, board, catalogue, progress).others(channel, most);
    }

    /**
     * The board planned at each value of one of its limits.
     *
     * @param zone   whose heat limit is varied; empty for the others
     * @param values W, A or boards, each &gt; 0
     * @throws Cancelled                when progress says so
     * @throws IllegalArgumentException when the board has no such zone or a value is not allowed
     */
    public WhatIf whatIf(Board board, Catalogue catalogue, WhatIf.Varied varied, String zone, List<Double> values,
            Progress progress) {
        return new BoardQuestions(this, board, catalogue, progress).whatIf(varied, zone, values);
    }

    /** The circuits that may be chosen for a channel on its board as planned. */
    List<SenseCircuit> menu(Board board, Catalogue catalogue, Channel channel, Plan plan) {
        BoardContext context = new BoardContext(board, catalogue, Map.of(), finite(ZoneHeat.rises(board.zones(),
                plan.channels(), board.ambient().max())));
        return Demand.of(channel) instanceof Demand.Reading.Complete(Demand demand)
                && ChannelSolver.unknownPins(channel, catalogue).isEmpty()
                        ? chooser.circuits(context, context.problem(demand, threshold(channel, plan.taps())))
                        : List.of();
    }

    /** The board with every choice of the plan pinned, so that {@link #check} judges exactly this plan. */
    public static Board pinned(Plan plan) {
        return Pinning.of(plan);
    }

    /** The channel with this circuit pinned. */
    public static Channel pinned(Channel channel, SenseCircuit circuit) {
        return Pinning.pinned(channel, circuit);
    }
}
