package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;

import org.hipparchus.distribution.continuous.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.Outcome;
import shuntwright.board.Demand;
import shuntwright.board.DesignRules;
import shuntwright.board.StatedDistribution;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.fixture.IdealParts;
import shuntwright.fixture.Records;
import shuntwright.parts.InputErrors;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/**
 * A channel whose trip current is linear in its errors: I = ((V + V_C)/G − V_A − E·K)/R with the offsets V_C of the comparator and
 * V_A of the amplifier and the thermal EMF E·K, so that limits, combined uncertainty and propagated distribution are known.
 */
class LinearChannelTest {

    private static final double R = 0.002;
    private static final double GAIN = 50;
    private static final double TRIP = 10;
    /** Half-widths of the three contributions, A. */
    private static final double BY_COMPARATOR = 0.30;
    private static final double BY_AMPLIFIER = 0.20;
    private static final double BY_EMF = 0.05;
    private static final UniformSum SUM = UniformSum.of(BY_COMPARATOR, BY_AMPLIFIER, BY_EMF);
    private static final int TRIALS = 400_000;

    private static final SenseCircuit CIRCUIT = circuit();
    private static final Demand DEMAND = Records.with(Records.with(IdealParts.demand(12), "tripWindow",
            Range.of(9.6, 10.4)), "rearm", Optional.empty());

    private static SenseCircuit circuit() {
        double threshold = TRIP * R * GAIN;
        SenseCircuit plain = IdealParts.circuit(IdealParts.shunt(R),
                IdealParts.amplifier(GAIN,
                        new InputErrors(BY_AMPLIFIER * R, 0, Double.POSITIVE_INFINITY, 0, Double.POSITIVE_INFINITY, 0,
                                0)),
                IdealParts.divider(2 * threshold, 1e4, 1e4));
        SenseCircuit second = Records.withPath(plain, "comparator.inputs.offset", BY_COMPARATOR * R * GAIN);
        return Records.withPath(second, "shunt.thermalEmf", BY_EMF * R / DesignRules.DEFAULT.shuntGradient());
    }

    private static Surroundings around(StatedDistribution... stated) {
        return Records.with(IdealParts.around(2 * TRIP * R * GAIN), "stated", List.of(stated));
    }

    private static Propagated sample(Surroundings around, double coverage, Assessment assessment) {
        ChannelStudy study = ChannelSampler.of(CIRCUIT, around, DEMAND)
                .sample(List.of(assessment), coverage, Runs.fixed(TRIALS, 1), Watch.NONE).study();
        assertThat(study.settled()).isTrue();
        assertThat(study.coverage()).isEqualTo(coverage);
        assertThat(study.outcomes()).hasSize(1);
        return study.outcome(Outcome.TRIP).orElseThrow();
    }

    private static Assessment assess(Surroundings around, double coverage) {
        List<Assessment> all = ChannelAccuracy.of(CIRCUIT, around, DEMAND).assess(coverage);
        assertThat(all).hasSize(1);
        return all.getFirst();
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.9, 0.95, 0.9973, 0.99999})
    void limitsCombinedAndPropagatedAgreeWithTheClosedForm(double coverage) {
        Assessment assessment = assess(around(), coverage);
        double reach = BY_COMPARATOR + BY_AMPLIFIER + BY_EMF;
        assertThat(assessment.nominal()).isCloseTo(TRIP, within(1e-12));
        assertThat(assessment.limits().min()).isCloseTo(TRIP - reach, within(1e-12));
        assertThat(assessment.limits().max()).isCloseTo(TRIP + reach, within(1e-12));
        double u = Math.sqrt((BY_COMPARATOR * BY_COMPARATOR + BY_AMPLIFIER * BY_AMPLIFIER + BY_EMF * BY_EMF) / 3);
        assertThat(assessment.combined().standard()).isCloseTo(u, within(1e-9));
        Propagated found = sample(around(), coverage, assessment);
        Sampled sampled = found.sampled();
        assertThat(sampled.trials()).isEqualTo(TRIALS);
        assertThat(sampled.mean()).isCloseTo(TRIP, within(4 * u / Math.sqrt(TRIALS)));
        assertThat(sampled.standard()).isCloseTo(u, within(4 * u / Math.sqrt(2.0 * TRIALS)));
        double end = SUM.quantile((1 + coverage) / 2);
        CoverageInterval symmetric = sampled.symmetric();
        assertThat(symmetric.range().min()).isCloseTo(TRIP - end, within(4 * symmetric.standardErrors().low()));
        assertThat(symmetric.range().max()).isCloseTo(TRIP + end, within(4 * symmetric.standardErrors().high()));
        assertThat(assessment.limits().contains(symmetric.range())).isTrue();
        assertThat(assessment.limits().contains(sampled.shortest().range())).isTrue();
        double exact = 2 * SUM.above(0.4);
        assertThat(sampled.outside().estimate()).isCloseTo(exact, within(4.5 * sampled.outside().standardError()));
        assertThat(found.inside()).isEqualTo(end < 0.4);
        // Clause 8 by hand: the normal quantile times u against the exact end, two digits of u.
        double k = new NormalDistribution(0, 1).inverseCumulativeProbability((1 + coverage) / 2);
        double delta = 0.005;
        assertThat(u).isBetween(0.21, 0.22);
        assertThat(found.validation().tolerance()).isCloseTo(delta, within(1e-12));
        assertThat(found.validation().highDifference()).isCloseTo(Math.abs(k * u - end),
                within(4 * symmetric.standardErrors().high()));
        assertThat(found.validation().valid()).isEqualTo(Math.abs(k * u - end) <= delta);
    }

    /** What the user states of an input reaches all three: normal and triangular for two of the inputs. */
    @Test
    void statedDistributionsAreSampled() {
        Surroundings around = around(
                new StatedDistribution("comparator offset", Optional.empty(), new Distribution.Normal(3)),
                new StatedDistribution("amplifier offset", Optional.of("amplifier"), new Distribution.Triangular()),
                new StatedDistribution("thermal EMF of the shunt", Optional.of("another"),
                        new Distribution.Normal(1)));
        Assessment assessment = assess(around, 0.95);
        double u = Math.sqrt(BY_COMPARATOR * BY_COMPARATOR / 9 + BY_AMPLIFIER * BY_AMPLIFIER / 6 + BY_EMF * BY_EMF / 3);
        assertThat(assessment.combined().standard()).isCloseTo(u, within(1e-9));
        Sampled sampled = sample(around, 0.95, assessment).sampled();
        assertThat(sampled.standard()).isCloseTo(u, within(4 * u / Math.sqrt(2.0 * TRIALS)));
        UniformSum bounded = UniformSum.of(BY_AMPLIFIER / 2, BY_AMPLIFIER / 2, BY_EMF);
        NormalDistribution normal = new NormalDistribution(0, 1);
        double end = Bisection.root(s -> Grid.mean(-8, 8, 8,
                z -> 16 * normal.density(z) * bounded.below(s - BY_COMPARATOR / 3 * z)) - 0.975, 0, 1);
        assertThat(sampled.symmetric().range().max()).isCloseTo(TRIP + end,
                within(4 * sampled.symmetric().standardErrors().high()));
    }

    /** Effects of a linear channel are its shares of the variance, like the lines of the budget. */
    @Test
    void effectsAreTheVarianceShares() {
        Assessment assessment = assess(around(), 0.95);
        ChannelSampler sampler = ChannelSampler.of(CIRCUIT, around(), DEMAND);
        ChannelSampler.Result plain = sampler.sample(List.of(assessment), 0.95, Runs.fixed(10_000, 1), Watch.NONE);
        assertThat(plain.study().outcomes().getFirst().effects()).isEmpty();
        List<EffectIndex> effects = sampler.withEffects(plain, 1, Watch.NONE).study().outcomes().getFirst().effects();
        assertThat(effects).hasSize(3).isSortedAccordingTo((a, b) -> Double.compare(b.total(), a.total()));
        for (EffectIndex effect : effects) {
            double share = assessment.budget().stream().filter(line -> line.input().equals(effect.input())).findFirst()
                    .orElseThrow().varianceShare();
            assertThat(effect.first()).as(effect.input().label()).isCloseTo(share, within(4 * effect.firstError()));
            assertThat(effect.total()).as(effect.input().label()).isCloseTo(share, within(6 * effect.totalError()));
        }
    }
}
