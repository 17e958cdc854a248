package shuntwright.quantity;

/**
 * A relative tolerance, possibly lopsided ("+1/-3 %").
 *
 * @param below how far below nominal, as a fraction ≥ 0 and &lt; 1
 * @param above how far above nominal, as a fraction ≥ 0
 */
public record Tolerance(double below, double above) {

    public static final Tolerance NONE = new Tolerance(0, 0);

    /** @throws IllegalArgumentException unless 0 ≤ below &lt; 1 and 0 ≤ above, both finite */
    public Tolerance {
        if (!(below >= 0 && below < 1) || !(above >= 0) || Double.isInfinite(above)) {
            throw new IllegalArgumentException(
                    "a tolerance needs fractions with 0 ≤ below < 1 and above ≥ 0, got -" + below + " / +" + above);
        }
        // Adding 0 turns -0 into 0, so that equal tolerances are equal records.
        below += 0.0;
        above += 0.0;
    }

    /** @param fraction the same on both sides, 0.01 for ±1 % */
    public static Tolerance symmetric(double fraction) {
        return new Tolerance(fraction, fraction);
    }

    /** The larger side, a fraction. */
    public double widest() {
        return Math.max(below, above);
    }

    public boolean isSymmetric() {
        return below == above;
    }
}
