package shuntwright.quantity;

import java.util.Optional;
import java.util.function.Function;

/**
 * What came of reading a text a person typed: a value, or why not and what to do.
 *
 * @param <T> the kind of value
 */
public sealed interface Reading<T> {

    /** @param value what the text means, in SI units */
    record Value<T>(T value) implements Reading<T> {}

    /** @param problem one sentence: what is wrong with the text, the allowed form or range, what to do */
    record Misread<T>(String problem) implements Reading<T> {}

    static <T> Reading<T> value(T value) {
        return new Value<>(value);
    }

    static <T> Reading<T> misread(String problem) {
        return new Misread<>(problem);
    }

    default Optional<T> ifValue() {
        return switch (this) {
            case Value<T>(T value) -> Optional.of(value);
            case Misread<T> _ -> Optional.empty();
        };
    }

    default Optional<String> ifProblem() {
        return switch (this) {
            case Value<T> _ -> Optional.empty();
            case Misread<T>(String problem) -> Optional.of(problem);
        };
    }

    default <U> Reading<U> then(Function<T, Reading<U>> next) {
        return switch (this) {
            case Value<T>(T value) -> next.apply(value);
            case Misread<T>(String problem) -> new Misread<>(problem);
        };
    }
}
