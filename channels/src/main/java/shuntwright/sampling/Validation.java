package shuntwright.sampling;

/**
 * Whether the combined uncertainty (JCGM 100) may stand for the propagated distribution (JCGM 101:2008, clause 8): both ends of
 * its interval y ± U agree with those of the probabilistically symmetric coverage interval to within the numerical tolerance that
 * belongs to the stated digits of the standard uncertainty.
 *
 * @param valid          both differences are within the tolerance
 * @param digits         significant digits of the standard uncertainty, 1 or 2
 * @param tolerance      δ, A
 * @param lowDifference  |y − U − y_low|, A
 * @param highDifference |y + U − y_high|, A
 */
public record Validation(boolean valid, int digits, double tolerance, double lowDifference, double highDifference) {}
