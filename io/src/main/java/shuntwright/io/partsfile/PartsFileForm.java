package shuntwright.io.partsfile;

import java.util.List;
import java.util.Optional;

import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Sheet;
import shuntwright.parts.CapacitorSeries;
import shuntwright.parts.Comparator;
import shuntwright.parts.Reference;
import shuntwright.parts.ResistorSeries;
import shuntwright.parts.SenseAmplifier;
import shuntwright.parts.Shunt;

final class PartsFileForm extends Form<PartsFile> {
    private final ShuntForm shuntForm = new ShuntForm();
    private final AmplifierForm amplifierForm = new AmplifierForm();
    private final ComparatorForm comparatorForm = new ComparatorForm();
    private final VoltageReferenceForm referenceForm = new VoltageReferenceForm();
    private final ResistorSeriesForm resistorForm = new ResistorSeriesForm();
    private final CapacitorSeriesForm capacitorForm = new CapacitorSeriesForm();

    private final Key<String> format = required("format", PartsFiles.FORMAT.kind(), "kind and version of the file");
    private final Key<String> currency = required("currency", Kinds.text("text", "the three capital letters of a "
            + "currency, for example \"EUR\",", PartsFileForm::readCurrency, text -> text),
            "ISO 4217 code of all prices; the same in all parts files of a board");
    private final Key<String> note = withDefault("note", Kinds.text(), "",
            "free text, for example where the data are from");
    private final Key<List<Shunt>> shunts = withDefault("shunts", Kinds.list(shuntForm), List.of(),
            "current sense resistors");
    private final Key<List<SenseAmplifier>> amplifiers = withDefault("amplifiers", Kinds.list(amplifierForm), List.of(),
            "current sense amplifiers of fixed gain");
    private final Key<List<Comparator>> comparators = withDefault("comparators", Kinds.list(comparatorForm), List.of(),
            "comparators with an open-drain output");
    private final Key<List<Reference>> references = withDefault("references", Kinds.list(referenceForm), List.of(),
            "precision voltage references");
    private final Key<List<ResistorSeries>> resistorSeries = withDefault("resistorSeries", Kinds.list(resistorForm),
            List.of(), "resistors for dividers, hysteresis and pull-ups");
    private final Key<List<CapacitorSeries>> capacitorSeries = withDefault("capacitorSeries",
            Kinds.list(capacitorForm), List.of(), "capacitors for filters");

    PartsFileForm() {
        super("Parts file");
    }

    private static Optional<String> readCurrency(String text) {
        return text.matches("[A-Z]{3}") ? Optional.of(text) : Optional.empty();
    }

    List<Form<?>> all() {
        return List.of(this, shuntForm, amplifierForm, comparatorForm, comparatorForm.hysteresisForm, referenceForm,
                resistorForm, capacitorForm);
    }

    @Override
    protected PartsFile bind(Fields fields) {
        return new PartsFile(fields.get(currency), fields.get(note), fields.get(shunts), fields.get(amplifiers),
                fields.get(comparators), fields.get(references), fields.get(resistorSeries),
                fields.get(capacitorSeries));
    }

    @Override
    protected void fill(PartsFile value, Sheet sheet) {
        sheet.put(format, PartsFiles.FORMAT.text());
        sheet.put(currency, value.currency());
        sheet.put(note, value.note());
        sheet.put(shunts, value.shunts());
        sheet.put(amplifiers, value.amplifiers());
        sheet.put(comparators, value.comparators());
        sheet.put(references, value.references());
        sheet.put(resistorSeries, value.resistors());
        sheet.put(capacitorSeries, value.capacitors());
    }
}
