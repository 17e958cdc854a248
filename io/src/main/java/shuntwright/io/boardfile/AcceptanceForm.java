package shuntwright.io.boardfile;

import java.util.Locale;

import shuntwright.board.Acceptance;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class AcceptanceForm extends Form<Acceptance> {
    private final Key<Acceptance.Basis> basis = withDefault("basis",
            Kinds.choice(each -> each.name().toLowerCase(Locale.ROOT), Acceptance.Basis.values()),
            Acceptance.DEFAULT.basis(), "whether only channels inside by limits are accepted, or also those whose "
                    + "coverage interval is within the demand");
    private final Key<Double> coverage = withDefault("coverage",
            Quantities.number(Dimension.RATIO, new Bounds(0.5, true, 1, false)), Acceptance.DEFAULT.coverage(),
            "coverage probability of the coverage intervals");

    AcceptanceForm() {
        super("Acceptance");
    }

    @Override
    protected Acceptance bind(Fields fields) {
        return new Acceptance(fields.get(basis), fields.get(coverage));
    }

    @Override
    protected void fill(Acceptance value, Sheet sheet) {
        sheet.put(basis, value.basis());
        sheet.put(coverage, value.coverage());
    }
}
