package shuntwright.io.boardfile;

import shuntwright.board.Tap;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class DacForm extends Form<Tap.Kind.Dac> {
    private final Key<Integer> bits = required("bits", Kinds.whole(4, 20), "resolution");
    private final Key<Double> gainError = withDefault("gainError", Quantities.limit(Dimension.RATIO, Bounds.BELOW_ONE),
            0.0, "limit of the gain error, without the source's own error");
    private final Key<Double> offset = withDefault("offset", Quantities.limit(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE),
            0.0, "limit of the offset");
    private final Key<Double> nonlinearity = withDefault("nonlinearity", Kinds.bare("steps", Bounds.NOT_NEGATIVE), 0.0,
            "limit of the integral non-linearity in steps (LSB)");

    DacForm() {
        super("DAC");
    }

    @Override
    protected Tap.Kind.Dac bind(Fields fields) {
        return new Tap.Kind.Dac(fields.get(bits), fields.get(gainError), fields.get(offset), fields.get(nonlinearity));
    }

    @Override
    protected void fill(Tap.Kind.Dac value, Sheet sheet) {
        sheet.put(bits, value.bits());
        sheet.put(gainError, value.gainError());
        sheet.put(offset, value.offset());
        sheet.put(nonlinearity, value.nonlinearity());
    }
}
