package shuntwright.planner.window.choice;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import shuntwright.board.Board;
import shuntwright.plan.BoardChoice;
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
        OptionalDouble gap = reached.gap();
        String bound = reached.bound().isPresent()
                ? Aims.show(reached.objective(), reached.bound().getAsDouble(), currency)
                : reached.proof() == Reached.Proof.PROVEN ? value : "–";
        String distance = gap.isPresent() ? Aims.atMost(gap.getAsDouble()) : "–";
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
        return new Shown.Clash(conflict.words(), conflict.minimal()
                ? "Proven minimal: leaving out any one of these makes the others possible."
                : "Not proven minimal: a part of these may conflict already.",
                conflict.members().stream().map(each -> new Shown.Part(each, demand(each), Relaxing.words(each),
                        current && Relaxing.change(each, board).isPresent())).toList());
    }

    private static String demand(Conflict.Member member) {
        String kind = switch (member.kind()) {
            case SHARED_LIMIT -> "";
            case CHANNEL -> "channel ";
            case TAP -> "tap ";
        };
        String name = member.name().startsWith(kind) ? member.name() : kind + member.name();
        return member.what().isEmpty() ? name : name + ", " + member.what();
    }
}
