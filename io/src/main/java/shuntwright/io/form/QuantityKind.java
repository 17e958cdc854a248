package shuntwright.io.form;

import java.util.Arrays;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.function.Function;

import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/**
 * A quantity in a file.
 *
 * @param dimension what is measured
 * @param bounds    of every number in it
 * @param shape     form of the text beyond one number, for the documentation; empty for one number
 * @param reader    of the text
 * @param bare      what a bare number means
 * @param writer    of the text
 * @param numbers   those that must be within the bounds
 */
record QuantityKind<V>(Dimension dimension, Bounds bounds, String shape, Function<String, Reading<V>> reader,
        DoubleFunction<V> bare, Function<V, String> writer, Function<V, double[]> numbers) implements Kind<V> {

    QuantityKind {
        reader = new RememberedTexts<>(reader);
    }

    @Override
    public Optional<V> read(LocatedJson value, Problems problems) {
        return switch (value) {
            case LocatedJson.Text text -> switch (reader.apply(text.value())) {
                case Reading.Value<V>(V read) -> within(read, "\"" + text.value() + "\"", value, problems);
                case Reading.Misread<V>(String problem) -> refuse(value, problem, problems);
            };
            case LocatedJson.Num num when Double.isNaN(num.value()) ->
                refuse(value,
                        num.written() + " is not a number; write a " + dimension.word() + " such as \"" + example()
                                + "\"",
                        problems);
            case LocatedJson.Num num when Double.isInfinite(num.value()) ->
                refuse(value, num.written() + " is larger than this program can count", problems);
            case LocatedJson.Num num -> bareNumber(num, problems);
            case LocatedJson.Obj _,LocatedJson.Arr _,LocatedJson.Bool _,LocatedJson.Null _ ->
                refuse(value, "a " + dimension.word() + " is needed here, for example \"" + example() + "\", not "
                        + value.inWords(), problems);
        };
    }

    private Optional<V> bareNumber(LocatedJson.Num num, Problems problems) {
        try {
            return within(bare.apply(num.value()), num.written(), num, problems);
        } catch (IllegalArgumentException e) {
            return refuse(num, String.valueOf(e.getMessage()), problems);
        }
    }

    private Optional<V> within(V read, String shown, LocatedJson value, Problems problems) {
        if (Arrays.stream(numbers.apply(read)).allMatch(bounds::allow)) {
            return Optional.of(read);
        }
        return refuse(value, shown + " is out of range: a " + dimension.word() + " " + bounds.words(dimension)
                + " is needed here", problems);
    }

    private static <V> Optional<V> refuse(LocatedJson value, String message, Problems problems) {
        problems.add(value, message);
        return Optional.empty();
    }

    private String example() {
        return QuantityWriter.show(bounds.allow(5) ? 5 : 0.5, dimension);
    }

    @Override
    public Json write(V value) {
        return new Json.Text(writer.apply(value));
    }

    @Override
    public String unit() {
        String unit = dimension == Dimension.RATIO ? "%" : dimension.unit();
        String form = shape.isEmpty()
                ? unit
                : shape.startsWith("±")
                        ? (unit + " " + shape).replace("% ±", "± %")
                        : unit + ", " + shape;
        String words = bounds.words(dimension);
        return words.isEmpty() ? form : form + ", " + words;
    }
}
