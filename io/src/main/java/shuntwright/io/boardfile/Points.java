package shuntwright.io.boardfile;

import java.util.List;

import shuntwright.board.TimePoint;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.PairKind;
import shuntwright.io.form.Quantities;
import shuntwright.quantity.Dimension;

/** Lists of [time, current] pairs. */
final class Points {
    private Points() {
    }

    static Kind<List<TimePoint>> kind(Bounds bounds) {
        return Kinds.list(new PairKind<>("[time, current]", Quantities.number(Dimension.TIME, bounds),
                Quantities.number(Dimension.CURRENT, bounds), TimePoint::new, TimePoint::time, TimePoint::current));
    }

    static void checkTimesAscend(Fields fields, Key<List<TimePoint>> key) {
        List<TimePoint> points = fields.find(key).orElse(List.of());
        for (int i = 1; i < points.size(); i++) {
            if (!(points.get(i).time() > points.get(i - 1).time())) {
                fields.problem(key,
                        "the times must ascend, but point " + (i + 1) + " is not later than the one before");
                return;
            }
        }
    }

    static void checkCurve(Fields fields, Key<List<TimePoint>> key) {
        if (fields.find(key).isEmpty()) {
            return;
        }
        List<TimePoint> points = fields.find(key).orElse(List.of());
        if (points.size() < 2) {
            fields.problem(key, "a curve needs at least two points [time, current]");
        }
        for (int i = 1; i < points.size(); i++) {
            if (!(points.get(i).current() > points.get(i - 1).current())
                    || !(points.get(i).time() <= points.get(i - 1).time())) {
                fields.problem(key, "from point to point the current must rise and the time must not, but point "
                        + (i + 1) + " breaks this");
                return;
            }
        }
    }
}
