package shuntwright.io.boardfile;

import java.util.OptionalInt;

import shuntwright.board.Pins;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class PinsForm extends Form<Pins> {
    private static final String FREE = "free";
    private static final Kind<Double> RESISTANCE = Quantities.number(Dimension.RESISTANCE, Bounds.POSITIVE);

    private final Key<String> shunt = optional("shunt", Kinds.name(), FREE, "part number of the shunt");
    private final Key<Integer> shuntCount = optional("shuntCount", Kinds.whole(1, Integer.MAX_VALUE), FREE,
            "shunts in parallel");
    private final Key<String> amplifier = optional("amplifier", Kinds.name(), FREE,
            "part number of the sense amplifier");
    private final Key<String> comparator = optional("comparator", Kinds.name(), FREE, "part number of the comparator");
    private final Key<String> resistors = optional("resistors", Kinds.name(), FREE,
            "part number of the series of divider and hysteresis resistors");
    private final Key<Double> dividerTop = optional("dividerTop", RESISTANCE, FREE,
            "resistor from the source to the threshold");
    private final Key<Double> dividerBottom = optional("dividerBottom", RESISTANCE, FREE,
            "resistor from the threshold to ground");
    private final Key<Double> hysteresisResistor = optional("hysteresisResistor", RESISTANCE, FREE,
            "resistor that sets the hysteresis");

    PinsForm() {
        super("Pins");
    }

    @Override
    protected Pins bind(Fields fields) {
        OptionalInt count = fields.find(shuntCount).map(OptionalInt::of).orElse(OptionalInt.empty());
        return new Pins(fields.find(shunt), count, fields.find(amplifier), fields.find(comparator),
                fields.find(resistors), fields.number(dividerTop), fields.number(dividerBottom),
                fields.number(hysteresisResistor));
    }

    @Override
    protected void fill(Pins value, Sheet sheet) {
        sheet.put(shunt, value.shunt());
        value.shuntCount().ifPresent(count -> sheet.put(shuntCount, count));
        sheet.put(amplifier, value.amplifier());
        sheet.put(comparator, value.comparator());
        sheet.put(resistors, value.resistors());
        sheet.put(dividerTop, value.dividerTop());
        sheet.put(dividerBottom, value.dividerBottom());
        sheet.put(hysteresisResistor, value.hysteresisResistor());
    }
}
