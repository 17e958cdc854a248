package shuntwright.circuit;

/**
 * A limit applied to a circuit.
 *
 * @param limit   which
 * @param reached the circuit's value, in the limit's dimension
 * @param bound   what it must keep to
 * @param atMost  true when {@code reached} must not exceed {@code bound}, false when it must not fall below
 */
public record LimitCheck(Limit limit, double reached, double bound, boolean atMost) {

    /** Share of a bound that arithmetic may be off by: 2.2 A through 25 mΩ must not miss 55 mV. */
    public static final double ROUNDING = 1e-12;

    /** True when the limit is respected but for rounding; false also when a value is not a number. */
    public boolean holds() {
        return miss() <= ROUNDING * Math.abs(bound);
    }

    /** By how much the limit is missed, in its dimension; ≤ 0 when it holds. */
    public double miss() {
        return atMost ? reached - bound : bound - reached;
    }
}
