package shuntwright.planner;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.Board;
import shuntwright.board.Objective;
import shuntwright.circuit.SenseCircuit;
import shuntwright.parts.Catalogue;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Conflict;
import shuntwright.plan.Front;
import shuntwright.plan.OtherChoice;
import shuntwright.plan.PartUse;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.plan.Reached;
import shuntwright.plan.SharedUse;
import shuntwright.plan.SolvedChannel;
import shuntwright.plan.WhatIf;
import shuntwright.planner.work.Explorer;
import shuntwright.quantity.Dimension;

/**
 * Board-wide choices made by hand for the plans of {@link HandMadePlans}. Heat can be had down to what {@link #LEAST} says; more
 * shunts in parallel are cooler and dearer.
 */
public final class HandMadeChoices {
    /** Share of the hand-made plan's heat below which no choice comes. */
    public static final double LEAST = 0.9;
    /** Heat of the coolest plan of the front, W. */
    public static final double COOLEST = 2;

    /** Answers at once. */
    public static final Explorer EXPLORER = new HandMadeExplorer();

    private HandMadeChoices() {
    }

    /** A plan with its choice: the first objective bounded, the others proven; a conflict where a zone is too warm. */
    public static Plan plan(Board board, Catalogue catalogue, Progress progress) {
        Plan bare = HandMadePlans.plan(board, catalogue, progress);
        progress.better(choice(bare, 20, false));
        return with(bare, choice(bare, board.preference().rounds(), false));
    }

    static Plan with(Plan plan, BoardChoice choice) {
        return new Plan(plan.board(), plan.currency(), plan.channels(), plan.shared(), plan.alerts(), plan.taps(),
                plan.references(), plan.parts(), plan.findings(), Optional.of(choice), plan.study());
    }

    /** The choice of a plan after some rounds. */
    public static BoardChoice choice(Plan plan, int rounds, boolean cutShort) {
        List<Reached> reached = new ArrayList<>();
        for (Objective each : plan.board().preference().order()) {
            boolean first = reached.isEmpty();
            double value = value(plan, each);
            reached.add(new Reached(each, value, first ? OptionalDouble.of(value * LEAST) : OptionalDouble.empty(),
                    first ? Reached.Proof.BOUNDED : Reached.Proof.PROVEN));
        }
        Optional<SharedUse> broken = plan.shared().stream().filter(each -> !each.holds()).findFirst();
        return new BoardChoice(reached, rounds, plan.board().preference().seed(), cutShort, 12_345, 678,
                broken.map(SharedUse::name).stream().toList(), broken.map(HandMadeChoices::conflict));
    }

    private static double value(Plan plan, Objective objective) {
        return switch (objective) {
            case LEAST_HEAT -> plan.shared().stream().filter(each -> each.kind() == SharedUse.Kind.BOARD_HEAT)
                    .mapToDouble(SharedUse::used).sum();
            case MOST_EVEN_HEAT -> 0.4;
            case LEAST_COST -> plan.buildCost();
            case FEWEST_PARTS -> plan.parts().size();
            case WIDEST_MARGIN -> 0.12;
        };
    }

    private static Conflict conflict(SharedUse use) {
        return new Conflict(List.of(
                new Conflict.Member(Conflict.Kind.SHARED_LIMIT, use.name(), "heat limit", use.limit(),
                        OptionalDouble.of(use.used() * 1.0001), use.dimension()),
                new Conflict.Member(Conflict.Kind.CHANNEL, "windlass", "must-trip current", OptionalDouble.of(18),
                        OptionalDouble.of(21.3), Dimension.CURRENT),
                new Conflict.Member(Conflict.Kind.CHANNEL, "bilge pump", "no-trip current", OptionalDouble.of(25),
                        OptionalDouble.empty(), Dimension.CURRENT)),
                true, use.name() + " may give off less than windlass and bilge pump need.");
    }

    private static final class HandMadeExplorer implements Explorer {
        @Override
        public Front front(Board board, Catalogue catalogue, Objective first, Objective second, int points,
                Progress progress) {
            List<Front.Point> all = new ArrayList<>();
            for (int at = 0; at < 6; at++) {
                step(progress, "points of the front", at, 6);
                double heat = COOLEST * (1 + 0.25 * at);
                Plan plan = with(HandMadePlans.plan(board, catalogue, Progress.SILENT), 2 * (6 - at), heat);
                all.add(new Front.Point(heat, plan.buildCost(), plan));
            }
            return new Front(first, second, all);
        }

        @Override
        public List<OtherChoice> others(Board board, Catalogue catalogue, String channel, int most,
                Progress progress) {
            List<OtherChoice> all = new ArrayList<>();
            for (int shunts = 3; shunts < 3 + Math.min(most, 3); shunts++) {
                step(progress, "other choices", shunts - 3, 3);
                Plan plan = with(HandMadePlans.plan(board, catalogue, Progress.SILENT), shunts, 3.3 - 0.2 * shunts);
                ChannelPlan planned = plan.channel(channel).orElseThrow();
                all.add(new OtherChoice(planned.solved().orElseThrow().circuit(), planned, List.of(), plan.buildCost(),
                        3.3 - 0.2 * shunts, plan.parts().size() + shunts - 3,
                        shunts == 5 ? List.of("supply") : List.of()));
            }
            return all;
        }

        /** Below two thirds of the range nothing meets the limits, except for boards built. */
        @Override
        public WhatIf whatIf(Board board, Catalogue catalogue, WhatIf.Varied varied, String zone, List<Double> values,
                Progress progress) {
            List<WhatIf.Point> points = new ArrayList<>();
            for (double value : values) {
                step(progress, "values", points.size(), values.size());
                double share = points.size() / (double) values.size();
                boolean met = varied == WhatIf.Varied.BUILD_QUANTITY || share > 0.3;
                double boards = varied == WhatIf.Varied.BUILD_QUANTITY ? value : board.buildQuantity();
                double each = 40 + 25 / (1 + 4 * share);
                points.add(new WhatIf.Point(value, met
                        ? Optional.of(new WhatIf.Sums(each * boards, each, 2 + 1.5 * share, 14 - (int) (5 * share)))
                        : Optional.empty()));
            }
            return new WhatIf(varied, zone, points);
        }

        private static void step(Progress progress, String stage, int done, int total) {
            progress.reached(stage, done, total);
            if (progress.cancelled()) {
                throw new BoardPlanner.Cancelled();
            }
        }
    }

    /** The same plan with so many shunts in parallel in each channel. */
    private static Plan with(Plan plan, int shunts, double heat) {
        List<ChannelPlan> channels = plan.channels().stream().map(each -> new ChannelPlan(each.channel(),
                each.verdict(), each.accepted(), each.solved().map(solved -> with(solved, shunts)), each.findings(),
                each.cures(), each.refusals())).toList();
        List<SharedUse> shared = plan.shared().stream().map(each -> each.kind() == SharedUse.Kind.BOARD_HEAT
                ? new SharedUse(each.kind(), each.name(), heat, each.limit(), each.dimension())
                : each).toList();
        List<PartUse> parts = plan.parts().stream().map(each -> {
            int quantity = each.quantity() * shunts;
            return new PartUse(each.partNumber(), each.description(), quantity,
                    java.util.stream.IntStream.rangeClosed(1, quantity).mapToObj(number -> "R" + number).toList(),
                    java.util.Collections.nCopies(quantity, each.users().getFirst()), each.purchase());
        }).toList();
        return new Plan(plan.board(), plan.currency(), channels, shared, plan.alerts(), plan.taps(),
                plan.references(), parts, plan.findings(), plan.choice(), plan.study());
    }

    private static SolvedChannel with(SolvedChannel solved, int shunts) {
        SenseCircuit circuit = solved.circuit();
        return new SolvedChannel(solved.demand(), new SenseCircuit(circuit.shunt(), shunts, circuit.amplifier(),
                circuit.comparator(), circuit.threshold(), circuit.network(), circuit.resistors()), solved.around(),
                solved.settings(), solved.inputs(), solved.assessments(), solved.uncalibrated(), solved.limits(),
                solved.heat(), solved.cost());
    }
}
