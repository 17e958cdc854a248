package shuntwright.planner.proof;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

import shuntwright.selection.Aim;
import shuntwright.selection.Answer;
import shuntwright.selection.Option;
import shuntwright.selection.Prover;
import shuntwright.selection.Selection;
import shuntwright.selection.Selector;

/** Looks at what the child says by means that are not the child's. */
final class Check {

    private static final double SAME = 1e-9;

    private Check() {
    }

    /** The value of the aim (0 without one) of a selection that keeps to all limits and caps; empty for any other. */
    static OptionalDouble value(Selection selection, Prover.Question question, List<Integer> choice) {
        if (choice.size() != selection.slots().size()) {
            return OptionalDouble.empty();
        }
        Map<Integer, Integer> values = new HashMap<>();
        for (int slot = 0; slot < choice.size(); slot++) {
            Selection.Menu menu = selection.menus().get(selection.slots().get(slot).menu());
            int at = choice.get(slot);
            if (at < 0 || at >= menu.options().size()) {
                return OptionalDouble.empty();
            }
            Option option = menu.options().get(at);
            Integer before = menu.group() < 0 ? null : values.put(menu.group(), option.value());
            if (before != null && before != option.value()) {
                return OptionalDouble.empty();
            }
        }
        List<Aim> aims = new ArrayList<>(question.caps().stream().map(Aim.Cap::aim).toList());
        question.aim().ifPresent(aims::add);
        Answer answer = Selector.look(selection, aims, choice);
        if (!answer.keepsLimits()) {
            return OptionalDouble.empty();
        }
        for (int i = 0; i < question.caps().size(); i++) {
            if (above(answer.reached().get(i).value(), question.caps().get(i).most())) {
                return OptionalDouble.empty();
            }
        }
        return OptionalDouble.of(question.aim().isPresent() ? answer.reached().getLast().value() : 0);
    }

    /** More than rounding above. */
    static boolean above(double value, double most) {
        return value - most > SAME * Math.max(Math.abs(most), 1e-12);
    }
}
