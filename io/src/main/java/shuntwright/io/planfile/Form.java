package shuntwright.io.planfile;

import java.util.List;
import java.util.function.Function;

import tools.jackson.core.JsonGenerator;

/**
 * How values of one kind stand in the file.
 *
 * @param <T> the kind of value
 */
sealed interface Form<T> {

    /** Writes the value as one JSON object. */
    void write(T value, JsonGenerator out);

    /** The tables such a value may follow. */
    List<ObjectTable<?>> tables();

    /**
     * Objects that all follow one table.
     *
     * @param table their attributes
     */
    record One<T>(ObjectTable<T> table) implements Form<T> {
        @Override
        public void write(T value, JsonGenerator out) {
            table.write(value, out);
        }

        @Override
        public List<ObjectTable<?>> tables() {
            return List.of(table);
        }
    }

    /**
     * Objects of a sealed kind, each variant with its own table.
     *
     * @param tables of all variants
     * @param choose the table of a value, together with the value
     */
    record Either<T>(List<ObjectTable<?>> tables, Function<T, Chosen<?>> choose) implements Form<T> {
        public Either {
            tables = List.copyOf(tables);
        }

        @Override
        public void write(T value, JsonGenerator out) {
            choose.apply(value).write(out);
        }
    }

    /**
     * A value with the table of its variant.
     *
     * @param table of the variant
     * @param value of the variant
     */
    record Chosen<V>(ObjectTable<V> table, V value) {
        void write(JsonGenerator out) {
            table.write(value, out);
        }
    }
}
