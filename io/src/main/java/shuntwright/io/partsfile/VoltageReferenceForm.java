package shuntwright.io.partsfile;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Key;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.parts.Reference;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;
import shuntwright.quantity.Toleranced;

final class VoltageReferenceForm extends PartForm<Reference> {
    private final Key<Toleranced> voltage = required("voltage",
            Quantities.toleranced(Dimension.VOLTAGE, Bounds.POSITIVE), "at 25 °C without load");
    private final Key<Double> drift = required("drift", PartKinds.DRIFT, "limit of its magnitude, referred to 25 °C");
    private final Key<Double> ageing = withDefault("ageing", PartKinds.ERROR, 0.0, "largest relative change over life");
    private final Key<Double> loadRegulation = required("loadRegulation",
            Quantities.number(Dimension.RESISTANCE, Bounds.NOT_NEGATIVE),
            "largest fall of the voltage per load current (V/A, that is Ω)");
    private final Key<Double> availableCurrent = required("availableCurrent", PartKinds.CURRENT, "largest load");
    private final Key<Range> supply = required("supply", PartKinds.SUPPLY, "supply voltage");
    private final Key<Double> supplyCurrent = required("supplyCurrent", PartKinds.LEAKAGE,
            "own consumption without load");
    private final SaleKeys saleKeys = makeSaleKeys();

    VoltageReferenceForm() {
        super("Reference");
    }

    @Override
    SaleKeys saleKeys() {
        return saleKeys;
    }

    @Override
    protected Reference bind(Fields fields) {
        return new Reference(partNumber(fields), description(fields), fields.get(voltage), fields.get(drift),
                fields.get(ageing), fields.get(loadRegulation), fields.get(availableCurrent), fields.get(supply),
                fields.get(supplyCurrent), purchase(fields));
    }

    @Override
    void fillOwn(Reference value, Sheet sheet) {
        sheet.put(voltage, value.voltage());
        sheet.put(drift, value.drift());
        sheet.put(ageing, value.ageing());
        sheet.put(loadRegulation, value.loadRegulation());
        sheet.put(availableCurrent, value.availableCurrent());
        sheet.put(supply, value.supply());
        sheet.put(supplyCurrent, value.supplyCurrent());
    }
}
