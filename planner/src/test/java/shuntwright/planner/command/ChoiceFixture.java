package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Supplier;

import shuntwright.board.Board;
import shuntwright.board.Objective;
import shuntwright.parts.Catalogue;
import shuntwright.plan.AlertPlan;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.Conflict;
import shuntwright.plan.Front;
import shuntwright.plan.OtherChoice;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.plan.Reached;
import shuntwright.plan.WhatIf;
import shuntwright.planner.work.Explorer;
import shuntwright.quantity.Dimension;

/** Board-wide choices and answers put together by hand for {@link PlanFixture}, and something that gives them. */
final class ChoiceFixture {

    private ChoiceFixture() {
    }

    static Reached reached(Objective objective, double value, double bound) {
        return new Reached(objective, value, OptionalDouble.of(bound),
                value == bound ? Reached.Proof.PROVEN : Reached.Proof.BOUNDED);
    }

    static BoardChoice choice(List<Reached> reached, List<String> broken, Optional<Conflict> conflict) {
        return new BoardChoice(reached, 300, 1, false, 12_345, 420, broken, conflict);
    }

    static Conflict conflict() {
        return new Conflict(List.of(
                new Conflict.Member(Conflict.Kind.SHARED_LIMIT, "zone rear edge", "heat limit", OptionalDouble.of(0.2),
                        OptionalDouble.of(0.25), Dimension.POWER),
                new Conflict.Member(Conflict.Kind.CHANNEL, "Winch of the drill", "must-trip current",
                        OptionalDouble.of(42), OptionalDouble.empty(), Dimension.CURRENT)),
                true, "Zone rear edge may dissipate 200 mW; its channels need 250 mW at least.");
    }

    /** Least heat proven, least cost not; a zone's limit broken. */
    static Plan plan() {
        return with(PlanFixture.plan(), choice(
                List.of(reached(Objective.LEAST_HEAT, 1.8, 1.8), reached(Objective.LEAST_COST, 1250, 1225)),
                List.of("zone rear edge"), Optional.of(conflict())));
    }

    /** With the board's alert lines as well, so that it can be written as a board. */
    static Plan with(Plan plan, BoardChoice choice) {
        List<AlertPlan> alerts = plan.board().alertLines().stream()
                .map(each -> new AlertPlan(each, List.of(), 10e3, Optional.empty(), 900, 180e3, 0.34e-3)).toList();
        return new Plan(plan.board(), plan.currency(), plan.channels(), plan.shared(), alerts, plan.taps(),
                plan.references(), plan.parts(), plan.findings(), Optional.of(choice), plan.study());
    }

    /** Two points. */
    static Front front(Objective first, Objective second) {
        Plan plan = PlanFixture.plan();
        return new Front(first, second,
                List.of(new Front.Point(1.8, 1250, with(plan,
                        choice(List.of(reached(first, 1.8, 1.8), reached(second, 1250, 1200)), List.of(),
                                Optional.empty()))),
                        new Front.Point(2.25, 1100, with(plan, choice(
                                List.of(reached(second, 1100, 1100),
                                        new Reached(first, 2.25, OptionalDouble.empty(), Reached.Proof.OPEN)),
                                List.of(), Optional.empty())))));
    }

    static List<OtherChoice> others() {
        Plan plan = PlanFixture.plan();
        return List.of(
                new OtherChoice(plan.channels().get(1).solved().orElseThrow().circuit(), plan.channels().get(1),
                        List.of(reached(Objective.LEAST_HEAT, 1.9, 1.9), reached(Objective.LEAST_COST, 1300, 1235)),
                        1300, 1.9, 13, List.of()),
                new OtherChoice(plan.channels().get(2).solved().orElseThrow().circuit(), plan.channels().get(2),
                        List.of(reached(Objective.LEAST_HEAT, 2.1, 2.1), reached(Objective.LEAST_COST, 1200, 1200)),
                        1200, 2.1, 12, List.of("supply")));
    }

    /** Answers by hand; the smallest value of a what-if has no plan. Remembers what it was asked. */
    static final class Asked implements Explorer, Supplier<Solver> {
        final List<Object> heard = new ArrayList<>();
        Board board = PlanFixture.board();

        @Override
        public Solver get() {
            return new Solver((asked, _, _) -> {
                board = asked;
                return plan();
            }, this);
        }

        @Override
        public Front front(Board asked, Catalogue catalogue, Objective first, Objective second, int points,
                Progress progress) {
            heard.addAll(List.of(first, second, points));
            return ChoiceFixture.front(first, second);
        }

        @Override
        public List<OtherChoice> others(Board asked, Catalogue catalogue, String channel, int most, Progress progress) {
            heard.addAll(List.of(channel, most));
            return ChoiceFixture.others();
        }

        @Override
        public WhatIf whatIf(Board asked, Catalogue catalogue, WhatIf.Varied varied, String zone, List<Double> values,
                Progress progress) {
            heard.addAll(List.of(varied, zone, values));
            List<WhatIf.Point> points = new ArrayList<>();
            for (double value : values) {
                points.add(new WhatIf.Point(value, points.isEmpty()
                        ? Optional.empty()
                        : Optional.of(new WhatIf.Sums(1200, 200, 0.6125, 11))));
            }
            return new WhatIf(varied, zone, points);
        }
    }
}
