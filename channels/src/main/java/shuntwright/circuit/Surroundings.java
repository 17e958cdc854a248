package shuntwright.circuit;

import java.util.List;
import java.util.Optional;

import shuntwright.board.Adc;
import shuntwright.board.DesignRules;
import shuntwright.board.StatedDistribution;
import shuntwright.quantity.Finite;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

/**
 * What all channels of a board share as far as one channel's equations see it.
 *
 * @param ambient °C
 * @param supply  sense supply, V
 * @param rules   design rules
 * @param adc     converter with its source; empty when nothing is read
 * @param stated  distributions that the user knows of some inputs
 * @param zone    how far the channel's zone warms its parts above ambient; empty for not at all
 */
public record Surroundings(Range ambient, Toleranced supply, DesignRules rules, Optional<Converter> adc,
        List<StatedDistribution> stated, Optional<ZoneRise> zone) {

    public Surroundings {
        stated = List.copyOf(stated);
    }

    /**
     * Warming of a zone's board by its own heat.
     *
     * @param zone its name; all its channels share one draw
     * @param most largest rise above ambient, with every channel at its load current, K; the least is 0, nothing loaded
     */
    public record ZoneRise(String zone, double most) {
        /** @throws IllegalArgumentException unless most ≥ 0 */
        public ZoneRise {
            if (!Finite.notNegative(most)) {
                throw new IllegalArgumentException("the rise of zone " + zone + " must be ≥ 0 K, got " + most);
            }
        }
    }

    /** Temperature around the channel's own parts: from the coldest, unloaded, to the hottest ambient with the zone's rise, °C. */
    public Range local() {
        return Range.of(ambient.min(), ambient.max() + rise());
    }

    /** Largest rise of the zone above ambient, K; 0 without a zone that warms. */
    public double rise() {
        return zone.map(ZoneRise::most).orElse(0.0);
    }

    public Surroundings withZone(Optional<ZoneRise> newZone) {
        return new Surroundings(ambient, supply, rules, adc, stated, newZone);
    }

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
