package shuntwright.accuracy;

/** What is asked of a channel's equations; each a current in A. */
public enum Outcome {
    TRIP("trip current"), RELEASE("release current"), READING_AT_LEAST("reading at least current"),
    READING_AT_LOAD("reading at load current");

    private final String words;

    Outcome(String words) {
        this.words = words;
    }

    public String words() {
        return words;
    }
}
