package shuntwright.bench;

import java.util.concurrent.TimeUnit;

import org.openjdk.jmh.annotations.AuxCounters;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;

/**
 * Planning each demo board from nothing: boards per second, and candidates of the catalogue decided upon per second
 * ({@code candidates}), beside the nominal trip currents of the same candidates.
 */
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.SECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class PlanBenchmark {

    /** Counts what a run has got through. */
    @AuxCounters
    @State(Scope.Thread)
    public static class Counted {
        /** Combinations of parts looked at; JMH divides them by the time. */
        public long candidates;

        @Setup(Level.Iteration)
        public void reset() {
            candidates = 0;
        }
    }

    @Benchmark
    public Plan plan(DemoBoard demo, Counted counted) {
        counted.candidates += demo.candidates();
        return new BoardPlanner().plan(demo.board(), demo.catalogue(), Progress.SILENT);
    }

    @Benchmark
    public double baseline(DemoBoard demo, Counted counted) {
        counted.candidates += demo.candidates();
        return Candidates.nominalTrips(demo.board(), demo.catalogue());
    }
}
