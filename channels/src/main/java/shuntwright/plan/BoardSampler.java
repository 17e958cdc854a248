package shuntwright.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Supplier;

import shuntwright.accuracy.Assessment;
import shuntwright.board.Demand;
import shuntwright.board.Sampling;
import shuntwright.circuit.SenseCircuit;
import shuntwright.circuit.Surroundings;
import shuntwright.sampling.BoardStudy;
import shuntwright.sampling.BoardYield;
import shuntwright.sampling.ChannelSampler;
import shuntwright.sampling.MonteCarlo;
import shuntwright.sampling.Watch;
import shuntwright.sampling.YieldSampler;

/**
 * Samples planned boards. Keeps what it sampled of each channel, also when it is cancelled before the others are done, so that
 * sampling again after an edit samples only what the edit touched; the full answer is the same as a new sampler's, and a first
 * picture has the channels that were sampled better before as they were. Not safe for use by several threads at once.
 */
public final class BoardSampler {

    /** Kept results for each channel of the board; beyond this many all are forgotten. */
    private static final int MOST_KEPT = 6;

    private final int threads;
    private final Map<Key, ChannelSampler.Result> kept = new ConcurrentHashMap<>();
    private final Map<Key, ChannelSampler.Result> withEffects = new ConcurrentHashMap<>();
    /** Of the most trials, whatever their number was to be. */
    private final Map<Key.Subject, ChannelSampler.Result> best = new ConcurrentHashMap<>();

    /** Everything a channel's distributions depend on. */
    private record Key(Subject subject, Sampling sampling) {
        /** The same without the number of trials. */
        private record Subject(Demand demand, SenseCircuit circuit, Surroundings around, double coverage, long seed) {}
    }

    /** How much is worked out. */
    public enum Depth {
        /** Distributions and yield: a first picture. Channels that were sampled before with more trials keep those. */
        SKETCH,
        /** Also effect indices and what shared inputs cost. */
        FULL
    }

    /** @param threads that share the work, ≥ 1; their number does not change the answer */
    public BoardSampler(int threads) {
        if (threads < 1) {
            throw new IllegalArgumentException("at least one thread is needed, got " + threads);
        }
        this.threads = threads;
    }

    /**
     * The plan with the propagated distributions of all its circuits, and verdicts that rest on them.
     *
     * @throws BoardPlanner.Cancelled when progress says so
     */
    public Plan sample(Plan plan, Sampling sampling, Depth depth, Progress progress) {
        forgetOld(plan.channels().size());
        double coverage = plan.board().acceptance().coverage();
        List<SolvedChannel> solved = plan.channels().stream().flatMap(each -> each.solved().stream()).toList();
        Counter counter = new Counter(progress, sampling, solved.size());
        // A thread pool by name, closed when done: an interrupted caller must not leave workers behind.
        try (ExecutorService pool = Executors.newFixedThreadPool(threads,
                Thread.ofPlatform().daemon().name("sampling ", 1).factory())) {
            List<ChannelSampler> samplers = all(pool, solved.stream()
                    .<Supplier<ChannelSampler>>map(each -> () -> ChannelSampler.of(each.circuit(), each.around(),
                            each.demand()))
                    .toList());
            List<Supplier<ChannelSampler.Result>> work = new ArrayList<>();
            for (int i = 0; i < solved.size(); i++) {
                SolvedChannel each = solved.get(i);
                ChannelSampler sampler = samplers.get(i);
                Key key = new Key(new Key.Subject(each.demand(), each.circuit(), each.around(), coverage,
                        sampling.seed()), sampling);
                work.add(() -> {
                    ChannelSampler.Result result = known(key, depth)
                            .orElseGet(() -> result(each, sampler, key, depth, counter));
                    counter.channelDone();
                    return result;
                });
            }
            List<ChannelSampler.Result> results = all(pool, work);
            BoardYield together = together(pool, solved, samplers, results, sampling, depth, counter);
            return Studied.with(plan, new BoardStudy(sampling,
                    results.stream().map(ChannelSampler.Result::study).toList(), together));
        } catch (MonteCarlo.Cancelled e) {
            throw new BoardPlanner.Cancelled(e);
        }
    }

    private void forgetOld(int channels) {
        int most = MOST_KEPT * Math.max(10, channels);
        if (kept.size() > most || withEffects.size() > most) {
            kept.clear();
            withEffects.clear();
            best.clear();
        }
    }

    /** What needs no work. */
    private Optional<ChannelSampler.Result> known(Key key, Depth depth) {
        ChannelSampler.Result complete = withEffects.get(key);
        if (complete != null || depth == Depth.FULL) {
            return Optional.ofNullable(complete);
        }
        return Optional.ofNullable(kept.get(key)).or(() -> Optional.ofNullable(best.get(key.subject()))
                .filter(each -> each.study().trials() >= key.sampling().trials().atMost()));
    }

    private void keep(Map<Key, ChannelSampler.Result> where, Key key, ChannelSampler.Result result) {
        where.put(key, result);
        best.merge(key.subject(), result,
                (former, now) -> now.study().trials() >= former.study().trials() ? now : former);
    }

    private ChannelSampler.Result result(SolvedChannel solved, ChannelSampler sampler, Key key, Depth depth,
            Watch watch) {
        ChannelSampler.Result result = kept.get(key);
        if (result == null) {
            result = sampler.sample(solved.assessments(), key.subject().coverage(), key.sampling(), watch);
            keep(kept, key, result);
        }
        if (depth == Depth.FULL) {
            result = sampler.withEffects(result, key.sampling().seed(), watch);
            keep(withEffects, key, result);
        }
        return result;
    }

    private static BoardYield together(ExecutorService pool, List<SolvedChannel> solved, List<ChannelSampler> samplers,
            List<ChannelSampler.Result> results, Sampling sampling, Depth depth, Counter counter) {
        List<YieldSampler.Part> parts = new ArrayList<>();
        for (int i = 0; i < results.size(); i++) {
            SolvedChannel each = solved.get(i);
            boolean certain = each.assessments().stream().allMatch(Assessment::insideByLimits)
                    && each.inputs().stream().allMatch(input -> input.distribution().bounded());
            parts.add(new YieldSampler.Part(samplers.get(i), results.get(i), !certain));
        }
        BoardYield plain = YieldSampler.of(parts);
        if (depth == Depth.SKETCH) {
            return plain;
        }
        List<Supplier<BoardYield.SharedCost>> costs = YieldSampler.costs(parts, sampling.seed(), counter);
        return YieldSampler.withCosts(plain, all(pool, costs));
    }

    /** Runs all, in their order; the first failure ends it. */
    private static <T> List<T> all(ExecutorService pool, List<Supplier<T>> work) {
        List<Future<T>> futures = work.stream().map(each -> pool.submit(each::get)).toList();
        try {
            List<T> results = new ArrayList<>();
            for (Future<T> each : futures) {
                results.add(each.get());
            }
            return results;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new BoardPlanner.Cancelled(e);
        } catch (ExecutionException e) {
            if (e.getCause() instanceof MonteCarlo.Cancelled cancelled) {
                throw cancelled;
            }
            if (e.getCause() instanceof RuntimeException failure) {
                throw failure;
            }
            throw new IllegalStateException("sampling failed", e);
        } finally {
            futures.forEach(each -> each.cancel(false));
        }
    }

    /** Tells the progress of all channels together, one report at a time. */
    private static final class Counter implements Watch {
        private static final int THOUSAND = 1_000;

        private final Progress progress;
        private final long total;
        private final long perChannel;
        private long done;
        private long channels;

        Counter(Progress progress, Sampling sampling, int channels) {
            this.progress = progress;
            this.perChannel = sampling.trials().atMost();
            this.total = perChannel * channels;
        }

        @Override
        public boolean cancelled() {
            return Thread.currentThread().isInterrupted() || progress.cancelled();
        }

        @Override
        public synchronized void done(long trials) {
            long before = done / (100 * THOUSAND);
            done += trials;
            if (done / (100 * THOUSAND) != before) {
                report();
            }
        }

        synchronized void channelDone() {
            channels++;
            done = Math.max(done, channels * perChannel);
            report();
        }

        private void report() {
            progress.reached("sampling, thousands of trials", (int) Math.min(done / THOUSAND, total / THOUSAND),
                    (int) Math.min(Integer.MAX_VALUE, total / THOUSAND));
        }
    }
}
