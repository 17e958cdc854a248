package shuntwright.io.json;

import java.util.List;

/** A JSON value to be written. */
public sealed interface Json {
    /** @param members in the order they are to be written */
    record Obj(List<Member> members) implements Json {
        public Obj {
            members = List.copyOf(members);
        }
    }

    record Member(String key, Json value) {}

    record Arr(List<? extends Json> elements) implements Json {
        public Arr {
            elements = List.copyOf(elements);
        }
    }

    record Text(String value) implements Json {}

    /** @param value finite */
    record Num(double value) implements Json {
        /** @throws IllegalArgumentException unless finite */
        public Num {
            if (!Double.isFinite(value)) {
                throw new IllegalArgumentException("JSON has no number for " + value);
            }
        }
    }

    record Whole(long value) implements Json {}

    record Bool(boolean value) implements Json {}
}
