package shuntwright.planner.window.shared;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.Board;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.ChoiceWords;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;
import shuntwright.planner.entry.BoardField;
import shuntwright.planner.window.figures.Aims;

/** The tile that says what is wanted of the board-wide choice, and how good it is. */
final class ChoiceTile {
    private static final List<BoardField> FIELDS = List.of(BoardField.WANTED, BoardField.PART_NUMBER_COST,
            BoardField.ROUNDS, BoardField.TIME_LIMIT, BoardField.CHOICE_SEED);

    private ChoiceTile() {
    }

    static SharedTile of(Board board, Optional<Plan> plan) {
        Optional<BoardChoice> choice = plan.flatMap(Plan::choice);
        String wanted = board.preference().order().getFirst().word();
        boolean holds = choice.map(each -> each.broken().isEmpty() && each.conflict().isEmpty()).orElse(true);
        SharedTile tile = new SharedTile("Choice, " + wanted, choice.map(ChoiceTile::value).orElse("–"),
                OptionalDouble.empty(), holds, FIELDS);
        return choice.isEmpty() ? tile : tile.withDetails(details(choice.get(), plan.get().currency()));
    }

    private static String value(BoardChoice choice) {
        return choice.conflict().isPresent()
                ? "demands conflict"
                : choice.reached().isEmpty() ? "–" : proof(choice.reached().getFirst());
    }

    private static String proof(Reached reached) {
        return switch (reached.proof()) {
            case PROVEN -> "proven best";
            case BOUNDED -> "at most " + ChoiceWords.distance(reached) + " from best";
            case OPEN -> "no bound known";
        };
    }

    private static List<String> details(BoardChoice choice, String currency) {
        List<String> lines = new ArrayList<>();
        for (Reached each : choice.reached()) {
            lines.add(Aims.wanted(each.objective()) + ": " + Aims.show(each.objective(), each.value(), currency) + ", "
                    + proof(each));
        }
        if (!choice.broken().isEmpty()) {
            lines.add("Breaks the limit of " + String.join(", ", choice.broken()) + ".");
        }
        choice.conflict().ifPresent(each -> lines.add(each.words()));
        return lines;
    }
}
