package shuntwright.io.boardfile;

import java.util.Optional;

import shuntwright.board.ReleaseDemand;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Quantities;
import shuntwright.io.json.Json;
import shuntwright.io.json.LocatedJson;
import shuntwright.io.json.Problems;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Range;

/** What happens after a trip, in a file: "between", "latch" or a window of currents. */
final class ReleaseKind implements Kind<ReleaseDemand> {
    private static final String BETWEEN = "between";
    private static final String LATCH = "latch";

    private final Kind<Range> window = Quantities.range(Dimension.CURRENT, Bounds.NOT_NEGATIVE);

    @Override
    public Optional<ReleaseDemand> read(LocatedJson value, Problems problems) {
        if (value instanceof LocatedJson.Text(var _, String text)) {
            if (text.equals(BETWEEN)) {
                return Optional.of(new ReleaseDemand.Between());
            }
            if (text.equals(LATCH)) {
                return Optional.of(new ReleaseDemand.Latch());
            }
            if (text.chars().noneMatch(c -> c >= '0' && c <= '9')) {
                problems.add(value, "\"" + text + "\" is not a release; allowed is \"between\", \"latch\" or a window "
                        + "of currents such as \"30 .. 34 A\"");
                return Optional.empty();
            }
        }
        return window.read(value, problems).flatMap(range -> {
            if (!(range.max() > 0)) {
                problems.add(value, "a release window that ends at 0 A can never be reached; give a window above 0 A, "
                        + "or \"latch\"");
                return Optional.empty();
            }
            if (!(range.min() < range.max())) {
                problems.add(value, "the release window is empty, from and to are both "
                        + QuantityWriter.show(range.min(), Dimension.CURRENT)
                        + "; give two currents such as \"30 .. 34 A\"");
                return Optional.empty();
            }
            return Optional.of(new ReleaseDemand.Window(range));
        });
    }

    @Override
    public Json write(ReleaseDemand value) {
        return switch (value) {
            case ReleaseDemand.Between _ -> new Json.Text(BETWEEN);
            case ReleaseDemand.Latch _ -> new Json.Text(LATCH);
            case ReleaseDemand.Window(Range range) -> window.write(range);
        };
    }

    @Override
    public String unit() {
        return "`\"between\"`, `\"latch\"` or " + window.unit();
    }
}
