package shuntwright.planner.command;

import java.util.List;

/** What the user gave cannot be worked with; carries every problem found, each a line of its own. */
final class BadInput extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<String> problems;

    BadInput(List<String> problems) {
        super(String.join("\n", problems));
        this.problems = List.copyOf(problems);
    }

    BadInput(String problem) {
        this(List.of(problem));
    }

    List<String> problems() {
        return problems;
    }
}
