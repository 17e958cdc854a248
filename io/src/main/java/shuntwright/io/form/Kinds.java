package shuntwright.io.form;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/** Kinds of values that are not quantities. */
public final class Kinds {
    private Kinds() {
    }

    /** Any text, also an empty one. */
    public static Kind<String> text() {
        return new TextKind<>("text", "a text in double quotes", Optional::of, text -> text);
    }

    /** A text by which something is found again: not empty, no blanks at its ends, no control characters. */
    public static Kind<String> name() {
        return new TextKind<>("text",
                "a name that is not empty and has no blanks at its ends and no control characters",
                text -> text.isEmpty() || !text.equals(text.strip()) || text.chars().anyMatch(Character::isISOControl)
                        ? Optional.empty()
                        : Optional.of(text),
                text -> text);
    }

    /**
     * A text of a form of its own.
     *
     * @param unit   for the documentation
     * @param needed what is needed, for the message
     * @param reader empty when the text is something else
     * @param writer its inverse
     */
    public static <V> Kind<V> text(String unit, String needed, Function<String, Optional<V>> reader,
            Function<V, String> writer) {
        return new TextKind<>(unit, needed, reader, writer);
    }

    /** One of a few words. */
    @SafeVarargs
    public static <V> Kind<V> choice(Function<V, String> word, V... values) {
        Map<String, V> words = new LinkedHashMap<>();
        for (V value : values) {
            words.put(word.apply(value), value);
        }
        return new ChoiceKind<>(words, word);
    }

    /** A whole number, both ends allowed. */
    public static Kind<Integer> whole(int least, int most) {
        return new WholeKind(least, most);
    }

    /** A whole number of any size that 64 bits hold. */
    public static Kind<Long> whole() {
        return new AnyWholeKind();
    }

    /** A bare number without a unit of its own. */
    public static Kind<Double> bare(String unit, Bounds bounds) {
        return new BareKind(unit, bounds);
    }

    /** Any number of values of one kind. */
    public static <V> Kind<List<V>> list(Kind<V> element) {
        return new ListKind<>(element);
    }

    private static <V> Optional<V> refuse(LocatedJson value, String message, Problems problems) {
        problems.add(value, message);
        return Optional.empty();
    }

    private record TextKind<V>(String unit, String needed, Function<String, Optional<V>> reader,
            Function<V, String> writer) implements Kind<V> {
        @Override
        public Optional<V> read(LocatedJson value, Problems problems) {
            Optional<V> read = value instanceof LocatedJson.Text text ? reader.apply(text.value()) : Optional.empty();
            return read.isPresent()
                    ? read
                    : refuse(value, needed + " is needed here, not " + value.inWords(), problems);
        }

        @Override
        public Json write(V value) {
            return new Json.Text(writer.apply(value));
        }
    }

    private record ChoiceKind<V>(Map<String, V> words, Function<V, String> word) implements Kind<V> {
        @Override
        public Optional<V> read(LocatedJson value, Problems problems) {
            if (value instanceof LocatedJson.Text(var _, String text)) {
                V found = words.get(text);
                return found != null
                        ? Optional.of(found)
                        : refuse(value, "\"" + text + "\" is not known here; allowed is " + allowed()
                                + NearestWord.find(text, words.keySet()).map(near -> ", maybe \"" + near
                                        + "\" is meant").orElse(""),
                                problems);
            }
            return refuse(value, allowed() + " is needed here, not " + value.inWords(), problems);
        }

        private String allowed() {
            return String.join(" or ", words.keySet().stream().map(each -> "\"" + each + "\"").toList());
        }

        @Override
        public Json write(V value) {
            return new Json.Text(word.apply(value));
        }

        @Override
        public String unit() {
            return String.join(" or ", words.keySet().stream().map(each -> "`\"" + each + "\"`").toList());
        }
    }

    private record WholeKind(int least, int most) implements Kind<Integer> {
        @Override
        public Optional<Integer> read(LocatedJson value, Problems problems) {
            if (value instanceof LocatedJson.Num num && num.value() == Math.rint(num.value()) && num.value() >= least
                    && num.value() <= most) {
                return Optional.of((int) num.value());
            }
            return refuse(value, "a " + unit() + " is needed here, without quotes, not " + value.inWords(), problems);
        }

        @Override
        public Json write(Integer value) {
            return new Json.Whole(value);
        }

        @Override
        public String unit() {
            return "whole number " + (most == Integer.MAX_VALUE ? "from " + least : "from " + least + " to " + most);
        }
    }

    private record AnyWholeKind() implements Kind<Long> {
        /** Up to here a double has every whole number. */
        private static final double EXACT = 0x1p53;

        @Override
        public Optional<Long> read(LocatedJson value, Problems problems) {
            if (value instanceof LocatedJson.Num num) {
                try {
                    return Optional.of(Long.parseLong(num.written()));
                } catch (NumberFormatException _) {
                    if (num.value() == Math.rint(num.value()) && Math.abs(num.value()) <= EXACT) {
                        return Optional.of((long) num.value());
                    }
                }
            }
            return refuse(value, "a whole number of at most 18 digits is needed here, without quotes, not "
                    + value.inWords(), problems);
        }

        @Override
        public Json write(Long value) {
            return new Json.Whole(value);
        }

        @Override
        public String unit() {
            return "whole number";
        }
    }

    private record BareKind(String name, Bounds bounds) implements Kind<Double> {
        @Override
        public Optional<Double> read(LocatedJson value, Problems problems) {
            if (value instanceof LocatedJson.Num num && bounds.allow(num.value())
                    && Double.isFinite(num.value())) {
                return Optional.of(num.value());
            }
            return refuse(value, "a number (" + unit() + ") is needed here, without quotes, not " + value.inWords(),
                    problems);
        }

        @Override
        public Json write(Double value) {
            return new Json.Num(value);
        }

        @Override
        public String unit() {
            return name + ", " + bounds.plainWords();
        }
    }

    private record ListKind<V>(Kind<V> element) implements Kind<List<V>> {
        @Override
        public Optional<List<V>> read(LocatedJson value, Problems problems) {
            if (!(value instanceof LocatedJson.Arr arr)) {
                return refuse(value, "a list [ … ] is needed here, not " + value.inWords(), problems);
            }
            List<V> read = new ArrayList<>();
            for (LocatedJson each : arr.elements()) {
                element.read(each, problems).ifPresent(read::add);
            }
            return read.size() == arr.elements().size() ? Optional.of(List.copyOf(read)) : Optional.empty();
        }

        @Override
        public Json write(List<V> value) {
            return new Json.Arr(value.stream().map(element::write).toList());
        }

        @Override
        public String unit() {
            return "list of " + element.unit();
        }
    }
}
