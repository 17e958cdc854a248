package shuntwright.bench;

import java.util.Objects;
import java.util.concurrent.TimeUnit;
import java.util.random.RandomGenerator;

import org.jspecify.annotations.Nullable;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

import shuntwright.accuracy.Input;
import shuntwright.accuracy.Layout;
import shuntwright.board.Sampling;
import shuntwright.plan.BoardSampler;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;
import shuntwright.plan.SolvedChannel;
import shuntwright.sampling.ChannelModel;
import shuntwright.sampling.ChannelStudy;
import shuntwright.sampling.Draws;
import shuntwright.sampling.Scratch;

/**
 * Sampling: millions of trials a second of one channel's trip current on one thread ({@code tripOnly}: drawn, evaluated, tails and
 * quantiles found), beside a plain loop over generators of the library ({@code plainLoop}: the same inputs and the same equation,
 * neither quantiles nor tails) and beside as many vector operations as it takes at least ({@code vectorLimit}); then the
 * milliseconds of what people wait for.
 */
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class SamplingBenchmark {
    private static final int TRIALS = 1_000_000;
    private static final int FIRST_PICTURE = 10_000;
    private static final Sampling MILLION = new Sampling(new Sampling.Trials.Fixed(TRIALS), 1);
    private static final int THREADS = 2;

    /** A generator of the library with the loop that uses it. */
    @State(Scope.Benchmark)
    public static class Plain {
        /** Which generator. */
        @Param({"SplittableRandom", "L64X128MixRandom", "Xoshiro256PlusPlus"})
        public String generator = "SplittableRandom";

        private RandomGenerator random = RandomGenerator.of("SplittableRandom");
        private @Nullable PlainTrials trials;

        @Setup
        public void prepare(SampledChannel channel) {
            random = RandomGenerator.of(generator);
            PlainTrials prepared = new PlainTrials(channel.lean(), channel.moving());
            same(channel.lean(), prepared);
            trials = prepared;
        }

        double[] run() {
            return Objects.requireNonNull(trials).run(random, TRIALS);
        }

        /** The loop must do the work it is compared with: same current for the same inputs. */
        private static void same(SolvedChannel lean, PlainTrials trials) {
            ChannelModel model = new ChannelModel(lean.circuit(), lean.around(), lean.demand());
            RandomGenerator random = RandomGenerator.of("SplittableRandom");
            double[][] x = new double[model.inputs()][Draws.BLOCK];
            double[][] y = new double[model.outputs()][Draws.BLOCK];
            for (int trial = 0; trial < Draws.BLOCK; trial++) {
                double[] vector = trials.vector();
                for (Input each : lean.inputs()) {
                    vector[Layout.index(each)] = each.limits().min() + each.limits().width() * random.nextDouble();
                }
                for (int i = 0; i < vector.length; i++) {
                    x[i][trial] = vector[i];
                }
                y[0][trial] = trials.trip(vector);
            }
            double[] plain = y[0].clone();
            model.evaluate(x, Draws.BLOCK, y, new Scratch());
            for (int trial = 0; trial < Draws.BLOCK; trial++) {
                if (!(Math.abs(plain[trial] - y[0][trial]) <= 1e-9 * y[0][trial])) {
                    throw new IllegalStateException("the plain loop says " + plain[trial] + " A, the model "
                            + y[0][trial] + " A");
                }
            }
        }
    }

    @Benchmark
    @BenchmarkMode(Mode.Throughput)
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    @OperationsPerInvocation(TRIALS)
    public ChannelStudy tripOnly(SampledChannel channel) {
        return SampledChannel.sample(channel.lean(), TRIALS);
    }

    @Benchmark
    @BenchmarkMode(Mode.Throughput)
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    @OperationsPerInvocation(TRIALS)
    public double[] plainLoop(Plain plain) {
        return plain.run();
    }

    @Benchmark
    @BenchmarkMode(Mode.Throughput)
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    @OperationsPerInvocation(TRIALS)
    public double vectorLimit(SampledChannel channel) {
        return new VectorLimit().run(channel.moving().size(), TRIALS);
    }

    @Benchmark
    @BenchmarkMode(Mode.Throughput)
    @OutputTimeUnit(TimeUnit.MICROSECONDS)
    @OperationsPerInvocation(TRIALS)
    public ChannelStudy allOutcomes(SampledChannel channel) {
        return SampledChannel.sample(channel.full(), TRIALS);
    }

    @Benchmark
    @BenchmarkMode(Mode.AverageTime)
    @OutputTimeUnit(TimeUnit.MILLISECONDS)
    public ChannelStudy firstPictureOfAChannel(SampledChannel channel) {
        return SampledChannel.sample(channel.full(), FIRST_PICTURE);
    }

    @Benchmark
    @BenchmarkMode(Mode.AverageTime)
    @OutputTimeUnit(TimeUnit.MILLISECONDS)
    public Plan boardOf64(SampledChannel channel) {
        return new BoardSampler(THREADS).sample(channel.plan(), MILLION, BoardSampler.Depth.SKETCH, Progress.SILENT);
    }

    @Benchmark
    @BenchmarkMode(Mode.AverageTime)
    @OutputTimeUnit(TimeUnit.MILLISECONDS)
    public Plan boardOf64WithIndices(SampledChannel channel) {
        return new BoardSampler(THREADS).sample(channel.plan(), MILLION, BoardSampler.Depth.FULL, Progress.SILENT);
    }
}
