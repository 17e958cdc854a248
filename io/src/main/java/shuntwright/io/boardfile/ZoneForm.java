package shuntwright.io.boardfile;

import shuntwright.board.Zone;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class ZoneForm extends Form<Zone> {
    private final Key<String> name = required("name", Kinds.name(), "what channels call it");
    private final Key<Double> heatLimit = optional("heatLimit", Quantities.number(Dimension.POWER, Bounds.POSITIVE),
            "no limit", "largest heat of its shunts together");
    private final Key<Double> thermalResistance = optional("thermalResistance",
            Quantities.number(Dimension.THERMAL_RESISTANCE, Bounds.POSITIVE), "its parts stay at ambient temperature",
            "from the zone's board to the ambient air: the zone's own heat warms all parts of its channels");

    ZoneForm() {
        super("Zone");
    }

    @Override
    protected Zone bind(Fields fields) {
        return new Zone(fields.get(name), fields.number(heatLimit), fields.number(thermalResistance));
    }

    @Override
    protected void fill(Zone value, Sheet sheet) {
        sheet.put(name, value.name());
        sheet.put(heatLimit, value.heatLimit());
        sheet.put(thermalResistance, value.thermalResistance());
    }
}
