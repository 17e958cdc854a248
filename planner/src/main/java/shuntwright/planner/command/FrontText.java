package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import shuntwright.board.Objective;
import shuntwright.io.planfile.Cautions;
import shuntwright.plan.BoardChoice;
import shuntwright.plan.ChoiceWords;
import shuntwright.plan.Front;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;

/** A front as text: a line for each plan. */
final class FrontText {
    private static final int NOT_PAINTED = -1;

    private FrontText() {
    }

    static List<String> of(Question.Answered<Front> answered) {
        Front front = answered.answer();
        Plan now = answered.plan();
        int count = front.points().size();
        List<String> lines = new ArrayList<>();
        lines.add(Spelling.harmless(now.board().name()) + ": " + front.first().word() + " against "
                + front.second().word() + ", " + count + (count == 1 ? " plan" : " plans") + " of the whole board, "
                + ChoiceText.words(answered.took()));
        if (count == 0) {
            lines.add("No plan keeps to every shared limit: the command plan says what is in the way.");
        } else {
            lines.add("");
            lines.addAll(table(front, now));
            lines.add("");
            lines.add("From bound: while " + front.first().word()
                    + " is no worse than in that plan, nothing is better in "
                    + front.second().word());
            lines.add(
                    "by more; \"open\" where nothing is known. Plans that were not found may lie between. Nothing here is");
            lines.add("sampled. Now: the board's own plan, for what the board file wants.");
        }
        lines.add("");
        lines.add(Cautions.LINE);
        return List.copyOf(lines);
    }

    private static List<String> table(Front front, Plan now) {
        Columns table = new Columns(NOT_PAINTED);
        table.add(List.of("plan", front.first().word(), front.second().word(), "from bound",
                "whole build", "part numbers", "all accepted"));
        int number = 0;
        for (Front.Point each : front.points()) {
            table.add(row(Integer.toString(++number), each.plan(), distance(each.plan(), front.second()),
                    ChoiceWords.value(front.first(), each.first(), now.currency()),
                    ChoiceWords.value(front.second(), each.second(), now.currency())));
        }
        table.add(row("now", now, "-", own(now, front.first()), own(now, front.second())));
        return table.lines();
    }

    private static List<String> row(String name, Plan plan, String distance, String first, String second) {
        return List.of(name, first, second, distance, ChoiceWords.money(plan.buildCost(), plan.currency()),
                Integer.toString(plan.parts().size()),
                plan.accepted() ? "yes" : "no");
    }

    /** What the board's own plan reaches of it, where it was asked for. */
    private static String own(Plan plan, Objective objective) {
        return reached(plan, objective).map(each -> ChoiceWords.value(objective, each.value(), plan.currency()))
                .orElse("-");
    }

    private static String distance(Plan plan, Objective objective) {
        return reached(plan, objective).map(ChoiceWords::distance).orElse("-");
    }

    private static Optional<Reached> reached(Plan plan, Objective objective) {
        return plan.choice().map(BoardChoice::reached).orElse(List.of()).stream()
                .filter(each -> each.objective() == objective).findFirst();
    }
}
