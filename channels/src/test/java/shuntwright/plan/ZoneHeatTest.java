package shuntwright.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.SplittableRandom;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Slot;
import shuntwright.board.Board;
import shuntwright.board.Demand;
import shuntwright.board.Zone;
import shuntwright.choice.TrialParts;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.Records;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;

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
    void thePlanIsJudgedAtTheRiseItHas() {
        for (double resistance : new double[]{2, 10, 30, 60}) {
            Plan plan = plan(board(resistance));
            double actual = substituted(resistance, hot(plan), plan.board().ambient().max());
            assertThat(hot(plan)).allSatisfy(each -> {
                assertThat(each.around().rise()).isEqualTo(actual, within(1e-6));
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
        Plan warm = plan(cold.board().withZones(board(150).zones())
                .withChannels(BoardPlanner.pinned(cold).channels()));
        for (String name : List.of("a", "b")) {
            var before = cold.channel(name).orElseThrow().solved().orElseThrow();
            var after = warm.channel(name).orElseThrow().solved().orElseThrow();
            assertThat(after.circuit()).isEqualTo(before.circuit());
            // Their combined uncertainty may be less: warmth may bring the middle of the temperatures nearer to 25 °C.
            assertThat(after.trip().limits().contains(before.trip().limits())).isTrue();
            assertThat(after.trip().limits().width()).isGreaterThan(before.trip().limits().width());
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
    void aPlanKeptAsPinsIsJudgedTheSame() {
        for (double resistance : new double[]{0.5, 5, 40, 150}) {
            Plan plan = plan(board(resistance));
            Plan check = new BoardPlanner().check(BoardPlanner.pinned(plan), TrialBoards.CATALOGUE, Progress.SILENT);
            assertThat(check.shared()).isEqualTo(plan.shared());
            for (ChannelPlan each : plan.channels()) {
                ChannelPlan again = check.channel(each.channel().name()).orElseThrow();
                assertThat(again.verdict()).isEqualTo(each.verdict());
                assertThat(again.solved().orElseThrow().assessments())
                        .isEqualTo(each.solved().orElseThrow().assessments());
            }
        }
    }

    /** Of shunts without a temperature coefficient: the sum of d·I²·R, each at the upper end of its tolerance. */
    @Test
    void withoutTemperatureCoefficientsTheRiseIsThatOfTheSum() {
        List<SolvedChannel> channels = List.of(solved(10, 0.5, TrialParts.shunt("a", 0.01, 0.01), 0, 40),
                solved(4, 1, TrialParts.shunt("b", 0.05, 0.02), 0, 40));
        // 0.5·100 A²·10.1 mΩ = 0.505 W and 16 A²·51 mΩ = 0.816 W.
        assertThat(ZoneHeat.rise(20, channels, 60)).isEqualTo(20 * 1.321, within(1e-9));
        assertThat(ZoneHeat.rise(20, List.of(), 60)).isZero();
    }

    /** 50 A²·10 mΩ·(1 + 0.001·(60 - 25 + ΔT))·20 K/W = ΔT: 10.35 K/(1 - 0.01). */
    @Test
    void oneShuntWithATemperatureCoefficientIsWorkedOutByHand() {
        List<SolvedChannel> one = List.of(solved(10, 0.5, TrialParts.shunt("a", 0.01, 0), 1e-3, 0));
        assertThat(ZoneHeat.rise(20, one, 60)).isEqualTo(10.35 / 0.99, within(1e-9));
        // 50 A²·10 mΩ·0.001 /K is 0.5 mW/K: runaway from 2 kK/W on.
        assertThat(ZoneHeat.rise(1999.9, one, 60)).isFinite();
        assertThat(ZoneHeat.rise(2000, one, 60)).isInfinite();
    }

    /** The heat less what the zone gives off changes sign at the rise, between nothing and a rise that bisection doubles to. */
    @Test
    void bisectionFindsTheSameRiseOrNone() {
        SplittableRandom random = new SplittableRandom(11);
        int finite = 0;
        int runaway = 0;
        for (int i = 0; i < 300; i++) {
            List<SolvedChannel> channels = new ArrayList<>();
            for (int c = random.nextInt(1, 5); c > 0; c--) {
                channels.add(solved(random.nextDouble(1, 30), random.nextDouble(),
                        TrialParts.shunt("s", random.nextDouble(1e-3, 2e-2), random.nextDouble(0.05)),
                        random.nextDouble(4e-3), random.nextDouble(5)));
            }
            double hottest = random.nextDouble(25, 90);
            double resistance = Math.exp(random.nextDouble(Math.log(0.5), Math.log(500)));
            double high = 1;
            while (high < 1e9 && excess(resistance, channels, hottest, high) > 0) {
                high *= 2;
            }
            double found = ZoneHeat.rise(resistance, channels, hottest);
            if (high >= 1e9) {
                runaway++;
                assertThat(found).isGreaterThan(1e8);
                continue;
            }
            finite++;
            double low = 0;
            for (int step = 0; step < 200; step++) {
                double middle = (low + high) / 2;
                if (excess(resistance, channels, hottest, middle) > 0) {
                    low = middle;
                } else {
                    high = middle;
                }
            }
            assertThat(found).isEqualTo(high, within(1e-6 * (1 + high)));
        }
        assertThat(finite).isGreaterThan(50);
        assertThat(runaway).isGreaterThan(30);
    }

    /** By how much the heat of a zone at a rise would warm it further, K. */
    private static double excess(double thermalResistance, List<SolvedChannel> channels, double hottest, double rise) {
        double heat = 0;
        for (SolvedChannel each : channels) {
            double load = each.demand().load();
            heat += each.demand().channel().diversity() * load * load * resistance(each, hottest + rise);
        }
        return thermalResistance * heat - rise;
    }

    /** A channel of that load, as far as its heat goes. */
    private static SolvedChannel solved(double load, double diversity, Shunt shunt, double coefficient,
            double heating) {
        Shunt part = Records.with(Records.with(shunt, "temperatureCoefficient", coefficient), "rating",
                new ShuntRating(100, 70, 170, heating, OptionalDouble.empty()));
        var channel = TrialBoards.channel("c", load).withDiversity(diversity);
        var demand = ((Demand.Reading.Complete) Demand.of(channel)).demand();
        var circuit = IdealParts.circuit(part, IdealParts.amplifier(50), IdealParts.divider(5, 1e4, 1e4));
        return new SolvedChannel(demand, circuit, IdealParts.around(5),
                new Settings(0, IdealParts.ZERO, OptionalDouble.empty(), 0, 0, 0), List.of(), List.of(), List.of(),
                List.of(), 0, 0);
    }

    @Test
    void runawayIsAFault() {
        Plan plan = plan(board(1e6));
        assertThat(plan.findings()).filteredOn(each -> each.key() == Finding.Key.THERMAL_RUNAWAY).singleElement()
                .satisfies(finding -> assertThat(finding.text()).contains("\"hot\"", "runs away", "1000000 K/W",
                        "lower thermal resistance"));
        assertThat(plan.accepted()).isFalse();
    }
}
