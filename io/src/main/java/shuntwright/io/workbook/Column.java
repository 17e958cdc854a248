package shuntwright.io.workbook;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/**
 * A column of a table.
 *
 * @param group  heading over neighbouring columns; empty for none
 * @param header with the unit after a comma, where there is one
 * @param width  in characters
 * @param style  of its cells
 * @param fill   what stands in a row's cell
 */
record Column<T>(String group, String header, int width, Style style, Fill<T> fill) {

    /** What stands in a cell. */
    sealed interface Content {
        /** Nothing. */
        record Empty() implements Content {}

        /** @param text always stays text */
        record Text(String text) implements Content {}

        /** @param text with a look of its own, such as a verdict */
        record Marked(String text, Style style) implements Content {}

        /** @param value in the unit of the header */
        record Figure(double value) implements Content {}

        /** @param formula without the equals sign */
        record Formula(String formula) implements Content {}
    }

    /** Makes the content of one cell. */
    @FunctionalInterface
    interface Fill<T> {
        Content of(T row, Cells<T> cells);
    }

    /** Addresses of cells near the one that is filled. */
    interface Cells<T> {
        /** In that column, so many rows further down. */
        String at(Column<T> column, int down);

        /** In the same column, so many rows below it. */
        String below(int first, int last);

        /** In the same row. */
        default String at(Column<T> column) {
            return at(column, 0);
        }
    }

    static <T> Column<T> text(String group, String header, int width, Function<T, String> get) {
        return new Column<>(group, header, width, Style.TEXT, (row, _) -> new Content.Text(get.apply(row)));
    }

    static <T> Column<T> wrapped(String header, int width, Function<T, String> get) {
        return new Column<>("", header, width, Style.WRAPPED, (row, _) -> new Content.Text(get.apply(row)));
    }

    static <T> Column<T> maybeText(String group, String header, int width, Function<T, Optional<String>> get) {
        return new Column<>(group, header, width, Style.TEXT,
                (row, _) -> get.apply(row).<Content>map(Content.Text::new).orElseGet(Content.Empty::new));
    }

    static <T> Column<T> number(String header, int width, Style style, ToDoubleFunction<T> get) {
        return new Column<>("", header, width, style, (row, _) -> finite(get.applyAsDouble(row)));
    }

    static <T> Column<T> maybeNumber(String group, String header, int width, Style style,
            Function<T, OptionalDouble> get) {
        return new Column<>(group, header, width, style, (row, _) -> {
            OptionalDouble value = get.apply(row);
            return value.isPresent() ? finite(value.getAsDouble()) : new Content.Empty();
        });
    }

    static <T> Column<T> live(String header, int width, Style style, Fill<T> fill) {
        return new Column<>("", header, width, style, fill);
    }

    /** A number, or its name as text where no cell can hold it. */
    static Content finite(double value) {
        return Double.isFinite(value) ? new Content.Figure(value) : new Content.Text(Double.toString(value));
    }
}
