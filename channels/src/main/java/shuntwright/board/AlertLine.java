package shuntwright.board;

import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Toleranced;

/**
 * A line with a pull-up that the open-drain outputs of one or more channels pull low.
 *
 * @param name           what channels call it
 * @param voltage        the pull-up's supply V_IO, V; empty for the sense supply
 * @param pullUp         resistance, Ω; empty lets the program choose
 * @param inputHigh      least voltage the receiving input takes as high (V_IH), V; empty for 0.7 V_IO
 * @param inputLow       largest voltage it takes as low (V_IL), V; empty for 0.3 V_IO
 * @param inputLeakage   largest input current of the receiver, A
 * @param capacitance    of line and receiver, F
 * @param riseTime       longest allowed 30 % to 70 % rise time, s; empty for no limit
 */
public record AlertLine(String name, Optional<Toleranced> voltage, OptionalDouble pullUp, OptionalDouble inputHigh,
        OptionalDouble inputLow, double inputLeakage, double capacitance, OptionalDouble riseTime) {

    /** @throws IllegalArgumentException unless resistance and rise time are &gt; 0 and the others ≥ 0 */
    public AlertLine {
        if (!Finite.positive(pullUp.orElse(1)) || !Finite.notNegative(inputHigh.orElse(0))
                || !Finite.notNegative(inputLow.orElse(0))
                || !Finite.notNegative(inputLeakage) || !Finite.notNegative(capacitance)
                || !Finite.positive(riseTime.orElse(1))) {
            throw new IllegalArgumentException("alert line " + name + " needs a pull-up and rise time > 0, levels, "
                    + "leakage and capacitance ≥ 0");
        }
    }

    /** A line of that name with every default: 1 µA input, 50 pF. */
    public static AlertLine named(String name) {
        return new AlertLine(name, Optional.empty(), OptionalDouble.empty(), OptionalDouble.empty(),
                OptionalDouble.empty(), 1e-6, 50e-12, OptionalDouble.empty());
    }
}
