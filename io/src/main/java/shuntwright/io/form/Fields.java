package shuntwright.io.form;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/** The values of one object of a file, read by its form. */
public final class Fields {
    private final LocatedJson.Obj object;
    private final Map<Key<?>, Object> values = new HashMap<>();
    private final Problems problems;

    private Fields(LocatedJson.Obj object, Problems problems) {
        this.object = object;
        this.problems = problems;
    }

    static Fields read(LocatedJson.Obj object, Form<?> form, Problems problems) {
        Fields fields = new Fields(object, problems);
        for (LocatedJson.Member member : object.members()) {
            if (!form.names().contains(member.key())) {
                problems.add(member.place(), NearestWord.unknown("key", member.key(), form.names()));
            }
        }
        for (Key<?> key : form.keys()) {
            fields.readKey(key);
        }
        return fields;
    }

    private <V> void readKey(Key<V> key) {
        Optional<LocatedJson> node = object.find(key.name());
        if (node.isPresent()) {
            key.kind().read(node.get(), problems).ifPresent(value -> values.put(key, value));
        } else if (key.isRequired()) {
            problems.add(object, "the key \"" + key.name() + "\" is missing: " + key.meaning());
        }
    }

    /** The value of a required key, or of one with a default. */
    public <V> V get(Key<V> key) {
        return find(key).or(key::fallback)
                .orElseThrow(() -> new IllegalStateException("no value for " + key.name() + "; use find"));
    }

    /** The value that stands in the file; empty when the key is left out or could not be read. */
    @SuppressWarnings("unchecked") // readKey is the only one to put, and puts the key's own kind of value
    public <V> Optional<V> find(Key<V> key) {
        return Optional.ofNullable((V) values.get(key));
    }

    public OptionalDouble number(Key<Double> key) {
        return find(key).map(OptionalDouble::of).orElse(OptionalDouble.empty());
    }

    /** Whether the key stands in the file, readable or not. */
    public boolean has(Key<?> key) {
        return object.find(key.name()).isPresent();
    }

    /** Adds a problem at the key's value, or at the object when the key is left out. */
    public void problem(Key<?> key, String message) {
        problems.add(object.find(key.name()).orElse(object), message);
    }
}
