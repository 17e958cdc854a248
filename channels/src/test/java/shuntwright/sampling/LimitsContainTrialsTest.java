package shuntwright.sampling;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;

import org.junit.jupiter.api.Test;

import shuntwright.accuracy.Assessment;
import shuntwright.accuracy.ChannelAccuracy;
import shuntwright.accuracy.Input;
import shuntwright.accuracy.Layout;
import shuntwright.fixture.Furnished;
import shuntwright.fixture.RandomCircuits;
import shuntwright.quantity.Range;

/** No trial of bounded inputs is ever outside the limits: thousands of channels with everything that may be stated of them. */
class LimitsContainTrialsTest {

    private static final int CHANNELS = 1500;

    private final RandomGenerator random = RandomGeneratorFactory.of("L64X128MixRandom").create(2026);

    private RandomCircuits.Drawn next(RandomCircuits circuits) {
        RandomCircuits.Drawn drawn = Furnished.furnish(circuits.next(), random);
        return random.nextBoolean() ? Furnished.withDistributions(drawn, random) : drawn;
    }

    @Test
    void everyTrialIsWithinTheLimits() {
        RandomCircuits circuits = RandomCircuits.full(random);
        Scratch scratch = new Scratch();
        Draws draws = new Draws();
        long trials = 0;
        for (int channel = 0; channel < CHANNELS; channel++) {
            RandomCircuits.Drawn drawn = next(circuits);
            ChannelAccuracy accuracy = ChannelAccuracy.of(drawn.circuit(), drawn.around(), drawn.demand());
            ChannelModel model = new ChannelModel(drawn.circuit(), drawn.around(), drawn.demand());
            Columns columns = new Columns(variables(accuracy), channel);
            double[][] x = columns.allocate();
            double[][] y = new double[model.outputs()][Draws.BLOCK];
            columns.draw(0, 0, draws, scratch, x);
            model.evaluate(x, Draws.BLOCK, y, scratch);
            for (int o = 0; o < y.length; o++) {
                Range limits = accuracy.limits(model.asked().get(o));
                double slack = 1e-12 * Math.abs(limits.max());
                for (double value : y[o]) {
                    trials++;
                    if (!(value >= limits.min() - slack && value <= limits.max() + slack)) {
                        assertThat(value).as("%s of %s", model.asked().get(o), drawn).isBetween(limits.min(),
                                limits.max());
                    }
                }
            }
        }
        assertThat(trials).isGreaterThan(4_000_000);
    }

    private static List<Variable> variables(ChannelAccuracy accuracy) {
        List<Variable> variables = new ArrayList<>();
        for (double value : accuracy.nominal()) {
            variables.add(Variable.of("", Range.exactly(value), Runs.UNIFORM));
        }
        for (Input input : accuracy.inputs()) {
            variables.set(Layout.index(input),
                    new Variable(input.label(), input.limits(), input.distribution(), input.reel()));
        }
        return variables;
    }

    /** The same by the way that boards take: what is reported stays within the limits too. */
    @Test
    void everyReportIsWithinTheLimits() {
        RandomCircuits circuits = RandomCircuits.full(random);
        for (int channel = 0; channel < 30; channel++) {
            RandomCircuits.Drawn drawn = next(circuits);
            List<Assessment> assessments = ChannelAccuracy.of(drawn.circuit(), drawn.around(), drawn.demand())
                    .assess(0.9973);
            ChannelStudy study = ChannelSampler.of(drawn.circuit(), drawn.around(), drawn.demand())
                    .sample(assessments, 0.9973, Runs.fixed(20_000, channel), Watch.NONE).study();
            assertThat(study.outcomes()).hasSameSizeAs(assessments);
            for (int i = 0; i < assessments.size(); i++) {
                Assessment assessment = assessments.get(i);
                Propagated propagated = study.outcomes().get(i);
                Sampled sampled = propagated.sampled();
                Range limits = assessment.limits();
                double slack = 1e-12 * Math.abs(limits.max());
                Range wider = Range.of(limits.min() - slack, limits.max() + slack);
                assertThat(propagated.outcome()).isEqualTo(assessment.outcome());
                assertThat(propagated.allowed()).isEqualTo(assessment.allowed());
                assertThat(wider.contains(sampled.symmetric().range())).isTrue();
                assertThat(wider.contains(sampled.shortest().range())).isTrue();
                assertThat(sampled.mean()).isBetween(limits.min(), limits.max());
                assertThat(sampled.runaways()).isZero();
                if (assessment.insideByLimits()) {
                    assertThat(sampled.outside().estimate()).isZero();
                }
                // The interval that holds nearly all trials is seldom half as wide as the limits, never wider.
                assertThat(sampled.symmetric().range().width()).isLessThanOrEqualTo(limits.width() + 2 * slack);
            }
        }
    }
}
