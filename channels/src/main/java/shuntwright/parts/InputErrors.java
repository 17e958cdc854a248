package shuntwright.parts;

/**
 * Errors of a sense amplifier that act like a voltage at its input; each number limits a magnitude.
 *
 * @param offset            at 25 °C and the common-mode and supply voltages below, V
 * @param offsetDrift       V/K, referred to 25 °C
 * @param rejection         common-mode rejection, dB
 * @param commonModeSpec    common-mode voltage at which the offset is stated, V
 * @param supplyRejection   supply rejection, dB
 * @param supplySpec        supply voltage at which the offset is stated, V
 * @param biasCurrent       input bias current, A
 */
public record InputErrors(double offset, double offsetDrift, double rejection, double commonModeSpec,
        double supplyRejection, double supplySpec, double biasCurrent) {

    /** @throws IllegalArgumentException unless magnitudes are ≥ 0 and rejections &gt; 0 */
    public InputErrors {
        if (!(offset >= 0) || !(offsetDrift >= 0) || !(rejection > 0) || !(supplyRejection > 0)
                || !(biasCurrent >= 0) || !Double.isFinite(commonModeSpec) || !Double.isFinite(supplySpec)) {
            throw new IllegalArgumentException("input errors need magnitudes ≥ 0 and rejections > 0 dB");
        }
    }
}
