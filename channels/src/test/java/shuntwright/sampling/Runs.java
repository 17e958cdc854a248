package shuntwright.sampling;

import java.util.List;
import java.util.function.Function;
import java.util.stream.IntStream;

import shuntwright.board.Sampling;
import shuntwright.quantity.Distribution;
import shuntwright.quantity.Range;

/** Short ways to sample a model in a test. */
final class Runs {

    static final Distribution UNIFORM = new Distribution.Uniform();
    static final int MILLION = 1_000_000;

    private Runs() {
    }

    static Sampling fixed(int trials, long seed) {
        return new Sampling(new Sampling.Trials.Fixed(trials), seed);
    }

    static Sampling adaptive(int digits, int most, long seed) {
        return new Sampling(new Sampling.Trials.Adaptive(digits, most), seed);
    }

    /** The only output of a model; everything is allowed. */
    static Sampled only(Model model, List<Variable> variables, double coverage, Sampling sampling) {
        return only(model, variables, Formula.ANYTHING, coverage, sampling);
    }

    static Sampled only(Model model, List<Variable> variables, Range allowed, double coverage, Sampling sampling) {
        return MonteCarlo.run(model, variables, List.of(allowed), coverage, sampling, Watch.NONE).outputs().getFirst();
    }

    static Variable uniform(String key, double mid, double half) {
        return of(key, mid, half, UNIFORM);
    }

    /** Uniform of that standard deviation around 0. */
    static Variable uniform(String key, double standard) {
        return uniform(key, 0, standard * Math.sqrt(3));
    }

    static Variable of(String key, double mid, double half, Distribution distribution) {
        return Variable.of(key, Range.of(mid - half, mid + half), distribution);
    }

    /** Scaled and shifted t of that scale. */
    static Variable student(String key, double mid, double scale, double degrees) {
        return of(key, mid, scale, new Distribution.StudentT(degrees, 1));
    }

    /** As many as wanted, x1, x2 ... */
    static List<Variable> many(int count, Function<String, Variable> each) {
        return IntStream.rangeClosed(1, count).mapToObj(i -> each.apply("x" + i)).toList();
    }
}
