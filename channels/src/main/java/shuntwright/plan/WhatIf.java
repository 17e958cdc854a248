package shuntwright.plan;

import java.util.List;
import java.util.Optional;

/**
 * What the board becomes as one of its limits changes.
 *
 * @param varied which
 * @param name   of the zone for a zone's heat limit; empty for the others
 * @param points by ascending value
 */
public record WhatIf(Varied varied, String name, List<Point> points) {
    public WhatIf {
        points = List.copyOf(points);
    }

    /** What is varied. */
    public enum Varied {
        /** Heat limit of the board, W. */
        BOARD_HEAT_LIMIT,
        /** Heat limit of one zone, W. */
        ZONE_HEAT_LIMIT,
        /** Available current of the sense supply, A. */
        SUPPLY_CURRENT,
        /** Boards built at once. */
        BUILD_QUANTITY
    }

    /**
     * The board at one value.
     *
     * @param value   W, A or boards
     * @param reached cost of the build, heat and distinct parts; empty where no choice meets every shared limit
     */
    public record Point(double value, Optional<Sums> reached) {}

    /**
     * Sums over the board.
     *
     * @param cost         of the whole build, the catalogue's currency
     * @param costPerBoard cost divided by the boards built
     * @param heat         of all shunts, W
     * @param parts        distinct part numbers
     */
    public record Sums(double cost, double costPerBoard, double heat, int parts) {}
}
