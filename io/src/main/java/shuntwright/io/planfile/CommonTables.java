package shuntwright.io.planfile;

import shuntwright.board.TimePoint;
import shuntwright.quantity.Spread;
import shuntwright.quantity.Toleranced;

/** Small objects that several others hold. */
final class CommonTables {

    static final Form<Toleranced> TOLERANCED_VOLTAGE = toleranced("voltage with tolerance", Unit.VOLT);
    static final Form<Toleranced> TOLERANCED_CURRENT = toleranced("current with tolerance", Unit.AMPERE);

    static final Form<Spread> VOLTAGES = ObjectTable.<Spread>named("voltage spread",
            "A nominal voltage with its own least and largest value.")
            .number("least", Unit.VOLT, "smallest", Spread::min)
            .number("nominal", Unit.VOLT, "nominal", Spread::nominal)
            .number("most", Unit.VOLT, "largest", Spread::max).form();

    static final Form<TimePoint> POINT = ObjectTable.<TimePoint>named("time point", "A current at a time.")
            .number("time", Unit.SECOND, "time", TimePoint::time)
            .number("current", Unit.AMPERE, "current", TimePoint::current).form();

    private CommonTables() {
    }

    private static Form<Toleranced> toleranced(String name, Unit unit) {
        return ObjectTable.<Toleranced>named(name, "A nominal value with its relative tolerance.")
                .number("nominal", unit, "nominal value", Toleranced::nominal)
                .number("below", Unit.FRACTION, "how far below nominal it may be", each -> each.tolerance().below())
                .number("above", Unit.FRACTION, "how far above nominal it may be", each -> each.tolerance().above())
                .form();
    }
}
