package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Supplier;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.board.Sampling;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.Records;
import shuntwright.quantity.Range;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/**
 * Yields that can be worked out: the trip current of each channel is 10 A·(1 + s)/(1 + e), where s is the shared supply's relative
 * deviation, from which the threshold is divided, and e the channel's own shunt's.
 */
class BoardYieldTest {

    private static final double TRIP = 10;
    private static final int TRIALS = 200_000;
    private static final double COVERAGE = 0.9;

    /** One board's channels. */
    private static final class Trial {
        private final Sampling sampling;
        private final List<YieldSampler.Part> parts = new ArrayList<>();

        Trial(long seed) {
            this.sampling = Runs.fixed(TRIALS, seed);
        }

        /** @param allowed shares of the nominal trip current */
        Trial channel(String name, double supplyTolerance, double shuntTolerance, Range allowed) {
            double supply = 2;
            double r = supply / 2 / 50 / TRIP;
            SenseCircuit circuit = IdealParts.circuit(
                    IdealParts.shunt(r, Tolerance.symmetric(shuntTolerance), 0, 0), IdealParts.amplifier(50),
                    IdealParts.divider(supply, 1e4, 1e4));
            Surroundings around = Records.with(IdealParts.around(supply), "supply",
                    new Toleranced(supply, Tolerance.symmetric(supplyTolerance)));
            Demand demand = new Demand(Channel.named(name), Spread.exactly(12), 8,
                    Range.of(TRIP * allowed.min(), TRIP * allowed.max()), TRIP, Optional.empty(), 11);
            ChannelSampler sampler = ChannelSampler.of(circuit, around, demand);
            var assessments = ChannelAccuracy.of(circuit, around, demand).assess(COVERAGE);
            ChannelSampler.Result result = sampler.sample(assessments, COVERAGE, sampling, Watch.NONE);
            parts.add(new YieldSampler.Part(sampler, result, !assessments.getFirst().insideByLimits()));
            return this;
        }

        BoardYield together() {
            List<Supplier<BoardYield.SharedCost>> costs = YieldSampler.costs(parts, sampling.seed(), Watch.NONE);
            return YieldSampler.withCosts(YieldSampler.of(parts), costs.stream().map(Supplier::get).toList());
        }
    }

    private static Range between(double low, double high) {
        return Range.of(low, high);
    }

    /** Half of the supply's range is allowed, of which both channels make the same. */
    @Test
    void channelsThatFailTogetherYieldMoreThanTheirProduct() {
        Range half = between(0.99, 1.01);
        BoardYield found = new Trial(1).channel("a", 0.02, 0, half).channel("b", 0.02, 0, half).together();
        double slip = Math.sqrt(0.25 / TRIALS);
        assertThat(found.inside().estimate()).isCloseTo(0.5, within(4 * slip));
        assertThat(found.inside().interval().contains(found.inside().estimate())).isTrue();
        assertThat(found.product()).isCloseTo(0.25, within(4 * slip));
        // Without the supply's deviation nothing is left that could fail.
        assertThat(found.shared()).singleElement().satisfies(cost -> {
            assertThat(cost.owner()).isEqualTo("supply");
            assertThat(cost.without()).isEqualTo(1);
            assertThat(cost.cost()).isCloseTo(0.5, within(4 * cost.standardError()));
            assertThat(cost.standardError()).isCloseTo(Math.sqrt(0.25 / (1 << 17)), within(1e-4));
        });
    }

    /** The same windows, but each channel's own shunt deviates: I/10 A = 1/(1 + e). */
    @Test
    void independentChannelsYieldTheirProduct() {
        Range half = between(1 / 1.01, 1 / 0.99);
        BoardYield found = new Trial(2).channel("a", 0, 0.02, half).channel("b", 0, 0.02, half)
                .channel("c", 0, 0.02, half).together();
        double slip = Math.sqrt(0.125 * 0.875 / TRIALS);
        assertThat(found.inside().estimate()).isCloseTo(0.125, within(4 * slip));
        assertThat(found.product()).isCloseTo(0.125, within(4 * slip * 2));
        assertThat(found.inside().standardError()).isCloseTo(slip, within(0.05 * slip));
        assertThat(found.shared()).isEmpty();
    }

    /** Given s, both channels are inside with probability q(s)² independently: yield E q², product (E q)², cost q(0)² − E q². */
    @Test
    void sharedAndOwnDeviationsTogether() {
        double shared = 0.02;
        double own = 0.01;
        double low = 0.975;
        double high = 1.02;
        // low ≤ (1 + s)/(1 + e) ≤ high with e uniform over ±own.
        DoubleUnaryOperator inside = s -> Math.max(0,
                Math.min(own, (1 + s) / low - 1) - Math.max(-own, (1 + s) / high - 1)) / (2 * own);
        double single = Grid.mean(-shared, shared, 400, inside);
        double both = Grid.mean(-shared, shared, 400, s -> Math.pow(inside.applyAsDouble(s), 2));
        double cost = Math.pow(inside.applyAsDouble(0), 2) - both;
        BoardYield found = new Trial(3).channel("a", shared, own, between(low, high))
                .channel("b", shared, own, between(low, high)).together();
        double slip = Math.sqrt(both * (1 - both) / TRIALS);
        assertThat(both).isGreaterThan(single * single + 20 * slip);
        assertThat(found.inside().estimate()).isCloseTo(both, within(4 * slip));
        assertThat(found.product()).isCloseTo(single * single, within(8 * slip));
        assertThat(found.shared()).singleElement().satisfies(supply -> {
            assertThat(supply.cost()).isCloseTo(cost, within(4 * supply.standardError()));
            assertThat(supply.without()).isCloseTo(Math.pow(inside.applyAsDouble(0), 2), within(8 * slip));
        });
    }

    /** Draws are shared by seed and name: each channel alone is what it is on a board with others, in any order. */
    @Test
    void anotherChannelOrOrderDoesNotChangeAChannel() {
        Range window = between(0.98, 1.01);
        Trial one = new Trial(4).channel("a", 0.02, 0.01, window).channel("b", 0.02, 0.02, window);
        Trial other = new Trial(4).channel("c", 0.02, 0.03, window).channel("b", 0.02, 0.02, window)
                .channel("a", 0.02, 0.01, window);
        assertThat(other.parts.get(2).result().study()).isEqualTo(one.parts.get(0).result().study());
        assertThat(other.parts.get(1).result().study()).isEqualTo(one.parts.get(1).result().study());
        Trial reversed = new Trial(4).channel("b", 0.02, 0.02, window).channel("a", 0.02, 0.01, window);
        assertThat(reversed.together().inside()).isEqualTo(one.together().inside());
        Trial reseeded = new Trial(5).channel("a", 0.02, 0.01, window);
        assertThat(reseeded.parts.getFirst().result().study()).isNotEqualTo(one.parts.getFirst().result().study());
        // Two channels alike in all but their name draw their own shunts apart.
        Trial twins = new Trial(4).channel("a", 0, 0.02, window).channel("b", 0, 0.02, window);
        assertThat(twins.parts.get(0).result().study().outcomes())
                .isNotEqualTo(twins.parts.get(1).result().study().outcomes());
    }

    /** A board on which nothing was outside: the yield is not claimed to be 1. */
    @Test
    void aBoardWithoutFailuresIsNotCertain() {
        BoardYield found = new Trial(6).channel("a", 0.02, 0, between(0.9, 1.1)).together();
        assertThat(found.inside().estimate()).isEqualTo(1);
        assertThat(found.inside().interval().min()).isLessThan(1).isGreaterThan(0.9999);
        assertThat(found.product()).isEqualTo(1);
        assertThat(found.shared()).isEmpty();
    }

    /** A reel is shared by the channels that take pieces of it: with full correlation they fail together. */
    @Test
    void piecesOfAReelFailTogether() {
        double supply = 2;
        double r = supply / 2 / 50 / TRIP;
        for (double correlation : new double[]{0, 1}) {
            List<YieldSampler.Part> parts = new ArrayList<>();
            for (String name : List.of("a", "b")) {
                SenseCircuit circuit = Records.withPath(IdealParts.circuit(
                        IdealParts.shunt(r, Tolerance.symmetric(0.02), 0, 0), IdealParts.amplifier(50),
                        IdealParts.divider(supply, 1e4, 1e4)), "shunt.correlation", correlation);
                Demand demand = new Demand(Channel.named(name), Spread.exactly(12), 8,
                        Range.of(TRIP / 1.01, TRIP / 0.99), TRIP, Optional.empty(), 11);
                ChannelSampler sampler = ChannelSampler.of(circuit, IdealParts.around(supply), demand);
                parts.add(new YieldSampler.Part(sampler,
                        sampler.sample(ChannelAccuracy.of(circuit, IdealParts.around(supply), demand).assess(COVERAGE),
                                COVERAGE, Runs.fixed(TRIALS, 7), Watch.NONE),
                        true));
            }
            double expected = correlation > 0 ? 0.5 : 0.25;
            assertThat(YieldSampler.of(parts).inside().estimate()).isCloseTo(expected,
                    within(4 * Math.sqrt(0.25 / TRIALS)));
        }
    }
}
