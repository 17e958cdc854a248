package shuntwright.io.boardfile;

import java.util.HashSet;
import java.util.List;

import shuntwright.board.Objective;
import shuntwright.board.Preference;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class PreferenceForm extends Form<Preference> {
    private final Key<List<Objective>> order = withDefault("order",
            Kinds.list(Kinds.choice(Objective::word, Objective.values())),
            Preference.DEFAULT.order(),
            "what is wanted: the first decides, each next one among choices equally good so far; none twice");
    private final Key<Double> partNumberCost = withDefault("partNumberCost",
            Kinds.bare("the catalogue's currency", Bounds.NOT_NEGATIVE), Preference.DEFAULT.partNumberCost(),
            "cost of one more distinct part number in the whole build");
    private final Key<Integer> rounds = withDefault("rounds", Kinds.whole(0, Preference.MOST_ROUNDS),
            Preference.DEFAULT.rounds(),
            "of the search for the best choice; more take longer and may find better ones");
    private final Key<Double> timeLimit = optional("timeLimit", Quantities.number(Dimension.TIME, Bounds.POSITIVE),
            "no limit", "after which the search ends with the best found (which then depends on the machine)");
    private final Key<Long> seed = withDefault("seed", Kinds.whole(), Preference.DEFAULT.seed(), "of the search");

    PreferenceForm() {
        super("Preference");
    }

    @Override
    protected void check(Fields fields) {
        fields.find(order).ifPresent(wanted -> {
            if (wanted.isEmpty()) {
                fields.problem(order, "at least one objective is needed; remove the key for the default order");
            } else if (new HashSet<>(wanted).size() != wanted.size()) {
                fields.problem(order, "no objective may stand twice; remove the later one");
            }
        });
    }

    @Override
    protected Preference bind(Fields fields) {
        return new Preference(fields.get(order), fields.get(partNumberCost), fields.get(rounds),
                fields.number(timeLimit),
                fields.get(seed));
    }

    @Override
    protected void fill(Preference value, Sheet sheet) {
        sheet.put(order, value.order());
        sheet.put(partNumberCost, value.partNumberCost());
        sheet.put(rounds, value.rounds());
        sheet.put(timeLimit, value.timeLimit());
        sheet.put(seed, value.seed());
    }
}
