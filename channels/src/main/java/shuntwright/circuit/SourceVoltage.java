package shuntwright.circuit;

import shuntwright.board.Source;
import shuntwright.quantity.Finite;
import shuntwright.quantity.Toleranced;

/**
 * The voltage a divider, DAC or ADC starts from, with everything that moves it.
 *
 * @param source    supply or a reference of the board
 * @param voltage   V, with its tolerance as delivered (reference) or in total (supply)
 * @param drift     limit of the magnitude of its relative drift, 1/K, referred to 25 °C; 0 for the supply
 * @param ageing    largest relative change over life, a fraction; 0 for the supply
 * @param loadDrop  largest fall at the full available load, V; 0 for the supply
 */
public record SourceVoltage(Source source, Toleranced voltage, double drift, double ageing, double loadDrop) {

    /** @throws IllegalArgumentException unless the voltage is &gt; 0 and the limits ≥ 0 */
    public SourceVoltage {
        if (!(voltage.min() > 0) || !Finite.notNegative(drift) || !Finite.notNegative(ageing)
                || !Finite.notNegative(loadDrop)) {
            throw new IllegalArgumentException("a source needs a voltage > 0 and limits ≥ 0, got " + voltage);
        }
    }

    /** True for the sense supply, whose voltage is one draw with the amplifiers' supply. */
    public boolean isSupply() {
        return source instanceof Source.Supply;
    }
}
