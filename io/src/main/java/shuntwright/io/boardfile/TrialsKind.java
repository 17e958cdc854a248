package shuntwright.io.boardfile;

import java.util.Optional;
import java.util.OptionalInt;

import shuntwright.board.Sampling;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;
import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;

/** How many trials, in a file: a number, or "adaptive", which is the empty one. */
final class TrialsKind implements Kind<OptionalInt> {
    static final String ADAPTIVE = "adaptive";

    private final Kind<Integer> number = Kinds.whole(Sampling.LEAST, Sampling.MOST);

    @Override
    public Optional<OptionalInt> read(LocatedJson value, Problems problems) {
        if (value instanceof LocatedJson.Text(var _, String text)) {
            if (text.equals(ADAPTIVE)) {
                return Optional.of(OptionalInt.empty());
            }
            problems.add(value, "\"" + text + "\" is not a number of trials; allowed is \"" + ADAPTIVE + "\" or a "
                    + number.unit() + " without quotes");
            return Optional.empty();
        }
        return number.read(value, problems).map(OptionalInt::of);
    }

    @Override
    public Json write(OptionalInt value) {
        return value.isPresent() ? number.write(value.getAsInt()) : new Json.Text(ADAPTIVE);
    }

    @Override
    public String unit() {
        return number.unit() + ", or `\"" + ADAPTIVE + "\"`";
    }
}
