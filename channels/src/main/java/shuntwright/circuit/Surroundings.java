package shuntwright.circuit;

import java.util.Optional;

import shuntwright.board.Adc;
import shuntwright.board.DesignRules;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/**
 * What all channels of a board share as far as one channel's equations see it.
 *
 * @param ambient °C
 * @param supply  sense supply, V
 * @param rules   design rules
 * @param adc     converter with its source; empty when nothing is read
 */
public record Surroundings(Range ambient, Toleranced supply, DesignRules rules, Optional<Converter> adc) {

    /** Temperature to which tolerances and offsets refer, °C (customary in data sheets). */
    public static final double REFERENCE_TEMPERATURE = 25;

    /** Temperature coefficient of copper at 20 °C, 1/K (IEC 60028:1925, 0.00393). */
    public static final double COPPER_COEFFICIENT = 3.93e-3;

    /** Temperature to which the copper coefficient and mounting resistances refer, °C (IEC 60028:1925). */
    public static final double COPPER_TEMPERATURE = 20;

    /**
     * @param adc    the board's converter
     * @param source its full scale
     */
    public record Converter(Adc adc, SourceVoltage source) {
        /** Size of one step, V. */
        public double step() {
            return source.voltage().nominal() / (1 << adc.bits());
        }
    }
}
