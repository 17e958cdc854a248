package shuntwright.io.partsfile;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.parts.Comparator;
import shuntwright.parts.ComparatorInputs;
import shuntwright.parts.Hysteresis;
import shuntwright.parts.OpenDrainOutput;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;

final class ComparatorForm extends PartForm<Comparator> {
    final HysteresisForm hysteresisForm = new HysteresisForm();

    private final Key<Double> offset = required("offset", PartKinds.OFFSET,
            "input offset, limit of its magnitude at 25 °C");
    private final Key<Double> offsetDrift = required("offsetDrift", PartKinds.OFFSET_DRIFT,
            "limit of its magnitude, referred to 25 °C");
    private final Key<Range> biasCurrent = required("biasCurrent", Quantities.range(Dimension.CURRENT, Bounds.ANY),
            "current into an input; negative where it flows out");
    private final Key<Double> inputLowest = withDefault("inputLowest", PartKinds.ANY_VOLTAGE, 0.0,
            "lowest input voltage at which it compares");
    private final Key<Double> inputHeadroom = required("inputHeadroom", PartKinds.ANY_VOLTAGE,
            "how far below the supply the threshold must stay; negative where it may exceed the supply");
    private final Key<Hysteresis> hysteresis = required("hysteresis", hysteresisForm,
            "how release is separated from trip");
    private final Key<Range> lowLevel = required("lowLevel", Quantities.range(Dimension.VOLTAGE, Bounds.NOT_NEGATIVE),
            "output voltage while it pulls down, up to the sink current");
    private final Key<Double> sinkCurrent = required("sinkCurrent", PartKinds.CURRENT,
            "largest current at which the low level holds");
    private final Key<Double> leakage = required("leakage", PartKinds.LEAKAGE,
            "largest current into the output while it is off");
    private final Key<Double> maximumVoltage = required("maximumVoltage", PartKinds.VOLTAGE,
            "largest voltage that the output may be pulled up to");
    private final Key<Range> supply = required("supply", PartKinds.SUPPLY, "supply voltage");
    private final Key<Double> supplyCurrent = required("supplyCurrent", PartKinds.LEAKAGE,
            "largest of the whole package");
    private final Key<Range> delay = required("delay", Quantities.range(Dimension.TIME, Bounds.NOT_NEGATIVE),
            "input to output");
    private final Key<Integer> sections = withDefault("sections", Kinds.whole(1, Integer.MAX_VALUE), 1,
            "comparators in one package");
    private final SaleKeys saleKeys = makeSaleKeys();

    ComparatorForm() {
        super("Comparator");
    }

    @Override
    SaleKeys saleKeys() {
        return saleKeys;
    }

    @Override
    protected Comparator bind(Fields fields) {
        ComparatorInputs inputs = new ComparatorInputs(fields.get(offset), fields.get(offsetDrift),
                fields.get(biasCurrent), fields.get(inputLowest), fields.get(inputHeadroom));
        OpenDrainOutput output = new OpenDrainOutput(fields.get(lowLevel), fields.get(sinkCurrent),
                fields.get(leakage), fields.get(maximumVoltage));
        return new Comparator(partNumber(fields), description(fields), inputs, fields.get(hysteresis), output,
                fields.get(supply), fields.get(supplyCurrent), fields.get(delay), fields.get(sections),
                purchase(fields));
    }

    @Override
    void fillOwn(Comparator value, Sheet sheet) {
        sheet.put(offset, value.inputs().offset());
        sheet.put(offsetDrift, value.inputs().offsetDrift());
        sheet.put(biasCurrent, value.inputs().biasCurrent());
        sheet.put(inputLowest, value.inputs().lowest());
        sheet.put(inputHeadroom, value.inputs().headroom());
        sheet.put(hysteresis, value.hysteresis());
        sheet.put(lowLevel, value.output().lowLevel());
        sheet.put(sinkCurrent, value.output().sinkCurrent());
        sheet.put(leakage, value.output().leakage());
        sheet.put(maximumVoltage, value.output().maximumVoltage());
        sheet.put(supply, value.supply());
        sheet.put(supplyCurrent, value.supplyCurrent());
        sheet.put(delay, value.delay());
        sheet.put(sections, value.sections());
    }
}
