package shuntwright.io.boardfile;

import shuntwright.board.SenseSupply;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Toleranced;

final class SupplyForm extends Form<SenseSupply> {
    private final Key<Toleranced> voltage = withDefault("voltage",
            Quantities.toleranced(Dimension.VOLTAGE, Bounds.POSITIVE), SenseSupply.DEFAULT.voltage(),
            "sense supply voltage over temperature, load and life");
    private final Key<Double> availableCurrent = withDefault("availableCurrent",
            Quantities.number(Dimension.CURRENT, Bounds.POSITIVE), SenseSupply.DEFAULT.availableCurrent(),
            "what all sense circuits together may draw");

    SupplyForm() {
        super("Supply");
    }

    @Override
    protected SenseSupply bind(Fields fields) {
        return new SenseSupply(fields.get(voltage), fields.get(availableCurrent));
    }

    @Override
    protected void fill(SenseSupply value, Sheet sheet) {
        sheet.put(voltage, value.voltage());
        sheet.put(availableCurrent, value.availableCurrent());
    }
}
