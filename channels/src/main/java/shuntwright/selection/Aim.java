package shuntwright.selection;

/** What is minimised. */
public sealed interface Aim {

    /** @param resource whose use is to be least, in its unit */
    record Use(int resource) implements Aim {}

    /** The largest share of a limit among the resources that are to be used evenly; 1 is the whole limit. */
    record LargestShare() implements Aim {}

    /** Cost of all orders with the cost of each distinct line, in currency. */
    record Cost() implements Aim {}

    /** Number of distinct lines. */
    record Lines() implements Aim {}

    /** The least margin of all slots with its sign changed, so that the least is the widest margin. */
    record LeastMargin() implements Aim {}

    /**
     * An aim that must not exceed a value.
     *
     * @param aim  what
     * @param most largest value allowed
     */
    record Cap(Aim aim, double most) {}
}
