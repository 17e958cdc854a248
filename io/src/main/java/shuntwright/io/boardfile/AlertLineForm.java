package shuntwright.io.boardfile;

import shuntwright.board.AlertLine;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Toleranced;

final class AlertLineForm extends Form<AlertLine> {
    private static final AlertLine DEFAULT = AlertLine.named("default");

    private final Key<String> name = required("name", Kinds.name(), "what channels call it");
    private final Key<Toleranced> voltage = optional("voltage",
            Quantities.toleranced(Dimension.VOLTAGE, Bounds.POSITIVE), "the sense supply",
            "supply of the pull-up");
    private final Key<Double> pullUp = optional("pullUp", Quantities.number(Dimension.RESISTANCE, Bounds.POSITIVE),
            "chosen by the program", "pull-up resistance");
    private final Key<Double> inputHigh = optional("inputHigh",
            Quantities.number(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE), "0.7 of the line's voltage",
            "least voltage that the receiving input takes as high");
    private final Key<Double> inputLow = optional("inputLow",
            Quantities.number(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE), "0.3 of the line's voltage",
            "largest voltage that it takes as low");
    private final Key<Double> inputLeakage = withDefault("inputLeakage",
            Quantities.limit(Dimension.CURRENT, Bounds.NOT_NEGATIVE), DEFAULT.inputLeakage(),
            "largest input current of the receiver");
    private final Key<Double> capacitance = withDefault("capacitance",
            Quantities.number(Dimension.CAPACITANCE, Bounds.NOT_NEGATIVE), DEFAULT.capacitance(),
            "of line and receiver");
    private final Key<Double> riseTime = optional("riseTime", Quantities.number(Dimension.TIME, Bounds.POSITIVE),
            "no limit", "longest rise from 30 % to 70 %");

    AlertLineForm() {
        super("Alert line");
    }

    @Override
    protected void check(Fields fields) {
        double high = fields.find(inputHigh).orElse(Double.POSITIVE_INFINITY);
        if (fields.find(inputLow).orElse(Double.NEGATIVE_INFINITY) >= high) {
            fields.problem(inputLow, "inputLow must be below inputHigh");
        }
    }

    @Override
    protected AlertLine bind(Fields fields) {
        return new AlertLine(fields.get(name), fields.find(voltage), fields.number(pullUp), fields.number(inputHigh),
                fields.number(inputLow), fields.get(inputLeakage), fields.get(capacitance), fields.number(riseTime));
    }

    @Override
    protected void fill(AlertLine value, Sheet sheet) {
        sheet.put(name, value.name());
        sheet.put(voltage, value.voltage());
        sheet.put(pullUp, value.pullUp());
        sheet.put(inputHigh, value.inputHigh());
        sheet.put(inputLow, value.inputLow());
        sheet.put(inputLeakage, value.inputLeakage());
        sheet.put(capacitance, value.capacitance());
        sheet.put(riseTime, value.riseTime());
    }
}
