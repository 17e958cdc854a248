package shuntwright.io.planfile;

import java.util.List;

import tools.jackson.core.JsonGenerator;

/**
 * One attribute of an object.
 *
 * @param key     as documented; ends in _UNIT where the unit depends on the object
 * @param value   what stands there, in words
 * @param unit    symbol of the unit; empty for none
 * @param always  true when every object has it
 * @param meaning in words
 * @param tables  that nested objects follow; empty without
 * @param emit    writes key and value, or nothing when the object has no such value
 */
record Attribute<T>(String key, String value, String unit, boolean always, String meaning,
        List<ObjectTable<?>> tables, Emit<T> emit) {

    /** Writes one attribute of an object. */
    @FunctionalInterface
    interface Emit<T> {
        void to(JsonGenerator out, T object);
    }
}
