package shuntwright.io.partsfile;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.parts.CapacitorSeries;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;

final class CapacitorSeriesForm extends PartForm<CapacitorSeries> {
    private final Key<ESeries> series = required("series", Kinds.choice(ESeries::name, ESeries.values()),
            "preferred values, IEC 60063");
    private final Key<Range> values = required("values", Quantities.range(Dimension.CAPACITANCE, Bounds.POSITIVE),
            "smallest and largest value made");
    private final Key<Tolerance> tolerance = required("tolerance", Quantities.tolerance(),
            "deviation including temperature and bias");
    private final Key<Double> voltage = required("voltage", PartKinds.VOLTAGE, "rated voltage");
    private final Key<String> dielectric = withDefault("dielectric", Kinds.text(), "", "class of the dielectric");
    private final SaleKeys saleKeys = makeSaleKeys();

    CapacitorSeriesForm() {
        super("Capacitor series");
    }

    @Override
    SaleKeys saleKeys() {
        return saleKeys;
    }

    @Override
    protected CapacitorSeries bind(Fields fields) {
        return new CapacitorSeries(partNumber(fields), description(fields), fields.get(series), fields.get(values),
                fields.get(tolerance), fields.get(voltage), fields.get(dielectric), purchase(fields));
    }

    @Override
    void fillOwn(CapacitorSeries value, Sheet sheet) {
        sheet.put(series, value.series());
        sheet.put(values, value.values());
        sheet.put(tolerance, value.tolerance());
        sheet.put(voltage, value.voltage());
        sheet.put(dielectric, value.dielectric());
    }
}
