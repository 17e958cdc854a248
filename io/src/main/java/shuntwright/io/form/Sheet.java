package shuntwright.io.form;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

import shuntwright.io.json.Json;

/** Collects the attributes of an object that is to be written; what equals its default is left out. */
public final class Sheet {
    private final List<Key<?>> order;
    private final Map<Key<?>, Json> written = new HashMap<>();

    Sheet(List<Key<?>> order) {
        this.order = order;
    }

    public <V> void put(Key<V> key, V value) {
        if (!key.fallback().equals(Optional.of(value))) {
            written.put(key, key.kind().write(value));
        }
    }

    public <V> void put(Key<V> key, Optional<V> value) {
        value.ifPresent(there -> put(key, there));
    }

    public void put(Key<Double> key, OptionalDouble value) {
        value.ifPresent(there -> put(key, (Double) there));
    }

    Json object() {
        return new Json.Obj(order.stream().filter(written::containsKey)
                .map(key -> new Json.Member(key.name(), written.getOrDefault(key, new Json.Obj(List.of())))).toList());
    }
}
