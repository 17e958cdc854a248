package shuntwright.io.boardfile;

import shuntwright.board.Adc;
import shuntwright.board.Source;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class AdcForm extends Form<Adc> {
    private final Key<Source> source = withDefault("source", SourceWords.KIND, new Source.Supply(),
            "whose voltage is the full scale");
    private final Key<Integer> bits = required("bits", Kinds.whole(6, 24), "resolution");
    private final Key<Double> gainError = withDefault("gainError", Quantities.limit(Dimension.RATIO, Bounds.BELOW_ONE),
            0.0, "limit of the gain error, without the source's own error");
    private final Key<Double> offset = withDefault("offset", Quantities.limit(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE),
            0.0, "limit of the offset");
    private final Key<Double> nonlinearity = withDefault("nonlinearity", Kinds.bare("steps", Bounds.NOT_NEGATIVE), 0.0,
            "limit of the integral non-linearity in steps (LSB)");

    AdcForm() {
        super("ADC");
    }

    @Override
    protected Adc bind(Fields fields) {
        return new Adc(fields.get(source), fields.get(bits), fields.get(gainError), fields.get(offset),
                fields.get(nonlinearity));
    }

    @Override
    protected void fill(Adc value, Sheet sheet) {
        sheet.put(source, value.source());
        sheet.put(bits, value.bits());
        sheet.put(gainError, value.gainError());
        sheet.put(offset, value.offset());
        sheet.put(nonlinearity, value.nonlinearity());
    }
}
