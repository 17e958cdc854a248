package shuntwright.io.form;

import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;

import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/**
 * Two values in one short list, such as a point of a curve.
 *
 * @param names  of the two, for messages and documentation, for example "[time, current]"
 * @param first  kind of the first
 * @param second kind of the second
 * @param join   makes the pair
 * @param left   its first
 * @param right  its second
 */
public record PairKind<A, B, V>(String names, Kind<A> first, Kind<B> second, BiFunction<A, B, V> join,
        Function<V, A> left, Function<V, B> right) implements Kind<V> {
    @Override
    public Optional<V> read(LocatedJson value, Problems problems) {
        if (!(value instanceof LocatedJson.Arr arr) || arr.elements().size() != 2) {
            String found = value instanceof LocatedJson.Arr arr
                    ? "a list of " + arr.elements().size()
                    : value.inWords();
            problems.add(value, "a pair " + names + " is needed here, not " + found);
            return Optional.empty();
        }
        Optional<A> a = first.read(arr.elements().getFirst(), problems);
        Optional<B> b = second.read(arr.elements().getLast(), problems);
        return a.flatMap(one -> b.map(two -> join.apply(one, two)));
    }

    @Override
    public Json write(V value) {
        return new Json.Arr(List.of(first.write(left.apply(value)), second.write(right.apply(value))));
    }

    @Override
    public String unit() {
        return "pairs `" + names + "` (" + first.unit() + "; " + second.unit() + ")";
    }
}
