package shuntwright.io.partsfile;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.parts.AmplifierRanges;
import shuntwright.parts.InputErrors;
import shuntwright.parts.SenseAmplifier;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;

final class AmplifierForm extends PartForm<SenseAmplifier> {
    private final Key<Double> gain = required("gain", Quantities.number(Dimension.GAIN, Bounds.POSITIVE),
            "output volts per input volt");
    private final Key<Double> gainError = required("gainError", PartKinds.ERROR, "limit of its magnitude at 25 °C");
    private final Key<Double> gainDrift = required("gainDrift", PartKinds.DRIFT,
            "limit of its magnitude, referred to 25 °C");
    private final Key<Double> gainAgeing = withDefault("gainAgeing", PartKinds.ERROR, 0.0,
            "largest relative change of the gain over life");
    private final Key<Double> offset = required("offset", PartKinds.OFFSET,
            "input offset, limit of its magnitude at 25 °C");
    private final Key<Double> offsetDrift = required("offsetDrift", PartKinds.OFFSET_DRIFT,
            "limit of its magnitude, referred to 25 °C");
    private final Key<Double> rejection = required("commonModeRejection", PartKinds.REJECTION, "least value");
    private final Key<Double> commonModeSpec = required("commonModeSpec", PartKinds.ANY_VOLTAGE,
            "common-mode voltage at which the offset is stated");
    private final Key<Double> supplyRejection = required("supplyRejection", PartKinds.REJECTION, "least value");
    private final Key<Double> supplySpec = required("supplySpec", PartKinds.ANY_VOLTAGE,
            "supply voltage at which the offset is stated");
    private final Key<Double> biasCurrent = required("biasCurrent", PartKinds.LEAKAGE,
            "input bias current, largest magnitude");
    private final Key<Range> commonMode = required("commonMode", Quantities.range(Dimension.VOLTAGE, Bounds.ANY),
            "voltage its inputs may sit at while it measures");
    private final Key<Double> differential = required("differential", PartKinds.VOLTAGE,
            "largest input difference that it amplifies as specified");
    private final Key<Double> survival = optional("survival", PartKinds.VOLTAGE, "`differential`",
            "largest input difference that it survives");
    private final Key<Range> supply = required("supply", PartKinds.SUPPLY, "supply voltage");
    private final Key<Double> outputHeadroom = required("outputHeadroom", PartKinds.HEADROOM,
            "how far below the supply its output stays linear");
    private final Key<Double> outputLow = required("outputLow", PartKinds.HEADROOM,
            "lowest output voltage at which it is linear");
    private final Key<Double> bandwidth = required("bandwidth",
            Quantities.number(Dimension.FREQUENCY, Bounds.POSITIVE), "−3 dB at this gain");
    private final Key<Double> slewRate = required("slewRate", Quantities.number(Dimension.SLEW_RATE, Bounds.POSITIVE),
            "of the output");
    private final Key<Double> supplyCurrent = required("supplyCurrent", PartKinds.LEAKAGE,
            "largest of the whole package");
    private final Key<Integer> sections = withDefault("sections", Kinds.whole(1, Integer.MAX_VALUE), 1,
            "amplifiers in one package");
    private final SaleKeys saleKeys = makeSaleKeys();

    AmplifierForm() {
        super("Amplifier");
    }

    @Override
    SaleKeys saleKeys() {
        return saleKeys;
    }

    @Override
    protected void check(Fields fields) {
        super.check(fields);
        if (fields.find(survival).orElse(Double.POSITIVE_INFINITY) < fields.find(differential).orElse(0.0)) {
            fields.problem(survival, "survival must not be below differential: what is measured must be survived");
        }
    }

    @Override
    protected SenseAmplifier bind(Fields fields) {
        InputErrors input = new InputErrors(fields.get(offset), fields.get(offsetDrift), fields.get(rejection),
                fields.get(commonModeSpec), fields.get(supplyRejection), fields.get(supplySpec),
                fields.get(biasCurrent));
        AmplifierRanges ranges = new AmplifierRanges(fields.get(commonMode), fields.get(differential),
                fields.find(survival).orElse(fields.get(differential)), fields.get(supply), fields.get(outputHeadroom),
                fields.get(outputLow));
        return new SenseAmplifier(partNumber(fields), description(fields), fields.get(gain), fields.get(gainError),
                fields.get(gainDrift), fields.get(gainAgeing), input, ranges, fields.get(bandwidth),
                fields.get(slewRate),
                fields.get(supplyCurrent), fields.get(sections), purchase(fields));
    }

    @Override
    void fillOwn(SenseAmplifier value, Sheet sheet) {
        sheet.put(gain, value.gain());
        sheet.put(gainError, value.gainError());
        sheet.put(gainDrift, value.gainDrift());
        sheet.put(gainAgeing, value.gainAgeing());
        sheet.put(offset, value.input().offset());
        sheet.put(offsetDrift, value.input().offsetDrift());
        sheet.put(rejection, value.input().rejection());
        sheet.put(commonModeSpec, value.input().commonModeSpec());
        sheet.put(supplyRejection, value.input().supplyRejection());
        sheet.put(supplySpec, value.input().supplySpec());
        sheet.put(biasCurrent, value.input().biasCurrent());
        sheet.put(commonMode, value.ranges().commonMode());
        sheet.put(differential, value.ranges().differential());
        sheet.put(survival, value.ranges().survival());
        sheet.put(supply, value.ranges().supply());
        sheet.put(outputHeadroom, value.ranges().outputHeadroom());
        sheet.put(outputLow, value.ranges().outputLow());
        sheet.put(bandwidth, value.bandwidth());
        sheet.put(slewRate, value.slewRate());
        sheet.put(supplyCurrent, value.supplyCurrent());
        sheet.put(sections, value.sections());
    }
}
