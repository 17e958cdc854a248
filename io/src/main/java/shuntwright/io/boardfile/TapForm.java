package shuntwright.io.boardfile;

import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.board.Source;
import shuntwright.board.Tap;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class TapForm extends Form<Tap> {
    private static final Tap.Kind.Divider FREE = new Tap.Kind.Divider(OptionalDouble.empty(), OptionalDouble.empty());

    final DividerForm dividerForm = new DividerForm();
    final DacForm dacForm = new DacForm();

    private final Key<String> name = required("name", Kinds.name(), "what channels call it");
    private final Key<Source> source = withDefault("source", SourceWords.KIND, new Source.Supply(),
            "what it takes its voltage from");
    private final Key<Double> voltage = optional("voltage", Quantities.number(Dimension.VOLTAGE, Bounds.POSITIVE),
            "chosen by the program", "wanted voltage");
    private final Key<Tap.Kind.Divider> divider = optional("divider", dividerForm,
            "a free divider, unless `dac` is there",
            "the tap is a divider with these resistors");
    private final Key<Tap.Kind.Dac> dac = optional("dac", dacForm, "no DAC", "the tap is an output of this DAC");

    TapForm() {
        super("Tap");
    }

    @Override
    protected void check(Fields fields) {
        if (fields.has(divider) && fields.has(dac)) {
            fields.problem(dac, "a tap is either a divider or a DAC output; remove \"divider\" or \"dac\"");
        }
    }

    @Override
    protected Tap bind(Fields fields) {
        Optional<Tap.Kind> kind = fields.find(dac).map(there -> there);
        return new Tap(fields.get(name), fields.get(source), kind.orElse(fields.find(divider).orElse(FREE)),
                fields.number(voltage));
    }

    @Override
    protected void fill(Tap value, Sheet sheet) {
        sheet.put(name, value.name());
        sheet.put(source, value.source());
        sheet.put(voltage, value.voltage());
        switch (value.kind()) {
            case Tap.Kind.Divider there -> sheet.put(divider, Optional.of(there).filter(each -> !each.equals(FREE)));
            case Tap.Kind.Dac there -> sheet.put(dac, there);
        }
    }
}
