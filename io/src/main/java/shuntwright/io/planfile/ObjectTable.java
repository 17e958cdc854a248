package shuntwright.io.planfile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;
import java.util.function.ToLongFunction;

import tools.jackson.core.JsonGenerator;

import shuntwright.quantity.Range;

/**
 * The attributes of one kind of object: how they are written and how they are documented.
 *
 * @param <T> the kind of object
 */
final class ObjectTable<T> {

    private static final String NUMBER = "number";
    private static final String WHOLE = "whole number";
    private static final String ENDS = "[low, high]";

    private final String name;
    private final String meaning;
    private final List<Attribute<T>> attributes = new ArrayList<>();

    private ObjectTable(String name, String meaning) {
        this.name = name;
        this.meaning = meaning;
    }

    /** A table without attributes yet. */
    static <T> ObjectTable<T> named(String name, String meaning) {
        return new ObjectTable<>(name, meaning);
    }

    /** A table of a variant, told apart by the attribute "kind". */
    static <T> ObjectTable<T> variant(String name, String kind, String meaning) {
        return new ObjectTable<T>(name, meaning).text("kind", "always \"" + kind + "\"", _ -> kind);
    }

    String name() {
        return name;
    }

    String meaning() {
        return meaning;
    }

    List<Attribute<T>> attributes() {
        return List.copyOf(attributes);
    }

    Form<T> form() {
        return new Form.One<>(this);
    }

    void write(T object, JsonGenerator out) {
        out.writeStartObject();
        for (Attribute<T> each : attributes) {
            each.emit().to(out, object);
        }
        out.writeEndObject();
    }

    ObjectTable<T> text(String key, String words, Function<T, String> get) {
        return add(key, "text", "", true, words, (out, object) -> out.writeStringProperty(key, get.apply(object)));
    }

    ObjectTable<T> maybeText(String key, String words, Function<T, Optional<String>> get) {
        return add(key, "text", "", false, words,
                (out, object) -> get.apply(object).ifPresent(text -> out.writeStringProperty(key, text)));
    }

    ObjectTable<T> texts(String key, String words, Function<T, List<String>> get) {
        return add(key, "list of text", "", true, words, (out, object) -> {
            out.writeArrayPropertyStart(key);
            get.apply(object).forEach(out::writeString);
            out.writeEndArray();
        });
    }

    ObjectTable<T> flag(String key, String words, Predicate<T> get) {
        return add(key, "true or false", "", true, words,
                (out, object) -> out.writeBooleanProperty(key, get.test(object)));
    }

    ObjectTable<T> count(String key, String words, ToLongFunction<T> get) {
        return add(key, WHOLE, "", true, words,
                (out, object) -> out.writeNumberProperty(key, get.applyAsLong(object)));
    }

    ObjectTable<T> counts(String key, String words, Function<T, List<Long>> get) {
        return add(key, "list of whole numbers", "", true, words, (out, object) -> {
            out.writeArrayPropertyStart(key);
            get.apply(object).forEach(out::writeNumber);
            out.writeEndArray();
        });
    }

    ObjectTable<T> maybeCount(String key, String words, Function<T, OptionalInt> get) {
        return add(key, WHOLE, "", false, words,
                (out, object) -> get.apply(object).ifPresent(value -> out.writeNumberProperty(key, value)));
    }

    ObjectTable<T> number(String stem, Unit unit, String words, ToDoubleFunction<T> get) {
        String key = key(stem, unit);
        return add(key, NUMBER, unit.symbol(), true, words,
                (out, object) -> out.writeNumberProperty(key, get.applyAsDouble(object)));
    }

    ObjectTable<T> maybeNumber(String stem, Unit unit, String words, Function<T, OptionalDouble> get) {
        String key = key(stem, unit);
        return add(key, NUMBER, unit.symbol(), false, words,
                (out, object) -> get.apply(object).ifPresent(value -> out.writeNumberProperty(key, value)));
    }

    /** A number whose unit is another in each object. */
    ObjectTable<T> numberIn(Function<T, Unit> unit, String stem, String words, ToDoubleFunction<T> get) {
        return add(stem + "_UNIT", NUMBER, "by the key", true, words, (out, object) -> out
                .writeNumberProperty(key(stem, unit.apply(object)), get.applyAsDouble(object)));
    }

    ObjectTable<T> maybeNumberIn(Function<T, Unit> unit, String stem, String words,
            Function<T, OptionalDouble> get) {
        return add(stem + "_UNIT", NUMBER, "by the key", false, words, (out, object) -> get.apply(object)
                .ifPresent(value -> out.writeNumberProperty(key(stem, unit.apply(object)), value)));
    }

    ObjectTable<T> range(String stem, Unit unit, String words, Function<T, Range> get) {
        String key = key(stem, unit);
        return add(key, ENDS, unit.symbol(), true, words, (out, object) -> ends(out, key, get.apply(object)));
    }

    ObjectTable<T> maybeRange(String stem, Unit unit, String words, Function<T, Optional<Range>> get) {
        String key = key(stem, unit);
        return add(key, ENDS, unit.symbol(), false, words,
                (out, object) -> get.apply(object).ifPresent(range -> ends(out, key, range)));
    }

    <U> ObjectTable<T> object(String key, Form<U> form, String words, Function<T, U> get) {
        return nested(key, "object", true, words, form, (out, object) -> {
            out.writeName(key);
            form.write(get.apply(object), out);
        });
    }

    <U> ObjectTable<T> maybeObject(String key, Form<U> form, String words, Function<T, Optional<U>> get) {
        return nested(key, "object", false, words, form, (out, object) -> get.apply(object).ifPresent(value -> {
            out.writeName(key);
            form.write(value, out);
        }));
    }

    <U> ObjectTable<T> list(String key, Form<U> form, String words, Function<T, List<U>> get) {
        return nested(key, "list", true, words, form, (out, object) -> {
            out.writeArrayPropertyStart(key);
            get.apply(object).forEach(value -> form.write(value, out));
            out.writeEndArray();
        });
    }

    private static String key(String stem, Unit unit) {
        return unit == Unit.PURE ? stem : stem + "_" + unit.suffix();
    }

    private static void ends(JsonGenerator out, String key, Range range) {
        out.writeArrayPropertyStart(key);
        out.writeNumber(range.min());
        out.writeNumber(range.max());
        out.writeEndArray();
    }

    private <U> ObjectTable<T> nested(String key, String value, boolean always, String words, Form<U> form,
            Attribute.Emit<T> emit) {
        attributes.add(new Attribute<>(key, value, "", always, words, form.tables(), emit));
        return this;
    }

    private ObjectTable<T> add(String key, String value, String unit, boolean always, String words,
            Attribute.Emit<T> emit) {
        attributes.add(new Attribute<>(key, value, unit, always, words, List.of(), emit));
        return this;
    }
}
