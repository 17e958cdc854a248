package shuntwright.board;

import shuntwright.quantity.Finite;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/**
 * The supply that all sense circuits share.
 *
 * @param voltage          over temperature, load and life, V
 * @param availableCurrent for all sense circuits together, A
 */
public record SenseSupply(Toleranced voltage, double availableCurrent) {

    /** 3.3 V ±2 %, 100 mA. */
    public static final SenseSupply DEFAULT = new SenseSupply(new Toleranced(3.3, Tolerance.symmetric(0.02)), 0.1);

    /** @throws IllegalArgumentException unless voltage and current are &gt; 0 */
    public SenseSupply {
        if (!(voltage.min() > 0) || !Finite.positive(availableCurrent)) {
            throw new IllegalArgumentException("the sense supply needs voltage and available current > 0");
        }
    }
}
