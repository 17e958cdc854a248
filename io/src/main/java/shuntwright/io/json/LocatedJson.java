package shuntwright.io.json;

import java.util.List;
import java.util.Optional;

/** A JSON value that knows where it stands. */
public sealed interface LocatedJson {
    Place place();

    /**
     * @param place   of the opening brace
     * @param members in the order of the file; of a key that stands twice, the first
     */
    record Obj(Place place, List<Member> members) implements LocatedJson {
        public Obj {
            members = List.copyOf(members);
        }

        public Optional<LocatedJson> find(String key) {
            for (Member each : members) {
                if (each.key().equals(key)) {
                    return Optional.of(each.value());
                }
            }
            return Optional.empty();
        }

        /** The elements of the array under that key; empty when there is no such array. */
        public List<LocatedJson> elements(String key) {
            return find(key).orElse(this) instanceof Arr arr ? arr.elements() : List.of();
        }

        /** The text under that key, with its place. */
        public Optional<Text> text(String key) {
            return find(key).orElse(this) instanceof Text text ? Optional.of(text) : Optional.empty();
        }
    }

    /**
     * @param place of the key, with the path of the value
     * @param key   as written
     * @param value what stands behind the colon
     */
    record Member(Place place, String key, LocatedJson value) {}

    /** @param elements in the order of the file */
    record Arr(Place place, List<LocatedJson> elements) implements LocatedJson {
        public Arr {
            elements = List.copyOf(elements);
        }
    }

    /** @param value without quotes and escapes */
    record Text(Place place, String value) implements LocatedJson {}

    /**
     * @param value   infinite where the written number is beyond a double; NaN where no number is written, but NaN or
     *                Infinity
     * @param written as in the file, shortened where it is very long
     */
    record Num(Place place, double value, String written) implements LocatedJson {}

    record Bool(Place place, boolean value) implements LocatedJson {}

    record Null(Place place) implements LocatedJson {}

    /** The value in words, for a message: "a list", the text "abc", the number 12. */
    default String inWords() {
        return switch (this) {
            case Obj _ -> "an object { … }";
            case Arr _ -> "a list [ … ]";
            case Text text -> "the text \"" + text.value() + "\"";
            case Num num -> "the number " + num.written();
            case Bool bool -> String.valueOf(bool.value());
            case Null _ -> "null";
        };
    }
}
