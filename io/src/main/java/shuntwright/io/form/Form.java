package shuntwright.io.form;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/**
 * The layout of one type of object in a file: its keys in the order in which they are written and documented.
 *
 * @param <T> what the object becomes in the program
 */
public abstract class Form<T> implements Kind<T> {
    private final String title;
    private final List<Key<?>> keys = new ArrayList<>();
    private final Set<String> names = new LinkedHashSet<>();

    /** @param title heading of its table in the documentation, for example "Alert line" */
    protected Form(String title) {
        this.title = title;
    }

    /** A key that every such object must have. */
    protected final <V> Key<V> required(String name, Kind<V> kind, String meaning) {
        return add(Key.required(name, kind, meaning));
    }

    /** A key that may be left out; {@code absent} says in words what then holds. */
    protected final <V> Key<V> optional(String name, Kind<V> kind, String absent, String meaning) {
        return add(Key.optional(name, kind, absent, meaning));
    }

    /** A key that may be left out, and then has this value; it is not written when it has. */
    protected final <V> Key<V> withDefault(String name, Kind<V> kind, V fallback, String meaning) {
        return add(Key.withDefault(name, kind, fallback, meaning));
    }

    private <V> Key<V> add(Key<V> key) {
        keys.add(key);
        names.add(key.name());
        return key;
    }

    public final String title() {
        return title;
    }

    public final List<Key<?>> keys() {
        return Collections.unmodifiableList(keys);
    }

    /** Called when every key could be read and {@link #check} found nothing. */
    protected abstract T bind(Fields fields);

    /** Adds problems that concern several keys; some of them may be missing or unreadable. */
    protected void check(Fields fields) {
    }

    /** Puts every attribute of the value onto the sheet. */
    protected abstract void fill(T value, Sheet sheet);

    @Override
    public final Optional<T> read(LocatedJson value, Problems problems) {
        if (!(value instanceof LocatedJson.Obj object)) {
            problems.add(value, "an object { … } with the keys " + String.join(", ", names) + " is needed here, not "
                    + value.inWords());
            return Optional.empty();
        }
        int before = problems.count();
        Fields fields = Fields.read(object, this, problems);
        check(fields);
        if (problems.count() > before) {
            return Optional.empty();
        }
        try {
            return Optional.of(bind(fields));
        } catch (IllegalArgumentException e) {
            // The records state rules of their own; what the keys' kinds let through is still the user's data.
            problems.add(object, String.valueOf(e.getMessage()));
            return Optional.empty();
        }
    }

    final Set<String> names() {
        return Collections.unmodifiableSet(names);
    }

    @Override
    public final Json write(T value) {
        Sheet sheet = new Sheet(keys);
        fill(value, sheet);
        return sheet.object();
    }

    @Override
    public final String unit() {
        return "[" + title.toLowerCase(Locale.ROOT) + "](#" + anchor() + ")";
    }

    private String anchor() {
        return title.toLowerCase(Locale.ROOT).replace(' ', '-');
    }
}
