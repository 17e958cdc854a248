package shuntwright.planner.proof;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;

import shuntwright.selection.Prover;
import shuntwright.selection.Selection;

/** What the child has said, as far as it stands up to being looked at. */
final class Conversation {

    private final Selection selection;
    private final Prover.Question question;
    private double bound = Double.NEGATIVE_INFINITY;
    private Optional<List<Integer>> better = Optional.empty();
    /** The least value known to be reached. */
    private OptionalDouble reached;
    private boolean impossible;
    private boolean done;
    private String complaint = "";

    Conversation(Selection selection, Prover.Question question) {
        this.selection = selection;
        this.question = question;
        this.reached = Check.value(selection, question, question.hint());
    }

    /** Takes one line of it; false when there is nothing more to be expected. */
    boolean heard(String line) {
        try {
            for (Word word : Word.values()) {
                String rest = word.rest(line);
                if (rest != null) {
                    take(word, rest.strip());
                }
            }
        } catch (NumberFormatException e) {
            complain("The solver said \"" + shortened(line) + "\", which is no answer.");
        }
        return !done && complaint.isEmpty();
    }

    private void take(Word word, String rest) {
        switch (word) {
            case READY -> {
                // It works; nothing is known yet.
            }
            case BOUND -> bound(Double.parseDouble(rest));
            case BETTER -> better(Stream.of(rest.split(" ")).filter(each -> !each.isEmpty()).map(Integer::valueOf)
                    .toList());
            case IMPOSSIBLE -> impossible = true;
            case FAILED -> complain("The solver could not answer: " + shortened(rest) + ".");
            case DONE -> done = true;
        }
    }

    private void bound(double value) {
        if (Double.isNaN(value) || value == Double.POSITIVE_INFINITY) {
            complain("The solver's bound is no number.");
        } else {
            bound = Math.max(bound, value);
        }
    }

    private void better(List<Integer> choice) {
        OptionalDouble value = Check.value(selection, question, choice);
        if (value.isPresent() && (reached.isEmpty() || value.getAsDouble() < reached.getAsDouble())) {
            reached = value;
            better = Optional.of(choice);
        }
    }

    void complain(String words) {
        complaint = complaint.isEmpty() ? words : complaint;
    }

    boolean isDone() {
        return done;
    }

    static String shortened(String text) {
        return text.length() > 300 ? text.substring(0, 300) + " …" : text;
    }

    Prover.Finding finding() {
        if (reached.isPresent() && (impossible || Check.above(bound, reached.getAsDouble()))) {
            // What is known to be there cannot be impossible, nor less than a bound.
            return new Prover.Finding(OptionalDouble.empty(), better, false,
                    "The solver contradicts a selection that is known; its answer is left aside.");
        }
        boolean known = bound > Double.NEGATIVE_INFINITY && question.aim().isPresent() && !impossible;
        double held = reached.isPresent() ? Math.min(bound, reached.getAsDouble()) : bound;
        return new Prover.Finding(known ? OptionalDouble.of(held) : OptionalDouble.empty(), better, impossible,
                complaint);
    }
}
