package shuntwright.io.boardfile;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

import shuntwright.board.TimePoint;
import shuntwright.board.Withstand;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class WithstandForm extends Form<Withstand> {
    private static final String ABSENT = "one of the three must be there";

    final ConductorForm conductorForm = new ConductorForm();

    private final Key<Double> energy = optional("energy", Quantities.number(Dimension.CHARGE_HEAT, Bounds.POSITIVE),
            ABSENT, "I²t that is survived");
    private final Key<Withstand.Conductor> conductor = optional("conductor", conductorForm, ABSENT,
            "a conductor heated adiabatically");
    private final Key<List<TimePoint>> curve = optional("curve", Points.kind(Bounds.POSITIVE), ABSENT,
            "longest time for each current, by rising current; log-log between points");

    WithstandForm() {
        super("Withstand");
    }

    @Override
    protected void check(Fields fields) {
        List<Key<?>> there = Stream.<Key<?>>of(energy, conductor, curve).filter(fields::has).toList();
        if (there.size() != 1) {
            fields.problem(there.isEmpty() ? energy : there.getLast(),
                    "exactly one of \"energy\", \"conductor\" and \"curve\" is needed, but there "
                            + (there.isEmpty() ? "is none" : "are " + there.size()));
        }
        Points.checkCurve(fields, curve);
    }

    @Override
    protected Withstand bind(Fields fields) {
        Optional<Withstand> found = fields.find(energy).<Withstand>map(Withstand.Energy::new)
                .or(() -> fields.find(conductor)).or(() -> fields.find(curve).map(Withstand.Curve::new));
        return found.orElseThrow();
    }

    @Override
    protected void fill(Withstand value, Sheet sheet) {
        switch (value) {
            case Withstand.Energy(double there) -> sheet.put(energy, there);
            case Withstand.Conductor there -> sheet.put(conductor, there);
            case Withstand.Curve(List<TimePoint> points) -> sheet.put(curve, points);
        }
    }
}
