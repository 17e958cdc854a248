package shuntwright.accuracy;

/**
 * What one input contributes to one outcome; currents in A.
 *
 * @param input         which
 * @param sensitivity   partial derivative of the outcome, A per unit of the input
 * @param towardsLow    how much it lowers the lower limit (≤ 0 unless it works the other way)
 * @param towardsHigh   how much it raises the upper limit
 * @param standard      its part of the combined standard uncertainty
 * @param varianceShare its share of u_c²; all add up to 1, and one is negative where correlation takes more away than the input adds
 */
public record BudgetLine(Input input, double sensitivity, double towardsLow, double towardsHigh, double standard,
        double varianceShare) {

    /** The larger of the two limit contributions, A. */
    public double widest() {
        return Math.max(Math.abs(towardsLow), Math.abs(towardsHigh));
    }
}
