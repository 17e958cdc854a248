package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static shuntwright.plan.TrialBoards.CATALOGUE;
import static shuntwright.plan.TrialBoards.board;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SplittableRandom;

import org.junit.jupiter.api.Test;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.board.Objective;
import shuntwright.board.SenseSupply;
import shuntwright.board.Zone;
import shuntwright.circuit.HysteresisNetwork;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Threshold;

/** The choice for the whole board, looked at from outside: what it claims is worked out again from the plan's circuits. */
class BoardChoiceTest {

    private static Board random(long seed, int channels, Objective... order) {
        SplittableRandom random = new SplittableRandom(seed);
        List<Channel> all = new ArrayList<>();
        for (int i = 0; i < channels; i++) {
            all.add(BoardPlannerTest.random("channel " + i, random)
                    .withZone(java.util.Optional.of(i % 2 == 0 ? "left" : "right")));
        }
        Board board = TrialBoards.withZones(board(all.toArray(Channel[]::new)), OptionalDouble.empty(),
                new Zone("left", OptionalDouble.of(50), OptionalDouble.empty()),
                new Zone("right", OptionalDouble.of(50), OptionalDouble.empty()));
        return board.withBuildQuantity(120)
                .withPreference(board.preference().withOrder(List.of(order)).withRounds(60).withPartNumberCost(3));
    }

    private static Plan plan(Board board) {
        return new BoardPlanner().plan(board, CATALOGUE, Progress.SILENT);
    }

    /** Pieces of each part number of a board, summed up from its circuits without the parts list. */
    private static Map<String, Integer> pieces(Plan plan) {
        Map<String, Integer> pieces = new HashMap<>();
        Map<String, Integer> sections = new HashMap<>();
        for (ChannelPlan each : plan.channels()) {
            if (each.solved().isEmpty()) {
                continue;
            }
            SenseCircuit c = each.solved().get().circuit();
            String zone = each.channel().zone().orElse("");
            pieces.merge(c.shunt().partNumber(), c.shuntCount(), Integer::sum);
            if (sections.merge(zone + c.amplifier().partNumber(), 1, Integer::sum) % c.amplifier().sections() == 1 % c
                    .amplifier().sections()) {
                pieces.merge(c.amplifier().partNumber(), 1, Integer::sum);
            }
            if (sections.merge(zone + c.comparator().partNumber(), 1, Integer::sum) % c.comparator().sections() == 1 % c
                    .comparator().sections()) {
                pieces.merge(c.comparator().partNumber(), 1, Integer::sum);
            }
            List<Double> ohms = new ArrayList<>();
            if (c.threshold() instanceof Threshold.Divider divider) {
                ohms.add(divider.top());
                ohms.add(divider.bottom());
            }
            switch (c.network()) {
                case HysteresisNetwork.None _ -> {
                }
                case HysteresisNetwork.SenseResistor(double ohm) -> ohms.add(ohm);
                case HysteresisNetwork.Feedback feedback -> ohms.add(feedback.resistance());
            }
            ohms.forEach(ohm -> pieces.merge(PartsList.number(c.resistors(), ohm), 1, Integer::sum));
        }
        plan.references().forEach(each -> pieces.merge(each.part().partNumber(), 1, Integer::sum));
        return pieces;
    }

    @Test
    void claimsWhatItsCircuitsComeTo() {
        for (int seed = 0; seed < 6; seed++) {
            Plan plan = plan(random(seed, 5, Objective.LEAST_COST, Objective.FEWEST_PARTS, Objective.LEAST_HEAT));
            Map<String, Integer> pieces = pieces(plan);
            double cost = 0;
            for (PartUse use : plan.parts()) {
                if (use.users().stream().noneMatch(user -> user.contains("alert line"))) {
                    assertThat(use.quantity()).as(use.partNumber()).isEqualTo(pieces.get(use.partNumber()));
                }
                cost += 3 + use.purchase().cheapestOrder(use.quantity() * 120).cost();
            }
            double heat = plan.channels().stream().flatMap(each -> each.solved().stream())
                    .mapToDouble(each -> each.demand().load() * each.demand().load() * each.circuit().resistance())
                    .sum();
            List<Reached> reached = plan.choice().orElseThrow().reached();
            assertThat(reached).extracting(Reached::objective).containsExactly(Objective.LEAST_COST,
                    Objective.FEWEST_PARTS,
                    Objective.LEAST_HEAT);
            assertThat(reached.get(0).value()).isCloseTo(cost, within(1e-9 * cost));
            assertThat(reached.get(1).value()).isEqualTo(plan.parts().size());
            assertThat(reached.get(2).value()).isCloseTo(heat, within(1e-9 * heat));
            for (Reached each : reached) {
                assertThat(each.bound().orElse(each.value())).isLessThanOrEqualTo(each.value() * (1 + 1e-9));
            }
        }
    }

    /** What is asked for first is never worse than when it is asked for last. */
    @Test
    void theFirstObjectiveDecides() {
        int better = 0;
        for (int seed = 10; seed < 14; seed++) {
            Plan cheap = plan(random(seed, 6, Objective.LEAST_COST, Objective.LEAST_HEAT));
            Plan cool = plan(random(seed, 6, Objective.LEAST_HEAT, Objective.LEAST_COST));
            assertThat(cheap.buildCost()).isLessThanOrEqualTo(cool.buildCost() * (1 + 1e-9));
            assertThat(BoardQuestions.heat(cool)).isLessThanOrEqualTo(BoardQuestions.heat(cheap) + 6 * 0.02 + 1e-9);
            better += cheap.buildCost() < cool.buildCost() ? 1 : 0;
            assertThat(cheap.channels()).allMatch(each -> each.accepted() == cool.channel(each.channel().name())
                    .orElseThrow().accepted());
        }
        assertThat(better).isGreaterThan(1);
    }

    @Test
    void aFrontTradesOneForTheOther() {
        Front front = new BoardPlanner().front(random(3, 5, Objective.LEAST_HEAT), CATALOGUE, Objective.LEAST_HEAT,
                Objective.LEAST_COST, 5, Progress.SILENT);
        assertThat(front.points()).hasSizeBetween(2, 5);
        for (int i = 1; i < front.points().size(); i++) {
            assertThat(front.points().get(i).first()).isGreaterThan(front.points().get(i - 1).first());
            assertThat(front.points().get(i).second()).isLessThan(front.points().get(i - 1).second());
        }
        for (Front.Point each : front.points()) {
            assertThat(each.first()).isCloseTo(BoardQuestions.heat(each.plan()), within(1e-9));
            assertThat(each.second()).isCloseTo(each.plan().buildCost(), within(1e-9));
        }
    }

    @Test
    void otherChoicesStateTheWholeBoard() {
        Board board = random(4, 4, Objective.LEAST_COST, Objective.LEAST_HEAT);
        BoardPlanner planner = new BoardPlanner();
        Plan now = planner.plan(board, CATALOGUE, Progress.SILENT);
        String name = now.channels().stream().filter(ChannelPlan::accepted).findFirst().orElseThrow().channel().name();
        List<OtherChoice> others = planner.others(board, CATALOGUE, name, 3, Progress.SILENT);
        assertThat(others).isNotEmpty().hasSizeLessThanOrEqualTo(3);
        for (OtherChoice each : others) {
            assertThat(each.channel().accepted()).isTrue();
            assertThat(each.circuit()).isNotEqualTo(now.channel(name).orElseThrow().solved().orElseThrow().circuit());
            assertThat(each.channel().solved().orElseThrow().circuit()).isEqualTo(each.circuit());
            assertThat(each.cost()).isGreaterThanOrEqualTo(now.buildCost() * (1 - 0.02));
        }
    }

    @Test
    void aHeatLimitBelowTheLeastIsAConflictWithItsCure() {
        Board board = random(5, 5, Objective.LEAST_HEAT, Objective.LEAST_COST);
        double least = BoardQuestions.heat(plan(board.withRules(board.rules().withHeatStep(0))));
        Board hot = board.withHeatLimit(OptionalDouble.of(0.8 * least));
        Plan plan = plan(hot);
        BoardChoice choice = plan.choice().orElseThrow();
        assertThat(choice.broken()).containsExactly("board heat");
        Conflict conflict = choice.conflict().orElseThrow();
        assertThat(conflict.minimal()).isTrue();
        Conflict.Member limit = conflict.members().getFirst();
        assertThat(limit.kind()).isEqualTo(Conflict.Kind.SHARED_LIMIT);
        assertThat(limit.relaxed().orElseThrow()).isBetween(least * (1 - 1e-9), least * 1.001);
        Plan relaxed = plan(hot.withHeatLimit(limit.relaxed()));
        assertThat(relaxed.choice().orElseThrow().broken()).isEmpty();
        assertThat(relaxed.choice().orElseThrow().conflict()).isEmpty();
        for (Conflict.Member member : conflict.members()) {
            if (member.kind() == Conflict.Kind.CHANNEL && member.relaxed().isPresent()) {
                Channel before = hot.channels().stream().filter(each -> each.name().equals(member.name())).findFirst()
                        .orElseThrow();
                Channel.Currents c = before.currents();
                Channel after = before.withCurrents(new Channel.Currents(c.load(), c.noTrip(), member.relaxed(),
                        c.tripTarget(), c.least(), c.fullScale()));
                assertThat(plan(hot.withChannels(
                        hot.channels().stream().map(each -> each.equals(before) ? after : each).toList())).choice()
                        .orElseThrow().broken()).as(member.name()).isEmpty();
            }
        }
    }

    /** A supply limit that circuits of least heat break is kept with hotter ones, whatever objective comes first. */
    @Test
    void keepsALimitThatLeastHeatAloneWouldBreak() {
        int tight = 0;
        for (int seed = 20; seed < 32; seed++) {
            Board board = random(seed, 5, Objective.LEAST_HEAT, Objective.LEAST_COST);
            double used = supply(plan(board));
            for (double share : new double[]{0.98, 0.95, 0.9, 0.8, 0.7}) {
                Board less = board.withSupply(
                        new SenseSupply(board.supply().voltage(), share * used));
                boolean can = plan(less.withPreference(less.preference().withOrder(List.of(Objective.LEAST_COST))))
                        .choice().orElseThrow().broken().isEmpty();
                if (can) {
                    tight++;
                    assertThat(plan(less).choice().orElseThrow().broken()).as("seed %s, %s", seed, share).isEmpty();
                }
            }
        }
        assertThat(tight).isGreaterThan(5);
    }

    private static double supply(Plan plan) {
        return plan.shared().stream().filter(each -> each.kind() == SharedUse.Kind.SUPPLY).findFirst().orElseThrow()
                .used();
    }

    @Test
    void whatIfLeavesOutWhatCannotBe() {
        Board board = random(6, 4, Objective.LEAST_COST);
        double least = BoardQuestions.heat(plan(board.withPreference(board.preference().withOrder(
                List.of(Objective.LEAST_HEAT))).withRules(board.rules().withHeatStep(0))));
        WhatIf answer = new BoardPlanner().whatIf(board, CATALOGUE, WhatIf.Varied.BOARD_HEAT_LIMIT, "",
                List.of(4 * least, 0.5 * least, 1.5 * least), Progress.SILENT);
        assertThat(answer.points()).extracting(WhatIf.Point::value).isSorted();
        assertThat(answer.points().getFirst().reached()).isEmpty();
        assertThat(answer.points().get(2).reached().orElseThrow().cost())
                .isLessThanOrEqualTo(answer.points().get(1).reached().orElseThrow().cost() * 1.02);
    }

    @Test
    void repeatsExactlyAndStreamsItsBest() {
        Board board = random(7, 6, Objective.LEAST_COST, Objective.LEAST_HEAT);
        List<BoardChoice> better = new ArrayList<>();
        Plan first = new BoardPlanner().plan(board, CATALOGUE, new Progress() {
            @Override
            public void reached(String stage, int done, int total) {
                // Not looked at.
            }

            @Override
            public void better(BoardChoice best) {
                better.add(best);
            }

            @Override
            public boolean cancelled() {
                return false;
            }
        });
        assertThat(plan(board)).isEqualTo(first);
        assertThat(better).isNotEmpty();
    }

    /** An edit starts from the plan before it and ends with nothing worse than a new planner's. */
    @Test
    void startsFromThePlanBefore() {
        Board board = random(9, 6, Objective.LEAST_COST, Objective.LEAST_HEAT);
        BoardPlanner planner = new BoardPlanner();
        Plan plan = planner.plan(board, CATALOGUE, Progress.SILENT);
        planner.startFrom(plan);
        Plan same = planner.plan(board.withPreference(board.preference().withRounds(0)), CATALOGUE, Progress.SILENT);
        assertThat(same.buildCost()).isLessThanOrEqualTo(plan.buildCost() * (1 + 1e-9));
        List<Channel> fewer = board.channels().subList(1, 6);
        Plan edited = planner.plan(board.withChannels(fewer), CATALOGUE, Progress.SILENT);
        Plan anew = plan(board.withChannels(fewer));
        assertThat(edited.buildCost()).isLessThanOrEqualTo(anew.buildCost() * 1.02);
        assertThat(edited.channels()).extracting(ChannelPlan::accepted)
                .isEqualTo(anew.channels().stream().map(ChannelPlan::accepted).toList());
    }

    @Test
    void enoughEndsWithTheBestSoFar() {
        Board board = random(8, 6, Objective.LEAST_COST);
        Plan plan = new BoardPlanner().plan(board, CATALOGUE, new Progress() {
            @Override
            public void reached(String stage, int done, int total) {
                // Not looked at.
            }

            @Override
            public boolean enough() {
                return true;
            }

            @Override
            public boolean cancelled() {
                return false;
            }
        });
        assertThat(plan.choice().orElseThrow().cutShort()).isTrue();
        assertThat(plan.channels()).anyMatch(ChannelPlan::accepted);
    }
}
