package shuntwright.parts;

import shuntwright.quantity.Finite;

/**
 * A current sense amplifier of fixed gain.
 *
 * @param partNumber    unique within the catalogue
 * @param description   free text
 * @param gain          V/V
 * @param gainError     limit of its magnitude at 25 °C, a fraction
 * @param gainDrift     limit of its magnitude, 1/K, referred to 25 °C
 * @param gainAgeing    largest relative change of the gain over life, a fraction
 * @param input         errors that act at the input
 * @param ranges        where it works
 * @param bandwidth     -3 dB at this gain, Hz
 * @param slewRate      V/s
 * @param supplyCurrent largest of the whole package, A
 * @param sections      amplifiers in one package, ≥ 1
 * @param purchase      how it is sold
 */
public record SenseAmplifier(String partNumber, String description, double gain, double gainError, double gainDrift,
        double gainAgeing, InputErrors input, AmplifierRanges ranges, double bandwidth, double slewRate,
        double supplyCurrent,
        int sections, Purchase purchase) implements Part {

    /** @throws IllegalArgumentException unless gain, bandwidth, slew rate are &gt; 0, limits ≥ 0 and sections ≥ 1 */
    public SenseAmplifier {
        if (!Finite.positive(gain) || !(gainError >= 0 && gainError < 1) || !Finite.notNegative(gainDrift)
                || !(gainAgeing >= 0 && gainAgeing < 1)
                || !Finite.positive(bandwidth)
                || !Finite.positive(slewRate) || !Finite.notNegative(supplyCurrent) || sections < 1) {
            throw new IllegalArgumentException("amplifier " + partNumber
                    + " needs gain, bandwidth and slew rate > 0, error limits ≥ 0 and at least one section");
        }
    }
}
