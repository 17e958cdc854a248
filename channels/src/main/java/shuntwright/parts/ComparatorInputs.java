package shuntwright.parts;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;

/**
 * What a comparator's inputs need and err by.
 *
 * @param offset      limit of its magnitude at 25 °C, V
 * @param offsetDrift limit of its magnitude, V/K, referred to 25 °C
 * @param biasCurrent current into an input, A; negative where it flows out
 * @param lowest      lowest input voltage at which it compares, V
 * @param headroom    how far below the supply the threshold must stay, V; negative where it may exceed the supply
 */
public record ComparatorInputs(double offset, double offsetDrift, Range biasCurrent, double lowest, double headroom) {

    /** @throws IllegalArgumentException unless offset and drift are ≥ 0 and the others finite */
    public ComparatorInputs {
        if (!Finite.notNegative(offset) || !Finite.notNegative(offsetDrift) || !Double.isFinite(lowest)
                || !Double.isFinite(headroom)) {
            throw new IllegalArgumentException("comparator inputs need offset and drift ≥ 0, got " + offset + ", "
                    + offsetDrift + ", " + lowest + ", " + headroom);
        }
    }
}
