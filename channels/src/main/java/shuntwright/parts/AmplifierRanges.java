package shuntwright.parts;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;

/**
 * Where a sense amplifier works.
 *
 * @param commonMode     voltage its inputs may sit at while it measures, V
 * @param differential   largest input difference it amplifies as specified, V
 * @param survival       largest input difference it survives, V
 * @param supply         supply voltage, V
 * @param outputHeadroom how far below the supply its output stays linear (h_hi), V
 * @param outputLow      lowest output voltage at which it is linear (h_lo), V
 */
public record AmplifierRanges(Range commonMode, double differential, double survival, Range supply,
        double outputHeadroom, double outputLow) {

    /** @throws IllegalArgumentException unless 0 &lt; differential ≤ survival and headrooms are ≥ 0 */
    public AmplifierRanges {
        if (!Finite.positive(differential) || !(survival >= differential) || Double.isInfinite(survival)
                || !Finite.notNegative(outputHeadroom) || !Finite.notNegative(outputLow)) {
            throw new IllegalArgumentException(
                    "amplifier ranges need 0 < differential ≤ survival and headrooms ≥ 0, got " + differential + ", "
                            + survival + ", " + outputHeadroom + ", " + outputLow);
        }
    }
}
