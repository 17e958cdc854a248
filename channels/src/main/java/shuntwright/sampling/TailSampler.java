package shuntwright.sampling;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import shuntwright.quantity.Range;

/**
 * Rare events by importance sampling: trials are drawn where the output is far out, each with the weight that makes the estimate
 * unbiased. Each input's density f is tilted to f(x)·exp(t·x − K(t)), K the logarithm of its moment generating function, with t
 * along the output's gradient (exponential tilting: J. S. Sadowsky, J. A. Bucklew, IEEE Trans. Inf. Theory 36, 1990). Where effects
 * multiply each other there is more than one way out, so several tilts, found from different starting points, and the plain
 * density are mixed, and a trial's weight is that of the mixture (A. Owen, Y. Zhou, J. Am. Stat. Assoc. 95, 2000).
 */
final class TailSampler {

    private static final int BLOCKS = 16;
    private static final int ROUNDS = 6;
    private static final double Z = 1.959963984540054;
    /** First stream of the counter that tails use; the others belong to plain trials and effect indices. */
    private static final int STREAM = 16;

    private final Model model;
    private final Columns columns;
    private final Tilt[] tilts;
    private final Draws draws = new Draws();
    private final Scratch scratch = new Scratch();
    private final double[][] x;
    private final double[][] y;
    private final double[][] uniform;
    private final long[] keys;
    private final long[] seconds;
    private final long choice;

    TailSampler(Model model, List<Variable> variables, long seed) {
        this.model = model;
        this.columns = new Columns(variables, seed);
        this.tilts = variables.stream().map(Tilt::of).toArray(Tilt[]::new);
        this.x = columns.allocate();
        for (int i = 0; i < x.length; i++) {
            x[i] = x[i].clone();
        }
        this.y = new double[model.outputs()][Draws.BLOCK];
        this.uniform = new double[3][Draws.BLOCK];
        this.keys = variables.stream().mapToLong(each -> Draws.key(seed, "tail of " + each.key())).toArray();
        this.seconds = variables.stream().mapToLong(each -> Draws.key(seed, "second tail of " + each.key())).toArray();
        this.choice = Draws.key(seed, "choice of tail");
    }

    /** A number with its standard error. */
    record Estimate(double value, double standardError) {}

    /** Probability of an output outside a range; empty where no way out was found. */
    Optional<Probability> outside(int output, Range allowed) {
        List<double[]> ways = new ArrayList<>();
        ways.addAll(ways(output, allowed.min(), false));
        ways.addAll(ways(output, allowed.max(), true));
        if (ways.isEmpty()) {
            return Optional.empty();
        }
        double sum = 0;
        double squares = 0;
        long n = 0;
        for (int block = 0; block < BLOCKS; block++) {
            double[] weights = draw(ways, block, STREAM);
            for (int j = 0; j < Draws.BLOCK; j++) {
                double value = y[output][j];
                double w = value >= allowed.min() && value <= allowed.max() ? 0 : weights[j];
                sum += w;
                squares += w * w;
                n++;
            }
        }
        double p = sum / n;
        double error = Math.sqrt(Math.max(0, squares / n - p * p) / (n - 1));
        if (!(p > 0)) {
            return Optional.empty();
        }
        // On a logarithmic scale, so that it never reaches 0.
        double factor = Math.exp(Z * error / p);
        double least = p / factor;
        double most = Math.min(1, p * factor);
        return Optional.of(new Probability(p, Range.of(least, most),
                error, Probability.Method.WEIGHTED, n));
    }

    /**
     * The value beyond which an output lies with a small probability.
     *
     * @param tail  probability beyond it
     * @param guess about where
     * @param upper true for the upper tail
     */
    Optional<Estimate> quantile(int output, double tail, double guess, boolean upper) {
        Optional<Estimate> found = Optional.empty();
        double at = guess;
        for (int round = 0; round < 3; round++) {
            Optional<Estimate> next = quantileNear(output, tail, at, upper, STREAM + 1 + round);
            if (next.isEmpty()) {
                return found;
            }
            found = next;
            at = next.get().value();
        }
        return found;
    }

    private Optional<Estimate> quantileNear(int output, double tail, double target, boolean upper, int stream) {
        List<double[]> ways = ways(output, target, upper);
        for (double share = 0.9; ways.isEmpty() && share > 0.3; share -= 0.1) {
            // The bounded inputs do not reach that far: aim nearer.
            ways = ways(output, middle(output) + share * (target - middle(output)), upper);
        }
        if (ways.isEmpty()) {
            return Optional.empty();
        }
        double[] values = new double[BLOCKS * Draws.BLOCK];
        double[] weights = new double[values.length];
        double[] parts = new double[BLOCKS];
        for (int block = 0; block < BLOCKS; block++) {
            int from = block * Draws.BLOCK;
            System.arraycopy(draw(ways, block, stream), 0, weights, from, Draws.BLOCK);
            for (int j = 0; j < Draws.BLOCK; j++) {
                values[from + j] = Double.isFinite(y[output][j]) ? y[output][j] : Tally.NO_VALUE;
            }
            parts[block] = beyond(values, weights, from, from + Draws.BLOCK, tail, upper);
        }
        double value = beyond(values, weights, 0, values.length, tail, upper);
        double squares = 0;
        for (double part : parts) {
            squares += (part - value) * (part - value);
        }
        return Optional.of(new Estimate(value, Math.sqrt(squares / (BLOCKS - 1.0) / BLOCKS)));
    }

    /** The value beyond which the weights of trials {@code from} to before {@code to} add up to a share of them. */
    private static double beyond(double[] values, double[] weights, int from, int to, double tail, boolean upper) {
        double[] away = new double[to - from];
        for (int i = 0; i < away.length; i++) {
            away[i] = upper ? -values[from + i] : values[from + i];
        }
        double found = WeightedRank.value(away, Arrays.copyOfRange(weights, from, to), tail * away.length);
        return upper ? -found : found;
    }

    private double middle(int output) {
        double[] start = new double[tilts.length];
        for (int i = 0; i < start.length; i++) {
            start[i] = tilts[i].mid();
        }
        set(0, start);
        model.evaluate(x, 1, y, scratch);
        return y[output][0];
    }

    /** Tilts that bring the middle of the output to a bound, one for each way out. */
    private List<double[]> ways(int output, double bound, boolean upper) {
        List<double[]> ways = new ArrayList<>();
        double middle = middle(output);
        if (!Double.isFinite(middle) || (upper ? middle >= bound : middle <= bound)) {
            return ways;
        }
        for (double[] start : starts()) {
            way(output, bound, upper, start).filter(found -> ways.stream().noneMatch(known -> alike(known, found)))
                    .ifPresent(ways::add);
        }
        return ways;
    }

    /** No tilt, and each input with a wide effect on others tilted to both its sides: where products have their ways out. */
    private List<double[]> starts() {
        List<double[]> starts = new ArrayList<>();
        starts.add(new double[tilts.length]);
        for (int i : model.multiplying()) {
            for (int side = -1; side <= 1; side += 2) {
                double[] start = new double[tilts.length];
                start[i] = tilts[i].towards(side);
                if (start[i] != 0) {
                    starts.add(start);
                }
            }
        }
        return starts;
    }

    private static boolean alike(double[] a, double[] b) {
        double difference = 0;
        double size = 0;
        for (int i = 0; i < a.length; i++) {
            difference += Math.abs(a[i] - b[i]);
            size += Math.abs(a[i]) + Math.abs(b[i]);
        }
        return difference <= 0.05 * size;
    }

    /**
     * Follows the gradient: tilt along it until the output at the tilted means meets the bound, then look at it again there. What
     * the start tilts stays so the first time, as what it multiplies has no effect before, and it has none before that is tilted;
     * the bound may then be out of reach yet.
     */
    private Optional<double[]> way(int output, double bound, boolean upper, double[] start) {
        double[] fixed = start;
        double[] tilt = start.clone();
        for (int round = 0; round < ROUNDS; round++) {
            double[] gradient = gradient(output, means(tilt));
            double strength = strength(output, bound, upper, gradient, fixed, round == 0);
            if (!(strength > 0)) {
                return Optional.empty();
            }
            for (int i = 0; i < tilts.length; i++) {
                tilt[i] = tilts[i].bounded(fixed[i] + (upper ? strength : -strength) * gradient[i]);
            }
            fixed = new double[tilts.length];
        }
        return Optional.of(tilt);
    }

    private double[] means(double[] tilt) {
        double[] means = new double[tilts.length];
        for (int i = 0; i < means.length; i++) {
            means[i] = tilts[i].mean(tilt[i]);
        }
        return means;
    }

    /** By central differences, all inputs in one evaluation or several. */
    private double[] gradient(int output, double[] at) {
        double[] gradient = new double[tilts.length];
        int per = Draws.BLOCK / 2;
        for (int from = 0; from < tilts.length; from += per) {
            int to = Math.min(tilts.length, from + per);
            for (int i = from; i < to; i++) {
                double step = 0.05 * tilts[i].half();
                set(2 * (i - from), at);
                set(2 * (i - from) + 1, at);
                x[i][2 * (i - from)] -= step;
                x[i][2 * (i - from) + 1] += step;
            }
            model.evaluate(x, 2 * (to - from), y, scratch);
            for (int i = from; i < to; i++) {
                double step = 0.1 * tilts[i].half();
                double change = y[output][2 * (i - from) + 1] - y[output][2 * (i - from)];
                gradient[i] = step > 0 && Double.isFinite(change) ? change / step : 0;
            }
        }
        return gradient;
    }

    private void set(int trial, double[] values) {
        for (int i = 0; i < values.length; i++) {
            x[i][trial] = values[i];
        }
    }

    /**
     * Factor of the gradient at which the tilted means bring the output to the bound; where none does a large one if that is
     * good enough to begin with, else 0.
     */
    private double strength(int output, double bound, boolean upper, double[] gradient, double[] fixed,
            boolean mayMiss) {
        double spread = 0;
        for (int i = 0; i < gradient.length; i++) {
            spread += square(gradient[i] * tilts[i].standard());
        }
        if (!(spread > 0)) {
            return 0;
        }
        double unit = 1 / Math.sqrt(spread);
        double low = 0;
        double high = unit;
        int doublings = 0;
        while (!reaches(output, bound, upper, gradient, fixed, high)) {
            low = high;
            high *= 2;
            if (++doublings > 12) {
                return mayMiss ? high : 0;
            }
        }
        for (int i = 0; i < 30; i++) {
            double middle = (low + high) / 2;
            if (reaches(output, bound, upper, gradient, fixed, middle)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private boolean reaches(int output, double bound, boolean upper, double[] gradient, double[] fixed,
            double strength) {
        for (int i = 0; i < tilts.length; i++) {
            x[i][0] = tilts[i].mean(tilts[i].bounded(fixed[i] + (upper ? strength : -strength) * gradient[i]));
        }
        model.evaluate(x, 1, y, scratch);
        double value = y[output][0];
        return !Double.isFinite(value) || (upper ? value >= bound : value <= bound);
    }

    private static double square(double value) {
        return value * value;
    }

    /** Draws a block of the mixture, evaluates it into y and gives each trial's weight. */
    private double[] draw(List<double[]> ways, int block, int stream) {
        double[] which = uniform[1];
        draws.uniform(choice, block, stream, 0, 1, which);
        columns.draw(block, stream, draws, scratch, x);
        int parts = ways.size() + 1;
        double[][] exponents = new double[parts][Draws.BLOCK];
        for (int i = 0; i < tilts.length; i++) {
            if (tilts[i].fixed()) {
                continue;
            }
            draws.uniform(keys[i], block, stream, 0, 1, uniform[0]);
            if (tilts[i].takesTwo()) {
                draws.uniform(seconds[i], block, stream, 0, 1, uniform[2]);
            }
            for (int j = 0; j < Draws.BLOCK; j++) {
                int part = (int) (which[j] * parts);
                if (part > 0) {
                    x[i][j] = tilts[i].draw(ways.get(part - 1)[i], uniform[0][j], uniform[2][j]);
                }
            }
            for (int part = 1; part < parts; part++) {
                double t = ways.get(part - 1)[i];
                double k = tilts[i].logMoment(t);
                if (t != 0) {
                    for (int j = 0; j < Draws.BLOCK; j++) {
                        exponents[part][j] += t * (x[i][j] - tilts[i].mid()) - k;
                    }
                }
            }
        }
        model.evaluate(x, Draws.BLOCK, y, scratch);
        double[] weights = new double[Draws.BLOCK];
        for (int j = 0; j < Draws.BLOCK; j++) {
            double density = 0;
            for (double[] exponent : exponents) {
                density += Math.exp(exponent[j]) / parts;
            }
            weights[j] = 1 / density;
        }
        return weights;
    }
}
