package shuntwright.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;

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

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.plan.BoardPlanner;
import shuntwright.plan.Plan;
import shuntwright.plan.Progress;

/**
 * Planning again after one channel's load current was edited: with the planner that planned the board before, beside a
 * new planner and beside the nominal trip currents of one channel's candidates. Every edit is to a new value, so that no
 * answer is at hand.
 */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(1)
public class OneEditBenchmark {

    /** A board that is edited again and again. */
    @State(Scope.Thread)
    public static class Edited {
        private final BoardPlanner planner = new BoardPlanner();
        private int edits;

        @Setup(Level.Trial)
        public void planOnce(DemoBoard demo) {
            planner.plan(demo.board(), demo.catalogue(), Progress.SILENT);
        }

        /** The board with the first channel's load current a millionth smaller for every edit so far. */
        private Board edit(Board board) {
            edits++;
            List<Channel> channels = new ArrayList<>(board.channels());
            Channel first = channels.getFirst();
            Channel.Currents currents = first.currents();
            double load = currents.load().orElseThrow() * (1 - edits * 1e-6);
            channels.set(0, first.withCurrents(new Channel.Currents(OptionalDouble.of(load), currents.noTrip(),
                    currents.mustTrip(), currents.tripTarget(), currents.least(), currents.fullScale())));
            return board.withChannels(channels);
        }
    }

    @Benchmark
    public Plan samePlanner(DemoBoard demo, Edited edited) {
        return edited.planner.plan(edited.edit(demo.board()), demo.catalogue(), Progress.SILENT);
    }

    @Benchmark
    public Plan newPlanner(DemoBoard demo, Edited edited) {
        return new BoardPlanner().plan(edited.edit(demo.board()), demo.catalogue(), Progress.SILENT);
    }

    @Benchmark
    public double baseline(DemoBoard demo) {
        return Candidates.nominalTrips(demo.board().withChannels(demo.board().channels().subList(0, 1)),
                demo.catalogue());
    }
}
