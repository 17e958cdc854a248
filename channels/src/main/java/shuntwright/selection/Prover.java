package shuntwright.selection;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Finds bounds, proofs and better selections by other means than this package's search. May fail, which is no answer. */
public interface Prover {

    /** Knows nothing. */
    Prover NONE = (selection, question, watch) -> Finding.NOTHING;

    /**
     * What is asked.
     *
     * @param caps that hold besides the limits
     * @param aim  to be least; empty when only asked whether limits and caps can be kept
     * @param hint a selection that keeps them, option of each slot; empty when none is known
     */
    record Question(List<Aim.Cap> caps, Optional<Aim> aim, List<Integer> hint) {
        public Question {
            caps = List.copyOf(caps);
            hint = List.copyOf(hint);
        }
    }

    /**
     * What was found.
     *
     * @param bound      no selection has less; empty when nothing is known
     * @param better     a selection that is said to be better, to be checked by whoever asks
     * @param impossible true when limits and caps are proven not to be kept by any selection
     * @param complaint  why nothing was found, in words; empty when all went well
     */
    record Finding(OptionalDouble bound, Optional<List<Integer>> better, boolean impossible, String complaint) {
        static final Finding NOTHING = new Finding(OptionalDouble.empty(), Optional.empty(), false, "");

        public Finding {
            better = better.map(List::copyOf);
        }
    }

    /** Answers within its own limits of time and memory; never throws for what goes wrong outside this program. */
    Finding ask(Selection selection, Question question, Watch watch);
}
