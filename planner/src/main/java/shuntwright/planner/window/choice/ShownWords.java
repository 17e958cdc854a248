package shuntwright.planner.window.choice;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;

import shuntwright.board.Board;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.ChoiceWords;
import shuntwright.plan.Conflict;
import shuntwright.plan.Reached;
import shuntwright.planner.window.figures.Aims;
import shuntwright.planner.window.figures.Took;
import shuntwright.planner.work.TrialWords;

/** A choice in words. */
final class ShownWords {
    private ShownWords() {
    }

    static List<Shown.Aim> aims(BoardChoice choice, String currency) {
        return choice.reached().stream().map(each -> aim(each, currency)).toList();
    }

    private static Shown.Aim aim(Reached reached, String currency) {
        String wanted = Aims.wanted(reached.objective());
        String value = Aims.show(reached.objective(), reached.value(), currency);
        String bound = reached.bound().isPresent()
                ? Aims.show(reached.objective(), reached.bound().getAsDouble(), currency)
                : reached.proof() == Reached.Proof.PROVEN ? value : "–";
        String distance = switch (reached.proof()) {
            case PROVEN -> "0 %";
            case BOUNDED -> ChoiceWords.distance(reached);
            case OPEN -> "–";
        };
        return new Shown.Aim(wanted, value, bound, distance, reached.proof(), switch (reached.proof()) {
            case PROVEN -> "proven best";
            case BOUNDED -> "at most " + distance + " from the best";
            case OPEN -> "no bound known";
        });
    }

    static List<Shown.Fact> facts(BoardChoice choice, Duration took) {
        List<Shown.Fact> facts = new ArrayList<>();
        if (!took.isZero()) {
            facts.add(new Shown.Fact("Time it took", Took.words(took)));
        }
        facts.add(new Shown.Fact("Rounds", TrialWords.count(choice.rounds())
                + (choice.cutShort() ? ", ended early" : "")));
        facts.add(new Shown.Fact("Seed", Long.toString(choice.seed())));
        facts.add(new Shown.Fact("Candidates", TrialWords.count(choice.candidates()) + ", compared "
                + TrialWords.count(choice.kept())));
        return facts;
    }

    /** @param current false when the conflict is of an earlier state of the board, so that nothing can be applied */
    static Shown.Clash clash(Conflict conflict, Board board, boolean current) {
        return new Shown.Clash(conflict.minimal()
                ? "Demands that cannot be met together; without any one of them the others can"
                : "Demands that cannot be met together; a part of them may conflict already",
                conflict.words(),
                conflict.members().stream().map(each -> new Shown.Part(each, demand(each), ChoiceWords.relaxed(each),
                        current && Relaxing.change(each, board).isPresent())).toList());
    }

    private static String demand(Conflict.Member member) {
        return ChoiceWords.owner(member) + (member.what().isEmpty() ? "" : ", " + member.what());
    }
}
