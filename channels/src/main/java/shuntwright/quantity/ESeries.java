package shuntwright.quantity;

import java.math.BigDecimal;

/**
 * The preferred number series of IEC 60063:2015.
 *
 * <p>Every member returned is the double nearest to its decimal value, so that 4.7 kΩ is exactly {@code 4700.0}. Values
 * must lie between 1e-300 and 1e300; a value within 1e-9 of a member, relatively, counts as that member.
 */
public enum ESeries {
    E3(3), E6(6), E12(12), E24(24), E48(48), E96(96), E192(192);

    private static final double SAME = 1e-9;
    private static final double LEAST = 1e-300;
    private static final double LARGEST = 1e300;
    /** Powers of ten that a double holds exactly: one multiplication or division by them rounds correctly. */
    private static final double[] POWERS = {1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13,
            1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22};

    private final int perDecade;

    ESeries(int perDecade) {
        this.perDecade = perDecade;
    }

    /** The values of the decade 1 ≤ v &lt; 10, ascending. */
    public double[] decade() {
        double[] decade = new double[perDecade];
        for (int i = 0; i < decade.length; i++) {
            decade[i] = member(i);
        }
        return decade;
    }

    /**
     * The nearest member by ratio (geometric midpoint between neighbours); a tie goes up.
     *
     * @throws IllegalArgumentException unless 1e-300 ≤ value ≤ 1e300
     */
    public double nearest(double value) {
        int below = indexBelow(checked(value));
        double low = member(below);
        double high = member(below + 1);
        return value / low >= high / value ? high : low;
    }

    /**
     * The smallest member not below {@code value}.
     *
     * @throws IllegalArgumentException unless 1e-300 ≤ value ≤ 1e300
     */
    public double atLeast(double value) {
        return member(indexAtLeast(checked(value)));
    }

    /**
     * The largest member not above {@code value}.
     *
     * @throws IllegalArgumentException unless 1e-300 ≤ value ≤ 1e300
     */
    public double atMost(double value) {
        return member(indexAtMost(checked(value)));
    }

    /**
     * Whether the value is a member.
     *
     * @throws IllegalArgumentException unless 1e-300 ≤ value ≤ 1e300
     */
    public boolean contains(double value) {
        return indexAtLeast(checked(value)) == indexAtMost(value);
    }

    /**
     * All members within the range, ascending.
     *
     * @throws IllegalArgumentException unless 1e-300 ≤ min and max ≤ 1e300
     */
    public double[] within(Range range) {
        int first = indexAtLeast(checked(range.min()));
        int last = indexAtMost(checked(range.max()));
        double[] members = new double[Math.max(0, last - first + 1)];
        for (int i = 0; i < members.length; i++) {
            members[i] = member(first + i);
        }
        return members;
    }

    private int indexAtLeast(double value) {
        int below = indexBelow(value);
        return value <= member(below) * (1 + SAME) ? below : below + 1;
    }

    private int indexAtMost(double value) {
        int below = indexBelow(value);
        return value >= member(below + 1) * (1 - SAME) ? below + 1 : below;
    }

    /** The index of the largest member that is exactly not above the value; index 0 is the member 1. */
    private int indexBelow(double value) {
        int start = (int) Math.floor(Math.log10(value)) * perDecade;
        // The logarithm may round across a power of ten, so the search spans one decade more on either side.
        int low = start - perDecade;
        int high = start + 2 * perDecade;
        while (high - low > 1) {
            int middle = low + (high - low) / 2;
            if (member(middle) <= value) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    private double member(int index) {
        int mantissa = Mantissas.at(Math.floorMod(index, perDecade), perDecade);
        int power = Math.floorDiv(index, perDecade) - 2;
        if (power >= 0 && power < POWERS.length) {
            return mantissa * POWERS[power];
        }
        if (power < 0 && -power < POWERS.length) {
            return mantissa / POWERS[-power];
        }
        return BigDecimal.valueOf(mantissa, -power).doubleValue();
    }

    private static double checked(double value) {
        if (!(value >= LEAST && value <= LARGEST)) {
            throw new IllegalArgumentException(
                    "a preferred number is looked up for values from 1e-300 to 1e300, got " + value);
        }
        return value;
    }
}
