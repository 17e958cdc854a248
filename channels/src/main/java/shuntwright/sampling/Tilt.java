package shuntwright.sampling;

import shuntwright.quantity.Distribution;

/**
 * One input's density f tilted to f(x)·exp(t·(x − mid) − K(t)): its mean, K, and how to draw from it. Triangle and trapezoid are sums
 * of two uniform parts, each tilted alike. Arcsine, t and pieces of a reel are left as they are (t = 0): the estimate stays unbiased.
 *
 * @param mid        of the limits
 * @param half       half-width of the limits
 * @param first      half-width of a uniform part; 0 for none
 * @param second     half-width of a second uniform part; 0 for none
 * @param deviation  standard deviation of a normal variable; 0 for none
 */
record Tilt(double mid, double half, double first, double second, double deviation) {

    /** Beyond this a uniform part sits at its end, and a normal one is further out than anyone asks. */
    private static final double MOST = 200;
    private static final double MOST_DEVIATIONS = 12;
    /** A uniform part has its mean at four fifths, a normal one at two standard deviations. */
    private static final double FAR = 5;
    private static final double FAR_DEVIATIONS = 2;
    private static final double SMALL = 1e-4;

    static Tilt of(Variable variable) {
        double mid = variable.limits().mid();
        double half = variable.limits().width() / 2;
        if (half == 0 || variable.reel().isPresent()) {
            return new Tilt(mid, half, 0, 0, 0);
        }
        return switch (variable.distribution()) {
            case Distribution.Uniform _ -> new Tilt(mid, half, half, 0, 0);
            case Distribution.Triangular _ -> new Tilt(mid, half, half / 2, half / 2, 0);
            case Distribution.Trapezoid(double ratio) -> new Tilt(mid, half, half * (1 + ratio) / 2,
                    half * (1 - ratio) / 2, 0);
            case Distribution.Normal(double k) -> new Tilt(mid, half, 0, 0, half / k);
            case Distribution.ArcSine _,Distribution.StudentT _ -> new Tilt(mid, half, 0, 0, 0);
        };
    }

    /** True when it cannot be tilted. */
    boolean fixed() {
        return first == 0 && deviation == 0;
    }

    /** True when a draw takes two uniform numbers. */
    boolean takesTwo() {
        return second > 0;
    }

    /** Standard deviation without tilt; 0 where it cannot be tilted. */
    double standard() {
        return Math.sqrt((first * first + second * second) / 3 + deviation * deviation);
    }

    /** The tilt nearest to {@code t} that can be drawn. */
    double bounded(double t) {
        if (fixed()) {
            return 0;
        }
        double most = deviation > 0 ? MOST_DEVIATIONS / deviation : MOST / first;
        return Math.max(-most, Math.min(most, t));
    }

    /** The tilt that brings the mean far to one side, +1 or -1; 0 where it cannot be tilted. */
    double towards(int side) {
        if (fixed()) {
            return 0;
        }
        return side * (deviation > 0 ? FAR_DEVIATIONS / deviation : FAR / first);
    }

    double mean(double t) {
        return mid + first * langevin(t * first) + second * langevin(t * second) + t * deviation * deviation;
    }

    /** K(t). */
    double logMoment(double t) {
        return logSinhOver(t * first) + logSinhOver(t * second) + t * t * deviation * deviation / 2;
    }

    /**
     * A draw.
     *
     * @param u uniform, 0 to 1
     * @param v another, used only where {@link #takesTwo()}
     */
    double draw(double t, double u, double v) {
        if (deviation > 0) {
            return mid + t * deviation * deviation + deviation * Normal.quantile(u);
        }
        double x = mid + first * uniform(t * first, u);
        return second > 0 ? x + second * uniform(t * second, v) : x;
    }

    /** Mean of a tilted uniform deviation: coth s − 1/s. */
    private static double langevin(double s) {
        return Math.abs(s) < SMALL ? s / 3 : 1 / Math.tanh(s) - 1 / s;
    }

    /** log(sinh s / s). */
    private static double logSinhOver(double s) {
        double a = Math.abs(s);
        return a < SMALL ? a * a / 6 : a - Math.log(2 * a) + Math.log1p(-Math.exp(-2 * a));
    }

    /** A tilted uniform deviation between -1 and 1. */
    private static double uniform(double s, double u) {
        double a = Math.abs(s);
        if (a < 1e-9) {
            return 2 * u - 1;
        }
        double z = 1 + Math.log1p((1 - u) * Math.expm1(-2 * a)) / a;
        return Math.copySign(1, s) * z;
    }
}
