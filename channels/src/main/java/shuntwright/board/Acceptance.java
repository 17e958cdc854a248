package shuntwright.board;

/**
 * When a channel counts as accepted.
 *
 * @param basis    what decides
 * @param coverage coverage probability of the coverage intervals, 0.5 to below 1
 */
public record Acceptance(Basis basis, double coverage) {

    /** What decides. */
    public enum Basis {
        /** Only channels that are inside by limits. */
        LIMITS,
        /** Also channels whose coverage interval is within the demand. */
        COVERAGE
    }

    /** Limits decide; coverage intervals at 99.73 %. */
    public static final Acceptance DEFAULT = new Acceptance(Basis.LIMITS, 0.9973);

    /** @throws IllegalArgumentException unless 0.5 ≤ coverage &lt; 1 */
    public Acceptance {
        if (!(coverage >= 0.5 && coverage < 1)) {
            throw new IllegalArgumentException("coverage probability must be from 0.5 to below 1, got " + coverage);
        }
    }
}
