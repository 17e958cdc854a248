package shuntwright.io.form;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;

import shuntwright.quantity.Reading;

/**
 * A reader of texts that remembers what it has read: a catalogue of thousands of parts says "±1 %" in most of them. Only
 * the first few thousand different texts are kept.
 */
final class RememberedTexts<V> implements Function<String, Reading<V>> {
    private static final int MOST = 4096;

    private final Function<String, Reading<V>> reader;
    private final Map<String, Reading<V>> known = new ConcurrentHashMap<>();

    /** @param reader gives the same reading for the same text */
    RememberedTexts(Function<String, Reading<V>> reader) {
        this.reader = reader;
    }

    @Override
    public Reading<V> apply(String text) {
        Reading<V> found = known.get(text);
        if (found != null) {
            return found;
        }
        Reading<V> read = reader.apply(text);
        if (known.size() < MOST) {
            known.put(text, read);
        }
        return read;
    }
}
