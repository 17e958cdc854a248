package shuntwright.io.form;

import java.util.Optional;
import java.util.stream.Collectors;

import shuntwright.io.json.Json;
import shuntwright.io.json.JsonText;

/**
 * One attribute of an object in a file.
 *
 * @param <V> what its value becomes in the program
 */
public final class Key<V> {
    private final String name;
    private final Kind<V> kind;
    private final boolean required;
    private final Optional<V> fallback;
    private final String absent;
    private final String meaning;

    private Key(String name, Kind<V> kind, boolean required, Optional<V> fallback, String absent, String meaning) {
        this.name = name;
        this.kind = kind;
        this.required = required;
        this.fallback = fallback;
        this.absent = absent;
        this.meaning = meaning;
    }

    static <V> Key<V> required(String name, Kind<V> kind, String meaning) {
        return new Key<>(name, kind, true, Optional.empty(), "", meaning);
    }

    static <V> Key<V> optional(String name, Kind<V> kind, String absent, String meaning) {
        return new Key<>(name, kind, false, Optional.empty(), absent, meaning);
    }

    static <V> Key<V> withDefault(String name, Kind<V> kind, V fallback, String meaning) {
        return new Key<>(name, kind, false, Optional.of(fallback), defaultWords(kind.write(fallback)), meaning);
    }

    private static String defaultWords(Json written) {
        return switch (written) {
            case Json.Obj _ -> "its defaults";
            case Json.Arr(var elements) when elements.isEmpty() -> "none";
            case Json.Text(String text) -> text.isEmpty() ? "empty" : "`\"" + text + "\"`";
            case Json.Arr(var elements) -> elements.stream().map(each -> JsonText.print(each).strip())
                    .collect(Collectors.joining(", ", "`[", "]`"));
            case Json.Num _,Json.Whole _,Json.Bool _ -> "`" + JsonText.print(written).strip() + "`";
        };
    }

    public String name() {
        return name;
    }

    public Kind<V> kind() {
        return kind;
    }

    public boolean isRequired() {
        return required;
    }

    /** What holds when the key is left out, where that is a value. */
    public Optional<V> fallback() {
        return fallback;
    }

    /** What holds when the key is left out, in words. */
    public String absent() {
        return absent;
    }

    public String meaning() {
        return meaning;
    }
}
