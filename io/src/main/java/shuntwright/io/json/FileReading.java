package shuntwright.io.json;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;

/**
 * What came of opening a file.
 *
 * @param <T> what the file holds
 */
public sealed interface FileReading<T> {
    /** @param value what the file holds */
    record Opened<T>(T value) implements FileReading<T> {}

    /** @param problems everything that is wrong, never empty, in the order of the file */
    record Refused<T>(List<Problem> problems) implements FileReading<T> {
        /** @throws IllegalArgumentException if there is no problem */
        public Refused {
            if (problems.isEmpty()) {
                throw new IllegalArgumentException("a file is refused for at least one problem");
            }
            problems = List.copyOf(problems);
        }

        /** All problems, one on each line. */
        public String text() {
            return problems.stream().map(Problem::toString).collect(Collectors.joining("\n"));
        }
    }

    default Optional<T> ifOpened() {
        return switch (this) {
            case Opened<T>(T value) -> Optional.of(value);
            case Refused<T> _ -> Optional.empty();
        };
    }

    /** What is wrong; empty when the file was opened. */
    default List<Problem> problems() {
        return switch (this) {
            case Opened<T> _ -> List.of();
            case Refused<T>(List<Problem> problems) -> problems;
        };
    }

    default <U> FileReading<U> map(Function<T, U> change) {
        return switch (this) {
            case Opened<T>(T value) -> new Opened<>(change.apply(value));
            case Refused<T>(List<Problem> problems) -> new Refused<>(problems);
        };
    }
}
