package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import java.util.SplittableRandom;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Slot;
import shuntwright.board.Board;
import shuntwright.board.Zone;
import shuntwright.parts.Shunt;

/** Zones that their own shunts warm. */
class ZoneHeatTest {

    private static final double COPPER = 3.93e-3;

    private static Board board(double thermalResistance) {
        Board board = TrialBoards.board(TrialBoards.inZone(TrialBoards.channel("a", 30), "hot"),
                TrialBoards.inZone(TrialBoards.channel("b", 20), "hot"), TrialBoards.channel("c", 20));
        return board.withZones(List.of(new Zone("hot", OptionalDouble.empty(), OptionalDouble.of(thermalResistance))));
    }

    private static Plan plan(Board board) {
        return new BoardPlanner().plan(board, TrialBoards.CATALOGUE, Progress.SILENT);
    }

    private static List<SolvedChannel> hot(Plan plan) {
        return plan.channels().stream().filter(each -> each.channel().zone().isPresent())
                .map(each -> each.solved().orElseThrow()).toList();
    }

    /** Resistance by its definition, self-heating by repeated substitution. */
    private static double resistance(SolvedChannel solved, double ambient) {
        Shunt s = solved.circuit().shunt();
        int n = solved.circuit().shuntCount();
        double share = solved.demand().load() / n;
        double own = s.resistance() * (1 + s.tolerance().above()) * (1 + s.ageing());
        double joint = s.mountingResistance().max();
        double hotter = ambient;
        double each = own;
        for (int i = 0; i < 200; i++) {
            double sign = hotter >= 25 ? 1 : -1;
            each = own * (1 + sign * s.temperatureCoefficient() * (hotter - 25)) + joint * (1 + COPPER * (hotter - 20));
            hotter = ambient + s.rating().thermalResistance() * share * share * each;
        }
        return each / n;
    }

    /** ΔT by repeated substitution. */
    private static double substituted(double thermalResistance, List<SolvedChannel> channels, double hottest) {
        double rise = 0;
        for (int i = 0; i < 500; i++) {
            double heat = 0;
            for (SolvedChannel each : channels) {
                double load = each.demand().load();
                heat += each.demand().channel().diversity() * load * load * resistance(each, hottest + rise);
            }
            rise = thermalResistance * heat;
        }
        return rise;
    }

    @Test
    void theRiseIsTheFixedPoint() {
        List<SolvedChannel> channels = hot(plan(board(1)));
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 200; i++) {
            double resistance = random.nextDouble(0.5, 60);
            double hottest = random.nextDouble(26, 90);
            assertThat(ZoneHeat.rise(resistance, channels, hottest))
                    .isEqualTo(substituted(resistance, channels, hottest), within(1e-6));
        }
    }

    @Test
    void thePlanCountsWithAtLeastTheRiseItHas() {
        for (double resistance : new double[]{2, 10, 30, 60}) {
            Plan plan = plan(board(resistance));
            double actual = substituted(resistance, hot(plan), plan.board().ambient().max());
            assertThat(hot(plan)).allSatisfy(each -> {
                assertThat(each.around().rise()).isBetween(actual * (1 - 1e-9), actual + 20);
                assertThat(each.inputs()).anyMatch(input -> input.slot() == Slot.ZONE_RISE
                        && input.limits().max() == each.around().rise());
            });
            assertThat(plan.channel("c").orElseThrow().solved().orElseThrow().around().rise()).isZero();
            assertThat(plan.shared()).filteredOn(each -> each.kind() == SharedUse.Kind.ZONE_RISE).singleElement()
                    .satisfies(use -> assertThat(use.used()).isEqualTo(actual, within(1e-6)));
        }
    }

    @Test
    void warmthWidensTheLimits() {
        Plan cold = plan(board(1e-6));
        Plan warm = plan(cold.board().withZones(board(40).zones())
                .withChannels(BoardPlanner.pinned(cold).channels()));
        for (String name : List.of("a", "b")) {
            var before = cold.channel(name).orElseThrow().solved().orElseThrow();
            var after = warm.channel(name).orElseThrow().solved().orElseThrow();
            assertThat(after.circuit()).isEqualTo(before.circuit());
            assertThat(after.trip().limits().contains(before.trip().limits())).isTrue();
            assertThat(after.trip().combined().standard()).isGreaterThanOrEqualTo(before.trip().combined().standard());
        }
    }

    @Test
    void aKeptPlannerGivesWhatANewOneGives() {
        BoardPlanner kept = new BoardPlanner();
        for (double resistance : new double[]{5, 40, 5}) {
            assertThat(kept.plan(board(resistance), TrialBoards.CATALOGUE, Progress.SILENT))
                    .isEqualTo(plan(board(resistance)));
        }
    }

    @Test
    void aPinnedBoardIsCheckedAtTheRiseItHas() {
        Plan plan = plan(board(20));
        Plan check = new BoardPlanner().check(BoardPlanner.pinned(plan), TrialBoards.CATALOGUE, Progress.SILENT);
        double actual = substituted(20, hot(check), check.board().ambient().max());
        assertThat(hot(check)).allSatisfy(each -> assertThat(each.around().rise()).isEqualTo(actual, within(1e-6)));
    }

    @Test
    void runawayIsAFault() {
        Plan plan = plan(board(1e6));
        assertThat(plan.findings()).filteredOn(each -> each.key() == Finding.Key.THERMAL_RUNAWAY).singleElement()
                .satisfies(finding -> assertThat(finding.text()).contains("hot", "runs away"));
        assertThat(plan.accepted()).isFalse();
    }
}
