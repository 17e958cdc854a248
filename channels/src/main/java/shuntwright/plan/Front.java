package shuntwright.plan;

import java.util.List;

import shuntwright.board.Objective;

/**
 * Plans of which none is better in one of two objectives without being worse in the other.
 *
 * @param first  objective along the front
 * @param second the other
 * @param points by ascending value of the first
 */
public record Front(Objective first, Objective second, List<Point> points) {
    public Front {
        points = List.copyOf(points);
    }

    /**
     * One plan of the front.
     *
     * @param first  value of the first objective (units of {@link Reached})
     * @param second value of the second
     * @param plan   the whole board, chosen so
     */
    public record Point(double first, double second, Plan plan) {}
}
