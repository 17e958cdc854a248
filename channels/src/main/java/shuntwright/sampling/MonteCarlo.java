package shuntwright.sampling;

import java.util.List;

import shuntwright.board.Sampling;
import shuntwright.quantity.Range;

/** Propagation of distributions by the Monte Carlo method (JCGM 101:2008, clause 7). */
public final class MonteCarlo {

    private MonteCarlo() {
    }

    /** Thrown out of a run that its {@link Watch} cancelled. */
    public static final class Cancelled extends RuntimeException {
        private static final long serialVersionUID = 1;
    }

    /**
     * What a run says.
     *
     * @param settled false when adaptive trials ended at their most before the results were stable
     * @param outputs of the model, in its order
     * @param outside probability that any output is outside what is allowed
     */
    public record Run(boolean settled, List<Sampled> outputs, Probability outside) {
        public Run {
            outputs = List.copyOf(outputs);
        }
    }

    /**
     * Samples a model.
     *
     * @param variables one for each input of the model
     * @param allowed   one for each output
     * @param coverage  coverage probability, above 0 to below 1
     * @throws Cancelled when the watch says so
     */
    public static Run run(Model model, List<Variable> variables, List<Range> allowed, double coverage,
            Sampling sampling, Watch watch) {
        if (watch.cancelled()) {
            throw new Cancelled();
        }
        return new Run(true, List.of(), new Probability(0, Range.of(0, 1), 0, Probability.Method.COUNTED, 0));
    }
}
