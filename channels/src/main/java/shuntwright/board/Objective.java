package shuntwright.board;

/** What may be wanted of all choices of parts that serve. */
public enum Objective {
    /** Least heat of all shunts together, with their diversity. */
    LEAST_HEAT,
    /** Smallest largest share of a zone's heat limit that is used. */
    MOST_EVEN_HEAT,
    /** Least cost of the whole build: order quantities, price breaks, cost of each distinct part number. */
    LEAST_COST,
    /** Fewest distinct part numbers. */
    FEWEST_PARTS,
    /** Widest slack of the channel that has least of it. */
    WIDEST_MARGIN
}
