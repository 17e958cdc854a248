package shuntwright.io.partsfile;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Quantities;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;

/** Kinds of values that several kinds of parts have. */
final class PartKinds {
    static final Bounds TEMPERATURE = new Bounds(-273.15, true, Double.POSITIVE_INFINITY, false);

    static final Kind<Double> ANY_VOLTAGE = Quantities.number(Dimension.VOLTAGE, Bounds.ANY);
    static final Kind<Double> VOLTAGE = Quantities.number(Dimension.VOLTAGE, Bounds.POSITIVE);
    static final Kind<Double> HEADROOM = Quantities.number(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE);
    static final Kind<Range> SUPPLY = Quantities.range(Dimension.VOLTAGE, Bounds.POSITIVE);
    static final Kind<Double> OFFSET = Quantities.limit(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE);
    static final Kind<Double> OFFSET_DRIFT = Quantities.limit(Dimension.VOLTAGE_PER_KELVIN, Bounds.NOT_NEGATIVE);
    static final Kind<Double> DRIFT = Quantities.limit(Dimension.TEMPERATURE_COEFFICIENT, Bounds.NOT_NEGATIVE);
    static final Kind<Double> ERROR = Quantities.limit(Dimension.RATIO, Bounds.BELOW_ONE);
    static final Kind<Double> CORRELATION = Quantities.number(Dimension.RATIO, Bounds.SHARE);
    static final Kind<Double> CURRENT = Quantities.number(Dimension.CURRENT, Bounds.POSITIVE);
    static final Kind<Double> LEAKAGE = Quantities.limit(Dimension.CURRENT, Bounds.NOT_NEGATIVE);
    static final Kind<Double> POWER = Quantities.number(Dimension.POWER, Bounds.POSITIVE);
    static final Kind<Double> REJECTION = Quantities.number(Dimension.DECIBEL, Bounds.POSITIVE);

    private PartKinds() {
    }
}
