package shuntwright.board;

/**
 * A point of a current over time.
 *
 * @param time    s, ≥ 0
 * @param current A, ≥ 0
 */
public record TimePoint(double time, double current) {

    /** @throws IllegalArgumentException unless both are finite and ≥ 0 */
    public TimePoint {
        if (!(time >= 0) || !(current >= 0) || Double.isInfinite(time) || Double.isInfinite(current)) {
            throw new IllegalArgumentException("a point needs time and current ≥ 0, got " + time + ", " + current);
        }
    }
}
