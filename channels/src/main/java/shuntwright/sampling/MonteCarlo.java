package shuntwright.sampling;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import shuntwright.board.Sampling;
import shuntwright.quantity.Range;

/**
 * Propagation of distributions by the Monte Carlo method (JCGM 101:2008, clause 7). The trials of a model are drawn block by block;
 * each draw depends on seed, variable and number of the trial only, so the answer does too.
 */
public final class MonteCarlo {

    /** Trials of which the outside ones are remembered, to be put together with those of other channels. */
    static final int REMEMBERED = 1 << 22;
    /** Digits of the standard uncertainty by which combined uncertainty is validated, unless adaptive trials name others. */
    static final int DIGITS = 2;

    private static final int PILOT_BLOCKS = 8;
    /** Parts of the trials from whose scatter the error of the shortest interval is taken. */
    private static final int PARTS = 10;
    /** With fewer trials beyond an end or a bound than this, weighted trials say more. */
    private static final int FEW = 100;
    /** Trials of the longest sequence that is kept whole, to be looked at for stability. */
    private static final int LONGEST = 1 << 22;
    /** A first picture of fewer trials than this does without weighted ones. */
    private static final int ENOUGH = 100_000;

    private final Model model;
    private final Columns columns;
    private final List<Variable> variables;
    private final List<Range> allowed;
    private final double coverage;
    private final Sampling sampling;
    private final Watch watch;
    private final Draws draws = new Draws();
    private final Scratch scratch = new Scratch();
    private final double[][] x;
    private final double[][] y;
    private final OutsideTrials outside;
    /** Outputs of the first blocks, which are looked at before they are counted. */
    private final List<double[][]> pilot = new ArrayList<>();
    private final List<List<Range>> shortestOfParts = new ArrayList<>();
    private long trials;

    private MonteCarlo(Model model, List<Variable> variables, List<Range> allowed, double coverage, Sampling sampling,
            Watch watch) {
        if (model.inputs() != variables.size() || model.outputs() != allowed.size()) {
            throw new IllegalArgumentException("a model of " + model.inputs() + " inputs and " + model.outputs()
                    + " outputs got " + variables.size() + " variables and " + allowed.size() + " allowed ranges");
        }
        this.model = model;
        this.variables = variables;
        this.columns = new Columns(variables, sampling.seed());
        this.allowed = allowed;
        this.coverage = coverage;
        this.sampling = sampling;
        this.watch = watch;
        this.x = columns.allocate();
        this.y = new double[model.outputs()][Draws.BLOCK];
        this.outside = new OutsideTrials(allowed, Math.min(REMEMBERED, sampling.trials().atMost()));
    }

    /** Thrown out of a run that its {@link Watch} cancelled. */
    public static final class Cancelled extends RuntimeException {
        private static final long serialVersionUID = 1;
    }

    /**
     * What a run says.
     *
     * @param settled false when adaptive trials ended at their most before the results were stable
     * @param outputs of the model, in its order
     * @param outside probability that any output is outside what is allowed
     */
    public record Run(boolean settled, List<Sampled> outputs, Probability outside) {
        public Run {
            outputs = List.copyOf(outputs);
        }
    }

    /** A run with the trials that were outside. */
    record Remembered(Run run, OutsideTrials outside) {}

    /**
     * Samples a model.
     *
     * @param variables one for each input of the model
     * @param allowed   one for each output
     * @param coverage  coverage probability, above 0 to below 1
     * @throws Cancelled when the watch says so
     */
    public static Run run(Model model, List<Variable> variables, List<Range> allowed, double coverage,
            Sampling sampling, Watch watch) {
        return remembered(model, variables, allowed, coverage, sampling, watch).run();
    }

    /** The same, with the trials that were outside. */
    static Remembered remembered(Model model, List<Variable> variables, List<Range> allowed, double coverage,
            Sampling sampling, Watch watch) {
        MonteCarlo monteCarlo = new MonteCarlo(model, variables, allowed, coverage, sampling, watch);
        return new Remembered(monteCarlo.run(), monteCarlo.outside);
    }

    /** Only the trials that are outside. */
    static OutsideTrials outside(Model model, List<Variable> variables, List<Range> allowed, int trials, long seed,
            Watch watch) {
        MonteCarlo monteCarlo = new MonteCarlo(model, variables, allowed, 0.5,
                new Sampling(new Sampling.Trials.Fixed(Math.max(Sampling.LEAST, trials)), seed), watch);
        monteCarlo.count(0, trials, List.of());
        return monteCarlo.outside;
    }

    /**
     * Only the probabilistically symmetric coverage intervals, by plain trials; empty as soon as so many trials are beyond a bound
     * that the interval of an output in question cannot be within what is allowed.
     *
     * @param inQuestion outputs whose intervals decide
     */
    static Optional<List<CoverageInterval>> intervals(Model model, List<Variable> variables, List<Range> allowed,
            double coverage, Sampling sampling, List<Integer> inQuestion) {
        MonteCarlo monteCarlo = new MonteCarlo(model, variables, allowed, coverage, sampling, Watch.NONE);
        int total = sampling.trials().atMost();
        // One more than beyond the end, for what reading a rank from a cell may be off.
        double most = (1 - coverage) / 2 * total + 1;
        long[] below = new long[allowed.size()];
        long[] above = new long[allowed.size()];
        for (int block = 0; block < PILOT_BLOCKS && block * Draws.BLOCK < total; block++) {
            monteCarlo.pilot(block);
            if (monteCarlo.beyond(inQuestion, Math.min(Draws.BLOCK, total - block * Draws.BLOCK), most, below, above)) {
                return Optional.empty();
            }
        }
        List<Tally> tallies = monteCarlo.tallies();
        for (int at = 0; at < total; at += Draws.BLOCK) {
            int count = Math.min(Draws.BLOCK, total - at);
            monteCarlo.count(at, at + count, tallies);
            if (at / Draws.BLOCK >= PILOT_BLOCKS && monteCarlo.beyond(inQuestion, count, most, below, above)) {
                return Optional.empty();
            }
        }
        return Optional.of(tallies.stream().map(each -> each.symmetric(coverage)).toList());
    }

    /** Counts the block's trials beyond either bound; true when there are too many. */
    private boolean beyond(List<Integer> inQuestion, int count, double most, long[] below, long[] above) {
        for (int i : inQuestion) {
            double low = allowed.get(i).min();
            double high = allowed.get(i).max();
            for (int j = 0; j < count; j++) {
                below[i] += y[i][j] < low ? 1 : 0;
                // Without a value it is above all others.
                above[i] += y[i][j] <= high ? 0 : 1;
            }
            if (below[i] > most || above[i] > most) {
                return true;
            }
        }
        return false;
    }

    private Run run() {
        List<Tally> whole = tallies();
        boolean settled = switch (sampling.trials()) {
            case Sampling.Trials.Fixed(int count) -> {
                fixed(count, whole);
                yield true;
            }
            case Sampling.Trials.Adaptive(int digits, int most) -> adaptive(digits, most, whole);
        };
        TailSampler tails = new TailSampler(model, variables, sampling.seed());
        List<Sampled> outputs = new ArrayList<>();
        for (int i = 0; i < whole.size(); i++) {
            stopped();
            outputs.add(sampled(i, whole.get(i), tails));
        }
        return new Run(settled, outputs, any(outputs));
    }

    /** At least the largest single one, at most their sum; counted unless too few were. */
    private Probability any(List<Sampled> outputs) {
        Probability counted = Binomial.of(outside.any(), trials);
        if (outside.any() >= FEW || outputs.stream().noneMatch(
                each -> each.outside().method() == Probability.Method.WEIGHTED)) {
            return counted;
        }
        double sum = 0;
        double least = 0;
        double most = 0;
        double variance = 0;
        for (Sampled each : outputs) {
            sum += each.outside().estimate();
            least = Math.max(least, each.outside().interval().min());
            most += each.outside().interval().max();
            variance += each.outside().standardError() * each.outside().standardError();
        }
        return new Probability(Math.min(1, sum), Range.of(least, Math.min(1, most)), Math.sqrt(variance),
                Probability.Method.WEIGHTED, trials);
    }

    /** One for each output, with cells that suit what a few trials say. */
    private List<Tally> tallies() {
        double[] sum = new double[model.outputs()];
        double[] squares = new double[model.outputs()];
        long[] values = new long[model.outputs()];
        double[] origin = new double[model.outputs()];
        for (int block = 0; block < PILOT_BLOCKS; block++) {
            pilot(block);
            for (int i = 0; i < y.length; i++) {
                for (double value : y[i]) {
                    if (Double.isFinite(value)) {
                        origin[i] = values[i] == 0 ? value : origin[i];
                        double away = value - origin[i];
                        values[i]++;
                        sum[i] += away;
                        squares[i] += away * away;
                    }
                }
            }
        }
        List<Tally> tallies = new ArrayList<>();
        for (int i = 0; i < y.length; i++) {
            double mean = values[i] == 0 ? 0 : sum[i] / values[i];
            double variance = values[i] == 0 ? 0 : squares[i] / values[i] - mean * mean;
            tallies.add(new Tally(origin[i] + mean, Math.sqrt(Math.max(0, variance))));
        }
        return tallies;
    }

    /** Evaluates one of the first blocks and remembers it. */
    private void pilot(int block) {
        evaluate(block, Draws.BLOCK);
        if (block == pilot.size()) {
            pilot.add(Arrays.stream(y).map(double[]::clone).toArray(double[][]::new));
        }
    }

    private void evaluate(int block, int count) {
        if (block < pilot.size()) {
            double[][] known = pilot.get(block);
            for (int i = 0; i < y.length; i++) {
                System.arraycopy(known[i], 0, y[i], 0, count);
            }
            return;
        }
        columns.draw(block, 0, draws, scratch, x);
        model.evaluate(x, count, y, scratch);
    }

    private void stopped() {
        if (watch.cancelled()) {
            throw new Cancelled();
        }
    }

    /** Trials {@code from} to before {@code to}, whole blocks but the last. */
    private void count(int from, int to, List<Tally> tallies) {
        for (int at = from; at < to; at += Draws.BLOCK) {
            stopped();
            int count = Math.min(Draws.BLOCK, to - at);
            evaluate(at / Draws.BLOCK, count);
            for (int i = 0; i < tallies.size(); i++) {
                tallies.get(i).add(y[i], count);
            }
            outside.add(y, count);
            trials += count;
            watch.done(count);
        }
    }

    private void fixed(int total, List<Tally> whole) {
        int blocks = (total + Draws.BLOCK - 1) / Draws.BLOCK;
        int from = 0;
        for (int part = 1; part <= PARTS; part++) {
            int to = Math.min(total, (int) ((long) blocks * part / PARTS) * Draws.BLOCK);
            part(from, to, whole);
            from = to;
        }
    }

    private void part(int from, int to, List<Tally> whole) {
        if (to == from) {
            return;
        }
        List<Tally> some = whole.stream().map(Tally::another).toList();
        count(from, to, some);
        take(some, whole);
    }

    /** Adds a part of the trials to the whole, and remembers its shortest intervals. */
    private void take(List<Tally> part, List<Tally> whole) {
        shortestOfParts.add(part.stream().map(each -> each.shortest(coverage)).toList());
        for (int i = 0; i < part.size(); i++) {
            whole.get(i).add(part.get(i));
        }
    }

    private boolean adaptive(int digits, int most, List<Tally> whole) {
        long wanted = Stability.sequence(coverage);
        if (wanted > LONGEST || 2 * wanted > most) {
            // Stable after two sequences at the earliest: as many as may be, and nothing is said of stability.
            fixed(most, whole);
            return false;
        }
        int sequence = (int) ((wanted + Draws.BLOCK - 1) / Draws.BLOCK) * Draws.BLOCK;
        List<Stability> stabilities = new ArrayList<>();
        whole.forEach(_ -> stabilities.add(new Stability(coverage, digits)));
        boolean stable = false;
        for (int from = 0; !stable && from + sequence <= most; from += sequence) {
            double[][] values = new double[y.length][sequence];
            List<Tally> some = whole.stream().map(Tally::another).toList();
            int[] kept = new int[y.length];
            for (int at = from; at < from + sequence; at += Draws.BLOCK) {
                count(at, at + Draws.BLOCK, some);
                for (int i = 0; i < y.length; i++) {
                    for (double value : y[i]) {
                        if (Double.isFinite(value)) {
                            values[i][kept[i]++] = value;
                        }
                    }
                }
            }
            take(some, whole);
            stable = true;
            for (int i = 0; i < y.length; i++) {
                if (kept[i] > 1) {
                    stabilities.get(i).add(Arrays.copyOf(values[i], kept[i]));
                    stable &= stabilities.get(i).stable(whole.get(i).standard());
                }
            }
        }
        return stable;
    }

    private Sampled sampled(int output, Tally tally, TailSampler tails) {
        return new Sampled(tally.trials(), tally.runaways(), Tally.finite(tally.mean()), tally.standard(),
                symmetric(output, tally, tails), shortest(output, tally), probability(output, tally, tails),
                tally.histogram());
    }

    private CoverageInterval symmetric(int output, Tally tally, TailSampler tails) {
        CoverageInterval plain = tally.symmetric(coverage);
        double tail = (1 - coverage) / 2;
        if (tail * tally.trials() >= FEW || tally.trials() < ENOUGH || tally.runaways() > 0 || tally.standard() == 0) {
            return plain;
        }
        double reach = Normal.quantile(1 - tail) * tally.standard();
        var low = tails.quantile(output, tail, tally.mean() - reach, false);
        var high = tails.quantile(output, tail, tally.mean() + reach, true);
        double from = low.isPresent() ? low.get().value() : plain.range().min();
        double to = high.isPresent() ? high.get().value() : plain.range().max();
        return new CoverageInterval(Range.of(from, Math.max(from, to)), new CoverageInterval.Ends(
                low.isPresent() ? low.get().standardError() : plain.standardErrors().low(),
                high.isPresent() ? high.get().standardError() : plain.standardErrors().high()));
    }

    /** The scatter of the parts, which falls with the cube root of their number. */
    private CoverageInterval shortest(int output, Tally tally) {
        Range range = tally.shortest(coverage);
        int parts = shortestOfParts.size();
        double low = 0;
        double high = 0;
        for (List<Range> each : shortestOfParts) {
            low += square(each.get(output).min() - range.min()) / parts;
            high += square(each.get(output).max() - range.max()) / parts;
        }
        double share = Math.cbrt(parts);
        return new CoverageInterval(range,
                new CoverageInterval.Ends(Math.sqrt(low) / share, Math.sqrt(high) / share));
    }

    private static double square(double value) {
        return value * value;
    }

    private Probability probability(int output, Tally tally, TailSampler tails) {
        Probability counted = Binomial.of(outside.of(output), tally.trials());
        if (outside.of(output) >= FEW || tally.trials() < ENOUGH || tally.standard() == 0 || tally.runaways() > 0) {
            return counted;
        }
        return tails.outside(output, allowed.get(output))
                .filter(weighted -> weighted.standardError() < weighted.estimate() / 3)
                .filter(weighted -> weighted.interval().width() < counted.interval().width())
                .orElse(counted);
    }
}
