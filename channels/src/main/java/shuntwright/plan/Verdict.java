package shuntwright.plan;

/** Whether a channel meets its demand. */
public enum Verdict {
    /** By limits: even the worst case is within the demand. */
    INSIDE("inside"),
    /** Not by limits, but the coverage interval is within. */
    LIKELY("likely"),
    /** Neither. */
    OUTSIDE("outside"),
    /** No choice of parts respects the limits. */
    NO_FIT("no fit"),
    /** Data are missing, so nothing was planned. */
    INCOMPLETE("incomplete");

    private final String word;

    Verdict(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }
}
