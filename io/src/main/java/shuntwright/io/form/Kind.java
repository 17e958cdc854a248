package shuntwright.io.form;

import java.util.Optional;

import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/**
 * A kind of value that may stand behind a key.
 *
 * @param <V> what it becomes in the program; compared by {@code equals}
 */
public interface Kind<V> {
    /** The value; when it is empty, the reason has been added to {@code problems}. */
    Optional<V> read(LocatedJson value, Problems problems);

    Json write(V value);

    /** What may stand here, for the unit column of the documentation. */
    String unit();
}
