package shuntwright.board;

import java.util.Optional;

import shuntwright.quantity.Finite;

/**
 * Rules that hold for every channel of the board.
 *
 * @param parallelShunts   most shunts in parallel in one channel, 1 to 8
 * @param powerMargin      share of a shunt's rated power that may be used, above 0 to 1
 * @param dividerCurrent   largest current one divider may draw from its source, A; bounds its resistance from below
 * @param biasShare        largest share of the threshold by which the comparator's bias current may shift it; bounds the
 *                         divider's resistance from above
 * @param resistors        part number of the resistor series for dividers and hysteresis; empty for any series of 1 % or
 *                         better, whichever serves at least cost
 * @param heatStep         heats within this much of the least count as equal when parts are chosen, W; 0 for the least itself
 * @param inputResistance  resistor in each amplifier input lead, Ω (0 for none)
 * @param inputMismatch    relative mismatch of those two resistors, a fraction
 */
public record DesignRules(int parallelShunts, double powerMargin, double dividerCurrent, double biasShare,
        Optional<String> resistors, double heatStep, double shuntGradient, double inputResistance,
        double inputMismatch) {

    /** Common practice: up to 3 in parallel, 70 % of rated power, 0.5 mA, 0.1 %, 20 mW, 1 K, no input resistors. */
    public static final DesignRules DEFAULT = new DesignRules(3, 0.7, 0.5e-3, 1e-3, Optional.empty(), 20e-3, 1, 0,
            0.02);

    /** @throws IllegalArgumentException unless each is within the range stated above */
    public DesignRules {
        if (parallelShunts < 1 || parallelShunts > 8 || !(powerMargin > 0 && powerMargin <= 1)
                || !Finite.positive(dividerCurrent) || !(biasShare > 0 && biasShare < 1)
                || !Finite.notNegative(heatStep)
                || !Finite.notNegative(shuntGradient)
                || !Finite.notNegative(inputResistance) || !(inputMismatch >= 0 && inputMismatch < 1)) {
            throw new IllegalArgumentException("design rules out of range: 1 to 8 shunts in parallel, power margin "
                    + "above 0 to 1, divider current > 0, bias share between 0 and 1, heat step, gradient and input resistance ≥ 0");
        }
    }

    public DesignRules withParallelShunts(int newParallelShunts) {
        return new DesignRules(newParallelShunts, powerMargin, dividerCurrent, biasShare, resistors, heatStep,
                shuntGradient, inputResistance, inputMismatch);
    }

    public DesignRules withPowerMargin(double newPowerMargin) {
        return new DesignRules(parallelShunts, newPowerMargin, dividerCurrent, biasShare, resistors, heatStep,
                shuntGradient, inputResistance, inputMismatch);
    }

    public DesignRules withHeatStep(double newHeatStep) {
        return new DesignRules(parallelShunts, powerMargin, dividerCurrent, biasShare, resistors, newHeatStep,
                shuntGradient, inputResistance, inputMismatch);
    }
}
