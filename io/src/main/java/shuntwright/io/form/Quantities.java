package shuntwright.io.form;

import java.util.List;
import java.util.function.Function;

import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;
import shuntwright.quantity.Reading;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Tolerance;
import shuntwright.quantity.Toleranced;

/** Kinds of values that are quantities: a text in engineering notation, or a bare number in the SI unit. */
public final class Quantities {
    private Quantities() {
    }

    /** One number. */
    public static Kind<Double> number(Dimension dimension, Bounds bounds) {
        return number(dimension, bounds, text -> QuantityReader.number(text, dimension));
    }

    /** One number, read by a reader of its own. */
    public static Kind<Double> number(Dimension dimension, Bounds bounds, Function<String, Reading<Double>> reader) {
        return new QuantityKind<>(dimension, bounds, "", reader, number -> number,
                value -> QuantityWriter.write(value, dimension), value -> new double[]{value});
    }

    /** The limit of an error's magnitude: "0.5 %" or, meaning the same, "±0.5 %". */
    public static Kind<Double> limit(Dimension dimension, Bounds bounds) {
        return number(dimension, bounds, text -> QuantityReader.number(withoutSigns(text), dimension));
    }

    private static String withoutSigns(String text) {
        String stripped = text.strip();
        for (String signs : List.of("±", "+/-", "+-")) {
            if (stripped.startsWith(signs)) {
                return stripped.substring(signs.length());
            }
        }
        return stripped;
    }

    /** Two ends. */
    public static Kind<Range> range(Dimension dimension, Bounds bounds) {
        return new QuantityKind<>(dimension, bounds, "from .. to", text -> QuantityReader.range(text, dimension),
                Range::exactly, value -> QuantityWriter.write(value, dimension),
                value -> new double[]{value.min(), value.max()});
    }

    /** A relative tolerance, above and below. */
    public static Kind<Tolerance> tolerance() {
        return new QuantityKind<>(Dimension.RATIO, Bounds.NOT_NEGATIVE, "±", QuantityReader::tolerance,
                Tolerance::symmetric, QuantityWriter::write, value -> new double[]{value.below(), value.above()});
    }

    /** A nominal value with its relative tolerance. */
    public static Kind<Toleranced> toleranced(Dimension dimension, Bounds bounds) {
        return new QuantityKind<>(dimension, bounds, "± %", text -> QuantityReader.toleranced(text, dimension),
                number -> new Toleranced(number, Tolerance.NONE), value -> QuantityWriter.write(value, dimension),
                value -> new double[]{value.min(), value.max()});
    }

    /** Least, nominal and largest value. */
    public static Kind<Spread> spread(Dimension dimension, Bounds bounds) {
        return new QuantityKind<>(dimension, bounds, "least .. nominal .. largest",
                text -> QuantityReader.spread(text, dimension), Spread::exactly,
                value -> QuantityWriter.write(value, dimension), value -> new double[]{value.min(), value.max()});
    }
}
