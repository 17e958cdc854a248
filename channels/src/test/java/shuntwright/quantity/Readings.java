package shuntwright.quantity;

/** Takes readings apart for assertions. */
final class Readings {

    private Readings() {
    }

    static <T> T meaning(Reading<T> reading) {
        return reading.ifValue().orElseThrow(() -> new AssertionError("misread: " + problem(reading)));
    }

    static <T> String problem(Reading<T> reading) {
        return reading.ifProblem().orElseThrow(() -> new AssertionError("read as " + reading));
    }
}
