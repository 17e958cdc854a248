package shuntwright.board;

import java.util.List;

/**
 * What is known of the inputs beyond their limits, and how their distributions are propagated.
 *
 * @param stated   distributions of some inputs; of several that suit an input the last that names its part counts, else the last
 * @param sampling how the propagated distribution is sampled
 */
public record Uncertainty(List<StatedDistribution> stated, Sampling sampling) {

    public static final Uncertainty DEFAULT = new Uncertainty(List.of(), Sampling.DEFAULT);

    public Uncertainty {
        stated = List.copyOf(stated);
    }

    public Uncertainty withSampling(Sampling newSampling) {
        return new Uncertainty(stated, newSampling);
    }
}
