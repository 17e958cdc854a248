package shuntwright.board;

/** What may be wanted of all choices of parts that serve. */
public enum Objective {
    /** Least heat of all shunts together, with their diversity. */
    LEAST_HEAT("least heat"),
    /** Smallest largest share of a zone's heat limit that is used. */
    MOST_EVEN_HEAT("most even heat"),
    /** Least cost of the whole build: order quantities, price breaks, cost of each distinct part number. */
    LEAST_COST("least cost"),
    /** Fewest distinct part numbers. */
    FEWEST_PARTS("fewest parts"),
    /** Widest slack of the channel that has least of it. */
    WIDEST_MARGIN("widest margin");

    private final String word;

    Objective(String word) {
        this.word = word;
    }

    /** As typed and as read, for example "least heat". */
    public String word() {
        return word;
    }
}
