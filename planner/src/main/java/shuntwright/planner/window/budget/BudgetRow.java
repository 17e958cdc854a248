package shuntwright.planner.window.budget;

/**
 * One input of an outcome as the three readers see it.
 *
 * @param label        what contributes
 * @param owner        whose draw it is
 * @param distribution between or around its limits
 * @param limits       what it does to the limits
 * @param variance     its share of the combined variance
 * @param first        first-order effect index
 * @param total        total effect index
 */
record BudgetRow(String label, String owner, String distribution, Limits limits, Share variance, Share first,
        Share total) {

    /**
     * What an input does to the limits.
     *
     * @param low      how far it moves the lower limit, in amperes, in words
     * @param high     how far it moves the upper limit
     * @param ofTarget both, of the trip target
     * @param lowBar   length of the bar below, a share of the longest bar, -1 to 1
     * @param highBar  length of the bar above
     * @param widest   larger of both contributions, A, for sorting
     */
    record Limits(String low, String high, String ofTarget, double lowBar, double highBar, double widest) {}

    /**
     * A share of the variance.
     *
     * @param text  in words
     * @param note  how sure it is, in words; empty where there is nothing to say
     * @param value 0 to 1 but for chance; −1 where it is not known
     * @param error standard error; 0 where it is exact
     */
    record Share(String text, String note, double value, double error) {
        /** Not known yet. */
        static final Share OPEN = new Share("–", "", -1, 0);

        boolean known() {
            return value > -1;
        }
    }
}
