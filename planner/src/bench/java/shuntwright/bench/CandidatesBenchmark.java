package shuntwright.bench;

import java.util.concurrent.TimeUnit;

import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Warmup;

import shuntwright.choice.ChannelPicker;
import shuntwright.plan.BoardPlanner;

/**
 * Only the search for candidates of all channels: every shunt, number in parallel and amplifier, with all limits and the
 * extremes of every error; beside the nominal trip current of each of the same combinations.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class CandidatesBenchmark {

    @Benchmark
    public ChannelPicker.Count search(DemoBoard demo) {
        return BoardPlanner.candidates(demo.board(), demo.catalogue());
    }

    @Benchmark
    public double baseline(DemoBoard demo) {
        return Candidates.nominalTripsOfPairs(demo.board(), demo.catalogue());
    }
}
