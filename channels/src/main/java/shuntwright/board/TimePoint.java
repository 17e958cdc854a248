package shuntwright.board;

import shuntwright.quantity.Finite;

/**
 * A point of a current over time.
 *
 * @param time    s, ≥ 0
 * @param current A, ≥ 0
 */
public record TimePoint(double time, double current) {

    /** @throws IllegalArgumentException unless both are finite and ≥ 0 */
    public TimePoint {
        if (!Finite.notNegative(time) || !Finite.notNegative(current)) {
            throw new IllegalArgumentException("a point needs time and current ≥ 0, got " + time + ", " + current);
        }
    }
}
