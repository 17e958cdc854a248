package shuntwright.io.partsfile;

import java.util.Locale;
import java.util.Optional;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.parts.Shunt;
import shuntwright.parts.ShuntRating;
import shuntwright.parts.Terminals;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.Range;
import shuntwright.quantity.Tolerance;

final class ShuntForm extends PartForm<Shunt> {
    private final Key<Double> resistance = required("resistance",
            Quantities.number(Dimension.RESISTANCE, Bounds.POSITIVE, QuantityReader::shuntResistance),
            "nominal at 25 °C");
    private final Key<Tolerance> tolerance = required("tolerance", Quantities.tolerance(), "as delivered, at 25 °C");
    private final Key<Double> temperatureCoefficient = required("temperatureCoefficient", PartKinds.DRIFT,
            "limit of its magnitude, referred to 25 °C");
    private final Key<Double> ageing = withDefault("ageing", PartKinds.ERROR, 0.0, "largest relative change over life");
    private final Key<Double> correlation = withDefault("correlation", PartKinds.CORRELATION, 0.0,
            "correlation coefficient of tolerance and of temperature coefficient between pieces of one reel");
    private final Key<Terminals> terminals = required("terminals",
            Kinds.choice(each -> each.name().toLowerCase(Locale.ROOT), Terminals.values()),
            "whether sense and load current share the joints");
    private final Key<Range> mountingResistance = withDefault("mountingResistance",
            Quantities.range(Dimension.RESISTANCE, Bounds.NOT_NEGATIVE), Range.exactly(0),
            "series resistance of the joints at 20 °C; zero for four terminals");
    private final Key<Double> thermalEmf = withDefault("thermalEmf", PartKinds.OFFSET_DRIFT, 0.0,
            "limit of its magnitude against copper");
    private final Key<Double> power = required("power", PartKinds.POWER, "rated dissipation");
    private final Key<Double> ratedTemperature = withDefault("ratedTemperature",
            Quantities.number(Dimension.TEMPERATURE, PartKinds.TEMPERATURE), 70.0,
            "ambient temperature to which the rating is constant");
    private final Key<Double> maximumTemperature = required("maximumTemperature",
            Quantities.number(Dimension.TEMPERATURE, PartKinds.TEMPERATURE),
            "temperature at which the rating has fallen to zero");
    private final Key<Double> thermalResistance = optional("thermalResistance",
            Quantities.number(Dimension.THERMAL_RESISTANCE, Bounds.NOT_NEGATIVE),
            "(`maximumTemperature` − `ratedTemperature`) / `power`", "element to ambient, mounted");
    private final Key<Double> pulseEnergy = optional("pulseEnergy",
            Quantities.number(Dimension.ENERGY, Bounds.POSITIVE), "not stated", "energy of a single short pulse");
    private final SaleKeys saleKeys = makeSaleKeys();

    ShuntForm() {
        super("Shunt");
    }

    @Override
    SaleKeys saleKeys() {
        return saleKeys;
    }

    @Override
    protected void check(Fields fields) {
        super.check(fields);
        fields.find(maximumTemperature).ifPresent(maximum -> {
            boolean readable = !fields.has(ratedTemperature) || fields.find(ratedTemperature).isPresent();
            if (readable && !(fields.get(ratedTemperature) < maximum)) {
                fields.problem(maximumTemperature, "maximumTemperature must be above ratedTemperature ("
                        + Math.round(fields.get(ratedTemperature)) + " °C)");
            }
        });
        boolean four = fields.find(terminals).equals(Optional.of(Terminals.FOUR));
        if (four && fields.find(mountingResistance).orElse(Range.exactly(0)).max() > 0) {
            fields.problem(mountingResistance, "with four terminals the joints are not measured: leave "
                    + "mountingResistance out, or set \"terminals\" to \"two\"");
        }
    }

    @Override
    protected Shunt bind(Fields fields) {
        double rated = fields.get(ratedTemperature);
        double maximum = fields.get(maximumTemperature);
        double watts = fields.get(power);
        ShuntRating rating = new ShuntRating(watts, rated, maximum,
                fields.find(thermalResistance).orElse((maximum - rated) / watts), fields.number(pulseEnergy));
        return new Shunt(partNumber(fields), description(fields), fields.get(resistance), fields.get(tolerance),
                fields.get(temperatureCoefficient), fields.get(ageing), fields.get(correlation), fields.get(terminals),
                fields.get(mountingResistance), fields.get(thermalEmf), rating, purchase(fields));
    }

    @Override
    void fillOwn(Shunt value, Sheet sheet) {
        sheet.put(resistance, value.resistance());
        sheet.put(tolerance, value.tolerance());
        sheet.put(temperatureCoefficient, value.temperatureCoefficient());
        sheet.put(ageing, value.ageing());
        sheet.put(correlation, value.correlation());
        sheet.put(terminals, value.terminals());
        sheet.put(mountingResistance, value.mountingResistance());
        sheet.put(thermalEmf, value.thermalEmf());
        sheet.put(power, value.rating().power());
        sheet.put(ratedTemperature, value.rating().ratedTemperature());
        sheet.put(maximumTemperature, value.rating().maximumTemperature());
        sheet.put(thermalResistance, value.rating().thermalResistance());
        sheet.put(pulseEnergy, value.rating().pulseEnergy());
    }
}
