package shuntwright.planner.command;

/** What the program tells the shell. */
enum ExitCode {
    ACCEPTED(0, "every channel is accepted"),
    NOT_ACCEPTED(1, "planned or checked, but something is not accepted"),
    BAD_INPUT(2, "a file or an option is at fault"),
    OUR_FAULT(3, "the program is at fault");

    private final int number;
    private final String words;

    ExitCode(int number, String words) {
        this.number = number;
        this.words = words;
    }

    int number() {
        return number;
    }

    String words() {
        return words;
    }
}
