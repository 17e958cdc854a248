package shuntwright.quantity;

/** The preferred number series of IEC 60063:2015. */
public enum ESeries {
    E3, E6, E12, E24, E48, E96, E192;

    /** The values of the decade 1 ≤ v &lt; 10, ascending. */
    public double[] decade() {
        return new double[0];
    }

    /** The nearest member by ratio (geometric midpoint between neighbours); a tie goes up. */
    public double nearest(double value) {
        return value;
    }

    /** The smallest member not below {@code value}. */
    public double atLeast(double value) {
        return value;
    }

    /** The largest member not above {@code value}. */
    public double atMost(double value) {
        return value;
    }

    /** All members within the range, ascending. */
    public double[] within(Range range) {
        return new double[]{range.min()};
    }
}
