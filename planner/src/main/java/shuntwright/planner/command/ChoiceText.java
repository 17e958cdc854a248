package shuntwright.planner.command;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

import shuntwright.plan.BoardChoice;
import shuntwright.plan.ChoiceWords;
import shuntwright.plan.Conflict;
import shuntwright.plan.Plan;
import shuntwright.plan.Reached;

/** The board-wide choice as text: what was wanted and reached, how sure that is, what cannot be met together. */
final class ChoiceText {
    private static final int NOT_PAINTED = -1;
    /** Objectives named while the search goes on, so that they stay on one line. */
    private static final int NAMED = 2;

    private ChoiceText() {
    }

    /**
     * What was wanted, what is reached of it and what is known of better ones.
     *
     * @param took to choose the parts; empty where that is not known
     */
    static List<String> of(BoardChoice choice, String currency, Optional<Duration> took) {
        Columns lines = new Columns(NOT_PAINTED);
        lines.add(List.of("chosen for",
                ChoiceWords.order(choice.reached().stream().map(Reached::objective).toList())));
        for (Reached each : choice.reached()) {
            lines.add(
                    List.of(each.objective().word(), ChoiceWords.value(each.objective(), each.value(), currency) + ", "
                            + ChoiceWords.proof(each, currency)));
        }
        lines.add(List.of("among", ChoiceWords.among(choice)));
        lines.add(List.of("search", took.map(time -> words(time) + ", ").orElse("") + ChoiceWords.search(choice)));
        if (!choice.broken().isEmpty()) {
            lines.add(List.of("limits broken", String.join(", ", choice.broken())));
        }
        return lines.lines();
    }

    /** What cannot be met together, and what each demand alone would have to be. */
    static List<String> of(Conflict conflict) {
        List<String> lines = new ArrayList<>();
        lines.add("Cannot be met together");
        lines.add("  " + Spelling.harmless(conflict.words()));
        Columns members = new Columns(NOT_PAINTED);
        for (Conflict.Member each : conflict.members()) {
            members.add(List.of("", ChoiceWords.owner(each), each.what(), ChoiceWords.relaxed(each)));
        }
        lines.addAll(members.lines());
        lines.add("  " + ChoiceWords.minimal(conflict));
        return List.copyOf(lines);
    }

    /** What the whole build costs: "whole build: 1,234.50 EUR, 12 part numbers". */
    static String build(Plan plan) {
        long unpriced = plan.parts().stream().filter(each -> each.purchase().prices().isEmpty()).count();
        double number = plan.board().preference().partNumberCost();
        return "whole build: " + ChoiceWords.money(plan.buildCost(), plan.currency()) + ", "
                + numbers(plan.parts().size())
                + (number > 0 ? " at " + ChoiceWords.money(number, plan.currency()) + " each among it" : "")
                + (unpriced > 0 ? ", " + unpriced + " without a price" : "");
    }

    static String numbers(int count) {
        return count + (count == 1 ? " part number" : " part numbers");
    }

    /** The best so far in a few signs: "1.8 W (proven), 1,250.00 (2 %)". */
    static String brief(BoardChoice choice) {
        return choice.reached().stream().limit(NAMED)
                .map(each -> ChoiceWords.value(each.objective(), each.value(), "").strip() + " ("
                        + ChoiceWords.distance(each) + ")")
                .collect(Collectors.joining(", "));
    }

    /** "85 ms", "3.2 s", "2 min 5 s". */
    static String words(Duration took) {
        long millis = took.toMillis();
        if (millis < 1000) {
            return Math.max(1, millis) + " ms";
        }
        return millis < 60_000
                ? String.format(Locale.ROOT, "%.1f s", millis / 1e3)
                : took.toMinutes() + " min " + took.toSecondsPart() + " s";
    }
}
