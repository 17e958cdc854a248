package shuntwright.planner.command;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

import shuntwright.io.planfile.Cautions;
import shuntwright.plan.ChoiceWords;
import shuntwright.plan.Plan;
import shuntwright.plan.WhatIf;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;

/** What the board becomes as one of its limits changes, as text: a line for each value. */
final class WhatIfText {
    private static final int NOT_PAINTED = -1;

    private WhatIfText() {
    }

    static List<String> of(Question.Answered<WhatIf> answered, Vary vary) {
        Plan now = answered.plan();
        OptionalDouble own = vary.now(now.board());
        List<String> lines = new ArrayList<>();
        lines.add(Spelling.harmless(now.board().name()) + ": what if the " + Spelling.harmless(vary.words())
                + " changes; now " + (own.isPresent() ? vary.show(own.getAsDouble()) : "none") + ", "
                + ChoiceText.words(answered.took()));
        lines.add("");
        Columns table = new Columns(NOT_PAINTED);
        table.add(List.of(vary.words(), "whole build", "each board", "heat", "part numbers"));
        for (WhatIf.Point each : answered.answer().points()) {
            table.add(row(vary.show(each.value()), each, now.currency()));
        }
        lines.addAll(table.lines());
        lines.add("");
        lines.add("Each line is a plan of the whole board for " + ChoiceWords.order(now.board().preference().order())
                + ". Nothing here is sampled.");
        lines.add("");
        lines.add(Cautions.LINE);
        return List.copyOf(lines);
    }

    private static List<String> row(String value, WhatIf.Point point, String currency) {
        return point.reached()
                .map(sums -> List.of(value, ChoiceWords.money(sums.cost(), currency),
                        ChoiceWords.money(sums.costPerBoard(), currency),
                        QuantityWriter.show(sums.heat(), Dimension.POWER), Integer.toString(sums.parts())))
                .orElse(List.of(value, "no choice was found that keeps to every shared limit"));
    }
}
