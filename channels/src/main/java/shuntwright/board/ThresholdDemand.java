package shuntwright.board;

/** Where a channel's threshold may come from. */
public sealed interface ThresholdDemand {

    /** An own divider from the supply or any reference of the board, whichever serves best. */
    record Free() implements ThresholdDemand {}

    /** An own divider from this source. */
    record OwnDivider(Source source) implements ThresholdDemand {}

    /** @param tap name of a tap of the board that several channels share */
    record SharedTap(String tap) implements ThresholdDemand {}
}
