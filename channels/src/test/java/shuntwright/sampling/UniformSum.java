package shuntwright.sampling;

import java.util.Arrays;
import java.util.List;

/**
 * The sum of independent uniform deviations of given half-widths around 0 (Irwin 1927, Hall 1927 for equal ones): its distribution
 * function is Σ ±(s + Σ ±aᵢ)ⁿ₊ / (n!·Π 2aᵢ) over all signs, of which few terms are left in the tails.
 *
 * @param halves half-widths
 */
record UniformSum(List<Double> halves) {

    UniformSum {
        halves = List.copyOf(halves);
    }

    static UniformSum of(double... halves) {
        return new UniformSum(Arrays.stream(halves).boxed().toList());
    }

    /** P(S ≤ s); exact to rounding where that is small. */
    double below(double s) {
        return s > 0 ? 1 - powers(-s, halves.size()) : powers(s, halves.size());
    }

    /** P(S > s). */
    double above(double s) {
        return below(-s);
    }

    double density(double s) {
        return powers(-Math.abs(s), halves.size() - 1);
    }

    private double powers(double s, int power) {
        int n = halves.size();
        double sum = 0;
        for (int signs = 0; signs < (1 << n); signs++) {
            double at = s;
            for (int i = 0; i < n; i++) {
                at += ((signs >> i) & 1) == 0 ? halves.get(i) : -halves.get(i);
            }
            if (at > 0) {
                sum += Math.pow(at, power) * (Integer.bitCount(signs) % 2 == 0 ? 1 : -1);
            }
        }
        double scale = 1;
        for (double half : halves) {
            scale *= 2 * half;
        }
        for (int i = 2; i <= power; i++) {
            scale *= i;
        }
        return sum / scale;
    }

    /** The value below which it lies with probability p. */
    double quantile(double p) {
        double reach = halves.stream().mapToDouble(Double::doubleValue).sum();
        return Bisection.root(s -> below(s) - p, -reach, reach);
    }
}
