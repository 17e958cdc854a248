package shuntwright.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Objective;
import shuntwright.board.SenseSupply;
import shuntwright.board.Zone;
import shuntwright.circuit.SenseCircuit;
import shuntwright.parts.Catalogue;

/** Questions about a board that need several plans of it: the front of two objectives, other choices for a channel, what if. */
final class BoardQuestions {

    /** Other choices are tried from so many circuits of the channel. */
    private static final int TRIED = 4;

    private final BoardPlanner planner;
    private final Board board;
    private final Catalogue catalogue;
    private final Progress progress;

    BoardQuestions(BoardPlanner planner, Board board, Catalogue catalogue, Progress progress) {
        this.planner = planner;
        this.board = board;
        this.catalogue = catalogue;
        this.progress = progress;
    }

    /** What a plan reaches of an objective, smaller is better. */
    static double value(Plan plan, Objective objective) {
        return switch (objective) {
            case LEAST_HEAT -> heat(plan);
            case MOST_EVEN_HEAT -> plan.shared().stream()
                    .filter(each -> each.kind() == SharedUse.Kind.ZONE_HEAT && each.limit().isPresent())
                    .mapToDouble(each -> each.used() / each.limit().getAsDouble()).max().orElse(0);
            case LEAST_COST -> plan.buildCost();
            case FEWEST_PARTS -> plan.parts().size();
            case WIDEST_MARGIN -> -plan.channels().stream().filter(ChannelPlan::accepted)
                    .flatMap(each -> each.solved().stream()).mapToDouble(BoardChooser::margin).min().orElse(0);
        };
    }

    static double heat(Plan plan) {
        return plan.shared().stream().filter(each -> each.kind() == SharedUse.Kind.BOARD_HEAT)
                .mapToDouble(SharedUse::used).sum();
    }

    Front front(Objective first, Objective second, int points) {
        if (first == second || points < 2) {
            throw new IllegalArgumentException("a front needs two different objectives and at least two points");
        }
        // Heat may worsen by nothing here: the front itself says what a little more of it buys.
        Board exact = board.withRules(board.rules().withHeatStep(0));
        List<Plan> plans = new ArrayList<>();
        Plan one = plan(exact, wish(List.of(first, second), Map.of()), 0, points);
        Plan other = plan(exact, wish(List.of(second, first), Map.of()), 1, points);
        plans.add(one);
        double from = value(one, first);
        double to = value(other, first);
        for (int i = 1; i < points - 1; i++) {
            double cap = from + (to - from) * i / (points - 1);
            plans.add(plan(exact, wish(List.of(second, first), Map.of(first, cap)), i + 1, points));
        }
        plans.add(other);
        return new Front(first, second, undominated(plans, first, second));
    }

    private BoardChooser.Wish wish(List<Objective> aims, Map<Objective, Double> caps) {
        return new BoardChooser.Wish(aims, caps, Map.of(), board.preference().rounds());
    }

    private Plan plan(Board asked, BoardChooser.Wish wish, int done, int total) {
        progress.reached("plans", done, total);
        Plan plan = planner.plan(asked, catalogue, wish, inner());
        return new Plan(board, plan.currency(), plan.channels(), plan.shared(), plan.alerts(), plan.taps(),
                plan.references(),
                plan.parts(), plan.findings(), plan.choice(), plan.study());
    }

    /** Cancels with the outer one; tells nothing. */
    private Progress inner() {
        return new Progress() {
            @Override
            public void reached(String stage, int done, int total) {
                // Only whole plans are counted.
            }

            @Override
            public boolean cancelled() {
                return progress.cancelled();
            }
        };
    }

    private static List<Front.Point> undominated(List<Plan> plans, Objective first, Objective second) {
        List<Front.Point> all = plans.stream()
                .filter(each -> each.choice().map(choice -> choice.broken().isEmpty()).orElse(true))
                .map(each -> new Front.Point(value(each, first), value(each, second), each))
                .sorted(Comparator.comparingDouble(Front.Point::first).thenComparingDouble(Front.Point::second))
                .toList();
        List<Front.Point> front = new ArrayList<>();
        for (Front.Point point : all) {
            if (front.isEmpty() || point.second() < front.getLast().second() - 1e-9 * Math.abs(point.second())) {
                front.add(shown(point, first, second));
            }
        }
        return front;
    }

    /** Margins are shown as they are, wider is better. */
    private static Front.Point shown(Front.Point point, Objective first, Objective second) {
        return new Front.Point(first == Objective.WIDEST_MARGIN ? -point.first() : point.first(),
                second == Objective.WIDEST_MARGIN ? -point.second() : point.second(), point.plan());
    }

    List<OtherChoice> others(String name, int most) {
        Channel channel = board.channels().stream().filter(each -> each.name().equals(name)).findFirst()
                .orElseThrow(() -> new IllegalArgumentException("the board has no channel \"" + name + "\""));
        if (!(Demand.of(channel) instanceof Demand.Reading.Complete)) {
            return List.of();
        }
        BoardChooser.Wish wish = BoardChooser.Wish.of(board.preference());
        Plan now = planner.plan(board, catalogue, wish, inner());
        Optional<SenseCircuit> present = now.channel(name).flatMap(ChannelPlan::solved).map(SolvedChannel::circuit);
        List<SenseCircuit> circuits = planner.menu(board, catalogue, channel, now).stream()
                .filter(each -> present.isEmpty() || !each.equals(present.get())).toList();
        List<SenseCircuit> tried = spread(circuits, Math.max(1, most) * TRIED);
        // A few rounds for each to see which are worth it, then the best ones with all rounds.
        List<OtherChoice> all = new ArrayList<>();
        Set<SenseCircuit> seen = new HashSet<>();
        for (SenseCircuit circuit : tried) {
            progress.reached("other choices", all.size(), tried.size() + most);
            if (seen.add(circuit)) {
                all.add(other(name, circuit, wish.withRounds(0)));
            }
        }
        all.sort(Comparator.comparingInt((OtherChoice each) -> each.broken().size()).thenComparing(this::better));
        List<OtherChoice> best = new ArrayList<>();
        for (OtherChoice each : all.subList(0, Math.min(most, all.size()))) {
            progress.reached("other choices", tried.size() + best.size(), tried.size() + most);
            best.add(other(name, each.circuit(), wish));
        }
        best.sort(Comparator.comparingInt((OtherChoice each) -> each.broken().size()).thenComparing(this::better));
        return best;
    }

    /** Some of each end and of between; by ascending heat as menus are. */
    private static List<SenseCircuit> spread(List<SenseCircuit> circuits, int most) {
        Set<SenseCircuit> some = new LinkedHashSet<>();
        for (int i = 0; i < Math.min(most, circuits.size()); i++) {
            some.add(circuits.get((int) ((long) i * circuits.size() / Math.min(most, circuits.size()))));
        }
        return List.copyOf(some);
    }

    private int better(OtherChoice a, OtherChoice b) {
        for (Objective objective : board.preference().order()) {
            int compared = Double.compare(value(a, objective), value(b, objective));
            if (compared != 0) {
                return compared;
            }
        }
        return 0;
    }

    private static double value(OtherChoice choice, Objective objective) {
        return choice.board().stream().filter(each -> each.objective() == objective)
                .mapToDouble(each -> objective == Objective.WIDEST_MARGIN ? -each.value() : each.value()).findFirst()
                .orElseThrow();
    }

    private OtherChoice other(String name, SenseCircuit circuit, BoardChooser.Wish wish) {
        Plan plan = planner.plan(board, catalogue,
                new BoardChooser.Wish(wish.aims(), wish.caps(), Map.of(name, circuit), wish.rounds()), inner());
        BoardChoice choice = plan.choice().orElseThrow();
        return new OtherChoice(circuit, plan.channel(name).orElseThrow(), choice.reached(), plan.buildCost(),
                heat(plan),
                plan.parts().size(), choice.broken());
    }

    WhatIf whatIf(WhatIf.Varied varied, String zone, List<Double> values) {
        List<WhatIf.Point> points = new ArrayList<>();
        for (double value : values.stream().sorted().toList()) {
            progress.reached("what if", points.size(), values.size());
            Plan plan = planner.plan(with(varied, zone, value), catalogue,
                    BoardChooser.Wish.of(board.preference()), inner());
            boolean keeps = plan.choice().map(choice -> choice.broken().isEmpty()).orElse(true);
            int boards = plan.board().buildQuantity();
            points.add(new WhatIf.Point(value, keeps
                    ? Optional.of(new WhatIf.Sums(plan.buildCost(), plan.buildCost() / boards, heat(plan),
                            plan.parts().size()))
                    : Optional.empty()));
        }
        return new WhatIf(varied, zone, points);
    }

    private Board with(WhatIf.Varied varied, String zone, double value) {
        return switch (varied) {
            case BOARD_HEAT_LIMIT -> board.withHeatLimit(OptionalDouble.of(value));
            case ZONE_HEAT_LIMIT -> {
                if (board.zone(zone).isEmpty()) {
                    throw new IllegalArgumentException("the board has no zone \"" + zone + "\"");
                }
                yield board.withZones(board.zones().stream().map(each -> each.name().equals(zone)
                        ? new Zone(zone, OptionalDouble.of(value), each.thermalResistance())
                        : each).toList());
            }
            case SUPPLY_CURRENT -> board.withSupply(new SenseSupply(board.supply().voltage(), value));
            case BUILD_QUANTITY -> board.withBuildQuantity(Math.max(1, (int) Math.round(value)));
        };
    }

    /** Values of every objective of a plan; for tests and reports. */
    static Map<Objective, Double> values(Plan plan) {
        Map<Objective, Double> values = new EnumMap<>(Objective.class);
        for (Objective objective : Objective.values()) {
            values.put(objective, value(plan, objective));
        }
        return values;
    }
}
