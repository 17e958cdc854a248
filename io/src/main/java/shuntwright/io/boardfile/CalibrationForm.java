package shuntwright.io.boardfile;

import java.util.Locale;
import java.util.Optional;

import shuntwright.board.Calibration;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;

final class CalibrationForm extends Form<Calibration> {
    private static final Kind<Double> CURRENT = Quantities.number(Dimension.CURRENT, Bounds.POSITIVE);

    private final Key<Calibration.Points> points = required("points",
            Kinds.choice(each -> each.name().toLowerCase(Locale.ROOT), Calibration.Points.values()),
            "whether one current is injected, which corrects the gain, or two, which correct gain and offset");
    private final Key<Double> lower = optional("lower", CURRENT, "a tenth of `upper`",
            "the lower of two currents; none with `one`");
    private final Key<Double> upper = optional("upper", CURRENT, "the load current",
            "the only or the upper current; not above the full scale");
    private final Key<Double> uncertainty = required("uncertainty", Quantities.limit(Dimension.RATIO, Bounds.BELOW_ONE),
            "limit of the relative error of the injected current");
    private final Key<Range> temperature = withDefault("temperature",
            Quantities.range(Dimension.TEMPERATURE, BoardForm.PHYSICAL_TEMPERATURE), Calibration.DEFAULT_TEMPERATURE,
            "of the parts while they are calibrated");

    CalibrationForm() {
        super("Calibration");
    }

    @Override
    protected void check(Fields fields) {
        if (fields.has(lower) && fields.find(points).equals(Optional.of(Calibration.Points.ONE))) {
            fields.problem(lower, "a calibration at one point has no lower current; remove \"lower\" or set \"points\" "
                    + "to \"two\"");
        }
        double highest = fields.find(upper).orElse(Double.POSITIVE_INFINITY);
        if (fields.find(lower).orElse(0.0) >= highest) {
            fields.problem(lower, "the lower calibration current must be below the upper one of "
                    + QuantityWriter.show(highest, Dimension.CURRENT));
        }
    }

    @Override
    protected Calibration bind(Fields fields) {
        return new Calibration(fields.get(points), fields.number(lower), fields.number(upper), fields.get(uncertainty),
                fields.get(temperature));
    }

    @Override
    protected void fill(Calibration value, Sheet sheet) {
        sheet.put(points, value.points());
        sheet.put(lower, value.lower());
        sheet.put(upper, value.upper());
        sheet.put(uncertainty, value.uncertainty());
        sheet.put(temperature, value.temperature());
    }
}
