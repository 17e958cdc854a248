package shuntwright.io.boardfile;

import shuntwright.board.Withstand;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Sheet;

final class ConductorForm extends Form<Withstand.Conductor> {
    private final Key<Double> area = required("area", Kinds.bare("mm²", Bounds.POSITIVE), "cross-section");
    private final Key<Double> constant = required("constant", Kinds.bare("A·√s/mm²", Bounds.POSITIVE),
            "k of IEC 60364-4-43, for example 115 for copper with PVC insulation");

    ConductorForm() {
        super("Conductor");
    }

    @Override
    protected Withstand.Conductor bind(Fields fields) {
        return new Withstand.Conductor(fields.get(area), fields.get(constant));
    }

    @Override
    protected void fill(Withstand.Conductor value, Sheet sheet) {
        sheet.put(area, value.area());
        sheet.put(constant, value.constant());
    }
}
