package shuntwright.sampling;

import shuntwright.quantity.Distribution;

/**
 * Turns uniform numbers from 0 to 1 into deviations of a distribution whose limits are ±1, by its inverse distribution function
 * (JCGM 101:2008, 6.4 and annex C).
 */
final class Shape {

    private Shape() {
    }

    /** The quantile of {@code p}, 0 &lt; p &lt; 1. */
    static double quantile(Distribution distribution, double p) {
        double v = 2 * p - 1;
        return switch (distribution) {
            case Distribution.Uniform _ -> v;
            case Distribution.Normal(double k) -> Normal.quantile(p) / k;
            case Distribution.Triangular _ -> Math.copySign(1 - Math.sqrt(1 - Math.abs(v)), v);
            case Distribution.ArcSine _ -> Math.sin(Math.PI / 2 * v);
            case Distribution.Trapezoid(double ratio) -> trapezoid(v, ratio);
            case Distribution.StudentT(double degrees, double k) ->
                StudentTable.of(degrees).quantile(Normal.quantile(p))
                        / k;
        };
    }

    /** The same for a whole column, in place. */
    static void apply(Distribution distribution, double[] column) {
        if (distribution instanceof Distribution.Uniform) {
            for (int j = 0; j < column.length; j++) {
                column[j] = 2 * column[j] - 1;
            }
            return;
        }
        for (int j = 0; j < column.length; j++) {
            column[j] = quantile(distribution, column[j]);
        }
    }

    /**
     * The same where the column holds standard normal numbers.
     *
     * @param distribution of the deviation
     * @param column       overwritten
     */
    static void applyToNormal(Distribution distribution, double[] column) {
        for (int j = 0; j < column.length; j++) {
            column[j] = switch (distribution) {
                case Distribution.Normal(double k) -> column[j] / k;
                case Distribution.StudentT(double degrees, double k) ->
                    StudentTable.of(degrees).quantile(column[j]) / k;
                case Distribution.Uniform _,Distribution.Triangular _,Distribution.ArcSine _,Distribution.Trapezoid _ ->
                    throw new IllegalArgumentException("bounded distributions are not made of normal numbers");
            };
        }
    }

    /** The sum of two uniform deviations of half-widths (1+β)/2 and (1−β)/2. */
    private static double trapezoid(double v, double ratio) {
        // Share of the probability on one side that lies under the flat top.
        double flat = 2 * ratio / (1 + ratio);
        double side = Math.abs(v);
        double at = side <= flat
                ? side * (1 + ratio) / 2
                : 1 - Math.sqrt((1 - side) * (1 - ratio * ratio));
        return Math.copySign(at, v);
    }
}
