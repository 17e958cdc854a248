package shuntwright.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Constructors of what users and parts files state refuse what is not a number, infinite or out of range. */
class RecordGuardsTest {

    /**
     * A record with one of its numbers exchanged for a bad one.
     *
     * @param valid     the record as it is
     * @param component that is exchanged
     * @param bad       the number put in
     */
    record Bad(Record valid, int component, Object bad) {

        String name() {
            return valid.getClass().getRecordComponents()[component].getName();
        }

        @Override
        public String toString() {
            return valid.getClass().getSimpleName() + "." + name() + " = " + bad;
        }
    }

    static Stream<Bad> notFinite() {
        return all(Specimens.NUMBERS, Specimens.MAY_BE_INFINITE, Double.NaN, Double.POSITIVE_INFINITY,
                Double.NEGATIVE_INFINITY);
    }

    static Stream<Bad> alwaysNaN() {
        return all(Specimens.NUMBERS, Set.of(), Double.NaN, Double.NEGATIVE_INFINITY);
    }

    static Stream<Bad> negative() {
        return all(Specimens.NUMBERS, Specimens.MAY_BE_NEGATIVE, -1e-12);
    }

    static Stream<Bad> counts() {
        List<Bad> bad = new ArrayList<>();
        for (Record valid : Specimens.NUMBERS) {
            RecordComponent[] components = valid.getClass().getRecordComponents();
            for (int i = 0; i < components.length; i++) {
                if (components[i].getType() == int.class
                        && !Specimens.MAY_BE_NEGATIVE.contains(key(valid, components[i]))) {
                    bad.add(new Bad(valid, i, -1));
                }
            }
        }
        return bad.stream();
    }

    private static Stream<Bad> all(List<Record> records, Set<String> allowed, double... numbers) {
        List<Bad> bad = new ArrayList<>();
        for (Record valid : records) {
            RecordComponent[] components = valid.getClass().getRecordComponents();
            for (int i = 0; i < components.length; i++) {
                Class<?> type = components[i].getType();
                for (double number : numbers) {
                    if (allowed.contains(key(valid, components[i]))) {
                        continue;
                    }
                    if (type == double.class) {
                        bad.add(new Bad(valid, i, number));
                    } else if (type == OptionalDouble.class) {
                        bad.add(new Bad(valid, i, OptionalDouble.of(number)));
                    }
                }
            }
        }
        return bad.stream();
    }

    private static String key(Record valid, RecordComponent component) {
        return valid.getClass().getSimpleName() + "." + component.getName();
    }

    @ParameterizedTest
    @MethodSource({"notFinite", "alwaysNaN", "negative", "counts"})
    void refuses(Bad bad) {
        assertThatThrownBy(() -> rebuild(bad)).as("%s", bad).isInstanceOf(IllegalArgumentException.class).message()
                .isNotBlank();
    }

    @ParameterizedTest
    @MethodSource("specimens")
    void takesTheValidOne(Record valid) throws ReflectiveOperationException {
        assertThat(rebuild(new Bad(valid, -1, 0))).isEqualTo(valid);
    }

    static List<Record> specimens() {
        return Specimens.NUMBERS;
    }

    private static Object rebuild(Bad bad) throws ReflectiveOperationException {
        RecordComponent[] components = bad.valid().getClass().getRecordComponents();
        Object[] arguments = new Object[components.length];
        for (int i = 0; i < components.length; i++) {
            arguments[i] = i == bad.component() ? bad.bad() : components[i].getAccessor().invoke(bad.valid());
        }
        Constructor<?> constructor = bad.valid().getClass().getDeclaredConstructor(
                Arrays.stream(components).map(RecordComponent::getType).toArray(Class<?>[]::new));
        try {
            return constructor.newInstance(arguments);
        } catch (InvocationTargetException e) {
            if (e.getCause() instanceof IllegalArgumentException refused) {
                throw refused;
            }
            throw e;
        }
    }
}
