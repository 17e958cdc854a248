package shuntwright.choice;

import java.util.List;

import shuntwright.circuit.SenseCircuit;

/**
 * Accepted circuits of one channel that are worth looking at for the whole board: from the least heat upwards, in each band of heat the
 * cheapest ones at several prices, with a variety of parts. The first ones have the least heat of all circuits that are accepted.
 *
 * @param circuits   accepted, by ascending heat; empty when none is
 * @param candidates combinations of shunts and amplifier that leave room for a threshold within every limit
 */
public record ChannelMenu(List<SenseCircuit> circuits, int candidates) {

    public ChannelMenu {
        circuits = List.copyOf(circuits);
    }

    /**
     * How much is looked at.
     *
     * @param bands   of heat above the least one, at most
     * @param ratio   from one band to the next, &gt; 1
     * @param perBand circuits of each band at each prices, at most
     */
    public record Breadth(int bands, double ratio, int perBand) {
        /** Heat decides: the least heat and a little above. */
        public static final Breadth NARROW = new Breadth(2, 1.12, 10);
        /** Something else decides. */
        public static final Breadth WIDE = new Breadth(12, 1.35, 6);
        /** Limits of calibrated readings take a hundred times as long to judge. */
        public static final Breadth CALIBRATED = new Breadth(1, 1.12, 2);
        /** For each of several voltages of a tap. */
        public static final Breadth TAP = new Breadth(5, 1.5, 4);
    }
}
