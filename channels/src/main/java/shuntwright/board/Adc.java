package shuntwright.board;

import shuntwright.quantity.Finite;

/**
 * The converter that reads the amplifier outputs; its full scale is its source's voltage.
 *
 * @param source    supply or reference
 * @param bits      resolution, 6 to 24
 * @param gainError limit of its magnitude without the source's own error, a fraction
 * @param offset    limit of its magnitude, V
 * @param nonlinearity integral non-linearity, limit of its magnitude in steps (LSB)
 */
public record Adc(Source source, int bits, double gainError, double offset, double nonlinearity) {

    /** @throws IllegalArgumentException unless 6 ≤ bits ≤ 24 and the limits are ≥ 0 */
    public Adc {
        if (bits < 6 || bits > 24 || !(gainError >= 0 && gainError < 1) || !Finite.notNegative(offset)
                || !Finite.notNegative(nonlinearity)) {
            throw new IllegalArgumentException("an ADC needs 6 to 24 bits and error limits ≥ 0, got " + bits + ", "
                    + gainError + ", " + offset + ", " + nonlinearity);
        }
    }
}
