package shuntwright.bench;

import shuntwright.board.Board;
import shuntwright.parts.Catalogue;
import shuntwright.parts.Comparator;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;

/** All ways to combine the parts of a catalogue, and the least work that looks at each of them. */
final class Candidates {
    private static final double THRESHOLD = 2.0;

    private Candidates() {
    }

    /** Combinations of shunt, number of shunts, amplifier and comparator, for all channels of the board. */
    static long count(Board board, Catalogue catalogue) {
        return (long) board.channels().size() * catalogue.shunts().size() * board.rules().parallelShunts()
                * catalogue.amplifiers().size() * catalogue.comparators().size();
    }

    /** Nominal trip current V_T·n/(G·R) of every combination, added up so that none is left out; A. */
    static double nominalTrips(Board board, Catalogue catalogue) {
        double sum = 0;
        for (int channel = 0; channel < board.channels().size(); channel++) {
            for (Comparator comparator : catalogue.comparators()) {
                double threshold = THRESHOLD + comparator.sections() * 1e-9;
                for (SenseAmplifier amplifier : catalogue.amplifiers()) {
                    for (Shunt shunt : catalogue.shunts()) {
                        for (int n = 1; n <= board.rules().parallelShunts(); n++) {
                            sum += threshold * n / (amplifier.gain() * shunt.resistance());
                        }
                    }
                }
            }
        }
        return sum;
    }

    /** The same for every combination of shunts and amplifier; A. */
    static double nominalTripsOfPairs(Board board, Catalogue catalogue) {
        double sum = 0;
        for (int channel = 0; channel < board.channels().size(); channel++) {
            for (SenseAmplifier amplifier : catalogue.amplifiers()) {
                for (Shunt shunt : catalogue.shunts()) {
                    for (int n = 1; n <= board.rules().parallelShunts(); n++) {
                        sum += THRESHOLD * n / (amplifier.gain() * shunt.resistance());
                    }
                }
            }
        }
        return sum;
    }
}
