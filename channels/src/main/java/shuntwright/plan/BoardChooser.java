package shuntwright.plan;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;

import shuntwright.accuracy.Assessment;
import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Objective;
import shuntwright.board.Preference;
import shuntwright.board.Tap;
import shuntwright.board.ThresholdDemand;
import shuntwright.choice.ChannelMenu;
import shuntwright.choice.ChannelProblem;
import shuntwright.choice.DividerTables;
import shuntwright.choice.MenuMaker;
import shuntwright.choice.Prices;
import shuntwright.choice.TapPicker;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Threshold;
import shuntwright.selection.Aim;
import shuntwright.selection.Answer;
import shuntwright.selection.Conflicts;
import shuntwright.selection.Prover;
import shuntwright.selection.Selector;

/**
 * Chooses the circuits of all channels together. Keeps the menus it made, so that choosing again after an edit makes only those that the
 * edit touches.
 */
final class BoardChooser {

    /** Kept menus; beyond this many they are made anew. */
    private static final int MOST_KEPT = 4_000;
    /** Iterations of the bound. */
    private static final int ITERATIONS = 250;
    /** Voltages of a tap that are looked at. */
    private static final int TAP_VOLTAGES = 6;

    private final DividerTables tables;
    private final Prover prover;
    private final Function<ChannelProblem, Optional<SenseCircuit>> nearest;
    private final MenuMaker maker;
    private final Map<Object, ChannelMenu> menus = new HashMap<>();
    /** Circuits that menus at other prices have offered. */
    private final Map<ChannelProblem, Set<SenseCircuit>> offered = new HashMap<>();
    private final Map<Object, List<Threshold>> voltages = new HashMap<>();
    private final Map<Object, Double> margins = new HashMap<>();

    /**
     * @param prover  asked where own bounds prove nothing
     * @param nearest the circuit of a channel that none serves; empty where none respects the limits of parts
     */
    BoardChooser(DividerTables tables, Prover prover, Function<ChannelProblem, Optional<SenseCircuit>> nearest) {
        this.nearest = nearest;
        this.tables = tables;
        this.prover = prover;
        this.maker = new MenuMaker(tables);
    }

    /**
     * What was chosen.
     *
     * @param model   the board as a selection
     * @param answer  of the search
     * @param order   of objectives
     * @param candidates that limits leave open
     */
    record Chosen(ChoiceModel model, Answer answer, List<Objective> order, long candidates) {

        /** Circuit and tap threshold of each channel that took part, by name. */
        Map<String, SenseCircuit> circuits() {
            Map<String, SenseCircuit> circuits = new LinkedHashMap<>();
            for (int entry = 0; entry < model.entries().size(); entry++) {
                circuits.put(model.entries().get(entry).name(), model.circuit(entry, answer.choice()));
            }
            return circuits;
        }

        /** The threshold chosen for a tap; empty when no voltage serves all of its channels. */
        Optional<Threshold> threshold(String tap) {
            return model.tap(tap).map(index -> model.threshold(index, answer.choice()));
        }

        BoardChoice report(Preference preference) {
            return BoardChooser.report(model, answer, order, preference, candidates);
        }
    }

    /**
     * What is to be chosen.
     *
     * @param aims   in order
     * @param caps   objectives that must not exceed a value (of {@link Reached}, smaller is better)
     * @param pinned circuits that channels must have, by name
     * @param rounds of the search for each aim
     */
    record Wish(List<Objective> aims, Map<Objective, Double> caps, Map<String, SenseCircuit> pinned, int rounds) {
        static Wish of(Preference preference) {
            return new Wish(preference.order(), Map.of(), Map.of(), preference.rounds());
        }

        Wish withRounds(int fewer) {
            return new Wish(aims, caps, pinned, fewer);
        }

        boolean wide() {
            return aims.getFirst() != Objective.LEAST_HEAT || !caps.isEmpty();
        }
    }

    /** A channel that is to be chosen with the others. */
    private record Open(Channel channel, Demand demand, ChannelProblem problem, int tap) {}

    void forget() {
        if (menus.size() > MOST_KEPT || maker.size() > MOST_KEPT) {
            menus.clear();
            maker.forget();
            offered.clear();
            voltages.clear();
            margins.clear();
        }
    }

    /**
     * The choice for all channels that have complete demands; one that no circuit serves gets the nearest.
     *
     * @param start circuits to start from, by channel; empty for none
     */
    Chosen choose(BoardContext context, Wish wish, Map<String, SenseCircuit> start, Progress progress) {
        List<Tap> taps = context.board().taps();
        List<Open> open = open(context, taps);
        List<ChoiceModel.TapEntry> tapEntries = tapEntries(context, taps, open);
        ChannelMenu.Breadth breadth = wish.wide() ? ChannelMenu.Breadth.WIDE : ChannelMenu.Breadth.NARROW;
        Chosen first = chosen(context, wish, open, tapEntries, breadth, List.of(), start, progress);
        if (!first.answer().keepsLimits() && breadth.equals(ChannelMenu.Breadth.NARROW)) {
            breadth = ChannelMenu.Breadth.WIDE;
            first = chosen(context, wish, open, tapEntries, breadth, List.of(), first.circuits(), progress);
        }
        boolean money = wish.aims().contains(Objective.LEAST_COST) || wish.aims().contains(Objective.FEWEST_PARTS);
        if (!money || wish.rounds() == 0 || progress.enough()) {
            return first;
        }
        // Once more with circuits that are cheap beside what is bought already.
        Map<String, Integer> ordered = ordered(first);
        ChoiceModel model = first.model();
        Prices marginal = (part, pieces) -> model.marginal(part, pieces, ordered);
        return chosen(context, wish, open, tapEntries, breadth, List.of(marginal), first.circuits(), progress);
    }

    private static Map<String, Integer> ordered(Chosen chosen) {
        Map<String, Integer> ordered = new HashMap<>();
        chosen.circuits().values().forEach(circuit -> {
            ordered.merge(circuit.shunt().partNumber(), circuit.shuntCount(), Integer::sum);
            ordered.merge(circuit.amplifier().partNumber(), 1, Integer::sum);
            ordered.merge(circuit.comparator().partNumber(), 1, Integer::sum);
        });
        return ordered;
    }

    private static List<Open> open(BoardContext context, List<Tap> taps) {
        List<Open> open = new ArrayList<>();
        for (Channel channel : context.board().channels()) {
            if (Demand.of(channel) instanceof Demand.Reading.Complete(Demand demand)
                    && ChannelSolver.unknownPins(channel, context.catalogue()).isEmpty()) {
                int tap = -1;
                for (int i = 0; i < taps.size(); i++) {
                    tap = channel.threshold() instanceof ThresholdDemand.SharedTap(String name)
                            && name.equals(taps.get(i).name()) ? i : tap;
                }
                open.add(new Open(channel, demand, context.problem(demand, Optional.empty()), tap));
            }
        }
        return open;
    }

    private List<ChoiceModel.TapEntry> tapEntries(BoardContext context, List<Tap> taps, List<Open> open) {
        List<ChoiceModel.TapEntry> entries = new ArrayList<>();
        for (int i = 0; i < taps.size(); i++) {
            int index = i;
            Tap tap = taps.get(i);
            List<ChannelProblem> problems = open.stream().filter(each -> each.tap() == index).map(Open::problem)
                    .toList();
            int users = (int) context.board().channels().stream()
                    .filter(each -> each.threshold() instanceof ThresholdDemand.SharedTap(String name)
                            && name.equals(tap.name()))
                    .count();
            Optional<SourceVoltage> source = context.source(tap.source());
            boolean can = source.isPresent() && !problems.isEmpty() && !problems.getFirst().resistors().isEmpty();
            entries.add(new ChoiceModel.TapEntry(tap.name(), can
                    ? voltages.computeIfAbsent(List.of(tap, source.get(), problems, users),
                            _ -> new TapPicker(tables).several(tap, source.get(), problems, users, TAP_VOLTAGES))
                    : List.of()));
        }
        return entries;
    }

    private Chosen chosen(BoardContext context, Wish wish, List<Open> open, List<ChoiceModel.TapEntry> taps,
            ChannelMenu.Breadth breadth, List<Prices> more, Map<String, SenseCircuit> start, Progress progress) {
        List<ChoiceModel.Entry> entries = new ArrayList<>();
        long candidates = 0;
        int[] indexOf = new int[taps.size()];
        List<ChoiceModel.TapEntry> usable = new ArrayList<>();
        Map<Integer, List<ChoiceModel.Entry>> onTaps = new HashMap<>();
        int step = 0;
        for (Open each : open) {
            if (progress.cancelled()) {
                throw new BoardPlanner.Cancelled();
            }
            progress.reached("choosing parts", step++, open.size());
            Optional<SenseCircuit> pinned = Optional.ofNullable(wish.pinned().get(each.channel().name()));
            if (each.tap() >= 0) {
                List<List<SenseCircuit>> choices = new ArrayList<>();
                for (Threshold threshold : taps.get(each.tap()).thresholds()) {
                    ChannelProblem problem = context.problem(each.demand(), Optional.of(threshold));
                    ChannelMenu menu = menu(context, problem, ChannelMenu.Breadth.TAP, more);
                    candidates += menu.candidates();
                    choices.add(pinned.filter(circuit -> circuit.threshold().equals(threshold)).map(List::of)
                            .orElseGet(() -> pinned.isPresent() ? List.of() : menu.circuits()));
                }
                onTaps.computeIfAbsent(each.tap(), _ -> new ArrayList<>()).add(new ChoiceModel.Entry(
                        List.of(each.problem().anonymous(), pinned), each.channel().name(), each.demand(), each.tap(),
                        choices,
                        (circuit, value) -> margin(context, wish, each, circuit,
                                Optional.of(taps.get(each.tap()).thresholds().get(value)))));
                continue;
            }
            ChannelMenu menu = menu(context, each.problem(), breadth, more);
            candidates += menu.candidates();
            List<SenseCircuit> circuits = pinned.map(List::of).orElse(menu.circuits());
            SenseCircuit before = start.get(each.channel().name());
            if (before != null && pinned.isEmpty() && !circuits.contains(before)
                    && offered.getOrDefault(each.problem().anonymous(), Set.of()).contains(before)) {
                circuits = new ArrayList<>(circuits);
                circuits.add(before);
            }
            if (circuits.isEmpty()) {
                // What it gets all the same takes part in every sum.
                circuits = nearest.apply(each.problem()).map(List::of).orElse(List.of());
            }
            if (!circuits.isEmpty()) {
                entries.add(new ChoiceModel.Entry(List.of(each.problem().anonymous(), pinned), each.channel().name(),
                        each.demand(), -1, List.of(circuits),
                        (circuit, _) -> margin(context, wish, each, circuit, Optional.empty())));
            }
        }
        for (int tap = 0; tap < taps.size(); tap++) {
            indexOf[tap] = usable.size();
            List<ChoiceModel.Entry> users = served(onTaps.getOrDefault(tap, List.of()));
            List<Integer> values = common(users, taps.get(tap).thresholds().size());
            if (values.isEmpty()) {
                continue;
            }
            List<Threshold> thresholds = taps.get(tap).thresholds();
            usable.add(new ChoiceModel.TapEntry(taps.get(tap).name(), values.stream().map(thresholds::get).toList()));
            for (ChoiceModel.Entry each : users) {
                entries.add(new ChoiceModel.Entry(each.kind(), each.name(), each.demand(), indexOf[tap],
                        values.stream().map(value -> each.choices().get(value)).toList(),
                        (circuit, value) -> each.margins().of(circuit, values.get(value))));
            }
        }
        progress.reached("choosing for the whole board", 0, 1);
        ChoiceModel model = new ChoiceModel(context, entries, usable);
        return new Chosen(model, select(context, model, wish, start, progress, candidates), wish.aims(), candidates);
    }

    /** Those that some voltage serves. */
    private static List<ChoiceModel.Entry> served(List<ChoiceModel.Entry> users) {
        return users.stream().filter(each -> each.choices().stream().anyMatch(list -> !list.isEmpty())).toList();
    }

    /** The voltages at which all users have a circuit; where there is none, none. */
    private static List<Integer> common(List<ChoiceModel.Entry> users, int values) {
        List<Integer> common = new ArrayList<>();
        for (int value = 0; value < values; value++) {
            int at = value;
            if (!users.isEmpty() && users.stream().noneMatch(each -> each.choices().get(at).isEmpty())) {
                common.add(value);
            }
        }
        return common;
    }

    private ChannelMenu menu(BoardContext context, ChannelProblem problem, ChannelMenu.Breadth breadth,
            List<Prices> more) {
        ChannelProblem key = problem.anonymous();
        int channels = Math.max(1, context.board().channels().size());
        List<Prices> prices = List.of(Prices.ofOneChannel(problem.buildQuantity()),
                Prices.ofOneChannel((int) Math.min(Integer.MAX_VALUE, (long) problem.buildQuantity() * channels)));
        ChannelMenu base = menus.computeIfAbsent(List.of(key, breadth, channels),
                _ -> maker.menu(key, breadth, prices));
        if (more.isEmpty() || base.circuits().isEmpty()) {
            return base;
        }
        LinkedHashSet<SenseCircuit> all = new LinkedHashSet<>(base.circuits());
        all.addAll(maker.menu(key, breadth, more).circuits());
        offered.computeIfAbsent(key, _ -> new HashSet<>()).addAll(all);
        return new ChannelMenu(new ArrayList<>(all), base.candidates());
    }

    /** What cannot be met together where a choice breaks shared limits. */
    Optional<Conflict> conflict(BoardContext context, Chosen chosen, Progress progress) {
        if (chosen.answer().keepsLimits()) {
            return Optional.empty();
        }
        Wish wish = Wish.of(context.board().preference()).withRounds(0);
        return ConflictWords.of(context.board(), chosen.model(), prover, (before, after) -> {
            if (progress.cancelled()) {
                throw new BoardPlanner.Cancelled();
            }
            Board changed = context.board().withChannels(
                    context.board().channels().stream().map(each -> each.equals(before) ? after : each).toList());
            BoardContext with = context.with(changed);
            List<Open> open = open(with, changed.taps());
            Chosen again = chosen(with, wish, open, tapEntries(with, changed.taps(), open), ChannelMenu.Breadth.WIDE,
                    List.of(), Map.of(), progress);
            return again.answer().keepsLimits()
                    || Conflicts.possible(again.model().selection(), changed.preference().seed(),
                            shuntwright.selection.Watch.NONE);
        }, new shuntwright.selection.Watch() {
            @Override
            public boolean ended() {
                if (progress.cancelled()) {
                    throw new BoardPlanner.Cancelled();
                }
                return false;
            }
        });
    }

    /** What may be chosen for one channel, by ascending heat. */
    List<SenseCircuit> circuits(BoardContext context, ChannelProblem problem) {
        return menu(context, problem, ChannelMenu.Breadth.WIDE, List.of()).circuits();
    }

    /** Margin of a circuit, where margins are wanted; else 0. */
    private double margin(BoardContext context, Wish wish, Open open, SenseCircuit circuit, Optional<Threshold> tap) {
        if (!wish.aims().contains(Objective.WIDEST_MARGIN) && !wish.caps().containsKey(Objective.WIDEST_MARGIN)) {
            return 0;
        }
        ChannelProblem problem = tap.isPresent() ? context.problem(open.demand(), tap) : open.problem();
        return margins.computeIfAbsent(List.of(problem.anonymous(), circuit),
                _ -> margin(ChannelSolver.solve(problem, circuit)));
    }

    /** Least slack of all outcomes by limits, as a share of the allowed half-width. */
    static double margin(SolvedChannel solved) {
        double margin = Double.POSITIVE_INFINITY;
        for (Assessment each : solved.assessments()) {
            double slack = Math.min(each.limits().min() - each.allowed().min(),
                    each.allowed().max() - each.limits().max());
            margin = Math.min(margin, slack / (each.allowed().width() / 2));
        }
        return margin;
    }

    private Answer select(BoardContext context, ChoiceModel model, Wish wish, Map<String, SenseCircuit> start,
            Progress progress, long candidates) {
        Preference preference = context.board().preference();
        Selector.Order order = new Selector.Order(wish.aims().stream().map(model::aim).toList(),
                wish.aims().stream().map(model::slack).toList(),
                wish.caps().entrySet().stream().map(each -> new Aim.Cap(model.aim(each.getKey()), each.getValue()))
                        .toList());
        double until = progress.seconds() + preference.timeLimit().orElse(Double.POSITIVE_INFINITY);
        shuntwright.selection.Watch watch = new shuntwright.selection.Watch() {
            @Override
            public boolean ended() {
                if (progress.cancelled()) {
                    throw new BoardPlanner.Cancelled();
                }
                return progress.enough() || progress.seconds() > until;
            }

            @Override
            public void better(Answer best) {
                progress.better(report(model, best, wish.aims(), preference, candidates));
            }
        };
        return Selector.select(model.selection(), order,
                new Selector.Effort(wish.rounds(), wish.rounds() == 0 ? 0 : ITERATIONS, preference.seed()),
                starting(model, start), prover, watch);
    }

    /** The options to start from, -1 for channels that are new or changed; empty for no start. */
    private static List<Integer> starting(ChoiceModel model, Map<String, SenseCircuit> start) {
        if (start.isEmpty()) {
            return List.of();
        }
        List<Integer> choice = new ArrayList<>();
        for (int entry = 0; entry < model.entries().size(); entry++) {
            int at = entry;
            choice.add(Optional.ofNullable(start.get(model.entries().get(entry).name()))
                    .flatMap(circuit -> model.optionOf(at, circuit)).orElse(-1));
        }
        while (choice.size() < model.selection().slots().size()) {
            choice.add(-1);
        }
        return choice;
    }

    /** What an answer says, in the board's words. */
    static BoardChoice report(ChoiceModel model, Answer answer, List<Objective> order, Preference preference,
            long candidates) {
        List<Reached> reached = new ArrayList<>();
        for (int i = 0; i < order.size(); i++) {
            Answer.Reached each = answer.reached().get(i);
            int sign = order.get(i) == Objective.WIDEST_MARGIN ? -1 : 1;
            OptionalDouble bound = each.bound().isPresent()
                    ? OptionalDouble.of(sign * each.bound().getAsDouble())
                    : OptionalDouble.empty();
            double slack = model.slack(order.get(i));
            boolean within = each.bound().isPresent()
                    && each.value() <= each.bound().getAsDouble() + slack * (1 + 1e-9);
            reached.add(new Reached(order.get(i), sign * each.value(), bound, each.proven() || within
                    ? Reached.Proof.PROVEN
                    : bound.isPresent() ? Reached.Proof.BOUNDED : Reached.Proof.OPEN));
        }
        return new BoardChoice(reached, answer.rounds(), preference.seed(), answer.cutShort(), candidates, model.kept(),
                answer.broken().stream().map(r -> model.selection().resources().get(r).name()).toList(),
                Optional.empty());
    }
}
