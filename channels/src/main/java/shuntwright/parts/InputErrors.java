package shuntwright.parts;

import shuntwright.quantity.Finite;

/**
 * Errors of a sense amplifier that act like a voltage at its input; each number limits a magnitude.
 *
 * @param offset            at 25 °C and the common-mode and supply voltages below, V
 * @param offsetDrift       V/K, referred to 25 °C
 * @param rejection         common-mode rejection, dB; infinite where there is no error
 * @param commonModeSpec    common-mode voltage at which the offset is stated, V
 * @param supplyRejection   supply rejection, dB; infinite where there is no error
 * @param supplySpec        supply voltage at which the offset is stated, V
 * @param biasCurrent       input bias current, A
 */
public record InputErrors(double offset, double offsetDrift, double rejection, double commonModeSpec,
        double supplyRejection, double supplySpec, double biasCurrent) {

    /** @throws IllegalArgumentException unless magnitudes are ≥ 0 and rejections &gt; 0 */
    public InputErrors {
        if (!Finite.notNegative(offset) || !Finite.notNegative(offsetDrift) || !(rejection > 0)
                || !(supplyRejection > 0)
                || !Finite.notNegative(biasCurrent) || !Double.isFinite(commonModeSpec)
                || !Double.isFinite(supplySpec)) {
            throw new IllegalArgumentException("input errors need magnitudes ≥ 0 and rejections > 0 dB");
        }
    }

    /** Limit of the input error per volt of common-mode voltage, V/V: 10^(−dB/20). */
    public double perCommonModeVolt() {
        return perVolt(rejection);
    }

    /** Limit of the input error per volt of supply voltage, V/V. */
    public double perSupplyVolt() {
        return perVolt(supplyRejection);
    }

    private static double perVolt(double decibel) {
        return Math.pow(10, -decibel / 20);
    }
}
