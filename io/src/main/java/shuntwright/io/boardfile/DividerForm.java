package shuntwright.io.boardfile;

import shuntwright.board.Tap;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class DividerForm extends Form<Tap.Kind.Divider> {
    private final Key<Double> top = optional("top", Quantities.number(Dimension.RESISTANCE, Bounds.POSITIVE),
            "chosen by the program", "pinned resistance from source to tap");
    private final Key<Double> bottom = optional("bottom", Quantities.number(Dimension.RESISTANCE, Bounds.POSITIVE),
            "chosen by the program", "pinned resistance from tap to ground");

    DividerForm() {
        super("Divider");
    }

    @Override
    protected Tap.Kind.Divider bind(Fields fields) {
        return new Tap.Kind.Divider(fields.number(top), fields.number(bottom));
    }

    @Override
    protected void fill(Tap.Kind.Divider value, Sheet sheet) {
        sheet.put(top, value.top());
        sheet.put(bottom, value.bottom());
    }
}
