package shuntwright.planner.window.budget;

/**
 * One contribution to an outcome.
 *
 * @param label       what contributes
 * @param low         how far it moves the lower limit, in amperes, in words
 * @param high        how far it moves the upper limit
 * @param lowPercent  the same of the trip target
 * @param highPercent the same of the trip target
 * @param variance    its share of the variance, in words
 * @param lowBar      length of the bar below, a share of the longest bar, -1 to 1
 * @param highBar     length of the bar above
 * @param share       variance share, 0 to 1
 * @param widest      larger of both contributions, A, for sorting
 */
record BudgetRow(String label, String low, String high, String lowPercent, String highPercent, String variance,
        double lowBar, double highBar, double share, double widest) {}
