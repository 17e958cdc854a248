package shuntwright.io.partsfile;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.parts.ResistorSeries;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.ESeries;
import shuntwright.quantity.Range;

final class ResistorSeriesForm extends PartForm<ResistorSeries> {
    private final Key<ESeries> series = required("series", Kinds.choice(ESeries::name, ESeries.values()),
            "preferred values, IEC 60063");
    private final Key<Range> values = required("values", Quantities.range(Dimension.RESISTANCE, Bounds.POSITIVE),
            "smallest and largest value made");
    private final Key<Double> tolerance = required("tolerance", PartKinds.ERROR,
            "limit of the deviation as delivered");
    private final Key<Double> temperatureCoefficient = required("temperatureCoefficient", PartKinds.DRIFT,
            "limit of its magnitude, referred to 25 °C");
    private final Key<Double> ageing = withDefault("ageing", PartKinds.ERROR, 0.0, "largest relative change over life");
    private final Key<Double> correlation = withDefault("correlation", PartKinds.CORRELATION, 0.0,
            "correlation coefficient of tolerance and of temperature coefficient between pieces of one value from one reel");
    private final Key<Double> power = required("power", PartKinds.POWER, "rated dissipation");
    private final SaleKeys saleKeys = makeSaleKeys();

    ResistorSeriesForm() {
        super("Resistor series");
    }

    @Override
    SaleKeys saleKeys() {
        return saleKeys;
    }

    @Override
    protected ResistorSeries bind(Fields fields) {
        return new ResistorSeries(partNumber(fields), description(fields), fields.get(series), fields.get(values),
                fields.get(tolerance), fields.get(temperatureCoefficient), fields.get(ageing),
                fields.get(correlation), fields.get(power), purchase(fields));
    }

    @Override
    void fillOwn(ResistorSeries value, Sheet sheet) {
        sheet.put(series, value.series());
        sheet.put(values, value.values());
        sheet.put(tolerance, value.tolerance());
        sheet.put(temperatureCoefficient, value.temperatureCoefficient());
        sheet.put(ageing, value.ageing());
        sheet.put(correlation, value.correlation());
        sheet.put(power, value.power());
    }
}
