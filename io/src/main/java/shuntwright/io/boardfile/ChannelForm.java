package shuntwright.io.boardfile;

import java.util.List;
import java.util.Locale;

import shuntwright.board.Calibration;
import shuntwright.board.Channel;
import shuntwright.board.Pins;
import shuntwright.board.ReleaseDemand;
import shuntwright.board.ThresholdDemand;
import shuntwright.board.TimePoint;
import shuntwright.board.Withstand;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.QuantityWriter;
import shuntwright.quantity.Spread;

final class ChannelForm extends Form<Channel> {
    private static final Kind<Double> CURRENT = Quantities.number(Dimension.CURRENT, Bounds.POSITIVE);
    private static final Kind<Double> ERROR = Quantities.limit(Dimension.RATIO, Bounds.BETWEEN_ZERO_AND_ONE);
    private static final String NOT_YET = "not planned until given";

    final CalibrationForm calibrationForm = new CalibrationForm();
    final WithstandForm withstandForm = new WithstandForm();
    final PinsForm pinsForm = new PinsForm();

    private final Key<String> name = required("name", Kinds.name(), "what the channel is called; unique on the board");
    private final Key<String> note = withDefault("note", Kinds.text(), "", "free text");
    private final Key<Spread> rail = optional("rail", Quantities.spread(Dimension.VOLTAGE, Bounds.ANY), NOT_YET,
            "voltage the rail sits at");
    private final Key<Channel.Side> side = withDefault("side",
            Kinds.choice(each -> each.name().toLowerCase(Locale.ROOT), Channel.Side.values()), Channel.Side.HIGH,
            "whether the shunt stands between rail and load, or between load and ground");
    private final Key<Double> load = optional("load", Quantities.number(Dimension.CURRENT, Bounds.NOT_NEGATIVE),
            NOT_YET, "continuous current in normal service; its heat counts");
    private final Key<Double> noTrip = optional("noTrip", CURRENT, NOT_YET, "largest current that must never trip");
    private final Key<Double> mustTrip = optional("mustTrip", CURRENT, NOT_YET,
            "by this current it must have tripped; above `noTrip`");
    private final Key<Double> tripTarget = optional("tripTarget", CURRENT, "geometric mean of `noTrip` and `mustTrip`",
            "wanted trip current");
    private final Key<Double> least = optional("least", CURRENT, "nothing asked", "smallest current to be read");
    private final Key<Double> fullScale = optional("fullScale", CURRENT, "`mustTrip`",
            "largest current that the ADC must still read");
    private final Key<ReleaseDemand> release = withDefault("release", new ReleaseKind(), new ReleaseDemand.Between(),
            "after a trip: re-arms between load and no-trip current, stays tripped, or re-arms within a window");
    private final Key<Double> readingAtLeast = optional("readingAtLeast", ERROR, "nothing asked",
            "largest reading error at the least current");
    private final Key<Double> readingAtLoad = optional("readingAtLoad", ERROR, "nothing asked",
            "largest reading error at the load current");
    private final Key<Calibration> calibration = optional("calibration", calibrationForm, "none",
            "of the reading at production; it needs the board's `adc`");
    private final Key<ThresholdDemand> threshold = withDefault("threshold", ThresholdWords.KIND,
            new ThresholdDemand.Free(), "where the threshold comes from: any own divider, an own divider from the "
                    + "supply or a reference, or a shared tap");
    private final Key<String> alertLine = optional("alertLine", Kinds.name(), "the board's first",
            "name of the alert line that it pulls");
    private final Key<String> zone = optional("zone", Kinds.name(), "none", "name of the zone that its shunt heats");
    private final Key<Double> diversity = withDefault("diversity", Quantities.number(Dimension.RATIO, Bounds.SHARE),
            1.0,
            "share of its heat that counts in totals");
    private final Key<Double> fault = optional("fault", CURRENT, "not checked",
            "prospective short-circuit current at the output");
    private final Key<Double> clearingTime = optional("clearingTime",
            Quantities.number(Dimension.TIME, Bounds.POSITIVE), "not checked",
            "longest time that a fault flows through the shunt");
    private final Key<List<TimePoint>> inrush = withDefault("inrush", Points.kind(Bounds.NOT_NEGATIVE), List.of(),
            "profile at switch-on that must not trip, straight lines between points, by ascending time");
    private final Key<Withstand> withstand = optional("withstand", withstandForm, "not checked",
            "what wire, trace or switch survives");
    private final Key<Pins> pins = withDefault("pins", pinsForm, Pins.NONE, "parts and values that are fixed");

    ChannelForm() {
        super("Channel");
    }

    @Override
    protected void check(Fields fields) {
        double lowest = fields.find(noTrip).orElse(0.0);
        double highest = fields.find(mustTrip).orElse(Double.POSITIVE_INFINITY);
        if (!(lowest < highest)) {
            fields.problem(mustTrip, "the must-trip current " + amperes(highest) + " must be above the no-trip current "
                    + amperes(lowest) + "; raise mustTrip or lower noTrip");
        } else {
            fields.find(tripTarget).filter(target -> !(lowest <= target && target <= highest))
                    .ifPresent(target -> fields.problem(tripTarget, "the trip target " + amperes(target)
                            + " is outside the trip window; it must be from noTrip " + amperes(lowest) + " to mustTrip"
                            + (highest < Double.POSITIVE_INFINITY ? " " + amperes(highest) : "")));
        }
        double top = fields.find(fullScale).orElse(Double.POSITIVE_INFINITY);
        if (fields.find(least).orElse(0.0) > top) {
            fields.problem(least, "the least current must not be above the full scale of " + amperes(top));
        }
        Points.checkTimesAscend(fields, inrush);
    }

    private static String amperes(double current) {
        return QuantityWriter.show(current, Dimension.CURRENT);
    }

    @Override
    protected Channel bind(Fields fields) {
        Channel.Currents currents = new Channel.Currents(fields.number(load), fields.number(noTrip),
                fields.number(mustTrip), fields.number(tripTarget), fields.number(least), fields.number(fullScale));
        Channel.ReadingDemand reading = new Channel.ReadingDemand(fields.number(readingAtLeast),
                fields.number(readingAtLoad), fields.find(calibration));
        Channel.Stress stress = new Channel.Stress(fields.number(fault), fields.number(clearingTime),
                fields.get(inrush), fields.find(withstand));
        return new Channel(fields.get(name), fields.get(note), fields.find(rail), fields.get(side), currents,
                fields.get(release), reading, fields.get(threshold), fields.find(alertLine), fields.find(zone),
                fields.get(diversity), stress, fields.get(pins));
    }

    @Override
    protected void fill(Channel value, Sheet sheet) {
        sheet.put(name, value.name());
        sheet.put(note, value.note());
        sheet.put(rail, value.rail());
        sheet.put(side, value.side());
        sheet.put(load, value.currents().load());
        sheet.put(noTrip, value.currents().noTrip());
        sheet.put(mustTrip, value.currents().mustTrip());
        sheet.put(tripTarget, value.currents().tripTarget());
        sheet.put(least, value.currents().least());
        sheet.put(fullScale, value.currents().fullScale());
        sheet.put(release, value.release());
        sheet.put(readingAtLeast, value.reading().atLeast());
        sheet.put(readingAtLoad, value.reading().atLoad());
        sheet.put(calibration, value.reading().calibration());
        sheet.put(threshold, value.threshold());
        sheet.put(alertLine, value.alertLine());
        sheet.put(zone, value.zone());
        sheet.put(diversity, value.diversity());
        sheet.put(fault, value.stress().fault());
        sheet.put(clearingTime, value.stress().clearingTime());
        sheet.put(inrush, value.stress().inrush());
        sheet.put(withstand, value.stress().withstand());
        sheet.put(pins, value.pins());
    }
}
