package shuntwright.planner.entry;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Collectors;

import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityReader;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Reading;

/** Small readers and writers that the fields share. */
final class Words {
    private Words() {
    }

    static String text(OptionalDouble value, Dimension dimension) {
        return value.isEmpty() ? "" : QuantityWriter.write(value.getAsDouble(), dimension);
    }

    /** A number above 0, or nothing for a blank text. */
    static Reading<OptionalDouble> positive(String text, String what, Dimension dimension) {
        if (text.isBlank()) {
            return Reading.value(OptionalDouble.empty());
        }
        return QuantityReader.number(text, dimension).then(value -> value > 0 && Double.isFinite(value)
                ? Reading.value(OptionalDouble.of(value))
                : Reading.misread(capital(what) + " must be above 0 " + dimension.unit() + ", got "
                        + QuantityWriter.show(value, dimension) + ". Type a larger value or clear the cell."));
    }

    /** A fraction above 0 and below 1, or nothing for a blank text. */
    static Reading<OptionalDouble> fraction(String text, String what) {
        return positive(text, what, Dimension.RATIO).then(value -> value.orElse(0.5) < 1
                ? Reading.value(value)
                : Reading.misread(capital(what) + " must be below 100 %, got "
                        + QuantityWriter.show(value.getAsDouble(), Dimension.RATIO)
                        + ". Write 1 % for one hundredth."));
    }

    static String plain(String text) {
        return text.strip().toLowerCase(Locale.ROOT);
    }

    static Optional<String> word(String text) {
        return text.isBlank() ? Optional.empty() : Optional.of(text.strip());
    }

    /** The name if it is one of those there, nothing for a blank text. */
    static <T> Reading<Optional<String>> oneOf(String text, String what, Iterable<T> there, Function<T, String> name) {
        if (text.isBlank()) {
            return Reading.value(Optional.empty());
        }
        for (T each : there) {
            if (name.apply(each).equalsIgnoreCase(text.strip())) {
                return Reading.value(Optional.of(name.apply(each)));
            }
        }
        String names = stream(there).map(name).collect(Collectors.joining(", "));
        return Reading.misread("The board has no " + what + " \"" + text.strip() + "\". "
                + (names.isEmpty()
                        ? "It has none yet; add one in the shared strip."
                        : "It has " + names + "."));
    }

    private static <T> java.util.stream.Stream<T> stream(Iterable<T> there) {
        return java.util.stream.StreamSupport.stream(there.spliterator(), false);
    }

    static String capital(String text) {
        return Character.toUpperCase(text.charAt(0)) + text.substring(1);
    }
}
